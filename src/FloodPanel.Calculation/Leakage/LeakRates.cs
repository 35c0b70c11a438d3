using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Leakage;

/// <summary>A published leak rate.</summary>
/// <param name="Words">Where it stands and what it is of.</param>
/// <param name="Rate">q [m³/s per m].</param>
/// <param name="Convention">What it is per metre of.</param>
public sealed record LeakRate(string Words, double Rate, LeakConvention Convention);

/// <summary>Leak rates that published tests allow.</summary>
public static class LeakRates
{
    private const double LitrePerHour = 1e-3 / 3600;

    /// <summary>The rates, the strictest first.</summary>
    public static ValueList<LeakRate> All { get; } =
    [
        new("PAS 1188:2014 and BS 851188-1:2019, aperture (secondary source): 0.5 L/h", 0.5 * LitrePerHour, LeakConvention.Width),
        new("PAS 1188 before 2014, aperture: 1 L/h", LitrePerHour, LeakConvention.Width),
        new("ANSI/FM 2510, opening barrier (from memory): 1 L/h", LitrePerHour, LeakConvention.Seal),
        new("BS 851188-2:2019, perimeter barrier (from memory): 40 L/h", 40 * LitrePerHour, LeakConvention.Width),
    ];
}
