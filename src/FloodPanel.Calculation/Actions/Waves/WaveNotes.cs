using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>What the reader of a wave load must know.</summary>
internal static class WaveNotes
{
    public static IEnumerable<Note> Of(WaveModel wave, double rake)
    {
        if (wave.IsDry)
        {
            yield return new("wave-dry-ground", new(
                $"Outside ground stays dry in the design flood: no wave reaches this opening, and the wave case holds still water only."));
            yield break;
        }

        if (wave is { IsTooSteep: true, Input: NonBreakingWaveInput steep })
        {
            yield return new("wave-not-covered", new(
                $"The bed rises by {new Quantity(steep.BedSlope, Dimension.Ratio)}, and the method covers no more than {new Quantity(GodaWave.SteepestBed, Dimension.Ratio)}: on a steeper bed waves may break on the barrier. Take the waves as breaking."));
            yield break;
        }

        if (wave is { IsCovered: false, Input: NonBreakingWaveInput high, GreatestHeight: { } limit })
        {
            yield return new("wave-not-covered", new(
                $"A wave of {Length(high.Height):typed} cannot stand in {Length(wave.Setting.GroundDepth)} of water: the depth lets through {Length(limit)}, and the method covers no more. Enter at most that height, or take the waves as breaking."));
            yield break;
        }

        if (wave.CrestHeight > wave.Setting.Height + FloodLevels.HeightTolerance)
        {
            yield return new("wave-overtopping", new(
                $"Wave crests reach {Length(wave.CrestHeight - wave.Setting.Height)} above the top of the barrier: water comes over it. What passes over does not load it."));
        }

        if (rake > 0)
        {
            yield return new("wave-raked-face", new(
                $"The wave load is that on a vertical face; on the raked face it is not reduced, which is safe."));
        }

        if (wave.Input is BreakingWaveInput)
        {
            yield return new("wave-head-on", new(
                $"Breaking waves are taken to meet the barrier head-on, whatever their direction, which is safe; flow is not added to them."));
        }
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);
}
