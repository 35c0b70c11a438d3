using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Guides;

/// <summary>
/// The dock brim-full, worked by hand: γ = 1025·9.80665; six logs of 0.2 m, 1.05 + 0.04 m of them on a guide. The lowest log
/// presses with γ·1.1·1.09, the next with γ·0.9·1.09, the third with γ·0.7·1.09 per metre of guide.
/// </summary>
public class GuideReportTests
{
    private const double Line = 1025 * 9.80665 * 1.1 * 1.09;

    /// <summary>The lowest of five fasteners holds 0.225 m: the lowest log and an eighth of the next.</summary>
    private const double Lowest = 1025 * 9.80665 * 1.09 * (1.1 * 0.2 + 0.9 * 0.025);

    [Fact]
    public void Of_Reveal_EveryCheckByHand()
    {
        var (guide, fasteners) = Parts(SampleGuides.Reveal, "left guide");

        Equal(guide, "guide-lip-bending", 6 * Line * 0.03 / (0.008 * 0.008), 120e6);
        Equal(guide, "guide-lip-shear", 1.5 * Line / 0.008, 70e6);
        Equal(guide, "guide-base-bending", 6 * Lowest * 0.03 / (0.08 * 0.01 * 0.01), 120e6);
        Equal(guide, "guide-wall-bearing", Line * 30 / 40 / 0.02, 5e6);
        Equal(fasteners, "fastener-tension", Lowest * 30 / 40, 6000);
        Equal(fasteners, "fastener-shear", Lowest, 8000);
        Equal(fasteners, "fastener-interaction", Lowest * 30 / 40 / 6000 + Lowest / 8000, 1.2);
        Equal(fasteners, "fastener-edge-distance", 0.08, 0.1);
        Equal(fasteners, "fastener-spacing", 0.1, 0.25);
    }

    /// <summary>Prying: T = R·70/40; the base bends at the fasteners, beside a hole of 12 mm: 2·30 − 12 = 48 mm.</summary>
    [Fact]
    public void Of_DryFace_PryingAndNoShear()
    {
        var (guide, fasteners) = Parts(SampleGuides.Reveal with { Mounting = GuideMounting.DryFace }, "right guide");

        Equal(guide, "guide-base-bending", 6 * Lowest * 0.03 / (0.048 * 0.01 * 0.01), 120e6);
        Equal(guide, "guide-wall-bearing", Line * 30 / 40 / 0.02, 5e6);
        Equal(fasteners, "fastener-tension", Lowest * 70 / 40, 6000);
        Assert.DoesNotContain(fasteners.Checks, check => check.Name is "fastener-shear" or "fastener-interaction");
    }

    /// <summary>The load over the wall: its whole bears, the fasteners hold the guide in place.</summary>
    [Fact]
    public void Of_WetFace_TheWallTakesTheLoad()
    {
        var (guide, fasteners) = Parts(SampleGuides.Reveal with { Mounting = GuideMounting.WetFace }, "left guide");

        Equal(guide, "guide-wall-bearing", Line / 0.02, 5e6);
        Assert.DoesNotContain(guide.Checks, check => check.Name == "guide-base-bending");
        Assert.Equal(["fastener-edge-distance", "fastener-spacing"], fasteners.Checks.Select(check => check.Name));
    }

    /// <summary>The load 60 mm from the fasteners, the strip 40 mm: T = R·20/40, C = n·60/40, M = R·20 mm on 2·40 mm.</summary>
    [Fact]
    public void Of_WetFaceWithTheLoadBeyondTheWall_TipsAboutTheStrip()
    {
        var (guide, fasteners) = Parts(SampleGuides.Reveal with { Mounting = GuideMounting.WetFace, LoadOffset = 0.06 }, "left guide");

        Equal(guide, "guide-base-bending", 6 * Lowest * 0.02 / (0.08 * 0.01 * 0.01), 120e6);
        Equal(guide, "guide-wall-bearing", Line * 60 / 40 / 0.02, 5e6);
        Equal(fasteners, "fastener-tension", Lowest * 20 / 40, 6000);
    }

    /// <summary>Bays of 1.5 and 2.7 m: 0.79 and 1.39 m of log on the guides.</summary>
    [Fact]
    public void Of_UnequalBays_EachGuideHasItsOwnBay()
    {
        var project = Refused.With((Barrier b) => b with { Bays = [1.5, 2.7], Guides = SampleGuides.Reveal });

        Equal(Part(project, NeededChecks.Anchors, "left guide"), "fastener-shear", Lowest * 0.79 / 1.09, 8000);
        Equal(Part(project, NeededChecks.Anchors, "right guide"), "fastener-shear", Lowest * 1.39 / 1.09, 8000);
    }

    /// <summary>
    /// Debris on 0.85 m of still water: the second fastener holds 0.225 to 0.475 m, of the second and third log, and 0.25 m of a
    /// patch of 0.30 m; the lowest holds more water but only 0.225 m of a patch.
    /// </summary>
    [Fact]
    public void Of_Debris_WaterOfTheStretchAndTheShareOfTheImpactOnIt()
    {
        var project = Refused.With((Opening o) => o with
        {
            Actions = new() { Debris = new() { Velocity = 1 } },
            Barrier = o.Barrier with { Guides = SampleGuides.Reveal },
        });

        var shear = Part(project, NeededChecks.Anchors, "left guide", "debris").Checks.Single(c => c.Name == "fastener-shear");

        var impact = shear.Steps.Single(s => s.Symbol == "F").Value;
        Assert.True(impact > 0);
        Hand.Equal(1025 * 9.80665 * 1.09 * (0.55 * 0.175 + 0.35 * 0.075) + impact * 0.25 / 0.3, shear.Demand);
    }

