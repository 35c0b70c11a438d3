namespace FloodPanel.Calculation.ProjectTree;

/// <summary>A material by library id or with its own figures.</summary>
public abstract record MaterialChoice;

/// <summary>A material of the library.</summary>
/// <param name="Id">Identifier in the library.</param>
public sealed record LibraryMaterial(string Id) : MaterialChoice;

/// <summary>A material with its own figures. An allowable given here wins over one derived from a strength.</summary>
public sealed record Material : MaterialChoice
{
    /// <summary>Family, which decides the factors on strength.</summary>
    public MaterialFamily Family { get; init; }

    /// <summary>Name on screens and documents.</summary>
    public string Name { get; init; } = "";

    /// <summary>ρ, density [kg/m³], > 0.</summary>
    public double Density { get; init; }

    /// <summary>E, elastic modulus along the member [Pa], > 0.</summary>
    public double ElasticModulus { get; init; }

    /// <summary>Characteristic yield (metal) or bending strength (timber) [Pa], > 0, or null.</summary>
    public double? BendingStrength { get; init; }

    /// <summary>Characteristic shear strength [Pa], > 0, or null.</summary>
    public double? ShearStrength { get; init; }

    /// <summary>Bending stress allowed (allowable stress) or design resistance (strength bases) [Pa], > 0, or null.</summary>
    public double? AllowableBending { get; init; }

    /// <summary>Shear stress allowed (allowable stress) or design resistance (strength bases) [Pa], > 0, or null.</summary>
    public double? AllowableShear { get; init; }

    /// <summary>f_u or F_tu, characteristic ultimate tensile strength [Pa], > 0, or null.</summary>
    public double? UltimateStrength { get; init; }

    /// <summary>f_o,haz or F_tyw, yield within 25 mm of a weld of aluminium [Pa], > 0, or null.</summary>
    public double? WeldedYield { get; init; }

    /// <summary>f_u,haz or F_tuw, ultimate strength within 25 mm of a weld of aluminium [Pa], > 0, or null.</summary>
    public double? WeldedUltimate { get; init; }

    /// <summary>G, shear modulus [Pa], > 0, or null.</summary>
    public double? ShearModulus { get; init; }

    /// <summary>Flexural strength across the fibres of a composite [Pa], > 0, or null.</summary>
    public double? CrossStrength { get; init; }

    /// <summary>f_c,90,k or F_c⊥, compressive strength of timber across the grain [Pa], > 0, or null.</summary>
    public double? CrossCompression { get; init; }

    /// <summary>ρ_k, characteristic density of timber [kg/m³], > 0, or null.</summary>
    public double? CharacteristicDensity { get; init; }

    /// <summary>How an aluminium alloy buckles; null where nobody has said.</summary>
    public BucklingClass? BucklingClass { get; init; }

    /// <summary>What the strengths are.</summary>
    public StrengthReference Reference { get; init; }
}

/// <summary>Buckling class of an aluminium alloy (EN 1999-1-1, 3.2.2).</summary>
public enum BucklingClass
{
    /// <summary>Class A, heat-treated tempers.</summary>
    A,

    /// <summary>Class B, other tempers.</summary>
    B,
}

/// <summary>What the strengths of a material are.</summary>
public enum StrengthReference
{
    /// <summary>Characteristic or specified minimum strengths.</summary>
    Characteristic,

    /// <summary>Reference design values of the National Design Specification for timber, to be adjusted by its factors.</summary>
    NdsReference,
}

/// <summary>Material families.</summary>
public enum MaterialFamily
{
    /// <summary>Aluminium alloys.</summary>
    Aluminium,

    /// <summary>Structural and stainless steels.</summary>
    Steel,

    /// <summary>Solid timber.</summary>
    Timber,

    /// <summary>Fibre-reinforced plastics.</summary>
    Composite,
}
