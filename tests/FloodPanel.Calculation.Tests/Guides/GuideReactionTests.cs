using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Tests.Guides;

public class GuideReactionTests
{
    /// <summary>Design loads 3, 2 and 1 kN/m on 0.9 m: 5.4 kN; the greatest 3·0.9/0.2 = 13.5 kN/m.</summary>
    [Fact]
    public void Of_ThreeLogs_SumAndPeakOfDesignLoads()
    {
        var response = GuideReaction.Of([new(30, 3_000), new(20, 2_000), new(10, 1_000)], tributary: 0.9, logHeights: [0.2, 0.2, 0.2]);

        Hand.Equal(5_400, response.Reaction);
        Hand.Equal(13_500, response.PeakLineReaction);
    }

    [Fact]
    public void Of_NoLogs_Nothing() => Assert.Equal(default, GuideReaction.Of([], 0.9, []));
}
