using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The shapes that a profile can be given by, and the way from one to another.</summary>
public static class ProfileShapes
{
    private const double Plate = 0.003;

    /// <summary>One of each shape, in the order shown.</summary>
    public static IReadOnlyList<Type> All { get; } =
        [typeof(HollowRectangle), typeof(Rectangle), typeof(RectangularTube), typeof(ISection), typeof(GivenProperties)];

    /// <summary>A profile of another shape with the same height and depth and, where it needs them, plausible thicknesses.</summary>
    public static Profile Like(Profile profile, Type shape)
    {
        var (height, depth) = (profile.Height, profile.Depth);
        var plate = PlateOf(profile);
        if (shape == typeof(GivenProperties))
        {
            var section = SectionProperties.Of(profile);
            return new GivenProperties
            {
                Height = height,
                Depth = depth,
                Area = section.Area,
                Inertia = section.Inertia,
                Modulus = section.Modulus,
                PlasticModulus = section.PlasticModulus,
                ShearArea = section.ShearArea,
            };
        }

        return shape == typeof(Rectangle) ? new Rectangle { Height = height, Depth = depth }
            : shape == typeof(RectangularTube) ? new RectangularTube { Height = height, Depth = depth, Wall = plate }
            : shape == typeof(ISection) ? new ISection { Height = height, Depth = depth, Flange = plate, Web = plate }
            : new HollowRectangle { Height = height, Depth = depth, Face = plate, Web = plate };
    }

    private static double PlateOf(Profile profile) => profile switch
    {
        HollowRectangle hollow => hollow.Face,
        RectangularTube tube => tube.Wall,
        ISection section => section.Flange,
        _ => Plate,
    };
}
