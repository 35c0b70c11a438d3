namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The actions switched on for an opening; still water always acts.</summary>
public sealed record ActionSet
{
    /// <summary>Moving water, or null.</summary>
    public FlowInput? Flow { get; init; }

    /// <summary>Waves, or null.</summary>
    public WaveInput? Wave { get; init; }

    /// <summary>Floating debris, or null.</summary>
    public DebrisInput? Debris { get; init; }

    /// <summary>Wind on the dry barrier, or null.</summary>
    public WindInput? Wind { get; init; }

    /// <summary>A line load on the dry barrier, or null.</summary>
    public LineInput? Line { get; init; }
}

/// <summary>Moving water against the barrier.</summary>
public sealed record FlowInput
{
    /// <summary>V, flow velocity [m/s], ≥ 0.</summary>
    public double Velocity { get; init; }

    /// <summary>a, shape coefficient of the surcharge method [-], ≥ 1.25.</summary>
    public double ShapeCoefficient { get; init; } = 1.25;
}

/// <summary>Waves against the barrier.</summary>
public abstract record WaveInput;

/// <summary>Breaking waves.</summary>
public sealed record BreakingWaveInput : WaveInput
{
    /// <summary>Risk category of the building [-], 1 to 4.</summary>
    public int RiskCategory { get; init; } = 2;
}

/// <summary>Non-breaking waves.</summary>
public sealed record NonBreakingWaveInput : WaveInput
{
    /// <summary>H_max, design wave height [m], > 0.</summary>
    public double Height { get; init; }

    /// <summary>T, wave period [s], at least 0.5.</summary>
    public double Period { get; init; }

    /// <summary>β, angle between wave direction and the normal to the wall [degrees], 0 to 90.</summary>
    public double AngleDegrees { get; init; }

    /// <summary>Slope of the bed in front of the wall, rise over run [-], ≥ 0.</summary>
    public double BedSlope { get; init; }
}

/// <summary>A floating object striking the barrier.</summary>
public sealed record DebrisInput
{
    /// <summary>m, mass of the object [kg], > 0.</summary>
    public double Mass { get; init; } = 450;

    /// <summary>V, velocity of the object [m/s], ≥ 0.</summary>
    public double Velocity { get; init; }

    /// <summary>Δt, stopping time [s], > 0.</summary>
    public double StoppingTime { get; init; } = 0.03;

    /// <summary>The factors on the impact force.</summary>
    public DebrisCoefficients Coefficients { get; init; } = new();
}

/// <summary>Factors on the debris impact force [-], each ≥ 0.</summary>
public sealed record DebrisCoefficients
{
    /// <summary>C_I, importance.</summary>
    public double Importance { get; init; } = 1;

    /// <summary>C_O, orientation.</summary>
    public double Orientation { get; init; } = 1;

    /// <summary>C_D, depth.</summary>
    public double Depth { get; init; } = 1;

    /// <summary>C_B, blockage.</summary>
    public double Blockage { get; init; } = 1;

    /// <summary>R_max, dynamic response; null means from the log's own period.</summary>
    public double? Response { get; init; }
}

/// <summary>Wind on the dry barrier.</summary>
public sealed record WindInput
{
    /// <summary>p, wind pressure [Pa], ≥ 0.</summary>
    public double Pressure { get; init; }
}

/// <summary>A horizontal line load on the dry barrier.</summary>
public sealed record LineInput
{
    /// <summary>Force per metre of width [N/m], ≥ 0.</summary>
    public double Force { get; init; }

    /// <summary>Height above the sill [m], ≥ 0.</summary>
    public double Height { get; init; }
}
