using System.Collections.Frozen;
using System.Globalization;

namespace FloodPanel.Calculation;

/// <summary>A unit of display: one of it is <paramref name="InSI"/> base SI units.</summary>
/// <param name="Symbol">As printed; empty for a pure number.</param>
/// <param name="InSI">Size in base SI.</param>
/// <param name="Decimals">Fixed decimals, or null for three significant figures.</param>
public sealed record Unit(string Symbol, double InSI, int? Decimals = null);

/// <summary>
/// The one place that converts and prints. Everything else is base SI. The factors are exact by definition:
/// 1 ft = 0.3048 m, 1 lb = 0.45359237 kg (international yard and pound agreement, 1959), 1 lbf = 1 lb × 9.80665 m/s²,
/// 1 US gallon = 231 in³.
/// </summary>
public static class Units
{
    private const double Foot = 0.3048;
    private const double Inch = Foot / 12;
    private const double Pound = 0.45359237;
    private const double PoundForce = Pound * Physics.Gravity;
    private const double KipPerSquareInch = 1000 * PoundForce / (Inch * Inch);
    private const double Gallon = 231 * Inch * Inch * Inch;
    private const double Hour = 3600;
    private const double Degree = Math.PI / 180;

    /// <summary>Decimals without an exponent, however small the number.</summary>
    private const string PlainDecimals = "0.##############################";

    private static readonly FrozenDictionary<Dimension, (Unit SI, Unit US)> Table =
        new Dictionary<Dimension, (Unit, Unit)>
        {
            [Dimension.Ratio] = (new("", 1), new("", 1)),
            [Dimension.Count] = (new("", 1, 0), new("", 1, 0)),
            [Dimension.Probability] = (new("", 1), new("", 1)),
            [Dimension.Years] = (new("years", 1, 0), new("years", 1, 0)),
            [Dimension.LengthPerYear] = (new("mm/year", 1e-3), new("in/year", Inch)),
            [Dimension.Degrees] = (new("°", 1, 1), new("°", 1, 1)),
            [Dimension.Angle] = (new("°", Degree, 1), new("°", Degree, 1)),
            [Dimension.Length] = (new("m", 1, 3), new("ft", Foot, 2)),
            [Dimension.SectionLength] = (new("mm", 1e-3, 1), new("in", Inch, 3)),
            [Dimension.Deflection] = (new("mm", 1e-3), new("in", Inch)),
            [Dimension.SectionArea] = (new("cm²", 1e-4), new("in²", Inch * Inch)),
            [Dimension.Area] = (new("m²", 1), new("ft²", Foot * Foot)),
            [Dimension.AreaInertia] = (new("m⁴", 1), new("ft⁴", Foot * Foot * Foot * Foot)),
            [Dimension.Volume] = (new("L", 1e-3), new("gal", Gallon)),
            [Dimension.FlowRate] = (new("L/h", 1e-3 / Hour), new("gal/h", Gallon / Hour)),
            [Dimension.LeakRate] = (new("L/h per m", 1e-3 / Hour), new("gal/h per ft", Gallon / Hour / Foot)),
            [Dimension.RainIntensity] = (new("mm/h", 1e-3 / Hour), new("in/h", Inch / Hour)),
            [Dimension.SectionModulus] = (new("cm³", 1e-6), new("in³", Inch * Inch * Inch)),
            [Dimension.SecondMoment] = (new("cm⁴", 1e-8), new("in⁴", Inch * Inch * Inch * Inch)),
            [Dimension.Velocity] = (new("m/s", 1), new("ft/s", Foot)),
            [Dimension.Acceleration] = (new("m/s²", 1), new("ft/s²", Foot)),
            [Dimension.Time] = (new("s", 1), new("s", 1)),
            [Dimension.WaveNumber] = (new("rad/m", 1), new("rad/ft", 1 / Foot)),
            [Dimension.Mass] = (new("kg", 1), new("lb", Pound)),
            [Dimension.LineMass] = (new("kg/m", 1), new("lb/ft", Pound / Foot)),
            [Dimension.Density] = (new("kg/m³", 1, 0), new("lb/ft³", Pound / (Foot * Foot * Foot), 1)),
            [Dimension.UnitWeight] = (new("kN/m³", 1e3), new("lbf/ft³", PoundForce / (Foot * Foot * Foot))),
            [Dimension.Force] = (new("kN", 1e3), new("lbf", PoundForce)),
            [Dimension.LineForce] = (new("kN/m", 1e3), new("lbf/ft", PoundForce / Foot)),
            [Dimension.Moment] = (new("kN·m", 1e3), new("lbf·ft", PoundForce * Foot)),
            [Dimension.Stiffness] = (new("kN·m²", 1e3), new("lbf·ft²", PoundForce * Foot * Foot)),
            [Dimension.Pressure] = (new("kPa", 1e3), new("psf", PoundForce / (Foot * Foot))),
            [Dimension.Stress] = (new("MPa", 1e6), new("ksi", KipPerSquareInch)),
            [Dimension.ElasticModulus] = (new("GPa", 1e9), new("ksi", KipPerSquareInch)),
        }.ToFrozenDictionary();

