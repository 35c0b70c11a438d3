using System.Globalization;
using System.Text.RegularExpressions;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Pdf;

namespace FloodPanel.Documents.Tests.Drawings;

/// <summary>The screen and the PDF show the same colours, and both can be read.</summary>
public partial class StyleSheetTests
{
    private static readonly string Css = File.ReadAllText(Path.Combine(RepositoryRoot(), "wwwroot", "css", "drawing.css"));

    private static readonly Dictionary<string, uint> Light = Variables(Css[..Css.IndexOf(".fp-theme-dark", StringComparison.Ordinal)]);

    private static readonly Dictionary<string, uint> Dark = Variables(Css[Css.IndexOf(".fp-theme-dark", StringComparison.Ordinal)..]);

    /// <summary>Okabe and Ito (2008), Color universal design: blue, sky blue, bluish green, vermilion, reddish purple.</summary>
    [Theory]
    [InlineData(LineRole.Hydrostatic, "hydrostatic", 0x0072B2)]
    [InlineData(LineRole.Flow, "flow", 0x56B4E9)]
    [InlineData(LineRole.Wave, "wave", 0x009E73)]
    [InlineData(LineRole.Debris, "debris", 0xD55E00)]
    [InlineData(LineRole.LineLoad, "line-load", 0xCC79A7)]
    public void Actions_ScreenAndPdf_TakeThePalette(LineRole role, string variable, uint published)
    {
        Assert.Equal(published, Ink.Of(role));
        Assert.Equal(published, Light[variable]);
    }

    [Theory]
    [InlineData(FillRole.Wall, "wall")]
    [InlineData(FillRole.Log, "log")]
    [InlineData(FillRole.Post, "post")]
    [InlineData(FillRole.Water, "water")]
    [InlineData(FillRole.Wind, "wind")]
    public void Areas_ScreenAndPdf_AreTheSame(FillRole role, string variable) => Assert.Equal(Ink.Of(role), Light[variable]);

    [Theory]
    [InlineData(LineRole.Hatch, "hatch")]
    [InlineData(LineRole.Extension, "extension")]
    [InlineData(LineRole.Wind, "wind")]
    public void Lines_ScreenAndPdf_AreTheSame(LineRole role, string variable) => Assert.Equal(Ink.Of(role), Light[variable]);

    /// <summary>WCAG 2.2, success criterion 1.4.3: text 4.5:1.</summary>
    [Fact]
    public void Text_OnSheetAndLogs_IsReadable()
    {
        var (paper, slate) = (Page("light", "sheet"), Page("dark", "sheet"));

        Assert.All([paper, Light["log"], Light["wall"], 0xFFFFFFu], ground => Assert.True(Contrast(Ink.Black, ground) >= 4.5));
        Assert.All([paper, 0xFFFFFFu], ground => Assert.True(Contrast(Light["ink-muted"], ground) >= 4.5));
        Assert.True(Contrast(Light["lit"], paper) >= 4.5);
        Assert.True(Contrast(Page("light", "ink"), paper) >= 4.5);
        Assert.All([slate, Dark["log"], Dark["wall"]], ground => Assert.True(Contrast(Page("dark", "ink"), ground) >= 4.5));
        Assert.True(Contrast(Dark["ink-muted"], slate) >= 4.5);
        Assert.True(Contrast(Dark["lit"], slate) >= 4.5);
        Assert.True(Contrast(0xFFFFFF, Ink.Warning) >= 4.5);
    }

    /// <summary>Numbers of logs stand on logs under water.</summary>
    [Fact]
    public void Text_OnLogsUnderWater_IsReadable()
    {
        var light = Mixed(Light["water"], Light["log"], Number("water-opacity", Css));
        var dark = Mixed(Dark["water"], Dark["log"], Number("water-opacity", Css[Css.IndexOf(".fp-theme-dark", StringComparison.Ordinal)..]));

        Assert.True(Contrast(Page("light", "ink"), light) >= 4.5);
        Assert.True(Contrast(Page("dark", "ink"), dark) >= 4.5);
    }

    [Fact]
    public void Css_EveryRoleOfALineAndAnArea_HasARule()
    {
        foreach (var role in Enum.GetNames<LineRole>())
        {
            Assert.Contains($".fp-drawing .fp-{Kebab(role)}", Css, StringComparison.Ordinal);
        }

        foreach (var role in Enum.GetNames<FillRole>())
        {
            Assert.Contains($".fp-drawing .fp-fill-{Kebab(role)}", Css, StringComparison.Ordinal);
        }
    }

    private static uint Page(string theme, string variable)
    {
        var css = File.ReadAllText(Path.Combine(RepositoryRoot(), "wwwroot", "css", "app.css"));
        var line = css.Split('\n').First(l => l.StartsWith($".fp-theme-{theme} {{", StringComparison.Ordinal));
        return Variables(line)[variable];
    }

    private static Dictionary<string, uint> Variables(string css) => Variable().Matches(css).ToDictionary(
        m => m.Groups[1].Value, m => uint.Parse(m.Groups[2].ValueSpan, NumberStyles.HexNumber, CultureInfo.InvariantCulture));

    private static double Number(string variable, string css) => double.Parse(
        Regex.Match(css, $"--fp-{variable}: ([0-9.]+);").Groups[1].ValueSpan, CultureInfo.InvariantCulture);

    private static string Kebab(string name) => Upper().Replace(name, m => $"{(m.Index == 0 ? "" : "-")}{m.Value.ToLowerInvariant()}");

    private static uint Mixed(uint over, uint under, double opacity)
    {
        uint Channel(int shift) => (uint)Math.Round(opacity * (over >> shift & 0xFF) + (1 - opacity) * (under >> shift & 0xFF));
        return Channel(16) << 16 | Channel(8) << 8 | Channel(0);
    }

    private static double Contrast(uint a, uint b)
    {
        var (first, second) = (Luminance(a), Luminance(b));
        return (Math.Max(first, second) + 0.05) / (Math.Min(first, second) + 0.05);
    }

    /// <summary>WCAG 2.2, relative luminance.</summary>
    private static double Luminance(uint rgb)
    {
        double Channel(int shift)
        {
            var c = (rgb >> shift & 0xFF) / 255.0;
            return c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4);
        }

        return 0.2126 * Channel(16) + 0.7152 * Channel(8) + 0.0722 * Channel(0);
    }

    private static string RepositoryRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "FloodPanel.sln")))
        {
            folder = folder.Parent ?? throw new InvalidOperationException("The repository is not above the tests.");
        }

        return folder.FullName;
    }

    [GeneratedRegex("--fp-([a-z-]+|ink-2): #([0-9a-f]{6});")]
    private static partial Regex Variable();

    [GeneratedRegex("[A-Z]")]
    private static partial Regex Upper();
}
