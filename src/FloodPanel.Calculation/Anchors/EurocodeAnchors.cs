using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Characteristic resistances of anchors in concrete by EN 1992-4 (from memory), newtons and millimetres in its constants.</summary>
public static class EurocodeAnchors
{
    /// <summary>1 mm [m].</summary>
    public const double Millimetre = 1e-3;

    /// <summary>1 MPa [Pa].</summary>
    public const double Megapascal = 1e6;

    /// <summary>Greatest f_uk for which k_6 holds: 1000 MPa (7.2.2.3.1) [Pa].</summary>
    public const double MostUltimate = 1000 * Megapascal;

    /// <summary>γ_c [-].</summary>
    public const double ConcreteFactor = 1.5;

    /// <summary>γ_Ms in tension: 1.2·f_uk/f_yk, at least 1.4 (Table 4.1) [-].</summary>
    /// <param name="yield">f_yk [Pa], > 0.</param>
    /// <param name="ultimate">f_uk [Pa], > 0.</param>
    public static double SteelFactorInTension(double yield, double ultimate) => Math.Max(1.2 * ultimate / yield, 1.4);

    /// <summary>γ_Ms in shear: f_uk/f_yk, at least 1.25, for f_uk ≤ 800 MPa and f_yk/f_uk ≤ 0.8; else 1.5 (Table 4.1) [-].</summary>
    /// <param name="yield">f_yk [Pa], > 0.</param>
    /// <param name="ultimate">f_uk [Pa], > 0.</param>
    public static double SteelFactorInShear(double yield, double ultimate) =>
        ultimate <= 800e6 * (1 + 1e-9) && yield / ultimate <= 0.8 + 1e-9 ? Math.Max(ultimate / yield, 1.25) : 1.5;

    /// <summary>k_1: 7.7 cracked and 11.0 uncracked post-installed, 8.9 and 12.7 cast in (7.2.1.4; the approval of the product governs) [-].</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double ConeConstant(AnchorKind kind, bool cracked) => (kind == AnchorKind.PostInstalled, cracked) switch
    {
        (true, true) => 7.7,
        (true, false) => 11.0,
        (false, true) => 8.9,
        (false, false) => 12.7,
    };

    /// <summary>N⁰_Rk,c = k_1·√f_ck·h_ef^1.5, cone of one anchor far from edges [N].</summary>
    /// <param name="constant">k_1 [-], > 0.</param>
    /// <param name="depth">h_ef [m], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    public static double BasicCone(double constant, double depth, double concrete)
    {
        Guard.Positive(constant);
        Guard.Positive(depth);
        Guard.Positive(concrete);

        return constant * Math.Sqrt(concrete / Megapascal) * Math.Pow(depth / Millimetre, 1.5);
    }

    /// <summary>N_Rk,c = N⁰_Rk,c·(A/A⁰)·ψ_s·ψ_ec, before ψ_re; ψ_M is taken as 1, which is safe (7.2.1.4) [N].</summary>
    /// <param name="body">The concrete that is torn out.</param>
    /// <param name="constant">k_1 [-], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    /// <param name="eccentricity">e_N [m], ≥ 0.</param>
    public static double Cone(BreakoutBody body, double constant, double concrete, double eccentricity) =>
        body.Area / body.SingleArea * body.EdgeFactor / (1 + 2 * eccentricity / (3 * body.Depth))
        * BasicCone(constant, body.Depth, concrete);

    /// <summary>ψ_re = 0.5 + h_ef/200 mm ≤ 1, dense reinforcement assumed (7.2.1.4) [-].</summary>
    /// <param name="depth">h_ef [m], > 0.</param>
    public static double ShellFactor(double depth) => Math.Min(1, 0.5 + depth / Millimetre / 200);

    /// <summary>N_Rk,p = k_2·A_h·f_ck of a headed anchor, k_2 7.5 cracked, 10.5 uncracked (7.2.1.5) [N].</summary>
    /// <param name="headArea">A_h [m²], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double HeadedPullout(double headArea, double concrete, bool cracked)
    {
        Guard.Positive(headArea);
        Guard.Positive(concrete);

        return (cracked ? 7.5 : 10.5) * headArea * concrete;
    }

    /// <summary>N⁰_Rk,cb = k_5·c_1·√A_h·√f_ck, blow-out of one headed anchor, k_5 8.7 cracked, 12.2 uncracked (7.2.1.8) [N].</summary>
    /// <param name="edge">c_1 [m], > 0.</param>
    /// <param name="headArea">A_h [m²], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double BlowOut(double edge, double headArea, double concrete, bool cracked)
    {
        Guard.Positive(edge);
        Guard.Positive(headArea);
        Guard.Positive(concrete);

        return (cracked ? 8.7 : 12.2) * (edge / Millimetre) * (Math.Sqrt(headArea) / Millimetre) * Math.Sqrt(concrete / Megapascal);
    }

