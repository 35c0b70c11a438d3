using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.PostBases;

/// <summary>Base plates and rakers in a whole opening: results, gaps, and that more of anything never makes a plate worse.</summary>
public class PostBaseReportTests
{
    private static readonly Material Steel = SampleProject.Steel with { BendingStrength = 275e6, ShearStrength = 158e6, UltimateStrength = 430e6 };

    private static readonly BasePlateInput Plate = new()
    {
        Material = Steel,
        Length = 0.3,
        Width = 0.2,
        Thickness = 0.02,
        RodDistance = 0.11,
        ConcreteStrength = 25e6,
        WeldLeg = 0.006,
        WeldStrength = 480e6,
    };

    [Fact]
    public void Plate_Complete_NoGapAndEveryCheck()
    {
        var result = Run(b => b with { BasePlate = Plate });

        Assert.DoesNotContain(NeededChecks.BasePlates, result.Verdict.Missing);
        Assert.Equal(
            ["base-plate-bearing", "base-plate-pressed", "base-plate-pulled", "weld-flange", "weld-web"],
            Parts(result, NeededChecks.BasePlates).First().Checks.Select(c => c.Name));
    }

    [Fact]
    public void Plate_None_Gap() => Assert.Equal(
        "The base plates of the posts have no inputs: enter a base plate, or declare it designed by others.",
        Gap(Run(b => b), "base-plates-missing"));

    [Fact]
    public void Weld_None_GapNamesTheField()
    {
        Assert.Equal(
            "The weld between post and base plate has no size: enter its leg.",
            Gap(Run(b => b with { BasePlate = Plate with { WeldLeg = null } }), "base-plates-weld"));
        Assert.Equal(
            "The weld between post and base plate has no strength: enter the strength of the weld metal.",
            Gap(Run(b => b with { BasePlate = Plate with { WeldStrength = null } }), "base-plates-weld"));
    }

    [Fact]
    public void Plate_OtherFamily_NotCovered() => Assert.Equal(
        "Base plates of aluminium under posts of steel are not covered: both must be of one family to be welded.",
        Gap(Run(b => b with { BasePlate = Plate with { Material = SampleProject.Aluminium } }), "base-plates-not-covered"));

    [Fact]
    public void Plate_PostByProperties_NotCovered() => Assert.Equal(
        "Base plates under posts given by their properties are not covered: enter the shape of the post.",
        Gap(
            Run(b => b with
            {
                BasePlate = Plate,
                Posts = b.Posts! with
                {
                    Profile = new GivenProperties { Height = 0.1, Depth = 0.1, Area = 2e-3, Inertia = 4e-6, Modulus = 8e-5, PlasticModulus = 9e-5, ShearArea = 1e-3 },
                },
            }),
            "base-plates-not-covered"));

    [Fact]
    public void Raker_FootWithoutResistance_Gap() => Assert.Equal(
        "The feet of the rakers have no anchor resistance: enter the foot anchor resistance against the horizontal thrust.",
        Gap(Run(b => b with { Posts = b.Posts! with { Raker = Raker } }), "raker-foot-missing"));

    [Fact]
    public void Raker_OfTimber_NotCovered() => Assert.Equal(
        "Rakers of timber are not covered: their buckling is checked for steel and aluminium only.",
        Gap(Run(b => b with { Posts = b.Posts! with { Raker = Raker with { Material = Steel with { Family = MaterialFamily.Timber } } } }), "raker-not-covered"));

    [Fact]
    public void WeldedBase_StrengthNotKnown_Gap() => Assert.Equal(
        "The posts are of aluminium and welded at their base: enter the yield beside a weld of their material.",
        Gap(Run(b => b with { Posts = b.Posts! with { Material = SampleProject.Aluminium, WeldedBase = true } }), "post-welded-missing"));

