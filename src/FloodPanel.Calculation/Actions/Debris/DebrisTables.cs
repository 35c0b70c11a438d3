namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>A coefficient that can be chosen by words.</summary>
/// <param name="Words">What applies, "limited: a path about 20 ft wide".</param>
/// <param name="Value">The coefficient [-].</param>
public sealed record DebrisChoice(string Words, double Value);

/// <summary>The coefficients of ASCE 7, C5.4.5, by words. The project file keeps the numbers.</summary>
public static class DebrisTables
{
    /// <summary>Source of importance and orientation, as printed.</summary>
    public const string MemorySource = "ASCE 7, C5.4.5 (from memory)";

    /// <summary>Source of depth and blockage, as printed.</summary>
    public const string SecondarySource = "ASCE 7, C5.4.5 (secondary source)";

    private const double Foot = 0.3048;

    /// <summary>C_I by risk category of the building.</summary>
    public static ValueList<DebrisChoice> Importance { get; } =
    [
        new("Risk category 1", 0.6), new("Risk category 2", 1.0), new("Risk category 3", 1.2), new("Risk category 4", 1.3),
    ];

    /// <summary>C_O.</summary>
    public static ValueList<DebrisChoice> Orientation { get; } = [new("Usual", 0.8), new("Head-on, nothing taken off", 1.0)];

    /// <summary>C_B by what screens the opening upstream.</summary>
    public static ValueList<DebrisChoice> Blockage { get; } =
    [
        new("No screening, path wider than 30 ft (9 m)", 1.0),
        new("Limited screening, path about 20 ft (6 m)", 0.6),
        new("Moderate screening, path about 10 ft (3 m)", 0.2),
        new("Dense screening, path under 5 ft (1.5 m)", 0.0),
    ];

    /// <summary>C_D by zone, and by depth where the water is shallow.</summary>
    /// <param name="depth">d_s, still-water depth above ground [m]; below zero where the ground stays dry.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is not finite.</exception>
    public static ValueList<DebrisChoice> Depth(double depth) =>
    [
        new("Floodway, coastal high-hazard zone, or deeper than 5 ft (1.5 m)", 1.0), new("Elsewhere, at this depth", ShallowDepth(depth)),
    ];

    /// <summary>C_D = 0.25·(d_s − 1) with d_s in ft, 0 to 1 [-]: 0.25 at 2 ft, 1 from 5 ft.</summary>
    /// <param name="depth">d_s, still-water depth above ground [m]; below zero where the ground stays dry.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is not finite.</exception>
    public static double ShallowDepth(double depth)
    {
        Guard.Finite(depth);

        return Math.Clamp(0.25 * (depth / Foot - 1), 0, 1);
    }
}
