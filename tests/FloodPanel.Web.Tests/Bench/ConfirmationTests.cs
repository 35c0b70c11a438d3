using Bunit;

namespace FloodPanel.Web.Tests.Bench;

/// <summary>Figures from memory carry a mark beside the choice until they are confirmed, and the cautions say so.</summary>
public class ConfirmationTests : BenchContext
{
    private const string Alloy = "remembered";

    private bool IsNamedInTheCautions => Editor.ResultFor("garage")!.Notes.Any(note => note.Code == "unconfirmed-value"
        && note.Text.ToString().StartsWith("Remembered alloy:", StringComparison.Ordinal));

    [Fact]
    public void MaterialFromMemory_Confirmed_LosesItsMarkAndCaution()
    {
        var page = Open("garage");
        Choose(page, "logs.material", "Remembered alloy");
        Assert.Equal("From memory", Mark(page));
        Assert.True(IsNamedInTheCautions);

        page.Find($"[data-testid=confirm-{Alloy}]").Click();

        Assert.Equal("From memory, confirmed", Mark(page));
        Assert.Equal([Alloy], Editor.Project.Confirmed);
        Assert.False(IsNamedInTheCautions);
    }

    [Fact]
    public void Confirmation_TakenBack_MarksAgain()
    {
        var page = Open("garage");
        Choose(page, "logs.material", "Remembered alloy");
        page.Find($"[data-testid=confirm-{Alloy}]").Click();

        page.Find($"[data-testid=confirm-{Alloy}]").Click();

        Assert.Equal("From memory", Mark(page));
        Assert.Empty(Editor.Project.Confirmed);
        Assert.True(IsNamedInTheCautions);
    }

    [Fact]
    public void OwnFigures_AreTheUsersAndCarryNoMark()
    {
        var page = Open("garage");
        Choose(page, "logs.material", "Remembered alloy");

        Choose(page, "logs.material", "Own figures");

        Assert.Empty(page.FindAll($"[data-testid=evidence-{Alloy}]"));
        Assert.False(IsNamedInTheCautions);
        var check = Editor.ResultFor("garage")!.Cases[0].Logs[0].Checks.First(c => c.Name == "log-bending");
        Assert.Contains("typed by the user", check.Source, StringComparison.Ordinal);
    }

    private static string Mark(IRenderedComponent<Web.Pages.Bench.BenchPage> page) =>
        page.Find($"[data-testid=evidence-{Alloy}] span").TextContent;
}
