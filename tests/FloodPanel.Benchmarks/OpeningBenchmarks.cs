using BenchmarkDotNet.Attributes;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Benchmarks;

/// <summary>One opening of 12 logs and 2 posts, both cases: by hand, in numbers only, and with every step.</summary>
[MemoryDiagnoser]
public class OpeningBenchmarks
{
    private readonly Project project = BenchmarkOpening.Project;
    private readonly OpeningModel model = new(
        BenchmarkOpening.Project.Site,
        BenchmarkOpening.Project.Openings[0],
        Library.Empty.BasisOf(BenchmarkOpening.Project),
        Library.Empty);

    private readonly HandInlined byHand;
    private readonly CaseEvaluation numbers;

    /// <summary>Makes room once and refuses to measure two things that differ.</summary>
    public OpeningBenchmarks()
    {
        byHand = new(model);
        numbers = new(model.LogCount, model.Bays.Count);
        RequireEqual(CaseKind.DesignFlood, byHand.DesignFlood);
        RequireEqual(CaseKind.BrimFull, byHand.BrimFull);
    }

    /// <summary>The yardstick: the same formulas in one plain loop.</summary>
    [Benchmark(Baseline = true)]
    public double HandInlinedLoop()
    {
        byHand.DesignFlood();
        var sum = byHand.Left;
        byHand.BrimFull();
        return sum + byHand.Left;
    }

    /// <summary>The calculation without steps.</summary>
    [Benchmark]
    public double NumbersOnly()
    {
        numbers.Fill(model, CaseKind.DesignFlood);
        var sum = numbers.LeftGuide.Reaction;
        numbers.Fill(model, CaseKind.BrimFull);
        return sum + numbers.LeftGuide.Reaction;
    }

    /// <summary>The calculation with every check and step, verdict and notes, from the project tree.</summary>
    [Benchmark]
    public OpeningResult WithSteps() => Design.Evaluate(project, project.Openings[0], Library.Empty);

    private void RequireEqual(CaseKind kind, Action fillByHand)
    {
        fillByHand();
        numbers.Fill(model, kind);
        for (var i = 0; i < byHand.Logs.Length; i++)
        {
            Require(byHand.Logs[i].Bending, numbers.Logs[i].Bending);
            Require(byHand.Logs[i].DeflectionUse, numbers.Logs[i].DeflectionUse);
        }

        for (var i = 0; i < byHand.Posts.Length; i++)
        {
            Require(byHand.Posts[i].Bending, numbers.Posts[i].Bending);
            Require(byHand.Posts[i].DeflectionUse, numbers.Posts[i].DeflectionUse);
        }

        Require(byHand.Right, numbers.RightGuide.Reaction);
        Require(byHand.RightPeak, numbers.RightGuide.PeakLineReaction);
    }

    private static void Require(double expected, double actual)
    {
        if (!(Math.Abs(expected - actual) <= 1e-9 * Math.Max(1, Math.Abs(expected))))
        {
            throw new InvalidOperationException($"By hand {expected}, calculated {actual}: nothing to compare.");
        }
    }
}
