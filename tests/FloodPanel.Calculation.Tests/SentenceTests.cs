namespace FloodPanel.Calculation.Tests;

public class SentenceTests
{
    private static readonly Sentence Wall = new($"{new Quantity(0.9144, Dimension.Length)} stands against {2} walls of {"brick"}.");

    /// <summary>3 ft is 0.9144 m.</summary>
    [Theory]
    [InlineData(UnitSystem.SI, "0.914 m stands against 2 walls of brick.")]
    [InlineData(UnitSystem.USCustomary, "3.00 ft stands against 2 walls of brick.")]
    public void In_EachSystem_QuantitiesFollow(UnitSystem system, string words) => Assert.Equal(words, Wall.In(system));

    [Fact]
    public void ToString_Always_IsSI() => Assert.Equal(Wall.In(UnitSystem.SI), Wall.ToString());

    /// <summary>999.99 Pa / 47.880259 Pa = 20.8852254.</summary>
    [Theory]
    [InlineData(UnitSystem.SI, "0.99999 kPa")]
    [InlineData(UnitSystem.USCustomary, "20.8852254 psf")]
    public void In_TypedQuantity_AllDigitsThatTheFormWouldShow(UnitSystem system, string words) =>
        Assert.Equal(words, new Sentence($"{new Quantity(999.99, Dimension.Pressure):typed}").In(system));

    [Fact]
    public void In_NumbersAndNulls_InvariantAndEmpty()
    {
        string? nothing = null;

        var words = new Sentence($"{1234.5:F1}|{nothing}|{0.25}").In(UnitSystem.SI);

        Assert.Equal("1234.5||0.25", words);
    }

    [Fact]
    public void Equals_SameWords_EqualWithSameHash()
    {
        var one = new Sentence($"{new Quantity(1, Dimension.Force)}");
        var other = new Sentence($"{new Quantity(1, Dimension.Force)}");

        Assert.Equal(one, other);
        Assert.Equal(one.GetHashCode(), other.GetHashCode());
    }

    /// <summary>1234 N and 1234.9 N are both 1.23 kN, but 277 and 278 lbf.</summary>
    [Fact]
    public void Equals_DifferentOnlyInUSUnits_NotEqual() =>
        Assert.NotEqual(
            new Sentence($"{new Quantity(1234, Dimension.Force)}"),
            new Sentence($"{new Quantity(1234.9, Dimension.Force)}"));
}
