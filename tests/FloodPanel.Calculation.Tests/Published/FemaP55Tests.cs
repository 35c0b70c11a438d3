using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// FEMA P-55, Coastal Construction Manual, vol. II (2011): unit weights of Eq. 8.6 (read in a stored copy) and drag
/// by Eq. 8.8 (read) with the coefficients of Table 8-2 (values from memory; the entry for 41 to 80 is remembered
/// as 1.6 or 1.75, and the larger is used).
/// </summary>
public class FemaP55Tests
{
    /// <summary>62.4 lb/ft³ fresh, 64.0 lb/ft³ salt.</summary>
    [Theory]
    [InlineData(1000, 62.4)]
    [InlineData(1025, 64.0)]
    public void Equation86_UnitWeight_AsPrinted(double density, double printed)
    {
        var unitWeight = Units.FromSI(Hydrostatic.UnitWeight(density), Dimension.UnitWeight, UnitSystem.USCustomary);

        Assert.Equal(printed, unitWeight, tolerance: 0.05);
    }

    /// <summary>
    /// With the printed unit weights, by hand: 3 ft of fresh water 62.4·3 = 187.2 psf and 62.4·3²/2 = 280.8 lb/ft;
    /// of salt water 192 psf and 288 lb/ft.
    /// </summary>
    [Theory]
    [InlineData(62.4, 187.2, 280.8)]
    [InlineData(64.0, 192.0, 288.0)]
    public void UnitWeight_ThreeFeetOfWater_PressureAndThrust(double perCubicFoot, double pressure, double thrust)
    {
        var unitWeight = Units.ToSI(perCubicFoot, Dimension.UnitWeight, UnitSystem.USCustomary);
        var depth = Units.ToSI(3, Dimension.Length, UnitSystem.USCustomary);

        var piece = Hydrostatic.Side(unitWeight, depth, height: 2 * depth, factor: 1);

        Hand.Equal(pressure, Units.FromSI(piece.AtBottom, Dimension.Pressure, UnitSystem.USCustomary));
        Hand.Equal(thrust, Units.FromSI(piece.Force, Dimension.LineForce, UnitSystem.USCustomary));
    }

    /// <summary>Table 8-2, each row at its end and just beyond.</summary>
    [Theory]
    [InlineData(1, 1.25)]
    [InlineData(12, 1.25)]
    [InlineData(12.001, 1.3)]
    [InlineData(20, 1.3)]
    [InlineData(20.001, 1.4)]
    [InlineData(32, 1.4)]
    [InlineData(32.001, 1.5)]
    [InlineData(40, 1.5)]
    [InlineData(40.001, 1.75)]
    [InlineData(80, 1.75)]
    [InlineData(80.001, 1.8)]
    [InlineData(120, 1.8)]
    [InlineData(120.001, 2.0)]
    public void Table82_WidthToDepth_DragCoefficient(double ratio, double coefficient) =>
        Assert.Equal(coefficient, Flow.DragCoefficient(ratio));

    /// <summary>Eq. 8.8, p = C_d·ρ·V²/2 at 4 m/s, ρ = 1000, width 30 times the depth: 1.4·1000·16/2 = 11.2 kPa.</summary>
    [Fact]
    public void Equation88_FourMetresPerSecond_Pressure()
    {
        var pressure = Flow.Pressure(4, 1.25, 1000 * Physics.Gravity, clearWidth: 30, wettedHeight: 1);

        Hand.Equal(11_200, pressure);
    }

    /// <summary>The drag is never taken below the surcharge method: a = 2 gives 2·1000·16/2 = 16 kPa.</summary>
    [Fact]
    public void Equation88_LargeShapeCoefficient_SurchargeRules()
    {
        var pressure = Flow.Pressure(4, 2, 1000 * Physics.Gravity, clearWidth: 30, wettedHeight: 1);

        Hand.Equal(16_000, pressure);
    }

    /// <summary>Up to 3.05 m/s the surcharge method stands whatever the width: 1.25·1000·3.05²/2.</summary>
    [Fact]
    public void Equation88_AtTheLimitOfTheSurchargeMethod_NoDrag()
    {
        var pressure = Flow.Pressure(3.05, 1.25, 1000 * Physics.Gravity, clearWidth: 200, wettedHeight: 1);

        Hand.Equal(5_814.0625, pressure);
    }
}
