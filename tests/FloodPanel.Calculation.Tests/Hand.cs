namespace FloodPanel.Calculation.Tests;

/// <summary>Comparison with arithmetic done by hand: closed forms agree to rounding.</summary>
internal static class Hand
{
    /// <summary>Relative tolerance of a closed form against hand arithmetic [-].</summary>
    public const double Tolerance = 1e-9;

    public static void Equal(double expected, double actual) =>
        Assert.Equal(expected, actual, tolerance: Tolerance * Math.Abs(expected));
}
