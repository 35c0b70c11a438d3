using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;

namespace FloodPanel.Web.Tests.Results;

public class StepTextTests
{
    [Fact]
    public void Substitute_Symbols_BecomeValuesWithUnits()
    {
        CalculationStep[] steps = [new("ρ", "", 1000, Dimension.Density), new("g", "", 9.80665, Dimension.Acceleration)];

        var text = StepText.Substitute("ρ·g", steps, UnitSystem.SI);

        Assert.Equal("1000 kg/m³·9.81 m/s²", text);
    }

    [Fact]
    public void Substitute_InUS_FollowsTheReadersUnits()
    {
        CalculationStep[] steps = [new("b", "", 3.048, Dimension.Length), new("e", "", 0.0508, Dimension.SectionLength)];

        var text = StepText.Substitute("b + 2·e", steps, UnitSystem.USCustomary);

        Assert.Equal("10.00 ft + 2·2.000 in", text);
    }

    [Fact]
    public void Substitute_SymbolThatBeginsAnother_TakesTheLongest()
    {
        CalculationStep[] steps =
        [
            new("M", "", 2000, Dimension.Moment), new("M_R", "", 4000, Dimension.Moment), new("M_R2", "", 8000, Dimension.Moment),
        ];

        var text = StepText.Substitute("M/M_R + M_R2 + M", steps, UnitSystem.SI);

        Assert.Equal("2.00 kN·m/(4.00 kN·m) + 8.00 kN·m + 2.00 kN·m", text);
    }

    [Theory]
    [InlineData("cos(θ)")]
    [InlineData("max(0, 1)")]
    [InlineData("h′ + hh + h_2 + h₁")]
    public void Substitute_SymbolInsideAnotherIdentifier_IsLeftAlone(string formula)
    {
        CalculationStep[] steps =
        [
            new("h", "", 0.95, Dimension.Length), new("s", "", 1, Dimension.Ratio), new("m", "", 1, Dimension.Ratio),
            new("o", "", 1, Dimension.Ratio), new("a", "", 1, Dimension.Ratio), new("x", "", 1, Dimension.Ratio),
        ];

        var text = StepText.Substitute(formula, steps, UnitSystem.SI);

        Assert.Equal(formula, text);
    }

    [Fact]
    public void Substitute_SymbolWithPrime_IsOneSymbol()
    {
        CalculationStep[] steps = [new("h", "", 0.95, Dimension.Length), new("h′", "", 0.1, Dimension.Length)];

        var text = StepText.Substitute("h − h′", steps, UnitSystem.SI);

        Assert.Equal("0.950 m − 0.100 m", text);
    }

    [Fact]
    public void Substitute_SymbolThatIsASubscriptOfAnother_DoesNotTouchIt()
    {
        CalculationStep[] steps = [new("k", "", 7, Dimension.Ratio), new("w_k", "", 1000, Dimension.LineForce)];

        var text = StepText.Substitute("w_k·k", steps, UnitSystem.SI);

        Assert.Equal("1.00 kN/m·7.00", text);
    }

    [Theory]
    [InlineData("h²/2", "(0.950 m)²/2")]
    [InlineData("1/h", "1/(0.950 m)")]
    [InlineData("√h", "√(0.950 m)")]
    [InlineData("a²", "1.25²")]
    [InlineData("1/a", "1/1.25")]
    [InlineData("γ/2", "(9.81 kN/m³)/2")]
    [InlineData("d", "-0.200 m")]
    [InlineData("h + d", "0.950 m + (-0.200 m)")]
    [InlineData("max(d, h)", "max(-0.200 m, 0.950 m)")]
    public void Substitute_WhereABareValueWouldMislead_AddsBrackets(string formula, string expected)
    {
        CalculationStep[] steps =
        [
            new("h", "", 0.95, Dimension.Length), new("a", "", 1.25, Dimension.Ratio),
            new("γ", "", 9806.65, Dimension.UnitWeight), new("d", "", -0.2, Dimension.Length),
        ];

        var text = StepText.Substitute(formula, steps, UnitSystem.SI);

        Assert.Equal(expected, text);
    }

    [Fact]
    public void Substitute_NumbersInTheFormula_Stay()
    {
        CalculationStep[] steps = [new("E", "", 70e9, Dimension.ElasticModulus), new("I", "", 4e-6, Dimension.SecondMoment)];

        var text = StepText.Substitute("5/(384·E·I)", steps, UnitSystem.SI);

        Assert.Equal("5/(384·70.0 GPa·400 cm⁴)", text);
    }

    [Fact]
    public void Pieces_OfAFormula_LowerSubscriptsAndKeepFunctionsUpright()
    {
        var pieces = StepText.Pieces("max(0, w_k)·h′/2");

        Assert.Equal(
            [
                new("max(0, ", "", false), new("w", "k", true), new(")·", "", false), new("h′", "", true), new("/2", "", false),
            ],
            pieces);
    }
}
