using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>
/// What stands in the fields of a page but was not accepted. The page cascades one, fields report to it, and
/// results can say that they do not yet follow what is typed.
/// </summary>
public sealed class TypedProblems
{
    private readonly Dictionary<string, Sentence> byField = [];

    /// <summary>Raised when a problem comes or goes.</summary>
    public event Action? Changed;

    /// <summary>The sentences, by key of the field.</summary>
    public IReadOnlyDictionary<string, Sentence> ByField => byField;

    /// <summary>Notes the problem of a field, or that it has none.</summary>
    public void Set(string field, Sentence? problem)
    {
        var before = byField.GetValueOrDefault(field);
        if (Equals(before, problem))
        {
            return;
        }

        if (problem is null)
        {
            byField.Remove(field);
        }
        else
        {
            byField[field] = problem;
        }

        Changed?.Invoke();
    }
}
