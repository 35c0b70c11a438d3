using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

/// <summary>The dock: posts 100 x 100 mm, barrier 1.2 m.</summary>
public class PostBaseValidationTests
{
    private static readonly RakerInput Raker = new()
    {
        Material = SampleProject.Steel,
        Profile = new RectangularTube { Height = 0.05, Depth = 0.05, Wall = 0.004 },
        HeadHeight = 0.9,
        FootDistance = 0.8,
    };

    private static readonly BasePlateInput Plate = new() { Material = SampleProject.Steel };

    private static readonly (string Path, Field Field, Func<double, Project> With)[] Inputs =
    [
        ("posts.raker.headHeight", RakerFields.HeadHeight, v => With(Raker with { HeadHeight = v })),
        ("posts.raker.footDistance", RakerFields.FootDistance, v => With(Raker with { FootDistance = v })),
        ("posts.raker.lengthFactor", RakerFields.LengthFactor, v => With(Raker with { LengthFactor = v })),
        ("posts.raker.play", RakerFields.Play, v => With(Raker with { Play = v })),
        ("posts.raker.footResistance", RakerFields.FootResistance, v => With(Raker with { FootResistance = v })),
        ("basePlate.length", BasePlateFields.Length, v => With(Plate with { Length = v })),
        ("basePlate.width", BasePlateFields.Width, v => With(Plate with { Width = v })),
        ("basePlate.thickness", BasePlateFields.Thickness, v => With(Plate with { Thickness = v })),
        ("basePlate.rodDistance", BasePlateFields.RodDistance, v => With(Plate with { RodDistance = v })),
        ("basePlate.concreteStrength", BasePlateFields.ConcreteStrength, v => With(Plate with { ConcreteStrength = v })),
        ("basePlate.areaRatio", BasePlateFields.AreaRatio, v => With(Plate with { AreaRatio = v })),
        ("basePlate.groutThickness", BasePlateFields.GroutThickness, v => With(Plate with { GroutThickness = v })),
        ("basePlate.weldLeg", BasePlateFields.WeldLeg, v => With(Plate with { WeldLeg = v })),
        ("basePlate.weldStrength", BasePlateFields.WeldStrength, v => With(Plate with { WeldStrength = v })),
    ];

    public static TheoryData<string> Paths => [.. Inputs.Select(i => i.Path)];

    [Theory]
    [MemberData(nameof(Paths))]
    public void Validate_BeyondTheLimits_RefusedOnceInTheWordsOfTheField(string leaf)
    {
        var (_, field, with) = Inputs.Single(i => i.Path == leaf);
        var least = field.MinimumExcluded ? field.Minimum : Math.BitDecrement(field.Minimum);

        Assert.All([least, Math.BitIncrement(field.Maximum), double.NaN, double.PositiveInfinity], value =>
        {
            var problem = Assert.Single(with(value).Validate(Library.Empty));

            Assert.Equal($"openings[0].barrier.{leaf}", problem.Path);
            Assert.Equal(field.Refusal(value), problem.Message);
        });
    }

    [Fact]
    public void Validate_RodsPerRow_WithinItsLimits()
    {
        Assert.Empty(With(Plate with { RodsPerRow = 20 }).Validate(Library.Empty));
        Assert.Equal("openings[0].barrier.basePlate.rodsPerRow", Assert.Single(With(Plate with { RodsPerRow = 21 }).Validate(Library.Empty)).Path);
    }

    [Fact]
    public void Raker_HeadAboveTheBarrier_IsRefused() => Refused.Once(
        With(Raker with { HeadHeight = 1.25 }),
        "openings[0].barrier.posts.raker.headHeight",
        "Height of the head is 1.25 m; allowed is up to the top of the barrier, 1.200 m.",
        "Height of the head is 4.10104987 ft; allowed is up to the top of the barrier, 3.94 ft.");

    [Fact]
    public void Raker_FootUnderALeaningHead_IsRefused() => Refused.Once(
        Refused.With((Opening o) => o with
        {
            RakeDegrees = 45,
            Barrier = o.Barrier with { Posts = o.Barrier.Posts! with { Raker = Raker with { HeadHeight = 0.5, FootDistance = 0.4 } } },
        }),
        "openings[0].barrier.posts.raker.footDistance",
        "Distance of the foot is 0.4 m; allowed is more than the head leans over, 0.500 m, or the raker does not push against the water.",
        "Distance of the foot is 1.31233596 ft; allowed is more than the head leans over, 1.64 ft, or the raker does not push against the water.");

    [Fact]
    public void Plate_SmallerThanThePost_IsRefused()
    {
        Refused.Once(
            With(Plate with { Width = 0.09 }),
            "openings[0].barrier.basePlate.width",
            "Plate width B is 90 mm; allowed is at least the width of the post, 100 mm.",
            "Plate width B is 3.54330709 in; allowed is at least the width of the post, 3.93700787 in.");
        Assert.Contains(
            With(Plate with { Length = 0.09, RodDistance = 0.06 }).Validate(Library.Empty),
            p => p.Message.ToString() == "Plate length N is 90 mm; allowed is at least the depth of the post, 100 mm.");
    }

    [Fact]
    public void Plate_RodsOutsideOrBesideThePost_IsRefused()
    {
        Refused.Once(
            With(Plate with { RodDistance = 0.15 }),
            "openings[0].barrier.basePlate.rodDistance",
            "Distance of the rods from the middle is 150 mm; allowed is less than half of the plate length, 150 mm.",
            "Distance of the rods from the middle is 5.90551181 in; allowed is less than half of the plate length, 5.90551181 in.");
        Refused.Once(
            With(Plate with { RodDistance = 0.05 }),
            "openings[0].barrier.basePlate.rodDistance",
            "Distance of the rods from the middle is 50 mm; allowed is more than half of the depth of the post, 50 mm: rods beside the post are not covered.",
            "Distance of the rods from the middle is 1.96850394 in; allowed is more than half of the depth of the post, 1.96850394 in: rods beside the post are not covered.");
    }

    private static Project With(RakerInput raker) => Refused.With((PostSet p) => p with { Raker = raker });

    private static Project With(BasePlateInput plate) => Refused.With((Barrier b) => b with { BasePlate = plate });
}
