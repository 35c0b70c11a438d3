using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Cases;

/// <summary>Wind and a line load on the dry dock: six logs of 0.2 m, one post between bays of 2.1 m, 0.1 m wide.</summary>
public class DryCaseTests
{
    /// <summary>700 Pa on every log: 140 N/m; on the post 2.2 m wide and 1.2 m high 1848 N and 1108.8 N·m.</summary>
    [Fact]
    public void Wind_UniformOnTheDryBarrier_ByHand()
    {
        var wind = Case(new() { Wind = new() { Pressure = 700 } }, "wind");

        Assert.All(wind.Logs, log => Hand.Equal(140, log.LineLoad));
        Hand.Equal(840, wind.Resultant);
        Hand.Equal(0.6, wind.CentreOfPressure!.Value);
        Hand.Equal(1_848, wind.Posts[0].BaseShear);
        Hand.Equal(1_108.8, wind.Posts[0].BaseMoment);
    }

    /// <summary>740 N/m at 0.9 m falls on the fifth log, 0.8 to 1.0 m; post 740·2.2 = 1628 N at 0.9 m.</summary>
    [Fact]
    public void Line_AtAHeight_OnTheLogThatStandsThere()
    {
        var line = Case(new() { Line = new() { Force = 740, Height = 0.9 } }, "line");

        Assert.Equal([0, 0, 0, 0, 740, 0], line.Logs.Where(l => l.Bay == 1).Select(l => l.LineLoad));
        Assert.Equal((740, 0.9), (line.Resultant, line.CentreOfPressure));
        Hand.Equal(1_628, line.Posts[0].BaseShear);
        Hand.Equal(1_465.2, line.Posts[0].BaseMoment);
        Hand.Equal(740 * (1.05 + 0.04), line.Guides[0].Reaction);
    }

    /// <summary>On a joint the upper log takes it, at the top of the barrier the top log.</summary>
    [Theory]
    [InlineData(0, 1)]
    [InlineData(0.4, 3)]
    [InlineData(1.2, 6)]
    public void Line_AtAJointOrAnEnd_OnTheLogThatBeginsThere(double height, int index)
    {
        var line = Case(new() { Line = new() { Force = 740, Height = height } }, "line");

        Assert.Equal(index, line.Logs.First(l => l.LineLoad > 0).Index);
    }

    /// <summary>ASCE 7: 1.0 on wind and 1.6 on a live load; EN 1990 1.5 on both.</summary>
    [Theory]
    [InlineData(DesignBasisKind.AllowableStress, 1.0, 1.0)]
    [InlineData(DesignBasisKind.UsStrength, 1.0, 1.6)]
    [InlineData(DesignBasisKind.Eurocode, 1.5, 1.5)]
    public void Factors_WindAndLine_OfTheBasis(DesignBasisKind basis, double wind, double line)
    {
        var actions = new ActionSet { Wind = new() { Pressure = 700 }, Line = new() { Force = 740, Height = 0.9 } };

        Hand.Equal(wind * 140, Case(actions, "wind", basis).Logs[0].LineLoad);
        Hand.Equal(line * 740, Case(actions, "line", basis).Logs[4].LineLoad);
    }

    /// <summary>AISC Manual, Table 3-23 (from memory): a force at a on a cantilever moves its tip by F·a²·(3l − a)/(6·E·I).</summary>
    [Fact]
    public void Line_OnThePost_TipByTheHandbook()
    {
        var line = Case(new() { Line = new() { Force = 740, Height = 0.9 } }, "line");
        var inertia = SectionProperties.Of((Profile)SampleProject.Dock.Barrier.Posts!.Profile).Inertia;

        Hand.Equal(1_628 * 0.81 * (3.6 - 0.9) / (6 * 210e9 * inertia), line.Posts[0].TipDeflection);
    }

    private static CaseResult Case(ActionSet actions, string name, DesignBasisKind basis = DesignBasisKind.AllowableStress)
    {
        var project = SampleProject.Project with { DesignBasis = basis, Openings = [SampleProject.Dock with { Actions = actions }] };
        return SampleProject.Result(project).Cases.Single(c => c.Name == name);
    }
}
