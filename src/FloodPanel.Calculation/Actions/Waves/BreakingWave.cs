namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>A wave that breaks on a vertical wall with dry space behind it.</summary>
/// <remarks>
/// The published total per metre, F = 1.1·C_p·γ·d_s² + 2.4·γ·d_s², is the area of two triangles: water standing 2.2·d_s
/// above the ground, and a dynamic pressure that rises from nothing at the ground to C_p·γ·d_s at still water and falls
/// to nothing 2.2·d_s above the ground. Integrating them over the barrier gives the published total for a wall that
/// reaches the crest, and less for a lower one.
/// </remarks>
public static class BreakingWave
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "ASCE 7, 5.4.4.2; FEMA P-55 (2011), Eq. 8.6, after Walton et al. 1989 (C_p of categories I, II and IV from memory)";

    /// <summary>Height of the reflected crest above the ground over the still-water depth [-].</summary>
    public const double CrestRatio = 2.2;

    /// <summary>H_b/d_s, greatest wave height over the still-water depth [-] (ASCE 7, Eq. 5.4-2, from memory).</summary>
    public const double HeightRatio = 0.78;

    /// <summary>C_p, dynamic pressure coefficient by risk category [-]: 1.6, 2.8, 3.2, 3.5.</summary>
    /// <param name="riskCategory">Risk category of the building [-], 1 to 4.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such category.</exception>
    /// <remarks>Source: ASCE 7, Table 5.4-1 (3.2 confirmed in a secondary text, the others from memory).</remarks>
    public static double PressureCoefficient(int riskCategory) => riskCategory switch
    {
        1 => 1.6,
        2 => 2.8,
        3 => 3.2,
        4 => 3.5,
        _ => throw new ArgumentOutOfRangeException(nameof(riskCategory), riskCategory, "is not 1 to 4"),
    };

    /// <summary>The pressure of the wave beyond that of still water, from the ground up, unfactored.</summary>
    /// <param name="coefficient">C_p, dynamic pressure coefficient [-], > 0.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <param name="depth">d_s, still-water depth above outside ground [m], > 0.</param>
    /// <param name="ground">Height of outside ground above the sill [m]; mostly 0 or below.</param>
    /// <returns>From ground to still water, and from there to the crest; with still water they make up the published total.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// Limits: head-on approach, vertical wall, dry behind. On a raked face and for oblique waves the load is not
    /// reduced, which is safe.
    /// </remarks>
    public static (PressurePiece ToStillWater, PressurePiece ToCrest) Pressure(
        double coefficient, double unitWeight, double depth, double ground)
    {
        Guard.Positive(coefficient);
        Guard.Positive(unitWeight);
        Guard.Positive(depth);
        Guard.Finite(ground);

        var standing = (CrestRatio - 1) * unitWeight * depth;
        var peak = standing + coefficient * unitWeight * depth;
        return (
            new(ground, ground + depth, standing, peak, 1),
            new(ground + depth, ground + CrestRatio * depth, peak, 0, 1));
    }
}
