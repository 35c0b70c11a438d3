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

        var row = ratio / Step;
        if (row >= Table.Length - 1)
        {
            return Table[^1];
        }

        var (below, part) = ((int)row, row - (int)row);
        return Table[below] + part * (Table[below + 1] - Table[below]);
    }

    /// <summary>R_max of an undamped oscillator under a half-sine pulse, exact [-].</summary>
    /// <param name="ratio">r = Δt/T_n [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The ratio is negative or not finite.</exception>
    /// <remarks>
    /// With β = 1/(2r): up to r = 1/2 the greatest response comes after the pulse, 2β/(β² − 1)·cos(π·r), π/2 at r = 1/2;
    /// above, within it, the greatest sin(2π·n·β/(1 + β))/(1 − β) over n up to (1 + β)/(2β). Source: first principles.
    /// </remarks>
    public static double HalfSine(double ratio)
    {
        Guard.NonNegative(ratio);

        if (ratio == 0)
        {
            return 0;
        }

        var beta = 1 / (2 * ratio);
        if (Math.Abs(beta - 1) < 1e-7)
        {
            return Math.PI / 2;
        }

        if (beta > 1)
        {
            return 2 * beta / (beta * beta - 1) * Math.Cos(Math.PI * ratio);
        }

        var greatest = 0.0;
        for (var n = 1; n <= (1 + beta) / (2 * beta); n++)
        {
            greatest = Math.Max(greatest, Math.Sin(2 * Math.PI * n * beta / (1 + beta)) / (1 - beta));
        }

        return greatest;
    }
}
