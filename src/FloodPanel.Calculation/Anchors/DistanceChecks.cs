using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>Least edge distance and spacing: of the approval, else those of ACI 318 for anchors cast in.</summary>
internal static class DistanceChecks
{
    private const string AciSource = "ACI 318-19, 17.9.2: four diameters between anchors cast in and not torqued (from memory)";

    /// <summary>The checks; a distance for which there is neither has none.</summary>
    public static IEnumerable<Check> Of(AnchorCase anchors)
    {
        var input = anchors.Input;
        var typed = string.IsNullOrWhiteSpace(input.Source) ? "Values typed by the user" : $"Values typed by the user: {input.Source.Trim()}";
        if (input.MinimumEdge is { } edge && anchors.Layout.Edges(2).Min() is { } nearest)
        {
            var steps = new StepList(3);
            steps.Given("c_min", edge, Dimension.SectionLength);
            steps.Given("c", nearest, Dimension.SectionLength);
            steps.Add("u", "c_min/c", edge / nearest, Dimension.Ratio);
            yield return new("anchor-edge-distance", "Edge distance", typed, Dimension.SectionLength, edge, nearest, steps.Done()) { IsDetailing = true };
        }

        var closest = anchors.PerRow > 1 ? Math.Min(anchors.Layout.Spacing, anchors.Layout.RowSpacing) : anchors.Layout.RowSpacing;
        if (input.MinimumSpacing is { } spacing)
        {
            var steps = new StepList(3);
            steps.Given("s_min", spacing, Dimension.SectionLength);
            yield return Spacing(steps, spacing, closest, typed);
        }
        else if (input is { Method: AnchorMethod.Aci318, Kind: not AnchorKind.PostInstalled })
        {
            var steps = new StepList(4);
            steps.Given("d", input.Diameter, Dimension.SectionLength);
            steps.Add("s_min", "4·d", 4 * input.Diameter, Dimension.SectionLength);
            yield return Spacing(steps, 4 * input.Diameter, closest, AciSource);
        }
    }

    private static Check Spacing(StepList steps, double least, double closest, string source)
    {
        steps.Given("s", closest, Dimension.SectionLength);
        steps.Add("u", "s_min/s", least / closest, Dimension.Ratio);
        return new("anchor-spacing", "Spacing", source, Dimension.SectionLength, least, closest, steps.Done()) { IsDetailing = true };
    }
}
