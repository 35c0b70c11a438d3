using System.Globalization;
using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation;

/// <summary>The verdict as a sentence.</summary>
internal static class VerdictWords
{
    public static Sentence Sentence(VerdictKind kind, IReadOnlyList<string> missing, Governing? governing)
    {
        var governs = Governs(kind, governing);
        return kind switch
        {
            VerdictKind.Adequate => new($"Adequate. {governs}"),
            VerdictKind.Inadequate when missing.Count > 0 => new($"Inadequate. {governs} Not yet checked are {List(missing)}."),
            VerdictKind.Inadequate => new($"Inadequate. {governs}"),
            _ => new($"Incomplete: not yet checked are {List(missing)}. {governs}"),
        };
    }

    /// <summary>"a, b and c", each as words.</summary>
    public static string List(IReadOnlyList<string> names)
    {
        var words = names.Select(NeededChecks.Title).ToArray();
        return words.Length switch
        {
            1 => words[0],
            _ => $"{string.Join(", ", words[..^1])} and {words[^1]}",
        };
    }

    private static string Governs(VerdictKind kind, Governing? governing)
    {
        if (governing is null)
        {
            return "No member has a result yet.";
        }

        if (governing.Check == NeededChecks.Freeboard)
        {
            return $"Freeboard governs: the barrier should be {Shown(governing.Utilisation)} times as high.";
        }

        var check = Capitalised(governing.Check);
        var where = governing.Case is { } name ? $" in the {CaseNames.InWords(name)} case" : "";
        var utilisation = Shown(governing.Utilisation);
        return kind switch
        {
            VerdictKind.Inadequate => $"{check}{where} governs, at {utilisation} of the allowable.",
            VerdictKind.Adequate => $"Every check made here passes; {check.ToLowerInvariant()}{where} governs, at {utilisation} of the allowable.",
            _ => $"Of what is checked, {check.ToLowerInvariant()}{where} governs, at {utilisation} of the allowable.",
        };
    }

    private static string Capitalised(string check)
    {
        var words = check.Replace('-', ' ');
        return char.ToUpperInvariant(words[0]) + words[1..];
    }

    /// <summary>Two decimals, or words where rounding would hide that it stands above 1.</summary>
    private static string Shown(double utilisation) => utilisation switch
    {
        > 1 and < 1.005 => "just over 1.00",
        _ => utilisation.ToString("0.00", CultureInfo.InvariantCulture),
    };
}
