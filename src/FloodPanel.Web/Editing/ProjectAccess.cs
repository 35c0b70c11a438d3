using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Editing;

/// <summary>A project as it stands in the store.</summary>
public sealed record OpenedProject(Guid Id, int Revision, DateTimeOffset SavedAt, Project Project);

/// <summary>What became of a save: accepted, or refused because someone else saved in between.</summary>
public sealed record SaveOutcome(bool Accepted, int Revision, DateTimeOffset SavedAt);

/// <summary>The three things that the editor asks of the store.</summary>
/// <param name="Open">The newest revision; null when there is no such project.</param>
/// <param name="Save">Appends a revision if the newest one is still the one that was opened.</param>
/// <param name="Create">Stores a new project.</param>
public sealed record ProjectAccess(
    Func<Guid, Task<OpenedProject?>> Open,
    Func<Guid, int, Project, Task<SaveOutcome>> Save,
    Func<Project, Task<OpenedProject>> Create);
