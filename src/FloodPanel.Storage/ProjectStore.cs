using FloodPanel.Storage.Entities;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace FloodPanel.Storage;

/// <summary>
/// The projects of this installation. Every save appends a revision; nothing is overwritten or erased. Each method
/// throws <see cref="StoreException"/>, with a sentence for the user, when the database cannot do its part.
/// </summary>
public sealed class ProjectStore(IDbContextFactory<FloodPanelDb> databases, TimeProvider clock)
{
    /// <summary>Projects that are not deleted, the last modified first.</summary>
    /// <param name="search">Words that must all occur in name, reference or client; null or blank for all.</param>
    /// <param name="cancellation">Stops waiting.</param>
    public async Task<IReadOnlyList<ProjectSummary>> ListAsync(string? search = null, CancellationToken cancellation = default)
    {
        var rows = await WithDatabaseAsync(
            db => db.Projects.AsNoTracking().Present()
                .OrderByDescending(p => p.ModifiedAt).ThenBy(p => p.Id)
                .Select(p => new ProjectSummary(
                    p.Id, p.Name, p.Reference, p.Client, p.OpeningCount, p.CurrentRevision, p.CreatedAt, p.ModifiedAt))
                .ToListAsync(cancellation),
            cancellation);

        // Searched here and not in SQLite, whose LIKE knows upper and lower case of A to Z only.
        var words = search?.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries) ?? [];
        return [.. rows.Where(row => words.All(word => Mentions(row, word)))];
    }

    /// <summary>Stores a new project as its revision 1.</summary>
    public Task<StoredProject> CreateAsync(Project project, CancellationToken cancellation = default)
    {
        var json = RevisionText.Of(project);
        var now = Now();
        var row = new ProjectRow { Id = Guid.NewGuid(), CurrentRevision = 1, CreatedAt = now, ModifiedAt = now };
        Describe(row, project);
        return WithDatabaseAsync(
            async db =>
            {
                db.Add(row);
                db.Add(new RevisionRow { ProjectId = row.Id, Number = 1, SavedAt = now, Json = json });
                await db.SaveChangesAsync(cancellation);
                return new StoredProject(row.Id, 1, now, project);
            },
            cancellation);
    }

    /// <summary>The newest revision; null when the project is not there or was deleted.</summary>
    public async Task<StoredProject?> OpenAsync(Guid id, CancellationToken cancellation = default) =>
        await WithDatabaseAsync(db => NewestAsync(db, id, cancellation), cancellation) is { } newest
            ? RevisionText.Open(newest)
            : null;

    /// <summary>Appends a revision, if the one that was opened is still the newest.</summary>
    /// <param name="id">The project.</param>
    /// <param name="openedRevision">The revision that was opened or last saved.</param>
    /// <param name="project">The project as it is now.</param>
    /// <param name="cancellation">Stops waiting; the save is then made whole or not at all.</param>
    public Task<SaveOutcome> SaveAsync(
        Guid id, int openedRevision, Project project, CancellationToken cancellation = default)
    {
        var revision = new RevisionRow
        {
            ProjectId = id,
            Number = openedRevision + 1,
            SavedAt = Now(),
            Json = RevisionText.Of(project),
        };
        return WithDatabaseAsync(db => AppendAsync(db, revision, project, cancellation), cancellation);
    }

    /// <summary>Stores the newest revision as a new project; null when the project is not there or was deleted.</summary>
    public async Task<StoredProject?> DuplicateAsync(Guid id, CancellationToken cancellation = default) =>
        await OpenAsync(id, cancellation) is { Project: var original }
            ? await CreateAsync(original with { Name = $"{original.Name} (copy)" }, cancellation)
            : null;

    /// <summary>Takes a project off the list; <see cref="RestoreAsync"/> brings it back. False when it is not there.</summary>
    public Task<bool> DeleteAsync(Guid id, CancellationToken cancellation = default) =>
        MarkAsync(id, deletedAt: Now(), cancellation);

    /// <summary>Brings a deleted project back. False when it is not there, or is not deleted.</summary>
    public Task<bool> RestoreAsync(Guid id, CancellationToken cancellation = default) =>
        MarkAsync(id, deletedAt: null, cancellation);

    /// <summary>The revisions of a project, the newest first.</summary>
    public async Task<IReadOnlyList<ProjectRevision>> RevisionsAsync(Guid id, CancellationToken cancellation = default) =>
        await WithDatabaseAsync(
            db => db.Revisions.Where(r => r.ProjectId == id)
                .OrderByDescending(r => r.Number)
                .Select(r => new ProjectRevision(r.Number, r.SavedAt))
                .ToListAsync(cancellation),
            cancellation);

    private static async Task<SaveOutcome> AppendAsync(
        FloodPanelDb db, RevisionRow revision, Project project, CancellationToken cancellation)
    {
        await using var transaction = await db.Database.BeginTransactionAsync(cancellation);
        if (await NewestAsync(db, revision.ProjectId, cancellation) is not { } newest)
        {
            return new ProjectGone();
        }

        // The same text needs no revision, even when a newer one holds it: an answer lost on the way is asked again.
        if (newest.Json == revision.Json)
        {
            return new ProjectSaved(newest.Number, newest.SavedAt);
        }

        if (!await AdvanceAsync(db, revision, project, cancellation))
        {
            return new SaveConflict(RevisionText.Open(newest));
        }

        db.Add(revision);
        await db.SaveChangesAsync(cancellation);
        await transaction.CommitAsync(cancellation);
        return new ProjectSaved(revision.Number, revision.SavedAt);
    }

    private static Task<RevisionRow?> NewestAsync(FloodPanelDb db, Guid id, CancellationToken cancellation) =>
        db.Projects.Present().Where(p => p.Id == id)
            .Join(db.Revisions, p => new { p.Id, Number = p.CurrentRevision }, r => new { Id = r.ProjectId, r.Number }, (p, r) => r)
            .AsNoTracking()
            .SingleOrDefaultAsync(cancellation);

    /// <summary>Moves the project's row to the revision in the database itself; false when it does not stand at the one before.</summary>
    private static async Task<bool> AdvanceAsync(
        FloodPanelDb db, RevisionRow revision, Project project, CancellationToken cancellation)
    {
        var described = new ProjectRow();
        Describe(described, project);
        var changed = await db.Projects
            .Where(p => p.Id == revision.ProjectId && p.CurrentRevision == revision.Number - 1 && p.DeletedAt == null)
            .ExecuteUpdateAsync(
                row => row
                    .SetProperty(p => p.CurrentRevision, revision.Number)
                    .SetProperty(p => p.ModifiedAt, revision.SavedAt)
                    .SetProperty(p => p.Name, described.Name)
                    .SetProperty(p => p.Reference, described.Reference)
                    .SetProperty(p => p.Client, described.Client)
                    .SetProperty(p => p.OpeningCount, described.OpeningCount),
                cancellation);
        return changed == 1;
    }

    private static void Describe(ProjectRow row, Project project)
    {
        row.Name = project.Name;
        row.Reference = project.Reference;
        row.Client = project.Client;
        row.OpeningCount = project.Openings.Count;
    }

    private static bool Mentions(ProjectSummary row, string word) =>
        row.Name.Contains(word, StringComparison.OrdinalIgnoreCase)
        || row.Reference.Contains(word, StringComparison.OrdinalIgnoreCase)
        || row.Client.Contains(word, StringComparison.OrdinalIgnoreCase);

    private Task<bool> MarkAsync(Guid id, DateTimeOffset? deletedAt, CancellationToken cancellation) =>
        WithDatabaseAsync(
            async db => await db.Projects
                .Where(p => p.Id == id && (p.DeletedAt == null) == (deletedAt != null))
                .ExecuteUpdateAsync(row => row.SetProperty(p => p.DeletedAt, deletedAt), cancellation) == 1,
            cancellation);

    /// <summary>One context for one piece of work; what the database refuses is told in a sentence.</summary>
    private async Task<T> WithDatabaseAsync<T>(Func<FloodPanelDb, Task<T>> work, CancellationToken cancellation)
    {
        try
        {
            await using var db = await databases.CreateDbContextAsync(cancellation);
            return await work(db);
        }
        catch (Exception e) when ((e as SqliteException ?? e.InnerException as SqliteException) is { } fault)
        {
            throw new StoreException($"The database does not answer ({fault.Message.TrimEnd('.')}); what was saved before is safe.", fault);
        }
    }

    // To the millisecond, as stored, so that a time returned equals the same time read back.
    private DateTimeOffset Now() => DateTimeOffset.FromUnixTimeMilliseconds(clock.GetUtcNow().ToUnixTimeMilliseconds());
}
