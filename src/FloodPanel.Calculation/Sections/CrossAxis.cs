using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Properties that bending in the direction of the water does not need: the other axis, torsion, warping. Sharp corners, but those of a tube with radii.</summary>
public static class CrossAxis
{
    /// <summary>I_z, second moment of area for bending across the direction of the water.</summary>
    /// <param name="profile">A profile without problems.</param>
    /// <returns>I_z [m⁴]; for a section given by its properties the one that is given, to be entered for its weaker axis.</returns>
    /// <remarks>Source: statics of plane areas; webs of a hollow section stand at equal distances, the outer two at its edges.</remarks>
    public static double Inertia(Profile profile) => profile switch
    {
        Rectangle => profile.Depth * Cube(profile.Height) / 12,
        HollowRectangle hollow => 2 * hollow.Face * Cube(hollow.Height) / 12 + Webs(hollow),
        RectangularTube tube => SectionProperties.Of(tube with { Height = tube.Depth, Depth = tube.Height }).Inertia,
        ISection section => 2 * section.Flange * Cube(section.Height) / 12 + (section.Depth - 2 * section.Flange) * Cube(section.Web) / 12,
        GivenProperties given => given.Inertia,
        _ => throw new ArgumentOutOfRangeException(nameof(profile), profile, "is not a known shape"),
    };

    /// <summary>J, torsion constant of an I-section, (2·b·t_f³ + h_w·t_w³)/3.</summary>
    /// <param name="section">The section.</param>
    /// <returns>J [m⁴].</returns>
    /// <remarks>Source: thin open sections (Saint-Venant), fillets left out, which is safe.</remarks>
    public static double Torsion(ISection section) =>
        (2 * section.Height * Cube(section.Flange) + (section.Depth - 2 * section.Flange) * Cube(section.Web)) / 3;

    /// <summary>I_w, warping constant of an I-section, I_z·(d − t_f)²/4.</summary>
    /// <param name="section">The section.</param>
    /// <returns>I_w [m⁶].</returns>
    /// <remarks>Source: thin-walled beams, doubly symmetric I-section.</remarks>
    public static double Warping(ISection section)
    {
        var lever = section.Depth - section.Flange;
        return Inertia(section) * lever * lever / 4;
    }

    private static double Webs(HollowRectangle hollow)
    {
        var (length, count) = (hollow.Depth - 2 * hollow.Face, hollow.Webs);
        var outer = (hollow.Height - hollow.Web) / 2;
        var sum = count * length * Cube(hollow.Web) / 12;
        for (var i = 0; i < count; i++)
        {
            var distance = outer * (2.0 * i / (count - 1) - 1);
            sum += hollow.Web * length * distance * distance;
        }

        return sum;
    }

    private static double Cube(double value) => value * value * value;
}
