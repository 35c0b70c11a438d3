using System.Globalization;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>One guide under one load case: its loads, and the lines of working that checks share.</summary>
internal sealed class GuideCase
{
    /// <summary>Fasteners whose loads differ by this share are equally loaded [-].</summary>
    private const double Rounding = 1e-9;

    private readonly OpeningModel model;
    private readonly FactoredLoad[] logLoads;
    private readonly int bay;
    private readonly GuideImpact impact;
    private readonly int peakLog;

    public GuideCase(OpeningModel model, GuideSet guides, CaseKind kind, CaseEvaluation numbers, bool isRight)
    {
        bay = isRight ? model.Bays.Count - 1 : 0;
        (this.model, Guides, Member) = (model, guides, isRight ? "right guide" : "left guide");
        PeakLine = (isRight ? numbers.RightGuide : numbers.LeftGuide).PeakLineReaction;
        impact = CaseForces.OnGuide(model, kind, bay);
        logLoads = numbers.LogLoads.ToArray();
        Load = GuideLoad.Of(logLoads, model.GuideTributary(bay), model.LogHeights, impact);
        peakLog = Math.Max(0, GuideReaction.PeakLog(logLoads, model.GuideTributary(bay), model.LogHeights, impact));
        Row = FastenerRow.Of(Load.Length, guides.Fasteners.EndDistance, guides.Fasteners.Pitch);
        Statics = GuideStatics.Of(guides);
    }

    public GuideSet Guides { get; }

    public string Member { get; }

    public GuideLoad Load { get; }

    /// <summary>n, greatest load of one log per length of guide [N/m].</summary>
    public double PeakLine { get; }

    public FastenerRow Row { get; }

    public GuideStatics Statics { get; }

    /// <summary>R, load on the stretch that a fastener holds [N].</summary>
    public double OnFastener(int index) => Row.Stretch(index) is var (from, to) ? Load.Over(from, to) : 0;

    /// <summary>The fastener for which a figure is greatest, from 0; the lowest of those that are equal but for rounding.</summary>
    public int Worst(Func<int, double> figure)
    {
        double[] figures = [.. Enumerable.Range(0, Row.Count).Select(figure)];
        var least = figures.Max() * (1 - Rounding);
        return Array.FindIndex(figures, value => value >= least);
    }

    /// <summary>b, e, w, P, h and n, the greatest line load.</summary>
    public void ExplainPeak(StepList steps)
    {
        var height = model.LogHeights[peakLog];
        steps.Given("b", model.Bays[bay], Dimension.Length);
        steps.Given("e", model.EndBearing, Dimension.SectionLength);
        steps.Given("w", logLoads[peakLog].Design, Dimension.LineForce);
        if (Load.IsStruck(peakLog))
        {
            steps.Given("P", impact.On(peakLog, height), Dimension.Force);
        }

        steps.Given("h", height, Dimension.SectionLength);
        steps.Add("n", Load.IsStruck(peakLog) ? "(w·(b/2 + e) + P)/h" : "w·(b/2 + e)/h", PeakLine, Dimension.LineForce);
    }

    /// <summary>Where a fastener stands, the stretch that it holds, and R, the load on it.</summary>
    public void ExplainFastener(StepList steps, int index)
    {
        var (from, to) = Row.Stretch(index);
        steps.Given("H", Row.Length, Dimension.Length);
        steps.Given("e_1", Row.EndDistance, Dimension.SectionLength);
        steps.Given("N", Row.Spaces, Dimension.Count);
        steps.Add("s", "(H − 2·e_1)/N", Row.Spacing, Dimension.SectionLength);
        steps.Given("k", index, Dimension.Count);
        steps.Add("y", "e_1 + k·s", Row.Position(index), Dimension.Length);
        Limit(steps, "y_1", index == 0 ? "" : "y − s/2", from);
        Limit(steps, "y_2", index == Row.Spaces ? "H" : "y + s/2", to);
        steps.Given("b", model.Bays[bay], Dimension.Length);
        steps.Given("e", model.EndBearing, Dimension.SectionLength);
        ExplainLoad(steps, from, to);
    }

    private static void Limit(StepList steps, string symbol, string formula, double value) =>
        steps.Add(symbol, formula, value, Dimension.Length);

    private void ExplainLoad(StepList steps, double from, double to)
    {
        var (steady, struck) = (new List<string>(), new List<string>());
        for (var log = 0; log < Load.LogCount; log++)
        {
            if (Load.Within(log, from, to) > 0)
            {
                var length = ExplainLog(steps, log, from, to);
                steady.Add($"n_{Number(log)}·{length}");
                if (Load.IsStruck(log))
                {
                    struck.Add($"P_{Number(log)}·{length}/h_{Number(log)}");
                }
            }
        }

        var formula = string.Join(" + ", steady);
        if (struck.Count > 0)
        {
            steps.Given("F", Load.Force, Dimension.Force);
            formula += $" + min(F, {string.Join(" + ", struck)})";
        }

        steps.Add("R", formula, Load.Over(from, to), Dimension.Force);
    }

    /// <summary>One log on the stretch; returns the symbol of the length on which it presses.</summary>
    private string ExplainLog(StepList steps, int log, double from, double to)
    {
        var (number, height, length) = (Number(log), model.LogHeights[log], Load.Within(log, from, to));
        steps.Given($"w_{number}", logLoads[log].Design, Dimension.LineForce);
        steps.Given($"h_{number}", height, Dimension.SectionLength);
        steps.Add($"n_{number}", $"w_{number}·(b/2 + e)/h_{number}", logLoads[log].Design * model.GuideTributary(bay) / height, Dimension.LineForce);
        if (Load.IsStruck(log))
        {
            steps.Given($"P_{number}", impact.On(log, height), Dimension.Force);
        }

        if (Load.Edge(log) >= from && Load.Edge(log + 1) <= to)
        {
            return $"h_{number}";
        }

        steps.Given($"z_{number}", Load.Edge(log), Dimension.Length);
        steps.Add($"l_{number}", $"min(y_2, z_{number} + h_{number}) − max(y_1, z_{number})", length, Dimension.Length);
        return $"l_{number}";
    }

    private static string Number(int log) => (log + 1).ToString(CultureInfo.InvariantCulture);
}
