namespace FloodPanel.Calculation.ProjectTree;

/// <summary>One gap to be closed and the barrier that closes it.</summary>
public sealed record Opening
{
    /// <summary>Identifier, unique in the project: letters, digits and hyphens.</summary>
    public string Id { get; init; } = "";

    /// <summary>Name on screens and documents.</summary>
    public string Name { get; init; } = "";

    /// <summary>Lowest surveyed point of the sill [m, project datum].</summary>
    public double SillLevel { get; init; }

    /// <summary>Lowest outside ground near the opening [m, project datum]; null means the sill level.</summary>
    public double? GroundLevel { get; init; }

    /// <summary>Clear width of the opening [m], > 0.</summary>
    public double ClearWidth { get; init; }

    /// <summary>Clear height of the opening [m], > 0.</summary>
    public double ClearHeight { get; init; }

    /// <summary>Angle of the barrier face from the vertical, top leaning to the protected side [degrees], 0 to 60.</summary>
    public double RakeDegrees { get; init; }

    /// <summary>Water level on the protected side [m, project datum]; null means dry.</summary>
    public double? ProtectedSideLevel { get; init; }

    /// <summary>What the wall around the opening is made of.</summary>
    public WallKind Wall { get; init; } = WallKind.ReinforcedConcrete;

    /// <summary>How that wall is judged, or null where nobody has said.</summary>
    public WallInput? WallBehind { get; init; }

    /// <summary>The actions to be considered besides still water.</summary>
    public ActionSet Actions { get; init; } = new();

    /// <summary>What closes the opening.</summary>
    public Barrier Barrier { get; init; } = new();

    /// <summary>Leakage, rain and pump, or null where nobody asks.</summary>
    public LeakageInput? Leakage { get; init; }
}

/// <summary>The wall around an opening.</summary>
public enum WallKind
{
    /// <summary>Reinforced concrete.</summary>
    ReinforcedConcrete,

    /// <summary>Solid masonry, unreinforced.</summary>
    Masonry,

    /// <summary>Cavity masonry, unreinforced.</summary>
    CavityMasonry,

    /// <summary>Timber frame.</summary>
    TimberFrame,

    /// <summary>Steel frame.</summary>
    SteelFrame,
}
