using FloodPanel.Calculation.Actions.Waves;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

public class GodaWaveTests
{
    private const double UnitWeight = 10_000;

    /// <summary>A long wave in shallow water: α_1 → 1.1, and the same pressure from still water to the ground.</summary>
    [Fact]
    public void Of_ShallowWater_TopCoefficientAndEvenPressure()
    {
        var wave = Without(height: 0.01, period: 60, depth: 0.05);

        Assert.Equal(1.1, wave.Alpha1, tolerance: 1e-4);
        Assert.Equal(1, wave.AtFoot / wave.AtStillWater, tolerance: 1e-4);
        Assert.Equal(60 * Math.Sqrt(Physics.Gravity * 0.05), 2 * Math.PI / wave.WaveNumber, tolerance: 0.01);
    }

    /// <summary>A short wave in deep water: α_1 → 0.6, and nothing at the ground; also where sinh and cosh overflow.</summary>
    [Theory]
    [InlineData(20)]
    [InlineData(2_000)]
    public void Of_DeepWater_LeastCoefficientAndNothingAtTheGround(double depth)
    {
        var wave = Without(height: 0.05, period: 0.8, depth);

        Assert.Equal(0.6, wave.Alpha1, tolerance: 1e-12);
        Assert.Equal(0, wave.AtFoot / wave.AtStillWater, tolerance: 1e-12);
    }

    /// <summary>On a level bed α_2 = 0, so that everything is in proportion to the wave height.</summary>
    [Fact]
    public void Of_DoubleHeightOnALevelBed_DoublePressureAndReach()
    {
        var (low, high) = (Without(0.2, 3, 1), Without(0.4, 3, 1));

        Assert.Equal(0, low.Alpha2);
        Hand.Equal(2 * low.AtStillWater, high.AtStillWater);
        Hand.Equal(2 * low.AtFoot, high.AtFoot);
        Hand.Equal(2 * low.Crest, high.Crest);
    }

    /// <summary>By hand for h = d = 1, H_max = 0.9, h_b = 1.05: (0.05/3.15)·0.81; the other branch, 2/0.9, is larger.</summary>
    [Fact]
    public void Of_RisingBed_SlopeCoefficientByHand() =>
        Hand.Equal(0.05 / 3.15 * 0.81, GodaWave.Of(0.9, 3, 0, UnitWeight, new(1, 1, 1, 1.05)).Alpha2);

    /// <summary>Over a berm of 0.2 m the second branch rules: 2·0.2/1.</summary>
    [Fact]
    public void Of_HighBerm_SecondBranchByHand() => Hand.Equal(0.4, GodaWave.Of(1, 3, 0, UnitWeight, new(2, 2, 0.2, 2.5)).Alpha2);

    /// <summary>Along the wall, β = 90°: half the reach, and half the pressure without the part of the bed.</summary>
    [Fact]
    public void Of_AlongTheWall_HalfOfHeadOn()
    {
        var (headOn, along) = (Without(0.3, 3, 1), GodaWave.Of(0.3, 3, Math.PI / 2, UnitWeight, new(1, 1, 1, 1)));

        Hand.Equal(headOn.Crest / 2, along.Crest);
        Hand.Equal(headOn.AtStillWater / 2, along.AtStillWater);
    }

    /// <summary>By hand for h_c = η*/3: two thirds of p_1; nothing from η* up.</summary>
    [Fact]
    public void At_AboveStillWater_FallsToNothingAtTheCrest()
    {
        var wave = Without(0.4, 3, 1);

        Assert.Equal(wave.AtStillWater, wave.At(0));
        Hand.Equal(wave.AtStillWater * 2 / 3, wave.At(0.2));
        Assert.Equal(0, wave.At(0.6), tolerance: 1e-9);
        Assert.Equal(0, wave.At(5));
    }

    /// <summary>By hand, deep water on a level bed: the exponential vanishes and 0.17·L_0 is left, 0.17·9.80665/2π for 1 s.</summary>
    [Fact]
    public void DepthLimit_DeepWater_SteepnessAlone() =>
        Hand.Equal(0.17 * 9.80665 / (2 * Math.PI), GodaWave.DepthLimit(period: 1, seawardDepth: 30, bedSlope: 0));

    /// <summary>By hand, shallow water: 0.17·1.5π·h_b·(1 + 15·m^(4/3)); with m = 1/8, 15/16 more.</summary>
    [Theory]
    [InlineData(0, 0.801106126665)]
    [InlineData(0.125, 1.552143120414)]
    public void DepthLimit_ShallowWater_InProportionToDepth(double bedSlope, double ratio) =>
        Assert.Equal(ratio, GodaWave.DepthLimit(period: 60, seawardDepth: 0.001, bedSlope) / 0.001, tolerance: 1e-5);

    /// <summary>A wave of the greatest height is as high as its own limit; a lower one is below it, a higher one above.</summary>
    [Property(MaxTest = 200)]
    public Property GreatestHeight_AnyPlace_PartsTheWaves() => Prop.ForAll(
        Gen.Choose(50, 6_000).Select(t => t / 100.0).ToArbitrary(),
        Gen.Choose(1, 5_000).Select(d => d / 1_000.0).ToArbitrary(),
        Gen.Choose(0, 100).Select(m => m / 1_000.0).ToArbitrary(),
        (period, depth, slope) =>
        {
            double Spare(double height) =>
                GodaWave.DepthLimit(period, GodaWave.SeawardDepth(depth, height, slope), slope) - height;

            var greatest = GodaWave.GreatestHeight(period, depth, slope);

            Assert.Equal(0, Spare(greatest), tolerance: 1e-9);
            Assert.True(Spare(0.99 * greatest) > 0);
            Assert.True(Spare(1.01 * greatest) < 0);
        });

    [Theory]
    [InlineData(0, 0, 1, 1)]
    [InlineData(double.NaN, 0, 1, 1)]
    [InlineData(0.3, -0.01, 1, 1)]
    [InlineData(0.3, 1.58, 1, 1)]
    [InlineData(0.3, double.NaN, 1, 1)]
    [InlineData(0.3, 0, 0, 1)]
    [InlineData(0.3, 0, double.PositiveInfinity, 1)]
    [InlineData(0.3, 0, 1, 0)]
    [InlineData(0.3, 0, 1, double.NaN)]
    public void Of_OutOfRange_Throws(double height, double angle, double unitWeight, double depth) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GodaWave.Of(height, 3, angle, unitWeight, new(depth, depth, depth, depth)));

    [Theory]
    [InlineData(0, 1, 0)]
    [InlineData(3, 0, 0)]
    [InlineData(3, double.NaN, 0)]
    [InlineData(3, 1, -0.1)]
    [InlineData(3, 1, double.NaN)]
    public void DepthLimit_OutOfRange_Throws(double period, double depth, double slope)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => GodaWave.DepthLimit(period, depth, slope));
        Assert.Throws<ArgumentOutOfRangeException>(() => GodaWave.GreatestHeight(period, depth, slope));
    }

    private static GodaWave Without(double height, double period, double depth) =>
        GodaWave.Of(height, period, 0, UnitWeight, new(depth, depth, depth, depth));
}
