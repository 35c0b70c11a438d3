namespace FloodPanel.Calculation.Guides;

/// <summary>Stresses in the legs of a guide.</summary>
public static class GuideStrength
{
    /// <summary>σ = 6·n·l/t², bending stress at the root of the lip, a cantilever [Pa].</summary>
    /// <param name="line">n, load per length of guide [N/m].</param>
    /// <param name="lever">l, from the load to the root [m], ≥ 0.</param>
    /// <param name="thickness">t, of the lip [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: statics. Limits: elastic; a fillet at the root does not shorten the lever.</remarks>
    public static double LipBending(double line, double lever, double thickness)
    {
        Guard.Finite(line);
        Guard.NonNegative(lever);
        Guard.Positive(thickness);

        return 6 * line * lever / (thickness * thickness);
    }

    /// <summary>τ = 1.5·n/t, greatest shear stress in the lip [Pa].</summary>
    /// <param name="line">n, load per length of guide [N/m].</param>
    /// <param name="thickness">t, of the lip [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: statics, solid rectangle.</remarks>
    public static double LipShear(double line, double thickness)
    {
        Guard.Finite(line);
        Guard.Positive(thickness);

        return 1.5 * line / thickness;
    }

    /// <summary>σ = 6·M/(b_eff·t_b²), bending stress in the base beside one fastener [Pa].</summary>
    /// <param name="moment">M, moment that belongs to the fastener [N·m].</param>
    /// <param name="width">b_eff, length of guide that bends [m], > 0.</param>
    /// <param name="thickness">t_b, of the base [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: statics; the width by a spread at 45° from the fastener, as AISC Design Guide 1, 3rd ed., Example 4.7-3.</remarks>
    public static double BaseBending(double moment, double width, double thickness)
    {
        Guard.Finite(moment);
        Guard.Positive(width);
        Guard.Positive(thickness);

        return 6 * moment / (width * thickness * thickness);
    }
}
