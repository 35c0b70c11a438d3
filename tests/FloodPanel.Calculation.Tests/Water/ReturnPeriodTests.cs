using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Tests.Water;

public class ReturnPeriodTests
{
    [Theory]
    [InlineData(0.01, "1 in 100")]
    [InlineData(0.002, "1 in 500")]
    [InlineData(0.7 * 0.01, "1 in 143")]
    [InlineData(0.4, "1 in 2.5")]
    [InlineData(0.1, "1 in 10")]
    [InlineData(0.999, "1 in 1")]
    [InlineData(1e-6, "1 in 1000000")]
    public void InWords_Probability_AsItIsSaid(double probability, string words) => Assert.Equal(words, ReturnPeriod.InWords(probability));

    [Theory]
    [InlineData(0)]
    [InlineData(1.01)]
    [InlineData(double.NaN)]
    public void Years_NoProbability_Throws(double probability) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ReturnPeriod.Years(probability));
}
