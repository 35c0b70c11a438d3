namespace FloodPanel.Documents.Drawings;

/// <summary>What a line stands for; writers choose its colour, <see cref="LineWeights"/> its width.</summary>
public enum LineRole
{
    /// <summary>Edges in view or cut.</summary>
    Outline,

    /// <summary>Minor edges: joints between logs.</summary>
    Edge,

    /// <summary>Frame of the sheet.</summary>
    Frame,

    /// <summary>Edges out of sight.</summary>
    Hidden,

    /// <summary>Dimension lines and the leaders of level marks.</summary>
    Dimension,

    /// <summary>Extension lines and rules of the title block.</summary>
    Extension,

    /// <summary>Ticks at the ends of dimension lines.</summary>
    Tick,

    /// <summary>Hatching of materials.</summary>
    Hatch,

    /// <summary>Surface of the ground.</summary>
    Ground,

    /// <summary>Surface of the water.</summary>
    Water,

    /// <summary>The resultant.</summary>
    Resultant,

    /// <summary>Hatching of the hydrostatic action.</summary>
    Hydrostatic,

    /// <summary>Hatching of the flow action.</summary>
    Flow,

    /// <summary>Hatching of the wave action.</summary>
    Wave,

    /// <summary>Hatching of the debris action.</summary>
    Debris,

    /// <summary>Hatching of the wind action.</summary>
    Wind,

    /// <summary>Hatching of the line load.</summary>
    LineLoad,
}

/// <summary>What an area stands for.</summary>
public enum FillRole
{
    /// <summary>The sheet.</summary>
    Paper,

    /// <summary>Wall and slab behind their hatching.</summary>
    Wall,

    /// <summary>Stop-logs.</summary>
    Log,

    /// <summary>Posts and guides.</summary>
    Post,

    /// <summary>Water, transparent.</summary>
    Water,

    /// <summary>Solid marks in ink: arrowheads.</summary>
    Ink,

    /// <summary>Solid marks of water levels.</summary>
    WaterMark,

    /// <summary>Not seen: widens what the pointer can hit. Not printed.</summary>
    Reach,

    /// <summary>Hydrostatic action.</summary>
    Hydrostatic,

    /// <summary>Flow action.</summary>
    Flow,

    /// <summary>Wave action.</summary>
    Wave,

    /// <summary>Debris action.</summary>
    Debris,

    /// <summary>Wind action.</summary>
    Wind,

    /// <summary>Line load.</summary>
    LineLoad,
}

/// <summary>What words stand for.</summary>
public enum TextRole
{
    /// <summary>Figures.</summary>
    Normal,

    /// <summary>Names beside figures, headings of the title block.</summary>
    Muted,

    /// <summary>Titles and the figures that matter most; semibold.</summary>
    Strong,
}

/// <summary>Line widths [mm] after ISO 128-2: thick 0.5, thin 0.25, and 0.18 or less for what should recede.</summary>
public static class LineWeights
{
    /// <summary>Dash and gap of hidden edges [mm].</summary>
    public static IReadOnlyList<double> HiddenDash { get; } = [1.6, 0.8];

    /// <summary>Width of a line [mm].</summary>
    /// <param name="role">What it stands for.</param>
    public static double Of(LineRole role) => role switch
    {
        LineRole.Outline => 0.5,
        LineRole.Ground or LineRole.Resultant => 0.7,
        LineRole.Water or LineRole.Tick or LineRole.Frame => 0.35,
        LineRole.Edge or LineRole.Hidden or LineRole.Dimension => 0.25,
        LineRole.Hatch => 0.13,
        _ => 0.18,
    };
}
