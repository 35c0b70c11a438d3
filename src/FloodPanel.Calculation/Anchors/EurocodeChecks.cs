using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of a post by EN 1992-4.</summary>
internal static class EurocodeChecks
{
    private const string Code = "EN 1992-4";

    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        var steelTension = SteelTension(anchors);
        var steelShear = SteelShear(anchors, steelTension);
        Check?[] tension = [Cone(anchors), Pullout(anchors), BlowOut(anchors)];
        Check?[] shear = [EdgeAhead(anchors), .. EdgesBeside(anchors), Pryout(anchors)];
        Check?[] all = [steelTension, steelShear, .. tension, .. shear];
        return
        [
            .. all.OfType<Check>(),
            Interaction("anchor-steel-interaction", "Steel, tension and shear together", steelTension.Utilisation, steelShear?.Utilisation ?? 0, 2),
            Interaction(
                "anchor-concrete-interaction", "Concrete, tension and shear together",
                tension.Max(c => c?.Utilisation ?? 0), shear.Max(c => c?.Utilisation ?? 0), 1.5),
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
        return Closed("anchor-steel-tension", "Steel in tension", "7.2.1.3", "N/N_R", anchors.RodTension, strength, steps);
    }

    /// <summary>Without a lever arm, or with one where the grout is thicker than half a diameter; null where tension leaves nothing to bend.</summary>
    private static Check? SteelShear(AnchorCase anchors, Check tension)
    {
        var input = anchors.Input;
        var factor = EurocodeAnchors.SteelFactorInShear(input.Yield, input.Ultimate);
        var steps = new StepList(26);
        anchors.WriteRodShear(steps);
        steps.Given("A_s", input.StressArea, Dimension.SectionArea);
        steps.Given("f_uk", input.Ultimate, Dimension.Stress);
        steps.Given("γ_Ms", factor, Dimension.Ratio);
        if (anchors.Plate.GroutThickness <= input.Diameter / 2)
        {
            var share = EurocodeAnchors.SteelShearShare(input.Ultimate, input.Ductile);
            var strength = share * input.StressArea * input.Ultimate / factor;
            steps.Given("k", share, Dimension.Ratio);
            steps.Add("V_R", "k·A_s·f_uk/γ_Ms", strength, Dimension.Force);
            return Closed("anchor-steel-shear", "Steel in shear", "7.2.2.3.1", "V/V_R", anchors.RodShear, strength, steps);
        }

        var beside = input.SharedShear ? tension.Utilisation : 0;
        if (beside >= 1)
        {
            return null;
        }

        var core = Math.Sqrt(4 * input.StressArea / Math.PI);
        var modulus = Math.PI * core * core * core / 32;
        var moment = 1.2 * modulus * input.Ultimate * (1 - beside);
        var arm = 0.5 * input.Diameter + anchors.Plate.GroutThickness + anchors.Plate.Thickness / 2;
        steps.Add("d_s", "√(4·A_s/π)", core, Dimension.SectionLength);
        steps.Add("W_el", "π·d_s³/32", modulus, Dimension.SectionModulus);
        steps.Given("u_N", beside, Dimension.Ratio);
        steps.Add("M_R", "1.2·W_el·f_uk·(1 − u_N)", moment, Dimension.Moment);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Given("t_g", anchors.Plate.GroutThickness, Dimension.SectionLength);
        steps.Given("t", anchors.Plate.Thickness, Dimension.SectionLength);
        steps.Add("ℓ_a", "0.5·d + t_g + t/2", arm, Dimension.SectionLength);
        steps.Add("V_R", "M_R/(ℓ_a·γ_Ms)", moment / (arm * factor), Dimension.Force);
        return Closed("anchor-steel-shear", "Steel in shear with a lever arm", "7.2.2.3.2, plate free to turn", "V/V_R", anchors.RodShear, moment / (arm * factor), steps);
    }

    private static Check Cone(AnchorCase anchors)
    {
        var body = BreakoutBody.Of(anchors.Layout, anchors.Rows, anchors.Input.Depth);
        var steps = new StepList(40);
        anchors.WriteGroupTension(steps);
        BodySteps.Write(steps, anchors.Layout, anchors.Rows, body);
        var strength = WriteCone(steps, anchors, body, anchors.Eccentricity, anchors.Rows == 2) / WriteFactor(steps, anchors);
        steps.Add("N_R", "N_c/γ_Mc", strength, Dimension.Force);
        return Closed("anchor-cone", "Concrete cone", "7.2.1.4", "N_g/N_R", anchors.GroupTension, strength, steps);
    }

