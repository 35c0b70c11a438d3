using System.Globalization;
using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

/// <summary>The actions of an opening: switched on, typed, switched off and on again.</summary>
public class LoadSectionTests : BenchContext
{
    private ActionSet Actions => Editor.Project.Openings[0].Actions;

    [Fact]
    public void Waves_SwitchedOn_BringTheirCaseWithItsDiagram()
    {
        var page = Open("garage");
        Assert.DoesNotContain("Wave", page.Find("[data-testid=cases]").TextContent);

        page.Find("[data-testid=switch-wave]").Change(true);
        ChooseCase(page, "Wave");

        Assert.Equal(2, Assert.IsType<BreakingWaveInput>(Actions.Wave).RiskCategory);
        Assert.Single(page.FindAll("[data-testid=resultant-wave]"));
        Assert.Single(page.FindAll("[data-testid=section] [data-part=action-wave]"));
        Assert.Empty(page.FindAll("[data-testid=resultant-flow]"));
    }

    [Fact]
    public void Waves_OtherKindAndBack_KeepWhatWasTyped()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wave]").Change(true);
        Choose(page, "wave.riskCategory", "3, many people");

        page.FindAll("[data-testid='field-wave.kind'] input")[1].Change(true);
        Field(page, "wave.height").Input("0.25");
        page.FindAll("[data-testid='field-wave.kind'] input")[0].Change(true);
        Assert.Equal(new BreakingWaveInput { RiskCategory = 3 }, Actions.Wave);
        page.FindAll("[data-testid='field-wave.kind'] input")[1].Change(true);

        Assert.Equal(0.25, Assert.IsType<NonBreakingWaveInput>(Actions.Wave).Height);
    }

    [Fact]
    public void Wave_HigherThanTheDepthAllows_IsNamedAndLeavesTheVerdictOpen()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wave]").Change(true);
        page.FindAll("[data-testid='field-wave.kind'] input")[1].Change(true);

        Field(page, "wave.height").Input("2");

        Assert.Contains("A wave of 2 m cannot stand in", page.Find("[data-testid=notes]").TextContent);
        Assert.Contains("wave", Editor.ResultFor("garage")!.Verdict.Missing);
    }

    [Fact]
    public void Debris_CoefficientByWords_WritesItsNumberAndShowsTheProduct()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-debris]").Change(true);

        Choose(page, "debris.importance.words", "Risk category 4");
        Choose(page, "debris.blockage.words", "Limited screening, path about 20 ft (6 m)");

        Assert.Equal((1.3, 0.6), (Actions.Debris!.Coefficients.Importance, Actions.Debris.Coefficients.Blockage));
        Assert.Equal("1.3", Field(page, "debris.importance").GetAttribute("value"));
        Assert.Contains("0.780", page.Find("[data-testid=debris-product]").TextContent);
    }

    [Fact]
    public void Debris_SwitchedOn_ShowsTheOtherMethodsAndItsArrow()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-debris]").Change(true);
        ChooseCase(page, "Debris");

        Assert.Equal(10, page.FindAll("[data-testid=debris-methods] tbody tr").Count);
        Assert.Single(page.FindAll("[data-testid=section] [data-part=action-debris]"));
        Assert.Contains("deflection is reported, not judged", page.Markup);
    }

    [Fact]
    public void Velocity_EstimateClicked_IsTakenOver()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-flow]").Change(true);

        page.FindAll("[data-testid=flow-estimate] button")[1].Click();

        var depth = Editor.Project.Site.DesignFloodLevel - Editor.Project.Openings[0].SillLevel;
        Assert.Equal(Math.Sqrt(9.80665 * depth), Actions.Flow!.Velocity, tolerance: 0.005);
        Assert.Equal(Actions.Flow.Velocity.ToString(CultureInfo.InvariantCulture), Field(page, "flow.velocity").GetAttribute("value"));
    }

    [Fact]
    public void WindAndLine_SwitchedOffAndOn_AreWhatTheyWere()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wind]").Change(true);
        page.Find("[data-testid=switch-line]").Change(true);
        Field(page, "wind.pressure").Input("1.1");
        Field(page, "line.height").Input("0.6");

        page.Find("[data-testid=switch-wind]").Change(false);
        page.Find("[data-testid=switch-line]").Change(false);
        Assert.Equal((null, null), (Actions.Wind, Actions.Line));
        page.Find("[data-testid=switch-wind]").Change(true);
        page.Find("[data-testid=switch-line]").Change(true);

        Assert.Equal((1100, 0.6), (Actions.Wind!.Pressure, Actions.Line!.Height));
        Assert.Equal(["Design flood", "Brim-full, governs", "Wind", "Line load"],
            page.FindAll("[data-testid=cases] label").Select(l => l.TextContent.Trim()));
    }

    [Fact]
    public void LineLoad_AboveTheBarrier_IsRefusedAtItsField()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-line]").Change(true);

        Field(page, "line.height").Input("1.5");

        Assert.Contains("allowed is up to the top of the barrier, 1.200 m", page.Find("[data-testid='problem-line.height']").TextContent);
    }

    [Fact]
    public void Members_EachCase_NameTheGoverningOne()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wave]").Change(true);

        page.Find("[data-testid=governs-post-1]").Click();

        Assert.Contains("Wave", page.Find("[data-testid=member-post-1]").TextContent);
        Assert.Contains("Post 1, wave case", page.Find("[data-testid=working]").TextContent);
    }

    [Fact]
    public void Section_Bench_ReadsOutThePressure() =>
        Assert.Contains(Open("garage").FindAll("[data-testid=section] .fp-mark-reading title"), t => t.TextContent.EndsWith("above the sill", StringComparison.Ordinal));

    private static void ChooseCase(IRenderedComponent<FloodPanel.Web.Pages.Bench.BenchPage> page, string words) =>
        page.FindAll("[data-testid=cases] label").First(l => l.TextContent.Contains(words, StringComparison.Ordinal)).QuerySelector("input")!.Change(true);
}
