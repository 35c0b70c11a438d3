using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Cases;

/// <summary>
/// Debris on the dock: 0.85 m of water, six logs of 0.2 m, bays of 2.1 m with 40 mm of bearing. 450 kg at 1.1 m/s stopped in
/// 0.1 s with a response of 1 is π·450·1.1/0.2 = 7775.44 N, of which a log of 0.2 m takes two thirds.
/// </summary>
public class DebrisCaseTests
{
    private const double Force = Math.PI * 450 * 1.1 / 0.2;
    private const double Share = Force * 2 / 3;
    private const double Span = 2.14;

    private static readonly DebrisInput Input =
        new() { Velocity = 1.1, StoppingTime = 0.1, Coefficients = new() { Response = 1 } };

    [Fact]
    public void Logs_Struck_ShareAtMidSpanAndAtTheSupport()
    {
        var (flood, debris) = (Case("design-flood"), Case("debris"));

        Assert.All(flood.Logs.Zip(debris.Logs).Take(5), pair =>
        {
            Hand.Equal(pair.First.LineLoad, pair.Second.LineLoad);
            Hand.Equal(Share, pair.Second.PointLoad);
            Hand.Equal(pair.First.Moment + Share * Span / 4, pair.Second.Moment);
            Hand.Equal(pair.First.Shear + Share, pair.Second.Shear);
        });
    }

    /// <summary>A log is struck where its lower edge stands below 0.85 + 0.15 m: the sixth begins at 1.00 m.</summary>
    [Fact]
    public void Logs_AboveTheReachOfTheObject_NotStruck()
    {
        var sixth = Case("debris").Logs[5];

        Assert.Equal((0, 0), (sixth.PointLoad, sixth.Moment));
    }

    [Fact]
    public void Deflection_Debris_ReportedAndNotJudged()
    {
        var log = Case("debris").Logs[0];

        Assert.Null(log.DeflectionCheck);
        Hand.Equal(log.Deflection, log.DeflectionWorking!.Steps[^1].Value);
        Assert.All(Case("debris").Posts, post => Assert.Null(post.DeflectionCheck));
    }

    /// <summary>The whole force once at 0.85 m on the post, and once on each guide.</summary>
    [Fact]
    public void PostsAndGuides_TheWholeForceOnce()
    {
        var (flood, debris) = (Case("design-flood"), Case("debris"));

        Hand.Equal(flood.Posts[0].BaseShear + Force, debris.Posts[0].BaseShear);
        Hand.Equal(flood.Posts[0].BaseMoment + Force * 0.85, debris.Posts[0].BaseMoment);
        Hand.Equal(flood.Guides[0].Reaction + Force, debris.Guides[0].Reaction);
        Hand.Equal(flood.Guides[0].PeakLineReaction + Share / 0.2, debris.Guides[0].PeakLineReaction);
    }

    [Fact]
    public void Resultant_Debris_LeavesThePointForceOut()
    {
        Hand.Equal(Case("design-flood").Resultant, Case("debris").Resultant);
        Hand.Equal(Force, Case("debris").Actions.Single(a => a.Kind == ActionKind.Debris).Impact!.Value.Characteristic);
    }

    [Fact]
    public void Debris_SillStaysDry_NothingIsStruck()
    {
        var dry = SampleProject.Dock with { SillLevel = 4.6, Actions = new() { Debris = Input } };

        var result = SampleProject.Result(SampleProject.Project with { Openings = [dry] }).Cases.Single(c => c.Name == "debris");

        Assert.All(result.Logs, log => Assert.Equal((0, 0), (log.PointLoad, log.Moment)));
        Assert.All(result.Posts, post => Assert.Equal(0, post.BaseShear));
        Assert.All(result.Guides, guide => Assert.Equal((0, 0), (guide.Reaction, guide.PeakLineReaction)));
    }

    /// <summary>Without a typed response: the larger of the dry and the wet period's, by the functions that have tests of their own.</summary>
    [Fact]
    public void Response_NotTyped_FollowsFromTheLog()
    {
        var input = Input with { StoppingTime = 0.03, Coefficients = new() };
        var log = SampleProject.Dock.Barrier.Logs;
        var section = SectionProperties.Of((Profile)log.Profile);
        var mass = 2700 * section.Area;
        var wet = mass + NaturalPeriod.AddedMass(1025, 0.2);
        double Response(double lineMass) => ResponseRatio.Of(0.03 / NaturalPeriod.Of(lineMass, 70e9 * section.Inertia, Span));

        var force = Case("debris", input).Actions.Single(a => a.Kind == ActionKind.Debris).Impact!.Value.Characteristic;

        Hand.Equal(Math.PI * 450 * 1.1 / 0.06 * Math.Max(Response(mass), Response(wet)), force);
    }

    /// <summary>EN 1990, accidental: factor 1.0 on every action of the case, where the design flood has 1.5.</summary>
    [Fact]
    public void Factor_Eurocode_AccidentalCaseUnfactored()
    {
        var project = With(Input) with { DesignBasis = DesignBasisKind.Eurocode };

        var cases = SampleProject.Result(project).Cases;

        Assert.Equal(1.0, cases.Single(c => c.Kind == CaseKind.Debris).Factor);
        Hand.Equal(
            cases.Single(c => c.Kind == CaseKind.DesignFlood).Logs[0].LineLoad / 1.5,
            cases.Single(c => c.Kind == CaseKind.Debris).Logs[0].LineLoad);
    }

    private static CaseResult Case(string name, DebrisInput? input = null) =>
        SampleProject.Result(With(input ?? Input)).Cases.Single(c => c.Name == name);

    private static Project With(DebrisInput input) => SampleProject.Project with
    {
        Openings = [SampleProject.Dock with { Actions = SampleProject.Dock.Actions with { Debris = input } }],
    };
}