    /// <summary>The unit in which a dimension is shown and typed.</summary>
    /// <param name="dimension">What the number measures.</param>
    /// <param name="system">The system of units.</param>
    public static Unit Of(Dimension dimension, UnitSystem system) =>
        system == UnitSystem.SI ? Table[dimension].SI : Table[dimension].US;

    /// <summary>Base SI to the unit shown.</summary>
    /// <param name="value">The number [base SI].</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="system">The system of units.</param>
    public static double FromSI(double value, Dimension dimension, UnitSystem system) =>
        value / Of(dimension, system).InSI;

    /// <summary>The unit shown to base SI.</summary>
    /// <param name="value">The number in the unit shown.</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="system">The system of units.</param>
    public static double ToSI(double value, Dimension dimension, UnitSystem system) =>
        value * Of(dimension, system).InSI;

    /// <summary>Number and unit, "1.78 kN".</summary>
    /// <param name="value">The number [base SI].</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="system">The system of units.</param>
    public static string Format(double value, Dimension dimension, UnitSystem system) =>
        WithSymbol(FormatNumber(value, dimension, system), dimension, system);

    /// <summary>Number and unit of a quantity, "1.78 kN".</summary>
    /// <param name="quantity">The quantity.</param>
    /// <param name="system">The system of units.</param>
    public static string Format(Quantity quantity, UnitSystem system) =>
        Format(quantity.Value, quantity.Dimension, system);

    /// <summary>The number alone, as shown in results: fixed decimals for lengths, else three significant figures.</summary>
    /// <param name="value">The number [base SI].</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="system">The system of units.</param>
    public static string FormatNumber(double value, Dimension dimension, UnitSystem system)
    {
        if (!double.IsFinite(value))
        {
            return value > 0 ? "∞" : value < 0 ? "−∞" : "–";
        }

        var unit = Of(dimension, system);
        var shown = value / unit.InSI;
        return WithoutMinusZero(unit.Decimals is { } decimals ? Fixed(shown, decimals) : SignificantFigures(shown));
    }

    /// <summary>
    /// The numbers of a column, all with the decimals of the largest, so that their points stand in line and small
    /// ones do not claim a precision that nobody needs.
    /// </summary>
    /// <param name="values">The numbers [base SI].</param>
    /// <param name="dimension">What they measure.</param>
    /// <param name="system">The system of units.</param>
    public static IReadOnlyList<string> FormatColumn(IReadOnlyList<double> values, Dimension dimension, UnitSystem system)
    {
        var largest = FormatNumber(values.Select(Math.Abs).Where(double.IsFinite).DefaultIfEmpty().Max(), dimension, system);
        var point = largest.IndexOf('.');
        var decimals = point < 0 ? 0 : largest.Length - point - 1;
        return [.. values.Select(Number)];

        string Number(double value) => double.IsFinite(value)
            ? WithoutMinusZero(Fixed(FromSI(value, dimension, system), decimals))
            : FormatNumber(value, dimension, system);
    }

    /// <summary>The number as typed back into a form: enough digits to mean the same, no trailing zeros.</summary>
    /// <param name="value">The number [base SI].</param>
    /// <param name="dimension">What it measures.</param>
    /// <param name="system">The system of units.</param>
    public static string FormatInput(double value, Dimension dimension, UnitSystem system)
    {
        // Adding zero makes a negative zero positive.
        var text = (FromSI(value, dimension, system) + 0.0).ToString("G9", CultureInfo.InvariantCulture);
        return text.Contains('E')
            ? double.Parse(text, CultureInfo.InvariantCulture).ToString(PlainDecimals, CultureInfo.InvariantCulture)
            : text;
    }

    /// <summary>Number and unit as typed, "0.0999 m": for messages about a value, which rounding must not disguise.</summary>
    /// <param name="quantity">The quantity.</param>
    /// <param name="system">The system of units.</param>
    public static string FormatTyped(Quantity quantity, UnitSystem system) =>
        WithSymbol(FormatInput(quantity.Value, quantity.Dimension, system), quantity.Dimension, system);

    private static string WithSymbol(string number, Dimension dimension, UnitSystem system) =>
        Of(dimension, system).Symbol switch
        {
            "" => number,
            "°" => number + "°",
            var symbol => $"{number} {symbol}",
        };

    private static string WithoutMinusZero(string text) =>
        text.StartsWith('-') && text.AsSpan(1).IndexOfAnyInRange('1', '9') < 0 ? text[1..] : text;

    private static string Fixed(double value, int decimals) =>
        value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    /// <summary>Three significant figures, also where rounding carries: 9.996 is 10.0.</summary>
    private static string SignificantFigures(double value)
    {
        const int most = 9;
        var scientific = value.ToString("E2", CultureInfo.InvariantCulture);
        var exponent = int.Parse(scientific.AsSpan(scientific.IndexOf('E') + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        return value == 0 || exponent < -most
            ? "0"
            : Fixed(double.Parse(scientific, CultureInfo.InvariantCulture), Math.Clamp(2 - exponent, 0, most));
    }
}
