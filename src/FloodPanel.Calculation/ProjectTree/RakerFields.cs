namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The numeric inputs of a raker with their limits.</summary>
public static class RakerFields
{
    /// <summary>RakerInput.HeadHeight.</summary>
    public static Field HeadHeight { get; } = new("headHeight", "Height of the head", Dimension.Length, 0, 30, "Where the raker holds the post, above the sill.", true);

    /// <summary>RakerInput.FootDistance.</summary>
    public static Field FootDistance { get; } = new("footDistance", "Distance of the foot", Dimension.Length, 0, 30, "Horizontal, from the base of the post; at the level of the sill.", true);

    /// <summary>RakerInput.LengthFactor.</summary>
    public static Field LengthFactor { get; } = new("lengthFactor", "Effective length factor", Dimension.Ratio, 0.5, 2, "1 where both ends are hinged.");

    /// <summary>RakerInput.Play.</summary>
    public static Field Play { get; } = new("play", "Play", Dimension.SectionLength, 0, 0.05, "In the joints, along the raker, before it bears.");

    /// <summary>RakerInput.FootResistance.</summary>
    public static Field FootResistance { get; } = new("footResistance", "Foot anchor resistance", Dimension.Force, 0, 5e6, "Design resistance to the horizontal thrust, from the anchor's own calculation.", true);
}
