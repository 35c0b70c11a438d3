namespace FloodPanel.Calculation.Actions;

/// <summary>One physical cause of load.</summary>
public enum ActionKind
{
    /// <summary>Still water on both sides.</summary>
    Hydrostatic,

    /// <summary>Moving water.</summary>
    Flow,

    /// <summary>Waves.</summary>
    Wave,

    /// <summary>Floating debris.</summary>
    Debris,

    /// <summary>Wind.</summary>
    Wind,

    /// <summary>A line load.</summary>
    Line,
}
