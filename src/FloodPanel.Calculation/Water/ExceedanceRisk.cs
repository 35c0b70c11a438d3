using System.Globalization;

namespace FloodPanel.Calculation.Water;

/// <summary>The risk that a level is exceeded at least once in a number of years.</summary>
public static class ExceedanceRisk
{
    private static readonly (double Share, string Words)[] Likely =
    [
        (1.0 / 3, "1 in 3"), (2.0 / 5, "2 in 5"), (1.0 / 2, "1 in 2"), (3.0 / 5, "3 in 5"), (2.0 / 3, "2 in 3"), (3.0 / 4, "3 in 4"),
        (4.0 / 5, "4 in 5"), (9.0 / 10, "9 in 10"),
    ];

    /// <summary>R = 1 − (1 − p)ⁿ [-].</summary>
    /// <param name="probability">p, annual exceedance probability [-], 0 to 1.</param>
    /// <param name="years">n, number of years, ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: independent years (common practice). Limits: a probability that stays what it is.</remarks>
    public static double Of(double probability, double years)
    {
        Guard.InRange(probability, 0, 1);
        Guard.NonNegative(years);

        return 1 - Math.Pow(1 - probability, years);
    }

    /// <summary>The risk in words, "about 1 in 4 over 30 years".</summary>
    /// <param name="probability">p, annual exceedance probability [-], 0 to 1.</param>
    /// <param name="years">n, number of years, ≥ 0.</param>
    /// <remarks>
    /// Up to 2 in 7, 1 in a whole number of at most two figures that matter; above, the nearest of the fractions that people
    /// say; "almost certain" from 0.95.
    /// </remarks>
    public static string InWords(double probability, double years)
    {
        var risk = Of(probability, years);
        var span = years == 1 ? "in a year" : $"over {years.ToString("0.##", CultureInfo.InvariantCulture)} years";
        return risk switch
        {
            0 => $"none {span}",
            >= 0.95 => $"almost certain {span}",
            > 2.0 / 7 => $"about {Likely.MinBy(l => Math.Abs(l.Share - risk)).Words} {span}",
            _ => $"about 1 in {TwoFigures(1 / risk)} {span}",
        };
    }

    private static string TwoFigures(double number)
    {
        var size = Math.Pow(10, Math.Max(0, Math.Floor(Math.Log10(number)) - 1));
        return (Math.Round(number / size) * size).ToString("0", CultureInfo.InvariantCulture);
    }
}
