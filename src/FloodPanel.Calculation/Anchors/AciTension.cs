using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Tension in the anchors of a post by ACI 318-19, 17.6.</summary>
internal static class AciTension
{
    public static IEnumerable<Check?> Of(AnchorCase anchors) => [Steel(anchors), Breakout(anchors), Pullout(anchors), .. SideFaces(anchors)];

    private static Check Steel(AnchorCase anchors)
    {
        var input = anchors.Input;
        var ultimate = AciAnchors.Ultimate(input.Yield, input.Ultimate);
        var factor = AciAnchors.SteelFactor(input.Ductile, inShear: false);
        var strength = factor * input.StressArea * ultimate;
        var steps = new StepList(14);
        anchors.WriteRodTension(steps);
        AciSteps.WriteSteel(steps, input, ultimate, factor);
        steps.Add("N_R", "φ·A_se·f_uta", strength, Dimension.Force);
        return AciSteps.Closed("anchor-steel-tension", "Steel in tension", "17.6.1", "N/N_R", anchors.RodTension, strength, steps);
    }

    private static Check Breakout(AnchorCase anchors)
    {
        var body = BreakoutBody.Of(anchors.Pulling, anchors.Rows, anchors.Input.Depth);
        var steps = new StepList(45);
        anchors.WriteTensionOn(body, steps);
        BodySteps.Write(steps, body);
        var nominal = AciSteps.WriteBreakout(steps, anchors, body, anchors.EccentricityOn(body));
        var factor = AciAnchors.ConcreteFactor(anchors.Input.Kind, anchors.Input.Category, anchors.Input.SupplementaryReinforcement, inShear: false);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_cbg", factor * nominal, Dimension.Force);
        return AciSteps.Closed("anchor-breakout", "Concrete breakout in tension", "17.6.2", "N_g/N_R", anchors.TensionOn(body), factor * nominal, steps);
    }

    private static Check? Pullout(AnchorCase anchors)
    {
        var steps = new StepList(18);
        anchors.WriteRodTension(steps);
        if (WritePullout(steps, anchors) is not { } nominal)
        {
            return null;
        }

        var factor = AciAnchors.PulloutFactor(anchors.Input.Kind, anchors.Input.Category);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_pn", factor * nominal, Dimension.Force);
        return AciSteps.Closed("anchor-pullout", "Pullout", "17.6.3", "N/N_R", anchors.RodTension, factor * nominal, steps);
    }

    /// <summary>N_pn; null where its input is missing.</summary>
    private static double? WritePullout(StepList steps, AnchorCase anchors)
    {
        var (input, concrete) = (anchors.Input, anchors.Concrete);
        if (input.Kind == AnchorKind.PostInstalled)
        {
            if (input.Pullout is { } typed)
            {
                steps.Given("N_pn", typed, Dimension.Force);
            }

            return input.Pullout;
        }

        AciSteps.WriteConcrete(steps, anchors);
        steps.Given("ψ_c", input.Cracked ? 1 : 1.4, Dimension.Ratio);
        switch (input)
        {
            case { Kind: AnchorKind.Headed, HeadArea: { } head }:
                var headed = AciAnchors.HeadedPullout(head, concrete, input.Cracked);
                steps.Given("A_brg", head, Dimension.SectionArea);
                steps.Add("N_pn", "ψ_c·8·A_brg·f_c", headed, Dimension.Force);
                return headed;
            case { Kind: AnchorKind.Hooked, HookLength: { } hook }:
                var hooked = AciAnchors.HookPullout(hook, input.Diameter, concrete, input.Cracked);
                steps.Given("e_h", hook, Dimension.SectionLength);
                steps.Given("d", input.Diameter, Dimension.SectionLength);
                steps.Add("N_pn", "ψ_c·0.9·f_c·min(e_h, 4.5·d)·d", hooked, Dimension.Force);
                return hooked;
            default:
                return null;
        }
    }

    /// <summary>Headed anchors deeper than 2.5 edge distances: the row along the edge behind it as a group, a single anchor at each side.</summary>
    private static IEnumerable<Check?> SideFaces(AnchorCase anchors)
    {
        var (input, layout) = (anchors.Input, anchors.Pulling);
        if (input.Kind != AnchorKind.Headed || input.HeadArea is not { } head)
        {
            yield break;
        }

        if (layout.Flood is { } behind && input.Depth > 2.5 * behind)
        {
            var isGroup = layout.PerRow > 1 && layout.Spacing < 6 * behind;
            yield return SideFace(anchors, head, new(
                behind, AnchorLayout.Nearer(layout.Left, layout.Right), isGroup ? layout.PerRow : 1, isGroup ? layout.RowLength : 0,
                "anchor-side-face", "Side-face blowout behind the row"));
        }

        if (AnchorLayout.Nearer(layout.Left, layout.Right) is { } beside && input.Depth > 2.5 * beside)
        {
            yield return SideFace(anchors, head, new(
                beside, AnchorLayout.Nearer(layout.Flood, layout.Edges(anchors.Rows)[1]), 1, 0, "anchor-side-face-end", "Side-face blowout beside the row"));
        }
    }

    private static Check SideFace(AnchorCase anchors, double head, Face face)
    {
        // The reduction at a corner is the code's for a single anchor; a group has it at its end as well, which is safe.
        var corner = AciAnchors.CornerFactor(face.Edge, face.Other);
        var nominal = corner * (1 + face.Length / (6 * face.Edge)) * AciAnchors.SideFace(face.Edge, head, anchors.Concrete);
        var factor = AciAnchors.ConcreteFactor(AnchorKind.Headed, 1, anchors.Input.SupplementaryReinforcement, inShear: false);
        var demand = anchors.RodTension * face.Count;
        var steps = new StepList(26);
        anchors.WriteRodTension(steps);
        steps.Given("m", face.Count, Dimension.Count);
        steps.Add("N_m", "m·N", demand, Dimension.Force);
        AciSteps.WriteUnits(steps, anchors);
        steps.Given("c", face.Edge, Dimension.SectionLength);
        if (face.Other is { } other)
        {
            steps.Given("c_2", other, Dimension.SectionLength);
        }

        steps.Add("ψ_k", face.Other is null ? "" : "min(1, (1 + max(1, c_2/c))/4)", corner, Dimension.Ratio);
        steps.Given("A_brg", head, Dimension.SectionArea);
        steps.Given("s_o", face.Length, Dimension.SectionLength);
        steps.Add("N_sb", "ψ_k·(1 + s_o/(6·c))·160·c/ℓ_0·√(A_brg)/ℓ_0·√(f_c/p_0)·F_0", nominal, Dimension.Force);
        steps.Given("φ", factor, Dimension.Ratio);
        steps.Add("N_R", "φ·N_sb", factor * nominal, Dimension.Force);
        return AciSteps.Closed(face.Name, face.Title, "17.6.4", "N_m/N_R", demand, factor * nominal, steps);
    }

    /// <summary>A face of the concrete that may burst, with the edge square to it and the anchors along it.</summary>
    private sealed record Face(double Edge, double? Other, int Count, double Length, string Name, string Title);
}
