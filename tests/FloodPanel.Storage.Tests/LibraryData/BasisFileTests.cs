using FloodPanel.Calculation.Cases;
using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

public sealed class BasisFileTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("floodpanel-bases-").FullName;

    public BasisFileTests()
    {
        foreach (var file in Directory.GetFiles(LibraryFiles.DeliveredFolder))
        {
            File.Copy(file, Path.Combine(folder, Path.GetFileName(file)));
        }
    }

    public void Dispose() => Directory.Delete(folder, recursive: true);

    /// <summary>What the user reads is what the calculation uses without files.</summary>
    [Fact]
    public void Load_Delivered_IsTheStandardOfTheCalculation() => Assert.Equal(
        DesignBases.Standard,
        LibraryFiles.Load(LibraryFiles.DeliveredFolder).Bases.Values.OrderBy(b => b.Kind).ToValueList());

    [Theory]
    [InlineData("\"divisor\": 1.67", "\"divisor\": \"x\"", "design-bases.json: bases[0].strengths[1].divisor: The value is \"x\"; allowed is a finite number.")]
    [InlineData("\"kind\": \"eurocode\"", "\"kind\": \"us-strength\"", "design-bases.json: bases: The basis \"eurocode\" stands there 0 times; needed is once.")]
    [InlineData("\"title\": \"Eurocode\"", "\"titel\": \"Eurocode\"", "design-bases.json: bases[2].title: The field is missing; needed is text in double quotes.")]
    [InlineData("\"floodSide\": 1.5, \"protectedSide\": 1.0, \"brimFull\": 1.35, ", "", "design-bases.json: bases[2].inland.floodSide: The field is missing; needed is a finite number.")]
    public void Load_BadBasis_IsRefusedWithPath(string good, string bad, string expected)
    {
        var path = Path.Combine(folder, "design-bases.json");
        var text = File.ReadAllText(path);
        Assert.Contains(good, text, StringComparison.Ordinal);
        File.WriteAllText(path, text.Replace(good, bad, StringComparison.Ordinal));

        var problems = Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems;

        Assert.Contains(expected, problems);
    }

    [Fact]
    public void Load_FileMissingOrCut_IsRefused()
    {
        var path = Path.Combine(folder, "design-bases.json");
        File.WriteAllText(path, "{ \"bases\": [");
        var cut = Assert.Single(Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems);
        File.Delete(path);
        var missing = Assert.Single(Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems);

        Assert.StartsWith("design-bases.json: The file is not JSON: ", cut);
        Assert.StartsWith("design-bases.json cannot be read in the data folder ", missing);
    }
}
