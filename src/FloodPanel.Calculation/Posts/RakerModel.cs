using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Posts;

/// <summary>
/// A raker resolved to numbers. s runs along the post; n stands normal to it, towards the protected side. With the head at height c and the foot
/// a behind the base: L = √(c² + (a − c·tan θ)²), cos φ = a·cos θ/L between the raker and n.
/// </summary>
/// <param name="Input">As entered.</param>
/// <param name="Member">Material and section.</param>
/// <param name="Head">s_c, distance of the head from the base along the post [m].</param>
/// <param name="Length">L [m].</param>
/// <param name="CosNormal">cos φ [-].</param>
/// <param name="LiftRatio">Tension in the post below the head for each newton of R, the force normal to the post [-].</param>
/// <param name="ThrustRatio">Horizontal force on the foot for each newton along the raker [-].</param>
public sealed record RakerModel(
    RakerInput Input, Member Member, double Head, double Length, double CosNormal, double LiftRatio, double ThrustRatio)
{
    /// <summary>Axial stiffness E·A/L [N/m].</summary>
    public double AxialStiffness => Member.Material.ElasticModulus * Member.Section.Area / Length;

    /// <summary>k = E·A/L·cos²φ, stiffness against the post moving along n [N/m].</summary>
    public double Stiffness => AxialStiffness * CosNormal * CosNormal;

    /// <summary>How far the post may move along n before the raker bears [m].</summary>
    public double Play => Input.Play / CosNormal;

    /// <summary>The smaller second moment of area of the section [m⁴].</summary>
    public double LeastInertia => Math.Min(Member.Section.Inertia, CrossAxis.Inertia(Member.Profile));

    /// <summary>The raker of a set of posts.</summary>
    /// <param name="raker">As entered, without problems.</param>
    /// <param name="rake">θ of the face [rad].</param>
    /// <param name="basis">The design basis.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public static RakerModel Of(RakerInput raker, double rake, DesignBasis basis, Library library)
    {
        var (cos, sin) = (Math.Cos(rake), Math.Sin(rake));
        var across = raker.FootDistance - raker.HeadHeight * Math.Tan(rake);
        var length = Math.Sqrt(across * across + raker.HeadHeight * raker.HeadHeight);
        var cosNormal = raker.FootDistance * cos / length;
        var alongPost = (raker.HeadHeight / cos - raker.FootDistance * sin) / length;
        return new(
            raker,
            Member.Of(raker.Material, raker.Profile, 1, basis, library),
            raker.HeadHeight / cos,
            length,
            cosNormal,
            alongPost / cosNormal,
            across / length);
    }
}
