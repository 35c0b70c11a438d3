namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of a base plate with their limits.</summary>
public static class BasePlateFields
{
    /// <summary>BasePlateInput.Length.</summary>
    public static Field Length { get; } = new("length", "Plate length N", Dimension.SectionLength, 0, 2, "In the direction of the water; the post stands in the middle.", true);

    /// <summary>BasePlateInput.Width.</summary>
    public static Field Width { get; } = new("width", "Plate width B", Dimension.SectionLength, 0, 2, "Across the opening.", true);

    /// <summary>BasePlateInput.Thickness.</summary>
    public static Field Thickness { get; } = new("thickness", "Plate thickness", Dimension.SectionLength, 0, 0.2, "Of the base plate.", true);

    /// <summary>BasePlateInput.RodDistance.</summary>
    public static Field RodDistance { get; } = new("rodDistance", "Rods from the middle", Dimension.SectionLength, 0, 1, "Distance f of each row of rods, wet side and dry side.", true);

    /// <summary>BasePlateInput.RodsPerRow.</summary>
    public static Field RodsPerRow { get; } = new("rodsPerRow", "Rods in a row", Dimension.Count, 1, 20, "The same on both sides of the post.");

    /// <summary>BasePlateInput.ConcreteStrength.</summary>
    public static Field ConcreteStrength { get; } = new("concreteStrength", "Concrete strength", Dimension.Stress, 5e6, 100e6, "Cylinder strength, f′c or f_ck.");

    /// <summary>BasePlateInput.AreaRatio.</summary>
    public static Field AreaRatio { get; } = new("areaRatio", "Area ratio A2/A1", Dimension.Ratio, 1, 9, "Concrete that spreads the bearing, over the area of the plate; 1 for a plate as large as its base.");

    /// <summary>BasePlateInput.GroutThickness.</summary>
    public static Field GroutThickness { get; } = new("groutThickness", "Grout thickness", Dimension.SectionLength, 0, 0.2, "Between plate and concrete; as strong as the concrete.");

    /// <summary>BasePlateInput.WeldLeg.</summary>
    public static Field WeldLeg { get; } = new("weldLeg", "Weld leg", Dimension.SectionLength, 0, 0.05, "Fillet all round the post; the throat is 0.707 of it.", true);

    /// <summary>BasePlateInput.WeldStrength.</summary>
    public static Field WeldStrength { get; } = new("weldStrength", "Weld metal strength", Dimension.Stress, 0, 1e9, "Of the electrode or filler.", true);
}
