using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// ASCE 7, C5.4.5: F = π·W·V·C/(2·g·Δt) with C_I by risk category and C_O from memory, C_D and C_B from a secondary source,
/// and the response by Δt/T_n from memory. The commentary prints no example: the values are its formula worked by hand.
/// </summary>
public class Asce7DebrisTests
{
    /// <summary>454 kg at 2 m/s stopped in 0.03 s, C_D 0.5, C_O 0.8, R 0.8: π·454·2·0.32/0.06 = 15.2 kN.</summary>
    [Fact]
    public void Force_ThousandPoundsAtTwoMetresPerSecond_ByHand() =>
        Assert.Equal(15.2, DebrisImpact.Force(454, 2, 0.03, 0.5 * 0.8 * 0.8) / 1000, tolerance: 0.05);

    /// <summary>In US units: W 1000 lb, V 10 ft/s, Δt 0.03 s, C 1: π·1000·10/(2·32.174·0.03) = 16 274 lb.</summary>
    [Fact]
    public void Force_ThousandPoundsAtTenFeetPerSecond_ByHand()
    {
        var mass = Units.ToSI(1000, Dimension.Mass, UnitSystem.USCustomary);

        var force = DebrisImpact.Force(mass, 3.048, 0.03, 1);

        Assert.Equal(16_274, Units.FromSI(force, Dimension.Force, UnitSystem.USCustomary), tolerance: 0.5);
    }

    /// <summary>0.25·(d_s − 1) in ft: nothing at 1 ft, 0.25, 0.50, 0.75 at 2, 3, 4 ft, 1.0 from 5 ft.</summary>
    [Theory]
    [InlineData(0.5, 0)]
    [InlineData(1, 0)]
    [InlineData(2, 0.25)]
    [InlineData(3, 0.50)]
    [InlineData(4, 0.75)]
    [InlineData(5, 1)]
    [InlineData(9, 1)]
    public void Depth_Feet_Coefficient(double feet, double coefficient) =>
        Hand.Equal(coefficient, DebrisTables.ShallowDepth(feet * 0.3048));

    /// <summary>Ground above the flood is below zero depth; what is no number is refused.</summary>
    [Fact]
    public void Depth_DryOrNotFinite_ZeroOrThrows()
    {
        Assert.Equal(0, DebrisTables.ShallowDepth(-2));
        Assert.Throws<ArgumentOutOfRangeException>(() => DebrisTables.ShallowDepth(double.NaN));
    }

    [Fact]
    public void Tables_Words_HoldTheirNumbers()
    {
        Assert.Equal([0.6, 1.0, 1.2, 1.3], DebrisTables.Importance.Select(c => c.Value));
        Assert.Equal([0.8, 1.0], DebrisTables.Orientation.Select(c => c.Value));
        Assert.Equal([1.0, 0.6, 0.2, 0.0], DebrisTables.Blockage.Select(c => c.Value));
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(0.1, 0.4)]
    [InlineData(0.25, 0.95)]
    [InlineData(0.5, 1.5)]
    [InlineData(0.75, 1.8)]
    [InlineData(1.0, 1.7)]
    [InlineData(1.4, 1.5)]
    [InlineData(20, 1.5)]
    public void Response_RatioOfTimes_TableWithStraightLinesBetween(double ratio, double response) =>
        Hand.Equal(response, ResponseRatio.Of(ratio));

    /// <summary>The remembered table stays within 0.1 of the exact spectrum from 0.1 to 1.4.</summary>
    [Fact]
    public void Response_Table_FollowsTheExactSpectrum() => Assert.All(
        Enumerable.Range(1, 14).Select(i => i / 10.0),
        ratio => Assert.Equal(ResponseRatio.HalfSine(ratio), ResponseRatio.Of(ratio), tolerance: 0.1));

    /// <summary>A stop twice as short is twice as hard.</summary>
    [Fact]
    public void Force_StopHalved_ForceDoubled() =>
        Hand.Equal(2 * DebrisImpact.Force(450, 1.5, 0.1, 1), DebrisImpact.Force(450, 1.5, 0.05, 1));

    [Fact]
    public void Force_MassOrVelocityDoubled_ForceDoubled()
    {
        var force = DebrisImpact.Force(450, 1.5, 0.1, 1);

        Hand.Equal(2 * force, DebrisImpact.Force(900, 1.5, 0.1, 1));
        Hand.Equal(2 * force, DebrisImpact.Force(450, 3, 0.1, 1));
    }

    [Theory]
    [InlineData(-1, 1, 0.03, 1)]
    [InlineData(450, -1, 0.03, 1)]
    [InlineData(450, 1, 0, 1)]
    [InlineData(450, 1, 0.03, -1)]
    [InlineData(double.NaN, 1, 0.03, 1)]
    public void Force_OutOfRange_Throws(double mass, double velocity, double stop, double coefficient) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DebrisImpact.Force(mass, velocity, stop, coefficient));

    [Fact]
    public void WithoutResponse_FourFactors_TheirProduct() => Hand.Equal(
        1.3 * 0.8 * 0.75 * 0.6,
        DebrisImpact.WithoutResponse(new DebrisCoefficients { Importance = 1.3, Orientation = 0.8, Depth = 0.75, Blockage = 0.6, Response = 9 }));
}
