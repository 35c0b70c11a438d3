using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Tests.Water;

public class FloodLevelsTests
{
    /// <summary>In binary fractions 4.1 + 0.25 + 0.1 falls short of 4.45.</summary>
    [Fact]
    public void Depth_LevelsThatDifferByRounding_Zero()
    {
        var depth = FloodLevels.Depth(4.1 + 0.25 + 0.1, 4.45);

        Assert.NotEqual(4.45, 4.1 + 0.25 + 0.1);
        Assert.Equal(0, depth);
        Assert.False(double.IsNegative(depth));
    }

    [Theory]
    [InlineData(12.35, 11.40, 0.95)]
    [InlineData(-3.2, -4.0, 0.8)]
    [InlineData(1.0, 1.25, -0.25)]
    public void Depth_Levels_Difference(double level, double sill, double depth) =>
        Assert.Equal(depth, FloodLevels.Depth(level, sill));

    /// <summary>H_req = h + f = 1.2 m; a barrier may miss it by 1 mm.</summary>
    [Theory]
    [InlineData(1.5, true)]
    [InlineData(1.2, true)]
    [InlineData(1.1991, true)]
    [InlineData(1.1989, false)]
    [InlineData(0.9, false)]
    public void Freeboard_BarrierHeight_WithinAMillimetre(double height, bool passes)
    {
        var check = FloodLevels.Freeboard(retainedDepth: 0.95, freeboard: 0.25, height);

        Assert.Equal(passes, check.Passes);
        Hand.Equal(1.2, check.Demand);
    }

    [Fact]
    public void Freeboard_FloodFarBelowTheSill_NothingRequired()
    {
        var check = FloodLevels.Freeboard(retainedDepth: -1, freeboard: 0.3, barrierHeight: 0.2);

        Assert.Equal(0, check.Demand);
        Assert.True(check.Passes);
    }

    [Theory]
    [InlineData(double.NaN, 0.3, 1)]
    [InlineData(1, -0.1, 1)]
    [InlineData(1, double.PositiveInfinity, 1)]
    [InlineData(1, 0.3, 0)]
    public void Freeboard_OutOfRange_Throws(double depth, double freeboard, double height) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FloodLevels.Freeboard(depth, freeboard, height));

    [Fact]
    public void DesignLevel_Site_SumOfTheThree()
    {
        var working = FloodLevels.DesignLevel(SampleProject.Project.Site);

        Assert.Equal(["z_swl", "s", "c", "z_dfl"], working.Steps.Select(s => s.Symbol));
        Hand.Equal(4.45, working.Steps[^1].Value);
    }
}
