using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>Every line that is printed holds: its formula, worked from earlier lines, gives its value in its unit.</summary>
[Properties(Arbitrary = [typeof(Scenarios)])]
public class CalculationStepTests
{
    [Property(MaxTest = 300)]
    public Property Steps_AnyOpening_EveryLineHolds(Scenario scenario)
    {
        var complaints = Audit(scenario.Result).Take(3).ToArray();

        return (complaints.Length == 0).Label(string.Join("\n", complaints));
    }

    /// <summary>The last line of a working is the figure that it explains.</summary>
    [Property(MaxTest = 100)]
    public void Working_AnyOpening_EndsInItsFigure(Scenario scenario)
    {
        var result = scenario.Result;

        Assert.Equal(result.RetainedDepth, result.Levels.Steps[^1].Value);
        Assert.All(result.Schedule, row => Assert.Equal(row.Mass, row.Working.Steps[^1].Value));
        Assert.All(result.Cases, @case =>
        {
            Assert.Equal(@case.Resultant, @case.ResultantWorking.Steps.Single(s => s.Symbol == "R").Value);
            Assert.Equal(@case.CentreOfPressure ?? @case.Resultant, @case.ResultantWorking.Steps[^1].Value);
            Assert.All(@case.Logs, log => Assert.Equal(log.LineLoad, log.LineLoadWorking.Steps[^1].Value));
            Assert.All(@case.Guides, guide =>
            {
                Assert.Equal(guide.PeakLineReaction, guide.Working.Steps[^1].Value);
                Assert.Equal(guide.Reaction, guide.Working.Steps.Single(s => s.Symbol == "R").Value);
            });
        });
    }

    private static IEnumerable<string> Audit(OpeningResult result)
    {
        var workings = result.Cases.SelectMany(c => c.Logs.Select(l => l.LineLoadWorking)
                .Concat(c.Actions.Select(a => a.Working))
                .Concat(c.Guides.Select(g => g.Working))
                .Concat(c.Parts.SelectMany(p => p.Workings))
                .Append(c.ResultantWorking))
            .Concat(result.Schedule.Select(s => s.Working))
            .Append(result.Levels);
        return workings.SelectMany(w => StepAudit.Complaints(w.Title, w.Steps))
            .Concat(Checks(result).SelectMany(StepAudit.Complaints));
    }

    private static IEnumerable<Check> Checks(OpeningResult result) => result.Cases
        .SelectMany(c => c.Logs.SelectMany(l => l.Checks)
            .Concat(c.Posts.SelectMany(p => p.Checks))
            .Concat(c.Parts.SelectMany(p => p.Checks)))
        .Append(result.Freeboard);
}
