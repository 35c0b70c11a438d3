using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

public class SainflouWaveTests
{
    /// <summary>
    /// The diagram is one straight line from nothing at the crest to γ·h + p_2 at the bed, less still water: the force is
    /// ½·(h + H + δ_0)·(γ·h + p_2) − ½·γ·h².
    /// </summary>
    [Theory]
    [InlineData(0.3, 0.7, 1)]
    [InlineData(1.2, 0.2, 4)]
    public void CrestForce_AnyWave_WholeTriangleLessStillWater(double height, double waveNumber, double depth)
    {
        var wave = SainflouWave.Of(height, waveNumber, depth, unitWeight: 10_000);

        var whole = (depth + height + wave.SetUp) / 2 * (10_000 * depth + wave.AtFoot);

        Hand.Equal(whole - 10_000 * depth * depth / 2, wave.CrestForce);
    }

    /// <summary>In deep water nothing reaches the bed, and δ_0 → π·H²/L = k·H²/2.</summary>
    [Fact]
    public void Of_DeepWater_NothingAtTheFoot()
    {
        var wave = SainflouWave.Of(0.3, 2, 30, 10_000);

        Assert.Equal(0, wave.AtFoot, tolerance: 1e-9);
        Hand.Equal(0.09, wave.SetUp);
    }

    [Theory]
    [InlineData(0, 1, 1, 1)]
    [InlineData(1, 0, 1, 1)]
    [InlineData(1, 1, double.NaN, 1)]
    [InlineData(1, 1, 1, -1)]
    public void Of_OutOfRange_Throws(double height, double waveNumber, double depth, double unitWeight) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SainflouWave.Of(height, waveNumber, depth, unitWeight));
}
