namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of a post by EN 1992-4.</summary>
internal static class EurocodeChecks
{
    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        var steelTension = SteelTension(anchors);
        var steelShear = SteelShear(anchors, steelTension);
        Check[] tension = [.. EurocodeTension.Of(anchors).OfType<Check>()];
        Check[] shear = [.. EurocodeShear.Of(anchors).OfType<Check>()];
        Check?[] steel = [steelTension, steelShear];
        return
        [
            .. steel.OfType<Check>(),
            .. tension,
            .. shear,
            Interaction("anchor-steel-interaction", "Steel, tension and shear together", steelTension.Utilisation, steelShear?.Utilisation ?? 0, 2),
            Interaction(
                "anchor-concrete-interaction", "Concrete, tension and shear together",
                tension.Max(c => c.Utilisation), shear.Max(c => c.Utilisation), 1.5),
        ];
    }

    private static Check SteelTension(AnchorCase anchors)
    {
        var input = anchors.Input;
        var factor = EurocodeAnchors.SteelFactorInTension(input.Yield, input.Ultimate);
        var strength = input.StressArea * input.Ultimate / factor;
        var steps = new StepList(12);
        anchors.WriteRodTension(steps);
        steps.Given("A_s", input.StressArea, Dimension.SectionArea);
        steps.Given("f_uk", input.Ultimate, Dimension.Stress);
        steps.Given("f_yk", input.Yield, Dimension.Stress);
        steps.Add("γ_Ms", "max(1.2·f_uk/f_yk, 1.4)", factor, Dimension.Ratio);
        steps.Add("N_R", "A_s·f_uk/γ_Ms", strength, Dimension.Force);
        return EurocodeSteps.Closed("anchor-steel-tension", "Steel in tension", "7.2.1.3", "N/N_R", anchors.RodTension, strength, steps);
    }

    /// <summary>
    /// Without a lever arm on concrete, or on grout of 30 MPa (as strong as the concrete) up to half a diameter thick; else with one. Null where
    /// tension leaves nothing to bend, and steel in tension fails.
    /// </summary>
    private static Check? SteelShear(AnchorCase anchors, Check tension)
    {
        var input = anchors.Input;
        var factor = EurocodeAnchors.SteelFactorInShear(input.Yield, input.Ultimate);
        var steps = new StepList(26);
        anchors.WriteRodShear(steps);
        steps.Given("A_s", input.StressArea, Dimension.SectionArea);
        steps.Given("f_uk", input.Ultimate, Dimension.Stress);
        steps.Given("γ_Ms", factor, Dimension.Ratio);
        if (EurocodeAnchors.BearsDirectly(anchors.Plate.GroutThickness, input.Diameter, anchors.Concrete))
        {
            var share = EurocodeAnchors.SteelShearShare(input.Ultimate, input.Ductile);
            var strength = share * input.StressArea * input.Ultimate / factor;
            steps.Given("k", share, Dimension.Ratio);
            steps.Add("V_R", "k·A_s·f_uk/γ_Ms", strength, Dimension.Force);
            return EurocodeSteps.Closed("anchor-steel-shear", "Steel in shear", "7.2.2.3.1", "V/V_R", anchors.RodShear, strength, steps);
        }

        var beside = input.SharedShear || anchors.Rows == 2 ? tension.Utilisation : 0;
        return beside < 1 ? WithLeverArm(anchors, steps, factor, beside) : null;
    }

    private static Check WithLeverArm(AnchorCase anchors, StepList steps, double factor, double beside)
    {
        var (input, plate) = (anchors.Input, anchors.Plate);
        var core = Math.Sqrt(4 * input.StressArea / Math.PI);
        var modulus = Math.PI * core * core * core / 32;
        var moment = 1.2 * modulus * input.Ultimate * (1 - beside);
        var arm = 0.5 * input.Diameter + plate.GroutThickness + plate.Thickness / 2;
        steps.Add("d_s", "√(4·A_s/π)", core, Dimension.SectionLength);
        steps.Add("W_el", "π·d_s³/32", modulus, Dimension.SectionModulus);
        steps.Given("u_N", beside, Dimension.Ratio);
        steps.Add("M_R", "1.2·W_el·f_uk·(1 − u_N)", moment, Dimension.Moment);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Given("t_g", plate.GroutThickness, Dimension.SectionLength);
        steps.Given("t", plate.Thickness, Dimension.SectionLength);
        steps.Add("ℓ_a", "0.5·d + t_g + t/2", arm, Dimension.SectionLength);
        steps.Add("V_R", "M_R/(ℓ_a·γ_Ms)", moment / (arm * factor), Dimension.Force);
        return EurocodeSteps.Closed("anchor-steel-shear", "Steel in shear with a lever arm", "7.2.2.3.2, plate free to turn", "V/V_R", anchors.RodShear, moment / (arm * factor), steps);
    }

    private static Check Interaction(string name, string title, double tension, double shear, double power)
    {
        var sum = Math.Pow(tension, power) + Math.Pow(shear, power);
        var steps = new StepList(5);
        steps.Given("u_N", tension, Dimension.Ratio);
        steps.Given("u_V", shear, Dimension.Ratio);
        steps.Add("u_NV", power == 2 ? "u_N² + u_V²" : "u_N^1.5 + u_V^1.5", sum, Dimension.Ratio);
        steps.Given("u_R", 1, Dimension.Ratio);
        steps.Add("u", "u_NV/u_R", sum, Dimension.Ratio);
        return new(name, title, $"{EurocodeSteps.Code}, 7.2.3 (from memory)", Dimension.Ratio, sum, 1, steps.Done());
    }
}
