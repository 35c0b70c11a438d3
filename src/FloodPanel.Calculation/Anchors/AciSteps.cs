using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Lines that checks by ACI 318-19, chapter 17, share.</summary>
internal static class AciSteps
{
    public const string Code = "ACI 318-19";

    public static void WriteSteel(StepList steps, AnchorInput input, double ultimate, double factor)
    {
        steps.Given("A_se", input.StressArea, Dimension.SectionArea);
        steps.Given("f_ya", input.Yield, Dimension.Stress);
        steps.Given("f_u", input.Ultimate, Dimension.Stress);
        steps.Given("f_max", AciAnchors.MostUltimate, Dimension.Stress);
        steps.Add("f_uta", "min(f_u, min(1.9·f_ya, f_max))", ultimate, Dimension.Stress);
        steps.Given("φ", factor, Dimension.Ratio);
    }

    /// <summary>f_c, no more than the code counts.</summary>
    public static void WriteConcrete(StepList steps, AnchorCase anchors)
    {
        steps.Given("f_cs", anchors.Plate.ConcreteStrength, Dimension.Stress);
        steps.Given("f_cm", AciAnchors.MostConcrete(anchors.Input.Kind), Dimension.Stress);
        steps.Add("f_c", "min(f_cs, f_cm)", anchors.Concrete, Dimension.Stress);
    }

    /// <summary>f_c and the units of the code: 1 psi, 1 in, 1 lb.</summary>
    public static void WriteUnits(StepList steps, AnchorCase anchors)
    {
        WriteConcrete(steps, anchors);
        steps.Given("p_0", AciAnchors.Psi, Dimension.Stress);
        steps.Given("ℓ_0", AciAnchors.Inch, Dimension.SectionLength);
        steps.Given("F_0", AciAnchors.Pound, Dimension.Force);
    }

    /// <summary>N_cbg of a body after its lines.</summary>
    public static double WriteBreakout(StepList steps, AnchorCase anchors, BreakoutBody body, double eccentricity)
    {
        var (input, concrete) = (anchors.Input, anchors.Concrete);
        WriteUnits(steps, anchors);
        steps.Given("k_c", AciAnchors.BreakoutConstant(input.Kind), Dimension.Ratio);
        var formula = AciAnchors.IsDeep(input.Kind, body.Depth)
            ? "√(f_c/p_0)·max(k_c·(h′/ℓ_0)^1.5, 16·(h′/ℓ_0)^(5/3))·F_0"
            : "k_c·√(f_c/p_0)·(h′/ℓ_0)^1.5·F_0";
        steps.Add("N_0", formula, AciAnchors.BasicBreakout(input.Kind, body.Depth, concrete), Dimension.Force);
        steps.Given("ψ_c", AciAnchors.CrackFactor(input.Kind, input.Cracked), Dimension.Ratio);
        var factors = "ψ_ed·ψ_c";
        if (eccentricity > 0)
        {
            steps.Add("ψ_ec", "1/(1 + e_N/(1.5·h′))", AciAnchors.Eccentricity(eccentricity, 1.5 * body.Depth), Dimension.Ratio);
            factors += "·ψ_ec";
        }

        var splitting = AciAnchors.SplittingFactor(body, anchors.CriticalEdge);
        if (anchors.CriticalEdge is { } critical && body.NearestEdge is { } nearest)
        {
            steps.Given("c_min", nearest, Dimension.SectionLength);
            steps.Given("c_ac", critical, Dimension.SectionLength);
            steps.Add("ψ_cp", "min(1, max(c_min, 1.5·h′)/c_ac)", splitting, Dimension.Ratio);
            factors += "·ψ_cp";
        }

        var nominal = splitting * AciAnchors.Breakout(body, input.Kind, concrete, input.Cracked, eccentricity);
        steps.Add("N_cbg", $"A_N/A_N0·{factors}·N_0", nominal, Dimension.Force);
        return nominal;
    }

    public static Check Closed(string name, string title, string clause, string ratio, double demand, double capacity, StepList steps)
    {
        steps.Add("u", ratio, demand / capacity, Dimension.Ratio);
        return new(name, title, $"{Code}, {clause}", Dimension.Force, demand, capacity, steps.Done());
    }
}
