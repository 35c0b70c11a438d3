using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>The flat parts of a thin-walled profile: two faces across the load, webs along it. Sharp corners, so that clear widths are on the safe side.</summary>
/// <param name="FacePart">b_f, clear width of one part of the compressed face [m]: between two webs, or of an outstand.</param>
/// <param name="FaceThickness">t_f [m].</param>
/// <param name="FaceParts">Number of such parts of one face [-].</param>
/// <param name="IsOutstand">True when a part of the face is held at one edge only.</param>
/// <param name="WebDepth">h_w, clear depth between the faces [m].</param>
/// <param name="WebThickness">t_w [m].</param>
/// <param name="Webs">Number of webs [-].</param>
public sealed record ThinWalls(
    double FacePart, double FaceThickness, int FaceParts, bool IsOutstand, double WebDepth, double WebThickness, int Webs)
{
    /// <summary>The flat parts of a profile; null for a solid one and for one given by its properties.</summary>
    /// <param name="profile">A profile without problems.</param>
    public static ThinWalls? Of(Profile profile) => profile switch
    {
        HollowRectangle hollow => new(
            (hollow.Height - hollow.Webs * hollow.Web) / (hollow.Webs - 1), hollow.Face, hollow.Webs - 1, false,
            hollow.Depth - 2 * hollow.Face, hollow.Web, hollow.Webs),
        RectangularTube tube => new(
            tube.Height - 2 * tube.Wall, tube.Wall, 1, false, tube.Depth - 2 * tube.Wall, tube.Wall, 2),
        ISection section => new(
            (section.Height - section.Web) / 2, section.Flange, 2, true, section.Depth - 2 * section.Flange, section.Web, 1),
        _ => null,
    };

    /// <summary>b_f/t_f [-].</summary>
    public double FaceSlenderness => FacePart / FaceThickness;

    /// <summary>h_w/t_w [-].</summary>
    public double WebSlenderness => WebDepth / WebThickness;
}
