namespace FloodPanel.Storage;

/// <summary>A project as it was opened.</summary>
/// <param name="Id">Identifier in the store.</param>
/// <param name="Revision">The revision opened; saving must name it.</param>
/// <param name="SavedAt">When that revision was saved.</param>
/// <param name="Project">The project.</param>
public sealed record StoredProject(Guid Id, int Revision, DateTimeOffset SavedAt, Project Project);

/// <summary>One row of the list of projects.</summary>
public sealed record ProjectSummary(
    Guid Id,
    string Name,
    string Reference,
    string Client,
    int OpeningCount,
    int Revision,
    DateTimeOffset CreatedAt,
    DateTimeOffset ModifiedAt);

/// <summary>One saved revision of a project.</summary>
public sealed record ProjectRevision(int Number, DateTimeOffset SavedAt);

/// <summary>What came of saving.</summary>
public abstract record SaveOutcome;

/// <summary>The project stands in the store.</summary>
/// <param name="Revision">The revision that holds it, to be named at the next save.</param>
/// <param name="SavedAt">When that revision was saved.</param>
public sealed record ProjectSaved(int Revision, DateTimeOffset SavedAt) : SaveOutcome;

/// <summary>Somebody saved after this project was opened. Nothing was written.</summary>
/// <param name="Newer">The newer revision.</param>
public sealed record SaveConflict(StoredProject Newer) : SaveOutcome;

/// <summary>The project is not in the store, or was deleted. Nothing was written.</summary>
public sealed record ProjectGone : SaveOutcome;
