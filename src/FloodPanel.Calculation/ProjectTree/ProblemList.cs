namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Collects problems with their paths in the project file.</summary>
internal sealed class ProblemList
{
    private readonly List<InputProblem> problems = [];

    public IReadOnlyList<InputProblem> Problems => problems;

    public void Add(string path, FormattableString message) => problems.Add(new(path, new(message)));

    /// <summary>The field's own limits. Returns true when the value is allowed.</summary>
    public bool Check(Field field, double value, string parent) => CheckAt(field, value, $"{parent}.{field.Key}");

    /// <summary>As <see cref="Check(Field, double, string)"/>, for a value that may be absent.</summary>
    public void Check(Field field, double? value, string parent)
    {
        if (value is { } given)
        {
            Check(field, given, parent);
        }
    }

    /// <summary>As <see cref="Check(Field, double, string)"/>, for a path that does not end in the field's key.</summary>
    public bool CheckAt(Field field, double value, string path)
    {
        var refusal = field.Refusal(value);
        if (refusal is not null)
        {
            problems.Add(new(path, refusal));
        }

        return refusal is null;
    }
}
