using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation;

/// <summary>Finds what the calculation cannot take. Paths are those of the project file.</summary>
public static class Validation
{
    /// <summary>Greatest retained depth that is taken for a depth and not for a slip in a level [m].</summary>
    public const double GreatestRetainedDepth = 20;

    /// <summary>All problems of a project, in the order of the file; empty when it can be calculated.</summary>
    /// <param name="project">The project.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public static IReadOnlyList<InputProblem> Validate(this Project project, Library library)
    {
        var problems = new ProblemList();
        if (string.IsNullOrWhiteSpace(project.Name))
        {
            problems.Add("name", $"Project name is empty; give the project a name.");
        }

        BasisValidation.Validate(project, problems);
        ValidateSite(project.Site, problems);
        var ids = new HashSet<string>(StringComparer.Ordinal);
        for (var i = 0; i < project.Openings.Count; i++)
        {
            var (opening, path) = (project.Openings[i], $"openings[{i}]");
            if (!IsIdentifier(opening.Id))
            {
                problems.Add($"{path}.id", $"Id is \"{opening.Id}\"; allowed are 1 to 60 letters, digits and hyphens.");
            }
            else if (!ids.Add(opening.Id))
            {
                problems.Add($"{path}.id", $"Id \"{opening.Id}\" is used by an earlier opening; each needs its own.");
            }

            ValidateOpening(project.Site, opening, path, problems, library);
        }

        for (var i = 0; i < project.Covers.Count; i++)
        {
            CoverValidation.Validate(project.Site, project.Covers[i], $"covers[{i}]", problems, library);
        }

        return problems.Problems;
    }

    /// <summary>Problems of one opening, its site and its basis, with the paths that they have in a project of their own.</summary>
    /// <param name="project">The project: site and design basis.</param>
    /// <param name="opening">The opening.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    internal static IReadOnlyList<InputProblem> Problems(Project project, Opening opening, Library library)
    {
        var problems = new ProblemList();
        BasisValidation.Validate(project, problems);
        ValidateSite(project.Site, problems);
        ValidateOpening(project.Site, opening, "openings[0]", problems, library);
        return problems.Problems;
    }

    /// <summary>Problems of one cover, the site and the basis, with the paths that they have in a project of their own.</summary>
    internal static IReadOnlyList<InputProblem> Problems(Project project, Cover cover, Library library)
    {
        var problems = new ProblemList();
        BasisValidation.Validate(project, problems);
        ValidateSite(project.Site, problems);
        CoverValidation.Validate(project.Site, cover, "covers[0]", problems, library);
        return problems.Problems;
    }

    /// <summary>True for 1 to 60 letters (a to z), digits and hyphens.</summary>
    /// <param name="id">The identifier.</param>
    public static bool IsIdentifier(string id) =>
        id.Length is >= 1 and <= 60 && id.All(c => char.IsAsciiLetterOrDigit(c) || c == '-');

    private static void ValidateSite(Site site, ProblemList problems)
    {
        const string path = "site";
        problems.Check(Fields.WaterDensity, site.WaterDensity, path);
        problems.Check(Fields.AnnualProbability, site.AnnualProbability, path);
        problems.Check(Fields.DesignStillWaterLevel, site.DesignStillWaterLevel, path);
        problems.Check(Fields.Surge, site.Surge, path);
        problems.Check(Fields.ClimateAllowance, site.ClimateAllowance, path);
        problems.Check(Fields.ClimateRate, site.ClimateRatePerYear, path);
        problems.Check(Fields.DesignLife, site.DesignLifeYears, path);
        problems.Check(Fields.Freeboard, site.Freeboard, path);
        for (var i = 0; i < site.Levels.Count; i++)
        {
            ValidateLevel(site.Levels, i, $"{path}.levels[{i}]", problems);
        }
    }

