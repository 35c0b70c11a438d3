using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Walls;

/// <summary>A published depth of water that a kind of wall carries without damage.</summary>
/// <param name="Depth">Depth [m].</param>
/// <param name="Source">Where it stands.</param>
public sealed record WallDepthLimit(double Depth, string Source);

/// <summary>Depth of water against the wall of a building.</summary>
public static class WallDepth
{
    /// <summary>Unreinforced masonry.</summary>
    public static WallDepthLimit Masonry { get; } = new(
        0.9, "USACE, MP SL-85-5 (1985): unreinforced brick veneer or block carries about 3 ft (0.9 m) of water without damage");

    /// <summary>Unreinforced cavity masonry.</summary>
    public static WallDepthLimit CavityMasonry { get; } = new(
        0.6, "CLG/Defra, Improving the Flood Performance of New Buildings (2007): more than 0.6 m of difference may damage standard masonry (secondary source)");

    /// <summary>The limit for a kind of wall; null where none is published.</summary>
    /// <param name="wall">The wall.</param>
    public static WallDepthLimit? Limit(WallKind wall) => wall switch
    {
        WallKind.Masonry => Masonry,
        WallKind.CavityMasonry => CavityMasonry,
        _ => null,
    };

    /// <summary>Depth of still water against the wall, from the lower of sill and outside ground [m], ≥ 0.</summary>
    /// <param name="site">Levels.</param>
    /// <param name="opening">The opening.</param>
    public static double Against(Site site, Opening opening) => Math.Max(0, FloodLevels.Depth(
        site.DesignFloodLevel, Math.Min(opening.SillLevel, opening.GroundLevel ?? opening.SillLevel)));

    /// <summary>A kind of wall in a sentence, "a reinforced concrete wall".</summary>
    /// <param name="wall">The wall.</param>
    public static string Name(WallKind wall) => wall switch
    {
        WallKind.ReinforcedConcrete => "a reinforced concrete wall",
        WallKind.Masonry => "an unreinforced masonry wall",
        WallKind.CavityMasonry => "a cavity masonry wall",
        WallKind.TimberFrame => "a timber frame wall",
        WallKind.SteelFrame => "a steel frame wall",
        _ => throw new ArgumentOutOfRangeException(nameof(wall), wall, "is not a known wall"),
    };
}
