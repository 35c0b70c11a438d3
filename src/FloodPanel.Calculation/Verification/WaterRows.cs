using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Verification;

/// <summary>Still water.</summary>
internal static class WaterRows
{
    private const string Quimby = "T. B. Quimby, A Beginner's Guide to ASCE 7-10 (2014), Example 6.1";
    private const string Fema = "FEMA P-55 vol. II (2011), Eq. 8.6, definitions";
    private const string Derived = "Closed forms with γ = 9.81 kN/m³";

    private static readonly double UnitWeight = Hydrostatic.UnitWeight(9810 / Physics.Gravity);

    public static IEnumerable<VerificationRow> Rows() => [.. UnitWeights(), .. FloodWall(), .. Face(), .. Log(), .. Raked()];

    private static IEnumerable<VerificationRow> UnitWeights() =>
    [
        new(Fema, "unit weight of fresh water", "lb/ft³", "62.4", Weight(1000), Evidence.Read),
        new(Fema, "unit weight of salt water", "lb/ft³", "64.0", Weight(1025), Evidence.Read),
    ];

    private static IEnumerable<VerificationRow> FloodWall()
    {
        var depth = 5 * Printed.Foot;
        var diagram = PressureDiagram.Of(Hydrostatic.Side(Printed.PerCubicFoot(64), depth, 6 * Printed.Foot, 1));
        var perFoot = Printed.PoundsPerFoot(diagram.Force);
        return
        [
            new(Quimby, "pressure at the base under 5 ft", "psf", "320", Printed.Psf(diagram.At(0)), Evidence.Read),
            new(Quimby, "thrust", "lb/ft", "800", perFoot, Evidence.Read),
            new(Quimby, "depth of the resultant, 3 ft 4 in", "in", "40", (depth - diagram.CentreOfPressure!.Value) / Printed.Foot * 12, Evidence.Read),
            new(Quimby, "force on the wall of 20 ft", "kip", "16.0", perFoot * 20 / 1000, Evidence.Read),
            new(Quimby, "force on the wall of 10 ft", "kip", "8.00", perFoot * 10 / 1000, Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Face() =>
    [
        .. Face("1.2 m of water on 1.0 m, overtopped", 1.2, 0, "6.867", "0.381"),
        .. Face("the same with 0.4 m behind", 1.2, 0.4, "6.082", "0.413"),
        .. Face("0.9 m of water on 1.0 m", 0.9, 0, "3.973", "0.300"),
    ];

    private static IEnumerable<VerificationRow> Face(string what, double depth, double behind, string force, string height)
    {
        var diagram = PressureDiagram.Of(
            Hydrostatic.Side(UnitWeight, depth, 1, 1), Hydrostatic.Side(UnitWeight, behind, 1, 1).Opposite());
        return
        [
            new(Derived, $"resultant, {what}", "kN/m", force, Printed.Kilo(diagram.Force), Evidence.Derived),
            new(Derived, $"its height, {what}", "m", height, diagram.CentreOfPressure!.Value, Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> Log()
    {
        var diagram = PressureDiagram.Of(Hydrostatic.Side(UnitWeight, 0.9, 1, 1));
        return
        [
            new(Derived, "load on the lowest log, 0 to 0.15 m under 0.9 m", "kN/m", "1.214", Printed.Kilo(diagram.Within(0, 0.15).Characteristic), Evidence.Derived),
            new(Derived, "its height", "m", "0.0727", diagram.CentreWithin(0, 0.15)!.Value, Evidence.Derived),
            new(Derived, "pressure at its upper edge", "kPa", "7.358", Printed.Kilo(diagram.At(0.15)), Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> Raked()
    {
        var cosine = Math.Cos(Math.PI / 6);
        var diagram = PressureDiagram.Of(Hydrostatic.Side(UnitWeight, 0.9, 1, 1));
        return
        [
            new(Derived, "normal force on a face at 60° to the horizontal, 0.9 m", "kN/m", "4.588", Printed.Kilo(diagram.Force / cosine), Evidence.Derived),
            new(Derived, "its distance up the slope", "m", "0.346", diagram.CentreOfPressure!.Value / cosine, Evidence.Derived),
        ];
    }

    private static double Weight(double density) => Printed.US(Hydrostatic.UnitWeight(density), Dimension.UnitWeight);
}
