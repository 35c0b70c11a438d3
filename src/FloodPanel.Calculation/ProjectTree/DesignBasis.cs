using System.Globalization;

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Factors on loads [-]. Deflections are not factored.</summary>
/// <param name="FloodSide">On water, flow and waves of the flood side.</param>
/// <param name="ProtectedSide">On the water of the protected side, which helps.</param>
/// <param name="BrimFull">On still water at the top of the barrier.</param>
/// <param name="Debris">On every action of the flood side in the debris case.</param>
/// <param name="Wind">On wind against the dry barrier.</param>
/// <param name="Line">On a line load against the dry barrier.</param>
public sealed record LoadFactors(
    double FloodSide, double ProtectedSide, double BrimFull, double Debris, double Wind, double Line);

/// <summary>How a characteristic strength of a family becomes a design stress: f = multiplier·f_k/divisor.</summary>
/// <param name="Family">The material family.</param>
/// <param name="Multiplier">A resistance factor or k_mod [-], above 0.</param>
/// <param name="Divisor">A safety factor or partial factor [-], above 0.</param>
/// <param name="Source">Where they stand.</param>
public sealed record StrengthRule(MaterialFamily Family, double Multiplier, double Divisor, string Source)
{
    /// <summary>Design stress / characteristic strength [-].</summary>
    public double Factor => Multiplier / Divisor;

    /// <summary>The rule as written, "0.70·f_k/1.30", with f_k for the strength.</summary>
    public string Formula => (Multiplier, Divisor) switch
    {
        (1, _) => $"f_k/{Written(Divisor)}",
        (_, 1) => $"{Written(Multiplier)}·f_k",
        _ => $"{Written(Multiplier)}·f_k/{Written(Divisor)}",
    };

    private static string Written(double factor) => factor.ToString("0.00##########", CultureInfo.InvariantCulture);
}

/// <summary>A rule set: factors on loads and strengths, with their sources.</summary>
/// <param name="Kind">Which one, or which one it was copied from.</param>
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
    ValueList<StrengthRule> Strengths)
{
    /// <summary>The load factors for a flood zone.</summary>
    /// <param name="zone">The flood zone of the site.</param>
    public LoadFactors For(FloodZone zone) => zone == FloodZone.Inland ? Inland : Coastal;

    /// <summary>The rule for a family, or null where the basis does not cover it.</summary>
    /// <param name="family">The material family.</param>
    public StrengthRule? For(MaterialFamily family) => Strengths.FirstOrDefault(rule => rule.Family == family);
}
