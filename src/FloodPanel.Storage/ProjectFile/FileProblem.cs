namespace FloodPanel.Storage.ProjectFile;

/// <summary>Why a file cannot be opened.</summary>
/// <param name="Path">JSON path, "openings[0].barrier.logs.count"; empty for the file as a whole.</param>
/// <param name="Message">A sentence with the value and what is allowed.</param>
public sealed record FileProblem(string Path, string Message)
{
    /// <summary>Path and sentence on one line.</summary>
    public override string ToString() => Path.Length == 0 ? Message : $"{Path}: {Message}";
}

/// <summary>What reading a file gave.</summary>
/// <param name="Project">The project; null when there are problems.</param>
/// <param name="Problems">All problems, in the order of the file.</param>
public sealed record ProjectFileReading(Project? Project, IReadOnlyList<FileProblem> Problems);
