namespace FloodPanel.Storage.Entities;

/// <summary>One saved state of a project. Rows are only ever added.</summary>
public class RevisionRow
{
    public Guid ProjectId { get; set; }

    /// <summary>1 for the first, then one more each.</summary>
    public int Number { get; set; }

    public DateTimeOffset SavedAt { get; set; }

    /// <summary>The project file.</summary>
    public string Json { get; set; } = "";
}
