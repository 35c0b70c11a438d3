namespace FloodPanel.Calculation.Tests;

public class GuardTests
{
    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Finite_NotFinite_Throws(double depth)
    {
        var refusal = Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Finite(depth));

        Assert.Equal("depth", refusal.ParamName);
    }

    [Theory]
    [InlineData(-0.0)]
    [InlineData(double.MaxValue)]
    [InlineData(double.MinValue)]
    public void Finite_Finite_Accepts(double depth) => Guard.Finite(depth);

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(-double.Epsilon)]
    public void NonNegative_NegativeOrNotFinite_Throws(double depth) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.NonNegative(depth));

    [Fact]
    public void NonNegative_ZeroOfEitherSignAndAbove_Accepts()
    {
        Guard.NonNegative(0.0);
        Guard.NonNegative(-0.0);
        Guard.NonNegative(double.MaxValue);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(-0.0)]
    [InlineData(-double.Epsilon)]
    public void Positive_NotAboveZeroOrNotFinite_Throws(double depth) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Positive(depth));

    [Fact]
    public void Positive_Zero_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Positive(0));

    [Fact]
    public void Positive_LeastAboveZero_Accepts() => Guard.Positive(double.Epsilon);

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(989.999)]
    [InlineData(1400.001)]
    public void InRange_Outside_ThrowsNamingTheRange(double density)
    {
        var refusal = Assert.Throws<ArgumentOutOfRangeException>(() => Guard.InRange(density, 990, 1400));

        Assert.Equal("density", refusal.ParamName);
        Assert.Contains("from 990 to 1400", refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(990)]
    [InlineData(1400)]
    public void InRange_AtEitherEnd_Accepts(double density) => Guard.InRange(density, 990, 1400);
}
