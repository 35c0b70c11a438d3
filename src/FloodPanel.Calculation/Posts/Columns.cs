namespace FloodPanel.Calculation.Posts;

/// <summary>Nominal buckling stress of a straight strut in compression, before the factor of the design basis. All from memory of the standards.</summary>
public static class Columns
{
    /// <summary>1 ksi, which the aluminium formulas are written in [Pa].</summary>
    public const double Ksi = 6894757.293168361;

    /// <summary>F_cr of AISC 360, E3.</summary>
    /// <param name="yield">F_y [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="slenderness">K·L/r [-], > 0.</param>
    /// <returns>0.658^(F_y/F_e)·F_y up to F_y/F_e = 2.25, else 0.877·F_e; F_e = π²·E/(K·L/r)² [Pa].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: AISC 360-22, E3 (from memory). Limits: no slender walls.</remarks>
    public static double SteelUs(double yield, double modulus, double slenderness)
    {
        var elastic = Euler(modulus, slenderness);
        Guard.Positive(yield);

        return yield / elastic <= 2.25 ? Math.Pow(0.658, yield / elastic) * yield : 0.877 * elastic;
    }

    /// <summary>χ of the European buckling curves.</summary>
    /// <param name="relative">λ, relative slenderness √(f_y/σ_cr) [-], ≥ 0.</param>
    /// <param name="imperfection">α [-], > 0.</param>
    /// <param name="plateau">λ_0, up to which nothing is lost [-], ≥ 0.</param>
    /// <returns>χ = 1/(φ + √(φ² − λ²)) ≤ 1, φ = (1 + α·(λ − λ_0) + λ²)/2 [-].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: EN 1993-1-1, 6.3.1.2 and EN 1999-1-1, 6.3.1.2 (both from memory).</remarks>
    public static double Reduction(double relative, double imperfection, double plateau)
    {
        Guard.NonNegative(relative);
        Guard.Positive(imperfection);
        Guard.NonNegative(plateau);

        var phi = (1 + imperfection * (relative - plateau) + relative * relative) / 2;
        return Math.Min(1, 1 / (phi + Math.Sqrt(phi * phi - relative * relative)));
    }

    /// <summary>F_n of the Aluminum Design Manual, E.3.</summary>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="slenderness">λ = K·L/r [-], > 0.</param>
    /// <returns>(B_c − D_c·λ)·(0.85 + 0.15·(C_c − λ)/C_c) ≤ F_cy below C_c, else 0.85·π²·E/λ² [Pa].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: Aluminum Design Manual 2020, E.2 and B.4 (from memory). Limits: tempers T5 to T9, no slender walls.</remarks>
    public static double AluminiumUs(double yield, double modulus, double slenderness)
    {
        var (intercept, slope, limit) = BucklingConstants(yield, modulus);
        Guard.Positive(slenderness);

        return slenderness < limit
            ? Math.Min(yield, (intercept - slope * slenderness) * (0.85 + 0.15 * (limit - slenderness) / limit))
            : 0.85 * Euler(modulus, slenderness);
    }

    /// <summary>B_c, D_c and C_c for members of tempers T5 to T9: B_c = F·(1 + √(F/2250 ksi)), D_c = (B_c/10)·√(B_c/E), C_c = 0.41·B_c/D_c.</summary>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: Aluminum Design Manual 2020, B.4 (from memory); reproduces the limit 78 that Part VII, Example 4 prints for 6063-T6.</remarks>
    public static (double Intercept, double Slope, double Limit) BucklingConstants(double yield, double modulus)
    {
        Guard.Positive(yield);
        Guard.Positive(modulus);

        var intercept = yield * (1 + Math.Sqrt(yield / (2250 * Ksi)));
        var slope = intercept / 10 * Math.Sqrt(intercept / modulus);
        return (intercept, slope, 0.41 * intercept / slope);
    }

    /// <summary>σ_cr = π²·E/λ², Euler's stress [Pa].</summary>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="slenderness">λ = K·L/r [-], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    public static double Euler(double modulus, double slenderness)
    {
        Guard.Positive(modulus);
        Guard.Positive(slenderness);

        return Math.PI * Math.PI * modulus / (slenderness * slenderness);
    }
}
