using MathNet.Numerics.RootFinding;

namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>Linear dispersion of regular waves, ω² = g·k·tanh(k·h).</summary>
public static class Dispersion
{
    /// <summary>Source of the relation, as printed.</summary>
    public const string Source = "Linear wave theory (USACE EM 1110-2-1100, II-1)";

    /// <summary>Relative, on x·tanh(x).</summary>
    private const double Accuracy = 1e-12;

    /// <summary>k, wave number [rad/m].</summary>
    /// <param name="period">T, wave period [s], > 0.</param>
    /// <param name="depth">h, still-water depth [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite and above zero.</exception>
    /// <remarks>
    /// x·tanh(x) = ω²·h/g for x = k·h, solved by a bracketed Newton iteration. Since x/(1 + x) ≤ tanh(x) ≤ min(1, x), the
    /// root lies between the larger of y and √y, the deep and shallow limits, and their sum, y being the right-hand side.
    /// In deep water the lower end is the root itself, so that no depth is too deep for the iteration.
    /// Limits: height small against length and depth; no current.
    /// </remarks>
    public static double WaveNumber(double period, double depth)
    {
        Guard.Positive(period);
        Guard.Positive(depth);

        var frequency = 2 * Math.PI / period;
        var y = frequency * frequency * depth / Physics.Gravity;
        var root = RobustNewtonRaphson.FindRoot(
            x => x * Math.Tanh(x) / y - 1,
            x => (Math.Tanh(x) + x * (1 - Math.Tanh(x) * Math.Tanh(x))) / y,
            Math.Max(y, Math.Sqrt(y)),
            y + Math.Sqrt(y),
            Accuracy);
        return root / depth;
    }

    /// <summary>L_0 = g·T²/(2·π), wave length in deep water [m].</summary>
    /// <param name="period">T, wave period [s], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The period is not finite and above zero.</exception>
    public static double DeepWaterLength(double period)
    {
        Guard.Positive(period);

        return Physics.Gravity * period * period / (2 * Math.PI);
    }
}
