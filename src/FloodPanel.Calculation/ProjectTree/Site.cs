namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Levels and water at the site. All levels stand in the project's datum [m].</summary>
public sealed record Site
{
    /// <summary>What the levels are measured from, in words.</summary>
    public string Datum { get; init; } = "site datum";

    /// <summary>ρ, water density [kg/m³], 990 to 1400: 1000 fresh, 1025 sea, more with sediment.</summary>
    public double WaterDensity { get; init; } = 1000;

    /// <summary>Annual exceedance probability of the design still-water level [-], above 0 and below 1.</summary>
    public double AnnualProbability { get; init; } = 0.01;

    /// <summary>Still-water level at that probability, before the allowances [m].</summary>
    public double DesignStillWaterLevel { get; init; }

    /// <summary>Surge allowance added to the still-water level [m], ≥ 0.</summary>
    public double Surge { get; init; }

    /// <summary>Climate allowance as a lump, added to the still-water level [m], ≥ 0.</summary>
    public double ClimateAllowance { get; init; }

    /// <summary>Climate allowance that grows with the years [m per year], ≥ 0; over the design life it adds to the lump.</summary>
    public double ClimateRatePerYear { get; init; }

    /// <summary>Years that the barrier should serve, 1 to 200.</summary>
    public double DesignLifeYears { get; init; } = 30;

    /// <summary>Height of barrier wanted above the design flood level [m], ≥ 0.</summary>
    public double Freeboard { get; init; } = 0.3;

    /// <summary>The flood zone, which sets some load factors.</summary>
    public FloodZone FloodZone { get; init; } = FloodZone.Inland;

    /// <summary>Known levels by annual exceedance probability; may be empty.</summary>
    public ValueList<LevelPoint> Levels { get; init; } = [];

    /// <summary>Climate allowance in all: the lump, and the rate over the design life [m].</summary>
    public double TotalClimateAllowance => ClimateAllowance + ClimateRatePerYear * DesignLifeYears;

    /// <summary>Design flood level: still-water level, surge and climate allowance together [m].</summary>
    public double DesignFloodLevel => DesignStillWaterLevel + Surge + TotalClimateAllowance;
}

/// <summary>One row of the table of levels.</summary>
/// <param name="AnnualProbability">Annual exceedance probability [-], above 0 and below 1.</param>
/// <param name="Level">Still-water level [m].</param>
public sealed record LevelPoint(double AnnualProbability, double Level);

/// <summary>The flood zone of the site, in the words of ASCE 7.</summary>
public enum FloodZone
{
    /// <summary>Away from the coast, or coastal without damaging waves.</summary>
    Inland,

    /// <summary>Coastal A zone: moderate breaking waves are possible.</summary>
    CoastalA,

    /// <summary>Coastal high-hazard (V) zone.</summary>
    CoastalHighHazard,
}
