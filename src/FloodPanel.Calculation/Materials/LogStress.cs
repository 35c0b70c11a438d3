using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Materials;

/// <summary>Design stresses of logs, with what timber and composites have to endure. A typed allowable always wins.</summary>
public static class LogStress
{
    /// <summary>Design bending stress; null when it is missing or not covered.</summary>
    /// <param name="material">The material.</param>
    /// <param name="profile">The cross-section.</param>
    /// <param name="stack">The stack, which says what its timber and composites endure.</param>
    /// <param name="basis">The design basis.</param>
    public static DesignStress? Bending(Material material, Profile profile, LogStack stack, DesignBasis basis) =>
        (material.AllowableBending, material.BendingStrength) switch
        {
            ({ }, _) or (_, null) => DesignStress.Bending(material, basis),
            (_, { } strength) => material.Family switch
            {
                MaterialFamily.Timber when stack.Timber is { } service => TimberStress.Bending(material, strength, profile, service, basis),
                MaterialFamily.Composite when stack.Composite is { } service => Composite(strength, service),
                _ => DesignStress.Bending(material, basis),
            },
        };

    /// <summary>Design shear stress along the log; null when it is missing or not covered.</summary>
    /// <param name="material">The material.</param>
    /// <param name="profile">The cross-section.</param>
    /// <param name="stack">The stack, which says what its timber and composites endure.</param>
    /// <param name="basis">The design basis.</param>
    public static DesignStress? Shear(Material material, Profile profile, LogStack stack, DesignBasis basis) =>
        (material.AllowableShear, material.ShearStrength) switch
        {
            ({ }, _) or (_, null) => DesignStress.Shear(material, basis),
            (_, { } strength) => material.Family switch
            {
                MaterialFamily.Timber when stack.Timber is { } service => TimberStress.Shear(material, strength, profile, service, basis),
                MaterialFamily.Composite when stack.Composite is { } service => Composite(strength, service),
                _ => DesignStress.Shear(material, basis),
            },
        };

    /// <summary>Design bending stress across the fibres of a composite; null when it is missing or not covered.</summary>
    /// <param name="material">The material.</param>
    /// <param name="stack">The stack, which says what its timber and composites endure.</param>
    public static DesignStress? Cross(Material material, LogStack stack) =>
        material.Family == MaterialFamily.Composite && material.CrossStrength is { } strength && stack.Composite is { } service
            ? Composite(strength, service)
            : null;

    /// <summary>Design stress in compression across the grain of timber; null when it is missing or not covered.</summary>
    /// <param name="material">The material.</param>
    /// <param name="stack">The stack, which says what its timber and composites endure.</param>
    /// <param name="basis">The design basis.</param>
    public static DesignStress? Across(Material material, LogStack stack, DesignBasis basis) =>
        material.Family == MaterialFamily.Timber ? TimberStress.Across(material, stack.Timber, basis) : null;

    private static DesignStress Composite(double strength, CompositeService service) => new(
        service.ConversionFactor * strength / service.MaterialFactor, strength, "η_c·f_k/γ_M",
        "strength by the product standard (EN 13706) over factors typed by the user")
    {
        Factors =
        [
            new("η_c", "", service.ConversionFactor, Dimension.Ratio),
            new("γ_M", "", service.MaterialFactor, Dimension.Ratio),
        ],
    };
}
