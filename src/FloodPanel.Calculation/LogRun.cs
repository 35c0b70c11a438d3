using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>Equal logs that follow each other in a stack.</summary>
/// <param name="First">Position of the lowest of them in the stack, 1 = lowest of all.</param>
/// <param name="Count">Number of logs [-], > 0.</param>
/// <param name="Log">One of the logs.</param>
public sealed record LogRun(int First, int Count, Member Log)
{
    internal static LogRun[] Of(LogStack stack, DesignBasis basis, Library library)
    {
        var runs = new List<LogRun>();
        var first = 1;
        foreach (var group in stack.Groups)
        {
            runs.Add(new(first, group.Count, Member.Of(group.Material, group.Profile, stack.DeflectionLimit, basis, library, stack)));
            first += group.Count;
        }

        return [.. runs];
    }
}
