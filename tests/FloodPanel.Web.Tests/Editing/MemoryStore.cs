using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Tests.Editing;

/// <summary>A store in memory that refuses a save over a newer revision, and fails when told to.</summary>
public sealed class MemoryStore(TimeProvider time)
{
    private readonly Dictionary<Guid, List<Project>> projects = [];

    private readonly HashSet<Guid> deleted = [];

    public Exception? Failure { get; set; }

    public ProjectAccess Access => new(OpenAsync, SaveAsync, CreateAsync, RestoreAsync);

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

    /// <summary>A deletion by somebody else.</summary>
    public void DeleteByAnother(Guid id) => deleted.Add(id);

    private Task<StoredProject?> OpenAsync(Guid id) => Task.FromResult(
        projects.TryGetValue(id, out var revisions) && !deleted.Contains(id)
            ? new StoredProject(id, revisions.Count, time.GetUtcNow(), revisions[^1])
            : null);

    private Task<SaveOutcome> SaveAsync(Guid id, int openedRevision, Project project)
    {
        if (Failure is not null)
        {
            return Task.FromException<SaveOutcome>(Failure);
        }

        if (deleted.Contains(id))
        {
            return Task.FromResult<SaveOutcome>(new ProjectGone());
        }

        var revisions = projects[id];
        if (openedRevision != revisions.Count)
        {
            return Task.FromResult<SaveOutcome>(new SaveConflict(new StoredProject(id, revisions.Count, time.GetUtcNow(), revisions[^1])));
        }

        revisions.Add(project);
        return Task.FromResult<SaveOutcome>(new ProjectSaved(revisions.Count, time.GetUtcNow()));
    }

    private Task<bool> RestoreAsync(Guid id) => Task.FromResult(deleted.Remove(id));

    private async Task<StoredProject> CreateAsync(Project project) => (await OpenAsync(Put(project)))!;
}
