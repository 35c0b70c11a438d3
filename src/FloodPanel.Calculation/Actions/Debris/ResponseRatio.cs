namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>R_max, greatest elastic response to a half-sine impulse over the static one, by Δt/T_n.</summary>
public static class ResponseRatio
{
    /// <summary>Source of the table, as printed.</summary>
    public const string Source = "ASCE 7, Table C5.4-4 (from memory; within 0.1 of the exact half-sine spectrum)";

    private const double Step = 0.1;

    private static readonly double[] Table = [0, .4, .8, 1.1, 1.4, 1.5, 1.7, 1.8, 1.8, 1.8, 1.7, 1.7, 1.6, 1.6, 1.5];

    /// <summary>R_max of the table, straight between its rows [-]; 1.5 from 1.4 on.</summary>
    /// <param name="ratio">Δt/T_n, impact duration over natural period [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is negative or not finite.</exception>
    public static double Of(double ratio)
    {
        Guard.NonNegative(ratio);

        return RowAt(ratio) is { } row
            ? row.Response + (row.Next - row.Response) * (ratio - row.Ratio) / Step
            : Table[^1];
    }

    /// <summary>R_max of an undamped oscillator under a half-sine pulse, exact [-].</summary>
    /// <param name="ratio">r = Δt/T_n [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is negative or not finite.</exception>
    /// <remarks>
    /// Up to r = 1/2 the greatest response comes after the pulse, 4·r/(1 − 4·r²)·cos(π·r), π/2 at r = 1/2; above, within it,
    /// the greatest 2·r/(2·r − 1)·sin(2·π·n/(2·r + 1)) over whole n from 1 to r + 1/2. Source: first principles.
    /// </remarks>
    public static double HalfSine(double ratio)
    {
        Guard.NonNegative(ratio);

        return IsHalf(ratio) ? Math.PI / 2
            : ratio < 0.5 ? 4 * ratio / (1 - 4 * ratio * ratio) * Math.Cos(Math.PI * ratio)
            : 2 * ratio / (2 * ratio - 1) * Math.Sin(2 * Math.PI * Peak(ratio) / (2 * ratio + 1));
    }

    /// <summary>The formula behind <see cref="HalfSine"/>, written with a symbol for the ratio.</summary>
    internal static string HalfSineFormula(double ratio, string symbol) =>
        IsHalf(ratio) ? "π/2"
        : ratio < 0.5 ? $"4·{symbol}/(1 − 4·{symbol}²)·cos(π·{symbol})"
        : FormattableString.Invariant($"2·{symbol}/(2·{symbol} − 1)·sin(2·π·{Peak(ratio):0}/(2·{symbol} + 1))");

    /// <summary>The row of the table at or below a ratio, with the response of the next; null from the last row on.</summary>
    internal static (double Ratio, double Response, double Next)? RowAt(double ratio)
    {
        var row = ratio / Step;
        return row < Table.Length - 1 ? ((int)row * Step, Table[(int)row], Table[(int)row + 1]) : null;
    }

    // Nearer to 1/2 than this the formula on either side is 0/0 but for rounding.
    private static bool IsHalf(double ratio) => Math.Abs(ratio - 0.5) < 1e-7;

    /// <summary>n of the greatest peak: the sine is greatest next to a quarter turn, n = (2·r + 1)/4.</summary>
    private static double Peak(double ratio)
    {
        var quarter = (2 * ratio + 1) / 4;
        var (below, above) = (Math.Max(1, Math.Floor(quarter)), Math.Ceiling(quarter));
        double Height(double n) => Math.Sin(2 * Math.PI * n / (2 * ratio + 1));
        return Height(below) >= Height(above) ? below : above;
    }
}
