using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Tension in the anchors of a post by EN 1992-4, 7.2.1: concrete.</summary>
internal static class EurocodeTension
{
    public static IEnumerable<Check?> Of(AnchorCase anchors) => [Cone(anchors), Pullout(anchors), Splitting(anchors), .. BlowOuts(anchors)];

    private static Check Cone(AnchorCase anchors)
    {
        var body = BreakoutBody.Of(anchors.Pulling, anchors.Rows, anchors.Input.Depth);
        var steps = new StepList(42);
        anchors.WriteTensionOn(body, steps);
        BodySteps.Write(steps, body);
        var strength = EurocodeSteps.WriteCone(steps, anchors, body, anchors.EccentricityOn(body)) / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("N_R", "N_c/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed("anchor-cone", "Concrete cone", "7.2.1.4", "N_g/N_R", anchors.TensionOn(body), strength, steps);
    }

    private static Check? Pullout(AnchorCase anchors)
    {
        var steps = new StepList(14);
        anchors.WriteRodTension(steps);
        if (anchors.Input.Kind == AnchorKind.Headed)
        {
            steps.Given("f_ck", anchors.Concrete, Dimension.Stress);
        }

        if (WritePullout(steps, anchors) is not { } nominal)
        {
            return null;
        }

        var strength = nominal / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("N_R", "N_p/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed("anchor-pullout", "Pull-out", "7.2.1.5", "N/N_R", anchors.RodTension, strength, steps);
    }

    /// <summary>N_p after f_ck; null where its input is missing.</summary>
    private static double? WritePullout(StepList steps, AnchorCase anchors)
    {
        var input = anchors.Input;
        switch (input)
        {
            case { Kind: AnchorKind.Headed, HeadArea: { } head }:
                var nominal = EurocodeAnchors.HeadedPullout(head, anchors.Concrete, input.Cracked);
                steps.Given("k_2", input.Cracked ? 7.5 : 10.5, Dimension.Ratio);
                steps.Given("A_h", head, Dimension.SectionArea);
                steps.Add("N_p", "k_2·A_h·f_ck", nominal, Dimension.Force);
                return nominal;
            case { Kind: AnchorKind.PostInstalled, Pullout: { } typed }:
                steps.Given("N_p", typed, Dimension.Force);
                return typed;
            default:
                return null;
        }
    }

    /// <summary>In concrete that does not crack, with the critical edge distance of the approval: a body of its own reach, the weaker of cone and pull-out.</summary>
    private static Check? Splitting(AnchorCase anchors)
    {
        if (anchors.CriticalEdge is not { } critical)
        {
            return null;
        }

        // The same geometry with c_cr,sp for 1.5·h_ef.
        var body = BreakoutBody.Of(anchors.Pulling, anchors.Rows, critical / BreakoutBody.Reach);
        var (depth, eccentricity) = (anchors.Input.Depth, anchors.EccentricityOn(body));
        var steps = new StepList(46);
        anchors.WriteTensionOn(body, steps);
        steps.Given("c_cr", critical, Dimension.SectionLength);
        BodySteps.Write(steps, body, "c_cr/1.5");
        steps.Given("h_1", depth, Dimension.SectionLength);
        var basic = EurocodeSteps.WriteBasicCone(steps, anchors, depth, "h_1");
        var pullout = WritePullout(steps, anchors);
        var least = pullout is { } p ? Math.Min(basic, p) : basic;
        steps.Add("N_1", pullout is null ? "N_0" : "min(N_0, N_p)", least, Dimension.Force);
        var share = EurocodeSteps.WriteFactors(steps, body, depth, eccentricity, out var factors);
        var nominal = body.Area / body.SingleArea * body.EdgeFactor * share * least;
        steps.Add("N_sp", $"{factors}·N_1", nominal, Dimension.Force);
        var strength = nominal / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("N_R", "N_sp/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed("anchor-splitting", "Splitting", "7.2.1.7", "N_g/N_R", anchors.TensionOn(body), strength, steps);
    }

    /// <summary>Headed anchors with an edge nearer than half their depth: the row behind which it lies as a group, a single anchor at each side.</summary>
    private static IEnumerable<Check?> BlowOuts(AnchorCase anchors)
    {
        var (input, layout) = (anchors.Input, anchors.Pulling);
        if (input.Kind != AnchorKind.Headed || input.HeadArea is not { } head)
        {
            yield break;
        }

        var beside = AnchorLayout.Nearer(layout.Left, layout.Right);
        if (layout.Flood is { } behind && behind < 0.5 * input.Depth)
        {
            var isGroup = layout.PerRow > 1 && layout.Spacing < 4 * behind;
            yield return BlowOut(anchors, head, behind, beside, isGroup ? layout.PerRow : 1, "anchor-blow-out", "Blow-out behind the row");
        }

        if (beside is { } near && near < 0.5 * input.Depth)
        {
            var square = AnchorLayout.Nearer(layout.Flood, layout.Edges(anchors.Rows)[1]);
            yield return BlowOut(anchors, head, near, square, 1, "anchor-blow-out-end", "Blow-out beside the row");
        }
    }

    private static Check BlowOut(AnchorCase anchors, double head, double edge, double? other, int count, string name, string title)
    {
        var input = anchors.Input;
        var length = (count - 1) * anchors.Layout.Spacing;
        var corner = EurocodeAnchors.CornerFactor(edge, other);
        var nominal = corner * (1 + length / (4 * edge)) * EurocodeAnchors.BlowOut(edge, head, anchors.Concrete, input.Cracked);
        var demand = count * anchors.RodTension;
        var steps = new StepList(24);
        anchors.WriteRodTension(steps);
        steps.Given("m", count, Dimension.Count);
        steps.Add("N_m", "m·N", demand, Dimension.Force);
        EurocodeSteps.WriteUnits(steps, anchors.Concrete);
        steps.Given("k_5", input.Cracked ? 8.7 : 12.2, Dimension.Ratio);
        steps.Given("c", edge, Dimension.SectionLength);
        if (other is { } square)
        {
            steps.Given("c_2", square, Dimension.SectionLength);
        }

        steps.Add("ψ_k", other is null ? "" : "min(1, 0.7 + 0.3·c_2/(2·c))", corner, Dimension.Ratio);
        steps.Given("A_h", head, Dimension.SectionArea);
        steps.Given("s_o", length, Dimension.SectionLength);
        steps.Add("N_cb", "ψ_k·(1 + s_o/(4·c))·k_5·c/ℓ_0·√(A_h)/ℓ_0·√(f_ck/p_0)·F_0", nominal, Dimension.Force);
        var strength = nominal / EurocodeSteps.WriteFactor(steps, anchors);
        steps.Add("N_R", "N_cb/γ_Mc", strength, Dimension.Force);
        return EurocodeSteps.Closed(name, title, "7.2.1.8", "N_m/N_R", demand, strength, steps);
    }
}
