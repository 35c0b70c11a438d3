using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>
/// What holds a slice of guide in balance, in proportion to the load on it: fasteners in tension and shear, and the wall under
/// the bearing strip.
/// </summary>
/// <param name="Tension">Tension of the fasteners over the load [-].</param>
/// <param name="TensionFormula">As written, of a and z; empty where there is none.</param>
/// <param name="Shear">Shear of the fasteners over the load [-].</param>
/// <param name="Bearing">Compression on the wall over the load [-].</param>
/// <param name="BearingFormula">As written, of a and z; empty where the whole load bears.</param>
/// <remarks>
/// <para>Plan of a slice on a face of the wall; F fasteners, S middle of the bearing strip, n load (▼ towards the wall, ▲ off it):</para>
/// <code>
///  wet face           n▼                dry face                    n▲
///      F━━━━━━━━━━S━━━━┛                    S━━━━━━━━F━━━━━━━━━━━━━━━━┛
///  ════T▼═════════C▲══╗ arris           ════C▲═══════T▼═══╗ arris
///      |--- z ----|                         |-- z ---|------ a -------|
///      |------ a ------|
/// </code>
/// <para>
/// In a reveal the load runs along the surface, at a from it, in the direction of the water: shear at F, and the couple n·a
/// presses S, at z from F in that direction, and pulls F.
/// </para>
/// <para>
/// Wet face: about the strip T·z = n·(a − z), C = n + T; while a ≤ z nothing tips, the wall takes n beneath the load and the
/// fasteners only hold the guide in its place. Dry face: about the strip T·z = n·(a + z), C = T − n. Reveal: the fasteners take
/// n in shear, and the couple n·a by T·z = n·a with C = T.
/// </para>
/// <para>Source: statics (forces and moments of the slice in balance). Limits: one line of fasteners; the guide stays straight across.</para>
/// </remarks>
public readonly record struct GuideStatics(double Tension, string TensionFormula, double Shear, double Bearing, string BearingFormula)
{
    /// <summary>Source of the statics, as printed.</summary>
    public const string Source = "Statics of the guide on its wall";

    /// <summary>The balance of a slice.</summary>
    /// <param name="mounting">Where the guide is fixed.</param>
    /// <param name="load">a, from the fasteners (in a reveal: from its surface) to the load [m], > 0.</param>
    /// <param name="bearing">z, from the fasteners to the middle of the bearing strip [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    public static GuideStatics Of(GuideMounting mounting, double load, double bearing)
    {
        Guard.Positive(load);
        Guard.Positive(bearing);

        return mounting switch
        {
            GuideMounting.WetFace when load <= bearing => new(0, "", 0, 1, ""),
            GuideMounting.WetFace => new((load - bearing) / bearing, "(a − z)/z", 0, load / bearing, "a/z"),
            GuideMounting.DryFace => new((load + bearing) / bearing, "(a + z)/z", 0, load / bearing, "a/z"),
            GuideMounting.Reveal => new(load / bearing, "a/z", 1, load / bearing, "a/z"),
            _ => throw new ArgumentOutOfRangeException(nameof(mounting), mounting, "is not a known mounting"),
        };
    }

    /// <summary>The balance of the guides of a barrier.</summary>
    /// <param name="guides">The guides.</param>
    public static GuideStatics Of(GuideSet guides) => Of(guides.Mounting, guides.LoadOffset, guides.BearingDistance);
}
