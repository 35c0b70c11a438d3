using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Breaking wave on a vertical wall, ASCE 7, 5.4.4.2; FEMA P-55 vol. II (2011), Eq. 8.6 (formulas read in a stored copy;
/// C_p of risk categories I, II and IV from memory, of III in a secondary text): F = 1.1·C_p·γ·d_s² + 2.4·γ·d_s² with
/// dry space behind the wall, 1.9 for 2.4 with water as deep behind it, P_max = C_p·γ·d_s + 1.2·γ·d_s.
/// </summary>
public class BreakingWaveTotalTests
{
    private const double Foot = 0.3048;

    /// <summary>Hydrostatic triangle of 2.2·d_s: ½·2.2² = 2.42, printed 2.4; less ½ behind, 1.92, printed 1.9.</summary>
    [Theory]
    [InlineData(1, 1.6)]
    [InlineData(2, 2.8)]
    [InlineData(3, 3.2)]
    [InlineData(4, 3.5)]
    public void Equation86_WallAboveTheCrest_PublishedTotalsComeOutOfTheIntegral(int category, double coefficient)
    {
        var dry = Total(category, depth: 1, height: 3, behind: 0).Force;
        var wet = Total(category, depth: 1, height: 3, behind: 1).Force;

        Hand.Equal(1.1 * coefficient + 2.42, dry);
        Hand.Equal(1.1 * coefficient + 1.92, wet);
        Assert.Equal(2.4, dry - 1.1 * coefficient, tolerance: 0.05);
        Assert.Equal(1.9, wet - 1.1 * coefficient, tolerance: 0.05);
    }

    /// <summary>
    /// Worked out outside this code, z_R/d_s = [1.1·C_p·(3.2/3) + 2.42·(2.2/3)]/(1.1·C_p + 2.42). The standard places the
    /// force at d_s, which is higher.
    /// </summary>
    [Theory]
    [InlineData(1, 0.874)]
    [InlineData(2, 0.920)]
    [InlineData(3, 0.931)]
    [InlineData(4, 0.938)]
    public void Equation86_WallAboveTheCrest_LineOfActionBelowStillWater(int category, double height) =>
        Assert.Equal(height, Total(category, depth: 1, height: 3, behind: 0).CentreOfPressure!.Value, tolerance: 0.0005);

    /// <summary>γ = 10.05 kN/m³, d_s = 0.9 m, C_p 2.8, worked out outside this code: whole, and cut 0.30 m above still water.</summary>
    [Theory]
    [InlineData(3.0, 44.77, 0.828)]
    [InlineData(1.2, 34.58, 0.642)]
    public void Derived_SaltWaterNinetyCentimetres_ForceAndHeight(double height, double force, double centre)
    {
        var total = Total(2, depth: 0.9, height, behind: 0, unitWeight: 10.05);

        Assert.Equal(force, total.Force, tolerance: 0.005);
        Assert.Equal(centre, total.CentreOfPressure!.Value, tolerance: 0.0005);
    }

    /// <summary>
    /// Derived for a flood wall with d_s = 0.65·5 = 3.25 ft of 64 pcf: P_max 832 and 582 psf; totals of 3704 and 3366, 2812
    /// and 2474 lb/ft by the printed 2.4 and 1.9. The integral keeps 2.42 and 1.92: 0.02·64·3.25² = 13.52 lb/ft more.
    /// </summary>
    [Theory]
    [InlineData(2, 832, 3_704, 3_366)]
    [InlineData(1, 582, 2_812, 2_474)]
    public void Derived_FloodWall_PeakPressureAndTotals(int category, double peak, double dry, double wet)
    {
        var unitWeight = Units.ToSI(64, Dimension.UnitWeight, UnitSystem.USCustomary);
        var depth = 3.25 * Foot;
        var wave = BreakingWave.Pressure(BreakingWave.PressureCoefficient(category), unitWeight, depth, ground: 0);

        Assert.Equal(peak, Units.FromSI(wave.ToStillWater.AtTop, Dimension.Pressure, UnitSystem.USCustomary), tolerance: 0.5);
        Assert.Equal(dry, PoundsPerFoot(Total(category, depth, 3 * depth, 0, unitWeight)) - 13.52, tolerance: 0.6);
        Assert.Equal(wet, PoundsPerFoot(Total(category, depth, 3 * depth, depth, unitWeight)) - 13.52, tolerance: 0.6);
    }

    /// <summary>Still water, the wave, and water behind, on a wall whose foot is at ground.</summary>
    private static PressureDiagram Total(int category, double depth, double height, double behind, double unitWeight = 1)
    {
        var wave = BreakingWave.Pressure(BreakingWave.PressureCoefficient(category), unitWeight, depth, ground: 0);
        var opposite = Hydrostatic.Side(unitWeight, behind, height, 1);
        return PressureDiagram.Of(
            Hydrostatic.Side(unitWeight, depth, height, 1),
            opposite with { AtBottom = -opposite.AtBottom, AtTop = -opposite.AtTop },
            wave.ToStillWater.Within(0, height),
            wave.ToCrest.Within(0, height));
    }

    private static double PoundsPerFoot(PressureDiagram diagram) =>
        Units.FromSI(diagram.Force, Dimension.LineForce, UnitSystem.USCustomary);
}
