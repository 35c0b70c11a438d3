namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>A number on its way through a formula.</summary>
/// <param name="Value">The number [base SI].</param>
/// <param name="Terms">The same with every difference taken as a sum: rounding errors are in proportion to it.</param>
/// <param name="Unit">Its unit.</param>
internal readonly record struct Measured(double Value, double Terms, Exponents Unit)
{
    public static Measured Number(double value) => new(value, Math.Abs(value), Exponents.None);

    public static Measured operator +(Measured a, Measured b) =>
        new(a.Value + b.Value, a.Terms + b.Terms, SameUnit(a, b));

    public static Measured operator -(Measured a, Measured b) =>
        new(a.Value - b.Value, a.Terms + b.Terms, SameUnit(a, b));

    public static Measured operator *(Measured a, Measured b) =>
        new(a.Value * b.Value, a.Terms * b.Terms, a.Unit + b.Unit);

    public static Measured operator /(Measured a, Measured b) =>
        new(a.Value / b.Value, a.Terms * b.Terms / (b.Value * b.Value), a.Unit - b.Unit);

    public static Measured Least(Measured a, Measured b) =>
        new(Math.Min(a.Value, b.Value), Math.Max(a.Terms, b.Terms), SameUnit(a, b));

    public static Measured Greatest(Measured a, Measured b) =>
        new(Math.Max(a.Value, b.Value), Math.Max(a.Terms, b.Terms), SameUnit(a, b));

    public Measured Power(int power) => new(Math.Pow(Value, power), Math.Pow(Terms, power), Unit * power);

    public Measured Root() => new(Math.Sqrt(Value), Math.Sqrt(Terms), Unit.Half());

    /// <summary>A function of a pure number.</summary>
    public Measured Function(Func<double, double> function)
    {
        var value = function(Value);
        return Unit == Exponents.None
            ? new(value, Math.Max(1, Math.Abs(value)), Exponents.None)
            : throw new FormatException($"a function of a number with the unit {Unit}");
    }

    /// <summary>Zero has any unit: max(0, h).</summary>
    private static Exponents SameUnit(Measured a, Measured b) =>
        a.Unit == b.Unit || b is { Value: 0, Terms: 0 } ? a.Unit
        : a is { Value: 0, Terms: 0 } ? b.Unit
        : throw new FormatException($"{a.Unit} and {b.Unit} are added or compared");
}
