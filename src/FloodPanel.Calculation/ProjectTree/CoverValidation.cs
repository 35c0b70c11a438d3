using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in covers.</summary>
internal static class CoverValidation
{
    public static void Validate(Site site, Cover cover, string path, ProblemList problems, Library library)
    {
        if (string.IsNullOrWhiteSpace(cover.Name))
        {
            problems.Add($"{path}.name", $"Name of the cover is empty; give it one that says where it is.");
        }

        Plate(cover.Plate, $"{path}.plate", problems);
        var depth = FloodLevels.Depth(site.DesignFloodLevel, cover.Level);
        if (problems.Check(CoverFields.Level, cover.Level, path) && depth > Validation.GreatestRetainedDepth)
        {
            problems.Add($"{path}.level", $"Level is {Length(cover.Level)}, {Length(depth):typed} below the design flood level, {Length(site.DesignFloodLevel)}; allowed is up to {Length(Validation.GreatestRetainedDepth)} below it.");
        }

        ChoiceValidation.Material(cover.Material, $"{path}.material", problems, library);
        problems.Check(CoverFields.Thickness, cover.Thickness, path);
        problems.Check(CoverFields.PoissonRatio, cover.PoissonRatio, path);
        problems.Check(CoverFields.DeflectionLimit, cover.DeflectionLimit, path);
        var fasteners = $"{path}.fasteners";
        problems.Check(CoverFields.Pitch, cover.Fasteners.Pitch, fasteners);
        problems.Check(CoverFields.GasketLoad, cover.Fasteners.GasketLoad, fasteners);
        problems.Check(CoverFields.FixingLever, cover.Fasteners.FixingLever, fasteners);
        problems.Check(CoverFields.Tension, cover.Fasteners.Tension, fasteners);
    }

    private static void Plate(CoverPlate plate, string path, ProblemList problems)
    {
        if (plate is RectangleCover rectangle)
        {
            problems.Check(CoverFields.Width, rectangle.Width, path);
            problems.Check(CoverFields.Height, rectangle.Height, path);
        }
        else if (plate is CircleCover circle)
        {
            problems.Check(CoverFields.Diameter, circle.Diameter, path);
        }
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);
}
