namespace FloodPanel.Calculation.Anchors;

/// <summary>Shear in the anchors of a post by EN 1992-4, 7.2.2: concrete.</summary>
internal static class EurocodeShear
{
    public static IEnumerable<Check?> Of(AnchorCase anchors) => [EdgeAhead(anchors), .. EdgesBeside(anchors), Pryout(anchors)];

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
        return Edge(anchors, steps, body, 1, demand, "anchor-edge-shear", $"Concrete edge on the {(anchors.PushesBack ? "flood" : "protected")} side");
    }

    /// <summary>Load along an edge beside the anchors: ψ_α = 2 at 90°, against the share of the anchors there.</summary>
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
                yield return Edge(anchors, steps, body, 2, demand, $"anchor-edge-shear-{side}", $"Concrete edge, load along the {side} edge");
            }
        }
    }

    private static Check Edge(AnchorCase anchors, StepList steps, EdgeBody body, double direction, double demand, string name, string title)
    {
        var (input, concrete) = (anchors.Input, anchors.Concrete);
        var bearing = EurocodeAnchors.BearingLength(input.Depth, input.Diameter);
        var (alpha, beta) = EurocodeAnchors.EdgeExponents(body.EdgeDistance, bearing, input.Diameter);
        var nominal = direction * EurocodeAnchors.Edge(body, bearing, input.Diameter, concrete, input.Cracked);
        BodySteps.Write(steps, body, countsSides: true);
        EurocodeSteps.WriteUnits(steps, concrete);
        steps.Given("h_ef", input.Depth, Dimension.SectionLength);
        steps.Given("d", input.Diameter, Dimension.SectionLength);
        steps.Add("ℓ_f", EurocodeAnchors.BearingFormula(input.Diameter), bearing, Dimension.SectionLength);
        steps.Add("α", "0.1·√(ℓ_f/c_1)", alpha, Dimension.Ratio);
        steps.Add("β", "0.1·(d/c_1)^0.2", beta, Dimension.Ratio);
        steps.Given("k_9", input.Cracked ? 1.7 : 2.4, Dimension.Ratio);
        steps.Add(
            "V_0", "k_9·exp(α·ln(d/ℓ_0) + β·ln(ℓ_f/ℓ_0))·√(f_ck/p_0)·(c_1/ℓ_0)^1.5·F_0",
            EurocodeAnchors.BasicEdge(body.EdgeDistance, bearing, input.Diameter, concrete, input.Cracked), Dimension.Force);
        steps.Given("ψ_α", direction, Dimension.Ratio);
        steps.Add("V_c", "A_V/A_V0·ψ_ed·ψ_h·ψ_α·V_0", nominal, Dimension.Force);
        var strength = nominal / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("V_R", "V_c/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed(name, title, "7.2.2.5", "V_m/V_R", demand, strength, steps);
    }

    private static Check Pryout(AnchorCase anchors)
    {
        var body = BreakoutBody.Of(anchors.Pushing.Turned, anchors.ShearRows, anchors.Input.Depth);
        var steps = new StepList(42);
        var demand = anchors.WriteShearOf(body.Count, steps);
        BodySteps.Write(steps, body);
        var cone = EurocodeSteps.WriteCone(steps, anchors, body, 0);
        var k = EurocodeAnchors.PryoutFactor(anchors.Input.Depth);
        steps.Given("k_8", k, Dimension.Ratio);
        var strength = k * cone / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("V_R", "k_8·N_c/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed("anchor-pryout", "Pry-out", "7.2.2.4", "V_m/V_R", demand, strength, steps);
    }
}