    private static Check? Pullout(AnchorCase anchors)
    {
        var (input, concrete) = (anchors.Input, anchors.Plate.ConcreteStrength);
        var steps = new StepList(14);
        anchors.WriteRodTension(steps);
        double nominal;
        switch (input.Kind)
        {
            case AnchorKind.Headed when input.HeadArea is { } head:
                nominal = EurocodeAnchors.HeadedPullout(head, concrete, input.Cracked);
                steps.Given("k_2", input.Cracked ? 7.5 : 10.5, Dimension.Ratio);
                steps.Given("A_h", head, Dimension.SectionArea);
                steps.Given("f_ck", concrete, Dimension.Stress);
                steps.Add("N_p", "k_2·A_h·f_ck", nominal, Dimension.Force);
                break;
            case AnchorKind.PostInstalled when input.Pullout is { } typed:
                nominal = typed;
                steps.Given("N_p", typed, Dimension.Force);
                break;
            default:
                return null;
        }

        var strength = nominal / WriteFactor(steps, anchors);
        steps.Add("N_R", "N_p/γ_Mc", strength, Dimension.Force);
        return Closed("anchor-pullout", "Pull-out", "7.2.1.5", "N/N_R", anchors.RodTension, strength, steps);
    }

    /// <summary>Headed anchors with an edge nearer than half their depth: the row there as a group.</summary>
    private static Check? BlowOut(AnchorCase anchors)
    {
        var (input, layout, concrete) = (anchors.Input, anchors.Layout, anchors.Plate.ConcreteStrength);
        var edge = new[] { layout.Flood, layout.Left, layout.Right }.Min();
        if (input.Kind != AnchorKind.Headed || input.HeadArea is not { } head || edge is not { } near || near >= 0.5 * input.Depth)
        {
            return null;
        }

        var count = near == layout.Flood ? anchors.PerRow : 1;
        var length = (count - 1) * Math.Min(layout.Spacing, 4 * near);
        var nominal = (1 + length / (4 * near)) * EurocodeAnchors.BlowOut(near, head, concrete, input.Cracked);
        var demand = count * anchors.RodTension;
        var steps = new StepList(20);
        anchors.WriteRodTension(steps);
        steps.Given("m", count, Dimension.Count);
        steps.Add("N_m", "m·N", demand, Dimension.Force);
        WriteUnits(steps, concrete);
        steps.Given("k_5", input.Cracked ? 8.7 : 12.2, Dimension.Ratio);
        steps.Given("c", near, Dimension.SectionLength);
        steps.Given("A_h", head, Dimension.SectionArea);
        steps.Given("s_o", length, Dimension.SectionLength);
        steps.Add("N_cb", "(1 + s_o/(4·c))·k_5·c/ℓ_0·√(A_h)/ℓ_0·√(f_ck/p_0)·F_0", nominal, Dimension.Force);
        var strength = nominal / WriteFactor(steps, anchors);
        steps.Add("N_R", "N_cb/γ_Mc", strength, Dimension.Force);
        return Closed("anchor-blow-out", "Blow-out", "7.2.1.8", "N_m/N_R", demand, strength, steps);
    }

    private static Check? EdgeAhead(AnchorCase anchors)
    {
        var layout = anchors.Layout;
        if (layout.Protected is not { } edge)
        {
            return null;
        }

        var body = EdgeBody.Of(layout.PerRow, layout.Spacing, edge, layout.Left, layout.Right, layout.Thickness);
        var steps = new StepList(30);
        anchors.WriteGroupShear(steps);
        return Edge(anchors, steps, body, 1, anchors.GroupShear, "V_g", "anchor-edge-shear", "Concrete edge on the protected side");
    }

    private static IEnumerable<Check?> EdgesBeside(AnchorCase anchors)
    {
        var layout = anchors.Layout;
        foreach (var (edge, side) in new[] { (layout.Left, "left"), (layout.Right, "right") })
        {
            if (edge is not { } distance)
            {
                continue;
            }

            var rows = anchors.Input.SharedShear ? 2 : 1;
            var demand = anchors.RodShear * rows;
            var body = EdgeBody.Of(rows, layout.RowSpacing, distance, layout.Flood, layout.Protected, layout.Thickness);
            var steps = new StepList(30);
            anchors.WriteRodShear(steps);
            steps.Given("m", rows, Dimension.Count);
            steps.Add("V_m", "m·V", demand, Dimension.Force);
            yield return Edge(anchors, steps, body, 2, demand, "V_m", $"anchor-edge-shear-{side}", $"Concrete edge, load along the {side} edge");
        }
    }

