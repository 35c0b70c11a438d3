using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Verification;

/// <summary>Local buckling, skin, timber factors and shear deflection of logs.</summary>
internal static class LogRows
{
    private const string Tube = "Aluminum Design Manual 2020, Part VII, Example 4: tube 3 × 3 × 0.095 in of 6063-T6";
    private const string Beam = "Aluminum Design Manual 2020, Part VII, Example 26: I-beam of 6061-T6";
    private const string Ribbed = "EN 1999-1-1: ribbed log 200 × 50 of 6060 T66, face of class 4";
    private const string Plank = "EN 1995-1-1: plank of C24, 75 × 200, short term, service class 3";
    private const double Inch = 0.0254;
    private const double Modulus = 10_100 * AluminiumBuckling.Ksi;

    public static IEnumerable<VerificationRow> Rows() => [.. Tubes(), .. Beams(), .. Log(), .. Timber()];

    private static IEnumerable<VerificationRow> Tubes()
    {
        var alloy = new Material
        {
            Family = MaterialFamily.Aluminium,
            ElasticModulus = Modulus,
            BendingStrength = 25 * AluminiumBuckling.Ksi,
            UltimateStrength = 30 * AluminiumBuckling.Ksi,
        };
        var resistance = Resistance(alloy, new RectangularTube { Height = 3 * Inch, Depth = 3 * Inch, Wall = 0.095 * Inch }, DesignBases.AllowableStress);
        return
        [
            new(Tube, "flange b/t", "", "29.6", Step(resistance, "λ_f"), Evidence.Read),
            new(Tube, "allowable stress of the flange", "ksi", "14.0", Ksi(Step(resistance, "F_c")) / 1.65, Evidence.Read),
            new(Tube, "allowable stress of the webs", "ksi", "22.7", Ksi(Step(resistance, "F_b")) / 1.65, Evidence.Read),
            new(Tube, "allowable moment at rupture", "in·kip", "18.5", InchKips(Step(resistance, "M_u")), Evidence.Read),
            new(Tube, "allowable moment with local buckling", "in·kip", "17.3", InchKips(resistance.Moment), Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Beams()
    {
        var yield = 35 * AluminiumBuckling.Ksi;
        return
        [
            new(Beam, "flange b/t 6.0: allowable stress", "ksi", "21.2", Ksi(AluminiumBuckling.Compression(yield, Modulus, true, false).Stress(6.0)) / 1.65, Evidence.Read),
            new(Beam, "web 29.1: allowable stress in bending", "ksi", "31.8", Ksi(AluminiumBuckling.WebBending(yield, Modulus).Stress(29.1)) / 1.65, Evidence.Read),
            new(Beam, "web 29.1: allowable stress in shear", "ksi", "12.7", Ksi(AluminiumBuckling.WebShear(29.1, yield, Modulus)) / 1.65, Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Log()
    {
        var alloy = new Material
        {
            Family = MaterialFamily.Aluminium,
            ElasticModulus = 70e9,
            BendingStrength = 160e6,
            BucklingClass = BucklingClass.A,
        };
        var profile = new HollowRectangle { Height = 0.2, Depth = 0.05, Face = 0.003, Web = 0.0085 / 3, Webs = 3 };
        var resistance = Resistance(alloy, profile, DesignBases.Eurocode);
        return
        [
            new(Ribbed, "effective over full thickness of the face", "", "0.916", Step(resistance, "ρ_f"), Evidence.Derived),
            new(Ribbed, "second moment, effective", "mm⁴", "696283", 1e12 * Step(resistance, "I_eff"), Evidence.Derived),
            new(Ribbed, "section modulus, effective", "mm³", "27045", 1e9 * Step(resistance, "W_eff"), Evidence.Derived),
            new(Ribbed, "moment resistance", "kN·m", "3.93", Printed.Kilo(resistance.Moment), Evidence.Derived),
            new(Ribbed, "skin between ribs under 8 kPa", "MPa", "6.1", SkinCheck.Stress(8000, ThinWalls.Of(profile)!.FacePart, 0.003, false) / 1e6, Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> Timber()
    {
        var timber = new Material { Family = MaterialFamily.Timber, BendingStrength = 24e6, ShearStrength = 4e6, CharacteristicDensity = 350 };
        var (profile, stack) = (new Rectangle { Height = 0.2, Depth = 0.075 }, new LogStack { Timber = new() });
        var section = SectionProperties.Of(profile);
        var (bending, shear) = (LogStress.Bending(timber, profile, stack, DesignBases.Eurocode)!, LogStress.Shear(timber, profile, stack, DesignBases.Eurocode)!);
        return
        [
            new(Plank, "depth factor", "", "1.149", TimberFactors.Depth(0.075, 350), Evidence.Derived),
            new(Plank, "design bending strength", "MPa", "14.84", bending.Value / 1e6, Evidence.Derived),
            new(Plank, "shear resistance with cracks", "kN", "14.4", Printed.Kilo(shear.Value * section.ShearArea), Evidence.Derived),
            new(Plank, "shear deflection, 1.8 kN/m over 1.2 m, G 690 MPa", "mm", "0.04", 1e3 * ShearDeflection.Uniform(1800, 1.2, 690e6 * 5 * section.Area / 6), Evidence.Derived),
        ];
    }

    private static WallResistance Resistance(Material alloy, Profile profile, DesignBasis basis) => LocalBuckling.Of(
        new(alloy, profile, SectionProperties.Of(profile), DesignStress.Bending(alloy, basis), null, 200), basis).Resistance!;

    private static double Step(WallResistance resistance, string symbol) => resistance.Steps.First(s => s.Symbol == symbol).Value;

    private static double Ksi(double stress) => stress / AluminiumBuckling.Ksi;

    private static double InchKips(double moment) => moment / (AluminiumBuckling.Ksi * Inch * Inch * Inch);
}
