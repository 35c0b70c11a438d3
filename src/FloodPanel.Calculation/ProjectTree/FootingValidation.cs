namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in a footing and in a wall.</summary>
internal static class FootingValidation
{
    public static void Validate(FootingInput footing, string path, ProblemList problems)
    {
        problems.Check(FootingFields.Width, footing.Width, path);
        problems.Check(FootingFields.Thickness, footing.Thickness, path);
        problems.Check(FootingFields.Density, footing.Density, path);
        problems.Check(FootingFields.Friction, footing.Friction, path);
        problems.Check(FootingFields.Adhesion, footing.Adhesion, path);
        problems.Check(FootingFields.AllowableBearing, footing.AllowableBearing, path);
        problems.Check(FootingFields.CutOff, footing.CutOff, path);
        problems.Check(FootingFields.SlidingFactor, footing.SlidingFactor, path);
        problems.Check(FootingFields.OverturningFactor, footing.OverturningFactor, path);
        problems.Check(FootingFields.FlotationFactor, footing.FlotationFactor, path);
        problems.Check(FootingFields.ContactShare, footing.ContactShare, path);
        if (problems.Check(FootingFields.BarrierFromFloodEdge, footing.BarrierFromFloodEdge, path)
            && footing.Width > 0 && footing.BarrierFromFloodEdge > footing.Width)
        {
            problems.Add(
                $"{path}.{FootingFields.BarrierFromFloodEdge.Key}",
                $"The barrier stands {new Quantity(footing.BarrierFromFloodEdge, Dimension.Length):typed} from the flood edge; allowed is up to the footing width, {new Quantity(footing.Width, Dimension.Length)}.");
        }
    }

    public static void Validate(WallInput? wall, string path, ProblemList problems)
    {
        problems.Check(WallFields.LineResistance, wall?.LineResistance, path);
        problems.Check(WallFields.TotalResistance, wall?.TotalResistance, path);
    }
}
