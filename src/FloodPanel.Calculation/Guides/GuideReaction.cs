using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Guides;

/// <summary>What a guide receives.</summary>
/// <param name="Reaction">R, design reaction of the whole stack [N].</param>
/// <param name="PeakLineReaction">n, greatest design reaction of one log per length of guide [N/m].</param>
public readonly record struct GuideResponse(double Reaction, double PeakLineReaction);

/// <summary>Reaction of a stack of logs on the guide at its end.</summary>
public static class GuideReaction
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Statics: half of the clear bay and the end bearing load the guide";

    /// <summary>R = Σ w·(b/2 + e) and n = max w·(b/2 + e)/t.</summary>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="tributary">b/2 + e, half of the clear bay and the end bearing [m].</param>
    /// <param name="logHeight">t, height of a log along the guide [m], > 0.</param>
    public static GuideResponse Of(ReadOnlySpan<FactoredLoad> logLoads, double tributary, double logHeight)
    {
        var (sum, peak) = (0.0, 0.0);
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
            peak = Math.Max(peak, load.Design);
        }

        return new(sum * tributary, peak * tributary / logHeight);
    }

    /// <summary>How a guide's reactions came about.</summary>
    /// <param name="response">What the guide receives.</param>
    /// <param name="logLoads">w, line load of each log [N/m].</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="logHeight">t, height of a log along the guide [m].</param>
    internal static Working Explain(
        GuideResponse response,
        ReadOnlySpan<FactoredLoad> logLoads,
        double clearBay,
        double endBearing,
        double logHeight)
    {
        var (sum, peak) = (0.0, 0.0);
        foreach (ref readonly var load in logLoads)
        {
            sum += load.Design;
            peak = Math.Max(peak, load.Design);
        }

        return new("Guide reaction", Source,
        [
            new("b", "", clearBay, Dimension.Length),
            new("e", "", endBearing, Dimension.SectionLength),
            new("w_sum", "", sum, Dimension.LineForce),
            new("R", "w_sum·(b/2 + e)", response.Reaction, Dimension.Force),
            new("w_max", "", peak, Dimension.LineForce),
            new("t", "", logHeight, Dimension.SectionLength),
            new("n", "w_max·(b/2 + e)/t", response.PeakLineReaction, Dimension.LineForce),
        ]);
    }
}
