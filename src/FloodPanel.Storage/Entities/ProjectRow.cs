namespace FloodPanel.Storage.Entities;

/// <summary>What the list of projects shows, and the number that guards against overwriting.</summary>
public class ProjectRow
{
    public Guid Id { get; set; }

    public string Name { get; set; } = "";

    public string Reference { get; set; } = "";

    public string Client { get; set; } = "";

    public int OpeningCount { get; set; }

    /// <summary>Number of the newest revision. A save must have opened this one.</summary>
    public int CurrentRevision { get; set; }

    public DateTimeOffset CreatedAt { get; set; }

    public DateTimeOffset ModifiedAt { get; set; }

    /// <summary>When the project was deleted; null while it is not. Nothing is ever erased.</summary>
    public DateTimeOffset? DeletedAt { get; set; }
}
