using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>What two rows of anchors must take, at the level of the design basis.</summary>
/// <param name="Tension">T, of all anchors in the row that pulls more [N], ≥ 0.</param>
/// <param name="OtherTension">T_2, of all anchors in the other row [N], ≥ 0 and not above T.</param>
/// <param name="Shear">V, of the whole plate [N], ≥ 0.</param>
/// <param name="PullsProtectedRow">True where the row on the protected side pulls more.</param>
/// <param name="PushesBack">True where the shear points at the flood side.</param>
public readonly record struct AnchorDemand(
    double Tension, double OtherTension, double Shear, bool PullsProtectedRow = false, bool PushesBack = false);

/// <summary>Any rows of anchors against what they must take: base plates use it, and whatever else is held by anchors may.</summary>
public static class AnchorResistance
{
    /// <summary>From service loads to strength level, where ACI 318 meets allowable stress design (common practice in product evaluations) [-].</summary>
    public const double ServiceToStrength = 1.6;

    /// <summary>The checks of a group, without asking whether its method covers it: see the gaps of the report.</summary>
    /// <param name="anchors">The anchors, without problems.</param>
    /// <param name="plate">What they hold: rows, concrete, grout and thickness.</param>
    /// <param name="demand">What they must take.</param>
    /// <param name="basis">The design basis of the demand.</param>
    /// <returns>A check for each mode that applies.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A demand is negative or not finite, or the method is unknown.</exception>
    /// <remarks>
    /// ACI 318-19, chapter 17, at strength level: under allowable stress the demand is raised by <see cref="ServiceToStrength"/>. EN 1992-4. Or the
    /// values of an approval, which belong to the design basis.
    /// </remarks>
    public static IReadOnlyList<Check> Checks(AnchorInput anchors, BasePlateInput plate, AnchorDemand demand, DesignBasisKind basis)
    {
        Guard.NonNegative(demand.Tension);
        Guard.InRange(demand.OtherTension, 0, demand.Tension);
        Guard.NonNegative(demand.Shear);

        var scale = anchors.Method == AnchorMethod.Aci318 && basis == DesignBasisKind.AllowableStress ? ServiceToStrength : 1;
        var group = new AnchorCase(anchors, plate, demand, scale);
        return anchors.Method switch
        {
            AnchorMethod.Approval => [.. ApprovalChecks.Of(group), .. DistanceChecks.Of(group)],
            AnchorMethod.Aci318 => [.. AciChecks.Of(group), .. DistanceChecks.Of(group)],
            AnchorMethod.En1992 => [.. EurocodeChecks.Of(group), .. DistanceChecks.Of(group)],
            _ => throw new ArgumentOutOfRangeException(nameof(anchors), anchors.Method, "is not a method"),
        };
    }
}
