namespace FloodPanel.Calculation.Posts;

/// <summary>Lines that the checks of a post with a raker share.</summary>
internal static class RakerSteps
{
    /// <summary>θ, c, a, L_r, c_n = cos φ, E_r, A_r and s_c.</summary>
    public static void Geometry(StepList steps, RakerModel raker, bool withRake = true)
    {
        var rake = Math.Acos(Math.Min(1, raker.Input.HeadHeight / raker.Head));
        var isRaked = raker.Head != raker.Input.HeadHeight;
        if (isRaked && withRake)
        {
            steps.Given("θ", rake, Dimension.Angle);
        }

        steps.Given("c", raker.Input.HeadHeight, Dimension.Length);
        steps.Given("a", raker.Input.FootDistance, Dimension.Length);
        steps.Add("L_r", isRaked ? "√(c² + (a − c·tan(θ))²)" : "√(c² + a²)", raker.Length, Dimension.Length);
        steps.Add("c_n", isRaked ? "a·cos(θ)/L_r" : "a/L_r", raker.CosNormal, Dimension.Ratio);
        steps.Given("E_r", raker.Member.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("A_r", raker.Member.Section.Area, Dimension.SectionArea);
        steps.Add("s_c", isRaked ? "c/cos(θ)" : "c", raker.Head, Dimension.Length);
    }

    /// <summary>φ and χ of a European buckling curve.</summary>
    /// <returns>χ [-].</returns>
    public static double Reduction(StepList steps, string symbol, double relative, double imperfection, double plateau)
    {
        var reduction = Columns.Reduction(relative, imperfection, plateau);
        steps.Given("α", imperfection, Dimension.Ratio);
        steps.Given("λ_0", plateau, Dimension.Ratio);
        steps.Add(
            "φ", $"(1 + α·({symbol} − λ_0) + {symbol}²)/2", (1 + imperfection * (relative - plateau) + relative * relative) / 2, Dimension.Ratio);
        steps.Add("χ", $"min(1, 1/(φ + √(φ² − {symbol}²)))", reduction, Dimension.Ratio);
        return reduction;
    }

    /// <summary>The moment of a post with a raker, after M_0: stiffness of the raker, its force with either base, and M.</summary>
    public static void Moment(StepList steps, PropResponse prop, RakerModel raker, Member post, SlopeLoad load)
    {
        HeadForces(steps, prop, raker, post);
        steps.Add("M_f", "M_0 − R_f·s_c", prop.FixedBaseMoment, Dimension.Moment);
        if (prop.PeakAt == 0)
        {
            steps.Add("M", "√(M_f²)", prop.PeakMoment, Dimension.Moment);
            return;
        }

        var above = load.Between(prop.PeakAt, double.PositiveInfinity);
        steps.Given("s_M", prop.PeakAt, Dimension.Length);
        steps.Given("A_0", above.Zero, Dimension.Force);
        steps.Given("A_1", above.First, Dimension.Moment);
        var force = prop.IsPeakPinned ? "R_p" : "R_f";
        steps.Add("M", $"√((A_1 − s_M·A_0 − {force}·(s_c − s_M))²)", prop.PeakMoment, Dimension.Moment);
    }

    /// <summary>The shear of a post with a raker, after V_0: at the base and on either side of the head, with either base.</summary>
    public static void Shear(StepList steps, PropResponse prop, SlopeLoad load, double head)
    {
        steps.Given("R_f", prop.FixedHeadForce, Dimension.Force);
        steps.Given("R_p", prop.PinnedHeadForce, Dimension.Force);
        steps.Given("V_h", load.Between(head, double.PositiveInfinity).Zero, Dimension.Force);
        steps.Add(
            "V",
            "max(max(√((V_0 − R_f)²), √((V_0 − R_p)²)), max(V_h, max(√((V_h − R_f)²), √((V_h − R_p)²))))",
            prop.PeakShear,
            Dimension.Force);
    }

    /// <summary>k, and R_f and R_p from the deflection of the head without a raker and from the moment about the base.</summary>
    private static void HeadForces(StepList steps, PropResponse prop, RakerModel raker, Member post)
    {
        Geometry(steps, raker, withRake: false);
        steps.Given("E", post.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", post.Section.Inertia, Dimension.SecondMoment);
        steps.Given("s_0", raker.Input.Play, Dimension.SectionLength);
        steps.Given("δ_0", prop.HeadDeflection, Dimension.Deflection);
        steps.Add(
            "R_f", "max(0, (δ_0 − s_0/c_n)/(s_c³/(3·E·I) + L_r/(E_r·A_r·c_n²)))", prop.FixedHeadForce, Dimension.Force);
        steps.Add("R_p", "M_0/s_c", prop.PinnedHeadForce, Dimension.Force);
    }
}
