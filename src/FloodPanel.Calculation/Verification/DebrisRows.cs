using FloodPanel.Calculation.Actions.Debris;

namespace FloodPanel.Calculation.Verification;

/// <summary>Debris.</summary>
internal static class DebrisRows
{
    private const string Fema = "FEMA P-55 (2011), Eq. 8.9, applied in a public specification";
    private const string Spread = "454 kg at 2 m/s by several methods";
    private const string Spectrum = "Half-sine response spectrum, undamped";

    public static IEnumerable<VerificationRow> Rows() => [.. Impact(), .. Spectra()];

    private static IEnumerable<VerificationRow> Impact()
    {
        var mass = Units.ToSI(1000, Dimension.Mass, UnitSystem.USCustomary);
        var velocity = Math.Sqrt(32.2 * 4) / 2 * Printed.Foot;
        return
        [
            new(Fema, "1000 lb at ½·√(g·d_s) in 4 ft, C_D 0.75, concrete wall", "lb", "3405", Printed.Pounds(DebrisComparison.FemaForce(mass, velocity, 0.75, 0.8)), Evidence.Secondary),
            new(Fema, "the same, timber pile", "lb", "851", Printed.Pounds(DebrisComparison.FemaForce(mass, velocity, 0.75, 0.2)), Evidence.Secondary),
            new(Spread, "stopped in 1 s", "kN", "0.9", Printed.Kilo(DebrisComparison.EvenStop(454, 2, 1)), Evidence.Derived),
            new(Spread, "stopped in 0.5 s", "kN", "1.8", Printed.Kilo(DebrisComparison.EvenStop(454, 2, 0.5)), Evidence.Derived),
            new(Spread, "ASCE 7, C_D 0.5, Δt 0.03 s, R_max 0.8, C_O 0.8", "kN", "15.2", Printed.Kilo(DebrisImpact.Force(454, 2, 0.03, 0.5 * 0.8 * 0.8)), Evidence.Derived),
            new(Spread, "FEMA P-55, C_D 0.75, concrete wall", "kN", "17.5", Printed.Kilo(DebrisComparison.FemaForce(454, 2, 0.75, 0.8)), Evidence.Derived),
            new("ASCE 7, C5.4.5 (secondary source)", "C_D at 2 ft", "", "0.25", DebrisTables.ShallowDepth(2 * Printed.Foot), Evidence.Secondary),
            new("ASCE 7, C5.4.5 (secondary source)", "C_D at 4 ft", "", "0.75", DebrisTables.ShallowDepth(4 * Printed.Foot), Evidence.Secondary),
        ];
    }

    private static IEnumerable<VerificationRow> Spectra()
    {
        string[] exact =
        [
            "0.396", "0.770", "1.102", "1.373", "1.571", "1.690", "1.750", "1.768", "1.759", "1.732", "1.694", "1.649", "1.600", "1.550",
        ];
        return exact.Select((published, i) => new VerificationRow(
            Spectrum, FormattableString.Invariant($"R_max at Δt/T_n = {(i + 1) / 10.0:0.0}"), "", published,
            ResponseRatio.HalfSine((i + 1) / 10.0), Evidence.Derived));
    }
}