    private static Check Edge(
        AnchorCase anchors, StepList steps, EdgeBody body, double direction, double demand, string symbol, string name, string title)
    {
        var (input, concrete) = (anchors.Input, anchors.Plate.ConcreteStrength);
        var bearing = Math.Min(input.Depth, 12 * input.Diameter);
        var (alpha, beta) = EurocodeAnchors.EdgeExponents(body.EdgeDistance, bearing, input.Diameter);
        var nominal = direction * EurocodeAnchors.Edge(body, bearing, input.Diameter, concrete, input.Cracked);
        BodySteps.Write(steps, body);
        WriteUnits(steps, concrete);
        steps.Given("h_ef", input.Depth, Dimension.SectionLength);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Add("ℓ_f", "min(h_ef, 12·d)", bearing, Dimension.SectionLength);
        steps.Add("α", "0.1·√(ℓ_f/c_1)", alpha, Dimension.Ratio);
        steps.Add("β", "0.1·(d/c_1)^0.2", beta, Dimension.Ratio);
        steps.Given("k_9", input.Cracked ? 1.7 : 2.4, Dimension.Ratio);
        steps.Add(
            "V_0", "k_9·exp(α·ln(d/ℓ_0) + β·ln(ℓ_f/ℓ_0))·√(f_ck/p_0)·(c_1/ℓ_0)^1.5·F_0",
            EurocodeAnchors.BasicEdge(body.EdgeDistance, bearing, input.Diameter, concrete, input.Cracked), Dimension.Force);
        steps.Given("ψ_α", direction, Dimension.Ratio);
        steps.Add("V_c", "A_V/A_V0·ψ_ed·ψ_h·ψ_α·V_0", nominal, Dimension.Force);
        var strength = nominal / WriteFactor(steps, anchors);
        steps.Add("V_R", "V_c/γ_Mc", strength, Dimension.Force);
        return Closed(name, title, "7.2.2.5", $"{symbol}/V_R", demand, strength, steps);
    }

    private static Check Pryout(AnchorCase anchors)
    {
        var rows = anchors.Input.SharedShear ? 2 : 1;
        var layout = rows == 1 ? anchors.Layout with { Flood = anchors.Layout.Protected, Protected = anchors.Layout.Flood } : anchors.Layout;
        var body = BreakoutBody.Of(layout, rows, anchors.Input.Depth);
        var steps = new StepList(36);
        anchors.WriteGroupShear(steps);
        BodySteps.Write(steps, layout, rows, body);
        var cone = WriteCone(steps, anchors, body, 0, isEccentric: false);
        var k = EurocodeAnchors.PryoutFactor(anchors.Input.Depth);
        steps.Given("k_8", k, Dimension.Ratio);
        var strength = k * cone / WriteFactor(steps, anchors);
        steps.Add("V_R", "k_8·N_c/γ_Mc", strength, Dimension.Force);
        return Closed("anchor-pryout", "Pry-out", "7.2.2.4", "V_g/V_R", anchors.GroupShear, strength, steps);
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
        return new(name, title, $"{Code}, 7.2.3 (from memory)", Dimension.Ratio, sum, 1, steps.Done());
    }

    private static double WriteCone(StepList steps, AnchorCase anchors, BreakoutBody body, double eccentricity, bool isEccentric)
    {
        var (input, concrete) = (anchors.Input, anchors.Plate.ConcreteStrength);
        var constant = EurocodeAnchors.ConeConstant(input.Kind, input.Cracked);
        WriteUnits(steps, concrete);
        steps.Given("k_1", constant, Dimension.Ratio);
        steps.Add("N_0", "k_1·√(f_ck/p_0)·(h_ef/ℓ_0)^1.5·F_0", EurocodeAnchors.BasicCone(constant, body.Depth, concrete), Dimension.Force);
        if (isEccentric)
        {
            steps.Add("ψ_ec", "1/(1 + 2·e_N/(3·h_ef))", 1 / (1 + 2 * eccentricity / (3 * body.Depth)), Dimension.Ratio);
        }

        var shell = EurocodeAnchors.ShellFactor(body.Depth);
        steps.Add("ψ_re", "min(1, 0.5 + h_ef/(200·ℓ_0))", shell, Dimension.Ratio);
        var nominal = shell * EurocodeAnchors.Cone(body, constant, concrete, eccentricity);
        steps.Add("N_c", $"A_N/A_N0·ψ_ed·ψ_re{(isEccentric ? "·ψ_ec" : "")}·N_0", nominal, Dimension.Force);
        return nominal;
    }

    private static double WriteFactor(StepList steps, AnchorCase anchors)
    {
        var factor = EurocodeAnchors.ConcreteFactor * anchors.Input.InstallationFactor;
        steps.Given("γ_inst", anchors.Input.InstallationFactor, Dimension.Ratio);
        steps.Add("γ_Mc", "1.5·γ_inst", factor, Dimension.Ratio);
        return factor;
    }

    /// <summary>f_ck and the units of the code: 1 MPa, 1 mm, 1 N.</summary>
    private static void WriteUnits(StepList steps, double concrete)
    {
        steps.Given("f_ck", concrete, Dimension.Stress);
        steps.Given("p_0", EurocodeAnchors.Megapascal, Dimension.Stress);
        steps.Given("ℓ_0", EurocodeAnchors.Millimetre, Dimension.SectionLength);
        steps.Given("F_0", 1, Dimension.Force);
    }

    private static Check Closed(string name, string title, string clause, string ratio, double demand, double capacity, StepList steps)
    {
        steps.Add("u", ratio, demand / capacity, Dimension.Ratio);
        return new(name, title, $"{Code}, {clause} (from memory)", Dimension.Force, demand, capacity, steps.Done());
    }
}
