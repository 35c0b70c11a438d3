using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Check values of Goda's and Sainflou's formulas (USACE EM 1110-2-1100, Tables VI-5-53 and VI-5-52), derived and
/// recomputed outside this code; no document prints them. A wall without a mound on a level bed: h 1.0, H_max 0.54, T 3 s,
/// h_c 0.30 m, ρ 1025. Worked with g = 9.81: unit weight and period are set so that γ and g·T² are the same.
/// </summary>
public class DerivedWaveTests
{
    private const double UnitWeight = 1025 * 9.81;

    private static readonly double Period = 3 * Math.Sqrt(9.81 / Physics.Gravity);

    [Fact]
    public void Goda_HeadOn_LengthCoefficientsAndPressures()
    {
        var wave = Wave(0);

        Assert.Equal(8.693, 2 * Math.PI / wave.WaveNumber, tolerance: 0.0005);
        Assert.Equal(0.8601, wave.Alpha1, tolerance: 0.00005);
        Assert.Equal(0, wave.Alpha2);
        Assert.Equal(0.7857, wave.Alpha3, tolerance: 0.00005);
        Assert.Equal(0.81, wave.Crest, tolerance: 0.005);
        Assert.Equal(4.670, wave.AtStillWater / 1000, tolerance: 0.0005);
        Assert.Equal(3.669, wave.AtFoot / 1000, tolerance: 0.0005);
        Assert.Equal(2.940, wave.At(0.30) / 1000, tolerance: 0.0005);
    }

    [Theory]
    [InlineData(0, 4.670, 5.311, 3.468)]
    [InlineData(15, 4.591, 5.216, 3.404)]
    public void Goda_Angle_PressureForceAndMomentAboutTheFoot(double degrees, double pressure, double force, double moment)
    {
        var wave = Wave(double.DegreesToRadians(degrees));

        var diagram = PressureDiagram.Of(
            new PressurePiece(0, 1, wave.AtFoot, wave.AtStillWater, 1),
            new PressurePiece(1, 1 + wave.Crest, wave.AtStillWater, 0, 1).Within(0, 1.30));

        Assert.Equal(pressure, wave.AtStillWater / 1000, tolerance: 0.0005);
        Assert.Equal(force, diagram.Force / 1000, tolerance: 0.0005);
        Assert.Equal(moment, diagram.Force * diagram.CentreOfPressure!.Value / 1000, tolerance: 0.0005);
    }

    /// <summary>The same wave typed in degrees, through the whole calculation: 15 radians would give another figure.</summary>
    [Fact]
    public void Goda_AngleTypedInDegrees_SamePressure()
    {
        var density = UnitWeight / Physics.Gravity;
        var dock = SampleProject.Dock with
        {
            SillLevel = 0,
            Actions = new() { Wave = new NonBreakingWaveInput { Height = 0.54, Period = Period, AngleDegrees = 15 } },
        };
        var site = SampleProject.Project.Site with { WaterDensity = density, DesignStillWaterLevel = 1, Surge = 0, ClimateAllowance = 0 };

        var result = SampleProject.Result(SampleProject.Project with { Site = site, Openings = [dock] });

        var wave = result.Cases.Single(c => c.Name == "wave").Actions.Single(a => a.Kind == ActionKind.Wave);
        Assert.Equal(4.591, wave.Pieces.Max(p => p.AtTop) / 1000, tolerance: 0.0005);
    }

    /// <summary>
    /// A public routine prints 187.7356 psf as its self-check for H_m0 6.4 ft, T_p 7.7 s, "β = 2", h 18.9, d 16.9 ft, bed 1:10,
    /// which it reaches only by taking 2 as radians. By degrees it is 652.9 psf, recomputed outside this code; an angle
    /// of 2 radians lies beyond the wall and is refused.
    /// </summary>
    [Fact]
    public void Goda_AngleOfTwo_DegreesAndNotRadians()
    {
        const double foot = 0.3048;
        var unitWeight = Units.ToSI(64, Dimension.UnitWeight, UnitSystem.USCustomary);
        var depths = new WaveDepths(18.9 * foot, 16.9 * foot, 16.9 * foot, (18.9 + 5 * 6.4 / 10) * foot);
        GodaWave At(double angle) => GodaWave.Of(1.8 * 6.4 * foot, 7.7 / 1.1, angle, unitWeight, depths);

        var pressure = Units.FromSI(At(double.DegreesToRadians(2)).AtStillWater, Dimension.Pressure, UnitSystem.USCustomary);

        Assert.Equal(652.9, pressure, tolerance: 0.05);
        Assert.Throws<ArgumentOutOfRangeException>(() => At(2));
    }

    /// <summary>The wave taken as regular: δ_0 0.170 m, p_1 5.948, p_2 4.266, p_3 3.717 kPa, 7.22 kN/m at the crest.</summary>
    [Fact]
    public void Sainflou_SameWave_SetUpPressuresAndForce()
    {
        var wave = SainflouWave.Of(0.54, Dispersion.WaveNumber(Period, 1), 1, UnitWeight);

        Assert.Equal(0.170, wave.SetUp, tolerance: 0.0005);
        Assert.Equal(5.948, wave.AtStillWater / 1000, tolerance: 0.0005);
        Assert.Equal(4.266, wave.AtFoot / 1000, tolerance: 0.0005);
        Assert.Equal(3.717, wave.AtTrough / 1000, tolerance: 0.0005);
        Assert.Equal(7.22, wave.CrestForce / 1000, tolerance: 0.005);
    }

    private static GodaWave Wave(double angle) => GodaWave.Of(0.54, Period, angle, UnitWeight, new(1, 1, 1, 1));
}
