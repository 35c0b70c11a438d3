using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>Fillet welds all round a post, per length of weld.</summary>
public static class FilletWelds
{
    /// <summary>Throat over leg of a fillet with equal legs, as AISC prints it [-].</summary>
    public const double Throat = 0.707;

    /// <summary>AISC 360 J2.4: Ω and φ of a fillet weld [-].</summary>
    internal const double SteelSafety = 2.00, SteelResistance = 0.75;

    /// <summary>Aluminum Design Manual J.2: Ω (read) and φ (from memory) of a weld [-].</summary>
    internal const double AluminiumSafety = 1.95, AluminiumResistance = 0.75;

    /// <summary>γ_M2 of EN 1993-1-8, 2.2 and γ_Mw of EN 1999-1-1, Table 8.1 (both from memory) [-].</summary>
    internal const double PartialFactor = 1.25;

    /// <summary>Nominal strength of a fillet per length, r_n = 0.60·F_EXX·0.707·w·k_ds.</summary>
    /// <param name="leg">w [m], > 0.</param>
    /// <param name="electrode">F_EXX [Pa], > 0.</param>
    /// <param name="directional">k_ds = 1.0 + 0.50·sin^1.5(θ) [-], 1 along the weld to 1.5 across it.</param>
    /// <returns>r_n [N/m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: AISC 360-22, J2.4. Limits: no increase on the ends of rectangular tubes in tension.</remarks>
    public static double NominalSteelUs(double leg, double electrode, double directional)
    {
        Guard.Positive(leg);
        Guard.Positive(electrode);
        Guard.InRange(directional, 1, 1.5);

        return 0.60 * electrode * Throat * leg * directional;
    }

    /// <summary>Allowable or design strength of a fillet per length: <see cref="NominalSteelUs"/> over 2.00, or times 0.75.</summary>
    /// <param name="nominal">r_n [N/m], ≥ 0.</param>
    /// <param name="kind">Allowable stress or US strength.</param>
    /// <returns>[N/m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">The strength is negative, or the basis is another one.</exception>
    /// <remarks>Source: AISC 360-22, J2.4.</remarks>
    public static double SteelUs(double nominal, DesignBasisKind kind)
    {
        Guard.NonNegative(nominal);

        return kind switch
        {
            DesignBasisKind.AllowableStress => nominal / SteelSafety,
            DesignBasisKind.UsStrength => SteelResistance * nominal,
            _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "is not a US basis"),
        };
    }

    /// <summary>β_w, correlation factor by yield strength.</summary>
    /// <param name="yield">f_y of the parts [Pa], > 0.</param>
    /// <returns>0.80 to 235 MPa, 0.85 to 275, 0.90 to 355, 1.0 above [-].</returns>
    /// <exception cref="ArgumentOutOfRangeException">The strength is not above zero.</exception>
    /// <remarks>Source: EN 1993-1-8, Table 4.1 (from memory).</remarks>
    public static double Correlation(double yield)
    {
        Guard.Positive(yield);

        return yield <= 235e6 ? 0.80 : yield <= 275e6 ? 0.85 : yield <= 355e6 ? 0.90 : 1.0;
    }

    /// <summary>Design strength of a fillet per length in any direction, F_w,Rd = a·f_u/(√3·β_w·γ_M2).</summary>
    /// <param name="throat">a [m], > 0.</param>
    /// <param name="ultimate">f_u of the weaker part [Pa], > 0.</param>
    /// <param name="correlation">β_w [-], > 0.</param>
    /// <returns>F_w,Rd [N/m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: EN 1993-1-8, 4.5.3.3, simplified method (from memory).</remarks>
    public static double SteelEurocode(double throat, double ultimate, double correlation)
    {
        Guard.Positive(throat);
        Guard.Positive(ultimate);
        Guard.Positive(correlation);

        return throat * ultimate / (Math.Sqrt(3) * correlation * PartialFactor);
    }

    /// <summary>Comparison stress of a fillet in its throat, √(2·q_n² + 3·q_v²)/a.</summary>
    /// <param name="across">q_n, force per length across the weld, normal to the plate [N/m].</param>
    /// <param name="along">q_v, force per length along the weld [N/m].</param>
    /// <param name="throat">a [m], > 0.</param>
    /// <returns>[Pa], to be compared with f_w/γ_Mw.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// Source: EN 1999-1-1, 8.6.3.3: √(σ² + 3·(τ² + τ_l²)) with σ = τ = q_n/(√2·a) in a throat at 45° and τ_l = q_v/a (from memory).
    /// </remarks>
    public static double ThroatStress(double across, double along, double throat)
    {
        Guard.Finite(across);
        Guard.Finite(along);
        Guard.Positive(throat);

        return Math.Sqrt(2 * across * across + 3 * along * along) / throat;
    }

    /// <summary>Nominal strength of an aluminium fillet per length in US practice, min(0.6·0.85·F_f·0.707·w, 0.6·F_tuw·w).</summary>
    /// <param name="leg">w [m], > 0.</param>
    /// <param name="filler">F_f, tensile ultimate strength of the filler [Pa], > 0.</param>
    /// <param name="beside">F_tuw, of the parts beside the weld [Pa], > 0.</param>
    /// <returns>[N/m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: Aluminum Design Manual 2020, J.2; both taken in shear, which is safe across the weld.</remarks>
    public static double NominalAluminiumUs(double leg, double filler, double beside)
    {
        Guard.Positive(leg);
        Guard.Positive(filler);
        Guard.Positive(beside);

        return Math.Min(0.6 * 0.85 * filler * Throat * leg, 0.6 * beside * leg);
    }

    /// <summary>W_line, section modulus of a weld line round a rectangle, d²/3 + b·d.</summary>
    /// <param name="width">b, across the opening [m], > 0.</param>
    /// <param name="depth">d, in the direction of the water [m], > 0.</param>
    /// <returns>W_line per unit of throat [m²].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not above zero.</exception>
    /// <remarks>Source: statics of lines, I_line = d³/6 + b·d²/2.</remarks>
    public static double RectangleModulus(double width, double depth)
    {
        Guard.Positive(width);
        Guard.Positive(depth);

        return depth * depth / 3 + width * depth;
    }
}
