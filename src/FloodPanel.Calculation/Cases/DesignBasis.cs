using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Cases;

/// <summary>Factors on loads [-].</summary>
/// <param name="FloodSide">On water, flow, wave and debris of the flood side.</param>
/// <param name="ProtectedSide">On the water of the protected side, which helps.</param>
/// <param name="BrimFull">On still water at the top of the barrier.</param>
public sealed record LoadFactors(double FloodSide, double ProtectedSide, double BrimFull);

/// <summary>How a characteristic strength becomes a design stress.</summary>
/// <param name="Factor">Design stress / characteristic strength [-].</param>
/// <param name="Formula">The factor on the strength as written, "f_k/1.65", with f_k for the strength.</param>
/// <param name="Source">Where the factor stands.</param>
public sealed record StrengthRule(double Factor, string Formula, string Source);

/// <summary>A rule set: factors on loads and strengths, with their sources.</summary>
/// <param name="Kind">Which one.</param>
/// <param name="Title">Name on screens and documents.</param>
/// <param name="LoadSource">Where the load factors stand.</param>
/// <param name="Inland">Load factors away from the coast.</param>
/// <param name="Coastal">Load factors in coastal A and coastal high-hazard zones.</param>
/// <param name="Strengths">Rules by material family; a family that is missing is not covered.</param>
public sealed record DesignBasis(
    DesignBasisKind Kind,
    string Title,
    string LoadSource,
    LoadFactors Inland,
    LoadFactors Coastal,
    IReadOnlyDictionary<MaterialFamily, StrengthRule> Strengths)
{
    /// <summary>The load factors for a flood zone.</summary>
    /// <param name="zone">The flood zone of the site.</param>
    public LoadFactors For(FloodZone zone) => zone == FloodZone.Inland ? Inland : Coastal;

    /// <summary>The rule for a family, or null where the basis does not cover it.</summary>
    /// <param name="family">The material family.</param>
    public StrengthRule? For(MaterialFamily family) => Strengths.GetValueOrDefault(family);
}
