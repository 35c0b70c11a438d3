using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Walls;

/// <summary>The dock, with 0.85 m of water against its wall. Limits: 0.9 m (USACE, 1985), 0.6 m (CLG/Defra, 2007, secondary source).</summary>
public class WallReportTests
{
    [Theory]
    [InlineData(WallKind.Masonry, 0.9, true)]
    [InlineData(WallKind.CavityMasonry, 0.6, false)]
    public void PublishedDepth_Masonry_DecidesByIt(WallKind kind, double limit, bool passes)
    {
        var result = With(kind, new() { Measure = WallMeasure.PublishedDepth });
        var check = Assert.Single(Assert.Single(result.Cases[0].Parts).Checks);

        Assert.Equal(("wall-depth", limit, passes), (check.Name, check.Capacity, check.Passes));
        Hand.Equal(0.85, check.Demand);
        Assert.DoesNotContain(NeededChecks.SupportingWall, result.Verdict.Missing);
        Assert.All(result.Cases.Skip(1), c => Assert.Empty(c.Parts));
    }

    [Theory]
    [InlineData(WallKind.ReinforcedConcrete, "a reinforced concrete wall")]
    [InlineData(WallKind.TimberFrame, "a timber frame wall")]
    [InlineData(WallKind.SteelFrame, "a steel frame wall")]
    public void PublishedDepth_OtherWalls_NotCovered(WallKind kind, string words)
    {
        var result = With(kind, new() { Measure = WallMeasure.PublishedDepth });

        Assert.Contains(words, Gap(result).Text.ToString(), StringComparison.Ordinal);
        Assert.Contains(NeededChecks.SupportingWall, result.Verdict.Missing);
    }

    [Fact]
    public void Resistance_Typed_HoldsAgainstBothGuidesInEachCase()
    {
        var result = With(WallKind.ReinforcedConcrete, new() { LineResistance = 20e3, TotalResistance = 15e3, Source = "Drawing W-1" });

        foreach (var loadCase in result.Cases)
        {
            Assert.Equal(["left wall", "right wall"], loadCase.Parts.Select(p => p.Member));
            foreach (var (part, guide) in loadCase.Parts.Zip(loadCase.Guides))
            {
                Assert.Equal([(guide.PeakLineReaction, 20e3), (guide.Reaction, 15e3)], part.Checks.Select(c => (c.Demand, c.Capacity)));
                Assert.All(part.Checks, c => Assert.Equal("Resistance typed by the user: Drawing W-1", c.Source));
            }
        }

        Assert.DoesNotContain(NeededChecks.SupportingWall, result.Verdict.Missing);
    }

    [Theory]
    [InlineData(null, "", "wall-resistance-missing")]
    [InlineData(20e3, " ", "wall-source-missing")]
    public void Resistance_Unfinished_SaysWhatToEnter(double? line, string source, string code)
    {
        var result = With(WallKind.Masonry, new() { LineResistance = line, Source = source });

        Assert.Equal(code, Gap(result).Code);
    }

    private static Note Gap(OpeningResult result) => Assert.Single(result.Gaps, g => g.Check == NeededChecks.SupportingWall).Note;

    private static OpeningResult With(WallKind kind, WallInput wall) =>
        SampleProject.Result(Refused.With((Opening o) => o with { Wall = kind, WallBehind = wall }));
}