    [Fact]
    public void Gaps_NoGuides_GuidesAndAnchorsAreMissing()
    {
        var result = SampleProject.Result(SampleGuides.OneBay(null));

        Assert.Contains(NeededChecks.Guides, result.Verdict.Missing);
        Assert.Contains(NeededChecks.Anchors, result.Verdict.Missing);
        Assert.Equal(
            ["The fasteners of the guides have no inputs: enter the guides, or declare the anchors designed by others.",
             "The guides have no inputs: enter their mounting and dimensions, or declare them designed by others."],
            GuideGaps(result));
    }

    [Fact]
    public void Gaps_EveryInput_NeitherIsMissing()
    {
        var result = SampleProject.Result(SampleGuides.OneBay(SampleGuides.Reveal));

        Assert.Empty(GuideGaps(result));
        Assert.DoesNotContain(NeededChecks.Guides, result.Verdict.Missing);
        Assert.DoesNotContain(NeededChecks.Anchors, result.Verdict.Missing);
    }

    public static TheoryData<string, string> Incomplete => new()
    {
        { "material", "The material of the guides has no bending or shear stress under this design basis: enter an allowable or a strength for both." },
        { "wall", "Wall bearing under the guides is empty: enter the pressure that the wall may take." },
        { "wall source", "Wall bearing under the guides has no source: enter where the value comes from." },
        { "values", "The fasteners of the guides lack values: enter tension per fastener, shear per fastener, least edge distance, least spacing, from their approval or from tests on the wall." },
        { "source", "The values of the guides' fasteners have no source: enter the approval or test that they come from." },
        { "basis", "The values of the guides' fasteners belong to another design basis than the project's: enter those of this one." },
    };

    [Theory]
    [MemberData(nameof(Incomplete))]
    public void Gaps_OneInputMissing_SaysWhichToEnter(string missing, string sentence)
    {
        var guides = missing switch
        {
            "material" => SampleGuides.Reveal with { Material = SampleProject.Aluminium with { AllowableShear = null } },
            "wall" => SampleGuides.Reveal with { WallBearing = null },
            "wall source" => SampleGuides.Reveal with { WallBearingSource = " " },
            "values" => SampleGuides.WithFasteners(f => f with { Tension = null, Shear = null, MinimumEdge = null, MinimumSpacing = null }),
            "source" => SampleGuides.WithFasteners(f => f with { Source = "" }),
            _ => SampleGuides.WithFasteners(f => f with { ValuesFor = DesignBasisKind.Eurocode }),
        };

        var result = SampleProject.Result(SampleGuides.OneBay(guides));

        Assert.Equal([sentence], GuideGaps(result));
    }

    /// <summary>A least edge distance that is kept uses nothing up; broken, it governs.</summary>
    [Theory]
    [InlineData(0.099, false)]
    [InlineData(0.5, true)]
    public void Governing_LeastEdgeDistance_OnlyWhenItIsBroken(double least, bool governs)
    {
        var strong = SampleGuides.WithFasteners(f => f with { MinimumEdge = least, Tension = 60_000, Shear = 80_000 });

        var governing = SampleProject.Result(SampleGuides.OneBay(strong)).Verdict.Governing!;

        Assert.Equal(governs, governing.Check == "fastener-edge-distance");
    }

    /// <summary>Values without a source are held against nothing; the forces are there all the same.</summary>
    [Fact]
    public void Of_NoSource_ForcesWithoutChecks()
    {
        var part = Part(SampleGuides.With(SampleGuides.WithFasteners(f => f with { Source = "" })), NeededChecks.Anchors, "left guide");

        Assert.Empty(part.Checks);
        Assert.Equal([Lowest * 30 / 40, Lowest], part.Workings.Select(w => Math.Round(w.Steps[^1].Value, 9)), Near);
    }

    private static bool Near(double a, double b) => Math.Abs(a - b) <= 1e-8 * Math.Abs(a);

    private static IEnumerable<string> GuideGaps(OpeningResult result) =>
        result.Gaps.Where(gap => gap.Note.Code.StartsWith("guide", StringComparison.Ordinal)).Select(gap => gap.Note.Text.ToString());

    private static (PartResult Guide, PartResult Fasteners) Parts(GuideSet guides, string member) =>
        (Part(SampleGuides.With(guides), NeededChecks.Guides, member), Part(SampleGuides.With(guides), NeededChecks.Anchors, member));

    private static PartResult Part(Project project, string check, string member, string @case = "brim-full") => SampleProject.Result(project)
        .Cases.Single(c => c.Name == @case).Parts.Single(p => p.Check == check && p.Member == member);

    private static void Equal(PartResult part, string name, double demand, double capacity)
    {
        var check = part.Checks.Single(c => c.Name == name);

        Hand.Equal(demand, check.Demand);
        Hand.Equal(capacity, check.Capacity);
        Hand.Equal(demand / capacity, check.Utilisation);
    }
}
