namespace FloodPanel.Calculation.ProjectTree;

/// <summary>A raking strut on the dry side of a post, hinged at both ends, its foot at the level of the sill. It takes compression only.</summary>
public sealed record RakerInput
{
    /// <summary>What the raker is made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>Its cross-section.</summary>
    public ProfileChoice Profile { get; init; } = new RectangularTube();

    /// <summary>c, height of its head on the post above the sill [m], > 0 and no higher than the barrier.</summary>
    public double HeadHeight { get; init; } = 0.9;

    /// <summary>a, horizontal distance of its foot from the base of the post [m], > 0.</summary>
    public double FootDistance { get; init; } = 0.9;

    /// <summary>K, effective length over length [-], 0.5 to 2.</summary>
    public double LengthFactor { get; init; } = 1;

    /// <summary>Play in its joints, along the raker, before it bears [m], ≥ 0.</summary>
    public double Play { get; init; }

    /// <summary>Design resistance of the anchor at its foot against the horizontal thrust [N], > 0; null when not known.</summary>
    public double? FootResistance { get; init; }
}
