namespace FloodPanel.Storage.LibraryData;

/// <summary>The library cannot be used. The message holds every problem, each with file, line and field.</summary>
public sealed class LibraryFileException(IReadOnlyList<string> problems)
    : Exception(string.Join(Environment.NewLine, problems))
{
    public IReadOnlyList<string> Problems => problems;
}
