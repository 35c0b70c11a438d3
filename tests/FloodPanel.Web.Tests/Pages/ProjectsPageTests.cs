using System.Text;
using AngleSharp.Dom;
using Bunit;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage.ProjectFile;
using FloodPanel.Web.Pages.Projects;
using FloodPanel.Web.Tests.Bench;
using Microsoft.AspNetCore.Components.Forms;

namespace FloodPanel.Web.Tests.Pages;

public class ProjectsPageTests : PageContext
{
    [Fact]
    public void Render_NoProjects_SaysWhatToDo()
    {
        var page = Show<ProjectsPage>();

        Assert.Contains("No projects yet.", page.Markup, StringComparison.Ordinal);
        Assert.NotNull(page.FindAll("button").Single(b => b.TextContent.Contains("New project", StringComparison.Ordinal)));
    }

    [Fact]
    public async Task Render_Projects_NewestFirstWithOpenings()
    {
        await PutAsync(Examples.Mill with { Reference = "M-4" });
        Time.Advance(TimeSpan.FromMinutes(1));
        await PutAsync(new Project { Name = "Quay 2" });

        var page = Show<ProjectsPage>();

        Assert.Equal(["Quay 2", "Mill Lane 4"], Names(page));
        Assert.Contains("M-4", Rows(page)[1].TextContent, StringComparison.Ordinal);
        Assert.Equal("2", Rows(page)[1].QuerySelector("td[data-label=Openings]")!.TextContent);
    }

    [Fact]
    public async Task Search_PartOfTheClient_LeavesTheProjectsThatMentionIt()
    {
        await PutAsync(Examples.Mill with { Client = "Weir Trust" });
        await PutAsync(new Project { Name = "Quay 2" });
        var page = Show<ProjectsPage>();

        await page.Find("input[type=search]").InputAsync("weir");
        page.WaitForAssertion(() => Assert.Equal(["Mill Lane 4"], Names(page)));
        await page.Find("input[type=search]").InputAsync("nothing like it");

        page.WaitForAssertion(() => Assert.Contains("No project mentions “nothing like it”", page.Markup, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Sort_ByName_ThenTurnedRound()
    {
        foreach (var name in new[] { "b", "C", "a" })
        {
            await PutAsync(new Project { Name = name });
        }

        var page = Show<ProjectsPage>();

        SortButton(page, "Project").Click();
        Assert.Equal(["a", "b", "C"], Names(page));
        SortButton(page, "Project").Click();
        Assert.Equal(["C", "b", "a"], Names(page));
        Assert.Equal("descending", SortButton(page, "Project").ParentElement!.GetAttribute("aria-sort"));
    }

    [Fact]
    public async Task Delete_ThenUndo_BringsTheProjectBack()
    {
        var id = await PutAsync(Examples.Mill);
        var page = Show<ProjectsPage>();

        await page.Find("[aria-label='Delete Mill Lane 4']").ClickAsync();
        page.WaitForAssertion(() => Assert.Empty(page.FindAll("[data-testid=project-row]")));
        Assert.Null(await OpenAsync(id));
        await page.FindAll("button").Single(b => b.TextContent.Trim() == "Undo").ClickAsync();

        page.WaitForAssertion(() => Assert.Equal(["Mill Lane 4"], Names(page)));
    }

    [Fact]
    public async Task Duplicate_Project_AddsACopy()
    {
        await PutAsync(Examples.Mill);
        var page = Show<ProjectsPage>();

        await page.Find("[aria-label='Duplicate Mill Lane 4']").ClickAsync();

        page.WaitForAssertion(() => Assert.Equal(["Mill Lane 4", "Mill Lane 4 (copy)"], Names(page).Order()));
    }

    [Fact]
    public async Task New_Name_CreatesAProjectAndGoesToItsSite()
    {
        var page = Show<ProjectsPage>();

        ClickNew(page);
        page.WaitForElement("form#new-project input").Input("Mill Lane 4");
        await page.Find("form#new-project").SubmitAsync();

        var created = Assert.Single(await ListAsync());
        Assert.Equal("Mill Lane 4", created.Name);
        Assert.EndsWith($"/projects/{created.Id}/site", Navigation.Uri, StringComparison.Ordinal);
    }

    [Fact]
    public async Task New_WithoutAName_SaysThatItIsNeeded()
    {
        var page = Show<ProjectsPage>();

        ClickNew(page);
        await page.WaitForElement("form#new-project").SubmitAsync();

        Assert.Contains("Project name is empty", page.Find("[role=alert]").TextContent, StringComparison.Ordinal);
        Assert.Empty(await ListAsync());
    }

    [Fact]
    public async Task Import_OwnExport_OpensTheSameProject()
    {
        var page = Show<ProjectsPage>();

        Upload(page, "mill.json", ProjectFileWriter.Write(Examples.Mill));

        page.WaitForAssertion(() => Assert.Contains("/openings", Navigation.Uri, StringComparison.Ordinal));
        var row = Assert.Single(await ListAsync());
        Assert.Equal(Examples.Mill, (await OpenAsync(row.Id))!.Project);
    }

    [Fact]
    public async Task Import_FileThatIsRefused_ListsEveryProblemAndStoresNothing()
    {
        var page = Show<ProjectsPage>();

        Upload(page, "bad.json", """{"format":"floodpanel-project","version":1,"name":"x","colour":1,"site":{"datum":3}}"""u8.ToArray());

        var list = page.WaitForElement("[data-testid=import-result] ul");
        Assert.Equal(["site.datum", "site.designStillWaterLevel", "colour"], list.QuerySelectorAll("code").Select(c => c.TextContent));
        Assert.All(list.QuerySelectorAll("li span"), s => Assert.EndsWith(".", s.TextContent, StringComparison.Ordinal));
        Assert.Empty(await ListAsync());
    }

    [Fact]
    public async Task Import_FileThatCannotBeCalculatedYet_IsStoredAndItsProblemsAreListed()
    {
        var page = Show<ProjectsPage>();

        Upload(page, "narrow.json", ProjectFileWriter.Write(Examples.Mill with { Openings = [Examples.Door with { ClearWidth = 0.01 }] }));

        var list = page.WaitForElement("[data-testid=import-result] ul");
        Assert.Contains("openings[0].clearWidth", list.QuerySelectorAll("code").Select(c => c.TextContent));
        Assert.Single(await ListAsync());
    }

    [Fact]
    public void Import_FileThatIsTooLarge_SaysHowLargeItMayBe()
    {
        var page = Show<ProjectsPage>();

        Upload(page, "large.json", Encoding.UTF8.GetBytes(new string(' ', ProjectFileReader.LargestFile + 1)));

        Assert.Contains("at most 4 MB", page.WaitForElement("[data-testid=import-result]").TextContent, StringComparison.Ordinal);
    }

    private static IReadOnlyList<IElement> Rows(IRenderedComponent<PageHost> page) => page.FindAll("[data-testid=project-row]");

    private static IEnumerable<string> Names(IRenderedComponent<PageHost> page) => Rows(page).Select(r => r.QuerySelector("th")!.TextContent);

    private static IElement SortButton(IRenderedComponent<PageHost> page, string title) =>
        page.FindAll("button.sort").Single(b => b.TextContent.StartsWith(title, StringComparison.Ordinal));

    // Not awaited: the click ends when the dialog does.
    private static void ClickNew(IRenderedComponent<PageHost> page) =>
        page.FindAll("button").First(b => b.TextContent.Trim() == "New project").Click();

    private static void Upload(IRenderedComponent<PageHost> page, string name, byte[] content) =>
        page.FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromBinary(content, name));
}
