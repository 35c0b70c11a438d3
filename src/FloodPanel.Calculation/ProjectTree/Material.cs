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
