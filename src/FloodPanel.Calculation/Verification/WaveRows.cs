using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Verification;

/// <summary>Waves. Sources that work with g = 9.81 are driven with a unit weight and a period that make γ and g·T² theirs.</summary>
internal static class WaveRows
{
    private const double SourceGravity = 9.81;
    private const string Manual = "USACE EM 1110-2-1100, II-1 (2002), Example II-1-1";
    private const string Aces = "USACE ACES User's Guide (1992), Example 4-3";
    private const string Goda = "Goda 1985, public test set of a coastal research institute";
    private const string GodaDerived = "Goda without a mound, h 1.0 m, H_max 0.54 m, T 3 s";
    private const string Sainflou = "Sainflou, linearised, the same wave";
    private const string Asce = "ASCE 7, 5.4.4.2; FEMA P-55 (2011), Eq. 8.6";

    private static readonly double PeriodRatio = Math.Sqrt(SourceGravity / Physics.Gravity);

    public static IEnumerable<VerificationRow> Rows() => [.. Length(), .. Standing(), .. Caisson(), .. NoMound(), .. Breaking(), .. Cut()];

    private static IEnumerable<VerificationRow> Length()
    {
        const string remark = "The page rounds from tables of d/L and is inconsistent with itself (53.2 and 53.3 m)";
        var length = 2 * Math.PI / Dispersion.WaveNumber(10, 3);
        return
        [
            new(Manual, "wave length, 10 s in 3 m", "m", "53.2", length, Evidence.Read, 0.001, remark),
            new(Manual, "depth over length", "", "0.05641", 3 / length, Evidence.Read, 0.001, remark),
            new(Manual, "celerity", "m/s", "5.32", length / 10, Evidence.Read, 0.001, remark),
        ];
    }

    private static IEnumerable<VerificationRow> Standing()
    {
        const string remark = "Printed by integrating the exact pressure; the straight-line diagram used here is 1.6 % high";
        var (depth, weight) = (15 * Printed.Foot, Printed.PerCubicFoot(64));
        var number = Dispersion.WaveNumber(10, depth);
        var wave = SainflouWave.Of(8 * Printed.Foot, number, depth, weight);
        return
        [
            new(Aces, "wave length, 10 s in 15 ft", "ft", "212.9", 2 * Math.PI / number / Printed.Foot, Evidence.Secondary),
            new(Aces, "Sainflou crest force with still water", "lb/ft", "17724.17", Printed.PoundsPerFoot(wave.CrestForce + weight * depth * depth / 2), Evidence.Secondary, 0.017, remark),
        ];
    }

    private static IEnumerable<VerificationRow> Caisson() =>
    [
        .. Caisson("(a)", 5.07, 2.75, "52.9407", "466.22", 2e-4, "The source rounds H_s in h_b"),
        .. Caisson("(b)", 3.60, 2.0, "35.403", "288.01", 0, ""),
    ];

    private static IEnumerable<VerificationRow> Caisson(
        string name, double height, double significant, string pressure, string force, double explained, string remark)
    {
        var depths = new WaveDepths(Wall: 5, Foot: 6, Berm: 4, Seaward: 5 + 5 * significant / 100);
        var wave = GodaWave.Of(height, 8 * PeriodRatio, 0, 1025 * SourceGravity, depths);
        var diagram = PressureDiagram.Of(
            new(-6, 0, wave.AtFoot, wave.AtStillWater, 1), new(0, wave.Crest, wave.AtStillWater, 0, 1));
        return
        [
            new(Goda, $"{name} pressure at still water", "kPa", pressure, Printed.Kilo(wave.AtStillWater), Evidence.Read, explained, remark),
            new(Goda, $"{name} force on the wall", "kN/m", force, Printed.Kilo(diagram.Within(-6, 5).Characteristic), Evidence.Read, explained, remark),
        ];
    }

