namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of a post against values typed from an approval or from tests on site.</summary>
internal static class ApprovalChecks
{
    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        var input = anchors.Input;
        var source = string.IsNullOrWhiteSpace(input.Source) ? "Values typed by the user" : $"Values typed by the user: {input.Source.Trim()}";
        if (input.TensionResistance is { } tensile)
        {
            var steps = new StepList(8);
            anchors.WriteRodTension(steps);
            steps.Given("N_R", tensile, Dimension.Force);
            yield return Closed("anchor-tension", "Tension of an anchor", source, Dimension.Force, "N/N_R", anchors.RodTension, tensile, steps);
        }

        if (input.ShearResistance is { } shearing)
        {
            var steps = new StepList(8);
            anchors.WriteRodShear(steps);
            steps.Given("V_R", shearing, Dimension.Force);
            yield return Closed("anchor-shear", "Shear of an anchor", source, Dimension.Force, "V/V_R", anchors.RodShear, shearing, steps);
        }

        if (input is { TensionResistance: { } n, ShearResistance: { } v })
        {
            var sum = anchors.RodTension / n + anchors.RodShear / v;
            var steps = new StepList(8);
            steps.Given("N", anchors.RodTension, Dimension.Force);
            steps.Given("N_R", n, Dimension.Force);
            steps.Given("V", anchors.RodShear, Dimension.Force);
            steps.Given("V_R", v, Dimension.Force);
            steps.Add("u_NV", "N/N_R + V/V_R", sum, Dimension.Ratio);
            steps.Given("u_R", input.InteractionLimit, Dimension.Ratio);
            yield return Closed(
                "anchor-interaction", "Tension and shear together", $"Sum of the utilisations; {source}", Dimension.Ratio, "u_NV/u_R", sum, input.InteractionLimit, steps);
        }
    }

    private static Check Closed(
        string name, string title, string source, Dimension dimension, string ratio, double demand, double capacity, StepList steps)
    {
        steps.Add("u", ratio, demand / capacity, Dimension.Ratio);
        return new(name, title, source, dimension, demand, capacity, steps.Done());
    }
}
