using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// ASCE 7, 5.4.3, equivalent surcharge d_h = a·V²/(2g) up to 10 ft/s (read in an ordinance that reproduces the
/// federal text). The standard prints no example: the depths are its formula worked by hand to the millimetre.
/// </summary>
public class Asce7FlowTests
{
    [Theory]
    [InlineData(1, 0.064)]
    [InlineData(2, 0.255)]
    [InlineData(3.05, 0.593)]
    public void Section543_ShapeCoefficient125_SurchargeDepth(double velocity, double depth) =>
        Assert.Equal(depth, Flow.SurchargeDepth(velocity, 1.25), tolerance: 0.0005);

    /// <summary>10 ft/s is 3.048 m/s: the limit in metres must not cut it off.</summary>
    [Fact]
    public void Section543_TenFeetPerSecond_WithinTheMethod() =>
        Assert.True(Units.ToSI(10, Dimension.Velocity, UnitSystem.USCustomary) <= Flow.SurchargeVelocityLimit);

    /// <summary>The same pressure as a depth of water: γ·d_h, and no more with the water deeper.</summary>
    [Theory]
    [InlineData(0.2)]
    [InlineData(2.0)]
    public void Section543_Pressure_IsUnitWeightTimesSurchargeDepth(double wettedHeight)
    {
        var pressure = Flow.Pressure(2, 1.25, unitWeight: 9_806.65, clearWidth: 3, wettedHeight);

        Hand.Equal(1.25 * 4 / 2 * 1000, pressure);
    }
}
