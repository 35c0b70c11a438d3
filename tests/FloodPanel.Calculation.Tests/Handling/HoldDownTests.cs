using FloodPanel.Calculation.Handling;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Calculation.Tests.Generated;
using FloodPanel.Calculation.Tests.Steps;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Handling;

/// <summary>
/// Hold-down against buoyancy (Archimedes; partial factors 1.1 and 0.9 of EN 1990 from memory). The log of the derived
/// example: 200 × 50, A 1574 mm², aluminium, water of 9.81 kN/m³: sealed 98.1 − 41.7 = 56.4 N/m upward.
/// </summary>
public class HoldDownTests
{
    private static readonly Material Alloy = new() { Family = MaterialFamily.Aluminium, Density = 2700, ElasticModulus = 70e9 };

    private static readonly HollowRectangle Profile = new() { Height = 0.2, Depth = 0.05, Face = 0.003, Web = 0.0085 / 3, Webs = 3 };

    private static readonly Member Ribbed = new(Alloy, Profile, SectionProperties.Of(Profile), null, null, 200);

    [Fact]
    public void Buoyancy_RibbedLog_DerivedExample()
    {
        var weight = Ribbed.Section.Area * 2700 * 9.81;

        Assert.Equal(98.1, HoldDown.Buoyancy(9810, Ribbed, isSealed: true), tolerance: 0.05);
        Assert.Equal(56.4, HoldDown.Buoyancy(9810, Ribbed, isSealed: true) - weight, tolerance: 0.05);
        Assert.True(HoldDown.Buoyancy(9810, Ribbed, isSealed: false) < weight);
    }

    /// <summary>Dock logs 2.17 m long: u 1025·9.80665·0.2·0.09 N/m, w 2700·9.80665·A; six of them, 1.1·u − 0.9·w, by hand.</summary>
    [Fact]
    public void Evaluate_SealedLogs_ForceWithItsFactors()
    {
        var area = SectionProperties.Of((Profile)SampleProject.Dock.Barrier.Logs.Profile).Area;
        var (u, w) = (1025 * 9.80665 * 0.018, 2700 * 9.80665 * area);

        var row = Of(logs => logs).HoldDowns[0];

        Hand.Equal(2.17 * 6 * (1.1 * u - 0.9 * w), row.DesignForce);
        Hand.Equal(2.17 * 6 * (u - w), row.Uplift);
    }

    /// <summary>A metal log that fills is heavier than the water it displaces; a seal that pushes with 500 N/m still lifts the stack.</summary>
    [Theory]
    [InlineData(0, false)]
    [InlineData(500, true)]
    public void Evaluate_LogsThatFill_OnlyTheSealLifts(double preload, bool held)
    {
        var result = Of(logs => logs with { Sealed = false, SealPreload = preload });

        Assert.Equal(held, result.HoldDowns[0].DesignForce > 0);
        Assert.Equal(held, result.Notes.Any(n => n.Code == "logs-float"));
    }

    [Property(MaxTest = 100, Arbitrary = [typeof(Scenarios)])]
    public void Working_AnyOpening_EveryLineHolds(Scenario scenario) => Assert.All(scenario.Result.HoldDowns, row =>
    {
        Assert.Empty(StepAudit.Complaints("hold-down", row.Working.Steps));
        Assert.Equal(row.DesignForce, row.Working.Steps[^1].Value);
    });

    private static OpeningResult Of(Func<LogStack, LogStack> change)
    {
        var dock = SampleProject.Dock with { Barrier = SampleProject.Dock.Barrier with { Logs = change(SampleProject.Dock.Barrier.Logs) } };
        return SampleProject.Result(SampleProject.Project with { Openings = [dock] });
    }
}
