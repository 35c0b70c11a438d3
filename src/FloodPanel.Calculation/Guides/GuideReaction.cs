using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;

namespace FloodPanel.Calculation.Guides;

/// <summary>What a guide receives.</summary>
/// <param name="Reaction">R, design reaction of the whole stack [N].</param>
/// <param name="PeakLineReaction">n, greatest design reaction of one log per length of guide [N/m].</param>
public readonly record struct GuideResponse(double Reaction, double PeakLineReaction);

/// <summary>What a debris impact does to a guide: the whole of it once, and a share of it on each log that is struck.</summary>
/// <param name="Force">F, design force [N].</param>
/// <param name="StruckLogs">Logs from the bottom that may be struck [-].</param>
public readonly record struct GuideImpact(double Force, int StruckLogs)
{
    /// <summary>P, design force on a log of the stack [N].</summary>
    /// <param name="log">Position from 0.</param>
    /// <param name="height">t, its height along the guide [m].</param>
    public double On(int log, double height) => log < StruckLogs ? Force * DebrisModel.Share(height) : 0;
}

/// <summary>Reaction of a stack of logs on the guide at its end.</summary>
public static class GuideReaction
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Statics: half of the clear bay and the end bearing load the guide";

    /// <summary>R = Σ w·(b/2 + e) + F and n = max((w·(b/2 + e) + P)/t).</summary>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="tributary">b/2 + e, half of the clear bay and the end bearing [m].</param>
    /// <param name="logHeights">t, height of each log along the guide [m], > 0.</param>
    /// <param name="impact">Debris, or nothing.</param>
    public static GuideResponse Of(
        ReadOnlySpan<FactoredLoad> logLoads, double tributary, ReadOnlySpan<double> logHeights, GuideImpact impact = default)
    {
        var sum = 0.0;
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
        }

        var peak = PeakLog(logLoads, tributary, logHeights, impact);
        return new(sum * tributary + impact.Force, peak < 0 ? 0 : LineReaction(logLoads, peak, tributary, logHeights, impact));
    }

    /// <summary>How a guide's reactions came about.</summary>
    /// <param name="response">What the guide receives.</param>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="logHeights">t, height of each log along the guide [m].</param>
    /// <param name="impact">Debris, or nothing.</param>
    internal static Working Explain(
        GuideResponse response,
        ReadOnlySpan<FactoredLoad> logLoads,
        double clearBay,
        double endBearing,
        ReadOnlySpan<double> logHeights,
        GuideImpact impact)
    {
        var sum = 0.0;
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
        }

        var peak = PeakLog(logLoads, clearBay / 2 + endBearing, logHeights, impact);
        var steps = new StepList(9);
        steps.Given("b", clearBay, Dimension.Length);
        steps.Given("e", endBearing, Dimension.SectionLength);
        steps.Given("w_sum", sum, Dimension.LineForce);
        if (impact.Force != 0)
        {
            steps.Given("F", impact.Force, Dimension.Force);
        }

        steps.Add("R", impact.Force == 0 ? "w_sum·(b/2 + e)" : "w_sum·(b/2 + e) + F", response.Reaction, Dimension.Force);
        steps.Given("w_max", peak < 0 ? 0 : logLoads[peak].Design, Dimension.LineForce);
        var struck = peak >= 0 && peak < impact.StruckLogs;
        if (struck)
        {
            steps.Given("P", impact.On(peak, logHeights[peak]), Dimension.Force);
        }

        steps.Given("t", logHeights[Math.Max(0, peak)], Dimension.SectionLength);
        steps.Add("n", struck ? "(w_max·(b/2 + e) + P)/t" : "w_max·(b/2 + e)/t", response.PeakLineReaction, Dimension.LineForce);
        return new("Guide reaction", Source, steps.Done());
    }

    /// <summary>The log that presses hardest on the guide, from 0; −1 where none presses towards the protected side.</summary>
    internal static int PeakLog(
        ReadOnlySpan<FactoredLoad> logLoads, double tributary, ReadOnlySpan<double> logHeights, GuideImpact impact)
    {
        var (peak, greatest) = (-1, 0.0);
        for (var log = 0; log < logLoads.Length; log++)
        {
            var end = LineReaction(logLoads, log, tributary, logHeights, impact);
            if (end > greatest)
            {
                (peak, greatest) = (log, end);
            }
        }

        return peak;
    }

    /// <summary>n, design reaction of one log per length of guide [N/m].</summary>
    private static double LineReaction(
        ReadOnlySpan<FactoredLoad> logLoads, int log, double tributary, ReadOnlySpan<double> logHeights, GuideImpact impact) =>
        (logLoads[log].Design * tributary + impact.On(log, logHeights[log])) / logHeights[log];
}
