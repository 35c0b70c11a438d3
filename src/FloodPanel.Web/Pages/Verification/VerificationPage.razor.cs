using FloodPanel.Calculation.Verification;

namespace FloodPanel.Web.Pages.Verification;

/// <summary>The verification table, computed when the page is opened.</summary>
public sealed partial class VerificationPage
{
    private readonly IGrouping<string, VerificationRow>[] groups = [.. VerificationTable.Rows().GroupBy(row => row.Source)];

    private string Summary
    {
        get
        {
            var rows = groups.SelectMany(group => group).ToArray();
            var agreeing = rows.Count(row => row.Agrees);
            return agreeing == rows.Length
                ? FormattableString.Invariant($"All {rows.Length} agree.")
                : FormattableString.Invariant($"{agreeing} of {rows.Length} agree: do not rely on this build.");
        }
    }

    private static string Name(Evidence evidence) => evidence switch
    {
        Evidence.Read => "read",
        Evidence.Secondary => "secondary",
        Evidence.Derived => "derived",
        _ => "memory",
    };

    private static string Meaning(Evidence evidence) => evidence switch
    {
        Evidence.Read => "read in a copy of the source",
        Evidence.Secondary => "read in a text that cites the source",
        Evidence.Derived => "derived or recomputed outside this program; no document prints it",
        _ => "from memory: check it against the source",
    };
}
