using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Startup;

/// <summary>Projects in memory, until the store is connected.</summary>
public sealed class MemoryProjects(TimeProvider time)
{
    private readonly Dictionary<Guid, OpenedProject> projects = [];

    public ProjectAccess Access => new(
        id => Task.FromResult(projects.GetValueOrDefault(id)),
        (id, revision, project) => Task.FromResult(Save(id, revision, project)),
        project => Task.FromResult(Put(Guid.NewGuid(), 1, project)));

    private SaveOutcome Save(Guid id, int revision, Project project)
    {
        var stored = projects[id];
        if (stored.Revision == revision)
        {
            stored = Put(id, revision + 1, project);
            return new SaveOutcome(true, stored.Revision, stored.SavedAt);
        }

        return new SaveOutcome(false, stored.Revision, stored.SavedAt);
    }

    private OpenedProject Put(Guid id, int revision, Project project) =>
        projects[id] = new OpenedProject(id, revision, time.GetUtcNow(), project);
}
