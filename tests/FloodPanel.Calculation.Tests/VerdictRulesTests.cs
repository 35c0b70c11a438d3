using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

public class VerdictRulesTests
{
    private static readonly Material Timber = new() { Family = MaterialFamily.Timber, Density = 500, ElasticModulus = 11e9, BendingStrength = 24e6, ShearStrength = 4e6 };

    [Fact]
    public void Of_EverythingCheckedOrByOthers_Adequate()
    {
        var verdict = Verdict((Barrier b) => b with { ByOthers = SampleProject.AllByOthers });

        Assert.Equal(VerdictKind.Adequate, verdict.Kind);
        Assert.Empty(verdict.Missing);
    }

    [Fact]
    public void Of_OneBay_NeedsNoPostsAndNoBasePlates()
    {
        var verdict = Verdict((Opening o) => o with { ClearWidth = 2.1, Barrier = o.Barrier with { Bays = [2.1], Posts = null } });

        Assert.Equal(["anchors", "guides", "supporting-wall"], verdict.Missing);
    }

    /// <summary>One declaration without its name or its reference leaves that check missing.</summary>
    [Theory]
    [InlineData("", "D-1")]
    [InlineData("A. Designer", "")]
    [InlineData(" ", " ")]
    public void Of_DeclarationWithoutNameOrReference_Incomplete(string name, string reference)
    {
        var declarations = SampleProject.AllByOthers.SetItem(3, new("anchors", name, reference));

        var verdict = Verdict((Barrier b) => b with { ByOthers = declarations });

        Assert.Equal(VerdictKind.Incomplete, verdict.Kind);
        Assert.Equal(["anchors"], verdict.Missing);
    }

