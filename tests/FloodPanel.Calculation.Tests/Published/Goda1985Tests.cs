using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Y. Goda, Random Seas and Design of Maritime Structures (1985), as in the public test set of a Dutch coastal research
/// institute's structures library, read in a stored copy: h 5, d 4, h′ 6, h_c 5 m, β 0, ρ 1025, bed 1:100, T 8 s. The foot
/// deeper than the bed is an arithmetic test. Worked with g = 9.81: unit weight and period are set so that γ and g·T²
/// are those of the source.
/// </summary>
public class Goda1985Tests
{
    private const double SourceGravity = 9.81;

    /// <summary>(b) H_D 3.60, H_s 2.0: printed p_1 35.403 kPa and F_H 288.01 kN/m.</summary>
    [Fact]
    public void CaseB_PressureAndForce_AsPrinted()
    {
        var wave = Wave(3.60, 2.0);

        Assert.Equal(35.403, wave.AtStillWater / 1000, tolerance: 0.0005);
        Assert.Equal(288.01, Force(wave) / 1000, tolerance: 0.005);
    }

    /// <summary>
    /// (a) H_D 5.07, H_s 2.75: printed p_1 52.9407 kPa and F_H 466.22 kN/m. The source takes h_b from an H_s that it prints
    /// rounded, which makes 0.01 %.
    /// </summary>
    [Fact]
    public void CaseA_PressureAndForce_AsPrintedWithin1In5000()
    {
        var wave = Wave(5.07, 2.75);

        Assert.Equal(52.9407, wave.AtStillWater / 1000, tolerance: 52.9407 / 5000);
        Assert.Equal(466.22, Force(wave) / 1000, tolerance: 466.22 / 5000);
    }

    /// <summary>(a), worked out outside this code: α 0.9198, 0.1186, 0.8167; p_1 52.935, p_3 43.23, p_4 18.13 kPa; 466.17 kN/m.</summary>
    [Fact]
    public void CaseA_Coefficients_AsRecomputed()
    {
        var wave = Wave(5.07, 2.75);

        Assert.Equal(0.9198, wave.Alpha1, tolerance: 0.00005);
        Assert.Equal(0.1186, wave.Alpha2, tolerance: 0.00005);
        Assert.Equal(0.8167, wave.Alpha3, tolerance: 0.00005);
        Assert.Equal(52.935, wave.AtStillWater / 1000, tolerance: 0.0005);
        Assert.Equal(43.23, wave.AtFoot / 1000, tolerance: 0.005);
        Assert.Equal(18.13, wave.At(5) / 1000, tolerance: 0.005);
        Assert.Equal(466.17, Force(wave) / 1000, tolerance: 0.005);
    }

    private static GodaWave Wave(double height, double significant) => GodaWave.Of(
        height,
        period: 8 * Math.Sqrt(SourceGravity / Physics.Gravity),
        angle: 0,
        unitWeight: 1025 * SourceGravity,
        new(Wall: 5, Foot: 6, Berm: 4, Seaward: 5 + 5 * significant / 100));

    /// <summary>From the foot, 6 m below still water, to the top of the wall, 5 m above.</summary>
    private static double Force(GodaWave wave) => PressureDiagram.Of(
        new(-6, 0, wave.AtFoot, wave.AtStillWater, 1),
        new(0, wave.Crest, wave.AtStillWater, 0, 1)).Within(-6, 5).Characteristic;
}
