namespace FloodPanel.Calculation.ProjectTree;

/// <summary>
/// The anchors of a base plate: two equal rows, one on the flood side and one on the protected side, as far apart as the
/// plate's rods. Edge distances are those of the outer anchors; null means far away.
/// </summary>
public sealed record AnchorInput
{
    /// <summary>By which rules the anchors are judged.</summary>
    public AnchorMethod Method { get; init; }

    /// <summary>Kind of anchor.</summary>
    public AnchorKind Kind { get; init; } = AnchorKind.PostInstalled;

    /// <summary>d, diameter [m], > 0.</summary>
    public double Diameter { get; init; } = 0.016;

    /// <summary>A_s, stress area [m²], > 0.</summary>
    public double StressArea { get; init; } = 157e-6;

    /// <summary>f_y, characteristic yield strength [Pa], > 0.</summary>
    public double Yield { get; init; } = 640e6;

    /// <summary>f_u, characteristic ultimate strength [Pa], > 0.</summary>
    public double Ultimate { get; init; } = 800e6;

    /// <summary>True where the steel stretches before it breaks.</summary>
    public bool Ductile { get; init; } = true;

    /// <summary>h_ef, effective depth in the concrete [m], > 0.</summary>
    public double Depth { get; init; } = 0.125;

    /// <summary>A_h, bearing area of the head [m²], > 0; headed anchors only.</summary>
    public double? HeadArea { get; init; }

    /// <summary>e_h, length of the hook from the face of the shaft [m], > 0; hooks only.</summary>
    public double? HookLength { get; init; }

    /// <summary>N_p, characteristic pull-out strength of a post-installed anchor, from its approval [N], > 0.</summary>
    public double? Pullout { get; init; }

    /// <summary>c_ac or c_cr,sp, edge distance from which a drilled anchor does not split concrete that does not crack, from its approval [m], > 0, or null.</summary>
    public double? CriticalEdge { get; init; }

    /// <summary>Category of a post-installed anchor in ACI 355.2, 1 to 3.</summary>
    public int Category { get; init; } = 1;

    /// <summary>γ_inst of EN 1992-4, from the approval [-], at least 1.</summary>
    public double InstallationFactor { get; init; } = 1;

    /// <summary>s, distance between the anchors of a row [m], > 0.</summary>
    public double Spacing { get; init; } = 0.12;

    /// <summary>From the row on the flood side to the edge of the concrete there [m], > 0, or null.</summary>
    public double? EdgeFlood { get; init; }

    /// <summary>From the row on the protected side to the edge of the concrete there [m], > 0, or null.</summary>
    public double? EdgeProtected { get; init; }

    /// <summary>From the outer anchors to the edge on the left [m], > 0, or null.</summary>
    public double? EdgeLeft { get; init; }

    /// <summary>From the outer anchors to the edge on the right [m], > 0, or null.</summary>
    public double? EdgeRight { get; init; }

    /// <summary>h, thickness of the concrete [m], > 0.</summary>
    public double MemberThickness { get; init; } = 0.3;

    /// <summary>True where the concrete may crack, which is to be assumed unless shown otherwise.</summary>
    public bool Cracked { get; init; } = true;

    /// <summary>True where reinforcement ties the breakout body to the rest.</summary>
    public bool SupplementaryReinforcement { get; init; }

    /// <summary>True where welded washers or filled holes make all anchors share the shear; else the row on the protected side takes it.</summary>
    public bool SharedShear { get; init; }

    /// <summary>t_w, thickness of a welded washer, for the bending of the rods in thick plates [m], > 0, or null.</summary>
    public double? WasherThickness { get; init; }

    /// <summary>N_R, design resistance of one anchor to tension, from its approval [N], > 0, or null.</summary>
    public double? TensionResistance { get; init; }

    /// <summary>V_R, design resistance of one anchor to shear, from its approval [N], > 0, or null.</summary>
    public double? ShearResistance { get; init; }

    /// <summary>Greatest sum of both utilisations that the approval allows [-], 1 to 1.2.</summary>
    public double InteractionLimit { get; init; } = 1;

    /// <summary>Least edge distance of the approval [m], > 0, or null.</summary>
    public double? MinimumEdge { get; init; }

    /// <summary>Least spacing of the approval [m], > 0, or null.</summary>
    public double? MinimumSpacing { get; init; }

    /// <summary>Approval or test report of typed values; empty until known.</summary>
    public string Source { get; init; } = "";
}

/// <summary>By which rules anchors are judged.</summary>
public enum AnchorMethod
{
    /// <summary>Values typed from an approval or from tests on site: proprietary, bonded and masonry anchors.</summary>
    Approval,

    /// <summary>ACI 318-19, chapter 17.</summary>
    Aci318,

    /// <summary>EN 1992-4.</summary>
    En1992,
}

/// <summary>Kinds of anchors in concrete.</summary>
public enum AnchorKind
{
    /// <summary>Cast in, with a head.</summary>
    Headed,

    /// <summary>Cast in, with a hook.</summary>
    Hooked,

    /// <summary>Drilled: expansion or undercut.</summary>
    PostInstalled,
}