    /// <summary>k_6·k_7: 0.6 up to 500 MPa, 0.5 above; times 0.8 where the steel is brittle (7.2.2.3.1) [-].</summary>
    /// <param name="ultimate">f_uk [Pa], > 0.</param>
    /// <param name="ductile">True where the steel stretches before it breaks.</param>
    public static double SteelShearShare(double ultimate, bool ductile) => (ultimate <= 500e6 ? 0.6 : 0.5) * (ductile ? 1.0 : 0.8);

    /// <summary>V⁰_Rk,c = k_9·d^α·l_f^β·√f_ck·c_1^1.5, α = 0.1·√(l_f/c_1), β = 0.1·(d/c_1)^0.2 (7.2.2.5) [N].</summary>
    /// <param name="edge">c_1 [m], > 0.</param>
    /// <param name="bearing">l_f, h_ef but at most 12·d [m], > 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double BasicEdge(double edge, double bearing, double diameter, double concrete, bool cracked)
    {
        Guard.Positive(edge);
        Guard.Positive(bearing);
        Guard.Positive(diameter);
        Guard.Positive(concrete);

        var (alpha, beta) = EdgeExponents(edge, bearing, diameter);
        return (cracked ? 1.7 : 2.4) * Math.Pow(diameter / Millimetre, alpha) * Math.Pow(bearing / Millimetre, beta)
            * Math.Sqrt(concrete / Megapascal) * Math.Pow(edge / Millimetre, 1.5);
    }

    /// <summary>α and β of the edge strength [-].</summary>
    /// <param name="edge">c_1 [m], > 0.</param>
    /// <param name="bearing">l_f [m], > 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    public static (double Alpha, double Beta) EdgeExponents(double edge, double bearing, double diameter) =>
        (0.1 * Math.Sqrt(bearing / edge), 0.1 * Math.Pow(diameter / edge, 0.2));

    /// <summary>V_Rk,c = V⁰_Rk,c·(A/A⁰)·ψ_s·ψ_h, load square to the edge, no eccentricity, no edge reinforcement (7.2.2.5) [N].</summary>
    /// <param name="body">The concrete that breaks off.</param>
    /// <param name="bearing">l_f [m], > 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    /// <param name="concrete">f_ck [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double Edge(EdgeBody body, double bearing, double diameter, double concrete, bool cracked) =>
        body.Area / body.SingleArea * body.SideFactor * body.ThicknessFactor
        * BasicEdge(body.EdgeDistance, bearing, diameter, concrete, cracked);

    /// <summary>l_f, length that bears in shear: h_ef, at most 12·d up to 24 mm of diameter, else max(8·d, 300 mm) (7.2.2.5) [m].</summary>
    /// <param name="depth">h_ef [m], > 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    public static double BearingLength(double depth, double diameter) =>
        Math.Min(depth, IsThin(diameter) ? 12 * diameter : Math.Max(8 * diameter, 300 * Millimetre));

    /// <summary>ψ_s,Nb = 0.7 + 0.3·c_2/(2·c_1) ≤ 1 near a corner (7.2.1.8) [-].</summary>
    /// <param name="edge">c_1, the nearer edge [m], > 0.</param>
    /// <param name="other">c_2, the edge square to it [m]; null when far.</param>
    public static double CornerFactor(double edge, double? other) => other is { } square ? Math.Min(1, 0.7 + 0.3 * square / (2 * edge)) : 1;

    /// <summary>True where shear has no lever arm: no grout, or at most half a diameter of at least 30 MPa (6.2.2.3).</summary>
    /// <param name="grout">Thickness of the grout [m], ≥ 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    /// <param name="strength">Of the grout, taken as that of the concrete [Pa], > 0.</param>
    public static bool BearsDirectly(double grout, double diameter, double strength) =>
        grout == 0 || (grout <= diameter / 2 && strength >= 30 * Megapascal);

    internal static string BearingFormula(double diameter) => IsThin(diameter) ? "min(h_ef, 12·d)" : "min(h_ef, max(8·d, 300·ℓ_0))";

    /// <summary>k_8: 2, or 1 where less than 60 mm deep (7.2.2.4) [-].</summary>
    /// <param name="depth">h_ef [m].</param>
    public static double PryoutFactor(double depth) => depth < 60 * Millimetre ? 1 : 2;

    private static bool IsThin(double diameter) => diameter <= 24 * Millimetre;
}
