using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Materials;

/// <summary>The stress that a member may carry, with the way it came about.</summary>
/// <param name="Value">f, design or allowable stress [Pa].</param>
/// <param name="Strength">f_k, characteristic strength [Pa]; null when the stress was typed.</param>
/// <param name="Formula">f from f_k as written; empty when the stress was typed.</param>
/// <param name="Source">Where the factor stands, or that the stress was typed.</param>
public sealed record DesignStress(double Value, double? Strength, string Formula, string Source)
{
    /// <summary>Steps of further factors that <see cref="Formula"/> uses.</summary>
    public IReadOnlyList<CalculationStep> Factors { get; init; } = [];

    /// <summary>Design bending stress; null when neither an allowable nor a strength with a rule is there.</summary>
    /// <param name="material">The material.</param>
    /// <param name="basis">The design basis.</param>
    public static DesignStress? Bending(Material material, DesignBasis basis) =>
        Of(material.AllowableBending, material.BendingStrength, Rule(material, basis));

    /// <summary>Design shear stress; null when neither an allowable nor a strength with a rule is there.</summary>
    /// <param name="material">The material.</param>
    /// <param name="basis">The design basis.</param>
    public static DesignStress? Shear(Material material, DesignBasis basis) =>
        Of(material.AllowableShear, material.ShearStrength, Rule(material, basis));

    /// <summary>No factor of a design basis goes with reference values of the NDS: they have adjustment factors of their own.</summary>
    private static StrengthRule? Rule(Material material, DesignBasis basis) =>
        material.Reference == StrengthReference.NdsReference ? null : basis.For(material.Family);

    private static DesignStress? Of(double? allowable, double? strength, StrengthRule? rule)
    {
        if (allowable is { } typed)
        {
            return new(typed, null, "", "allowable typed by the user");
        }

        return strength is { } characteristic && rule is not null
            ? new(rule.Factor * characteristic, characteristic, rule.Formula, rule.Source)
            : null;
    }
}
