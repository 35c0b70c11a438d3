using System.Collections.Frozen;
using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>
/// Names of units that may be typed behind a number, besides the two that <see cref="Units"/> shows. The factors
/// are exact by definition: inch, pound and pound-force as in <see cref="Units"/>; 1 bar = 10⁵ Pa.
/// </summary>
internal static class UnitNames
{
    public const double Foot = 0.3048;
    public const double Inch = Foot / 12;
    private const double Pound = 0.45359237;
    private const double PoundForce = Pound * Physics.Gravity;
    private const double SquareInch = Inch * Inch;
    private const double SquareFoot = Foot * Foot;

    private static readonly (string Name, double Size)[] Lengths =
    [
        ("m", 1), ("cm", 1e-2), ("mm", 1e-3), ("ft", Foot), ("in", Inch),
        ("metre", 1), ("metres", 1), ("meter", 1), ("meters", 1),
        ("foot", Foot), ("feet", Foot), ("'", Foot), ("inch", Inch), ("inches", Inch), ("\"", Inch),
    ];

    private static readonly (string Name, double Size)[] Pressures =
    [
        ("kPa", 1e3), ("MPa", 1e6), ("GPa", 1e9), ("Pa", 1), ("N/mm2", 1e6), ("kN/m2", 1e3), ("N/m2", 1),
        ("bar", 1e5), ("mbar", 100), ("psf", PoundForce / SquareFoot), ("psi", PoundForce / SquareInch),
        ("ksi", 1000 * PoundForce / SquareInch), ("ksf", 1000 * PoundForce / SquareFoot),
    ];

    private static readonly FrozenDictionary<Dimension, (string Name, double Size)[]> Table =
        new Dictionary<Dimension, (string Name, double Size)[]>
        {
            [Dimension.Ratio] = [("%", 0.01)],
            [Dimension.Probability] = [("%", 0.01)],
            [Dimension.Years] = [("year", 1), ("yr", 1), ("yrs", 1), ("a", 1)],
            [Dimension.LengthPerYear] = [("mm/yr", 1e-3), ("mm/a", 1e-3), ("cm/year", 1e-2), ("m/year", 1), ("in/yr", Inch), ("ft/year", Foot)],
            [Dimension.Degrees] = [("deg", 1), ("degrees", 1)],
            [Dimension.Angle] = [("deg", Math.PI / 180), ("rad", 1)],
            [Dimension.Length] = Lengths,
            [Dimension.SectionLength] = Lengths,
            [Dimension.Area] = [("m2", 1), ("ft2", SquareFoot)],
            [Dimension.Volume] = [("l", 1e-3), ("litres", 1e-3), ("m3", 1), ("gallons", 231 * SquareInch * Inch), ("ft3", SquareFoot * Foot)],
            [Dimension.FlowRate] = [("l/h", 1e-3 / 3600), ("l/min", 1e-3 / 60), ("l/s", 1e-3), ("gph", 231 * SquareInch * Inch / 3600), ("gpm", 231 * SquareInch * Inch / 60)],
            [Dimension.LeakRate] = [("l/h/m", 1e-3 / 3600), ("l/h", 1e-3 / 3600)],
            [Dimension.RainIntensity] = [("mm/hr", 1e-3 / 3600), ("in/hr", Inch / 3600), ("iph", Inch / 3600)],
            [Dimension.SectionArea] = [("cm2", 1e-4), ("mm2", 1e-6), ("m2", 1), ("in2", SquareInch), ("ft2", SquareFoot)],
            [Dimension.SectionModulus] = [("cm3", 1e-6), ("mm3", 1e-9), ("m3", 1), ("in3", SquareInch * Inch)],
            [Dimension.SecondMoment] = [("cm4", 1e-8), ("mm4", 1e-12), ("m4", 1), ("in4", SquareInch * SquareInch)],
            [Dimension.Velocity] = [("m/s", 1), ("km/h", 1 / 3.6), ("cm/s", 1e-2), ("ft/s", Foot), ("fps", Foot), ("mph", 0.44704)],
            [Dimension.Acceleration] = [("m/s2", 1), ("ft/s2", Foot)],
            [Dimension.Time] = [("s", 1), ("ms", 1e-3), ("min", 60), ("sec", 1)],
            [Dimension.Mass] = [("kg", 1), ("t", 1e3), ("g", 1e-3), ("lb", Pound), ("lbs", Pound), ("lbm", Pound)],
            [Dimension.LineMass] = [("kg/m", 1), ("g/m", 1e-3), ("lb/ft", Pound / Foot), ("plf", Pound / Foot)],
            [Dimension.Density] = [("kg/m3", 1), ("t/m3", 1e3), ("g/cm3", 1e3), ("lb/ft3", Pound / (SquareFoot * Foot)), ("pcf", Pound / (SquareFoot * Foot))],
            [Dimension.UnitWeight] = [("kN/m3", 1e3), ("N/m3", 1), ("lbf/ft3", PoundForce / (SquareFoot * Foot)), ("pcf", PoundForce / (SquareFoot * Foot))],
            [Dimension.Force] = [("kN", 1e3), ("N", 1), ("lbf", PoundForce), ("lb", PoundForce), ("kip", 1e3 * PoundForce)],
            [Dimension.LineForce] = [("kN/m", 1e3), ("N/m", 1), ("lbf/ft", PoundForce / Foot), ("lb/ft", PoundForce / Foot), ("plf", PoundForce / Foot)],
            [Dimension.Moment] = [("kNm", 1e3), ("Nm", 1), ("lbfft", PoundForce * Foot), ("ftlbf", PoundForce * Foot), ("ftlb", PoundForce * Foot)],
            [Dimension.Pressure] = Pressures,
            [Dimension.Stress] = Pressures,
            [Dimension.ElasticModulus] = Pressures,
        }.ToFrozenDictionary();

