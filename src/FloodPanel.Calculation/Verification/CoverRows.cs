using FloodPanel.Calculation.Covers;

namespace FloodPanel.Calculation.Verification;

/// <summary>Plates: coefficients of handbooks, ν = 0.3 unless said otherwise.</summary>
internal static class CoverRows
{
    private const string Timoshenko = "Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, 2nd ed. (1959)";
    private const string Roark = "Roark's Formulas for Stress and Strain";
    private const string Differing = "table and series differ by up to 0.5 %";

    public static IEnumerable<VerificationRow> Rows() => [.. FourEdges(), .. Hydrostatic(), .. ThreeEdges(), .. Circles()];

    private static IEnumerable<VerificationRow> FourEdges()
    {
        var (square, oblong, twice) = (Uniform(1), Uniform(1.5), Uniform(2));
        const string table = $"{Timoshenko}, Table 8";
        return
        [
            new(table, "four edges, square: D·w/(q·a⁴)", "", "0.00406", square.Bulge, Evidence.Derived),
            new(table, "four edges, square: M/(q·a²)", "", "0.0479", square.Moment, Evidence.Derived),
            new(table, "four edges, square: corner force R/(q·a²)", "", "0.065", square.CornerHold, Evidence.Memory),
            new(table, "four edges, b/a 1.5: D·w/(q·a⁴)", "", "0.00772", oblong.Bulge, Evidence.Derived),
            new(table, "four edges, b/a 1.5: M/(q·a²)", "", "0.0812", oblong.Moment, Evidence.Derived),
            new(table, "four edges, b/a 2: D·w/(q·a⁴)", "", "0.01013", twice.Bulge, Evidence.Derived),
            new(table, "four edges, b/a 2: M/(q·a²)", "", "0.1017", twice.Moment, Evidence.Derived),
            new($"{Roark}, Table 11.4 case 1a", "four edges, b/a 2: stress factor β", "", "0.6102", 6 * twice.Moment, Evidence.Read, 0.0005, Differing),
            new($"{Roark}, Table 11.4 case 1a", "four edges, b/a 2: edge reaction factor γ", "", "0.503", twice.Reaction, Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Hydrostatic()
    {
        const string table = $"{Timoshenko}, Tables 10 to 13";
        var square = Plate(1, 1, PlateEdge.Supported, new(0, 0, 1));
        var wide = Plate(1, 2, PlateEdge.Supported, new(0, 0, 1));
        return
        [
            new(table, "four edges, square, hydrostatic: D·w/(q₀·a⁴), greatest", "", "0.00205", square.Bulge, Evidence.Derived),
            new(table, "four edges, square, hydrostatic: M/(q₀·a²), greatest", "", "0.0270", square.Moment, Evidence.Derived),
            new(table, "four edges, twice as wide as high, hydrostatic: D·w/(q₀·a⁴), greatest", "", "0.00508", wide.Bulge, Evidence.Derived),
            new(table, "four edges, twice as wide as high, hydrostatic: M/(q₀·a²), greatest", "", "0.0529", wide.Moment, Evidence.Derived),
        ];
    }

    private static IEnumerable<VerificationRow> ThreeEdges()
    {
        const string table = $"{Roark}, Table 26 case 2a (6th ed.)";
        const double toRoark = 12 * (1 - 0.3 * 0.3);
        var (half, square, twice) = (Free(0.5), Free(1), Free(2));
        return
        [
            new(table, "one edge free, a/b 0.5: stress factor β", "", "0.36", 6 * half.Moment, Evidence.Read),
            new(table, "one edge free, square: stress factor β", "", "0.67", 6 * square.Moment, Evidence.Read),
            new(table, "one edge free, square: deflection factor α", "", "0.14", toRoark * square.Bulge, Evidence.Read),
            new(table, "one edge free, a/b 2: stress factor β", "", "0.79", 6 * twice.Moment, Evidence.Read),
            new(table, "one edge free, a/b 2: deflection factor α", "", "0.165", toRoark * twice.Bulge, Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Circles()
    {
        const string source = "Circular plate, worked by hand: diameter 600 mm, t 6 mm, E 70 GPa, ν 0.33, 20 kPa";
        const double thickness = 0.006;
        const double stiffness = 70e9 * thickness * thickness * thickness / (12 * (1 - 0.33 * 0.33));
        var supported = new CircularPlate(0.3, 0.33, isClamped: false, 20e3, 0).Worst();
        var clamped = new CircularPlate(0.3, 0.33, isClamped: true, 20e3, 0).Worst();
        return
        [
            new(source, "supported: deflection", "mm", "7.17", 1e3 * supported.Bulge / stiffness, Evidence.Derived),
            new(source, "supported: stress", "MPa", "62.4", 6e-6 * supported.Moment / (thickness * thickness), Evidence.Derived),
            new(source, "clamped: deflection", "mm", "1.79", 1e3 * clamped.Bulge / stiffness, Evidence.Derived),
            new(source, "clamped: stress at the edge", "MPa", "37.5", 6e-6 * clamped.Moment / (thickness * thickness), Evidence.Derived),
        ];
    }

    private static PlateResponse Uniform(double width) => Plate(1, width, PlateEdge.Supported, PlatePressure.Uniform(1));

    private static PlateResponse Free(double height) => Plate(height, 1, PlateEdge.Free, PlatePressure.Uniform(1));

    private static PlateResponse Plate(double height, double width, PlateEdge top, PlatePressure pressure) =>
        new RectangularPlate(height, width, 0.3, top, PlateEdge.Supported, pressure).Worst();
}
