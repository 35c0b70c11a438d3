using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;

namespace FloodPanel.Web.Editing;

/// <summary>What the editor asks of the store.</summary>
/// <param name="Open">The newest revision; null when there is no such project, or it was deleted.</param>
/// <param name="Save">Appends a revision if the newest one is still the one that was opened.</param>
/// <param name="Create">Stores a new project.</param>
/// <param name="Restore">Brings a deleted project back.</param>
public sealed record ProjectAccess(
    Func<Guid, Task<StoredProject?>> Open,
    Func<Guid, int, Project, Task<SaveOutcome>> Save,
    Func<Project, Task<StoredProject>> Create,
    Func<Guid, Task<bool>> Restore)
{
    public static ProjectAccess To(ProjectStore store) => new(
        id => store.OpenAsync(id),
        (id, revision, project) => store.SaveAsync(id, revision, project),
        project => store.CreateAsync(project),
        id => store.RestoreAsync(id));
}
