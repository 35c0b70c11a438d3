namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in anchors.</summary>
internal static class AnchorValidation
{
    public static void Validate(AnchorInput? anchors, string path, ProblemList problems)
    {
        if (anchors is null)
        {
            return;
        }

        problems.Check(AnchorFields.Diameter, anchors.Diameter, path);
        problems.Check(AnchorFields.StressArea, anchors.StressArea, path);
        problems.Check(AnchorFields.Yield, anchors.Yield, path);
        problems.Check(AnchorFields.Ultimate, anchors.Ultimate, path);
        problems.Check(AnchorFields.Depth, anchors.Depth, path);
        problems.Check(AnchorFields.HeadArea, anchors.HeadArea, path);
        problems.Check(AnchorFields.HookLength, anchors.HookLength, path);
        problems.Check(AnchorFields.Pullout, anchors.Pullout, path);
        problems.Check(AnchorFields.CriticalEdge, anchors.CriticalEdge, path);
        problems.Check(AnchorFields.Category, anchors.Category, path);
        problems.Check(AnchorFields.InstallationFactor, anchors.InstallationFactor, path);
        problems.Check(AnchorFields.Spacing, anchors.Spacing, path);
        problems.Check(AnchorFields.EdgeFlood, anchors.EdgeFlood, path);
        problems.Check(AnchorFields.EdgeProtected, anchors.EdgeProtected, path);
        problems.Check(AnchorFields.EdgeLeft, anchors.EdgeLeft, path);
        problems.Check(AnchorFields.EdgeRight, anchors.EdgeRight, path);
        problems.Check(AnchorFields.MemberThickness, anchors.MemberThickness, path);
        problems.Check(AnchorFields.WasherThickness, anchors.WasherThickness, path);
        problems.Check(AnchorFields.TensionResistance, anchors.TensionResistance, path);
        problems.Check(AnchorFields.ShearResistance, anchors.ShearResistance, path);
        problems.Check(AnchorFields.InteractionLimit, anchors.InteractionLimit, path);
        problems.Check(AnchorFields.MinimumEdge, anchors.MinimumEdge, path);
        problems.Check(AnchorFields.MinimumSpacing, anchors.MinimumSpacing, path);
        if (anchors.Method != AnchorMethod.Approval && anchors.MemberThickness > 0 && anchors.Depth >= anchors.MemberThickness)
        {
            problems.Add($"{path}.depth", $"Effective depth is {Section(anchors.Depth):typed}; allowed is less than the concrete thickness, {Section(anchors.MemberThickness)}.");
        }

        if (anchors.Ultimate > 0 && anchors.Yield > anchors.Ultimate)
        {
            problems.Add($"{path}.yield", $"Anchor yield strength is {new Quantity(anchors.Yield, Dimension.Stress):typed}; allowed is up to the ultimate strength, {new Quantity(anchors.Ultimate, Dimension.Stress)}.");
        }
    }

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}
