using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Materials;

/// <summary>Design stresses of wet timber: EN 1995-1-1 in service class 3, or the National Design Specification with its adjustment factors.</summary>
internal static class TimberStress
{
    private const string Eurocode = "EN 1995-1-1, 2.4.1 and Table 3.1, service class 3";
    private const string Nds = "NDS, Table 4.3.1 with 2.3.2, wet service (factors partly from memory)";

    /// <summary>k_mod·k_h·f_k/γ_M, or F_b·C_D·C_M·C_F; null where neither covers it.</summary>
    public static DesignStress? Bending(
        Material material, double strength, Profile profile, TimberService service, DesignBasis basis)
    {
        if (IsNds(material, basis))
        {
            var wet = TimberFactors.WetBending(strength, service.SizeFactor, Math.Min(profile.Height, profile.Depth));
            var duration = TimberFactors.Duration(service.Duration);
            return new(strength * duration * wet * service.SizeFactor, strength, "f_k·C_D·C_M·C_F", Nds)
            {
                Factors = [Factor("C_D", duration), Factor("C_M", wet), Factor("C_F", service.SizeFactor)],
            };
        }

        if (Rule(material, basis) is not { } rule)
        {
            return null;
        }

        var (modified, depth) = (TimberFactors.Modification(service.Duration), TimberFactors.Depth(profile.Depth, material.CharacteristicDensity));
        return depth == 1
            ? Eurocodes(strength, "k_mod·f_k/γ_M", modified * strength / rule.Divisor, [Factor("k_mod", modified), Factor("γ_M", rule.Divisor)], Eurocode)
            : Eurocodes(strength, "k_mod·k_h·f_k/γ_M", modified * depth * strength / rule.Divisor,
                [
                    Factor("k_mod", modified),
                    new("t", "", profile.Depth, Dimension.SectionLength),
                    new("t_ref", "", TimberFactors.ReferenceDepth, Dimension.SectionLength),
                    new("k_h", "min((t_ref/t)^0.2, 1.3)", depth, Dimension.Ratio),
                    Factor("γ_M", rule.Divisor),
                ],
                $"{Eurocode}; depth factor 3.2(3)");
    }

    /// <summary>k_mod·k_cr·f_k/γ_M, or F_v·C_D·C_M; null where neither covers it.</summary>
    public static DesignStress? Shear(
        Material material, double strength, Profile profile, TimberService service, DesignBasis basis)
    {
        if (IsNds(material, basis))
        {
            var (duration, wet) = (TimberFactors.Duration(service.Duration), TimberFactors.WetShear(Math.Min(profile.Height, profile.Depth)));
            return new(strength * duration * wet, strength, "f_k·C_D·C_M", Nds) { Factors = [Factor("C_D", duration), Factor("C_M", wet)] };
        }

        if (Rule(material, basis) is not { } rule)
        {
            return null;
        }

        var modified = TimberFactors.Modification(service.Duration);
        return Eurocodes(strength, "k_mod·k_cr·f_k/γ_M", modified * TimberFactors.Cracks * strength / rule.Divisor,
            [Factor("k_mod", modified), Factor("k_cr", TimberFactors.Cracks), Factor("γ_M", rule.Divisor)],
            $"{Eurocode}; cracks 6.1.7(2)");
    }

    /// <summary>Across the grain: k_mod·f_c,90,k/γ_M, or F_c⊥·C_M without a duration factor; null where neither covers it.</summary>
    public static DesignStress? Across(Material material, TimberService? service, DesignBasis basis)
    {
        if (material.CrossCompression is not { } strength)
        {
            return null;
        }

        if (IsNds(material, basis))
        {
            return new(strength * TimberFactors.WetBearing, strength, "f_k·C_M", Nds) { Factors = [Factor("C_M", TimberFactors.WetBearing)] };
        }

        if (Rule(material, basis) is not { } rule)
        {
            return null;
        }

        var modified = service is null ? rule.Multiplier : TimberFactors.Modification(service.Duration);
        return Eurocodes(strength, "k_mod·f_k/γ_M", modified * strength / rule.Divisor, [Factor("k_mod", modified), Factor("γ_M", rule.Divisor)], Eurocode);
    }

    private static DesignStress Eurocodes(double strength, string formula, double value, CalculationStep[] factors, string source) =>
        new(value, strength, formula, source) { Factors = factors };

    private static bool IsNds(Material material, DesignBasis basis) =>
        material.Reference == StrengthReference.NdsReference && basis.Kind == DesignBasisKind.AllowableStress;

    private static StrengthRule? Rule(Material material, DesignBasis basis) =>
        material.Reference == StrengthReference.NdsReference ? null : basis.For(MaterialFamily.Timber);

    private static CalculationStep Factor(string symbol, double value) => new(symbol, "", value, Dimension.Ratio);
}
