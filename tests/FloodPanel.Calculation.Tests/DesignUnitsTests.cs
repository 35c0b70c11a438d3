using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

/// <summary>The same job typed in SI and in US units has the same results.</summary>
[Properties(Arbitrary = [typeof(Scenarios)])]
public class DesignUnitsTests
{
    [Property(MaxTest = 100)]
    public void Evaluate_TypedInUSUnits_SameAsInSI(Scenario scenario)
    {
        // A wave at its very limit, or over ground that the water just reaches, is covered or not by the last digit typed.
        var depth = scenario.Site.DesignFloodLevel - (scenario.Opening.GroundLevel ?? scenario.Opening.SillLevel);
        if (scenario.Model.Wave is { Input: NonBreakingWaveInput wave, GreatestHeight: var limit } && (Math.Abs(depth) < 1e-5 || Math.Abs(wave.Height - limit ?? wave.Height) < 1e-5))
        {
            return;
        }

        var si = new Retyped(UnitSystem.SI).Of(scenario);
        var us = new Retyped(UnitSystem.USCustomary).Of(scenario);
        var full = si.With((Opening o) => o with { ProtectedSideLevel = null }).WithDepth(si.Result.BarrierHeight).Result;
        var typing = Typing(si.Result);

        Assert.Empty(us.Project.Validate(Library.Empty));
        Agree(c => [c.Resultant]);
        Agree(c => c.Logs.Select(l => l.LineLoad));
        Agree(c => c.Logs.Select(l => l.Moment));
        Agree(c => c.Logs.Select(l => l.Deflection));
        Agree(c => c.Posts.Select(p => p.BaseMoment));
        Agree(c => c.Posts.Select(p => p.TipDeflection));
        Agree(c => c.Guides.Select(g => g.Reaction));
        Agree(Uses);
        Assert.Equal(si.Result.Freeboard.Utilisation, us.Result.Freeboard.Utilisation, typing);
        Assert.Equal(si.Result.Verdict.Missing, us.Result.Verdict.Missing);

        // Measured by the same figures under water to the top: a log that is barely wet has next to no load.
        void Agree(Func<CaseResult, IEnumerable<double>> figures)
        {
            var (first, second) = (si.Result.Cases.SelectMany(figures).ToArray(), us.Result.Cases.SelectMany(figures).ToArray());
            var scale = full.Cases.SelectMany(figures).Concat(first).Select(Math.Abs).DefaultIfEmpty().Max();
            Assert.Equal(first.Length, second.Length);
            Assert.All(first.Zip(second), pair => Assert.Equal(pair.First, pair.Second, typing * scale));
        }
    }

    /// <summary>
    /// Forms show nine figures. Levels to 120 m are then good to 0.3 µm each, of which a wave feels three, and which the
    /// fifth power of a depth in a deflection makes 4 µm of the height of the barrier; all else is good to 1e-7. What a raker leaves to the base is a
    /// difference of two moments, an order less exact.
    /// </summary>
    private static double Typing(OpeningResult result) =>
        (4e-6 / result.BarrierHeight + 1e-7) * (result.Opening.Barrier.Posts?.Raker is null ? 1 : 10);

    private static IEnumerable<double> Uses(CaseResult @case) => @case.Logs
        .SelectMany(l => new[] { l.BendingCheck, l.ShearCheck, l.DeflectionCheck })
        .Concat(@case.Posts.SelectMany(p => new[] { p.BendingCheck, p.ShearCheck, p.DeflectionCheck }))
        .Select(c => c?.Utilisation ?? -1);
}
