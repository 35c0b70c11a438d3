using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Posts;

/// <summary>
/// What a raker takes and what it leaves to the post: the envelope of a fixed base and of a base that turns, because no base plate is wholly
/// rigid. All at design level but the deflection.
/// </summary>
/// <param name="FixedHeadForce">R_f, force of the raker normal to the post with a fixed base [N].</param>
/// <param name="PinnedHeadForce">R_p, the same with a base that turns [N].</param>
/// <param name="Compression">N, axial force of the raker [N], the greater of both.</param>
/// <param name="Uplift">T_u, tension in the post and uplift on its base [N]; negative where the raker presses a raked post down.</param>
/// <param name="Thrust">H, horizontal force on the foot of the raker [N].</param>
/// <param name="FixedBaseMoment">M_f, base moment with a fixed base [N·m].</param>
/// <param name="CantileverShear">V_0, base shear without the raker [N].</param>
/// <param name="CantileverMoment">M_0, base moment without the raker [N·m].</param>
/// <param name="HeadDeflection">δ_0, deflection of the post at the head without the raker, design load [m].</param>
/// <param name="PeakMoment">M, greatest moment in the post [N·m].</param>
/// <param name="PeakAt">s_M, where it stands, along the post from the base [m].</param>
/// <param name="IsPeakPinned">True when it comes from the base that turns.</param>
/// <param name="PeakShear">V, greatest shear force in the post [N].</param>
public sealed record PropResponse(
    double FixedHeadForce,
    double PinnedHeadForce,
    double Compression,
    double Uplift,
    double Thrust,
    double FixedBaseMoment,
    double CantileverShear,
    double CantileverMoment,
    double HeadDeflection,
    double PeakMoment,
    double PeakAt,
    bool IsPeakPinned,
    double PeakShear)
{
    /// <summary>Source of the solution, as printed.</summary>
    public const string Source = "Propped post by direct stiffness, fixed base and base that turns";

    /// <summary>The response of a post with a raker.</summary>
    internal static PostResponse Respond(OpeningModel model, PressureDiagram diagram, int post, ConcentratedForce force, bool judgesDeflection)
    {
        var (member, raker, length) = (model.Post!, model.Raker!, model.FaceLength);
        var design = new SlopeLoad(diagram, force, model.PostTributary(post), model.CosRake, IsDesign: true);
        var atBaseFixed = ProppedPost.Solve(design, length, member.Stiffness, raker, isPinned: false);
        var atBaseTurning = ProppedPost.Solve(design, length, member.Stiffness, raker, isPinned: true);
        var prop = Of(design, length, member.Stiffness, raker, atBaseFixed, atBaseTurning);
        var unfactored = design with { IsDesign = false };
        var deflection = Math.Max(
            ProppedPost.Solve(unfactored, length, member.Stiffness, raker, isPinned: false).PeakDeflection(),
            ProppedPost.Solve(unfactored, length, member.Stiffness, raker, isPinned: true).PeakDeflection());
        var (fixedShear, turningShear) = (atBaseFixed.Shear(0), atBaseTurning.Shear(0));
        return new(
            Math.Abs(turningShear) > Math.Abs(fixedShear) ? turningShear : fixedShear,
            atBaseFixed.Moment(0),
            deflection,
            prop.PeakMoment / member.MomentResistance,
            prop.PeakShear / member.ShearResistance,
            judgesDeflection ? deflection / (length / member.DeflectionLimit) : 0,
            prop);
    }

    private static PropResponse Of(
        SlopeLoad load, double length, double stiffness, RakerModel raker, ProppedPost atBaseFixed, ProppedPost atBaseTurning)
    {
        var greatest = Math.Max(atBaseFixed.HeadForce, atBaseTurning.HeadForce);
        var (own, other) = (atBaseFixed.PeakMoment(), atBaseTurning.PeakMoment());
        var isPinned = other.Moment > own.Moment;
        var head = Math.Min(raker.Head, length);
        return new(
            atBaseFixed.HeadForce,
            atBaseTurning.HeadForce,
            greatest / raker.CosNormal,
            greatest * raker.LiftRatio,
            greatest / raker.CosNormal * raker.ThrustRatio,
            atBaseFixed.Moment(0),
            load.Between(0, double.PositiveInfinity).Zero,
            load.Between(0, double.PositiveInfinity).First,
            atBaseFixed.Deflection(head) + atBaseFixed.HeadForce * head * head * head / (3 * stiffness),
            isPinned ? other.Moment : own.Moment,
            isPinned ? other.At : own.At,
            isPinned,
            Math.Max(atBaseFixed.PeakShear(), atBaseTurning.PeakShear()));
    }
}
