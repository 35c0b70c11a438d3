using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// FEMA P-55 vol. II (2011), Eq. 8.9, F = W·V·C_D·C_B·C_Str, applied in a public specification read in a secondary text:
/// W 1000 lb, d_s 4 ft, C_D 0.75, no screening; V = ½·√(g·d_s) with g = 32.2 ft/s². Printed 3,405 lb for a concrete wall
/// (C_Str 0.8 s/ft) and 851 lb for a timber pile (0.2 s/ft).
/// </summary>
public class FemaP55DebrisTests
{
    private const double Foot = 0.3048;

    [Theory]
    [InlineData(0.8, 3_405)]
    [InlineData(0.2, 851)]
    public void Equation89_ThousandPoundsInFourFeet_AsPrinted(double structure, double printed)
    {
        var mass = Units.ToSI(1000, Dimension.Mass, UnitSystem.USCustomary);
        var velocity = Math.Sqrt(32.2 * 4) / 2 * Foot;

        var force = DebrisComparison.FemaForce(mass, velocity, depthAndBlockage: 0.75, structure);

        Assert.Equal(printed, Units.FromSI(force, Dimension.Force, UnitSystem.USCustomary), tolerance: 0.5);
    }

    /// <summary>454 kg at 2 m/s, worked out outside this code: 0.9 kN in 1 s, 1.8 in 0.5 s, 17.5 by FEMA on a concrete wall in 4 ft.</summary>
    [Fact]
    public void Comparison_SameObject_SpreadOfTwenty()
    {
        var input = new DebrisInput { Mass = 454, Velocity = 2, Coefficients = new() { Depth = 0.75 } };

        var estimates = DebrisComparison.Of(input, force: 1);

        double Of(string method) => estimates.Single(e => e.Method.StartsWith(method, StringComparison.Ordinal)).Force / 1000;
        Assert.Equal(0.9, Of("Stopped evenly in 1 s"), tolerance: 0.05);
        Assert.Equal(1.8, Of("Stopped evenly in 0.5 s"), tolerance: 0.05);
        Assert.Equal(17.5, Of("Concrete wall"), tolerance: 0.05);
        Assert.All(estimates, e => Assert.NotEmpty(e.Source));
    }

    /// <summary>Eq. 8.2 and ASCE 7, C5.4: V = d_s/1 s and √(g·d_s); 1.5 m gives 1.5 and 3.835 m/s.</summary>
    [Fact]
    public void Equation82_Depth_VelocityBounds()
    {
        Hand.Equal(1.5, VelocityEstimate.Lower(1.5));
        Assert.Equal(3.835, VelocityEstimate.Upper(1.5), tolerance: 0.0005);
        Assert.Throws<ArgumentOutOfRangeException>(() => VelocityEstimate.Lower(-0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => VelocityEstimate.Upper(double.NaN));
    }
}
