using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>What the other properties rest on: the generated projects are valid and reach the corners.</summary>
[Properties(Arbitrary = [typeof(Scenarios)])]
public class ScenariosTests
{
    [Property(MaxTest = 300)]
    public Property Valid_AnyScenario_HasNoProblems(Scenario scenario)
    {
        var problems = scenario.Project.Validate(Library.Empty);

        return (problems.Count == 0).Label(string.Join("\n", problems.Select(p => $"{p.Path}: {p.Message}")));
    }

    [Fact]
    public void Valid_ManyScenarios_ReachEveryCorner()
    {
        var scenarios = Scenarios.Valid().Generator.Sample(500).ToArray();

        Assert.Equal(3, scenarios.Select(s => s.Project.DesignBasis).Distinct().Count());
        Assert.Equal(3, scenarios.Select(s => s.Site.FloodZone).Distinct().Count());
        Assert.Equal(5, scenarios.Select(s => s.Opening.Barrier.Logs.Profile.GetType()).Distinct().Count());
        Assert.Equal(4, scenarios.Select(s => ((Material)s.Opening.Barrier.Logs.Material).Family).Distinct().Count());
        Assert.Equal(4, scenarios.Select(s => s.Opening.Barrier.Bays.Count).Distinct().Count());
        Assert.Equal(3, scenarios.Select(s => s.Result.Verdict.Kind).Distinct().Count());
        Assert.Contains(scenarios, s => s.Result.RetainedDepth < 0);
        Assert.Contains(scenarios, s => s.Result.RetainedDepth > s.Result.BarrierHeight);
        Assert.Contains(scenarios, s => s.Result.ProtectedDepth > 0 && s.Opening.RakeDegrees > 0);
        Assert.Contains(scenarios, s => s.Opening.Actions.Flow is { Velocity: > 3.05 });
    }
}
