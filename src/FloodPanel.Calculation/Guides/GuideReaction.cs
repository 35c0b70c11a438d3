using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Guides;

/// <summary>What a guide receives.</summary>
/// <param name="Reaction">R, design reaction of the whole stack [N].</param>
/// <param name="PeakLineReaction">n, greatest design reaction of one log per length of guide [N/m].</param>
public readonly record struct GuideResponse(double Reaction, double PeakLineReaction);

/// <summary>What a debris impact does to a guide: the whole of it once, and its share on one log [N].</summary>
/// <param name="Force">F, design force [N].</param>
/// <param name="Share">P, design share of one log [N].</param>
/// <param name="StruckLogs">Logs from the bottom that may be struck [-].</param>
public readonly record struct GuideImpact(double Force, double Share, int StruckLogs);

/// <summary>Reaction of a stack of logs on the guide at its end.</summary>
public static class GuideReaction
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Statics: half of the clear bay and the end bearing load the guide";

    /// <summary>R = Σ w·(b/2 + e) + F and n = max(w·(b/2 + e) + P)/t.</summary>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="tributary">b/2 + e, half of the clear bay and the end bearing [m].</param>
    /// <param name="logHeight">t, height of a log along the guide [m], > 0.</param>
    /// <param name="impact">Debris, or nothing.</param>
    public static GuideResponse Of(
        ReadOnlySpan<FactoredLoad> logLoads, double tributary, double logHeight, GuideImpact impact = default)
    {
        var sum = 0.0;
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
        }

        var peak = PeakLog(logLoads, tributary, impact);
        var greatest = peak < 0 ? 0 : End(logLoads, peak, tributary, impact);
        return new(sum * tributary + impact.Force, greatest / logHeight);
    }

    /// <summary>How a guide's reactions came about.</summary>
    /// <param name="response">What the guide receives.</param>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="logHeight">t, height of a log along the guide [m].</param>
    /// <param name="impact">Debris, or nothing.</param>
    internal static Working Explain(
        GuideResponse response,
        ReadOnlySpan<FactoredLoad> logLoads,
        double clearBay,
        double endBearing,
        double logHeight,
        GuideImpact impact)
    {
        var sum = 0.0;
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
        }

        var peak = PeakLog(logLoads, clearBay / 2 + endBearing, impact);
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
            steps.Given("P", impact.Share, Dimension.Force);
        }

        steps.Given("t", logHeight, Dimension.SectionLength);
        steps.Add("n", struck ? "(w_max·(b/2 + e) + P)/t" : "w_max·(b/2 + e)/t", response.PeakLineReaction, Dimension.LineForce);
        return new("Guide reaction", Source, steps.Done());
    }

    /// <summary>The log that presses hardest on the guide, from 0; −1 where none presses towards the protected side.</summary>
    private static int PeakLog(ReadOnlySpan<FactoredLoad> logLoads, double tributary, GuideImpact impact)
    {
        var (peak, greatest) = (-1, 0.0);
        for (var log = 0; log < logLoads.Length; log++)
        {
            var end = End(logLoads, log, tributary, impact);
            if (end > greatest)
            {
                (peak, greatest) = (log, end);
            }
        }

        return peak;
    }

    private static double End(ReadOnlySpan<FactoredLoad> logLoads, int log, double tributary, GuideImpact impact) =>
        logLoads[log].Design * tributary + (log < impact.StruckLogs ? impact.Share : 0);
}
