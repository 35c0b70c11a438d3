namespace FloodPanel.Calculation.Anchors;

/// <summary>Lines that checks by EN 1992-4 share.</summary>
internal static class EurocodeSteps
{
    public const string Code = "EN 1992-4";

    /// <summary>N_c, cone of a body after its lines.</summary>
    public static double WriteCone(StepList steps, AnchorCase anchors, BreakoutBody body, double eccentricity)
    {
        WriteBasicCone(steps, anchors, body.Depth, "h′");
        return WriteBody(steps, "N_c", "N_0", body, eccentricity, EurocodeAnchors.ConeConstant(anchors.Input.Kind, anchors.Input.Cracked), anchors);
    }

    /// <summary>f_ck, k_1 and N_0 of a depth whose symbol stands above; the value of N_0.</summary>
    public static double WriteBasicCone(StepList steps, AnchorCase anchors, double depth, string symbol)
    {
        var constant = EurocodeAnchors.ConeConstant(anchors.Input.Kind, anchors.Input.Cracked);
        var basic = EurocodeAnchors.BasicCone(constant, depth, anchors.Concrete);
        WriteUnits(steps, anchors.Concrete);
        steps.Given("k_1", constant, Dimension.Ratio);
        steps.Add("N_0", $"k_1·√(f_ck/p_0)·({symbol}/ℓ_0)^1.5·F_0", basic, Dimension.Force);
        return basic;
    }

    /// <summary>ψ_re and ψ_ec, and a strength of the body from that of one anchor.</summary>
    public static double WriteFactors(StepList steps, BreakoutBody body, double shellDepth, double eccentricity, out string factors)
    {
        var shell = EurocodeAnchors.ShellFactor(shellDepth);
        steps.Add("ψ_re", $"min(1, 0.5 + {(shellDepth == body.Depth ? "h′" : "h_1")}/(200·ℓ_0))", shell, Dimension.Ratio);
        factors = "A_N/A_N0·ψ_ed·ψ_re";
        if (eccentricity <= 0)
        {
            return shell;
        }

        var share = 1 / (1 + 2 * eccentricity / (3 * body.Depth));
        steps.Add("ψ_ec", "1/(1 + 2·e_N/(3·h′))", share, Dimension.Ratio);
        factors += "·ψ_ec";
        return shell * share;
    }

    /// <summary>γ_Mc.</summary>
    public static double WriteFactor(StepList steps, AnchorCase anchors)
    {
        var factor = EurocodeAnchors.ConcreteFactor * anchors.Input.InstallationFactor;
        steps.Given("γ_inst", anchors.Input.InstallationFactor, Dimension.Ratio);
        steps.Add("γ_Mc", "1.5·γ_inst", factor, Dimension.Ratio);
        return factor;
    }

    /// <summary>f_ck and the units of the code: 1 MPa, 1 mm, 1 N.</summary>
    public static void WriteUnits(StepList steps, double concrete)
    {
        steps.Given("f_ck", concrete, Dimension.Stress);
        steps.Given("p_0", EurocodeAnchors.Megapascal, Dimension.Stress);
        steps.Given("ℓ_0", EurocodeAnchors.Millimetre, Dimension.SectionLength);
        steps.Given("F_0", 1, Dimension.Force);
    }

    public static Check Closed(string name, string title, string clause, string ratio, double demand, double capacity, StepList steps)
    {
        steps.Add("u", ratio, demand / capacity, Dimension.Ratio);
        return new(name, title, $"{Code}, {clause} (from memory)", Dimension.Force, demand, capacity, steps.Done());
    }

    private static double WriteBody(
        StepList steps, string symbol, string basic, BreakoutBody body, double eccentricity, double constant, AnchorCase anchors)
    {
        WriteFactors(steps, body, body.Depth, eccentricity, out var factors);
        var nominal = EurocodeAnchors.ShellFactor(body.Depth) * EurocodeAnchors.Cone(body, constant, anchors.Concrete, eccentricity);
        steps.Add(symbol, $"{factors}·{basic}", nominal, Dimension.Force);
        return nominal;
    }
}
