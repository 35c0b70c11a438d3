namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of covers, with their limits.</summary>
public static class CoverFields
{
    /// <summary>RectangleCover.Width.</summary>
    public static Field Width { get; } = Side("width", "Width", "Between the lines on which the plate is held.");

    /// <summary>RectangleCover.Height.</summary>
    public static Field Height { get; } = Side("height", "Height", "Between the lines on which the plate is held; the length of a plate that lies flat.");

    /// <summary>CircleCover.Diameter.</summary>
    public static Field Diameter { get; } = Side("diameter", "Diameter", "Of the line on which the plate is held.");

    /// <summary>Cover.Level.</summary>
    public static Field Level { get; } = new("level", "Level", Dimension.Length, -9000, 9000,
        "Of the lower edge; of the middle of a circle; of a plate that lies flat.");

    /// <summary>Cover.Thickness.</summary>
    public static Field Thickness { get; } = Size("thickness", "Thickness", 0.2, "Of the plate.");

    /// <summary>Cover.PoissonRatio.</summary>
    public static Field PoissonRatio { get; } = new("poissonRatio", "Poisson's ratio", Dimension.Ratio, 0, 0.49,
        "0.3 for steel and aluminium in EN 1993 and EN 1999; 0.33 for aluminium in US practice.");

    /// <summary>Cover.DeflectionLimit.</summary>
    public static Field DeflectionLimit { get; } = new("deflectionLimit", "Deflection limit, span /", Dimension.Count, 20, 2000,
        "Span is the shorter side, the free edge, or the diameter. What the gasket bears decides; common practice is 200 or more.");

    /// <summary>CoverFasteners.Pitch.</summary>
    public static Field Pitch { get; } = Size("pitch", "Fastener pitch", 3, "Greatest distance along the rim; fasteners are spaced evenly.");

    /// <summary>CoverFasteners.GasketLoad.</summary>
    public static Field GasketLoad { get; } = new("gasketLoad", "Gasket line load", Dimension.LineForce, 0, 1e6,
        "By which the pressed gasket pushes the plate away; its maker's figure.");

    /// <summary>CoverFasteners.FixingLever.</summary>
    public static Field FixingLever { get; } = Size("fixingLever", "Fixing lever", 1,
        "From the fasteners to the line on which the clamped rim bears: its outer edge where water pulls the plate off, its inner edge where water presses it on.");

    /// <summary>CoverFasteners.Tension.</summary>
    public static Field Tension { get; } = new("tension", "Tension per fastener", Dimension.Force, 0, 1e6,
        "That one fastener may take at its edge distance and spacing, in terms of the design basis.", true);

    private static Field Side(string key, string label, string help) => new(key, label, Dimension.Length, 0, 20, help, true);

    private static Field Size(string key, string label, double most, string help) =>
        new(key, label, Dimension.SectionLength, 0, most, help, true);
}
