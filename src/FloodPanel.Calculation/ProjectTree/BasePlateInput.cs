namespace FloodPanel.Calculation.ProjectTree;

/// <summary>
/// The plate under each post: symmetrical, the post in its middle, a row of rods on the wet side and one on the dry side,
/// on grout over concrete.
/// </summary>
public sealed record BasePlateInput
{
    /// <summary>What the plate is made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>N, size in the direction of the water [m], > 0.</summary>
    public double Length { get; init; } = 0.3;

    /// <summary>B, size across the opening [m], > 0.</summary>
    public double Width { get; init; } = 0.2;

    /// <summary>t, thickness [m], > 0.</summary>
    public double Thickness { get; init; } = 0.02;

    /// <summary>f, distance of each row of rods from the middle of the plate [m], > 0.</summary>
    public double RodDistance { get; init; } = 0.11;

    /// <summary>Rods in each of the two rows [-], 1 to 20.</summary>
    public int RodsPerRow { get; init; } = 2;

    /// <summary>f'c or f_ck, cylinder strength of the concrete [Pa], > 0.</summary>
    public double ConcreteStrength { get; init; } = 25e6;

    /// <summary>A2/A1, concrete area that spreads the bearing over the area of the plate [-], at least 1.</summary>
    public double AreaRatio { get; init; } = 1;

    /// <summary>Thickness of the grout under the plate [m], ≥ 0.</summary>
    public double GroutThickness { get; init; }

    /// <summary>w, leg of the fillet weld all round the post [m], > 0; null when there is none.</summary>
    public double? WeldLeg { get; init; }

    /// <summary>
    /// Strength of the weld metal [Pa], > 0: F_EXX of the electrode for steel in US practice, f_w or F_tuw of the filler for aluminium;
    /// null when not known. EN 1993-1-8 takes the strength of the parts instead.
    /// </summary>
    public double? WeldStrength { get; init; }
}
