using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Tests.Forms;

public class WordsTests
{
    public static TheoryData<string, string[]> EveryChoice => new()
    {
        { "walls", [.. Enum.GetValues<WallKind>().Select(Words.Of)] },
        { "families", [.. Enum.GetValues<MaterialFamily>().Select(Words.Of)] },
        { "bases", [.. Enum.GetValues<DesignBasisKind>().Select(Words.Of)] },
        { "zones", [.. Enum.GetValues<FloodZone>().Select(Words.Of)] },
        { "units", [.. Enum.GetValues<UnitSystem>().Select(Words.Of)] },
        { "verdicts", [.. Enum.GetValues<VerdictKind>().Select(Words.Of)] },
        { "actions", [.. Enum.GetValues<ActionKind>().Select(Words.Of)] },
        { "shapes", [.. Shapes.Select(Words.Of)] },
    };

    private static Profile[] Shapes =>
        [new Rectangle(), new HollowRectangle(), new RectangularTube(), new ISection(), new GivenProperties()];

    [Theory]
    [MemberData(nameof(EveryChoice))]
    public void Of_EveryChoice_HasItsOwnWords(string choice, string[] words)
    {
        Assert.True(words.Length >= 2, choice);
        Assert.All(words, w => Assert.False(string.IsNullOrWhiteSpace(w)));
        Assert.Distinct(words);
    }

    [Theory]
    [InlineData("design-flood", "Design flood")]
    [InlineData("log-bending", "Log bending")]
    [InlineData("", "")]
    public void FromName_NameOfAFile_BecomesWords(string name, string words) => Assert.Equal(words, Words.FromName(name));
}
