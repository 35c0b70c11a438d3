using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>
/// Adequate only when every needed check ran and passed; inadequate when one fails; incomplete when none fails but
/// one has no result. A declaration that others design a part stands for a check without a result, never for one
/// that failed here.
/// </summary>
internal static class VerdictRules
{
    public static Verdict Of(
        Opening opening, OpeningModel model, IReadOnlyList<CaseResult> cases, Check freeboard, IReadOnlyList<string> uncovered)
    {
        var governing = Governing(cases, freeboard);
        var missing = Missing(opening, model, uncovered);
        var fails = !freeboard.Passes || Checks(cases).Any(c => !c.Check.Passes);
        var kind = fails ? VerdictKind.Inadequate
            : missing.Count > 0 ? VerdictKind.Incomplete
            : VerdictKind.Adequate;
        return new(kind, missing, governing, VerdictWords.Sentence(kind, missing, governing));
    }

    /// <summary>True when the check is declared to be made by somebody who is named, with a reference.</summary>
    public static bool IsByOthers(Opening opening, string check) =>
        opening.Barrier.ByOthers.Any(d => d.Check == check && IsNamed(d));

    public static bool IsNamed(DesignedByOthers declaration) =>
        !string.IsNullOrWhiteSpace(declaration.Name) && !string.IsNullOrWhiteSpace(declaration.Reference);

    private static List<string> Missing(Opening opening, OpeningModel model, IReadOnlyList<string> uncovered)
    {
        var missing = new List<string>();
        foreach (var check in NeededChecks.MayBeByOthers)
        {
            var hasResult = check switch
            {
                NeededChecks.Logs => model.Log.IsComplete,
                NeededChecks.Posts => model.Post is null || model.Post.IsComplete,
                NeededChecks.BasePlates => model.Post is null,
                _ => false,
            };
            if (!hasResult && !IsByOthers(opening, check))
            {
                missing.Add(check);
            }
        }

        missing.AddRange(uncovered);
        return missing;
    }

    private static Governing? Governing(IReadOnlyList<CaseResult> cases, Check freeboard)
    {
        Governing? worst = freeboard.Passes ? null : new(freeboard.Name, null, freeboard.Utilisation, "");
        foreach (var (check, caseName, member, number, bay) in Checks(cases))
        {
            if (worst is null || check.Utilisation > worst.Utilisation)
            {
                worst = new(check.Name, caseName, check.Utilisation, Member(member, number, bay, cases));
            }
        }

        return worst;
    }

    private static string Member(string member, int number, int bay, IReadOnlyList<CaseResult> cases) =>
        bay > 0 && cases[0].Posts.Count > 0 ? $"{member} {number} in bay {bay}" : $"{member} {number}";

    private static IEnumerable<(Check Check, string Case, string Member, int Number, int Bay)> Checks(
        IReadOnlyList<CaseResult> cases)
    {
        foreach (var result in cases)
        {
            foreach (var log in result.Logs)
            {
                foreach (var check in log.Checks)
                {
                    yield return (check, result.Name, "log", log.Index, log.Bay);
                }
            }

            foreach (var post in result.Posts)
            {
                foreach (var check in post.Checks)
                {
                    yield return (check, result.Name, "post", post.Index, 0);
                }
            }
        }
    }
}
