namespace FloodPanel.Calculation.Sections;

/// <summary>Buckling constants of flat parts of aluminium, tempers T5 to T9, or any temper beside a weld.</summary>
/// <remarks>
/// Source: Aluminum Design Manual 2020, B.4 (formulas reproduce the limits printed in Part VII; those beside a weld from memory).
/// Stresses in the formulas are in ksi; κ = 1 ksi makes them free of units.
/// </remarks>
public static class AluminiumBuckling
{
    /// <summary>κ, 1 ksi [Pa].</summary>
    public const double Ksi = 4.4482216152605e3 / (0.0254 * 0.0254);

    /// <summary>The range of slenderness that a part falls into.</summary>
    public enum Range
    {
        /// <summary>Yields before it buckles.</summary>
        Yield,

        /// <summary>Buckles inelastically.</summary>
        Inelastic,

        /// <summary>Carries on after elastic buckling.</summary>
        PostBuckling,
    }

    /// <summary>A line of inelastic buckling B − k·D·λ between yield and post-buckling.</summary>
    /// <param name="Plateau">F at low slenderness [Pa].</param>
    /// <param name="Intercept">B [Pa].</param>
    /// <param name="Slope">D [Pa].</param>
    /// <param name="Edge">k, 1.6 for two edges held, 5.0 for one, m = 0.65 for a web in bending [-].</param>
    /// <param name="K1">k₁ [-].</param>
    /// <param name="K2">k₂ [-].</param>
    /// <param name="Modulus">E [Pa].</param>
    public readonly record struct Line(double Plateau, double Intercept, double Slope, double Edge, double K1, double K2, double Modulus)
    {
        /// <summary>λ₁ = (B − F)/(k·D), up to which the part yields [-].</summary>
        public double Lower => (Intercept - Plateau) / (Edge * Slope);

        /// <summary>λ₂ = k₁·B/(k·D), from which it carries on after buckling [-].</summary>
        public double Upper => K1 * Intercept / (Edge * Slope);

        /// <summary>The range of a slenderness.</summary>
        /// <param name="slenderness">λ = b/t [-], ≥ 0.</param>
        public Range At(double slenderness) =>
            slenderness <= Lower ? Range.Yield : slenderness < Upper ? Range.Inelastic : Range.PostBuckling;

        /// <summary>Nominal stress [Pa]: F, B − k·D·λ or k₂·√(B·E)/(k·λ).</summary>
        /// <param name="slenderness">λ = b/t [-], ≥ 0.</param>
        public double Stress(double slenderness) => At(slenderness) switch
        {
            Range.Yield => Plateau,
            Range.Inelastic => Intercept - Edge * Slope * slenderness,
            _ => K2 * Math.Sqrt(Intercept * Modulus) / (Edge * slenderness),
        };
    }

    /// <summary>Uniform compression of a flat part, B.5.4.1 and B.5.4.2.</summary>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="isOutstand">True when one edge is held only.</param>
    /// <param name="isWelded">True beside a weld.</param>
    public static Line Compression(double yield, double modulus, bool isOutstand, bool isWelded)
    {
        Guard.Positive(yield);
        Guard.Positive(modulus);
        var edge = isOutstand ? 5.0 : 1.6;
        if (isWelded)
        {
            var welded = yield * (1 + Math.Cbrt(yield / (440 * Ksi)));
            return new(yield, welded, welded / 20 * Math.Sqrt(6 * welded / modulus), edge, 0.50, 2.04, modulus);
        }

        var intercept = yield * (1 + Math.Cbrt(yield / (1500 * Ksi)));
        return new(yield, intercept, intercept / 10 * Math.Sqrt(intercept / modulus), edge, 0.35, 2.27, modulus);
    }

    /// <summary>A web in bending in its own plane, symmetrical, B.5.5.1.</summary>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    public static Line WebBending(double yield, double modulus)
    {
        Guard.Positive(yield);
        Guard.Positive(modulus);
        var intercept = 1.3 * yield * (1 + Math.Cbrt(yield / (340 * Ksi)));
        return new(1.5 * yield, intercept, intercept / 20 * Math.Sqrt(6 * intercept / modulus), 0.65, 0.50, 2.04, modulus);
    }

    /// <summary>A web in shear, G.2: F_sy = 0.6·F_ty, then B_s − 1.25·D_s·λ, then π²·E/(1.25·λ)².</summary>
    /// <param name="slenderness">λ = h_w/t_w [-], ≥ 0.</param>
    /// <param name="yield">F_ty [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <returns>Nominal shear stress F_s [Pa].</returns>
    public static double WebShear(double slenderness, double yield, double modulus)
    {
        Guard.NonNegative(slenderness);
        Guard.Positive(yield);
        Guard.Positive(modulus);
        var shear = 0.6 * yield;
        var intercept = shear * (1 + Math.Cbrt(shear / (800 * Ksi)));
        var slope = intercept / 10 * Math.Sqrt(intercept / modulus);
        var lower = (intercept - shear) / (1.25 * slope);
        var upper = 0.41 * intercept / slope / 1.25;
        return slenderness <= lower ? shear
            : slenderness < upper ? intercept - 1.25 * slope * slenderness
            : Math.PI * Math.PI * modulus / (1.25 * slenderness * 1.25 * slenderness);
    }
}
