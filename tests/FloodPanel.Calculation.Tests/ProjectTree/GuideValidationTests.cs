using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Guides;

namespace FloodPanel.Calculation.Tests.ProjectTree;

public class GuideValidationTests
{
    private const string Path = "openings[0].barrier.guides";

    private static readonly (string Path, Field Field, Func<double, GuideSet> With)[] Inputs =
    [
        ("lipThickness", GuideFields.LipThickness, v => SampleGuides.Reveal with { LipThickness = v }),
        ("lipLever", GuideFields.LipLever, v => SampleGuides.Reveal with { LipLever = v }),
        ("baseThickness", GuideFields.BaseThickness, v => SampleGuides.Reveal with { BaseThickness = v }),
        ("loadOffset", GuideFields.LoadOffset, v => SampleGuides.Reveal with { LoadOffset = v }),
        ("bearingDistance", GuideFields.BearingDistance, v => SampleGuides.Reveal with { BearingDistance = v }),
        ("bearingWidth", GuideFields.BearingWidth, v => SampleGuides.Reveal with { BearingWidth = v }),
        ("wallBearing", GuideFields.WallBearing, v => SampleGuides.Reveal with { WallBearing = v }),
        ("fasteners.pitch", GuideFields.Pitch, v => SampleGuides.WithFasteners(f => f with { Pitch = v })),
        ("fasteners.endDistance", GuideFields.EndDistance, v => SampleGuides.WithFasteners(f => f with { EndDistance = v })),
        ("fasteners.edgeDistance", GuideFields.EdgeDistance, v => SampleGuides.WithFasteners(f => f with { EdgeDistance = v })),
        ("fasteners.holeDiameter", GuideFields.HoleDiameter, v => SampleGuides.WithFasteners(f => f with { HoleDiameter = v })),
        ("fasteners.tension", GuideFields.Tension, v => SampleGuides.WithFasteners(f => f with { Tension = v })),
        ("fasteners.shear", GuideFields.Shear, v => SampleGuides.WithFasteners(f => f with { Shear = v })),
        ("fasteners.minimumEdge", GuideFields.MinimumEdge, v => SampleGuides.WithFasteners(f => f with { MinimumEdge = v })),
        ("fasteners.minimumSpacing", GuideFields.MinimumSpacing, v => SampleGuides.WithFasteners(f => f with { MinimumSpacing = v })),
        ("fasteners.interactionLimit", GuideFields.InteractionLimit, v => SampleGuides.WithFasteners(f => f with { InteractionLimit = v })),
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
            var expected = new InputProblem($"{Path}.{leaf}", field.Refusal(value)!);
            Assert.Single(SampleGuides.With(with(value)).Validate(Library.Empty), problem => problem == expected);
        });
    }

    [Fact]
    public void Validate_SampleGuides_NoProblems() => Refused.Not(SampleGuides.With(SampleGuides.Reveal));

    [Fact]
    public void Validate_MaterialUnknown_Refused() => Assert.Contains(
        SampleGuides.With(SampleGuides.Reveal with { Material = new LibraryMaterial("nothing") }).Validate(Library.Empty),
        problem => problem.Path == $"{Path}.material");

    [Fact]
    public void Validate_StripPastTheFasteners_Refused() => Refused.Once(
        SampleGuides.With(SampleGuides.Reveal with { BearingDistance = 0.01, BearingWidth = 0.021 }), $"{Path}.bearingWidth",
        "Bearing width is 21 mm; allowed is at most twice the bearing distance, 20 mm, or the strip reaches past the fasteners.",
        "Bearing width is 0.826771654 in; allowed is at most twice the bearing distance, 0.787401575 in, or the strip reaches past the fasteners.");

    /// <summary>40 + 20/2 = 50 mm from the fasteners, 49 mm of wall.</summary>
    [Theory]
    [InlineData(GuideMounting.WetFace, true)]
    [InlineData(GuideMounting.Reveal, true)]
    [InlineData(GuideMounting.DryFace, false)]
    public void Validate_StripPastTheArris_RefusedWhereTheStripLiesTowardsIt(GuideMounting mounting, bool refused)
    {
        var project = SampleGuides.With(SampleGuides.WithFasteners(f => f with { EdgeDistance = 0.049 }) with { Mounting = mounting });

        Assert.Equal(refused ? [$"{Path}.bearingDistance"] : [], project.Validate(Library.Empty).Select(p => p.Path));
    }

    [Theory]
    [InlineData(GuideMounting.DryFace, true)]
    [InlineData(GuideMounting.Reveal, false)]
    public void Validate_HoleAsWideAsTheBaseThatBends_RefusedOnADryFace(GuideMounting mounting, bool refused)
    {
        var project = SampleGuides.With(SampleGuides.Reveal with { Mounting = mounting, LoadOffset = 0.006 });

        Assert.Equal(refused ? [$"{Path}.fasteners.holeDiameter"] : [], project.Validate(Library.Empty).Select(p => p.Path));
    }

    [Fact]
    public void Validate_HoleAsWideAsThePitch_Refused() => Refused.Once(
        SampleGuides.With(SampleGuides.WithFasteners(f => f with { Pitch = 0.012 })), $"{Path}.fasteners.holeDiameter",
        "Hole diameter is 12 mm; allowed is less than the fastener pitch, 12 mm.",
        "Hole diameter is 0.472440945 in; allowed is less than the fastener pitch, 0.472440945 in.");

    /// <summary>Six logs of 0.2 m: 1.2 m.</summary>
    [Fact]
    public void Validate_EndDistanceOfHalfTheStack_Refused() => Refused.Once(
        SampleGuides.With(SampleGuides.WithFasteners(f => f with { EndDistance = 0.6 })), $"{Path}.fasteners.endDistance",
        "End distance is 600 mm; allowed is less than half of the stack of logs, 600 mm, so that a guide has two fasteners.",
        "End distance is 23.6220472 in; allowed is less than half of the stack of logs, 23.6220472 in, so that a guide has two fasteners.");
}
