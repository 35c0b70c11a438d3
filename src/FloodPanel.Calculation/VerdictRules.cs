using FloodPanel.Calculation.Parts;
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
        Opening opening,
        OpeningModel model,
        IReadOnlyList<CaseResult> cases,
        Check freeboard,
        IReadOnlyList<string> uncovered,
        IReadOnlyList<PartGap> gaps)
    {
        var governing = Governing(cases, freeboard);
        var missing = Missing(opening, model, uncovered, gaps);
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

    private static List<string> Missing(
        Opening opening, OpeningModel model, IReadOnlyList<string> uncovered, IReadOnlyList<PartGap> gaps)
    {
        var missing = new List<string>();
        foreach (var check in NeededChecks.MayBeByOthers)
        {
            var hasStresses = check switch
            {
                NeededChecks.Logs => model.Runs.All(run => run.Log.IsComplete),
                NeededChecks.Posts => model.Post is null || model.Post.IsComplete,
                _ => true,
            };
            var hasResult = hasStresses && gaps.All(gap => gap.Check != check);
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
        var hasPosts = cases[0].Posts.Count > 0;
        Governing? worst = freeboard.Passes ? null : new(freeboard.Name, null, freeboard.Utilisation, "");
        foreach (var (check, result, member) in Checks(cases))
        {
            if (check.MayGovern && (worst is null || check.Utilisation > worst.Utilisation))
            {
                worst = new(check.Name, result.Name, check.Utilisation, Name(member, hasPosts));
            }
        }

        return worst;
    }

    private static string Name(object member, bool hasPosts) => member switch
    {
        LogResult log when hasPosts => FormattableString.Invariant($"log {log.Index} in bay {log.Bay}"),
        LogResult log => FormattableString.Invariant($"log {log.Index}"),
        PostResult post => FormattableString.Invariant($"post {post.Index}"),
        PartResult part => part.Member,
        _ => throw new ArgumentOutOfRangeException(nameof(member), member, "is not a member"),
    };

    /// <summary>Each check with its case and the log, post or part that it is of.</summary>
    private static IEnumerable<(Check Check, CaseResult Case, object Member)> Checks(IReadOnlyList<CaseResult> cases)
    {
        foreach (var result in cases)
        {
            foreach (var log in result.Logs)
            {
                foreach (var check in log.Checks)
                {
                    yield return (check, result, log);
                }
            }

            foreach (var post in result.Posts)
            {
                foreach (var check in post.Checks)
                {
                    yield return (check, result, post);
                }
            }

            foreach (var part in result.Parts)
            {
                foreach (var check in part.Checks)
                {
                    yield return (check, result, part);
                }
            }
        }
    }
}
