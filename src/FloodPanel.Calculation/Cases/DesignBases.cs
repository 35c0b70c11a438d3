using System.Collections.Frozen;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Cases;

/// <summary>The three rule sets.</summary>
public static class DesignBases
{
    /// <summary>Service loads against strengths reduced by a safety factor.</summary>
    public static DesignBasis AllowableStress { get; } = new(
        DesignBasisKind.AllowableStress,
        "Allowable stress",
        "ASCE 7-16, 2.4.2: 1.5 in coastal zones; elsewhere 1.0, its 0.75 not taken",
        new(FloodSide: 1.0, ProtectedSide: 1.0, BrimFull: 1.0),
        new(FloodSide: 1.5, ProtectedSide: 1.5, BrimFull: 1.5),
        new Dictionary<MaterialFamily, StrengthRule>
        {
            [MaterialFamily.Aluminium] = new(1 / 1.65, "f_k/1.65", "Aluminum Design Manual 2020, F.1 and G.1: safety factor 1.65 on yield"),
            [MaterialFamily.Steel] = new(1 / 1.67, "f_k/1.67", "AISC 360, F1 and G1: safety factor 1.67"),
        }.ToFrozenDictionary());

    /// <summary>US strength design: factored loads against factored strengths.</summary>
    public static DesignBasis UsStrength { get; } = new(
        DesignBasisKind.UsStrength,
        "US strength design",
        "ASCE 7-16, 2.3.2: 2.0 in coastal zones, 1.0 elsewhere; 1.4 on a fluid of known greatest height",
        new(FloodSide: 1.0, ProtectedSide: 1.0, BrimFull: 1.4),
        new(FloodSide: 2.0, ProtectedSide: 2.0, BrimFull: 2.0),
        new Dictionary<MaterialFamily, StrengthRule>
        {
            [MaterialFamily.Aluminium] = new(0.90, "0.90·f_k", "Aluminum Design Manual 2020, F.1 and G.1: resistance factor 0.90 (from memory)"),
            [MaterialFamily.Steel] = new(0.90, "0.90·f_k", "AISC 360, F1 and G1: resistance factor 0.90"),
        }.ToFrozenDictionary());

    /// <summary>Eurocode partial factors.</summary>
    public static DesignBasis Eurocode { get; } = new(
        DesignBasisKind.Eurocode,
        "Eurocode",
        "EN 1990, Table A1.2(B) (from memory): 1.5 variable, 1.0 favourable, 1.35 where geometry limits the level",
        new(FloodSide: 1.5, ProtectedSide: 1.0, BrimFull: 1.35),
        new(FloodSide: 1.5, ProtectedSide: 1.0, BrimFull: 1.35),
        new Dictionary<MaterialFamily, StrengthRule>
        {
            [MaterialFamily.Aluminium] = new(1 / 1.10, "f_k/1.10", "EN 1999-1-1, 6.1.3: partial factor 1.10 (from memory)"),
            [MaterialFamily.Steel] = new(1 / 1.00, "f_k/1.00", "EN 1993-1-1, 6.1: partial factor 1.00 (from memory)"),
            [MaterialFamily.Timber] = new(0.70 / 1.30, "0.70·f_k/1.30",
                "EN 1995-1-1, 2.4.1 and Table 3.1: k_mod 0.70 (service class 3, short term), partial factor 1.30"),
        }.ToFrozenDictionary());

    /// <summary>The rule set of a kind.</summary>
    /// <param name="kind">The kind.</param>
    public static DesignBasis Of(DesignBasisKind kind) => kind switch
    {
        DesignBasisKind.AllowableStress => AllowableStress,
        DesignBasisKind.UsStrength => UsStrength,
        DesignBasisKind.Eurocode => Eurocode,
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "is not a design basis"),
    };
}
