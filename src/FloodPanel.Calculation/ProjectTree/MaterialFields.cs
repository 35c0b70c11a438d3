namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The optional figures of a material that some checks need, with their limits.</summary>
public static class MaterialFields
{
    /// <summary>Material.UltimateStrength.</summary>
    public static Field UltimateStrength { get; } = new("ultimateStrength", "Ultimate strength", Dimension.Stress, 0, 5e9,
        "Characteristic tensile strength of a metal.", true);

    /// <summary>Material.WeldedYield.</summary>
    public static Field WeldedYield { get; } = new("weldedYield", "Yield beside a weld", Dimension.Stress, 0, 5e9,
        "Of aluminium, within 25 mm of a weld.", true);

    /// <summary>Material.WeldedUltimate.</summary>
    public static Field WeldedUltimate { get; } = new("weldedUltimate", "Ultimate strength beside a weld", Dimension.Stress, 0, 5e9,
        "Of aluminium, within 25 mm of a weld.", true);

    /// <summary>Material.ShearModulus.</summary>
    public static Field ShearModulus { get; } = new("shearModulus", "Shear modulus", Dimension.ElasticModulus, 1e7, 1e12,
        "Adds the shear deflection of timber and composites.");

    /// <summary>Material.CrossStrength.</summary>
    public static Field CrossStrength { get; } = new("crossStrength", "Strength across the fibres", Dimension.Stress, 0, 5e9,
        "Flexural strength of a composite in the transverse direction.", true);

    /// <summary>Material.CrossCompression.</summary>
    public static Field CrossCompression { get; } = new("crossCompression", "Compression across the grain", Dimension.Stress, 0, 5e9,
        "Of timber, where a log bears on its guide.", true);

    /// <summary>Material.CharacteristicDensity.</summary>
    public static Field CharacteristicDensity { get; } = new("characteristicDensity", "Characteristic density", Dimension.Density, 0, 25_000,
        "Of timber, ρ_k.", true);
}
