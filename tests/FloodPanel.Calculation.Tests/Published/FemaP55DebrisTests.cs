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

    /// <summary>
    /// By hand: in 4 ft (1.2192 m) √(9.80665·1.2192)/2 = 1.7289 m/s, and 454·9.80665·1.7289·0.75·0.8/0.3048 = 15 152 N;
    /// 100 lb/ft (1459.39 N/m) over 2 m are 2918.8 N.
    /// </summary>
    [Fact]
    public void Comparison_PlaceKnown_RowsThatFollowFromIt()
    {
        var input = new DebrisInput { Mass = 454, Velocity = 2, Coefficients = new() { Depth = 0.75 } };

        var (without, with) = (DebrisComparison.Of(input, force: 1), DebrisComparison.Of(input, force: 1, groundDepth: 1.2192, span: 2));

        var added = with.Except(without).Select(e => e.Force).ToArray();
        Assert.Equal(2, added.Length);
        Assert.Equal(15_152, added[0], tolerance: 1);
        Assert.Equal(2918.8, added[1], tolerance: 0.05);
        Assert.Equal(without, with.Intersect(without));
    }

    /// <summary>Ground that stays dry has no velocity of its own.</summary>
    [Fact]
    public void Comparison_DryGround_NoForceAtFemasVelocity() => Assert.Equal(
        0, DebrisComparison.Of(new() { Velocity = 1 }, force: 1, groundDepth: -0.3).Single(e => e.Method.Contains("own velocity", StringComparison.Ordinal)).Force);

    [Theory]
    [InlineData(-1, 1, 1, 0.8)]
    [InlineData(454, -1, 1, 0.8)]
    [InlineData(454, 1, -1, 0.8)]
    [InlineData(454, 1, 1, double.NaN)]
    public void Equation89_OutOfRange_Throws(double mass, double velocity, double factors, double structure) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DebrisComparison.FemaForce(mass, velocity, factors, structure));

    [Theory]
    [InlineData(-1, 1, 1)]
    [InlineData(454, double.PositiveInfinity, 1)]
    [InlineData(454, 1, 0)]
    public void EvenStop_OutOfRange_Throws(double mass, double velocity, double stop) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DebrisComparison.EvenStop(mass, velocity, stop));

    [Fact]
    public void SpecialImpact_NegativeSpan_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DebrisComparison.SpecialImpact(-1));

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
