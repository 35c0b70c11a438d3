using FloodPanel.Calculation.Actions.Waves;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

public class DispersionTests
{
    /// <summary>Periods and depths that may be typed, and far beyond: films of water, and the sea at its deepest.</summary>
    [Property(MaxTest = 300)]
    public Property WaveNumber_AnyPeriodAndDepth_HoldsInTheRelation() => Prop.ForAll(
        Gen.Choose(50, 6_000).Select(t => t / 100.0).ToArbitrary(),
        Gen.Choose(-100, 43).Select(e => Math.Pow(10, e / 10.0)).ToArbitrary(),
        (period, depth) =>
        {
            var number = Dispersion.WaveNumber(period, depth);

            var frequency = 2 * Math.PI / period;
            Assert.Equal(1, Physics.Gravity * number * Math.Tanh(number * depth) / (frequency * frequency), tolerance: 1e-11);
        });

    /// <summary>L → T·√(g·h): at a depth of 1 mm the next term, (k·h)²/6, is 7e-6 of it for 10 s.</summary>
    [Fact]
    public void WaveNumber_ShallowWater_LengthOfALongWave() =>
        Assert.Equal(10 * Math.Sqrt(Physics.Gravity * 0.001), 2 * Math.PI / Dispersion.WaveNumber(10, 0.001), tolerance: 1e-5);

    [Theory]
    [InlineData(0.5, 9_000)]
    [InlineData(0.5, 1)]
    [InlineData(10, 9_000)]
    public void WaveNumber_DeepWater_LengthOfDeepWater(double period, double depth) =>
        Hand.Equal(Dispersion.DeepWaterLength(period), 2 * Math.PI / Dispersion.WaveNumber(period, depth));

    /// <summary>By hand: 9.80665·100/2π.</summary>
    [Fact]
    public void DeepWaterLength_TenSeconds_ByHand() => Hand.Equal(156.077682267, Dispersion.DeepWaterLength(10));

    [Theory]
    [InlineData(0, 1)]
    [InlineData(-1, 1)]
    [InlineData(double.NaN, 1)]
    [InlineData(double.PositiveInfinity, 1)]
    [InlineData(3, 0)]
    [InlineData(3, -1)]
    [InlineData(3, double.NaN)]
    [InlineData(3, double.PositiveInfinity)]
    public void WaveNumber_OutOfRange_Throws(double period, double depth) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Dispersion.WaveNumber(period, depth));
}
