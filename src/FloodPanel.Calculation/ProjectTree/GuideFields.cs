namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of guides and their fasteners, with their limits.</summary>
public static class GuideFields
{
    /// <summary>GuideSet.LipThickness.</summary>
    public static Field LipThickness { get; } = Size("lipThickness", "Lip thickness", 0.1, "Of the leg that the logs press on.");

    /// <summary>GuideSet.LipLever.</summary>
    public static Field LipLever { get; } = new("lipLever", "Lip lever", Dimension.SectionLength, 0, 0.5,
        "From the middle of the logs' bearing to the root of the lip; nothing where the lip lies on the wall.");

    /// <summary>GuideSet.BaseThickness.</summary>
    public static Field BaseThickness { get; } = Size("baseThickness", "Base thickness", 0.1, "Of the part that is fixed to the wall.");

    /// <summary>GuideSet.LoadOffset.</summary>
    public static Field LoadOffset { get; } = Size("loadOffset", "Load offset", 1,
        "From the fasteners to the middle of the logs' bearing; in a reveal, from its surface.");

    /// <summary>GuideSet.BearingDistance.</summary>
    public static Field BearingDistance { get; } = Size("bearingDistance", "Bearing distance", 1,
        "From the fasteners to the middle of the strip that bears on the wall.");

    /// <summary>GuideSet.BearingWidth.</summary>
    public static Field BearingWidth { get; } = Size("bearingWidth", "Bearing width", 1, "Of the strip that bears on the wall.");

    /// <summary>GuideSet.WallBearing.</summary>
    public static Field WallBearing { get; } = new("wallBearing", "Wall bearing", Dimension.Stress, 0, 1e9,
        "Pressure that the wall may take under the guide, in terms of the design basis.", true);

    /// <summary>GuideFasteners.Pitch.</summary>
    public static Field Pitch { get; } = Size("pitch", "Fastener pitch", 3, "Greatest distance along the guide; fasteners are spaced evenly.");

    /// <summary>GuideFasteners.EndDistance.</summary>
    public static Field EndDistance { get; } = Size("endDistance", "End distance", 3, "From each end of the guide to the nearest fastener.");

    /// <summary>GuideFasteners.EdgeDistance.</summary>
    public static Field EdgeDistance { get; } = Size("edgeDistance", "Edge distance", 3,
        "From the fasteners to the arris: at the opening on a face, on the dry side in a reveal.");

    /// <summary>GuideFasteners.HoleDiameter.</summary>
    public static Field HoleDiameter { get; } = Size("holeDiameter", "Hole diameter", 0.1, "In the guide, for a fastener.");

    /// <summary>GuideFasteners.Tension.</summary>
    public static Field Tension { get; } = new("tension", "Tension per fastener", Dimension.Force, 0, 1e6,
        "That one fastener may take at its edge distance and spacing.", true);

    /// <summary>GuideFasteners.Shear.</summary>
    public static Field Shear { get; } = new("shear", "Shear per fastener", Dimension.Force, 0, 1e6,
        "Towards the arris, that one fastener may take.", true);

    /// <summary>GuideFasteners.MinimumEdge.</summary>
    public static Field MinimumEdge { get; } = Size("minimumEdge", "Least edge distance", 3, "For which the values hold.");

    /// <summary>GuideFasteners.MinimumSpacing.</summary>
    public static Field MinimumSpacing { get; } = Size("minimumSpacing", "Least spacing", 3, "For which the values hold.");

    /// <summary>GuideFasteners.InteractionLimit.</summary>
    public static Field InteractionLimit { get; } = new("interactionLimit", "Sum of utilisations", Dimension.Ratio, 1, 1.2,
        "Tension and shear together: what the approval allows, 1 where it says nothing.");

    private static Field Size(string key, string label, double most, string help) =>
        new(key, label, Dimension.SectionLength, 0, most, help, true);
}
