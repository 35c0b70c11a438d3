using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Footings;

/// <summary>The dock on a footing of its own: 0.85 m of water in the design flood, 1.2 m to the top.</summary>
public class FootingReportTests
{
    private static readonly FootingInput Footing = new()
    {
        Width = 3.4,
        Thickness = 0.7,
        BarrierFromFloodEdge = 2.6,
        Friction = 0.5,
        AllowableBearing = 120e3,
        CutOff = 1.5,
        Soil = CreepSoil.MediumSand,
        CarriesGuides = true,
        Source = "Report G-2",
    };

    [Fact]
    public void Evaluate_GoodFooting_SixChecksPassAndNothingIsMissing()
    {
        var result = SampleProject.Result(Refused.With((Barrier b) => b with { Footing = Footing }));
        var part = Assert.Single(result.Cases[0].Parts, p => p.Member == "footing");

        Assert.Equal(
            ["footing-sliding", "footing-eccentricity", "footing-overturning", "footing-bearing", "footing-flotation", "footing-creep"],
            part.Checks.Select(c => c.Name));
        Assert.All(part.Checks, check => Assert.True(check.Passes, check.Name));
        Assert.DoesNotContain(NeededChecks.SupportingWall, result.Verdict.Missing);
    }

    [Fact]
    public void Evaluate_NarrowFooting_IsInadequateAndSaysWhich()
    {
        var result = SampleProject.Result(Refused.With((Barrier b) => b with { Footing = Footing with { Width = 0.8, BarrierFromFloodEdge = 0.3 } }));

        Assert.Equal(VerdictKind.Inadequate, result.Verdict.Kind);
        Assert.Equal("footing", result.Verdict.Governing!.Member);
        Assert.StartsWith("footing-", result.Verdict.Governing.Check, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", DesignBasisKind.AllowableStress, "footing-source-missing")]
    [InlineData("Report G-2", DesignBasisKind.Eurocode, "footing-not-covered")]
    public void Gaps_NoSourceOrNotCovered_SupportingWallIsMissing(string source, DesignBasisKind basis, string code)
    {
        var project = Refused.With((Barrier b) => b with { Footing = Footing with { Source = source } }) with { DesignBasis = basis };
        var result = SampleProject.Result(project);

        Assert.Contains(NeededChecks.SupportingWall, result.Verdict.Missing);
        Assert.Equal(code, Assert.Single(result.Gaps, g => g.Check == NeededChecks.SupportingWall).Note.Code);
    }

    [Fact]
    public void Gaps_GuidesOnAWall_TheWallIsWantedToo()
    {
        var result = SampleProject.Result(Refused.With((Barrier b) => b with { Footing = Footing with { CarriesGuides = false } }));

        Assert.Contains(NeededChecks.SupportingWall, result.Verdict.Missing);
    }

    /// <summary>
    /// More friction, adhesion or cut-off, heavier concrete, firmer ground never raise a utilisation; heavier concrete may raise the
    /// bearing pressure, which is a load. Width and thickness may raise some: they take on more uplift and more water at the side.
    /// </summary>
    [Property(MaxTest = 150, Arbitrary = [typeof(Scenarios)])]
    public void Checks_Better_NeverWorse(Scenario scenario)
    {
        if (scenario.Opening.Barrier.Footing is not { } footing)
        {
            return;
        }

        NeverWorse(scenario, footing, f => f with { Friction = f.Friction + 0.1 }, "");
        NeverWorse(scenario, footing, f => f with { Adhesion = f.Adhesion + 1000 }, "");
        NeverWorse(scenario, footing, f => f with { AllowableBearing = 2 * f.AllowableBearing }, "");
        NeverWorse(scenario, footing, f => f with { CutOff = f.CutOff + 0.5 }, "");
        NeverWorse(scenario, footing, f => f with { Density = f.Density + 300 }, "footing-bearing");
    }

    private static void NeverWorse(Scenario scenario, FootingInput footing, Func<FootingInput, FootingInput> change, string except)
    {
        var (before, after) = (Checks(scenario, footing), Checks(scenario, change(footing)));
        foreach (var (name, use) in before.Where(pair => pair.Key != except && after.ContainsKey(pair.Key)))
        {
            // Rounding of a resultant through the very middle counts as nothing.
            Assert.True(after[name] <= use * (1 + 1e-9) + 1e-12, $"{name}: {use:R} became {after[name]:R}");
        }
    }

    private static Dictionary<string, double> Checks(Scenario scenario, FootingInput footing)
    {
        var opening = scenario.Opening with { Barrier = scenario.Opening.Barrier with { Footing = footing } };
        var result = Design.Evaluate(scenario.Project with { Openings = [opening] }, opening, Library.Empty);
        return result.Cases[0].Parts.Where(p => p.Member == "footing").SelectMany(p => p.Checks).ToDictionary(c => c.Name, c => c.Utilisation);
    }
}
