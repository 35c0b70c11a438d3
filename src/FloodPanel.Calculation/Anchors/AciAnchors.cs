using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Strengths of anchors in concrete by ACI 318-19, chapter 17, normal-weight concrete. Constants are those of the code in pounds, inches and psi.</summary>
public static class AciAnchors
{
    /// <summary>1 lb as a force [N].</summary>
    public const double Pound = 4.4482216152605;

    /// <summary>1 in [m].</summary>
    public const double Inch = 0.0254;

    /// <summary>1 psi [Pa].</summary>
    public const double Psi = Pound / (Inch * Inch);

    /// <summary>Greatest depth that the breakout formulas cover: 25 in [m].</summary>
    public const double GreatestDepth = 25 * Inch;

    /// <summary>Greatest f_uta that counts: 125 ksi [Pa].</summary>
    public const double MostUltimate = 125_000 * Psi;

    /// <summary>Greatest f'c that counts (17.3.1, from memory): 10 000 psi cast in, 8 000 psi post-installed [Pa].</summary>
    /// <param name="kind">Kind of anchor.</param>
    public static double MostConcrete(AnchorKind kind) => (kind == AnchorKind.PostInstalled ? 8_000 : 10_000) * Psi;

    /// <summary>f'c that counts [Pa].</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="strength">f'c as specified [Pa], > 0.</param>
    public static double Concrete(AnchorKind kind, double strength) => Math.Min(strength, MostConcrete(kind));

    /// <summary>f_uta ≤ min(1.9·f_ya, 125 ksi) (17.6.1.2) [Pa].</summary>
    /// <param name="yield">f_ya [Pa], > 0.</param>
    /// <param name="ultimate">f_uta as specified [Pa], > 0.</param>
    public static double Ultimate(double yield, double ultimate) => Math.Min(ultimate, Math.Min(1.9 * yield, MostUltimate));

    /// <summary>k_c of the basic breakout strength (17.6.2.2.1): 24 cast in, 17 post-installed (from memory) [-].</summary>
    /// <param name="kind">Kind of anchor.</param>
    public static double BreakoutConstant(AnchorKind kind) => kind == AnchorKind.PostInstalled ? 17 : 24;

    /// <summary>True where the 5/3 power holds: headed, 11 to 25 in deep (17.6.2.2.3).</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="depth">h_ef [m].</param>
    public static bool IsDeep(AnchorKind kind, double depth) => kind == AnchorKind.Headed && depth >= 11 * Inch;

    /// <summary>N_b, basic breakout strength of one anchor far from edges.</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="depth">h_ef [m], > 0, at most 25 in.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    /// <returns>N_b [N].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range.</exception>
    /// <remarks>k_c·√f'c·h_ef^1.5; for deep headed anchors the greater of that and 16·√f'c·h_ef^(5/3). Source: 17.6.2.2.</remarks>
    public static double BasicBreakout(AnchorKind kind, double depth, double concrete)
    {
        Guard.InRange(depth, double.Epsilon, GreatestDepth);
        Guard.Positive(concrete);

        var (root, inches) = (Math.Sqrt(concrete / Psi), depth / Inch);
        var shallow = BreakoutConstant(kind) * Math.Pow(inches, 1.5);
        var deep = IsDeep(kind, depth) ? 16 * Math.Pow(inches, 5.0 / 3) : 0;
        return Pound * root * Math.Max(shallow, deep);
    }

    /// <summary>ψ_c,N: 1.0 cracked; uncracked 1.25 cast in, 1.4 post-installed (17.6.2.5, from memory) [-].</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double CrackFactor(AnchorKind kind, bool cracked) => cracked ? 1 : kind == AnchorKind.PostInstalled ? 1.4 : 1.25;

    /// <summary>ψ_cp: post-installed in uncracked concrete near an edge, c_min/c_ac, at least 1.5·h_ef/c_ac (17.6.2.6, from memory); else 1 [-].</summary>
    /// <param name="body">The concrete that is torn out.</param>
    /// <param name="critical">c_ac, critical edge distance of the approval [m], > 0; null where splitting does not count.</param>
    public static double SplittingFactor(BreakoutBody body, double? critical) =>
        critical is { } distance && body.NearestEdge is { } edge ? Math.Min(1, Math.Max(edge, 1.5 * body.Depth) / distance) : 1;

