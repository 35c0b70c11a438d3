namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in a project's own design basis.</summary>
internal static class BasisValidation
{
    private const string Path = "ownBasis";

    public static void Validate(Project project, ProblemList problems)
    {
        if (project.OwnBasis is not { } basis)
        {
            return;
        }

        if (basis.Kind != project.DesignBasis)
        {
            problems.Add(Path, $"The project's own design basis was copied from {basis.Kind}, and the project names {project.DesignBasis}; copy it from that one, or drop it.");
        }

        if (string.IsNullOrWhiteSpace(basis.Title))
        {
            problems.Add($"{Path}.title", $"Title of the project's own design basis is empty; give it a name that says what it follows.");
        }

        Factors(basis.Inland, $"{Path}.inland", problems);
        Factors(basis.Coastal, $"{Path}.coastal", problems);
        for (var i = 0; i < basis.Strengths.Count; i++)
        {
            var (rule, path) = (basis.Strengths[i], $"{Path}.strengths[{i}]");
            problems.CheckAt(Fields.StrengthFactor, rule.Multiplier, $"{path}.multiplier");
            problems.CheckAt(Fields.StrengthFactor, rule.Divisor, $"{path}.divisor");
            if (basis.Strengths.Take(i).Any(earlier => earlier.Family == rule.Family))
            {
                problems.Add($"{path}.family", $"Family {rule.Family.ToString().ToLowerInvariant()} has an earlier rule; each family takes one.");
            }
        }
    }

    private static void Factors(LoadFactors factors, string path, ProblemList problems)
    {
        problems.CheckAt(Fields.LoadFactor, factors.FloodSide, $"{path}.floodSide");
        problems.CheckAt(Fields.LoadFactor, factors.ProtectedSide, $"{path}.protectedSide");
        problems.CheckAt(Fields.LoadFactor, factors.BrimFull, $"{path}.brimFull");
        problems.CheckAt(Fields.LoadFactor, factors.Debris, $"{path}.debris");
        problems.CheckAt(Fields.LoadFactor, factors.Wind, $"{path}.wind");
        problems.CheckAt(Fields.LoadFactor, factors.Line, $"{path}.line");
    }
}
