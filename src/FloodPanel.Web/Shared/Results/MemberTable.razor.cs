using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The case and check that govern each member. Bays as wide as an earlier one carry the same and have no rows.</summary>
public sealed partial class MemberTable
{
    /// <summary>The result of the opening.</summary>
    [Parameter, EditorRequired]
    public OpeningResult Result { get; set; } = null!;

    private ValueList<double> Bays => Result.Opening.Barrier.Bays;

    private IEnumerable<MemberGoverning> Rows => MemberGoverning.Of(Result)
        .Where(row => row.Bay == 0 || Bays.Take(row.Bay - 1).All(width => width != Bays[row.Bay - 1]));

    private string WordsOf(MemberGoverning row) => row.Member switch
    {
        "log" => Bays.Distinct().Count() > 1 ? $"Log {row.Number}, bay {row.Bay}" : $"Log {row.Number}",
        "post" => $"Post {row.Number}",
        "guide" => $"{Forms.Words.FromName(row.Side)} guide",
        _ => $"{Forms.Words.FromName(row.Member)}, {NeededChecks.Title(row.Part)}",
    };

    private static string NameOf(MemberGoverning row) => row.Member switch
    {
        "log" => FormattableString.Invariant($"log-{row.Number}-bay-{row.Bay}"),
        "post" => FormattableString.Invariant($"post-{row.Number}"),
        "guide" => $"{row.Side}-guide",
        _ => $"{row.Part}-{row.Member.Replace(' ', '-')}",
    };

    private static FigureKey KeyOf(MemberGoverning row, Check check) => row.Part.Length > 0
        ? new(check.Name, "u", row.Case.Name, Part: $"{row.Part}/{row.Member}")
        : new(check.Name, "u", row.Case.Name, row.Number, row.Bay);
}
