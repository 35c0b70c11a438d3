namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Where a guide is fixed.</summary>
public enum GuideMounting
{
    /// <summary>On the face of the wall towards the water, which presses the guide on.</summary>
    WetFace,

    /// <summary>On the face of the wall away from the water, which pulls the guide off.</summary>
    DryFace,

    /// <summary>In the reveal: the water pushes the guide along the surface it is fixed to.</summary>
    Reveal,
}

/// <summary>
/// The guides at both ends, alike. Distances are measured in a plan section of the guide, across its length; load, fasteners
/// and bearing strip are lines along it.
/// </summary>
public sealed record GuideSet
{
    /// <summary>Where the guides are fixed.</summary>
    public GuideMounting Mounting { get; init; } = GuideMounting.Reveal;

    /// <summary>What the guides are made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>t, thickness of the lip that the logs press on [m], > 0.</summary>
    public double LipThickness { get; init; } = 0.008;

    /// <summary>l, from the middle of the logs' bearing to the root of the lip [m], ≥ 0; nothing where the lip lies on the wall.</summary>
    public double LipLever { get; init; } = 0.03;

    /// <summary>t_b, thickness of the part that is fixed to the wall [m], > 0.</summary>
    public double BaseThickness { get; init; } = 0.008;

    /// <summary>a, from the fasteners to the load, on a face; from the reveal's surface to the load, in a reveal [m], > 0.</summary>
    public double LoadOffset { get; init; } = 0.03;

    /// <summary>
    /// z, from the fasteners to the middle of the strip that bears on the wall [m], > 0: towards the arris on a wet face, away from the
    /// opening on a dry face, in the direction of the load in a reveal.
    /// </summary>
    public double BearingDistance { get; init; } = 0.04;

    /// <summary>c, width of the strip that bears on the wall [m], > 0.</summary>
    public double BearingWidth { get; init; } = 0.02;

    /// <summary>p_R, pressure that the wall may take under the guide: allowable, or design resistance under a strength basis [Pa], > 0, or null.</summary>
    public double? WallBearing { get; init; }

    /// <summary>Where <see cref="WallBearing"/> comes from.</summary>
    public string WallBearingSource { get; init; } = "";

    /// <summary>What fixes the guides to the wall.</summary>
    public GuideFasteners Fasteners { get; init; } = new();
}

/// <summary>One line of fasteners along a guide, with the values of their approval.</summary>
public sealed record GuideFasteners
{
    /// <summary>p, greatest distance between fasteners along the guide [m], > 0; they are spaced evenly.</summary>
    public double Pitch { get; init; } = 0.25;

    /// <summary>e_1, from each end of the guide to the nearest fastener [m], > 0.</summary>
    public double EndDistance { get; init; } = 0.1;

    /// <summary>c_1, from the fasteners to the arris of the wall: at the opening on a face, on the dry side in a reveal [m], > 0.</summary>
    public double EdgeDistance { get; init; } = 0.1;

    /// <summary>d_0, hole in the guide for a fastener [m], > 0.</summary>
    public double HoleDiameter { get; init; } = 0.012;

    /// <summary>The design basis that the values below belong to.</summary>
    public DesignBasisKind ValuesFor { get; init; }

    /// <summary>N_R, tension that one fastener may take near the arris: allowable load, design strength or design resistance [N], > 0, or null.</summary>
    public double? Tension { get; init; }

    /// <summary>V_R, shear towards the arris that one fastener may take: allowable load, design strength or design resistance [N], > 0, or null.</summary>
    public double? Shear { get; init; }

    /// <summary>c_min, least edge distance for which the values hold [m], > 0, or null.</summary>
    public double? MinimumEdge { get; init; }

    /// <summary>s_min, least spacing for which the values hold [m], > 0, or null.</summary>
    public double? MinimumSpacing { get; init; }

    /// <summary>Sum of the utilisations in tension and shear that the approval allows [-], 1 to 1.2.</summary>
    public double InteractionLimit { get; init; } = 1;

    /// <summary>The approval or test that the values come from.</summary>
    public string Source { get; init; } = "";
}
