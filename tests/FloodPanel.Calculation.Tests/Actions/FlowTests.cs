using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Tests.Actions;

public class FlowTests
{
    [Theory]
    [InlineData(-0.1, 1.25)]
    [InlineData(double.NaN, 1.25)]
    [InlineData(double.PositiveInfinity, 1.25)]
    [InlineData(1, 1.249)]
    [InlineData(1, double.NaN)]
    [InlineData(1, double.PositiveInfinity)]
    public void SurchargeDepth_OutOfRange_Throws(double velocity, double shapeCoefficient) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Flow.SurchargeDepth(velocity, shapeCoefficient));

    [Fact]
    public void SurchargeDepth_StillWater_None() => Assert.Equal(0, Flow.SurchargeDepth(0, 1.25));

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void DragCoefficient_RatioNotAboveZero_Throws(double ratio) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Flow.DragCoefficient(ratio));

    /// <summary>Faster water never presses less, also across the change of method.</summary>
    [Fact]
    public void Pressure_FasterWater_NeverLess()
    {
        var pressures = Enumerable.Range(0, 800)
            .Select(i => Flow.Pressure(i / 100.0, 1.25, 9_806.65, clearWidth: 5, wettedHeight: 1))
            .ToArray();

        Assert.Equal(pressures.Order(), pressures);
    }
}