    /// <summary>N_cbg = (A_Nc/A_Nco)·ψ_ec·ψ_ed·ψ_c·N_b, breakout strength of a group in tension (17.6.2.1), without ψ_cp [N].</summary>
    /// <param name="body">The concrete that is torn out.</param>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    /// <param name="eccentricity">e_N, of the tension in the group [m], ≥ 0.</param>
    public static double Breakout(BreakoutBody body, AnchorKind kind, double concrete, bool cracked, double eccentricity) =>
        body.Area / body.SingleArea * Eccentricity(eccentricity, 1.5 * body.Depth) * body.EdgeFactor
        * CrackFactor(kind, cracked) * BasicBreakout(kind, body.Depth, concrete);

    /// <summary>ψ_ec = 1/(1 + e/reach) (17.6.2.3, 17.7.2.3) [-].</summary>
    /// <param name="eccentricity">e [m], ≥ 0.</param>
    /// <param name="reach">1.5·h_ef or 1.5·c_a1 [m], > 0.</param>
    public static double Eccentricity(double eccentricity, double reach) => 1 / (1 + eccentricity / reach);

    /// <summary>N_pn of a headed anchor: 8·A_brg·f'c, times 1.4 where uncracked (17.6.3) [N].</summary>
    /// <param name="headArea">A_brg [m²], > 0.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double HeadedPullout(double headArea, double concrete, bool cracked)
    {
        Guard.Positive(headArea);
        Guard.Positive(concrete);

        return (cracked ? 1 : 1.4) * 8 * headArea * concrete;
    }

    /// <summary>N_pn of a hook: 0.9·f'c·e_h·d_a with e_h of 3 to 4.5·d_a, times 1.4 where uncracked (17.6.3) [N].</summary>
    /// <param name="hook">e_h [m], at least 3·d_a; more than 4.5·d_a counts 4.5·d_a.</param>
    /// <param name="diameter">d_a [m], > 0.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double HookPullout(double hook, double diameter, double concrete, bool cracked)
    {
        Guard.Positive(hook);
        Guard.Positive(diameter);
        Guard.Positive(concrete);

        return (cracked ? 1 : 1.4) * 0.9 * concrete * Math.Min(hook, 4.5 * diameter) * diameter;
    }

    /// <summary>N_sb = 160·c·√A_brg·√f'c, side-face blowout of one headed anchor (17.6.4.1, from memory) [N].</summary>
    /// <param name="edge">c_a1 [m], > 0.</param>
    /// <param name="headArea">A_brg [m²], > 0.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    public static double SideFace(double edge, double headArea, double concrete)
    {
        Guard.Positive(edge);
        Guard.Positive(headArea);
        Guard.Positive(concrete);

        return 160 * (edge / Inch) * (Math.Sqrt(headArea) / Inch) * Math.Sqrt(concrete / Psi) * Pound;
    }

    /// <summary>(1 + c_2/c_1)/4: side-face blowout of an anchor near a corner, c_2 less than 3·c_1 (17.6.4.1.1, from memory); else 1 [-].</summary>
    /// <param name="edge">c_1, the nearer edge [m], > 0.</param>
    /// <param name="other">c_2, the edge square to it [m]; null when far.</param>
    public static double CornerFactor(double edge, double? other) => Math.Min(1, (1 + Math.Max(1, (other ?? double.PositiveInfinity) / edge)) / 4);

