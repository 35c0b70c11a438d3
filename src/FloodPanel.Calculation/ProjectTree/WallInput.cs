namespace FloodPanel.Calculation.ProjectTree;

/// <summary>How the wall that receives the guides is judged.</summary>
public sealed record WallInput
{
    /// <summary>By which measure.</summary>
    public WallMeasure Measure { get; init; } = WallMeasure.Resistance;

    /// <summary>n_R, resistance of the edge of the wall to a line load from a guide, on the footing of the design basis [N/m], > 0, or null.</summary>
    public double? LineResistance { get; init; }

    /// <summary>R_R, resistance of the wall to the whole reaction of one guide, on the footing of the design basis [N], > 0, or null.</summary>
    public double? TotalResistance { get; init; }

    /// <summary>Who gives the resistance, and where; empty until known.</summary>
    public string Source { get; init; } = "";
}

/// <summary>By which measure a wall is judged.</summary>
public enum WallMeasure
{
    /// <summary>Its resistance to the reactions of the guides, given by its designer.</summary>
    Resistance,

    /// <summary>The published depth of water that unreinforced masonry carries without damage.</summary>
    PublishedDepth,
}

/// <summary>The numeric inputs of a wall with their limits.</summary>
public static class WallFields
{
    /// <summary>WallInput.LineResistance.</summary>
    public static Field LineResistance { get; } = new("lineResistance", "Resistance along the edge", Dimension.LineForce, 0, 1e7,
        "To the greatest line load of a guide, from the designer of the wall.", true);

    /// <summary>WallInput.TotalResistance.</summary>
    public static Field TotalResistance { get; } = new("totalResistance", "Resistance to a guide", Dimension.Force, 0, 1e8,
        "To the whole reaction of one guide, from the designer of the wall.", true);
}
