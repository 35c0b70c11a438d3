using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using MathNet.Numerics.Integration;

namespace FloodPanel.Calculation.Tests.Sections;

/// <summary>Areas worked by hand in centimetres.</summary>
public class SectionPropertiesTests
{
    /// <summary>20 × 6: A 120, I 20·216/12, W 20·36/6, W_pl 20·36/4, A_v 120/1.5.</summary>
    [Fact]
    public void Of_Rectangle_ByHand() =>
        AssertCentimetres(new Rectangle { Height = 0.2, Depth = 0.06 }, area: 120, inertia: 360, modulus: 120, plastic: 180, shear: 80);

    /// <summary>20 × 10, faces 1, four webs of 0.5: void 18 × 8. A 200 − 144, I (20·1000 − 18·512)/12, W_pl (2000 − 18·64)/4, A_v 4·0.5·8.</summary>
    [Fact]
    public void Of_HollowRectangle_ByHand() => AssertCentimetres(
        new HollowRectangle { Height = 0.2, Depth = 0.1, Face = 0.01, Web = 0.005, Webs = 4 },
        area: 56, inertia: 10_784 / 12.0, modulus: 10_784 / 60.0, plastic: 212, shear: 16);

    /// <summary>10 × 12, wall 1: void 8 × 10. A 120 − 80, I (10·1728 − 8·1000)/12, W_pl (1440 − 800)/4, A_v 2·1·10.</summary>
    [Fact]
    public void Of_RectangularTube_ByHand() => AssertCentimetres(
        new RectangularTube { Height = 0.1, Depth = 0.12, Wall = 0.01 },
        area: 40, inertia: 9_280 / 12.0, modulus: 9_280 / 72.0, plastic: 160, shear: 20);

    /// <summary>Width 10, depth 12, flanges 1, web 0.6: voids 9.4 × 10. A 120 − 94, I (17280 − 9400)/12, W_pl (1440 − 940)/4, A_v 0.6·10.</summary>
    [Fact]
    public void Of_ISection_ByHand() => AssertCentimetres(
        new ISection { Height = 0.1, Depth = 0.12, Flange = 0.01, Web = 0.006 },
        area: 26, inertia: 7_880 / 12.0, modulus: 7_880 / 72.0, plastic: 125, shear: 6);

    [Fact]
    public void Of_GivenProperties_AsGiven() => AssertCentimetres(
        new GivenProperties
        {
            Height = 0.2,
            Depth = 0.1,
            Area = 55e-4,
            Inertia = 890e-8,
            Modulus = 178e-6,
            PlasticModulus = 210e-6,
            ShearArea = 15e-4,
        },
        area: 55, inertia: 890, modulus: 178, plastic: 210, shear: 15);

    /// <summary>
    /// Area and moments as integrals of the width over the depth, strip by strip. Between the heights where the width bends
    /// it is straight or an arc; an arc wants many points, as its slope is infinite at its end.
    /// </summary>
    [Property]
    public Property Of_AnyShape_AgreesWithIntegralsOverTheDepth() =>
        Prop.ForAll(Members.Profile.Where(p => p is not GivenProperties).ToArbitrary(), profile =>
        {
            var section = SectionProperties.Of(profile);
            var half = profile.Depth / 2;
            double[] bends = [0, .. Bends(profile).Where(y => y > 0 && y < half).Distinct().Order(), half];
            double Twice(Func<double, double> f) => 2 * bends.Zip(bends.Skip(1)).Sum(piece =>
                GaussLegendreRule.Integrate(y => f(y) * Width(profile, y), piece.First, piece.Second, order: 512));

            Assert.Equal(1, section.Area / Twice(_ => 1), tolerance: 1e-7);
            Assert.Equal(1, section.Inertia / Twice(y => y * y), tolerance: 1e-7);
            Assert.Equal(1, section.PlasticModulus / Twice(y => y), tolerance: 1e-7);
            Assert.Equal(1, section.Modulus / (section.Inertia / half), tolerance: 1e-9);
        });

    /// <summary>Between the straight parts of the webs and of the faces, AISC 360 G4 counts the straight inside of a web: 120 − 2·(10 + 5) = 90 mm, two webs of 10 mm.</summary>
    [Fact]
    public void Of_RoundedTube_ShearAreaIsTheStraightInsideOfTheWebs() => Hand.Equal(
        18, SectionProperties.Of(new RectangularTube { Height = 0.1, Depth = 0.12, Wall = 0.01, CornerRadius = 0.015 }).ShearArea * 1e4);

    /// <summary>A tube so round that it is a pipe, 100 × 10: A = π·(50² − 40²) mm², I = π·(50⁴ − 40⁴)/4 mm⁴.</summary>
    [Fact]
    public void Of_TubeThatIsAllCorner_IsAPipe()
    {
        var pipe = SectionProperties.Of(new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.01, CornerRadius = 0.05 });

        Hand.Equal(Math.PI * 900, pipe.Area * 1e6);
        Hand.Equal(Math.PI * (6_250_000 - 2_560_000) / 4, pipe.Inertia * 1e12);
        Hand.Equal((1_000_000 - 512_000) / 6.0, pipe.PlasticModulus * 1e9);
    }

    /// <summary>Distances from mid-depth at which the width is another function.</summary>
    private static double[] Bends(Profile profile) => profile switch
    {
        HollowRectangle hollow => [hollow.Depth / 2 - hollow.Face],
        RectangularTube tube => [tube.Depth / 2 - tube.Wall, tube.Depth / 2 - tube.Wall - tube.InnerCorner, tube.Depth / 2 - tube.OuterCorner],
        ISection section => [section.Depth / 2 - section.Flange],
        _ => [],
    };

    private static double Width(Profile profile, double y) => profile switch
    {
        HollowRectangle hollow when y < hollow.Depth / 2 - hollow.Face => hollow.Webs * hollow.Web,
        RectangularTube tube => Rounded(tube.Height, tube.Depth / 2, tube.OuterCorner, y)
            - Rounded(tube.Height - 2 * tube.Wall, tube.Depth / 2 - tube.Wall, tube.InnerCorner, y),
        ISection section when y < section.Depth / 2 - section.Flange => section.Web,
        _ => profile.Height,
    };

    /// <summary>Width of a rounded rectangle at a distance from its middle; none beyond its edge.</summary>
    private static double Rounded(double width, double half, double radius, double y)
    {
        var up = Math.Max(0, y - (half - radius));
        return y >= half ? 0 : width - 2 * (radius - Math.Sqrt(radius * radius - up * up));
    }

    private static void AssertCentimetres(
        Profile profile, double area, double inertia, double modulus, double plastic, double shear)
    {
        var section = SectionProperties.Of(profile);

        Assert.Equal((profile.Height, profile.Depth), (section.Height, section.Depth));
        Hand.Equal(area, section.Area * 1e4);
        Hand.Equal(inertia, section.Inertia * 1e8);
        Hand.Equal(modulus, section.Modulus * 1e6);
        Hand.Equal(plastic, section.PlasticModulus * 1e6);
        Hand.Equal(shear, section.ShearArea * 1e4);
    }
}
