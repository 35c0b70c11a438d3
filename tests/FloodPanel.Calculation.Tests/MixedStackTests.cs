using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests;

/// <summary>
/// The dock, 1.2 m high: four logs of 200 mm on two heavier ones of 200 mm, or on one of 250 and one of 150 mm. The water
/// does not know of joints: loads add up to the same, and each log answers with its own stiffness.
/// </summary>
public class MixedStackTests
{
    private static readonly HollowRectangle Main = (HollowRectangle)SampleProject.Dock.Barrier.Logs.Profile;

    [Fact]
    public void Evaluate_HeavierLogsAtTheBottom_CarryTheSameLoadAndBendLess()
    {
        var plain = Evaluate([]);
        var heavy = Main with { Face = 2 * Main.Face };
        var mixed = Evaluate([new() { Material = SampleProject.Aluminium, Profile = heavy, Count = 2 }]);

        Assert.Equal(plain.BarrierHeight, mixed.BarrierHeight, 1e-12);
        var ratio = SectionProperties.Of(Main).Inertia / SectionProperties.Of(heavy).Inertia;
        foreach (var (before, after) in plain.Cases[0].Logs.Zip(mixed.Cases[0].Logs))
        {
            Hand.Equal(before.LineLoad, after.LineLoad);
            Hand.Equal(before.Deflection * (after.Index <= 2 ? ratio : 1), after.Deflection);
        }
    }

    [Fact]
    public void Evaluate_LogsOfOtherHeights_JointsAndLoadsFollow()
    {
        var mixed = Evaluate(
        [
            new() { Material = SampleProject.Aluminium, Profile = Main with { Height = 0.25 }, Count = 1 },
            new() { Material = SampleProject.Aluminium, Profile = Main with { Height = 0.15 }, Count = 1 },
        ]);
        var logs = mixed.Cases[0].Logs.Where(log => log.Bay == 1).ToArray();

        Assert.Equal([0, 0.25, 0.4, 0.6, 0.8, 1.0], logs.Select(log => Math.Round(log.Bottom, 12)));
        Hand.Equal(Evaluate([]).Cases[0].Logs.Where(log => log.Bay == 1).Sum(log => log.LineLoad), logs.Sum(log => log.LineLoad));
        Hand.Equal(
            logs.Max(log => log.LineLoad * (mixed.Opening.Barrier.Bays[0] / 2 + mixed.Opening.Barrier.Logs.EndBearing) / (log.Top - log.Bottom)),
            mixed.Cases[0].Guides[0].PeakLineReaction);
    }

    [Fact]
    public void Evaluate_Mixed_ScheduleHasARowForEachKindAndHoldDownSumsThem()
    {
        var heavy = Main with { Height = 0.25, Face = 2 * Main.Face };
        var mixed = Evaluate([new() { Material = SampleProject.Aluminium, Profile = heavy, Count = 2 }]);
        var rows = mixed.Schedule.Where(row => row.Bay == 1).ToArray();

        Assert.Equal([(1, 2), (3, 4)], rows.Select(row => (row.FirstLog, row.Count)));
        Hand.Equal(rows[0].Mass / SectionProperties.Of(heavy).Area, rows[1].Mass / SectionProperties.Of(Main).Area);
        var gamma = SampleProject.Project.Site.WaterDensity * Physics.Gravity;
        double Net(Profile profile) => gamma * profile.Height * profile.Depth
            - SectionProperties.Of(profile).Area * SampleProject.Aluminium.Density * Physics.Gravity;
        Hand.Equal(rows[0].CuttingLength * (2 * Net(heavy) + 4 * Net(Main)), mixed.HoldDowns[0].Uplift);
    }

    [Fact]
    public void Evaluate_OneKindWithoutAStress_LogsAreMissing()
    {
        var unknown = SampleProject.Aluminium with { BendingStrength = null, AllowableBending = null };
        var mixed = Evaluate([new() { Material = unknown, Profile = Main, Count = 1 }]);

        Assert.Contains(NeededChecks.Logs, mixed.Verdict.Missing);
        Assert.Contains(mixed.Notes, note => note.Code == "strength-missing");
    }

    [Fact]
    public void Validate_MoreThanAHundredLogs_IsRefused()
    {
        var project = With([new() { Material = SampleProject.Aluminium, Profile = Main, Count = 97 }]);

        var problem = Assert.Single(Validation.Validate(project, Library.Empty));

        Assert.Equal("openings[0].barrier.logs.below", problem.Path);
        Assert.Equal("The stack has 101 logs; allowed is 100 in all.", problem.Message.ToString());
    }

    private static OpeningResult Evaluate(ValueList<LogGroup> below) => Assert.Single(Design.Run(With(below), Library.Empty).Openings);

    private static Project With(ValueList<LogGroup> below)
    {
        var dock = SampleProject.Dock;
        var replaced = below.Count == 0 ? 0 : 2;
        var logs = dock.Barrier.Logs with { Below = below, Count = dock.Barrier.Logs.Count - replaced };
        return SampleProject.Project with { Openings = [dock with { Barrier = dock.Barrier with { Logs = logs } }] };
    }
}
