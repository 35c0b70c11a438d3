using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Posts;

/// <summary>What a post feels and how far that goes towards what it may carry.</summary>
/// <param name="BaseShear">V, design shear at the base [N], normal to the face.</param>
/// <param name="BaseMoment">M, design moment at the base [N·m].</param>
/// <param name="TipDeflection">δ, unfactored deflection of the tip [m]; with a raker, the greatest along the post.</param>
/// <param name="Bending">Utilisation in bending [-]; 0 when the stress is missing, see <see cref="Member.IsComplete"/>.</param>
/// <param name="ShearUse">Utilisation in shear [-]; 0 when the stress is missing.</param>
/// <param name="DeflectionUse">Utilisation of the deflection limit [-]; 0 when deflection is not judged.</param>
/// <param name="Prop">What a raker takes and leaves; null where there is none.</param>
public readonly record struct PostResponse(
    double BaseShear,
    double BaseMoment,
    double TipDeflection,
    double Bending,
    double ShearUse,
    double DeflectionUse,
    PropResponse? Prop = null)
{
    /// <summary>M, greatest design moment in the post [N·m]: at the base of a cantilever.</summary>
    public double PeakMoment => Prop?.PeakMoment ?? BaseMoment;

    /// <summary>V, greatest design shear force in the post [N]: at the base of a cantilever.</summary>
    public double PeakShear => Prop?.PeakShear ?? BaseShear;

    /// <summary>Design uplift on the base along the post [N], negative where it is pressed down; 0 without a raker.</summary>
    public double Uplift => Prop?.Uplift ?? 0;
}

/// <summary>
/// A post fixed at its base and free at its top, loaded by the pressure diagram over a tributary width and by a force.
/// </summary>
public static class Cantilever
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Beam statics, cantilever under the pressure diagram";

    /// <summary>The response of a post.</summary>
    /// <param name="diagram">Pressure normal to the face over height z.</param>
    /// <param name="post">The post.</param>
    /// <param name="tributary">b_t, width of face that loads the post [m], > 0.</param>
    /// <param name="length">ℓ, length of the post along the face [m], > 0.</param>
    /// <param name="cosRake">cos θ, so that a point at slope distance s stands at z = s·cos θ [-].</param>
    /// <param name="force">F, a force on the post [N], normal to the face at its height.</param>
    /// <param name="judgesDeflection">False where the deflection is reported and not judged.</param>
    /// <remarks>
    /// q(s) = p(z)·b_t. V = ∫q ds + F, M = ∫q·s ds + F·s_F, δ = (∫q·s²·(3ℓ − s) ds + F·s_F²·(3ℓ − s_F))/(6·E·I), each
    /// exact for the straight pieces of the diagram. Source: beam statics (unit-load theorem). Limits: fixed base, bending deformation only.
    /// </remarks>
    public static PostResponse Respond(
        PressureDiagram diagram,
        Member post,
        double tributary,
        double length,
        double cosRake,
        ConcentratedForce force = default,
        bool judgesDeflection = true)
    {
        var (shear, moment, deflection) = (0.0, 0.0, 0.0);
        var toSlope = 1 / cosRake;
        foreach (ref readonly var piece in diagram.Pieces)
        {
            shear += piece.Factor * piece.Force;
            moment += piece.Factor * piece.FirstMoment;
            deflection += TipIntegral(piece, length, toSlope);
        }

        var arm = force.Height * toSlope;
        shear = shear * tributary * toSlope + force.Design;
        moment = moment * tributary * toSlope * toSlope + force.Design * arm;
        deflection = (deflection * tributary + TipTerm(force, length, toSlope)) / (6 * post.Stiffness);
        return new(
            shear,
            moment,
            deflection,
            moment / post.MomentResistance,
            shear / post.ShearResistance,
            judgesDeflection ? deflection / (length / post.DeflectionLimit) : 0);
    }

    /// <summary>K = F·s_F²·(3ℓ − s_F) of a force [N·m³], s_F = z_F/cos θ.</summary>
    /// <param name="force">The force.</param>
    /// <param name="length">ℓ, length of the post [m].</param>
    /// <param name="toSlope">1/cos θ [-].</param>
    internal static double TipTerm(ConcentratedForce force, double length, double toSlope)
    {
        var arm = force.Height * toSlope;
        return force.Characteristic * arm * arm * (3 * length - arm);
    }

    /// <summary>J = ∫p·s²·(3ℓ − s) ds over one piece [N·m²], s = z/cos θ.</summary>
    /// <param name="piece">The piece.</param>
    /// <param name="length">ℓ, length of the post [m].</param>
    /// <param name="toSlope">1/cos θ [-].</param>
    internal static double TipIntegral(in PressurePiece piece, double length, double toSlope)
    {
        var cubed = toSlope * toSlope * toSlope;
        return cubed * (3 * length * piece.SecondMoment - toSlope * piece.ThirdMoment);
    }
}
