using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Verification;

/// <summary>Logs, posts and the stresses that they may carry.</summary>
internal static class MemberRows
{
    private const string Aluminum = "Aluminum Design Manual 2020, Part VII";
    private const string Timber = "EN 1995-1-1, 2.4.1 with EN 338 and k_mod 0.70";
    private const string Aisc = "AISC Manual, Table 3-23 (formulas worked with round figures)";
    private const string Roark = "Roark's Formulas, Table 8.1 (load rising to the tip)";
    private const string Ribbed = "Ribbed log 200 × 50, faces 3 mm, ribs 8.5 mm in all";
    private const string Post = "Post under 1.2 m of fresh water, tributary 2.0 m";

    public static IEnumerable<VerificationRow> Rows() => [.. Stresses(), .. Beams(), .. Cantilevers(), .. Log(), .. FreshWater()];

    private static IEnumerable<VerificationRow> Stresses() =>
    [
        Yield("6061-T6", 35, "21.2"),
        Yield("6063-T6", 25, "15.2"),
        .. Class("C16", 16, 3.2, "8.62", "1.72"),
        .. Class("C24", 24, 4.0, "12.92", "2.15"),
        .. Class("D30", 30, 3.9, "16.15", "2.10"),
    ];

    private static VerificationRow Yield(string alloy, double ksi, string published)
    {
        var material = new Material
        {
            Family = MaterialFamily.Aluminium,
            BendingStrength = Units.ToSI(ksi, Dimension.Stress, UnitSystem.USCustomary),
        };
        var stress = DesignStress.Bending(material, DesignBases.AllowableStress)!.Value;
        return new(Aluminum, $"allowable stress at yield of {alloy}", "ksi", published, Printed.US(stress, Dimension.Stress), Evidence.Read);
    }

    private static IEnumerable<VerificationRow> Class(string name, double bendingMpa, double shearMpa, string bending, string shear)
    {
        var timber = new Material { Family = MaterialFamily.Timber, BendingStrength = bendingMpa * 1e6, ShearStrength = shearMpa * 1e6 };
        var basis = DesignBases.Eurocode;
        return
        [
            new(Timber, $"design bending strength of {name}", "MPa", bending, DesignStress.Bending(timber, basis)!.Value / 1e6, Evidence.Secondary),
            new(Timber, $"design shear strength of {name}", "MPa", shear, DesignStress.Shear(timber, basis)!.Value / 1e6, Evidence.Secondary),
        ];
    }

    private static IEnumerable<VerificationRow> Beams() =>
    [
        new(Aisc, "case 1, w 6 kN/m, l 2.5 m: moment", "kN·m", "4.6875", Printed.Kilo(SimpleBeam.Moment(6000, 2.5)), Evidence.Memory),
        new(Aisc, "case 1: reaction", "kN", "7.5", Printed.Kilo(SimpleBeam.Shear(6000, 2.5)), Evidence.Memory),
        new(Aisc, "case 1, E·I 50 kN·m²: deflection", "mm", "61.035", 1e3 * SimpleBeam.Deflection(6000, 2.5, 50e3), Evidence.Memory),
        new(Aisc, "case 7, P 8 kN, l 3 m: moment", "kN·m", "6", Printed.Kilo(SimpleBeam.PointMoment(8000, 3)), Evidence.Memory),
        new(Aisc, "case 7, E·I 50 kN·m²: deflection", "mm", "90", 1e3 * SimpleBeam.PointDeflection(8000, 3, 50e3), Evidence.Memory),
    ];

    private static IEnumerable<VerificationRow> Cantilevers()
    {
        var triangle = Respond(new(0, 1.2, 12e3, 0, 1), 2, 1.2, 200e3);
        var uniform = Respond(new(0, 1.2, 12e3, 12e3, 1), 2, 1.2, 200e3);
        var rising = Respond(new(0, 2, 0, 6e3, 1), 1.5, 2, 300e3);
        return
        [
            new(Aisc, "case 18, 24 kN/m falling to the tip, 1.2 m: base moment", "kN·m", "5.76", Printed.Kilo(triangle.BaseMoment), Evidence.Memory),
            new(Aisc, "case 18, E·I 200 kN·m²: tip", "mm", "8.2944", 1e3 * triangle.TipDeflection, Evidence.Memory),
            new(Aisc, "case 19, 24 kN/m uniform: base moment", "kN·m", "17.28", Printed.Kilo(uniform.BaseMoment), Evidence.Memory),
            new(Aisc, "case 19: tip", "mm", "31.104", 1e3 * uniform.TipDeflection, Evidence.Memory),
            new(Roark, "9 kN/m at the tip, 2 m: base moment", "kN·m", "12", Printed.Kilo(rising.BaseMoment), Evidence.Memory),
            new(Roark, "E·I 300 kN·m²: tip", "mm", "44.0", 1e3 * rising.TipDeflection, Evidence.Memory),
        ];
    }

    private static IEnumerable<VerificationRow> Log()
    {
        var section = SectionProperties.Of(new HollowRectangle { Height = 0.2, Depth = 0.05, Face = 0.003, Web = 0.0085 / 3, Webs = 3 });
        return
        [
            new(Ribbed, "area", "mm²", "1574", section.Area * 1e6, Evidence.Derived),
            new(Ribbed, "second moment of area", "mm⁴", "723939", section.Inertia * 1e12, Evidence.Derived),
            new(Ribbed, "elastic modulus", "mm³", "28958", section.Modulus * 1e9, Evidence.Derived),
            new(Ribbed, "plastic modulus", "mm³", "32314", section.PlasticModulus * 1e9, Evidence.Derived),
            new(Ribbed, "deflection under 1.6 kN/m on 1.5 m, E 70 GPa", "mm", "2.08", 1e3 * SimpleBeam.Deflection(1600, 1.5, 70e9 * section.Inertia), Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> FreshWater()
    {
        var water = Hydrostatic.Side(Hydrostatic.UnitWeight(9810 / Physics.Gravity), 1.2, 1.2, 1);
        var post = Respond(water, 2, 1.2, 1e6);
        return
        [
            new(Post, "line load at the sill", "kN/m", "23.54", Printed.Kilo(2 * water.AtBottom), Evidence.Derived),
            new(Post, "base shear", "kN", "14.13", Printed.Kilo(post.BaseShear), Evidence.Derived),
            new(Post, "base moment", "kN·m", "5.65", Printed.Kilo(post.BaseMoment), Evidence.Derived),
        ];
    }

    private static PostResponse Respond(PressurePiece load, double tributary, double length, double stiffness)
    {
        var material = new Material { ElasticModulus = stiffness, Density = 1 };
        var section = SectionProperties.Of(new GivenProperties { Area = 1, Inertia = 1, Modulus = 1, PlasticModulus = 1, ShearArea = 1 });
        return Cantilever.Respond(PressureDiagram.Of(load), new Member(material, new Rectangle { Height = section.Height, Depth = section.Depth }, section, null, null, 100), tributary, length, cosRake: 1);
    }
}
