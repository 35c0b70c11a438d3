using Bunit;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Covers;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Pages;

public class CoversPageTests : PageContext
{
    private static readonly Cover Vent = new()
    {
        Name = "Vent",
        Level = Examples.Mill.Site.DesignFloodLevel - 1,
        Material = new LibraryMaterial("s235"),
        Pressing = CoverPressing.Unseating,
        Fasteners = new CoverFasteners { Pitch = 0.1, Tension = 2000, Source = "Approval" },
    };

    [Fact]
    public async Task Show_WithoutCovers_SaysWhatACoverIsAndAddsOne()
    {
        var page = await ShowAsync(Examples.Mill);
        Assert.Contains("No covers yet", page.Find("[data-testid=no-covers]").TextContent, StringComparison.Ordinal);

        page.Find("[data-testid=add-cover]").Click();

        Assert.Equal("Cover 1", Assert.Single(Editor.Project.Covers).Name);
        Assert.Contains("svg", page.Find("[data-testid=cover-drawing]").InnerHtml, StringComparison.Ordinal);
        Assert.Contains("Incomplete. Of what is checked", page.Find("[data-testid=cover-verdict]").TextContent, StringComparison.Ordinal);
        Assert.Contains("Enter the tension", page.Find("[data-testid=cover-gaps]").TextContent, StringComparison.Ordinal);
        Editor.Undo();
        Assert.Empty(Editor.Project.Covers);
    }

    [Fact]
    public async Task Type_Thickness_FiguresFollowAndSavesInTheProject()
    {
        var page = await ShowAsync(Examples.Mill with { Covers = [Vent] });
        var before = Editor.CoverAt(0)!.Governing!.Utilisation;

        Type(page, "thickness", "10 mm");

        Assert.Equal(0.01, Editor.Project.Covers[0].Thickness, tolerance: 1e-12);
        Assert.True(Editor.CoverAt(0)!.Checks[0].Utilisation < before);
        Assert.Contains(page.FindAll("[data-testid=cover-bending] [data-testid=step]"), step => step.TextContent.Contains('σ'));
    }

    [Fact]
    public async Task Choose_CircleAndBack_KeepsWhatWasTyped()
    {
        var page = await ShowAsync(Examples.Mill with { Covers = [Vent] });
        Type(page, "width", "0.77");

        page.FindAll("[data-testid=field-shape] input")[1].Change(true);
        Assert.Equal(new CircleCover(), Editor.Project.Covers[0].Plate);
        Type(page, "diameter", "0.5");
        page.FindAll("[data-testid=field-shape] input")[0].Change(true);

        Assert.Equal(new RectangleCover { Width = 0.77 }, Editor.Project.Covers[0].Plate);
        page.FindAll("[data-testid=field-shape] input")[1].Change(true);
        Assert.Equal(new CircleCover { Diameter = 0.5 }, Editor.Project.Covers[0].Plate);
    }

    [Fact]
    public async Task DuplicateAndDelete_SecondCover_SelectionFollows()
    {
        var page = await ShowAsync(Examples.Mill with { Covers = [Vent] });

        page.Find("button[aria-label='Duplicate Vent']").Click();
        Assert.Equal(["Vent", "Vent (copy)"], Editor.Project.Covers.Select(c => c.Name));
        Assert.Equal("Vent (copy)", page.Find("[data-testid=field-name]").GetAttribute("value"));
        page.Find("button[aria-label='Delete Vent (copy)']").Click();

        Assert.Equal("Vent", Assert.Single(Editor.Project.Covers).Name);
        Assert.Equal("Vent", page.Find("[data-testid=field-name]").GetAttribute("value"));
    }

    [Fact]
    public async Task Show_CoverWithAProblem_SentenceInsteadOfFigures()
    {
        var page = await ShowAsync(Examples.Mill with { Covers = [Vent with { Name = "" }] });

        Assert.Contains("Name of the cover is empty", page.Find("[data-testid=cover-problem]").TextContent, StringComparison.Ordinal);
        Assert.Empty(page.FindAll("[data-testid=cover-results]"));
    }

    private static void Type(IRenderedComponent<PageHost> page, string field, string text) =>
        page.Find($"[data-testid=field-{field}]").Input(text);

    private async Task<IRenderedComponent<PageHost>> ShowAsync(Project project)
    {
        var id = await PutAsync(project);
        var page = Show<CoversPage>(p => p.Add(x => x.Id, id));
        page.WaitForElement("[data-testid=add-cover]");
        return page;
    }
}