    /// <summary>A raker takes moment from the base and lifts it: less in the post, uplift in the plate.</summary>
    [Fact]
    public void Raker_Stiff_RelievesThePostAndLiftsThePlate()
    {
        var without = Run(b => b with { BasePlate = Plate }).Cases[0];
        var with = Run(b => b with { BasePlate = Plate, Posts = b.Posts! with { Raker = Raker with { FootResistance = 20e3 } } }).Cases[0];

        Assert.True(with.Posts[0].BaseMoment < 0.5 * without.Posts[0].BaseMoment);
        Assert.True(with.Posts[0].BendingCheck!.Utilisation < without.Posts[0].BendingCheck!.Utilisation);
        Assert.Contains(with.Posts[0].Others, c => c.Name == "raker-compression" && c.Demand > 0);
        Assert.Contains(with.Parts, p => p.Check == NeededChecks.Anchors && p.Member == "raker of post 1");
        var tension = with.Parts.First(p => p.Check == NeededChecks.BasePlates).Workings[0].Steps;
        Assert.True(tension.Single(s => s.Symbol == "T_u").Value > 0);
    }

    /// <summary>A thicker plate, a wider weld, a stronger concrete: no utilisation of the base plates rises.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Plate_MoreOfAnything_NeverWorse(Scenario scenario)
    {
        if (scenario.Opening.Barrier.BasePlate is not { } plate)
        {
            return;
        }

        Compare("base-plate-pressed", p => p with { Thickness = 1.3 * p.Thickness });
        Compare("base-plate-pulled", p => p with { Thickness = 1.3 * p.Thickness });
        Compare("weld", p => p with { WeldLeg = 1.3 * p.WeldLeg });
        Compare("base-plate-bearing", p => p with { ConcreteStrength = 1.3 * p.ConcreteStrength });

        void Compare(string name, Func<BasePlateInput, BasePlateInput> change)
        {
            var more = scenario.With((Opening o) => o with { Barrier = o.Barrier with { BasePlate = change(plate) } });
            var pairs = Uses(scenario.Result, name).Zip(Uses(more.Result, name));
            Assert.All(pairs, pair => Assert.True(pair.Second <= pair.First * (1 + 1e-12), $"{name}: {pair.First} became {pair.Second}"));
        }
    }

    /// <summary>A thicker flange never raises what an I-section is used by: bending with shear, and lateral-torsional buckling.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Post_ThickerFlange_NeverWorse(Scenario scenario)
    {
        if (scenario.Opening.Barrier.Posts is not { Raker: null, Profile: ISection section } posts || section.Depth - 2.6 * section.Flange <= 0)
        {
            return;
        }

        // The shear area is the web between the flanges: with a thicker flange it shrinks, so the depth grows along.
        var thicker = section with { Flange = 1.3 * section.Flange, Depth = section.Depth + 0.6 * section.Flange };
        var more = scenario.With((Opening o) => o with { Barrier = o.Barrier with { BasePlate = null, Posts = posts with { Profile = thicker } } });

        foreach (var name in new[] { "post-bending-shear", "post-lateral" })
        {
            var pairs = PostUses(scenario.Result, name).Zip(PostUses(more.Result, name));
            Assert.All(pairs, pair => Assert.True(pair.Second <= pair.First * (1 + 1e-9), $"{name}: {pair.First} became {pair.Second}"));
        }
    }

    private static RakerInput Raker => new()
    {
        Material = Steel,
        Profile = new RectangularTube { Height = 0.05, Depth = 0.05, Wall = 0.004 },
        HeadHeight = 0.9,
        FootDistance = 0.9,
    };

    private static OpeningResult Run(Func<Barrier, Barrier> change) => SampleProject.Result(Refused.With(change));

    private static IEnumerable<PartResult> Parts(OpeningResult result, string check) => result.Cases[0].Parts.Where(p => p.Check == check);

    private static string Gap(OpeningResult result, string code) => result.Gaps.Single(g => g.Note.Code == code).Note.Text.ToString();

    private static double[] Uses(OpeningResult result, string name) =>
    [
        .. result.Cases.SelectMany(c => c.Parts).Where(p => p.Check == NeededChecks.BasePlates)
            .SelectMany(p => p.Checks).Where(c => c.Name.StartsWith(name, StringComparison.Ordinal)).Select(c => c.Utilisation),
    ];

    private static double[] PostUses(OpeningResult result, string name) =>
        [.. result.Cases.SelectMany(c => c.Posts).SelectMany(p => p.Others).Where(c => c.Name == name).Select(c => c.Utilisation)];
}
