using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

/// <summary>The dock: flood level 4.45 m, sill 3.6 m, barrier 1.2 m.</summary>
public class WaveNotesTests
{
    private static readonly NonBreakingWaveInput Low = new() { Height = 0.2, Period = 2.8 };

    [Fact]
    public void Notes_NoWave_None() => Assert.Empty(Notes(null));

    /// <summary>Crest 0.85 + 1.5·0.2 = 1.15 m: under the top.</summary>
    [Fact]
    public void Notes_LowNonBreakingWave_None() => Assert.Empty(Notes(Low));

    [Fact]
    public void DryGround_FloodNotAboveTheGround_SaysThatNoWaveComes()
    {
        var note = Assert.Single(Notes(Low, o => o with { GroundLevel = 4.45 }));

        Assert.Equal("wave-dry-ground", note.Code);
    }

    /// <summary>
    /// On a level bed by hand: L_0 = 9.80665·2.8²/2π = 12.236 m, 0.17·L_0·(1 − exp(−1.5π·0.85/L_0)) = 0.581 m.
    /// </summary>
    [Fact]
    public void NotCovered_HigherThanTheDepthAllows_NamesTheLimitInBothSystems()
    {
        var note = Assert.Single(Notes(Low with { Height = 0.7 }));

        Assert.Equal("wave-not-covered", note.Code);
        Assert.StartsWith("A wave of 0.7 m cannot stand in 0.850 m of water: the depth lets through 0.581 m,", note.Text.In(UnitSystem.SI), StringComparison.Ordinal);
        Assert.Contains("lets through 1.91 ft", note.Text.In(UnitSystem.USCustomary), StringComparison.Ordinal);
    }

    [Fact]
    public void NotCovered_BedTooSteep_NamesTheSlope()
    {
        var note = Assert.Single(Notes(Low with { BedSlope = 0.2 }));

        Assert.Equal("wave-not-covered", note.Code);
        Assert.StartsWith("The bed rises by 0.200, and the method covers no more than 0.100:", note.Text.ToString(), StringComparison.Ordinal);
    }

    /// <summary>By hand: η* = 1.5·0.234 = 0.351 m reaches 1 mm over the top, which is not yet told; 0.3 m reaches 0.1 m over.</summary>
    [Fact]
    public void Overtopping_CrestMoreThanAMillimetreOverTheTop()
    {
        Assert.Empty(Notes(Low with { Height = 0.2339 }));
        var note = Assert.Single(Notes(Low with { Height = 0.3 }));

        Assert.Equal("wave-overtopping", note.Code);
        Assert.StartsWith("Wave crests reach 0.100 m above the top of the barrier", note.Text.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void RakedFace_NotReduced() =>
        Assert.Equal("wave-raked-face", Assert.Single(Notes(Low with { Height = 0.02 }, o => o with { RakeDegrees = 10 })).Code);

    [Fact]
    public void HeadOn_BreakingWave() =>
        Assert.Equal(["wave-overtopping", "wave-head-on"], Notes(new BreakingWaveInput()).Select(n => n.Code));

    private static Note[] Notes(WaveInput? wave, Func<Opening, Opening>? change = null)
    {
        var project = Refused.With((Opening o) => (change ?? (x => x))(o with { Actions = new() { Wave = wave } }));
        return [.. SampleProject.Result(project).Notes.Where(n => n.Code.StartsWith("wave-", StringComparison.Ordinal))];
    }
}
