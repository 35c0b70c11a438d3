namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>The reader must be right itself before it judges the steps.</summary>
public class FormulaReaderTests
{
    private static readonly Dictionary<string, Measured> Known = new()
    {
        ["h"] = new(3, 3, Exponents.Of(Dimension.Length)),
        ["h′"] = new(1, 1, Exponents.Of(Dimension.Length)),
        ["z_a1"] = new(0.5, 0.5, Exponents.Of(Dimension.Length)),
        ["δ_lim"] = new(2, 2, Exponents.None),
        ["ℓ"] = new(4, 4, Exponents.None),
        ["F"] = new(10, 10, Exponents.Of(Dimension.Force)),
        ["w"] = new(5, 5, Exponents.Of(Dimension.LineForce)),
    };

    /// <summary>Worked by hand.</summary>
    [Theory]
    [InlineData("1 + 2·3", 7)]
    [InlineData("(1 + 2)·3", 9)]
    [InlineData("8/4/2", 1)]
    [InlineData("8/(4/2)", 4)]
    [InlineData("8/4·2", 4)]
    [InlineData("7 − 2 − 1", 4)]
    [InlineData("2·3²", 18)]
    [InlineData("2³ + 2⁴", 24)]
    [InlineData("(1 + 1)²/4", 1)]
    [InlineData("√(9)·2", 6)]
    [InlineData("√16²", 16)]
    [InlineData("0.70·10/1.30", 5.384615384615385)]
    [InlineData("cos(0)", 1)]
    [InlineData("cos(π/3)", 0.5)]
    [InlineData("sin(π/6)", 0.5)]
    [InlineData("tan(π/4)", 1)]
    [InlineData("sinh(1) + cosh(1) − exp(1)", 0)]
    [InlineData("(exp(1) + 1/exp(1))/2/cosh(1)", 1)]
    [InlineData("tanh(0.5)·cosh(0.5)/sinh(0.5)", 1)]
    [InlineData("exp(0)", 1)]
    [InlineData("4^(3/2)", 8)]
    [InlineData("2·4^(1/2)/4", 1)]
    [InlineData("min(2, 1 + 2)", 2)]
    [InlineData("max(2, 1 + 2)", 3)]
    [InlineData("δ_lim·ℓ", 8)]
    [InlineData("h/h′", 3)]
    [InlineData("max(0, h)/h", 1)]
    public void Read_Formula_Value(string formula, double value) =>
        Assert.Equal(value, FormulaReader.Read(formula, Known).Value, tolerance: 1e-15);

    [Theory]
    [InlineData("h·h′", Dimension.SectionArea)]
    [InlineData("w·h", Dimension.Force)]
    [InlineData("F/h²", Dimension.Pressure)]
    [InlineData("h + z_a1 − h′", Dimension.Length)]
    [InlineData("√(h·h)", Dimension.Length)]
    [InlineData("max(0, h)", Dimension.Length)]
    [InlineData("min(F, w·h)", Dimension.Force)]
    public void Read_Formula_Unit(string formula, Dimension dimension) =>
        Assert.Equal(Exponents.Of(dimension), FormulaReader.Read(formula, Known).Unit);

    /// <summary>Signs of other alphabets, unknown symbols and mixed units.</summary>
    [Theory]
    [InlineData("")]
    [InlineData("1 - 2")]
    [InlineData("1 * 2")]
    [InlineData("2 × 3")]
    [InlineData("h^2")]
    [InlineData("2^")]
    [InlineData("(1 + 2")]
    [InlineData("1 + 2)")]
    [InlineData("1 2")]
    [InlineData("−1")]
    [InlineData("log(1)")]
    [InlineData("tanh(h)")]
    [InlineData("min(1)")]
    [InlineData("max(1, 2, 3)")]
    [InlineData("H")]
    [InlineData("h + F")]
    [InlineData("h + 1")]
    [InlineData("max(h, F)")]
    [InlineData("cos(h)")]
    [InlineData("√(h)")]
    public void Read_NotInTheLanguage_Throws(string formula) =>
        Assert.Throws<FormatException>(() => FormulaReader.Read(formula, Known));
}
