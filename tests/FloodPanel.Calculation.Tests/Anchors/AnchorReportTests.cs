using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FloodPanel.Calculation.Tests.Steps;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Anchors;

[Properties(Arbitrary = [typeof(AnchorSets)])]
public class AnchorReportTests
{
    private static readonly AnchoredDock Dock = new(
        DesignBasisKind.AllowableStress,
        new() { TensionResistance = 40e3, ShearResistance = 30e3, Source = "Approval A-7" },
        new() { Material = SampleProject.Steel with { BendingStrength = 275e6 }, RodDistance = 0.11 });

    [Property(MaxTest = 400)]
    public Property Steps_AnyAnchors_EveryLineHolds(AnchoredDock dock)
    {
        var complaints = Checks(dock).SelectMany(StepAudit.Complaints).Take(3).ToArray();

        return (complaints.Length == 0).Label(string.Join("\n", complaints));
    }

    /// <summary>Anchors have checks unless a gap says why not.</summary>
    [Property(MaxTest = 200)]
    public void Parts_AnyAnchors_ChecksOrAGap(AnchoredDock dock)
    {
        var result = dock.Result;
        var isCovered = result.Cases.All(c => c.Parts.Any(p => p is { Check: NeededChecks.Anchors, Member: "post 1" } && p.Checks.Count > 1));
        var hasGap = result.Gaps.Any(g => g.Check == NeededChecks.Anchors && g.Note.Code.StartsWith("anchor", StringComparison.Ordinal));

        Assert.NotEqual(isCovered, hasGap);
    }

    /// <summary>
    /// Deeper anchors never raise a utilisation, while the depth of the member goes along. Exceptions are the codes' own, and are left out here: side-face
    /// blowout begins at a depth of 2.5 (ACI 318-19, 17.6.4.1) or 2 edge distances (EN 1992-4, 7.2.1.8); a third edge nearer than 1.5 depths
    /// reduces the depth that counts (17.6.2.1.2); beside an edge ψ_ed falls faster than the body of a long row grows (17.6.2.4).
    /// </summary>
    [Property(MaxTest = 300)]
    public void Checks_DeeperFarFromEdges_NeverWorse(AnchoredDock dock)
    {
        var far = dock.Anchors with { EdgeFlood = null, EdgeProtected = null, EdgeLeft = null, EdgeRight = null };
        NeverWorse(dock with { Anchors = far }, Deeper);
    }

    /// <summary>Near edges too, what does not tear out a body of its depth is never worse for deeper anchors.</summary>
    [Property(MaxTest = 300)]
    public void Checks_DeeperNearEdges_SteelPulloutAndEdgeNeverWorse(AnchoredDock dock) => NeverWorse(
        dock, Deeper, name => name.StartsWith("anchor-steel", StringComparison.Ordinal) || name.StartsWith("anchor-edge", StringComparison.Ordinal) || name == "anchor-pullout");

    /// <summary>
    /// Edges further off never raise a utilisation, except where three or more are nearer than 1.5 depths: the greatest of those sets the depth that
    /// counts, and one that moves out of that reach no longer does (ACI 318-19, 17.6.2.1.2; EN 1992-4, 7.2.1.4(8)).
    /// </summary>
    [Property(MaxTest = 300)]
    public Property Checks_EdgesFurtherOff_NeverWorse(AnchoredDock dock)
    {
        var layout = AnchorLayout.Of(dock.Anchors, dock.Plate);
        var isCut = new[] { layout, layout.Turned }.Any(l => IsReduced(l, 1) || IsReduced(l, 2));
        return Prop.When(!isCut, () => NeverWorse(dock, a => a with
        {
            EdgeFlood = a.EdgeFlood + 0.05,
            EdgeProtected = a.EdgeProtected + 0.05,
            EdgeLeft = a.EdgeLeft + 0.05,
            EdgeRight = a.EdgeRight + 0.05,
        }));

        // Splitting has a reach of its own.
        bool IsReduced(AnchorLayout l, int rows) => new[] { dock.Anchors.Depth, (dock.Anchors.CriticalEdge ?? 0.1) / 1.5 }
            .Any(depth => BreakoutBody.Of(l, rows, depth) is var body && body.Depth < body.Embedment);
    }

