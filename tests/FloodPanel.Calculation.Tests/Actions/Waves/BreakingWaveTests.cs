using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

public class BreakingWaveTests
{
    /// <summary>Twice the depth: four times the force, at twice the height.</summary>
    [Fact]
    public void Pressure_DoubleDepth_FourfoldForce()
    {
        var (low, high) = (Diagram(0.5), Diagram(1));

        Hand.Equal(4 * low.Force, high.Force);
        Hand.Equal(2 * low.CentreOfPressure!.Value, high.CentreOfPressure!.Value);
    }

    /// <summary>Ground at −0.2 m under 0.7 m of water: still water at 0.5 m, crest 2.2·0.7 above ground.</summary>
    [Fact]
    public void Pressure_GroundBelowTheSill_MeasuredFromGround()
    {
        var (toStillWater, toCrest) = BreakingWave.Pressure(2.8, 10_000, 0.7, ground: -0.2);

        Hand.Equal(-0.2, toStillWater.Bottom);
        Hand.Equal(0.5, toStillWater.Top);
        Hand.Equal(0.5, toCrest.Bottom);
        Hand.Equal(1.34, toCrest.Top);
        Assert.Equal(toStillWater.AtTop, toCrest.AtBottom);
        Assert.Equal(0, toCrest.AtTop);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(5)]
    public void PressureCoefficient_NoSuchCategory_Throws(int category) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BreakingWave.PressureCoefficient(category));

    [Theory]
    [InlineData(0, 1, 1, 0)]
    [InlineData(1.6, 0, 1, 0)]
    [InlineData(1.6, 1, 0, 0)]
    [InlineData(1.6, 1, -1, 0)]
    [InlineData(1.6, 1, double.NaN, 0)]
    [InlineData(1.6, 1, 1, double.PositiveInfinity)]
    public void Pressure_OutOfRange_Throws(double coefficient, double unitWeight, double depth, double ground) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BreakingWave.Pressure(coefficient, unitWeight, depth, ground));

    private static PressureDiagram Diagram(double depth)
    {
        var wave = BreakingWave.Pressure(2.8, 10_000, depth, ground: 0);
        return PressureDiagram.Of(wave.ToStillWater, wave.ToCrest);
    }
}
