using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of a post by ACI 318-19, chapter 17.</summary>
internal static class AciChecks
{
    private const string Code = "ACI 318-19";

    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        Check?[] tension = [SteelTension(anchors), Breakout(anchors), Pullout(anchors), .. SideFaces(anchors)];
        Check?[] shear = [SteelShear(anchors), EdgeAhead(anchors), .. EdgesBeside(anchors), Pryout(anchors)];
        var all = tension.Concat(shear).OfType<Check>().ToArray();
        return [.. all, Interaction(tension, shear), .. Bending(anchors)];
    }

    private static Check SteelTension(AnchorCase anchors)
    {
        var input = anchors.Input;
        var ultimate = AciAnchors.Ultimate(input.Yield, input.Ultimate);
        var factor = AciAnchors.SteelFactor(input.Ductile, inShear: false);
        var strength = factor * input.StressArea * ultimate;
        var steps = new StepList(14);
        anchors.WriteRodTension(steps);
        WriteSteel(steps, input, ultimate, factor);
        steps.Add("N_R", "φ·A_se·f_uta", strength, Dimension.Force);
        return Closed("anchor-steel-tension", "Steel in tension", "17.6.1", "N/N_R", anchors.RodTension, strength, steps);
    }

    private static Check SteelShear(AnchorCase anchors)
    {
        var input = anchors.Input;
        var ultimate = AciAnchors.Ultimate(input.Yield, input.Ultimate);
        var factor = AciAnchors.SteelFactor(input.Ductile, inShear: true);
        var grout = anchors.Plate.GroutThickness > 0 ? 0.8 : 1;
        var strength = factor * grout * 0.6 * input.StressArea * ultimate;
        var steps = new StepList(15);
        anchors.WriteRodShear(steps);
        WriteSteel(steps, input, ultimate, factor);
        steps.Given("k_g", grout, Dimension.Ratio);
        steps.Add("V_R", "φ·k_g·0.6·A_se·f_uta", strength, Dimension.Force);
        return Closed("anchor-steel-shear", "Steel in shear", "17.7.1", "V/V_R", anchors.RodShear, strength, steps);
    }

    private static Check Breakout(AnchorCase anchors)
    {
        var body = BreakoutBody.Of(anchors.Layout, anchors.Rows, anchors.Input.Depth);
        var steps = new StepList(40);
        anchors.WriteGroupTension(steps);
        BodySteps.Write(steps, anchors.Layout, anchors.Rows, body);
        var nominal = WriteBreakout(steps, anchors, body, anchors.Eccentricity, anchors.Rows == 2);
        var factor = AciAnchors.ConcreteFactor(anchors.Input.Kind, anchors.Input.Category, anchors.Input.SupplementaryReinforcement, inShear: false);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_cbg", factor * nominal, Dimension.Force);
        return Closed("anchor-breakout", "Concrete breakout in tension", "17.6.2", "N_g/N_R", anchors.GroupTension, factor * nominal, steps);
    }

    private static Check? Pullout(AnchorCase anchors)
    {
        var input = anchors.Input;
        var concrete = anchors.Plate.ConcreteStrength;
        var steps = new StepList(16);
        anchors.WriteRodTension(steps);
        double nominal;
        switch (input.Kind)
        {
            case AnchorKind.Headed when input.HeadArea is { } head:
                nominal = AciAnchors.HeadedPullout(head, concrete, input.Cracked);
                steps.Given("ψ_c", input.Cracked ? 1 : 1.4, Dimension.Ratio);
                steps.Given("A_brg", head, Dimension.SectionArea);
                steps.Given("f_c", concrete, Dimension.Stress);
                steps.Add("N_pn", "ψ_c·8·A_brg·f_c", nominal, Dimension.Force);
                break;
            case AnchorKind.Hooked when input.HookLength is { } hook:
                nominal = AciAnchors.HookPullout(hook, input.Diameter, concrete, input.Cracked);
                steps.Given("ψ_c", input.Cracked ? 1 : 1.4, Dimension.Ratio);
                steps.Given("e_h", hook, Dimension.SectionLength);
                steps.Given("d", input.Diameter, Dimension.SectionLength);
                steps.Given("f_c", concrete, Dimension.Stress);
                steps.Add("N_pn", "ψ_c·0.9·f_c·min(e_h, 4.5·d)·d", nominal, Dimension.Force);
                break;
            case AnchorKind.PostInstalled when input.Pullout is { } typed:
                nominal = typed;
                steps.Given("N_pn", typed, Dimension.Force);
                break;
            default:
                return null;
        }

        var factor = AciAnchors.PulloutFactor(input.Kind, input.Category);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_pn", factor * nominal, Dimension.Force);
        return Closed("anchor-pullout", "Pullout", "17.6.3", "N/N_R", anchors.RodTension, factor * nominal, steps);
    }

    /// <summary>Headed anchors deeper than 2.5 edge distances: the row along the flood edge as a group, a single anchor at each side.</summary>
    private static IEnumerable<Check?> SideFaces(AnchorCase anchors)
    {
        var (input, layout) = (anchors.Input, anchors.Layout);
        if (input.Kind != AnchorKind.Headed || input.HeadArea is not { } head)
        {
            yield break;
        }

        if (layout.Flood is { } flood && input.Depth > 2.5 * flood)
        {
            yield return SideFace(anchors, head, flood, anchors.PerRow, Math.Min(layout.RowLength, 6 * flood * (anchors.PerRow - 1)), "anchor-side-face", "Side-face blowout, flood edge");
        }

        var side = new[] { layout.Left, layout.Right }.Min();
        if (side is { } near && input.Depth > 2.5 * near)
        {
            yield return SideFace(anchors, head, near, 1, 0, "anchor-side-face-end", "Side-face blowout, edge beside");
        }
    }

    private static Check SideFace(AnchorCase anchors, double head, double edge, int count, double length, string name, string title)
    {
        var concrete = anchors.Plate.ConcreteStrength;
        var nominal = (1 + length / (6 * edge)) * AciAnchors.SideFace(edge, head, concrete);
        var factor = AciAnchors.ConcreteFactor(AnchorKind.Headed, 1, anchors.Input.SupplementaryReinforcement, inShear: false);
        var demand = anchors.RodTension * count;
        var steps = new StepList(20);
        anchors.WriteRodTension(steps);
        steps.Given("m", count, Dimension.Count);
        steps.Add("N_m", "m·N", demand, Dimension.Force);
        WriteUnits(steps, concrete);
        steps.Given("c", edge, Dimension.SectionLength);
        steps.Given("A_brg", head, Dimension.SectionArea);
        steps.Given("s_o", length, Dimension.SectionLength);
        steps.Add("N_sb", "(1 + s_o/(6·c))·160·c/ℓ_0·√(A_brg)/ℓ_0·√(f_c/p_0)·F_0", nominal, Dimension.Force);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_sb", factor * nominal, Dimension.Force);
        return Closed(name, title, "17.6.4", "N_m/N_R", demand, factor * nominal, steps);
    }

    private static Check? EdgeAhead(AnchorCase anchors)
    {
        var layout = anchors.Layout;
        if (layout.Protected is not { } edge)
        {
            return null;
        }

        // Whoever shares it: the row nearest the edge breaks off first, and is taken to carry the whole.
        var body = EdgeBody.Of(layout.PerRow, layout.Spacing, edge, layout.Left, layout.Right, layout.Thickness);
        var steps = new StepList(30);
        anchors.WriteGroupShear(steps);
        return Edge(anchors, steps, body, 1, anchors.GroupShear, "V_g", "anchor-edge-shear", "Concrete breakout towards the protected edge");
    }

    /// <summary>Shear along an edge beside the anchors: twice the strength square to it, against the share of the anchors there.</summary>
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
            var body = EdgeBody.Of(rows, layout.RowSpacing, distance, layout.Flood, layout.Protected, layout.Thickness) with { NearestSide = null };
            var steps = new StepList(30);
            anchors.WriteRodShear(steps);
            steps.Given("m", rows, Dimension.Count);
            steps.Add("V_m", "m·V", demand, Dimension.Force);
            yield return Edge(anchors, steps, body, 2, demand, "V_m", $"anchor-edge-shear-{side}", $"Concrete breakout along the {side} edge");
        }
    }

    private static Check Edge(
        AnchorCase anchors, StepList steps, EdgeBody body, double parallel, double demand, string symbol, string name, string title)
    {
        var (input, concrete) = (anchors.Input, anchors.Plate.ConcreteStrength);
        var bearing = Math.Min(input.Depth, 8 * input.Diameter);
        var nominal = parallel * AciAnchors.Edge(body, bearing, input.Diameter, concrete, input.Cracked);
        var factor = AciAnchors.ConcreteFactor(input.Kind, input.Category, input.SupplementaryReinforcement, inShear: true);
        BodySteps.Write(steps, body);
        WriteUnits(steps, concrete);
        steps.Given("h_ef", input.Depth, Dimension.SectionLength);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Add("ℓ_e", "min(h_ef, 8·d)", bearing, Dimension.SectionLength);
        steps.Add("k", "min(7·(ℓ_e/d)^0.2·√(d/ℓ_0), 9)", AciAnchors.EdgeConstant(bearing, input.Diameter), Dimension.Ratio);
        steps.Add("V_0", "k·√(f_c/p_0)·(c_1/ℓ_0)^1.5·F_0", AciAnchors.BasicEdge(body.EdgeDistance, bearing, input.Diameter, concrete), Dimension.Force);
        steps.Given("ψ_c", input.Cracked ? 1 : 1.4, Dimension.Ratio);
        steps.Given("k_e", parallel, Dimension.Ratio);
        steps.Add("V_cbg", "k_e·A_V/A_V0·ψ_ed·ψ_c·ψ_h·V_0", nominal, Dimension.Force);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("V_R", "φ·V_cbg", factor * nominal, Dimension.Force);
        return Closed(name, title, "17.7.2", $"{symbol}/V_R", demand, factor * nominal, steps);
    }

    private static Check Pryout(AnchorCase anchors)
    {
        var input = anchors.Input;
        var rows = input.SharedShear ? 2 : 1;

        // The row on the protected side alone: seen from there the edges change places.
        var layout = rows == 1 ? anchors.Layout with { Flood = anchors.Layout.Protected, Protected = anchors.Layout.Flood } : anchors.Layout;
        var body = BreakoutBody.Of(layout, rows, input.Depth);
        var steps = new StepList(36);
        anchors.WriteGroupShear(steps);
        BodySteps.Write(steps, layout, rows, body);
        var breakout = WriteBreakout(steps, anchors, body, 0, isEccentric: false);
        var (factor, k) = (AciAnchors.ConcreteFactor(AnchorKind.Headed, 1, reinforced: false, inShear: true), AciAnchors.PryoutFactor(input.Depth));
        steps.Given("k_cp", k, Dimension.Ratio);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("V_R", "φ·k_cp·N_cbg", factor * k * breakout, Dimension.Force);
        return Closed("anchor-pryout", "Pryout", "17.7.3", "V_g/V_R", anchors.GroupShear, factor * k * breakout, steps);
    }

    private static Check Interaction(Check?[] tension, Check?[] shear)
    {
        var (n, v) = (tension.Max(c => c?.Utilisation ?? 0), shear.Max(c => c?.Utilisation ?? 0));
        var counts = n > 0.2 && v > 0.2;
        var demand = counts ? n + v : Math.Max(n, v);
        var limit = counts ? 1.2 : 1;
        var steps = new StepList(5);
        steps.Given("u_N", n, Dimension.Ratio);
        steps.Given("u_V", v, Dimension.Ratio);
        steps.Add("u_NV", counts ? "u_N + u_V" : "max(u_N, u_V)", demand, Dimension.Ratio);
        steps.Given("u_R", limit, Dimension.Ratio);
        steps.Add("u", "u_NV/u_R", demand / limit, Dimension.Ratio);
        return new("anchor-interaction", "Tension and shear together", $"{Code}, 17.8: a part up to 0.2 does not count", Dimension.Ratio, demand, limit, steps.Done());
    }

    private static IEnumerable<Check> Bending(AnchorCase anchors)
    {
        if (anchors.Input.WasherThickness is not { } washer)
        {
            yield break;
        }

        var input = anchors.Input;
        var rod = RodBending.Of(anchors.RodTension, anchors.RodShear, input.Diameter, anchors.Plate.Thickness, washer, input.Ultimate);
        var steps = new StepList(26);
        anchors.WriteRodTension(steps);
        steps.Given("V_b", anchors.Shear, Dimension.Force);
        steps.Given("n_V", anchors.InShear, Dimension.Count);
        steps.Add("V", "n_a·V_b/n_V", anchors.RodShear, Dimension.Force);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Given("t", anchors.Plate.Thickness, Dimension.SectionLength);
        steps.Given("t_w", washer, Dimension.SectionLength);
        steps.Given("F_u", input.Ultimate, Dimension.Stress);
        steps.Add("f_v", "V/(π·d²/4)", rod.ShearStress, Dimension.Stress);
        steps.Add("M", "V·(t + t_w/2)/2", rod.Bending, Dimension.Moment);
        steps.Add("f_b", "M/(d³/6)", rod.BendingStress, Dimension.Stress);
        steps.Add("f_a", "N/(π·d²/4)", rod.AxialStress, Dimension.Stress);
        steps.Add("f", "f_a + f_b", rod.Total, Dimension.Stress);
        steps.Add("F_R", "0.75·min(0.75·F_u, 1.3·0.75·F_u − 0.75·F_u·f_v/(0.75·0.45·F_u))", rod.Allowed, Dimension.Stress);
        if (rod.Allowed > 0)
        {
            steps.Add("u", "f/F_R", rod.Total / rod.Allowed, Dimension.Ratio);
            yield return new("anchor-rod-bending", "Rod in tension, shear and bending", RodBending.Source, Dimension.Stress, rod.Total, rod.Allowed, steps.Done());
        }
    }

    private static void WriteSteel(StepList steps, AnchorInput input, double ultimate, double factor)
    {
        steps.Given("A_se", input.StressArea, Dimension.SectionArea);
        steps.Given("f_ya", input.Yield, Dimension.Stress);
        steps.Given("f_u", input.Ultimate, Dimension.Stress);
        steps.Given("f_max", 125_000 * AciAnchors.Psi, Dimension.Stress);
        steps.Add("f_uta", "min(f_u, min(1.9·f_ya, f_max))", ultimate, Dimension.Stress);
        steps.Given("φ", factor, Dimension.Ratio);
    }

    /// <summary>f'c and the units of the code: 1 psi, 1 in, 1 lb.</summary>
    private static void WriteUnits(StepList steps, double concrete)
    {
        steps.Given("f_c", concrete, Dimension.Stress);
        steps.Given("p_0", AciAnchors.Psi, Dimension.Stress);
        steps.Given("ℓ_0", AciAnchors.Inch, Dimension.SectionLength);
        steps.Given("F_0", AciAnchors.Pound, Dimension.Force);
    }

    private static double WriteBreakout(StepList steps, AnchorCase anchors, BreakoutBody body, double eccentricity, bool isEccentric)
    {
        var (input, concrete) = (anchors.Input, anchors.Plate.ConcreteStrength);
        WriteUnits(steps, concrete);
        steps.Given("k_c", AciAnchors.BreakoutConstant(input.Kind), Dimension.Ratio);
        var formula = AciAnchors.IsDeep(input.Kind, body.Depth)
            ? "√(f_c/p_0)·max(k_c·(h_ef/ℓ_0)^1.5, 16·(h_ef/ℓ_0)^(5/3))·F_0"
            : "k_c·√(f_c/p_0)·(h_ef/ℓ_0)^1.5·F_0";
        steps.Add("N_0", formula, AciAnchors.BasicBreakout(input.Kind, body.Depth, concrete), Dimension.Force);
        steps.Given("ψ_c", AciAnchors.CrackFactor(input.Kind, input.Cracked), Dimension.Ratio);
        if (isEccentric)
        {
            steps.Add("ψ_ec", "1/(1 + e_N/(1.5·h_ef))", AciAnchors.Eccentricity(eccentricity, 1.5 * body.Depth), Dimension.Ratio);
        }

        var nominal = AciAnchors.Breakout(body, input.Kind, concrete, input.Cracked, eccentricity);
        steps.Add("N_cbg", $"A_N/A_N0·ψ_ed·ψ_c{(isEccentric ? "·ψ_ec" : "")}·N_0", nominal, Dimension.Force);
        return nominal;
    }

    private static Check Closed(string name, string title, string clause, string ratio, double demand, double capacity, StepList steps)
    {
        steps.Add("u", ratio, demand / capacity, Dimension.Ratio);
        return new(name, title, $"{Code}, {clause}", Dimension.Force, demand, capacity, steps.Done());
    }
}