    private static readonly FrozenDictionary<Dimension, (string Name, double Size)[]> LongestFirst =
        Enum.GetValues<Dimension>().ToFrozenDictionary(d => d, d => Known(d).OrderByDescending(u => u.Name.Length).ToArray());

    /// <summary>
    /// Takes a unit name off the start of the text: its size in base SI, or null where a number or nothing follows.
    /// False where something else stands there.
    /// </summary>
    public static bool Take(ref string rest, Dimension dimension, out double? size)
    {
        size = null;
        if (rest.Length == 0 || char.IsAsciiDigit(rest[0]))
        {
            return true;
        }

        foreach (var (name, factor) in LongestFirst[dimension])
        {
            if (rest.StartsWith(name, StringComparison.OrdinalIgnoreCase) && EndsAt(rest, name))
            {
                size = factor;
                rest = WithoutFullStop(rest[name.Length..]);
                return true;
            }
        }

        return false;
    }

    /// <summary>The units that fit a dimension, "Units: m, cm, mm, ft, in."</summary>
    public static string Hint(Dimension dimension)
    {
        var names = Known(dimension).Select(u => u.Name).Where(n => n.Length > 0).Distinct().Take(5).ToArray();
        return names.Length == 0 ? "Write a number without a unit." : $"Units: {string.Join(", ", names)}.";
    }

    // "3 ft. 6 in." is common; "3 ft .5" is a number.
    private static string WithoutFullStop(string rest) =>
        rest == "." || rest.StartsWith(". ", StringComparison.Ordinal) ? rest[1..] : rest;

    private static bool EndsAt(string rest, string name) =>
        rest.Length == name.Length || !char.IsLetter(name[^1]) || !char.IsLetter(rest[name.Length]);

    private static IEnumerable<(string Name, double Size)> Known(Dimension dimension)
    {
        var typed = Table.GetValueOrDefault(dimension, []);
        return typed.Concat(new[] { UnitSystem.SI, UnitSystem.USCustomary }
            .Select(system => Units.Of(dimension, system))
            .Where(unit => unit.Symbol.Length > 0)
            .Select(unit => (unit.Symbol, unit.InSI)));
    }
}
