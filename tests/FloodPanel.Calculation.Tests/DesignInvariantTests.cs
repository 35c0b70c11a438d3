using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

/// <summary>What must hold whatever the opening.</summary>
[Properties(Arbitrary = [typeof(Scenarios)])]
public class DesignInvariantTests
{
    private static readonly string[] Levels = ["Opening", "Levels", "DesignFloodLevel", "Notes", "Sentence"];

    /// <summary>Thrust grows with the square of the depth, as long as the water stays below the top.</summary>
    [Property(MaxTest = 100)]
    public void Evaluate_DoubleTheDepth_FourTimesTheThrust(Scenario scenario, PositiveInt part)
    {
        var still = StillAndDry(scenario);
        var depth = Math.Round(0.5 * still.Result.BarrierHeight * (part.Get % 100 + 1) / 101, 4);

        var thrust = still.WithDepth(depth).DesignFlood.Resultant;
        var doubled = still.WithDepth(2 * depth).DesignFlood.Resultant;

        Hand.Equal(4 * thrust, doubled);
    }

    [Property(MaxTest = 100)]
    public void Evaluate_NoWater_NoLoad(Scenario scenario, PositiveInt below)
    {
        var dry = scenario.With((Opening o) => o with { ProtectedSideLevel = null }).WithDepth(-below.Get % 500 / 1000.0);

        var flood = dry.DesignFlood;

        Assert.Equal(0, flood.Resultant);
        Assert.Null(flood.CentreOfPressure);
        Assert.All(flood.Logs, l => Assert.Equal((0, 0, 0, 0), (l.LineLoad, l.Moment, l.Shear, l.Deflection)));
        Assert.All(flood.Posts, p => Assert.Equal((0, 0, 0), (p.BaseShear, p.BaseMoment, p.TipDeflection)));
        Assert.All(flood.Guides, g => Assert.Equal((0, 0), (g.Reaction, g.PeakLineReaction)));
    }

    /// <summary>All levels moved together: a surveyor's other datum.</summary>
    [Property(MaxTest = 100)]
    public void Evaluate_OtherDatum_NothingChanges(Scenario scenario, int shift)
    {
        var moved = shift % 500 / 8.0;
        var there = scenario
            .With((Opening o) => o with
            {
                SillLevel = o.SillLevel + moved,
                GroundLevel = o.GroundLevel + moved,
                ProtectedSideLevel = o.ProtectedSideLevel + moved,
            })
            .With((Site s) => s with { DesignStillWaterLevel = s.DesignStillWaterLevel + moved });

        var (before, after) = (scenario.Result, there.Result);

        Assert.All(
            Figures.Of(before, Levels.Contains).Zip(Figures.Of(after, Levels.Contains)),
            pair => Assert.True(Agree(pair.First, pair.Second), $"{pair.First} became {pair.Second}"));
        Assert.Equal(before.Verdict.Missing, after.Verdict.Missing);
        Assert.Equal(before.Verdict.Kind, after.Verdict.Kind);
    }

    /// <summary>
    /// Deeper water never relieves a log. Within the surcharge method: above it the drag coefficient falls in steps
    /// with the depth, as published, and such a result is never called complete.
    /// </summary>
    [Property(MaxTest = 100)]
    public void Evaluate_MoreWater_NeverLessLoadOnAnyLog(Scenario scenario, PositiveInt rise)
    {
        var slow = scenario.Opening.Actions.Flow is { Velocity: > 3.05 } ? WithFlow(scenario, 2.9) : scenario;
        var deeper = slow.WithDepth(slow.Result.RetainedDepth + rise.Get % 700 / 1000.0);

        var (before, after) = (slow.DesignFlood, deeper.DesignFlood);

        Assert.All(before.Logs.Zip(after.Logs), pair =>
        {
            var rounding = 1e-9 * (1 + pair.First.LineLoad);
            Assert.True(pair.Second.LineLoad >= pair.First.LineLoad - rounding);
            Assert.True(pair.Second.Deflection >= pair.First.Deflection * (1 - 1e-9) - 1e-12);
        });
        Assert.True(after.Resultant >= before.Resultant - 1e-9 * (1 + before.Resultant));
    }

    /// <summary>The same above the surcharge method where the drag coefficient stays what it is: 1.25 up to a width of 12 depths.</summary>
    [Property(MaxTest = 100)]
    public void Evaluate_MoreWaterAtAFixedDragCoefficient_NeverLessLoadOnAnyLog(Scenario scenario, PositiveInt rise)
    {
        var fast = WithFlow(scenario, 3.1 + rise.Get % 40 / 10.0);
        var width = fast.Opening.ClearWidth;
        var depth = Math.Max(width / 12 + 0.001, fast.Result.RetainedDepth);
        if (width / 12 + 0.001 > fast.Result.BarrierHeight)
        {
            // A barrier lower than a twelfth of its width has no depth with this coefficient.
            return;
        }

        var before = fast.WithDepth(depth).DesignFlood;
        var after = fast.WithDepth(depth + rise.Get % 300 / 1000.0).DesignFlood;

        Assert.All(before.Logs.Zip(after.Logs), pair =>
            Assert.True(pair.Second.LineLoad >= pair.First.LineLoad - 1e-9 * (1 + pair.First.LineLoad)));
    }

    /// <summary>Water behind helps, and never turns a load about.</summary>
    [Property(MaxTest = 100)]
    public void Evaluate_WaterBehind_NeverMoreLoadAndNeverNegative(Scenario scenario)
    {
        var dry = scenario.With((Opening o) => o with { ProtectedSideLevel = null });

        Assert.All(scenario.DesignFlood.Logs.Zip(dry.DesignFlood.Logs), pair =>
        {
            Assert.InRange(pair.First.LineLoad, 0, pair.Second.LineLoad * (1 + 1e-12));
            Assert.InRange(pair.First.Deflection, 0, pair.Second.Deflection * (1 + 1e-12));
        });
    }

    /// <summary>The same barrier in a mirror: bays the other way round.</summary>
    [Property(MaxTest = 50)]
    public void Evaluate_Mirrored_SameLoadsMirrored(Scenario scenario)
    {
        var mirrored = scenario.With((Opening o) => o with { Barrier = o.Barrier with { Bays = o.Barrier.Bays.Reverse().ToValueList() } });

        Assert.All(scenario.Result.Cases.Zip(mirrored.Result.Cases), pair =>
        {
            Assert.Equal(pair.First.Guides.Select(g => g.Reaction).Reverse(), pair.Second.Guides.Select(g => g.Reaction));
            Assert.Equal(pair.First.Posts.Select(p => p.BaseMoment).Reverse(), pair.Second.Posts.Select(p => p.BaseMoment));
        });
    }

    private static Scenario StillAndDry(Scenario scenario) =>
        scenario.With((Opening o) => o with { ProtectedSideLevel = null, Actions = new() });

    private static Scenario WithFlow(Scenario scenario, double velocity) =>
        scenario.With((Opening o) => o with { Actions = new() { Flow = new() { Velocity = velocity } } });

    private static bool Agree((string Path, double Value) a, (string Path, double Value) b) =>
        a.Path == b.Path && Math.Abs(a.Value - b.Value) <= 1e-9 * Math.Abs(a.Value);
}
