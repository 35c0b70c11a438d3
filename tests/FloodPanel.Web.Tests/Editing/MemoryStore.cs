using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Tests.Editing;

/// <summary>A store in memory that refuses a save over a newer revision, and fails when told to.</summary>
public sealed class MemoryStore(TimeProvider time)
{
    private readonly Dictionary<Guid, List<Project>> projects = [];

    public Exception? Failure { get; set; }

    public ProjectAccess Access => new(OpenAsync, SaveAsync, CreateAsync);

    public IReadOnlyList<Project> Revisions(Guid id) => projects[id];

    public IEnumerable<Guid> Ids => projects.Keys;

    public Guid Put(Project project)
    {
        var id = Guid.NewGuid();
        projects[id] = [project];
        return id;
    }

    /// <summary>A save by somebody else.</summary>
    public void SaveByAnother(Guid id, Project project) => projects[id].Add(project);

    private Task<OpenedProject?> OpenAsync(Guid id) => Task.FromResult(
        projects.TryGetValue(id, out var revisions)
            ? new OpenedProject(id, revisions.Count, time.GetUtcNow(), revisions[^1])
            : null);

    private Task<SaveOutcome> SaveAsync(Guid id, int openedRevision, Project project)
    {
        if (Failure is not null)
        {
            return Task.FromException<SaveOutcome>(Failure);
        }

        var revisions = projects[id];
        var accepted = openedRevision == revisions.Count;
        if (accepted)
        {
            revisions.Add(project);
        }

        return Task.FromResult(new SaveOutcome(accepted, revisions.Count, time.GetUtcNow()));
    }

    private async Task<OpenedProject> CreateAsync(Project project) => (await OpenAsync(Put(project)))!;
}