    [Property(MaxTest = 100)]
    public void Checks_StrongerConcrete_NeverWorse(AnchoredDock dock) =>
        NeverWorse(dock, dock with { Plate = dock.Plate with { ConcreteStrength = 35e6 } }, 1.12);

    /// <summary>Two rods pull in the row, two take the shear: T/2 and V/2 against the typed values.</summary>
    [Fact]
    public void Approval_Typed_RodForcesByHand()
    {
        var result = Dock.Result;
        var part = Assert.Single(result.Cases[0].Parts, p => p.Check == NeededChecks.Anchors);
        var post = result.Cases[0].Posts[0];

        Assert.Equal(["anchor-tension", "anchor-shear", "anchor-interaction"], part.Checks.Select(c => c.Name));
        Hand.Equal(post.BaseShear / 2, part.Checks[1].Demand);

        // A stress block at one edge: the rods stand at 0.11 m, the block ends near 0.15 m from the middle.
        Assert.InRange(part.Checks[0].Demand, post.BaseMoment / 0.26 / 2, post.BaseMoment / 0.22 / 2);
        Assert.All(part.Checks, c => Assert.Contains("Approval A-7", c.Source, StringComparison.Ordinal));
    }

    [Fact]
    public void Aci_ServiceLoads_AreRaisedToStrengthLevel()
    {
        var anchors = new AnchorInput { Method = AnchorMethod.Aci318, Kind = AnchorKind.Headed, HeadArea = 500e-6 };
        var service = Checks(Dock with { Anchors = anchors }).First(c => c.Name == "anchor-steel-shear");
        var strength = Checks(Dock with { Anchors = anchors, Basis = DesignBasisKind.UsStrength }).First(c => c.Name == "anchor-steel-shear");

        Hand.Equal(1.6, service.Demand / strength.Demand);
        Hand.Equal(service.Capacity, strength.Capacity);
    }

    [Fact]
    public void GroutPad_Aci_EightTenthsOfTheShear()
    {
        var anchors = new AnchorInput { Method = AnchorMethod.Aci318, Kind = AnchorKind.Headed, HeadArea = 500e-6 };
        double Capacity(double grout) => Checks(Dock with { Anchors = anchors, Plate = Dock.Plate with { GroutThickness = grout } })
            .First(c => c.Name == "anchor-steel-shear").Capacity;

        Hand.Equal(0.8, Capacity(0.03) / Capacity(0));
    }

    [Theory]
    [InlineData(AnchorMethod.Aci318, AnchorKind.Headed, DesignBasisKind.Eurocode, "anchor-not-covered")]
    [InlineData(AnchorMethod.En1992, AnchorKind.Headed, DesignBasisKind.UsStrength, "anchor-not-covered")]
    [InlineData(AnchorMethod.En1992, AnchorKind.Hooked, DesignBasisKind.Eurocode, "anchor-not-covered")]
    [InlineData(AnchorMethod.Aci318, AnchorKind.Headed, DesignBasisKind.UsStrength, "anchor-head-missing")]
    [InlineData(AnchorMethod.Aci318, AnchorKind.Hooked, DesignBasisKind.UsStrength, "anchor-hook-missing")]
    [InlineData(AnchorMethod.En1992, AnchorKind.PostInstalled, DesignBasisKind.Eurocode, "anchor-pullout-missing")]
    [InlineData(AnchorMethod.Approval, AnchorKind.PostInstalled, DesignBasisKind.Eurocode, "anchor-values-missing")]
    public void Gaps_UnfinishedOrNotCovered_SaysWhich(AnchorMethod method, AnchorKind kind, DesignBasisKind basis, string code)
    {
        var result = (Dock with { Basis = basis, Anchors = new() { Method = method, Kind = kind } }).Result;

        Assert.Contains(result.Gaps, g => g.Check == NeededChecks.Anchors && g.Note.Code == code);
        Assert.Contains(NeededChecks.Anchors, result.Verdict.Missing);
    }