    /// <summary>V_b, basic edge strength of one anchor in shear: the smaller of 7·(l_e/d)^0.2·√d and 9, times √f'c·c^1.5 (17.7.2.2) [N].</summary>
    /// <param name="edge">c_a1 [m], > 0.</param>
    /// <param name="bearing">l_e, h_ef but at most 8·d [m], > 0.</param>
    /// <param name="diameter">d_a [m], > 0.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    public static double BasicEdge(double edge, double bearing, double diameter, double concrete)
    {
        Guard.Positive(edge);
        Guard.Positive(bearing);
        Guard.Positive(diameter);
        Guard.Positive(concrete);

        return EdgeConstant(bearing, diameter) * Math.Sqrt(concrete / Psi) * Math.Pow(edge / Inch, 1.5) * Pound;
    }

    /// <summary>min(7·(l_e/d)^0.2·√d, 9), d in inches [-].</summary>
    internal static double EdgeConstant(double bearing, double diameter) =>
        Math.Min(7 * Math.Pow(bearing / diameter, 0.2) * Math.Sqrt(diameter / Inch), 9);

    /// <summary>ψ_c,V: 1.0 cracked without reinforcement at the edge, 1.4 uncracked (17.7.2.5, from memory) [-].</summary>
    /// <param name="cracked">True where the concrete may crack.</param>
    public static double EdgeCrackFactor(bool cracked) => cracked ? 1 : 1.4;

    /// <summary>V_cbg = (A_Vc/A_Vco)·ψ_ed·ψ_c·ψ_h·V_b, edge strength of a row in shear, no eccentricity (17.7.2.1) [N].</summary>
    /// <param name="body">The concrete that breaks off.</param>
    /// <param name="bearing">l_e [m], > 0.</param>
    /// <param name="diameter">d_a [m], > 0.</param>
    /// <param name="concrete">f'c [Pa], > 0.</param>
    /// <param name="cracked">True where the concrete may crack; see <see cref="EdgeCrackFactor"/>.</param>
    public static double Edge(EdgeBody body, double bearing, double diameter, double concrete, bool cracked) =>
        body.Area / body.SingleArea * body.SideFactor * EdgeCrackFactor(cracked) * body.ThicknessFactor
        * BasicEdge(body.EdgeDistance, bearing, diameter, concrete);

    /// <summary>k_cp: 2, or 1 where less than 2.5 in deep (17.7.3.1) [-].</summary>
    /// <param name="depth">h_ef [m].</param>
    public static double PryoutFactor(double depth) => depth < 2.5 * Inch ? 1 : 2;

    /// <summary>φ for steel (Table 17.5.3(a); brittle from memory) [-].</summary>
    /// <param name="ductile">True where the steel stretches before it breaks.</param>
    /// <param name="inShear">True in shear.</param>
    public static double SteelFactor(bool ductile, bool inShear) => (ductile, inShear) switch
    {
        (true, false) => 0.75,
        (true, true) => 0.65,
        (false, false) => 0.65,
        (false, true) => 0.60,
    };

    /// <summary>φ for breakout and side-face blowout (Table 17.5.3(b); post-installed from memory) [-].</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="category">Category of a post-installed anchor, 1 to 3.</param>
    /// <param name="reinforced">True with supplementary reinforcement.</param>
    /// <param name="inShear">True in shear.</param>
    /// <exception cref="ArgumentOutOfRangeException">The category is unknown.</exception>
    public static double ConcreteFactor(AnchorKind kind, int category, bool reinforced, bool inShear)
    {
        if (inShear || kind != AnchorKind.PostInstalled)
        {
            return reinforced ? 0.75 : 0.70;
        }

        return (reinforced ? 0.10 : 0) + PulloutFactor(kind, category);
    }

    /// <summary>φ for pullout (Table 17.5.3(c); post-installed from memory) [-].</summary>
    /// <param name="kind">Kind of anchor.</param>
    /// <param name="category">Category of a post-installed anchor, 1 to 3.</param>
    /// <exception cref="ArgumentOutOfRangeException">The category is unknown.</exception>
    public static double PulloutFactor(AnchorKind kind, int category) => kind != AnchorKind.PostInstalled ? 0.70 : category switch
    {
        1 => 0.65,
        2 => 0.55,
        3 => 0.45,
        _ => throw new ArgumentOutOfRangeException(nameof(category), category, "is not a category"),
    };
}
