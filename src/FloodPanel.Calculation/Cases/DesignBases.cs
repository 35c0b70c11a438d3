using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Cases;

/// <summary>The three rule sets as delivered. The data file <c>design-bases.json</c> says the same and is what the app reads.</summary>
public static class DesignBases
{
    /// <summary>Service loads against strengths reduced by a safety factor.</summary>
    public static DesignBasis AllowableStress { get; } = new(
        DesignBasisKind.AllowableStress,
        "Allowable stress",
        "ASCE 7-16, 2.4.2: 1.5 in coastal zones; elsewhere 1.0, its 0.75 not taken",
        Inland: new(FloodSide: 1.0, ProtectedSide: 1.0, BrimFull: 1.0, Debris: 1.0, Wind: 1.0, Line: 1.0),
        Coastal: new(FloodSide: 1.5, ProtectedSide: 1.5, BrimFull: 1.5, Debris: 1.5, Wind: 1.0, Line: 1.0),
        [
            new(MaterialFamily.Aluminium, 1, 1.65, "Aluminum Design Manual 2020, F.1 and G.1: safety factor 1.65 on yield"),
            new(MaterialFamily.Steel, 1, 1.67, "AISC 360, F1 and G1: safety factor 1.67"),
        ]);

    /// <summary>US strength design: factored loads against factored strengths.</summary>
    public static DesignBasis UsStrength { get; } = new(
        DesignBasisKind.UsStrength,
        "US strength design",
        "ASCE 7-16, 2.3.2: 2.0 in coastal zones, 1.0 elsewhere; 1.4 on a fluid of known greatest height; 1.6 on a line load",
        Inland: new(FloodSide: 1.0, ProtectedSide: 1.0, BrimFull: 1.4, Debris: 1.0, Wind: 1.0, Line: 1.6),
        Coastal: new(FloodSide: 2.0, ProtectedSide: 2.0, BrimFull: 2.0, Debris: 2.0, Wind: 1.0, Line: 1.6),
        [
            new(MaterialFamily.Aluminium, 0.90, 1, "Aluminum Design Manual 2020, F.1 and G.1: resistance factor 0.90 (from memory)"),
            new(MaterialFamily.Steel, 0.90, 1, "AISC 360, F1 and G1: resistance factor 0.90"),
        ]);

    /// <summary>Eurocode partial factors.</summary>
    public static DesignBasis Eurocode { get; } = new(
        DesignBasisKind.Eurocode,
        "Eurocode",
        "EN 1990, Tables A1.2(B) and A1.3 (from memory): 1.5 variable, 1.0 favourable, 1.35 where geometry limits the level, 1.0 accidental",
        Inland: new(FloodSide: 1.5, ProtectedSide: 1.0, BrimFull: 1.35, Debris: 1.0, Wind: 1.5, Line: 1.5),
        Coastal: new(FloodSide: 1.5, ProtectedSide: 1.0, BrimFull: 1.35, Debris: 1.0, Wind: 1.5, Line: 1.5),
        [
            new(MaterialFamily.Aluminium, 1, 1.10, "EN 1999-1-1, 6.1.3: partial factor 1.10 (from memory)"),
            new(MaterialFamily.Steel, 1, 1.00, "EN 1993-1-1, 6.1: partial factor 1.00 (from memory)"),
            new(MaterialFamily.Timber, 0.70, 1.30,
                "EN 1995-1-1, 2.4.1 and Table 3.1: k_mod 0.70 (service class 3, short term), partial factor 1.30"),
        ]);

    /// <summary>All of them, in the order in which they are offered.</summary>
    public static ValueList<DesignBasis> Standard { get; } = [AllowableStress, UsStrength, Eurocode];
}
