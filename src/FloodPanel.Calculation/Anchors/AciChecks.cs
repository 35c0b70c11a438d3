namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of a post by ACI 318-19, chapter 17.</summary>
internal static class AciChecks
{
    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        Check[] tension = [.. AciTension.Of(anchors).OfType<Check>()];
        Check[] shear = [.. AciShear.Of(anchors).OfType<Check>()];
        return [.. tension, .. shear, Interaction(tension, shear), .. Bending(anchors)];
    }

    /// <summary>Each part by itself, and where both are above 0.2 their sum over 1.2.</summary>
    private static Check Interaction(Check[] tension, Check[] shear)
    {
        var (n, v) = (tension.Max(c => c.Utilisation), shear.Max(c => c.Utilisation));
        var isShared = n > 0.2 && v > 0.2;
        var greater = Math.Max(n, v);
        var demand = isShared ? Math.Max(greater, (n + v) / 1.2) : greater;
        var steps = new StepList(5);
        steps.Given("u_N", n, Dimension.Ratio);
        steps.Given("u_V", v, Dimension.Ratio);
        steps.Add("u_NV", isShared ? "max(max(u_N, u_V), (u_N + u_V)/1.2)" : "max(u_N, u_V)", demand, Dimension.Ratio);
        steps.Given("u_R", 1, Dimension.Ratio);
        steps.Add("u", "u_NV/u_R", demand, Dimension.Ratio);
        return new("anchor-interaction", "Tension and shear together", $"{AciSteps.Code}, 17.8: a part up to 0.2 does not count", Dimension.Ratio, demand, 1, steps.Done());
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
}
