using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Properties of a cross-section for bending in the direction of the water.</summary>
/// <param name="Height">b, size along the stack (log) or across the opening (post) [m].</param>
/// <param name="Depth">d, size in the direction of the water [m].</param>
/// <param name="Area">A, area [m²].</param>
/// <param name="Inertia">I, second moment of area [m⁴].</param>
/// <param name="Modulus">W, elastic section modulus [m³].</param>
/// <param name="PlasticModulus">W_pl, plastic section modulus [m³].</param>
/// <param name="ShearArea">A_v, shear force over A_v is the shear stress to be checked [m²].</param>
public readonly record struct SectionProperties(
    double Height, double Depth, double Area, double Inertia, double Modulus, double PlasticModulus, double ShearArea)
{
    /// <summary>m = A·ρ, mass per length without fittings [kg/m].</summary>
    /// <param name="density">ρ [kg/m³], > 0.</param>
    public double MassPerLength(double density) => Area * density;

    /// <summary>The properties of a profile.</summary>
    /// <param name="profile">A profile without problems, see <see cref="Validation"/>.</param>
    /// <remarks>
    /// Source: statics of plane areas. Shear: the peak of the parabola, 1.5·V/A, for a solid rectangle; V over the
    /// webs between the faces or flanges for all other shapes, of a tube over the straight inside of its webs (AISC 360, G4:
    /// depth less two walls and two inner radii). Corners are sharp, but those of a tube with radii.
    /// </remarks>
    public static SectionProperties Of(Profile profile) => profile switch
    {
        Rectangle => Hollowed(profile, 0, 0) with { ShearArea = profile.Height * profile.Depth / 1.5 },
        HollowRectangle hollow => Hollowed(profile, hollow.Height - hollow.Webs * hollow.Web, hollow.Depth - 2 * hollow.Face),
        RectangularTube tube => Tube(tube),
        ISection section => Hollowed(profile, section.Height - section.Web, section.Depth - 2 * section.Flange),
        GivenProperties given => new(
            given.Height, given.Depth, given.Area, given.Inertia, given.Modulus, given.PlasticModulus, given.ShearArea),
        _ => throw new ArgumentOutOfRangeException(nameof(profile), profile, "is not a known shape"),
    };

    /// <summary>A tube with sharp corners, less what the outer radii take away and more by what the inner ones leave.</summary>
    private static SectionProperties Tube(RectangularTube tube)
    {
        var (clear, depth) = (tube.Depth - 2 * tube.Wall, tube.Depth);
        var sharp = Hollowed(tube, tube.Height - 2 * tube.Wall, clear);
        var (outer, inner) = (CornerFillet.Of(tube.OuterCorner, depth / 2), CornerFillet.Of(tube.InnerCorner, clear / 2));
        var inertia = sharp.Inertia - 4 * (outer.Inertia - inner.Inertia);
        return sharp with
        {
            Area = sharp.Area - 4 * (outer.Area - inner.Area),
            Inertia = inertia,
            Modulus = 2 * inertia / depth,
            PlasticModulus = sharp.PlasticModulus - 4 * (outer.FirstMoment - inner.FirstMoment),
            ShearArea = 2 * tube.Wall * (clear - 2 * tube.InnerCorner),
        };
    }

    /// <summary>A rectangle b·d less a void of the given size, symmetrical about mid-depth.</summary>
    private static SectionProperties Hollowed(Profile profile, double voidHeight, double voidDepth)
    {
        var (b, d) = (profile.Height, profile.Depth);
        var inertia = (b * d * d * d - voidHeight * voidDepth * voidDepth * voidDepth) / 12;
        return new(
            b,
            d,
            Area: b * d - voidHeight * voidDepth,
            Inertia: inertia,
            Modulus: 2 * inertia / d,
            PlasticModulus: (b * d * d - voidHeight * voidDepth * voidDepth) / 4,
            ShearArea: (b - voidHeight) * voidDepth);
    }
}
