namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of joints, timber and composites with their limits.</summary>
public static class LogServiceFields
{
    /// <summary>LogJoint.Travel.</summary>
    public static Field Travel { get; } = new("travel", "Joint travel", Dimension.SectionLength, 0, 0.1,
        "How far neighbouring logs may bend apart before tongue or seal opens.", true);

    /// <summary>LogJoint.SealCompression.</summary>
    public static Field SealCompression { get; } = new("sealCompression", "End seal compression", Dimension.SectionLength, 0, 0.05,
        "Of the seal at each end of a log; empty leaves its check out.", true);

    /// <summary>TimberService.SizeFactor.</summary>
    public static Field SizeFactor { get; } = new("sizeFactor", "Size factor C_F", Dimension.Ratio, 0.5, 1.5,
        "On NDS reference bending values, from the table of the species.");

    /// <summary>CompositeService.MaterialFactor.</summary>
    public static Field MaterialFactor { get; } = new("materialFactor", "Material factor", Dimension.Ratio, 1, 10,
        "γ_M of the design standard chosen; the safety factor under allowable stress.");

    /// <summary>CompositeService.ConversionFactor.</summary>
    public static Field ConversionFactor { get; } = new("conversionFactor", "Conversion factor", Dimension.Ratio, 0, 1,
        "η_c for moisture, temperature and duration.", true);
}
