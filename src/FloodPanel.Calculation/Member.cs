using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation;

/// <summary>A log or post resolved to numbers: section, material and the stresses it may carry.</summary>
/// <param name="Material">The material.</param>
/// <param name="Profile">The cross-section as entered.</param>
/// <param name="Section">Properties of the cross-section.</param>
/// <param name="Bending">Design bending stress; null when its inputs are missing or not covered.</param>
/// <param name="Shear">Design shear stress; null when its inputs are missing or not covered.</param>
/// <param name="DeflectionLimit">n in the limit length / n [-].</param>
public sealed record Member(
    Material Material, Profile Profile, SectionProperties Section, DesignStress? Bending, DesignStress? Shear, double DeflectionLimit)
{
    /// <summary>E·I, bending stiffness [N·m²].</summary>
    public double Stiffness => Material.ElasticModulus * Section.Inertia;

    /// <summary>M_R = W·f_b, moment resistance [N·m]; infinite when the stress is missing, see <see cref="IsComplete"/>.</summary>
    public double MomentResistance => Bending is null ? double.PositiveInfinity : Section.Modulus * Bending.Value;

    /// <summary>V_R = A_v·f_v, shear resistance [N]; infinite when the stress is missing, see <see cref="IsComplete"/>.</summary>
    public double ShearResistance => Shear is null ? double.PositiveInfinity : Section.ShearArea * Shear.Value;

    /// <summary>Source of the bending check, as printed.</summary>
    public string BendingSource { get; } = $"Elastic bending M/W; {Bending?.Source}";

    /// <summary>Source of the shear check, as printed.</summary>
    public string ShearSource { get; } = $"Shear over the shear area; {Shear?.Source}";

    /// <summary>True when both stresses are known, so that every check of the member has a result.</summary>
    public bool IsComplete => Bending is not null && Shear is not null;

    internal static Member Of(
        MaterialChoice material, ProfileChoice profile, double deflectionLimit, DesignBasis basis, Library library, LogStack? stack = null)
    {
        var found = library.Find(material)
            ?? throw new ArgumentException("the library does not hold the material", nameof(material));
        var shape = library.Find(profile)
            ?? throw new ArgumentException("the library does not hold the profile", nameof(profile));
        return new(
            found,
            shape,
            SectionProperties.Of(shape),
            Marked(stack is null ? DesignStress.Bending(found, basis) : LogStress.Bending(found, shape, stack, basis), material),
            Marked(stack is null ? DesignStress.Shear(found, basis) : LogStress.Shear(found, shape, stack, basis), material),
            deflectionLimit);
    }

    /// <summary>A strength that the user typed is marked as theirs.</summary>
    private static DesignStress? Marked(DesignStress? stress, MaterialChoice material) =>
        stress is { Strength: not null } && material is Material ? stress with { Source = $"{stress.Source}; strength typed by the user" } : stress;
}
