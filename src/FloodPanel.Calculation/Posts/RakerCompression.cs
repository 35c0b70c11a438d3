using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>The raker as a strut: its axial force against its buckling resistance.</summary>
internal static class RakerCompression
{
    /// <summary>α and λ_0 of curve c of EN 1993-1-1, on the safe side for cold-formed tubes and weak axes (from memory) [-].</summary>
    private const double SteelImperfection = 0.49, SteelPlateau = 0.2;

    /// <summary>True where a formula for the raker's family and basis is here and its strength is known.</summary>
    public static bool IsCovered(RakerModel raker, DesignBasis basis) =>
        raker.Member.Material is { Family: MaterialFamily.Steel or MaterialFamily.Aluminium, BendingStrength: not null }
        && basis.For(raker.Member.Material.Family) is not null;

    /// <summary>N against N_R = A·f; null where <see cref="IsCovered"/> says no.</summary>
    public static Check? Of(PropResponse prop, RakerModel raker, DesignBasis basis)
    {
        if (!IsCovered(raker, basis))
        {
            return null;
        }

        var steps = new StepList(40);
        RakerSteps.Geometry(steps, raker);
        steps.Given("R_f", prop.FixedHeadForce, Dimension.Force);
        steps.Given("R_p", prop.PinnedHeadForce, Dimension.Force);
        steps.Add("N", "max(R_f, R_p)/c_n", prop.Compression, Dimension.Force);
        var (material, section) = (raker.Member.Material, raker.Member.Section);
        steps.Given("f_k", material.BendingStrength!.Value, Dimension.Stress);
        steps.Given("I_r", raker.LeastInertia, Dimension.SecondMoment);
        steps.Add("r", "√(I_r/A_r)", Math.Sqrt(raker.LeastInertia / section.Area), Dimension.SectionLength);
        steps.Given("K", raker.Input.LengthFactor, Dimension.Ratio);
        var slenderness = raker.Input.LengthFactor * raker.Length / Math.Sqrt(raker.LeastInertia / section.Area);
        steps.Add("λ", "K·L_r/r", slenderness, Dimension.Ratio);
        var nominal = Nominal(steps, material, slenderness, basis.Kind);
        var rule = basis.For(material.Family)!;
        var capacity = rule.Factor * nominal.Stress * section.Area;
        steps.Add("N_R", $"A_r·{rule.Formula.Replace("f_k", "f_n", StringComparison.Ordinal)}", capacity, Dimension.Force);
        steps.Add("u", "N/N_R", prop.Compression / capacity, Dimension.Ratio);
        return new(
            "raker-compression", "Raker in compression", $"{nominal.Source}; {rule.Source}", Dimension.Force,
            prop.Compression, capacity, steps.Done());
    }

    private static (double Stress, string Source) Nominal(StepList steps, Material material, double slenderness, DesignBasisKind kind)
    {
        var (yield, modulus) = (material.BendingStrength!.Value, material.ElasticModulus);
        if (kind == DesignBasisKind.Eurocode)
        {
            return Eurocode(steps, material, slenderness);
        }

        if (material.Family == MaterialFamily.Aluminium)
        {
            var stress = Columns.AluminiumUs(yield, modulus, slenderness);
            AluminiumConstants(steps, yield, modulus);
            var isShort = slenderness < Columns.BucklingConstants(yield, modulus).Limit;
            steps.Add(
                "f_n",
                isShort ? "min(f_k, (B_c − D_c·λ)·(0.85 + 0.15·(C_c − λ)/C_c))" : "0.85·π²·E_r/λ²",
                stress,
                Dimension.Stress);
            return (stress, "Aluminum Design Manual 2020, E.2 (from memory)");
        }

        var elastic = Columns.Euler(modulus, slenderness);
        steps.Add("F_e", "π²·E_r/λ²", elastic, Dimension.Stress);
        var critical = Columns.SteelUs(yield, modulus, slenderness);
        steps.Add("f_n", yield / elastic <= 2.25 ? "0.658^(f_k/F_e)·f_k" : "0.877·F_e", critical, Dimension.Stress);
        return (critical, "AISC 360, E3 (from memory)");
    }

    private static (double Stress, string Source) Eurocode(StepList steps, Material material, double slenderness)
    {
        var (imperfection, plateau, source) = material switch
        {
            { Family: MaterialFamily.Steel } => (SteelImperfection, SteelPlateau, "EN 1993-1-1, 6.3.1.2, curve c (from memory)"),
            { BucklingClass: BucklingClass.A } => (0.20, 0.10, "EN 1999-1-1, 6.3.1.2, class A (from memory)"),
            _ => (0.32, 0.0, "EN 1999-1-1, 6.3.1.2, class B (from memory)"),
        };
        var relative = Math.Sqrt(material.BendingStrength!.Value / Columns.Euler(material.ElasticModulus, slenderness));
        steps.Add("λ_r", "√(f_k/(π²·E_r/λ²))", relative, Dimension.Ratio);
        var reduction = RakerSteps.Reduction(steps, "λ_r", relative, imperfection, plateau);
        var stress = reduction * material.BendingStrength.Value;
        steps.Add("f_n", "χ·f_k", stress, Dimension.Stress);
        return (stress, source);
    }

    /// <summary>κ, B_c, D_c and C_c.</summary>
    internal static void AluminiumConstants(StepList steps, double yield, double modulus, string modulusSymbol = "E_r")
    {
        var (intercept, slope, limit) = Columns.BucklingConstants(yield, modulus);
        steps.Given("κ", Columns.Ksi, Dimension.Stress);
        steps.Add("B_c", "f_k·(1 + √(f_k/(2250·κ)))", intercept, Dimension.Stress);
        steps.Add("D_c", $"B_c/10·√(B_c/{modulusSymbol})", slope, Dimension.Stress);
        steps.Add("C_c", "0.41·B_c/D_c", limit, Dimension.Ratio);
    }
}
