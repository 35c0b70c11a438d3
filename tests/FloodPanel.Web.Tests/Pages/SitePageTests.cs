using Bunit;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Levels;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Pages;

public class SitePageTests : PageContext
{
    [Fact]
    public async Task Type_Levels_SumFollowsEachKey()
    {
        var page = await ShowAsync(Examples.Mill);

        Type(page, "designStillWaterLevel", "12.4");
        Type(page, "surge", "0.25");
        Type(page, "climateAllowance", "0.1");

        // 12.40 + 0.25 + 0.10 = 12.75; freeboard 0.20 makes 12.95.
        Assert.Equal("12.750 m", page.Find("[data-testid=design-flood-level]").TextContent);
        Assert.Equal("12.950 m", page.Find("[data-testid=required-top]").TextContent);
        Assert.Equal(1.35, Editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
    }

    [Fact]
    public async Task Type_WithAUnitBehind_IsTakenInThatUnit()
    {
        var page = await ShowAsync(Examples.Mill);

        Type(page, "freeboard", "1 ft");

        Assert.Equal(0.3048, Editor.Project.Site.Freeboard, tolerance: 1e-12);
    }

    [Fact]
    public async Task Type_SomethingThatIsNotAllowed_KeepsTheLastGoodValueAndSaysWhatIs()
    {
        var page = await ShowAsync(Examples.Mill);

        Type(page, "freeboard", "77");
        await page.Find("[data-testid=field-freeboard]").BlurAsync();

        Assert.Equal(0.2, Editor.Project.Site.Freeboard);
        Assert.Contains("Freeboard is 77 m; allowed is", page.Find("[data-testid=problem-freeboard]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Levels_Interpolated_AreTakenOverWithOneClick()
    {
        var mill = Examples.Mill with
        {
            Site = Examples.Mill.Site with { Levels = [new LevelPoint(0.1, 11.9), new LevelPoint(0.01, 12.35)], AnnualProbability = 0.01 },
        };
        var page = await ShowAsync(mill);
        Assert.Empty(page.FindAll("[data-testid=use-level]"));

        Type(page, "annualProbability", "1 in 50");
        page.Find("[data-testid=use-level]").Click();

        Assert.Equal((0.02, 12.216), (Editor.Project.Site.AnnualProbability, Editor.Project.Site.DesignStillWaterLevel));
        Assert.Contains("0.02 the table gives 12.216 m", page.Find("[data-testid=interpolated]").TextContent, StringComparison.Ordinal);
        Assert.Contains("about 1 in 2 over 30 years", page.Find("[data-testid=risk]").TextContent, StringComparison.Ordinal);
        Assert.Empty(page.FindAll("[data-testid=use-level]"));
    }

    [Fact]
    public async Task Levels_DesignProbabilityOutsideThem_SaysThatNothingIsExtrapolated()
    {
        var page = await ShowAsync(Examples.Mill with { Site = Examples.Mill.Site with { Levels = [new LevelPoint(0.1, 11.9), new LevelPoint(0.02, 12.1)] } });

        Assert.Contains("nothing is extrapolated", page.Find("[data-testid=interpolated]").TextContent, StringComparison.Ordinal);
        Assert.Empty(page.FindAll("[data-testid=use-level]"));
    }

    [Fact]
    public async Task Climate_RateOverTheDesignLife_RaisesTheDesignLevel()
    {
        var page = await ShowAsync(Examples.Mill);

        Type(page, "climateRatePerYear", "5");
        Type(page, "designLifeYears", "40");

        Assert.Equal("12.550 m", page.Find("[data-testid=design-flood-level]").TextContent);
    }

    [Fact]
    public async Task Basis_CopiedAndAdjusted_ChangesTheDesignLoads()
    {
        var page = await ShowAsync(Examples.Mill);
        Assert.Contains("fk/1.65", page.Find("[data-testid=factors]").TextContent, StringComparison.Ordinal);
        var before = Editor.ResultFor("garage")!.Cases[0].Logs[0].LineLoad;

        page.Find("[data-testid=copy-basis]").Click();
        Type(page, "ownBasis.floodSide", "1.3");

        Assert.Equal("Allowable stress, adjusted", Editor.Project.OwnBasis!.Title);
        Assert.Equal(1.3 * before, Editor.ResultFor("garage")!.Cases[0].Logs[0].LineLoad, tolerance: 1e-9 * before);
        page.Find("[data-testid=drop-basis]").Click();
        Assert.Null(Editor.Project.OwnBasis);
        Assert.Equal(before, Editor.ResultFor("garage")!.Cases[0].Logs[0].LineLoad);
    }

    [Fact]
    public async Task Basis_AnotherRuleSet_DropsTheCopyAndUndoBringsItBack()
    {
        var page = await ShowAsync(Examples.Mill);
        page.Find("[data-testid=copy-basis]").Click();
        Type(page, "ownBasis.debris", "1.2");

        page.FindAll("[data-testid=field-designBasis] input")[2].Change(true);
        Assert.Equal((DesignBasisKind.Eurocode, null), (Editor.Project.DesignBasis, Editor.Project.OwnBasis));
        Editor.Undo();

        Assert.Equal(1.2, Editor.Project.OwnBasis!.Inland.Debris);
    }

    [Fact]
    public async Task Basis_WithoutATitle_SaysWhatIsWanted()
    {
        var page = await ShowAsync(Examples.Mill);
        page.Find("[data-testid=copy-basis]").Click();

        Type(page, "ownBasis.title", "");

        Assert.NotEmpty(page.Find("[data-testid='problem-ownBasis.title']").TextContent);
    }

    [Fact]
    public async Task Type_Job_IsKept()
    {
        var page = await ShowAsync(Examples.Mill);

        Type(page, "name", "Mill Lane 5");
        Type(page, "reference", "M-5");
        Type(page, "client", "Weir Trust");
        Type(page, "address", "5 Mill Lane");
        Type(page, "engineer", "A. Engineer");
        Type(page, "datum", "brass bolt");

        var project = Editor.Project;
        Assert.Equal(("Mill Lane 5", "M-5", "Weir Trust"), (project.Name, project.Reference, project.Client));
        Assert.Equal(("5 Mill Lane", "A. Engineer", "brass bolt"), (project.Address, project.Engineer, project.Site.Datum));
    }

    [Fact]
    public async Task Choose_Sea_SetsTheDensity()
    {
        var page = await ShowAsync(Examples.Mill);

        page.FindAll("[data-testid=field-waterKind] input")[1].Change("on");

        Assert.Equal(1025, Editor.Project.Site.WaterDensity);
        Assert.Equal("1025", page.Find("[data-testid=field-waterDensity]").GetAttribute("value"));
    }

    [Fact]
    public async Task Undo_AfterTyping_BringsTheFieldBack()
    {
        var page = await ShowAsync(Examples.Mill);
        Type(page, "surge", "0.2");
        Type(page, "surge", "0.25");

        await page.InvokeAsync(Editor.Undo);

        Assert.Equal("0", page.Find("[data-testid=field-surge]").GetAttribute("value"));
        Assert.Equal("12.350 m", page.Find("[data-testid=design-flood-level]").TextContent);
    }

    [Fact]
    public async Task KnownLevels_AddedAndUsed_SetLevelAndProbability()
    {
        var page = await ShowAsync(Examples.Mill);

        page.FindAll("button").First(b => b.TextContent.Trim() == "Add level").Click();
        page.Find("[data-testid='field-levels[0].annualProbability']").Input("0.005");
        page.Find("[data-testid='field-levels[0].level']").Input("12.6");
        page.Find("[aria-label='Design for level 1']").Click();

        Assert.Equal((12.6, 0.005), (Editor.Project.Site.DesignStillWaterLevel, Editor.Project.Site.AnnualProbability));
        page.Find("[aria-label='Delete level 1']").Click();
        Assert.Empty(Editor.Project.Site.Levels);
    }

    [Fact]
    public async Task Conflict_SavedElsewhere_OffersBothChoices()
    {
        var id = await PutAsync(Examples.Mill);
        Navigation.NavigateTo($"/projects/{id}/site");
        var page = Show<SitePage>(p => p.Add(s => s.Id, id));
        await Store.SaveAsync(id, 1, Examples.Mill with { Client = "Theirs" }, Xunit.TestContext.Current.CancellationToken);
        Type(page, "client", "Mine");
        await page.InvokeAsync(Editor.SaveNowAsync);

        var notice = page.WaitForElement("[data-testid=conflict]");
        Assert.Equal(["Save mine as a copy", "Reload theirs, drop mine"], notice.QuerySelectorAll("button").Select(b => b.TextContent.Trim()));
        notice.QuerySelectorAll("button")[0].Click();

        page.WaitForAssertion(() => Assert.NotEqual(id, Editor.Id));
        Assert.Equal("Theirs", (await OpenAsync(id))!.Project.Client);
        Assert.Equal("Mine", (await OpenAsync(Editor.Id))!.Project.Client);
        Assert.EndsWith($"/projects/{Editor.Id}/site", Navigation.Uri, StringComparison.Ordinal);
    }

    private async Task<IRenderedComponent<PageHost>> ShowAsync(Project project)
    {
        var id = await PutAsync(project);
        return Show<SitePage>(p => p.Add(s => s.Id, id));
    }

    private static void Type(IRenderedComponent<PageHost> page, string field, string text) =>
        page.Find($"[data-testid='field-{field}']").Input(text);
}
