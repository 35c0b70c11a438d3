namespace FloodPanel.Storage.ProjectFile;

/// <summary>Problems found so far. A hostile file can hold millions: the first hundred are told, the rest counted.</summary>
internal sealed class ProblemList
{
    private const int Told = 100;

    private readonly List<FileProblem> problems = [];
    private int untold;

    public bool IsEmpty => problems.Count == 0;

    public void Add(string path, string message)
    {
        if (problems.Count < Told)
        {
            problems.Add(new FileProblem(path, message));
        }
        else
        {
            untold++;
        }
    }

    public IReadOnlyList<FileProblem> ToList() =>
        untold == 0 ? problems : [.. problems, new FileProblem("", $"There are {untold} further problems.")];
}