    /// <summary>Timber has no rule under the US bases, nothing has one for a composite: the strength is not used.</summary>
    [Theory]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Timber, true)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Timber, true)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Timber, false)]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Composite, true)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Composite, true)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Composite, true)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Aluminium, false)]
    public void Of_BasisAndFamily_LogsMissingWhereThereIsNoRule(DesignBasisKind basis, MaterialFamily family, bool missing)
    {
        var project = Refused.With((LogStack l) => l with { Material = Timber with { Family = family } }) with { DesignBasis = basis };

        var result = SampleProject.Result(project);

        Assert.Equal(missing, result.Verdict.Missing.Contains("logs"));
        Assert.Equal(missing, result.Notes.Any(n => n.Code == "strength-missing"));
        Assert.All(result.Cases.SelectMany(c => c.Logs), log => Assert.Equal(missing, log.BendingCheck is null && log.ShearCheck is null));
    }

    [Fact]
    public void Of_PostsWithoutAStress_PostsMissing()
    {
        var verdict = Verdict((PostSet p) => p with { Material = SampleProject.Steel with { AllowableShear = null } });

        Assert.Equal(["posts", "base-plates", "anchors", "guides", "supporting-wall"], verdict.Missing);
    }

    /// <summary>An action that its method does not cover keeps the verdict open, whoever designs the rest.</summary>
    [Fact]
    public void Of_ActionsNotCovered_IncompleteAndListed()
    {
        var actions = new ActionSet
        {
            Flow = new() { Velocity = 3.06 },
            Wave = new NonBreakingWaveInput { Height = 3, Period = 3 },
        };

        var verdict = Verdict((Opening o) => o with { Actions = actions, Barrier = o.Barrier with { ByOthers = SampleProject.AllByOthers } });

        Assert.Equal(["flow", "wave"], verdict.Missing);
        Assert.NotEqual(VerdictKind.Adequate, verdict.Kind);
    }

    [Theory]
    [InlineData(3.05, VerdictKind.Adequate)]
    [InlineData(3.0501, VerdictKind.Incomplete)]
    public void Of_FlowAtTheLimitOfTheMethod_IncompleteAboveIt(double velocity, VerdictKind kind)
    {
        var verdict = Verdict((Opening o) => o with
        {
            Actions = new() { Flow = new() { Velocity = velocity } },
            Barrier = o.Barrier with { ByOthers = SampleProject.AllByOthers },
        });

        Assert.Equal(kind, verdict.Kind);
    }

    /// <summary>Required 1.1 m: 0.85 m of water and a freeboard of 0.25 m.</summary>
    [Fact]
    public void Of_FreeboardMissed_InadequateAndGoverns()
    {
        var verdict = Verdict((Site s) => s with { Freeboard = 0.36 });

        Assert.Equal(VerdictKind.Inadequate, verdict.Kind);
        Assert.Equal(("freeboard", null, ""), (verdict.Governing!.Check, verdict.Governing.Case, verdict.Governing.Member));
        Hand.Equal(1.21 / 1.201, verdict.Governing.Utilisation);
    }

    /// <summary>A freeboard that is met to 99 % is no member's utilisation: a log governs below it.</summary>
    [Fact]
    public void Of_FreeboardMet_NeverGoverns()
    {
        var verdict = Verdict((Site s) => s with { Freeboard = 0.35 });

        Assert.NotEqual(VerdictKind.Inadequate, verdict.Kind);
        Assert.NotEqual("freeboard", verdict.Governing!.Check);
        Assert.InRange(verdict.Governing.Utilisation, 0, 0.9);
    }

    /// <summary>A log that fails worse than the freeboard governs before it.</summary>
    [Fact]
    public void Of_FreeboardMissedAndALogWorse_LogGoverns()
    {
        var project = Refused.With((LogStack l) => l with { Material = SampleProject.Aluminium with { AllowableBending = 5e6 } });

        var verdict = SampleProject.Result(project with { Site = project.Site with { Freeboard = 0.5 } }).Verdict;

        Assert.Equal("log-bending", verdict.Governing!.Check);
        Assert.Equal("brim-full", verdict.Governing.Case);
    }

    /// <summary>A check that fails here is not healed by a declaration.</summary>
    [Fact]
    public void Of_FailingLogsDeclaredByOthers_Inadequate()
    {
        var verdict = Verdict((Barrier b) => b with
        {
            ByOthers = SampleProject.AllByOthers,
            Logs = b.Logs with { DeflectionLimit = 5000 },
        });

        Assert.Equal(VerdictKind.Inadequate, verdict.Kind);
        Assert.Equal("log-deflection", verdict.Governing!.Check);
    }

    [Theory]
    [InlineData(true, "log 1 in bay 2")]
    [InlineData(false, "log 1")]
    public void Governing_Log_NamedWithItsBayWhereThereAreSeveral(bool posts, string member)
    {
        var weak = SampleProject.Dock.Barrier.Logs with { Material = SampleProject.Aluminium with { AllowableBending = 10e6 } };

        var verdict = Verdict((Opening o) => posts
            ? o with { ClearWidth = 3.2, Barrier = o.Barrier with { Logs = weak, Bays = [1.0, 2.1] } }
            : o with { ClearWidth = 2.1, Barrier = o.Barrier with { Logs = weak, Bays = [2.1], Posts = null } });

        Assert.Equal(member, verdict.Governing!.Member);
    }

    /// <summary>The second post stands between the wide bays.</summary>
    [Fact]
    public void Governing_Post_NamedByItsNumber()
    {
        var verdict = Verdict((Opening o) => o with
        {
            ClearWidth = 4.4,
            Barrier = o.Barrier with { Bays = [0.6, 1.8, 1.8], Posts = o.Barrier.Posts! with { Material = SampleProject.Steel with { AllowableBending = 10e6 } } },
        });

        Assert.Equal(("post-bending", "brim-full", "post 2"), (verdict.Governing!.Check, verdict.Governing.Case, verdict.Governing.Member));
    }

    [Property(MaxTest = 300, Arbitrary = [typeof(Scenarios)])]
    public void Of_AnyOpening_AdequateOnlyWhenAllRanAndPassed(Scenario scenario)
    {
        var result = scenario.Result;
        var members = result.Cases.SelectMany(c => c.Logs.SelectMany(l => l.Checks)
            .Concat(c.Posts.SelectMany(p => p.Checks)).Concat(c.Parts.SelectMany(p => p.Checks))).ToArray();
        var fails = members.Append(result.Freeboard).Any(c => !(c.Demand <= c.Capacity));

        var expected = fails ? VerdictKind.Inadequate
            : result.Verdict.Missing.Count > 0 ? VerdictKind.Incomplete
            : VerdictKind.Adequate;

        Assert.Equal(expected, result.Verdict.Kind);
        Assert.StartsWith(expected.ToString(), result.Verdict.Sentence.ToString(), StringComparison.Ordinal);
        var worst = members.Where(c => !c.IsDetailing || c.Demand > c.Capacity).Max(c => c.Utilisation);
        Assert.Equal(result.Freeboard.Passes ? worst : Math.Max(worst, result.Freeboard.Utilisation), result.Verdict.Governing!.Utilisation);
    }

    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Missing_AnyOpening_WhateverHasNoResultAndNoDesigner(Scenario scenario)
    {
        var (barrier, actions) = (scenario.Opening.Barrier, scenario.Opening.Actions);
        var result = scenario.Result;
        var logsRan = result.Cases[0].Logs.All(log => log is { BendingCheck: not null, ShearCheck: not null });
        var postsRan = barrier.Bays.Count == 1 || result.Cases[0].Posts[0] is { BendingCheck: not null, ShearCheck: not null };
        var needed = new List<string>();
        needed.AddRange(logsRan ? [] : ["logs"]);
        needed.AddRange(postsRan ? [] : ["posts"]);
        needed.AddRange(result.Gaps.Select(gap => gap.Check));
        needed = [.. NeededChecks.MayBeByOthers.Where(needed.Contains)];
        needed.RemoveAll(check => barrier.ByOthers.Any(d => d.Check == check && d.Name.Length > 0 && d.Reference.Length > 0));
        needed.AddRange(actions.Flow is { Velocity: > 3.05 } ? ["flow"] : []);
        needed.AddRange(scenario.Model.Wave is { IsCovered: false } ? ["wave"] : []);

        Assert.Equal(needed, result.Verdict.Missing);
    }

    private static Verdict Verdict(Func<Opening, Opening> change) => SampleProject.Result(Refused.With(change)).Verdict;

    private static Verdict Verdict(Func<Barrier, Barrier> change) => SampleProject.Result(Refused.With(change)).Verdict;

    private static Verdict Verdict(Func<PostSet, PostSet> change) => SampleProject.Result(Refused.With(change)).Verdict;

    private static Verdict Verdict(Func<Site, Site> change) => SampleProject.Result(Refused.With(change)).Verdict;
}
