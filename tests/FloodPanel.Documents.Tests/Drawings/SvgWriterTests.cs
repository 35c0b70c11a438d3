using System.Globalization;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public partial class SvgWriterTests
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    public static TheoryData<string, UnitSystem> Cases() => DrawingTests.Cases();

    [Theory]
    [MemberData(nameof(Cases))]
    public void WriteText_AnyOpening_IsWellFormedWithFiniteNumbersAndNoColours(string name, UnitSystem units)
    {
        foreach (var (_, scene) in DrawingTests.Scenes(name, units))
        {
            var text = SvgWriter.WriteText(scene);

            var root = XDocument.Parse(text).Root!;
            Assert.Equal(Svg + "svg", root.Name);
            Assert.DoesNotMatch("NaN|Infinity|∞", text);
            Assert.DoesNotMatch("(fill|stroke|color|style)=\"", text.Replace("fill=\"none\"", "", StringComparison.Ordinal));
            Assert.All(root.Descendants(Svg + "path"), path => Assert.Matches(PathData(), path.Attribute("d")!.Value));
        }
    }

    [Fact]
    public void Write_Elevation_EveryFieldHasItsMark()
    {
        var svg = SvgWriter.Write(ElevationDrawing.Draw(Sample.Input(Sample.Garage)));

        var fields = svg.Descendants().Attributes("data-field").Select(a => a.Value).ToHashSet();
        Assert.Superset(
            new HashSet<string>
            {
                "clearWidth", "clearHeight", "sillLevel", "groundLevel", "designStillWaterLevel", "freeboard", "count", "bays[0]",
                "bays[1]", "posts.width",
            },
            fields);
    }

    [Fact]
    public void Write_Section_EveryFieldHasItsMark()
    {
        var opening = Sample.Garage with { RakeDegrees = 20, ProtectedSideLevel = 11.7 };

        var svg = SvgWriter.Write(SectionDrawing.Draw(Sample.Input(opening), "design-flood"));

        var fields = svg.Descendants().Attributes("data-field").Select(a => a.Value).ToHashSet();
        Assert.Superset(
            new HashSet<string>
            {
                "sillLevel", "groundLevel", "designStillWaterLevel", "freeboard", "count", "protectedSideLevel", "rake",
            },
            fields);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Write_EveryMark_HasATitle(string name, UnitSystem units)
    {
        foreach (var (_, scene) in DrawingTests.Scenes(name, units))
        {
            var marks = SvgWriter.Write(scene).Descendants(Svg + "g").ToArray();

            Assert.NotEmpty(marks);
            Assert.All(marks, mark => Assert.NotEqual("", mark.Element(Svg + "title")!.Value));
        }
    }

    [Fact]
    public void Write_Root_SaysWhatIsShownToThoseWhoCannotSee()
    {
        var svg = SvgWriter.Write(SectionDrawing.Draw(Sample.Input(Sample.Garage), "design-flood"));

        Assert.Equal("img", svg.Attribute("role")!.Value);
        Assert.Contains("resultant is 5.28 kN/m, 0.342 m above the sill", svg.Attribute("aria-label")!.Value, StringComparison.Ordinal);
        Assert.Equal("0 0 140 98", svg.Attribute("viewBox")!.Value);
    }

    [Fact]
    public void Write_Logs_CanBeFoundByBayAndNumber()
    {
        var svg = SvgWriter.Write(ElevationDrawing.Draw(Sample.Input(Sample.Garage)));

        var parts = svg.Descendants().Attributes("data-part").Select(a => a.Value).Where(p => p.StartsWith("bay", StringComparison.Ordinal));
        Assert.Equal(
            Enumerable.Range(1, 2).SelectMany(bay => Enumerable.Range(1, 6).Select(log => string.Create(CultureInfo.InvariantCulture, $"bay-{bay}-log-{log}"))),
            parts);
    }

    [GeneratedRegex(@"^(M-?[\d.]+ -?[\d.]+(L-?[\d.]+ -?[\d.]+)+Z?)*$")]
    private static partial Regex PathData();
}