    [Theory]
    [InlineData(false, null, "anchor-critical-edge-missing")]
    [InlineData(true, null, "")]
    [InlineData(false, 0.3, "")]
    public void Gaps_DrilledInUncrackedConcrete_NeedsTheCriticalEdge(bool cracked, double? critical, string code)
    {
        var anchors = new AnchorInput
        {
            Method = AnchorMethod.Aci318,
            Pullout = 30e3,
            MinimumEdge = 0.1,
            MinimumSpacing = 0.1,
            Source = "Approval A-7",
            Cracked = cracked,
            CriticalEdge = critical,
        };
        var gaps = (Dock with { Basis = DesignBasisKind.UsStrength, Anchors = anchors }).Result.Gaps
            .Where(g => g.Check == NeededChecks.Anchors && g.Note.Code.StartsWith("anchor-", StringComparison.Ordinal)).Select(g => g.Note.Code);

        Assert.Equal(code.Length == 0 ? [] : [code], gaps);
    }

    [Fact]
    public void Gaps_DrilledWithoutDistances_AsksForThem()
    {
        var anchors = new AnchorInput { Method = AnchorMethod.Aci318, Pullout = 30e3, Source = "Approval A-7" };

        Assert.Contains((Dock with { Basis = DesignBasisKind.UsStrength, Anchors = anchors }).Result.Gaps, g => g.Note.Code == "anchor-distances-missing");
    }

    [Fact]
    public void Validate_DeeperThanTheConcrete_IsRefused()
    {
        var problems = (Dock with { Anchors = new() { Method = AnchorMethod.Aci318, Depth = 0.3, MemberThickness = 0.3 } }).Project.Validate(Library.Empty);

        var problem = Assert.Single(problems);
        Assert.Equal("openings[0].barrier.anchors.depth", problem.Path);
        Assert.StartsWith("Effective depth is 300 mm; allowed is less than the concrete thickness", problem.Message.ToString(), StringComparison.Ordinal);
    }

    private static Check[] Checks(AnchoredDock dock) => [.. dock.Result.Cases.SelectMany(Anchored)];

    private static IEnumerable<Check> Anchored(CaseResult loadCase) => loadCase.Parts
        .Where(p => p.Check == NeededChecks.Anchors && p.Member.StartsWith("post", StringComparison.Ordinal)).SelectMany(p => p.Checks);

    private static AnchorInput Deeper(AnchorInput anchors) =>
        anchors with { Depth = anchors.Depth + 0.02, MemberThickness = anchors.MemberThickness + 0.02 };

    private static void NeverWorse(AnchoredDock dock, Func<AnchorInput, AnchorInput> better, Func<string, bool>? counts = null) =>
        NeverWorse(dock, dock with { Anchors = better(dock.Anchors) }, 1, counts);

    private static void NeverWorse(AnchoredDock dock, AnchoredDock better, double slack, Func<string, bool>? counts = null)
    {
        foreach (var (was, now) in dock.Result.Cases.Zip(better.Result.Cases))
        {
            var before = Anchored(was).ToDictionary(c => c.Name, c => c.Utilisation);
            foreach (var check in Anchored(now).Where(c => before.ContainsKey(c.Name) && counts?.Invoke(c.Name) != false))
            {
                Assert.True(check.Utilisation <= before[check.Name] * slack * (1 + 1e-9), $"{check.Name}: {before[check.Name]:R} became {check.Utilisation:R}");
            }
        }
    }
}
