using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>The entry to the calculation: pure, synchronous, without I/O.</summary>
public static class Design
{
    /// <summary>Calculates every opening of a project.</summary>
    /// <param name="project">A project without problems, see <see cref="Validation.Validate"/>.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public static ProjectResult Run(Project project, Library library) =>
        new(project, [.. project.Openings.Select(o => Evaluate(project, o, library))]);

    /// <summary>Calculates one opening of a project.</summary>
    /// <param name="project">The project: its site and design basis apply.</param>
    /// <param name="opening">An opening without problems, see <see cref="Validation.Validate"/>.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public static OpeningResult Evaluate(Project project, Opening opening, Library library) =>
        throw new InvalidOperationException($"{project.Name} {opening.Name} {library}");
}
