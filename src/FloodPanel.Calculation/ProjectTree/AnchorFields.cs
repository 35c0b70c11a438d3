namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of anchors with their limits.</summary>
public static class AnchorFields
{
    /// <summary>AnchorInput.Diameter.</summary>
    public static Field Diameter { get; } = new("diameter", "Anchor diameter", Dimension.SectionLength, 0, 0.1, "Nominal.", true);

    /// <summary>AnchorInput.StressArea.</summary>
    public static Field StressArea { get; } = new("stressArea", "Stress area", Dimension.SectionArea, 0, 0.01, "Of the thread, in tension and in shear.", true);

    /// <summary>AnchorInput.Yield.</summary>
    public static Field Yield { get; } = new("yield", "Anchor yield strength", Dimension.Stress, 0, 2e9, "Characteristic.", true);

    /// <summary>AnchorInput.Ultimate.</summary>
    public static Field Ultimate { get; } = new("ultimate", "Anchor ultimate strength", Dimension.Stress, 0, 2e9, "Characteristic.", true);

    /// <summary>AnchorInput.Depth.</summary>
    public static Field Depth { get; } = new("depth", "Effective depth", Dimension.SectionLength, 0.025, 1.5, "h_ef, in the concrete.");

    /// <summary>AnchorInput.HeadArea.</summary>
    public static Field HeadArea { get; } = new("headArea", "Bearing area of the head", Dimension.SectionArea, 0, 0.05, "Less the shaft.", true);

    /// <summary>AnchorInput.HookLength.</summary>
    public static Field HookLength { get; } = new("hookLength", "Hook length", Dimension.SectionLength, 0, 0.5, "From the face of the shaft; 3 to 4.5 diameters count.", true);

    /// <summary>AnchorInput.Pullout.</summary>
    public static Field Pullout { get; } = new("pullout", "Pull-out strength", Dimension.Force, 0, 2e6, "Characteristic, of one anchor, from its approval.", true);

    /// <summary>AnchorInput.CriticalEdge.</summary>
    public static Field CriticalEdge { get; } = new("criticalEdge", "Critical edge distance", Dimension.SectionLength, 0, 5, "For splitting, from the approval: c_ac or c_cr,sp; counts where the concrete does not crack.", true);

    /// <summary>AnchorInput.Category.</summary>
    public static Field Category { get; } = new("category", "Anchor category", Dimension.Count, 1, 3, "ACI 355.2, from the approval.");

    /// <summary>AnchorInput.InstallationFactor.</summary>
    public static Field InstallationFactor { get; } = new("installationFactor", "Installation factor", Dimension.Ratio, 1, 1.4, "γ_inst, from the approval.");

    /// <summary>AnchorInput.Spacing.</summary>
    public static Field Spacing { get; } = new("spacing", "Spacing in a row", Dimension.SectionLength, 0, 5, "Between the anchors of a row.", true);

    /// <summary>AnchorInput.EdgeFlood.</summary>
    public static Field EdgeFlood { get; } = new("edgeFlood", "Edge on the flood side", Dimension.SectionLength, 0, 100, "From the row there; empty means far away.", true);

    /// <summary>AnchorInput.EdgeProtected.</summary>
    public static Field EdgeProtected { get; } = new("edgeProtected", "Edge on the protected side", Dimension.SectionLength, 0, 100, "From the row there, towards which the shear pushes; empty means far away.", true);

    /// <summary>AnchorInput.EdgeLeft.</summary>
    public static Field EdgeLeft { get; } = new("edgeLeft", "Edge on the left", Dimension.SectionLength, 0, 100, "From the outer anchors; empty means far away.", true);

    /// <summary>AnchorInput.EdgeRight.</summary>
    public static Field EdgeRight { get; } = new("edgeRight", "Edge on the right", Dimension.SectionLength, 0, 100, "From the outer anchors; empty means far away.", true);

    /// <summary>AnchorInput.MemberThickness.</summary>
    public static Field MemberThickness { get; } = new("memberThickness", "Concrete thickness", Dimension.SectionLength, 0, 20, "Of the slab or beam that holds the anchors.", true);

    /// <summary>AnchorInput.WasherThickness.</summary>
    public static Field WasherThickness { get; } = new("washerThickness", "Welded washer", Dimension.SectionLength, 0, 0.1, "Thickness; with it the rods are checked in bending.", true);

    /// <summary>AnchorInput.TensionResistance.</summary>
    public static Field TensionResistance { get; } = new("tensionResistance", "Tension resistance", Dimension.Force, 0, 2e6, "Design value of one anchor in this group, for the design basis of the project.", true);

    /// <summary>AnchorInput.ShearResistance.</summary>
    public static Field ShearResistance { get; } = new("shearResistance", "Shear resistance", Dimension.Force, 0, 2e6, "Design value of one anchor in this group, for the design basis of the project.", true);

    /// <summary>AnchorInput.InteractionLimit.</summary>
    public static Field InteractionLimit { get; } = new("interactionLimit", "Interaction limit", Dimension.Ratio, 1, 1.2, "Greatest sum of both utilisations.");

    /// <summary>AnchorInput.MinimumEdge.</summary>
    public static Field MinimumEdge { get; } = new("minimumEdge", "Least edge distance", Dimension.SectionLength, 0, 5, "From the approval, or from cover and code.", true);

    /// <summary>AnchorInput.MinimumSpacing.</summary>
    public static Field MinimumSpacing { get; } = new("minimumSpacing", "Least spacing", Dimension.SectionLength, 0, 5, "From the approval.", true);
}
