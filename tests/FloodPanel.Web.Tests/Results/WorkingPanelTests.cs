using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Tests.Results;

public class WorkingPanelTests : BunitContext
{
    private static readonly FigureKey Moment = new(Figures.LogBending, "M", "design-flood", 1, 1);

    private int closed;

    public WorkingPanelTests() => JSInterop.Mode = JSRuntimeMode.Loose;

    [Fact]
    public void Render_Check_ShowsEachStepWithFormulaNumbersAndResult()
    {
        var result = Examples.Result(Examples.Garage);
        var check = result.Cases[0].Logs[0].BendingCheck!;

        var panel = Show(result);

        Assert.Equal(check.Steps.Count, panel.FindAll("[data-testid=step]").Count);
        var load = Units.Format(check.Steps.First(s => s.Symbol == "w").Value, Dimension.LineForce, UnitSystem.SI);
        var asked = panel.Find(".step.asked");
        Assert.Contains($"= {load}·(1.640 m)²/8", asked.TextContent);
        Assert.Contains(Units.FormatNumber(check.Demand, Dimension.Moment, UnitSystem.SI), asked.TextContent);
        Assert.Contains(check.Source, panel.Find(".source").TextContent);
        Assert.Contains("Log 1, bay 1, design flood case", panel.Find(".working-where").TextContent);
        Assert.Contains("Passes", panel.Find(".outcome").TextContent);
    }

    [Fact]
    public void Render_GivenValue_HasNoFormula()
    {
        var panel = Show(Examples.Result(Examples.Garage));

        Assert.Single(panel.FindAll("[data-testid=step]")[0].QuerySelectorAll(".line"));
    }

    [Fact]
    public void Render_AfterAnEdit_FollowsTheNewResult()
    {
        var panel = Show(Examples.Result(Examples.Garage));

        panel.Render(p => p.Add(w => w.Key, Moment).Add(w => w.OnClose, () => closed++)
            .Add(w => w.Result, Examples.Result(Examples.Garage.WithLogs(logs => logs with { EndBearing = 0.05 }))));

        Assert.Contains("(1.650 m)²", panel.Find(".step.asked").TextContent);
    }

    [Fact]
    public void Render_FigureThatIsGone_ShowsNothing()
    {
        var panel = Render<WorkingPanel>(p => p.Add(w => w.Key, Moment with { Index = 9 })
            .Add(w => w.Result, Examples.Result(Examples.Garage)));

        Assert.Equal("", panel.Markup.Trim());
    }

    [Fact]
    public void Close_ByButtonOrEscape_IsRaised()
    {
        var panel = Show(Examples.Result(Examples.Garage));

        panel.Find("[data-testid=close-working]").Click();
        panel.Find("[role=dialog]").KeyDown(new KeyboardEventArgs { Key = "Escape" });

        Assert.Equal(2, closed);
    }

    [Fact]
    public void Render_Open_TakesTheFocus()
    {
        Show(Examples.Result(Examples.Garage));

        JSInterop.VerifyFocusAsyncInvoke();
    }

    [Fact]
    public void Render_FigureThatGoesAndComesBack_LeavesTheFocusAlone()
    {
        var panel = Show(Examples.Result(Examples.Garage));
        var key = Moment with { Index = 4 };
        panel.Render(p => p.Add(w => w.Key, key));
        panel.Render(p => p.Add(w => w.Result, Examples.Result(Examples.Garage.WithLogs(logs => logs with { Count = 2 }))));

        panel.Render(p => p.Add(w => w.Result, Examples.Result(Examples.Garage)));

        Assert.NotNull(panel.Find(".step.asked"));
        JSInterop.VerifyFocusAsyncInvoke(calledTimes: 2);
    }

    private IRenderedComponent<WorkingPanel> Show(OpeningResult result) => Render<WorkingPanel>(p => p
        .Add(w => w.Key, Moment).Add(w => w.Result, result).Add(w => w.OnClose, () => closed++));
}
