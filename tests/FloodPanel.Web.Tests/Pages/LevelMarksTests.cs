using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Levels;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Pages;

public class LevelMarksTests
{
    [Fact]
    public void Marks_HigherLevel_StandsHigher()
    {
        var marks = new LevelMarks(Examples.Mill);

        Assert.Equal(["Required top", "Design flood level"], marks.Right.Select(m => m.Name));
        Assert.True(marks.Right[0].Y < marks.Right[1].Y);
        Assert.All(marks.Left, sill => Assert.True(sill.Y > marks.WaterY));
    }

    [Theory]
    [InlineData(1)]
    [InlineData(12)]
    [InlineData(60)]
    public void Marks_ManySillsAtOneLevel_LabelsKeepApartAndOnTheSheet(int count)
    {
        var openings = Enumerable.Range(1, count).Select(n => new Opening { Id = $"o{n}", Name = $"Opening {n}", SillLevel = 11.4 });

        var marks = new LevelMarks(Examples.Mill with { Openings = openings.ToValueList() });

        var ys = marks.Left.Select(m => m.LabelY).ToList();
        Assert.All(ys, y => Assert.InRange(y, 0, LevelMarks.Height));
        Assert.All(ys.Zip(ys.Skip(1)), pair => Assert.True(pair.Second - pair.First >= LevelMarks.LabelPitch - 1e-9));
    }

    [Fact]
    public void Marks_AllLevelsAlike_StayFinite()
    {
        var marks = new LevelMarks(new Project { Site = new Site { Freeboard = 0 } });

        Assert.All(marks.Right, m => Assert.True(double.IsFinite(m.Y)));
    }
}
