namespace FloodPanel.Calculation.ProjectTree;

/// <summary>A free-standing footing or sill beam under the barrier, as long as the opening is wide.</summary>
public sealed record FootingInput
{
    /// <summary>B, width in the direction of the water [m], > 0.</summary>
    public double Width { get; init; } = 1.5;

    /// <summary>D, thickness below the sill [m], > 0.</summary>
    public double Thickness { get; init; } = 0.4;

    /// <summary>x_b, from the edge on the flood side to the face of the barrier [m], 0 to B.</summary>
    public double BarrierFromFloodEdge { get; init; } = 0.9;

    /// <summary>ρ_c, density [kg/m³], > 0.</summary>
    public double Density { get; init; } = 2400;

    /// <summary>µ, friction between base and ground [-], 0.05 to 1.</summary>
    public double Friction { get; init; } = 0.4;

    /// <summary>c_a, adhesion over the base in contact [Pa], ≥ 0.</summary>
    public double Adhesion { get; init; }

    /// <summary>q_a, allowable bearing pressure [Pa], > 0.</summary>
    public double AllowableBearing { get; init; } = 100e3;

    /// <summary>D_c, depth of a cut-off below the base [m], ≥ 0.</summary>
    public double CutOff { get; init; }

    /// <summary>The ground under the base, for the creep ratio.</summary>
    public CreepSoil Soil { get; init; }

    /// <summary>Required factor on sliding [-], ≥ 1.</summary>
    public double SlidingFactor { get; init; } = 1.5;

    /// <summary>Required ratio of moments about the toe [-], ≥ 1.</summary>
    public double OverturningFactor { get; init; } = 1.5;

    /// <summary>Required factor on flotation [-], ≥ 1.</summary>
    public double FlotationFactor { get; init; } = 1.3;

    /// <summary>Required share of the base in compression [-], above 0 to 1.</summary>
    public double ContactShare { get; init; } = 1;

    /// <summary>True when the guides stand on the footing too, so that no wall takes load.</summary>
    public bool CarriesGuides { get; init; }

    /// <summary>Where friction, adhesion and bearing pressure come from; empty until known.</summary>
    public string Source { get; init; } = "";
}

/// <summary>Kinds of ground by Lane, the most erodible first.</summary>
public enum CreepSoil
{
    /// <summary>Very fine sand or silt.</summary>
    VeryFineSandOrSilt,

    /// <summary>Fine sand.</summary>
    FineSand,

    /// <summary>Medium sand.</summary>
    MediumSand,

    /// <summary>Coarse sand.</summary>
    CoarseSand,

    /// <summary>Fine gravel.</summary>
    FineGravel,

    /// <summary>Medium gravel.</summary>
    MediumGravel,

    /// <summary>Coarse gravel with cobbles.</summary>
    CoarseGravel,

    /// <summary>Boulders with cobbles and gravel.</summary>
    Boulders,

    /// <summary>Soft clay.</summary>
    SoftClay,

    /// <summary>Medium clay.</summary>
    MediumClay,

    /// <summary>Hard clay.</summary>
    HardClay,

    /// <summary>Hardpan.</summary>
    Hardpan,
}

/// <summary>The numeric inputs of a footing with their limits.</summary>
public static class FootingFields
{
    /// <summary>FootingInput.Width.</summary>
    public static Field Width { get; } = new("width", "Footing width", Dimension.Length, 0, 30, "In the direction of the water.", true);

    /// <summary>FootingInput.Thickness.</summary>
    public static Field Thickness { get; } = new("thickness", "Footing thickness", Dimension.Length, 0, 10, "From the sill down to the base.", true);

    /// <summary>FootingInput.BarrierFromFloodEdge.</summary>
    public static Field BarrierFromFloodEdge { get; } = new("barrierFromFloodEdge", "Barrier from the flood edge", Dimension.Length, 0, 30,
        "From the edge on the flood side to the face of the barrier; water stands on it.");

    /// <summary>FootingInput.Density.</summary>
    public static Field Density { get; } = new("density", "Density of the footing", Dimension.Density, 1000, 8000, "2400 kg/m³ concrete (common practice).");

    /// <summary>FootingInput.Friction.</summary>
    public static Field Friction { get; } = new("friction", "Friction", Dimension.Ratio, 0.05, 1, "Between base and ground, without a safety factor.");

    /// <summary>FootingInput.Adhesion.</summary>
    public static Field Adhesion { get; } = new("adhesion", "Adhesion", Dimension.Pressure, 0, 500_000, "Over the base in contact; nothing on sand.");

    /// <summary>FootingInput.AllowableBearing.</summary>
    public static Field AllowableBearing { get; } = new("allowableBearing", "Allowable bearing", Dimension.Pressure, 0, 20e6, "Pressure that the ground may take, its safety factor included.", true);

    /// <summary>FootingInput.CutOff.</summary>
    public static Field CutOff { get; } = new("cutOff", "Cut-off depth", Dimension.Length, 0, 30, "Of a sheet or trench below the base; counts twice in the creep path.");

    /// <summary>FootingInput.SlidingFactor.</summary>
    public static Field SlidingFactor { get; } = new("slidingFactor", "Factor on sliding", Dimension.Ratio, 1, 5, "1.5 for the design flood (USACE EM 1110-2-2502, secondary source).");

    /// <summary>FootingInput.OverturningFactor.</summary>
    public static Field OverturningFactor { get; } = new("overturningFactor", "Factor on overturning", Dimension.Ratio, 1, 5, "1.5 (FEMA P-259, from memory).");

    /// <summary>FootingInput.FlotationFactor.</summary>
    public static Field FlotationFactor { get; } = new("flotationFactor", "Factor on flotation", Dimension.Ratio, 1, 5, "1.3 usual, 1.2 unusual, 1.1 extreme (USACE EM 1110-2-2100, from memory).");

    /// <summary>FootingInput.ContactShare.</summary>
    public static Field ContactShare { get; } = new("contactShare", "Base in compression", Dimension.Ratio, 0, 1, "Share required: 1 for the design flood on soil, 0.75 for water to the top (USACE EM 1110-2-2502, from memory).", true);
}
