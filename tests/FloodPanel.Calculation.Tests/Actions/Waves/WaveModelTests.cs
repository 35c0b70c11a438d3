using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Waves;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Actions.Waves;

/// <summary>The dock: 0.85 m of water above the sill, barrier 1.2 m high.</summary>
public class WaveModelTests
{
    private static readonly NonBreakingWaveInput Swell = new() { Height = 0.3, Period = 2.8, BedSlope = 0.02 };

    private static readonly BreakingWaveInput Breakers = new() { RiskCategory = 2 };

    [Fact]
    public void Of_NoWave_None() => Assert.Null(WaveModel.Of(null, 10_000, 0.85, 0.85, 1.2));

    /// <summary>Both methods: pressure meets at still water, ends at the barrier's top, and presses nowhere outside.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Pieces_AnyOpening_WithinTheBarrierWithoutSuctionOrSteps(Scenario scenario)
    {
        Assert.All(scenario.Result.Cases.Where(c => c.Name == "wave"), @case =>
        {
            var pieces = @case.Actions.Single(a => a.Kind == ActionKind.Wave).Pieces;
            Assert.All(pieces, piece =>
            {
                Assert.InRange(piece.Bottom, 0, piece.Top);
                Assert.InRange(piece.Top, 0, scenario.Result.BarrierHeight);
                Assert.True(piece is { AtBottom: >= 0, AtTop: >= 0 });
            });
            Assert.All(pieces.Zip(pieces.Skip(1)), pair =>
            {
                Assert.Equal(pair.First.Top, pair.Second.Bottom, tolerance: 1e-12);
                Assert.Equal(pair.First.AtTop, pair.Second.AtBottom, tolerance: 1e-9 * pair.First.AtTop);
            });
        });
    }

    /// <summary>By hand: 0.85 + 1.5·0.3 for Goda, 2.2·0.85 for a breaking wave.</summary>
    [Fact]
    public void CrestHeight_GroundAtTheSill_ByHand()
    {
        Hand.Equal(1.3, Model(Swell).CrestHeight);
        Hand.Equal(1.87, Model(Breakers).CrestHeight);
    }

    /// <summary>Ground 0.5 m below the sill: 2.2·1.35 − 0.5.</summary>
    [Fact]
    public void CrestHeight_GroundBelowTheSill_FromGround() =>
        Hand.Equal(2.47, WaveModel.Of(Breakers, 10_000, 0.85, 1.35, 1.2)!.CrestHeight);

    [Fact]
    public void IncludesFlow_OnlyTheBreakingWave()
    {
        Assert.True(Model(Breakers).IncludesFlow);
        Assert.False(Model(Swell).IncludesFlow);
    }

    [Fact]
    public void IsCovered_WaveOfTheGreatestHeight_CoveredAndNoHigher()
    {
        var greatest = Model(Swell).GreatestHeight!.Value;

        Assert.True(Model(Swell with { Height = greatest * 0.9999 }).IsCovered);
        Assert.False(Model(Swell with { Height = greatest * 1.0001 }).IsCovered);
    }

    [Theory]
    [InlineData(0.1, true)]
    [InlineData(0.101, false)]
    public void IsCovered_SlopeOfTheBed_UpToOneInTen(double slope, bool covered) =>
        Assert.Equal(covered, Model(Swell with { BedSlope = slope }).IsCovered);

    /// <summary>Nothing is not covered where nothing comes.</summary>
    [Theory]
    [InlineData(0)]
    [InlineData(-0.3)]
    public void Of_GroundDry_CoveredAndNoPressure(double groundDepth)
    {
        foreach (var input in new WaveInput[] { Breakers, Swell with { Height = 5, BedSlope = 0.5 } })
        {
            var wave = WaveModel.Of(input, 10_000, 0.85, groundDepth, 1.2)!;

            Assert.True(wave.IsDry);
            Assert.True(wave.IsCovered);
            Assert.Equal(0.85, wave.CrestHeight);
        }
    }

    /// <summary>The case has no flow beside a breaking wave, whose total is the design value.</summary>
    [Fact]
    public void WaveCase_WithFlow_OnlyBesideNonBreakingWaves()
    {
        Assert.Equal([ActionKind.Hydrostatic, ActionKind.Flow, ActionKind.Wave], Actions(Swell));
        Assert.Equal([ActionKind.Hydrostatic, ActionKind.Wave], Actions(Breakers));
    }

    [Fact]
    public void WaveCase_NotCovered_NoCaseAndMissing()
    {
        var result = Result(Swell with { Height = 2 });

        Assert.DoesNotContain(result.Cases, c => c.Name == "wave");
        Assert.Contains("wave", result.Verdict.Missing);
    }

    private static WaveModel Model(WaveInput input) => WaveModel.Of(input, 10_000, 0.85, 0.85, 1.2)!;

    private static IEnumerable<ActionKind> Actions(WaveInput wave) =>
        Result(wave).Cases.Single(c => c.Name == "wave").Actions.Select(a => a.Kind);

    private static OpeningResult Result(WaveInput wave) =>
        SampleProject.Result(Refused.With((Opening o) => o with { Actions = o.Actions with { Wave = wave } }));
}