    /// <summary>A level against its own limits and against the levels before it: rarer water stands no lower.</summary>
    private static void ValidateLevel(ValueList<LevelPoint> levels, int index, string path, ProblemList problems)
    {
        var level = levels[index];
        if (!problems.Check(Fields.LevelProbability, level.AnnualProbability, path) | !problems.Check(Fields.LevelValue, level.Level, path))
        {
            return;
        }

        for (var i = 0; i < index; i++)
        {
            var earlier = levels[i];
            if (!Fields.LevelProbability.Allows(earlier.AnnualProbability) || !Fields.LevelValue.Allows(earlier.Level))
            {
                // A row that is refused itself says nothing about this one.
                continue;
            }

            if (LevelCurve.IsSame(earlier.AnnualProbability, level.AnnualProbability))
            {
                problems.Add($"{path}.annualProbability", $"Probability of level {index + 1} is {Chance(level.AnnualProbability):typed}, as of level {i + 1}; each probability takes one level.");
            }
            else if (earlier.AnnualProbability > level.AnnualProbability ? earlier.Level > level.Level : earlier.Level < level.Level)
            {
                var (rare, frequent) = earlier.AnnualProbability < level.AnnualProbability ? (earlier, level) : (level, earlier);
                problems.Add($"{path}.level", $"Level {index + 1} is {Length(level.Level):typed}; the rarer level, {Length(rare.Level):typed} at {Chance(rare.AnnualProbability):typed}, must not stand below the more frequent one, {Length(frequent.Level):typed} at {Chance(frequent.AnnualProbability):typed}.");
            }
        }
    }

    private static Quantity Chance(double value) => new(value, Dimension.Probability);

    private static void ValidateOpening(Site site, Opening opening, string path, ProblemList problems, Library library)
    {
        var sill = problems.Check(Fields.SillLevel, opening.SillLevel, path);
        var retained = FloodLevels.Depth(site.DesignFloodLevel, opening.SillLevel);
        if (sill && retained > GreatestRetainedDepth)
        {
            problems.Add($"{path}.sillLevel", $"Sill level is {Length(opening.SillLevel)}, {Length(retained):typed} below the design flood level, {Length(site.DesignFloodLevel)}; allowed is up to {Length(GreatestRetainedDepth)} below it.");
        }

        problems.Check(Fields.GroundLevel, opening.GroundLevel, path);
        problems.Check(Fields.ClearWidth, opening.ClearWidth, path);
        problems.Check(Fields.ClearHeight, opening.ClearHeight, path);
        problems.Check(Fields.Rake, opening.RakeDegrees, path);
        problems.Check(Fields.ProtectedSideLevel, opening.ProtectedSideLevel, path);
        if (opening.ProtectedSideLevel is { } behind && FloodLevels.Depth(behind, site.DesignFloodLevel) > FloodLevels.LevelTolerance)
        {
            problems.Add($"{path}.protectedSideLevel", $"Protected-side water level is {Length(behind):typed}, above the design flood level, {Length(site.DesignFloodLevel):typed}; allowed is up to that level, because reverse head is not covered.");
        }

        ActionValidation.Validate(opening, path, problems, library);
        BarrierValidation.Validate(opening, path, problems, library);
        ValidateLeakage(opening.Leakage, $"{path}.leakage", problems);
        FootingValidation.Validate(opening.WallBehind, $"{path}.wall", problems);
    }

    private static void ValidateLeakage(LeakageInput? leakage, string path, ProblemList problems)
    {
        problems.Check(Fields.LeakRate, leakage?.Rate, path);
        problems.Check(Fields.RainIntensity, leakage?.RainIntensity, path);
        problems.Check(Fields.RainArea, leakage?.RainArea, path);
        problems.Check(Fields.RunoffCoefficient, leakage?.RunoffCoefficient, path);
        problems.Check(Fields.SumpVolume, leakage?.SumpVolume, path);
        problems.Check(Fields.PumpMargin, leakage?.PumpMargin, path);
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);
}