    private static IEnumerable<VerificationRow> NoMound()
    {
        var wave = Wave(0);
        var oblique = Wave(15);
        var sainflou = SainflouWave.Of(0.54, wave.WaveNumber, 1, 1025 * SourceGravity);
        return
        [
            new(GodaDerived, "wave length", "m", "8.693", 2 * Math.PI / wave.WaveNumber, Evidence.Derived),
            new(GodaDerived, "α_1", "", "0.8601", wave.Alpha1, Evidence.Derived),
            new(GodaDerived, "α_3", "", "0.7857", wave.Alpha3, Evidence.Derived),
            new(GodaDerived, "η*", "m", "0.81", wave.Crest, Evidence.Derived),
            new(GodaDerived, "p_1", "kPa", "4.670", Printed.Kilo(wave.AtStillWater), Evidence.Derived),
            new(GodaDerived, "p_3", "kPa", "3.669", Printed.Kilo(wave.AtFoot), Evidence.Derived),
            new(GodaDerived, "p_4 at 0.30 m", "kPa", "2.940", Printed.Kilo(wave.At(0.30)), Evidence.Derived),
            new(GodaDerived, "force up to 0.30 m", "kN/m", "5.311", Printed.Kilo(Force(wave)), Evidence.Derived),
            new(GodaDerived, "p_1 at β = 15°", "kPa", "4.591", Printed.Kilo(oblique.AtStillWater), Evidence.Derived),
            new(GodaDerived, "force at β = 15°", "kN/m", "5.216", Printed.Kilo(Force(oblique)), Evidence.Derived),
            new(Sainflou, "set-up", "m", "0.170", sainflou.SetUp, Evidence.Derived),
            new(Sainflou, "p_1", "kPa", "5.948", Printed.Kilo(sainflou.AtStillWater), Evidence.Derived),
            new(Sainflou, "p_2", "kPa", "4.266", Printed.Kilo(sainflou.AtFoot), Evidence.Derived),
            new(Sainflou, "wave force at the crest", "kN/m", "7.22", Printed.Kilo(sainflou.CrestForce), Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> Breaking()
    {
        // Unit weight, depth and C_p of 1: what is left are the published coefficients themselves.
        var dry = Total(1, 1, 1, 3, 0).Force;
        var wet = Total(1, 1, 1, 3, 1).Force;
        var dynamic = Total(2, 1, 1, 3, 0).Force - dry;
        var weight = Printed.PerCubicFoot(64);
        var depth = 3.25 * Printed.Foot;
        const string rounded = "The standard rounds the areas 2.42 and 1.92 to 2.4 and 1.9";
        return
        [
            new(Asce, "coefficient of C_p·γ·d_s², from the integral", "", "1.1", dynamic, Evidence.Read),
            new(Asce, "coefficient of γ·d_s² with dry space behind", "", "2.4", dry - dynamic, Evidence.Read),
            new(Asce, "coefficient of γ·d_s² with equal water behind", "", "1.9", wet - dynamic, Evidence.Read),
            new(Asce, "total at C_p 2.8, d_s 3.25 ft, dry", "lb/ft", "3704", Printed.PoundsPerFoot(Total(2.8, weight, depth, 9, 0).Force), Evidence.Derived, 0.005, rounded),
            new(Asce, "the same with equal water behind", "lb/ft", "3366", Printed.PoundsPerFoot(Total(2.8, weight, depth, 9, depth).Force), Evidence.Derived, 0.005, rounded),
            new(Asce, "P_max at C_p 2.8", "psf", "832", Printed.Psf(BreakingWave.Pressure(2.8, weight, depth, 0).ToStillWater.AtTop), Evidence.Derived),
            new(Asce, "total at C_p 1.6, dry", "lb/ft", "2812", Printed.PoundsPerFoot(Total(1.6, weight, depth, 9, 0).Force), Evidence.Derived, 0.005, rounded),
        ];
    }

    private static IEnumerable<VerificationRow> Cut()
    {
        const string source = "Breaking wave integrated over the barrier, γ 10.05 kN/m³, d_s 0.9 m, C_p 2.8";
        var whole = Total(2.8, 10.05, 0.9, 3, 0);
        var cut = Total(2.8, 10.05, 0.9, 1.2, 0);
        return
        [
            new(source, "whole height: force", "kN/m", "44.77", whole.Force, Evidence.Derived),
            new(source, "whole height: centre", "m", "0.828", whole.CentreOfPressure!.Value, Evidence.Derived),
            new(source, "top 0.30 m above still water: force", "kN/m", "34.58", cut.Force, Evidence.Derived),
            new(source, "top 0.30 m above still water: centre", "m", "0.642", cut.CentreOfPressure!.Value, Evidence.Derived),
        ];
    }

    private static GodaWave Wave(double degrees) => GodaWave.Of(
        0.54, 3 * PeriodRatio, double.DegreesToRadians(degrees), 1025 * SourceGravity, new(1, 1, 1, 1));

    private static double Force(GodaWave wave) => PressureDiagram.Of(
        new(-1, 0, wave.AtFoot, wave.AtStillWater, 1),
        new(0, wave.Crest, wave.AtStillWater, 0, 1)).Within(-1, 0.30).Characteristic;

    private static PressureDiagram Total(double coefficient, double weight, double depth, double height, double behind)
    {
        var (toStillWater, toCrest) = BreakingWave.Pressure(coefficient, weight, depth, ground: 0);
        return PressureDiagram.Of(
            Hydrostatic.Side(weight, depth, height, 1),
            Hydrostatic.Side(weight, behind, height, 1).Opposite(),
            toStillWater.Within(0, height),
            toCrest.Within(0, height));
    }
}
