using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Tests.Cases;

public class CaseNamesTests
{
    [Fact]
    public void InFiles_Cases_AsInTheProjectFile() =>
        Assert.Equal(
            ["design-flood", "wave", "debris", "brim-full", "wind", "line"],
            Enum.GetValues<CaseKind>().Select(CaseNames.InFiles));

    [Theory]
    [InlineData("design-flood", "design flood")]
    [InlineData("brim-full", "brim-full")]
    [InlineData("wave", "wave")]
    [InlineData("line", "line load")]
    public void InWords_Name_AsInASentence(string name, string words) => Assert.Equal(words, CaseNames.InWords(name));

    [Fact]
    public void InFiles_UnknownCase_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => CaseNames.InFiles((CaseKind)99));
}
