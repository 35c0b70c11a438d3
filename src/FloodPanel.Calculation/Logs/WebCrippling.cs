namespace FloodPanel.Calculation.Logs;

/// <summary>What one web carries where the end of a log bears on its seat.</summary>
public static class WebCrippling
{
    /// <summary>C_w1, inside a span [m]: 5.4 in.</summary>
    public const double InsideReach = 5.4 * 0.0254;

    /// <summary>C_w2, at an end [m]: 1.3 in.</summary>
    public const double EndReach = 1.3 * 0.0254;

    /// <summary>C_w3 [m]: 0.4 in.</summary>
    public const double CornerReach = 0.4 * 0.0254;

    /// <summary>Nominal crippling of a flat web of aluminium, square to its seat: 1.2·C_wa·(N + C_w2)/(C_w3 + R_i) at an end, C_wa·(N + C_w1)/(C_w3 + R_i) inside a span.</summary>
    /// <param name="thickness">t_w [m], > 0.</param>
    /// <param name="yield">F_cy [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="bearing">N, length of bearing [m], > 0.</param>
    /// <param name="radius">R_i, radius of the inner corner [m], ≥ 0.</param>
    /// <param name="isEnd">True at an end.</param>
    /// <returns>R_n of one web [N].</returns>
    /// <remarks>Source: Aluminum Design Manual, J (from memory), C_wa = t²·(0.46·F_cy + 0.02·√(E·F_cy)).</remarks>
    public static double Aluminium(double thickness, double yield, double modulus, double bearing, double radius, bool isEnd)
    {
        Guard.Positive(thickness);
        Guard.Positive(yield);
        Guard.Positive(modulus);
        Guard.Positive(bearing);
        Guard.NonNegative(radius);
        var perLength = thickness * thickness * (0.46 * yield + 0.02 * Math.Sqrt(modulus * yield)) / (CornerReach + radius);
        return isEnd ? 1.2 * perLength * (bearing + EndReach) : perLength * (bearing + InsideReach);
    }

    /// <summary>k_F = min(2 + 6·s_s/h_w, 6), buckling factor of a web loaded at an unstiffened end.</summary>
    /// <param name="bearing">s_s, length of bearing [m], > 0.</param>
    /// <param name="depth">h_w [m], > 0.</param>
    /// <remarks>Source: EN 1993-1-5, Figure 6.1 type (c) (from memory); EN 1999-1-1, 6.7.5 has the same.</remarks>
    public static double BucklingFactor(double bearing, double depth)
    {
        Guard.Positive(bearing);
        Guard.Positive(depth);
        return Math.Min(2 + 6 * bearing / depth, 6);
    }

    /// <summary>Length of web that yields at an unstiffened end, the least of three.</summary>
    /// <param name="reach">l_e = min(k_F·E·t_w²/(2·f_y·h_w), s_s) [m].</param>
    /// <param name="bearing">s_s [m], > 0.</param>
    /// <param name="flange">t_f [m], > 0.</param>
    /// <param name="ratio">m₁ = b_f/t_w, width of flange that helps one web over its thickness [-].</param>
    /// <returns>l_y [m].</returns>
    /// <remarks>Source: EN 1993-1-5, 6.5, Eqs. (6.10) to (6.12) (from memory); m₂ = 0, which is safe.</remarks>
    public static double YieldLength(double reach, double bearing, double flange, double ratio)
    {
        var local = reach / flange;
        return Math.Min(
            Math.Min(reach + flange * Math.Sqrt(ratio / 2 + local * local), reach + flange * Math.Sqrt(ratio)),
            bearing + 2 * flange * (1 + Math.Sqrt(ratio)));
    }

    /// <summary>χ_F = min(0.5/λ_F, 1), reduction for buckling of the web, λ_F = √(l_y·t_w·f_y/F_cr).</summary>
    /// <param name="slenderness">λ_F [-], > 0.</param>
    /// <remarks>Source: EN 1993-1-5, 6.4 (from memory).</remarks>
    public static double Reduction(double slenderness)
    {
        Guard.Positive(slenderness);
        return Math.Min(0.5 / slenderness, 1);
    }

    /// <summary>Nominal yielding of a web of steel at an end: F_y·t_w·(2.5·k + l_b).</summary>
    /// <param name="thickness">t_w [m], > 0.</param>
    /// <param name="flange">k, to the toe of the fillet; the flange thickness of a sharp corner [m], > 0.</param>
    /// <param name="yield">F_y [Pa], > 0.</param>
    /// <param name="bearing">l_b [m], > 0.</param>
    /// <returns>R_n of one web [N].</returns>
    /// <remarks>Source: AISC 360, J10.2, Eq. (J10-3) (from memory).</remarks>
    public static double SteelYielding(double thickness, double flange, double yield, double bearing) =>
        yield * thickness * (2.5 * flange + bearing);

    /// <summary>Nominal crippling of a web of steel at an end: 0.40·t_w²·(1 + a·(t_w/t_f)^1.5)·√(E·F_y·t_f/t_w).</summary>
    /// <param name="thickness">t_w [m], > 0.</param>
    /// <param name="flange">t_f [m], > 0.</param>
    /// <param name="yield">F_y [Pa], > 0.</param>
    /// <param name="modulus">E [Pa], > 0.</param>
    /// <param name="spread">a, see <see cref="SteelSpread"/> [-].</param>
    /// <returns>R_n of one web [N].</returns>
    /// <remarks>Source: AISC 360, J10.3, Eqs. (J10-5a) and (J10-5b) (from memory).</remarks>
    public static double SteelCrippling(double thickness, double flange, double yield, double modulus, double spread) =>
        0.40 * thickness * thickness * (1 + spread * Math.Pow(thickness / flange, 1.5))
        * Math.Sqrt(modulus * yield * flange / thickness);

    /// <summary>a = 3·l_b/d up to l_b/d = 0.2, beyond it 4·l_b/d − 0.2.</summary>
    /// <param name="bearing">l_b [m], > 0.</param>
    /// <param name="depth">d, whole depth of the section [m], > 0.</param>
    /// <remarks>Source: AISC 360, J10.3 (from memory).</remarks>
    public static double SteelSpread(double bearing, double depth) =>
        bearing / depth <= 0.2 ? 3 * bearing / depth : 4 * bearing / depth - 0.2;
}
