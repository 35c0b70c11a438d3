using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class LeakageSectionTests : BenchContext
{
    private LeakageInput? Leakage => Editor.Project.Openings[0].Leakage;

    [Fact]
    public void Switch_On_ShowsLeakAndPumpAndTheCaution()
    {
        var page = Open("garage");
        Assert.Empty(page.FindAll("[data-testid=leakage]"));

        page.Find("[data-testid=switch-leakage]").Change(true);

        // 3.3 m of clear width at 1 L/h per m, and half as much again for the pump.
        Assert.Equal("3.30", Text(page, "leak"));
        Assert.Equal("4.95", Text(page, "pump"));
        Assert.Contains("drains, vents and cavities", page.Find("[data-testid=notes]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Published_Rate_WritesRateAndConvention()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-leakage]").Change(true);

        Choose(page, "leakage.published", "ANSI/FM 2510, opening barrier (from memory): 1 L/h");

        Assert.Equal(LeakConvention.Seal, Leakage!.Convention);
    }

    [Fact]
    public void Rain_Typed_RaisesThePumpAndOpensItsWorking()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-leakage]").Change(true);

        Field(page, "leakage.rainIntensity").Input("50");
        Field(page, "leakage.rainArea").Input("20");
        Field(page, "leakage.sumpVolume").Input("100");
        page.Find("[data-testid=pump]").Click();

        Assert.Equal("1350", Text(page, "pump"));
        Assert.Equal("7 min", Text(page, "time-to-fill"));
        Assert.Contains("Leakage, rain and pump", page.Find("[data-testid=working]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void BackFlow_Confirmed_CautionGoes()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-leakage]").Change(true);

        page.Find("[data-testid=leakage-back-flow]").Change(true);

        Assert.True(Leakage!.BackFlowClosed);
        Assert.DoesNotContain(Editor.ResultFor("garage")!.Notes, note => note.Code == "back-flow-open");
    }
}
