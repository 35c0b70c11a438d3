using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

[Properties(Arbitrary = [typeof(Scenarios)])]
public class CaseEvaluationTests
{
    /// <summary>The sizing search sees the same numbers as the printed result, to the last bit.</summary>
    [Property(MaxTest = 200)]
    public void Fill_AnyOpening_ExactlyTheFiguresOfTheResult(Scenario scenario)
    {
        var (model, result) = (scenario.Model, scenario.Result);
        var numbers = new CaseEvaluation(model.LogCount, model.Bays.Count);

        Assert.All(result.Cases.Zip(model.Cases), pair =>
        {
            var (@case, kind) = pair;
            numbers.Fill(model, kind);

            Assert.Equal(@case.Resultant, @case.Name == "line" ? scenario.Opening.Actions.Line!.Force : numbers.Diagram.Force / model.CosRake);
            Assert.Equal(@case.Name == "line" ? @case.CentreOfPressure : numbers.Diagram.CentreOfPressure, @case.CentreOfPressure);
            Assert.Equal(
                @case.Logs.Select(l => (l.LineLoad, l.Moment, l.Shear, l.Deflection)),
                numbers.Logs.ToArray().Select(l => (l.LineLoad, l.Moment, l.Shear, l.Deflection)));
            Assert.Equal(
                @case.Logs.Select(l => (Use(l.BendingCheck), Use(l.ShearCheck), Use(l.DeflectionCheck))),
                numbers.Logs.ToArray().Select(l => (l.Bending, l.ShearUse, l.DeflectionUse)));
            Assert.Equal(
                @case.Posts.Select(p => (p.BaseShear, p.BaseMoment, p.TipDeflection)),
                numbers.Posts.ToArray().Select(p => (p.BaseShear, p.BaseMoment, p.TipDeflection)));
            Assert.Equal(
                @case.Posts.Select(p => (Use(p.BendingCheck), Use(p.ShearCheck), Use(p.DeflectionCheck))),
                numbers.Posts.ToArray().Select(p => (p.Bending, p.ShearUse, p.DeflectionUse)));
            Assert.Equal(
                @case.Guides.Select(g => (g.Reaction, g.PeakLineReaction)),
                [(numbers.LeftGuide.Reaction, numbers.LeftGuide.PeakLineReaction), (numbers.RightGuide.Reaction, numbers.RightGuide.PeakLineReaction)]);
        });
    }

    /// <summary>What the logs take is what the water gives: Σ w_k over the stack is the resultant.</summary>
    [Property(MaxTest = 200)]
    public void LogLoads_AnyOpening_AddUpToTheResultant(Scenario scenario)
    {
        var model = scenario.Model;
        var numbers = new CaseEvaluation(model.LogCount, model.Bays.Count);

        Assert.All(model.Cases, kind =>
        {
            numbers.Fill(model, kind);

            var sum = numbers.LogLoads.ToArray().Sum(load => load.Characteristic);
            var line = kind == CaseKind.Line ? scenario.Opening.Actions.Line!.Force : 0;
            Assert.Equal(numbers.Diagram.Force / model.CosRake + line, sum, tolerance: 1e-11 * Terms(numbers, model));
        });
    }

    /// <summary>Each guide takes half of the clear bay and an end bearing of every log; debris comes on top.</summary>
    [Property(MaxTest = 100)]
    public void Guides_AnyOpening_HalfABayAndABearingOfTheWholeLoad(Scenario scenario)
    {
        var (bays, bearing) = (scenario.Opening.Barrier.Bays, scenario.Opening.Barrier.Logs.EndBearing);

        Assert.All(scenario.Result.Cases.Where(c => c.Kind != CaseKind.Debris), @case =>
        {
            var load = @case.Logs.Where(l => l.Bay == 1).Sum(l => l.LineLoad);
            Hand.Equal(load * (bays[0] / 2 + bearing), @case.Guides[0].Reaction);
            Hand.Equal(load * (bays[^1] / 2 + bearing), @case.Guides[1].Reaction);
        });
    }

    [Fact]
    public void Fill_Again_AllocatesNothing()
    {
        var model = new Scenario(SampleProject.Project).Model;
        var numbers = new CaseEvaluation(model.LogCount, model.Bays.Count);
        FillAll();

        var before = GC.GetAllocatedBytesForCurrentThread();
        FillAll();

        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());

        void FillAll()
        {
            for (var i = 0; i < model.Cases.Count; i++)
            {
                numbers.Fill(model, model.Cases[i]);
            }
        }
    }

    [Theory]
    [InlineData(5, 2)]
    [InlineData(7, 2)]
    [InlineData(6, 1)]
    [InlineData(6, 3)]
    public void Fill_RoomForOtherCounts_Throws(int logs, int bays)
    {
        var model = new Scenario(SampleProject.Project).Model;
        var numbers = new CaseEvaluation(logs, bays);

        Assert.Throws<ArgumentException>(() => numbers.Fill(model, CaseKind.DesignFlood));
    }

    /// <summary>A check without a stress is absent in the result and 0 in the numbers.</summary>
    private static double Use(Check? check) => check?.Utilisation ?? 0;

    private static double Terms(CaseEvaluation numbers, OpeningModel model) =>
        numbers.Diagram.Pieces.ToArray().Sum(p => Math.Abs(p.Force)) / model.CosRake;
}
