using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

[Properties(Arbitrary = [typeof(Scenarios)])]
public class DesignTests
{
    [Fact]
    public void Run_SampleProject_HasNoProblemsAndNamesWhatIsMissing()
    {
        var problems = SampleProject.Project.Validate(Library.Empty);

        var result = SampleProject.Result(SampleProject.Project);

        Assert.Empty(problems);
        Assert.Equal(VerdictKind.Incomplete, result.Verdict.Kind);
        Assert.Equal(["base-plates", "anchors", "guides", "supporting-wall"], result.Verdict.Missing);
    }

    /// <summary>The design flood level is 4.45 m; within a micrometre it is the same level.</summary>
    [Fact]
    public void Run_WaterBehindAboveTheFloodByRounding_StandsAsHighAsTheFlood()
    {
        var project = Refused.With((Opening o) => o with { ProtectedSideLevel = 4.4500009 });

        Assert.Equal(4.45 - SampleProject.Dock.SillLevel, SampleProject.Result(project).ProtectedDepth, 1e-9);
    }

    [Property(MaxTest = 50)]
    public void Run_AnyProject_EvaluatesEachOpening(Scenario scenario)
    {
        var two = scenario.Project with { Openings = [scenario.Opening, scenario.Opening with { Id = "other" }] };

        var result = Design.Run(two, Library.Empty);

        Assert.Equal(two, result.Project);
        Assert.Equal(two.Openings, result.Openings.Select(o => o.Opening));
    }

    [Property(MaxTest = 100)]
    public void Evaluate_AnyOpening_EveryNumberIsFinite(Scenario scenario) =>
        Assert.All(
            Figures.Of(scenario.Result, skip: name => name == "Opening"),
            figure => Assert.True(double.IsFinite(figure.Value), $"{figure.Path} is {figure.Value}"));

    [Property(MaxTest = 100)]
    public void Evaluate_LogsOfAnyOpening_StackedWithoutGapsToTheTop(Scenario scenario) =>
        Assert.All(scenario.Result.Cases, @case => Assert.All(@case.Logs.GroupBy(l => l.Bay), bay =>
        {
            var logs = bay.ToArray();
            Assert.Equal(0, logs[0].Bottom);
            Assert.Equal(logs[1..].Select(l => l.Bottom), logs[..^1].Select(l => l.Top));
            Assert.Equal(scenario.Result.BarrierHeight, logs[^1].Top);
            Assert.Equal(Enumerable.Range(1, logs.Length), logs.Select(l => l.Index));
        }));

    [Fact]
    public void Evaluate_OpeningWithAProblem_RefusedWithItsPathAndSentence()
    {
        var narrow = SampleProject.Dock with { ClearWidth = 0.05 };

        var refused = Assert.Throws<ArgumentException>(
            () => Design.Evaluate(SampleProject.Project, narrow, Library.Empty));

        Assert.Contains("openings[0].clearWidth: Clear width is 0.05 m", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void Run_SiteWithAProblem_Refused(double level)
    {
        var site = SampleProject.Project.Site with { DesignStillWaterLevel = level };

        Assert.Throws<ArgumentException>(() => Design.Run(SampleProject.Project with { Site = site }, Library.Empty));
    }

    [Fact]
    public void Evaluate_MaterialAndProfileOfTheLibrary_SameAsInline()
    {
        var logs = SampleProject.Dock.Barrier.Logs;
        var library = new Library(
            [new("alloy", "Alloy", SampleProject.Aluminium, "invented", "invented")],
            [new("plank", "Plank", (Profile)logs.Profile, "invented", "invented")],
            DesignBases.Standard);
        var named = SampleProject.Dock with
        {
            Barrier = SampleProject.Dock.Barrier with
            {
                Logs = logs with { Material = new LibraryMaterial("alloy"), Profile = new LibraryProfile("plank") },
            },
        };

        var result = Design.Evaluate(SampleProject.Project, named, library);

        Assert.Equal(
            Figures.Of(SampleProject.Result(SampleProject.Project), skip: name => name == "Opening"),
            Figures.Of(result, skip: name => name == "Opening"));
    }
}
