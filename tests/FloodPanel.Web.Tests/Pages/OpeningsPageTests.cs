using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Openings;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Pages;

public class OpeningsPageTests : PageContext
{
    [Fact]
    public async Task Render_NoOpenings_SaysWhatAnOpeningIs()
    {
        var page = await ShowAsync(Examples.Mill with { Openings = [] });

        Assert.Contains("No openings yet.", page.Markup, StringComparison.Ordinal);
        Assert.True(Button(page, "Owner summary (PDF)").HasAttribute("disabled"));
    }

    [Fact]
    public void Render_NoSuchProject_SaysThatItIsNotHere()
    {
        var page = Show<OpeningsPage>(p => p.Add(o => o.Id, Guid.NewGuid()));

        Assert.Contains("This project is not here", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Render_Openings_VerdictInWordsWithWhatGoverns()
    {
        var page = await ShowAsync(Examples.Mill);

        var row = page.Find("[data-testid=opening-garage]");
        var governing = Editor.ResultFor("garage")!.Verdict.Governing!;
        Assert.Equal("incomplete", row.QuerySelector("[data-testid=verdict]")!.GetAttribute("data-verdict"));
        Assert.Contains("Incomplete", row.TextContent, StringComparison.Ordinal);
        Assert.Contains(Shared.Forms.Words.FromName(governing.Check), row.TextContent, StringComparison.Ordinal);
        Assert.Contains("0.950", row.TextContent, StringComparison.Ordinal);
        Assert.Contains("6 logs, 2 bays, 1 post", row.TextContent, StringComparison.Ordinal);
        Assert.Contains("6 logs", page.Find("[data-testid=opening-door]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Render_OpeningWithAProblem_ShowsTheSentenceInsteadOfAResult()
    {
        var page = await ShowAsync(Examples.Mill with { Openings = [Examples.Door with { ClearHeight = 0 }] });

        var row = page.Find("[data-testid=opening-door]");
        Assert.Contains("Clear height is 0 m; allowed is", row.TextContent, StringComparison.Ordinal);
        Assert.Equal("none", row.QuerySelector("[data-testid=verdict]")!.GetAttribute("data-verdict"));
    }

    [Fact]
    public async Task Add_Measurements_AddsAnOpeningThatIsCalculated()
    {
        var page = await ShowAsync(Examples.Mill with { Openings = [] });

        Button(page, "Add opening").Click();
        Type(page, "openingName", "Side door");
        Type(page, "sillLevel", "11.5");
        Type(page, "clearWidth", "3 ft 6 in");
        Type(page, "clearHeight", "2100 mm");
        Assert.Contains("Retained depth 0.850 m. Proposed:", page.Find("[data-testid=proposal]").TextContent, StringComparison.Ordinal);
        await page.Find("form#add-opening").SubmitAsync();

        var opening = Assert.Single(Editor.Project.Openings);
        Assert.Equal(("side-door", 11.5, 1.0668, 2.1), (opening.Id, opening.SillLevel, Math.Round(opening.ClearWidth, 6), opening.ClearHeight));
        Assert.NotNull(Editor.ResultFor("side-door"));
        Assert.EndsWith("/openings/side-door", Navigation.Uri, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Add_SomethingMissing_SaysWhat()
    {
        var page = await ShowAsync(Examples.Mill with { Openings = [] });

        Button(page, "Add opening").Click();
        Type(page, "openingName", "Side door");
        Type(page, "clearWidth", "1.1");
        await page.Find("form#add-opening").SubmitAsync();

        Assert.Equal("Still needed: the sill level, the clear height.", page.Find("form#add-opening .fp-problem").TextContent);
        Assert.Empty(Editor.Project.Openings);
    }

    [Fact]
    public async Task Delete_ThenUndo_PutsTheOpeningBackInItsPlace()
    {
        var page = await ShowAsync(Examples.Mill);

        await page.Find("[aria-label='Delete Garage door']").ClickAsync();
        Assert.Equal(["door"], Editor.Project.Openings.Select(o => o.Id));
        await page.WaitForElement(".mud-snackbar-content-action button").ClickAsync();

        Assert.Equal(["garage", "door"], Editor.Project.Openings.Select(o => o.Id));
    }

    [Fact]
    public async Task Duplicate_Opening_StandsBelowWithANameAndIdOfItsOwn()
    {
        var page = await ShowAsync(Examples.Mill);

        await page.Find("[aria-label='Duplicate Garage door']").ClickAsync();

        Assert.Equal(["garage", "garage-door-copy", "door"], Editor.Project.Openings.Select(o => o.Id));
        Assert.Equal(Editor.Project.Openings[0].Barrier, Editor.Project.Openings[1].Barrier);
    }

    [Fact]
    public async Task Move_Down_ChangesTheOrder()
    {
        var page = await ShowAsync(Examples.Mill);

        await page.Find("[aria-label='Move Garage door down']").ClickAsync();

        Assert.Equal(["door", "garage"], Editor.Project.Openings.Select(o => o.Id));
        Assert.True(page.Find("[aria-label='Move Garage door down']").HasAttribute("disabled"));
    }

    [Fact]
    public async Task Units_US_ShowsFeet()
    {
        var page = await ShowAsync(Examples.Mill);

        await page.InvokeAsync(() => Settings.Use(UnitSystem.USCustomary));

        // 0.95 m / 0.3048 = 3.117 ft.
        Assert.Contains("3.12", page.Find("[data-testid=opening-garage]").TextContent, StringComparison.Ordinal);
    }

    private async Task<IRenderedComponent<PageHost>> ShowAsync(Project project)
    {
        var id = await PutAsync(project);
        return Show<OpeningsPage>(p => p.Add(o => o.Id, id));
    }

    private static AngleSharp.Dom.IElement Button(IRenderedComponent<PageHost> page, string words) =>
        page.FindAll("button").First(b => b.TextContent.Trim() == words);

    private static void Type(IRenderedComponent<PageHost> page, string field, string text) =>
        page.WaitForElement($"[data-testid=field-{field}]").Input(text);
}
