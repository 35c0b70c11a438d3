using FloodPanel.Calculation;
using FloodPanel.Documents.OwnerSummaries;
using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;

namespace FloodPanel.Documents.Tests.OwnerSummaries;

public class OwnerSummaryPdfTests
{
    private const double PointsPerMillimetre = 72 / 25.4;

    private static readonly DateOnly Date = new(2026, 12, 1);

    public static TheoryData<string, UnitSystem> Cases()
    {
        var cases = new TheoryData<string, UnitSystem>();
        foreach (var name in Projects.Names)
        {
            cases.Add(name, UnitSystem.SI);
            cases.Add(name, UnitSystem.USCustomary);
        }

        return cases;
    }

    [Fact]
    public void Write_SI_FiguresAreThere()
    {
        using var document = Read("three", UnitSystem.SI);

        var words = AllWords(document);
        Assert.All(
            ["Mill Lane 4", "A. Weir", "4 Mill Lane, Ostrey", "ML-04", "R. Holm", "Revision 3, 1 December 2026", "Ostrey datum",
                "Garage door", "Front door", "Gap in the yard wall", "12.350 m", "0.950", "1.670", "8.41", "Not for construction"],
            expected => Assert.Contains(expected, words, StringComparison.Ordinal));
    }

    [Fact]
    public void Write_UsCustomary_FiguresAreThere()
    {
        using var document = Read("three", UnitSystem.USCustomary);

        // 12.35 m / 0.3048 = 40.52 ft; 0.95 m = 3.12 ft; 1.67 m = 65.748 in; 8.41 kg = 18.5 lb.
        var words = AllWords(document);
        Assert.All(
            ["40.52 ft", "3.12", "65.748", "18.5", "lb", "in"],
            expected => Assert.Contains(expected, words, StringComparison.Ordinal));
        Assert.DoesNotContain("12.350", words, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("one", UnitSystem.SI, 1)]
    [InlineData("adequate", UnitSystem.SI, 1)]
    [InlineData("three", UnitSystem.SI, 2)]
    [InlineData("three", UnitSystem.USCustomary, 2)]
    public void Write_UpToThreeOpenings_OneOrTwoPages(string project, UnitSystem units, int pages)
    {
        using var document = Read(project, units);

        Assert.Equal(pages, document.NumberOfPages);
    }

    [Theory]
    [InlineData(UnitSystem.SI, 210, 297)]
    [InlineData(UnitSystem.USCustomary, 215.9, 279.4)]
    public void Write_UnitSystem_SetsThePageSize(UnitSystem units, double width, double height)
    {
        using var document = Read("three", units);

        Assert.All(document.GetPages(), page =>
        {
            Assert.Equal(width, page.Width / PointsPerMillimetre, 0.1);
            Assert.Equal(height, page.Height / PointsPerMillimetre, 0.1);
        });
    }

    [Fact]
    public void Write_Metadata_SaysWhatTheFileIs()
    {
        using var document = Read("one", UnitSystem.SI);

        var about = document.Information;
        Assert.Equal("Flood barrier summary: Mill Lane 4", about.Title);
        Assert.Equal("R. Holm", about.Author);
        Assert.Equal("What is protected against flooding, to what level, and with what", about.Subject);
        Assert.Contains("stop-logs", about.Keywords, StringComparison.Ordinal);
        Assert.StartsWith("D:20261201", about.CreationDate, StringComparison.Ordinal);
        Assert.True(document.Structure.Catalog.CatalogDictionary.ContainsKey(UglyToad.PdfPig.Tokens.NameToken.Create("Lang")));
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Write_AnyProject_EveryFontIsAnEmbeddedSubset(string project, UnitSystem units)
    {
        var pdf = Write(project, units);

        using var document = PdfDocument.Open(pdf);
        var fonts = document.GetPages().SelectMany(p => p.Letters).Select(l => l.FontName).Distinct().ToArray();
        Assert.NotEmpty(fonts);
        Assert.All(fonts, font => Assert.Matches("^[A-Z]{6}\\+Source", font));
        var raw = System.Text.Encoding.Latin1.GetString(pdf);
        Assert.Equal(fonts.Length, raw.Split("/FontFile2 ").Length - 1);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Write_AnyProject_EveryLetterIsInsideTheMargins(string project, UnitSystem units)
    {
        using var document = Read(project, units);

        const double margin = 9 * PointsPerMillimetre;
        Assert.All(document.GetPages(), page => Assert.All(page.Letters, letter =>
        {
            var box = letter.BoundingBox;
            Assert.True(
                box.Left >= margin && box.Right <= page.Width - margin && box.Bottom >= margin / 2 && box.Top <= page.Height - margin,
                $"page {page.Number}: {letter.Value} at {box}");
        }));
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Write_AnyProject_NoWordMeetsAnother(string project, UnitSystem units)
    {
        using var document = Read(project, units);

        foreach (var page in document.GetPages())
        {
            PageText.AssertNoOverlap(page);
        }
    }

    [Theory]
    [InlineData("twelve")]
    [InlineData("twelve-long")]
    [InlineData("forty")]
    public void Write_ManyOpenings_EveryPageHasBandFooterAndNumber(string project)
    {
        using var document = Read(project, UnitSystem.SI);

        Assert.True(document.NumberOfPages > 3);
        Assert.All(document.GetPages(), page =>
        {
            var words = Words(page);
            Assert.Contains("Not for construction", words, StringComparison.Ordinal);
            Assert.Contains($"Page {page.Number} of {document.NumberOfPages}", words, StringComparison.Ordinal);
            Assert.Contains("Revision 3, 1 December 2026", words, StringComparison.Ordinal);
        });
    }

    [Fact]
    public void Write_TableOverTwoPages_RepeatsItsHead()
    {
        using var document = Read("forty", UnitSystem.SI);

        var withRows = document.GetPages().Where(p => Words(p).Contains("Incomplete Opening ", StringComparison.Ordinal)
            || Words(p).Contains(" Incomplete", StringComparison.Ordinal)).Take(2).ToArray();
        Assert.Equal(2, withRows.Length);
        Assert.All(withRows, page => Assert.Contains("Water above sill", Words(page), StringComparison.Ordinal));
    }

    [Fact]
    public void Write_Adequate_HasNoMarkAgainstConstruction()
    {
        using var document = Read("adequate", UnitSystem.SI);

        Assert.DoesNotContain("Not for construction", AllWords(document), StringComparison.Ordinal);
    }

    [Fact]
    public void Write_SameInput_SameBytes()
    {
        Assert.Equal(Write("three", UnitSystem.SI), Write("three", UnitSystem.SI));
        Assert.NotEqual(Write("three", UnitSystem.SI), Write("one", UnitSystem.SI));
    }

    [Fact]
    public void Write_AtTheSameTime_EveryFileIsTheSame()
    {
        var alone = Write("three", UnitSystem.SI);

        var together = Enumerable.Range(0, 8).AsParallel().WithDegreeOfParallelism(4)
            .Select(_ => Write("three", UnitSystem.SI)).ToArray();

        Assert.All(together, pdf => Assert.Equal(alone, pdf));
    }

    private static byte[] Write(string project, UnitSystem units) =>
        OwnerSummaryPdf.Write(Projects.Run(project), Library.Empty, units, 3, Date);

    private static PdfDocument Read(string project, UnitSystem units) => PdfDocument.Open(Write(project, units));

    private static string AllWords(PdfDocument document) => string.Join(' ', document.GetPages().Select(Words));

    private static string Words(Page page) => string.Join(' ', page.GetWords().Select(w => w.Text));
}
