namespace FloodPanel.Calculation.ProjectTree;

/// <summary>What a leak rate is per metre of.</summary>
public enum LeakConvention
{
    /// <summary>Clear width of the opening, as in British practice.</summary>
    Width,

    /// <summary>Wetted seal, the width and both sides of each bay, as in American practice.</summary>
    Seal,
}

/// <summary>What comes past the barrier and from the sky behind it, and the pump for it.</summary>
public sealed record LeakageInput
{
    /// <summary>What the rate is per metre of.</summary>
    public LeakConvention Convention { get; init; } = LeakConvention.Width;

    /// <summary>q, leak rate allowed or measured [m³/s per m], ≥ 0. 1 L/h per m is 2.78e-7.</summary>
    public double Rate { get; init; } = 1e-3 / 3600;

    /// <summary>i, rain intensity [m/s], ≥ 0; 0 for no rain.</summary>
    public double RainIntensity { get; init; }

    /// <summary>A, area behind the barrier that drains to it [m²], ≥ 0.</summary>
    public double RainArea { get; init; }

    /// <summary>C, runoff coefficient [-], 0 to 1.</summary>
    public double RunoffCoefficient { get; init; } = 0.9;

    /// <summary>Volume of the sump [m³], ≥ 0; 0 for none.</summary>
    public double SumpVolume { get; init; }

    /// <summary>Pump flow over inflow [-], at least 1.</summary>
    public double PumpMargin { get; init; } = 1.5;

    /// <summary>True when somebody has confirmed that drains, vents and cavities are closed against back-flow.</summary>
    public bool BackFlowClosed { get; init; }
}
