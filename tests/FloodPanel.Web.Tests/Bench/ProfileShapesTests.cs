using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Web.Pages.Bench;

namespace FloodPanel.Web.Tests.Bench;

public class ProfileShapesTests
{
    private static readonly Profile[] Known =
    [
        new Rectangle { Height = 0.2, Depth = 0.05 },
        new HollowRectangle { Height = 0.2, Depth = 0.08, Face = 0.004, Web = 0.003, Webs = 3 },
        new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.006 },
        new ISection { Height = 0.1, Depth = 0.1, Flange = 0.008, Web = 0.006 },
    ];

    [Fact]
    public void Like_EveryShape_KeepsHeightAndDepthAndCanBeCalculated()
    {
        foreach (var profile in Known)
        {
            foreach (var shape in ProfileShapes.All)
            {
                var other = ProfileShapes.Like(profile, shape);

                Assert.IsType(shape, other);
                Assert.Equal((profile.Height, profile.Depth), (other.Height, other.Depth));
                Assert.True(SectionProperties.Of(other).Modulus > 0);
            }
        }
    }

    [Fact]
    public void Like_GivenProperties_AreThoseOfTheShape()
    {
        var given = ProfileShapes.Like(Known[1], typeof(GivenProperties));

        Assert.Equal(SectionProperties.Of(Known[1]), SectionProperties.Of(given));
    }
}
