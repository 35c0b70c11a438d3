using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Shear in the anchors of a post by ACI 318-19, 17.7.</summary>
internal static class AciShear
{
    public static IEnumerable<Check?> Of(AnchorCase anchors) => [Steel(anchors), EdgeAhead(anchors), .. EdgesBeside(anchors), Pryout(anchors)];

    private static Check Steel(AnchorCase anchors)
    {
        var input = anchors.Input;
        var ultimate = AciAnchors.Ultimate(input.Yield, input.Ultimate);
        var factor = AciAnchors.SteelFactor(input.Ductile, inShear: true);
        var grout = anchors.Plate.GroutThickness > 0 ? 0.8 : 1;
        var strength = factor * grout * 0.6 * input.StressArea * ultimate;
        var steps = new StepList(15);
        anchors.WriteRodShear(steps);
        AciSteps.WriteSteel(steps, input, ultimate, factor);
        steps.Given("k_g", grout, Dimension.Ratio);
        steps.Add("V_R", "φ·k_g·0.6·A_se·f_uta", strength, Dimension.Force);
        return AciSteps.Closed("anchor-steel-shear", "Steel in shear", "17.7.1", "V/V_R", anchors.RodShear, strength, steps);
    }

    private static Check? EdgeAhead(AnchorCase anchors)
    {
        var layout = anchors.Pushing;
        if (layout.Protected is not { } edge)
        {
            return null;
        }

        var body = EdgeBody.Of(layout.PerRow, layout.Spacing, edge, layout.Left, layout.Right, layout.Thickness);
        var steps = new StepList(36);
        var demand = anchors.WriteShearAhead(body.Count, steps);
        return Edge(anchors, steps, body, isParallel: false, demand, "anchor-edge-shear", $"Concrete breakout towards the {(anchors.PushesBack ? "flood" : "protected")} edge");
    }

    /// <summary>Shear along an edge beside the anchors: twice the strength square to it, against the share of the anchors there.</summary>
    private static IEnumerable<Check?> EdgesBeside(AnchorCase anchors)
    {
        var layout = anchors.Pushing;
        foreach (var (edge, side) in new[] { (layout.Left, "left"), (layout.Right, "right") })
        {
            if (edge is { } distance)
            {
                var behind = anchors.ShearRows == 1 ? layout.Flood + layout.RowSpacing : layout.Flood;
                var body = EdgeBody.Of(anchors.ShearRows, layout.RowSpacing, distance, behind, layout.Protected, layout.Thickness);
                var steps = new StepList(36);
                var demand = anchors.WriteShearOf(body.Count, steps);
                yield return Edge(anchors, steps, body, isParallel: true, demand, $"anchor-edge-shear-{side}", $"Concrete breakout along the {side} edge");
            }
        }
    }

    private static Check Edge(AnchorCase anchors, StepList steps, EdgeBody body, bool isParallel, double demand, string name, string title)
    {
        // Along an edge: twice the strength, ψ_ed = 1 (17.7.2.1c).
        var counted = isParallel ? body with { Side = null, OtherSide = null } : body;
        var (input, concrete, direction) = (anchors.Input, anchors.Concrete, isParallel ? 2 : 1);
        var bearing = Math.Min(input.Depth, 8 * input.Diameter);
        var basic = AciAnchors.BasicEdge(body.EdgeDistance, bearing, input.Diameter, concrete);
        var nominal = direction * body.Area / body.SingleArea * counted.SideFactor * AciAnchors.EdgeCrackFactor(input.Cracked) * body.ThicknessFactor * basic;
        var factor = AciAnchors.ConcreteFactor(input.Kind, input.Category, input.SupplementaryReinforcement, inShear: true);
        BodySteps.Write(steps, body, countsSides: !isParallel);
        AciSteps.WriteUnits(steps, anchors);
        steps.Given("h_ef", input.Depth, Dimension.SectionLength);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Add("ℓ_e", "min(h_ef, 8·d)", bearing, Dimension.SectionLength);
        steps.Add("k", "min(7·(ℓ_e/d)^0.2·√(d/ℓ_0), 9)", AciAnchors.EdgeConstant(bearing, input.Diameter), Dimension.Ratio);
        steps.Add("V_0", "k·√(f_c/p_0)·(c_1/ℓ_0)^1.5·F_0", basic, Dimension.Force);
        steps.Given("ψ_c", AciAnchors.EdgeCrackFactor(input.Cracked), Dimension.Ratio);
        steps.Given("k_e", direction, Dimension.Ratio);
        steps.Add("V_cbg", "k_e·A_V/A_V0·ψ_ed·ψ_c·ψ_h·V_0", nominal, Dimension.Force);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("V_R", "φ·V_cbg", factor * nominal, Dimension.Force);
        return AciSteps.Closed(name, title, "17.7.2", "V_m/V_R", demand, factor * nominal, steps);
    }

    private static Check Pryout(AnchorCase anchors)
    {
        var input = anchors.Input;
        var body = BreakoutBody.Of(anchors.Pushing.Turned, anchors.ShearRows, input.Depth);
        var steps = new StepList(40);
        var demand = anchors.WriteShearOf(body.Count, steps);
        BodySteps.Write(steps, body);
        var breakout = AciSteps.WriteBreakout(steps, anchors, body, 0);
        var (factor, k) = (AciAnchors.ConcreteFactor(AnchorKind.Headed, 1, reinforced: false, inShear: true), AciAnchors.PryoutFactor(input.Depth));
        steps.Given("k_cp", k, Dimension.Ratio);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("V_R", "φ·k_cp·N_cbg", factor * k * breakout, Dimension.Force);
        return AciSteps.Closed("anchor-pryout", "Pryout", "17.7.3", "V_m/V_R", demand, factor * k * breakout, steps);
    }
}
