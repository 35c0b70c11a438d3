using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Tests.Guides;

public class GuideLoadTests
{
    private static readonly double[] Heights = [0.2, 0.2, 0.4];

    /// <summary>3, 2 and 2 kN/m on 0.8 m: 12, 8 and 4 kN per metre of guide; half of the first log, the second, a quarter of the third: 1.2 + 1.6 + 0.4 kN.</summary>
    [Fact]
    public void Over_StretchAcrossJoints_SumOfItsParts()
    {
        var load = GuideLoad.Of([new(30, 3_000), new(20, 2_000), new(20, 2_000)], 0.8, Heights);

        Hand.Equal(3_200, load.Over(0.1, 0.5));
        Assert.Equal(0.8, load.Length, 1e-12);
    }

    /// <summary>
    /// An impact of 6 kN on patches of 0.30 m: 4 kN on a log of 0.2 m, that is 20 kN/m; on a stretch of 0.1 m of it 2 kN, on one of 0.5 m
    /// over both struck logs no more than the whole.
    /// </summary>
    [Theory]
    [InlineData(0, 0.1, 2_000)]
    [InlineData(0.1, 0.3, 4_000)]
    [InlineData(0, 0.5, 6_000)]
    [InlineData(0.3, 0.6, 2_000)]
    [InlineData(0.4, 0.8, 0)]
    public void Over_Impact_ItsShareOnceAndNoMoreThanTheWhole(double from, double to, double force)
    {
        var load = GuideLoad.Of([default, default, default], 0.8, Heights, new GuideImpact(6_000, StruckLogs: 2));

        Assert.Equal(force, load.Over(from, to), 1e-9 * 6_000);
        Assert.True(load.IsStruck(1));
        Assert.False(load.IsStruck(2));
    }
}
