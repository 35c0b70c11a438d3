using System.Globalization;
using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Results;

public class LogLadderTests : BunitContext
{
    private readonly OpenFigure open = new();

    [Fact]
    public void Render_Stack_HasARowForEachLogWithTheTopLogOnTop()
    {
        var ladder = Show(Examples.Result(Examples.Garage));

        Assert.Equal(["6", "5", "4", "3", "2", "1"], ladder.FindAll("th[scope=row]").Select(cell => cell.TextContent));
    }

    [Fact]
    public void Render_Row_ShowsItsOwnNumbersInTheUnitsOfTheHead()
    {
        var result = Examples.Result(Examples.Garage);
        var log = result.Cases[0].Logs.First(l => l is { Bay: 1, Index: 2 });

        var ladder = Show(result);

        Assert.Equal(log.LineLoad / 1e3, Number(ladder, "load-log-2"), 0.005);
        Assert.Equal(log.Moment / 1e3, Number(ladder, "moment-log-2"), 0.005);
        Assert.Equal(log.Shear / 1e3, Number(ladder, "shear-log-2"), 0.005);
        Assert.Equal(log.Deflection * 1e3, Number(ladder, "deflection-log-2"), 0.005);
        Assert.Equal(["kN/m", "kN·m", "kN", "mm"], ladder.FindAll("thead .fp-unit").Select(unit => unit.TextContent));
    }

    [Fact]
    public void Render_InUS_FollowsTheReadersUnits()
    {
        var result = Examples.Result(Examples.Garage);

        var ladder = Show(result, units: UnitSystem.USCustomary);

        Assert.Equal(["lbf/ft", "lbf·ft", "lbf", "in"], ladder.FindAll("thead .fp-unit").Select(unit => unit.TextContent));
        Assert.Equal(
            Units.FormatNumber(result.Cases[0].Logs[0].LineLoad, Dimension.LineForce, UnitSystem.USCustomary),
            Figure(ladder, "load-log-1"));
    }

    [Fact]
    public void Render_Utilisation_IsThatOfTheWorstCheck()
    {
        var result = Examples.Result(Examples.Garage);
        var log = result.Cases[0].Logs[0];
        var worst = new[] { log.BendingCheck!, log.ShearCheck!, log.DeflectionCheck! }.MaxBy(check => check.Utilisation)!;

        var ladder = Show(result);

        Assert.Equal(Units.FormatNumber(worst.Utilisation, Dimension.Ratio, UnitSystem.SI), Figure(ladder, "use-log-1"));
    }

    [Fact]
    public void Render_FailingLog_SaysSoInAWordAndAShape()
    {
        var weak = Examples.Garage.WithLogs(logs => logs with { Material = Examples.Aluminium with { AllowableBending = 5e6 } });

        var ladder = Show(Examples.Result(weak));

        var row = ladder.Find("[data-testid=log-1]");
        Assert.Contains("fails", row.ClassName);
        Assert.Equal("inadequate", row.QuerySelector("[data-testid=verdict]")!.GetAttribute("data-verdict"));
        Assert.NotNull(row.QuerySelector("[data-testid=verdict] svg"));
        Assert.Equal("adequate", ladder.Find("[data-testid=log-6] [data-testid=verdict]").GetAttribute("data-verdict"));
    }

    [Fact]
    public void Render_GoverningLog_IsMarkedAndNoOther()
    {
        var weak = Examples.Garage.WithLogs(logs => logs with { Material = Examples.Aluminium with { AllowableBending = 5e6 } });
        var result = Examples.Result(weak);
        var governing = Figures.Governing(result)!;
        var loadCase = result.Cases.First(c => c.Name == governing.Case);

        var ladder = Show(result, loadCase);

        Assert.Equal($"log-{governing.Index}", Assert.Single(ladder.FindAll("tr.governing")).GetAttribute("data-testid"));
        Assert.Equal("governs", ladder.Find("tr.governing .use-check b").TextContent);
        Assert.Contains("bending", ladder.Find("tr.governing .use-check").TextContent);
    }

    [Fact]
    public void Click_OnANumber_OpensItsWorkingAndClosesItAgain()
    {
        var ladder = Show(Examples.Result(Examples.Garage));

        ladder.Find("[data-testid=moment-log-3]").Click();

        Assert.Equal(new FigureKey("log-bending", "M", "design-flood", 3, 1), open.Key);

        ladder.Find("[data-testid=moment-log-3]").Click();

        Assert.Null(open.Key);
    }

    [Fact]
    public void Render_Number_IsAButtonThatSaysWhatItIs()
    {
        var result = Examples.Result(Examples.Garage);

        var button = Show(result).Find("[data-testid=moment-log-3]");

        Assert.Equal("BUTTON", button.TagName);
        var moment = Units.Format(result.Cases[0].Logs[2].Moment, Dimension.Moment, UnitSystem.SI);
        Assert.Equal($"Moment of log 3, {moment}, show the working", button.GetAttribute("aria-label"));
    }

    [Fact]
    public void Render_LogWithoutDesignStress_StillShowsItsMomentWithItsWorking()
    {
        var unknown = Examples.Garage.WithLogs(logs => logs with { Material = Examples.Aluminium with { AllowableBending = null } });

        var ladder = Show(Examples.Result(unknown));

        Assert.NotEqual("", Figure(ladder, "moment-log-3"));
        ladder.Find("[data-testid=moment-log-3]").Click();
        Assert.Equal("Moment in the log", Figures.Find(Examples.Result(unknown), open.Key!)!.Title);
    }

    private IRenderedComponent<LogLadder> Show(OpeningResult result, CaseResult? loadCase = null, UnitSystem units = UnitSystem.SI) =>
        Render<LogLadder>(p => p.Add(l => l.Case, loadCase ?? result.Cases[0]).Add(l => l.Bay, 1)
            .Add(l => l.Height, result.BarrierHeight).Add(l => l.Governing, Figures.Governing(result))
            .AddCascadingValue(units).AddCascadingValue(open));

    private static double Number(IRenderedComponent<LogLadder> ladder, string name) =>
        double.Parse(Figure(ladder, name), CultureInfo.InvariantCulture);

    private static string Figure(IRenderedComponent<LogLadder> ladder, string name) =>
        ladder.Find($"[data-testid={name}]").TextContent;
}
