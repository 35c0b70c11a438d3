using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>Bearing strength of the concrete under a plate.</summary>
public static class ConcreteBearing
{
    /// <summary>φ_c of AISC 360 J8, strength design [-].</summary>
    private const double ResistanceFactor = 0.65;

    /// <summary>Ω_c of AISC 360 J8, allowable stress [-].</summary>
    private const double SafetyFactor = 2.31;

    /// <summary>γ_c of EN 1992-1-1, 2.4.2.4 (from memory) [-].</summary>
    private const double PartialFactor = 1.5;

    /// <summary>Greatest part that spreading may add: √(A2/A1) in AISC 360 J8 and in EN 1992-1-1, 6.7 (from memory) [-].</summary>
    private const double MostSpreadUs = 2, MostSpreadEurocode = 3;

    /// <summary>f_p, greatest design bearing pressure.</summary>
    /// <param name="strength">f'c or f_ck [Pa], > 0.</param>
    /// <param name="areaRatio">A2/A1 [-], at least 1.</param>
    /// <param name="kind">The design basis.</param>
    /// <returns>f_p [Pa].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// AISC 360 J8: 0.85·f'c·√(A2/A1) ≤ 1.7·f'c, times 0.65 or over 2.31. EN 1993-1-8, 6.2.5(7): f_jd = 2/3·α·f_ck/γ_c,
    /// α = √(A2/A1) ≤ 3 (from memory). Limits: grout no weaker than the concrete.
    /// </remarks>
    public static double Strength(double strength, double areaRatio, DesignBasisKind kind)
    {
        Guard.Positive(strength);
        Guard.InRange(areaRatio, 1, double.MaxValue);

        var spread = Math.Sqrt(areaRatio);
        return kind switch
        {
            DesignBasisKind.AllowableStress => 0.85 * strength * Math.Min(spread, MostSpreadUs) / SafetyFactor,
            DesignBasisKind.UsStrength => ResistanceFactor * 0.85 * strength * Math.Min(spread, MostSpreadUs),
            DesignBasisKind.Eurocode => 2.0 / 3 * strength * Math.Min(spread, MostSpreadEurocode) / PartialFactor,
            _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "has no bearing strength here"),
        };
    }

    /// <summary>The formula of <see cref="Strength"/> in the symbols f_c and a_c = A2/A1.</summary>
    internal static string Formula(DesignBasisKind kind) => kind switch
    {
        DesignBasisKind.AllowableStress => "0.85·f_c·min(√(a_c), 2)/2.31",
        DesignBasisKind.UsStrength => "0.65·0.85·f_c·min(√(a_c), 2)",
        _ => "2/3·f_c·min(√(a_c), 3)/1.5",
    };

    /// <summary>Where it stands.</summary>
    internal static string Source(DesignBasisKind kind) => kind == DesignBasisKind.Eurocode
        ? "EN 1993-1-8, 6.2.5(7) with EN 1992-1-1, 6.7 (from memory)"
        : "AISC 360, J8";
}
