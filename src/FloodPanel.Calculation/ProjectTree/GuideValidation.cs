namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in guides and in how they fit their wall and their barrier.</summary>
internal static class GuideValidation
{
    /// <summary>Lengths that agree to this are equal [m].</summary>
    private const double Rounding = 1e-9;

    public static void Validate(Barrier barrier, string barrierPath, ProblemList problems, Library library)
    {
        if (barrier.Guides is not { } guides)
        {
            return;
        }

        var path = $"{barrierPath}.guides";
        ChoiceValidation.Material(guides.Material, $"{path}.material", problems, library);
        problems.Check(GuideFields.LipThickness, guides.LipThickness, path);
        problems.Check(GuideFields.LipLever, guides.LipLever, path);
        problems.Check(GuideFields.BaseThickness, guides.BaseThickness, path);
        var offset = problems.Check(GuideFields.LoadOffset, guides.LoadOffset, path);
        var distance = problems.Check(GuideFields.BearingDistance, guides.BearingDistance, path);
        var width = problems.Check(GuideFields.BearingWidth, guides.BearingWidth, path);
        problems.Check(GuideFields.WallBearing, guides.WallBearing, path);
        var (edge, hole) = Fasteners(guides.Fasteners, $"{path}.fasteners", problems);
        if (distance && width)
        {
            Strip(guides, edge, path, problems);
        }

        if (hole && offset && distance)
        {
            Hole(guides, $"{path}.fasteners.holeDiameter", problems);
        }

        EndDistance(barrier, guides.Fasteners.EndDistance, $"{path}.fasteners.endDistance", problems, library);
    }

    private static (bool Edge, bool Hole) Fasteners(GuideFasteners fasteners, string path, ProblemList problems)
    {
        problems.Check(GuideFields.Pitch, fasteners.Pitch, path);
        problems.Check(GuideFields.EndDistance, fasteners.EndDistance, path);
        var edge = problems.Check(GuideFields.EdgeDistance, fasteners.EdgeDistance, path);
        var hole = problems.Check(GuideFields.HoleDiameter, fasteners.HoleDiameter, path);
        problems.Check(GuideFields.Tension, fasteners.Tension, path);
        problems.Check(GuideFields.Shear, fasteners.Shear, path);
        problems.Check(GuideFields.MinimumEdge, fasteners.MinimumEdge, path);
        problems.Check(GuideFields.MinimumSpacing, fasteners.MinimumSpacing, path);
        problems.Check(GuideFields.InteractionLimit, fasteners.InteractionLimit, path);
        return (edge, hole);
    }

    /// <summary>The strip lies beside the fasteners and, where it lies towards the arris, on the wall.</summary>
    private static void Strip(GuideSet guides, bool isEdgeAllowed, string path, ProblemList problems)
    {
        var (distance, width, edge) = (guides.BearingDistance, guides.BearingWidth, guides.Fasteners.EdgeDistance);
        if (width > 2 * distance + Rounding)
        {
            problems.Add($"{path}.bearingWidth", $"Bearing width is {Section(width):typed}; allowed is at most twice the bearing distance, {Section(2 * distance):typed}, or the strip reaches past the fasteners.");
        }
        else if (isEdgeAllowed && guides.Mounting != GuideMounting.DryFace && distance + width / 2 > edge + Rounding)
        {
            problems.Add($"{path}.bearingDistance", $"The strip that bears on the wall ends {Section(distance + width / 2):typed} from the fasteners; allowed is at most the edge distance, {Section(edge):typed}, or it reaches past the arris.");
        }
    }

    /// <summary>On a dry face the base bends at the fasteners: something must be left beside the hole.</summary>
    private static void Hole(GuideSet guides, string path, ProblemList problems)
    {
        var least = 2 * Math.Min(guides.LoadOffset, guides.BearingDistance);
        if (guides.Mounting == GuideMounting.DryFace && guides.Fasteners.HoleDiameter >= least)
        {
            problems.Add(path, $"Hole diameter is {Section(guides.Fasteners.HoleDiameter):typed}; allowed is less than {Section(least):typed}, twice the smaller of load offset and bearing distance.");
        }

        if (guides.Fasteners.HoleDiameter >= guides.Fasteners.Pitch && GuideFields.Pitch.Allows(guides.Fasteners.Pitch))
        {
            problems.Add(path, $"Hole diameter is {Section(guides.Fasteners.HoleDiameter):typed}; allowed is less than the fastener pitch, {Section(guides.Fasteners.Pitch):typed}.");
        }
    }

    private static void EndDistance(Barrier barrier, double end, string path, ProblemList problems, Library library)
    {
        var heights = barrier.Logs.Groups.Select(group => group.Count * (library.Find(group.Profile)?.Height ?? double.NaN)).Sum();
        if (heights > 0 && GuideFields.EndDistance.Allows(end) && 2 * end >= heights - Rounding)
        {
            problems.Add(path, $"End distance is {Section(end):typed}; allowed is less than half of the stack of logs, {Section(heights / 2):typed}, so that a guide has two fasteners.");
        }
    }

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}
