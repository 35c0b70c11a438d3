using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The verdict: a shape, a word, and the rest of the sentence.</summary>
public sealed partial class VerdictBanner
{
    /// <summary>The verdict; null where there is no result.</summary>
    [Parameter, EditorRequired]
    public Verdict? Verdict { get; set; }

    /// <summary>What stands here when there is no result.</summary>
    [Parameter]
    public string WithoutResult { get; set; } = "";

    /// <summary>The figure that governs; null when none does.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>Raised when the user asks for the figure that governs.</summary>
    [Parameter]
    public EventCallback<FigureKey> OnShow { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private string Class => Verdict?.Kind.ToString().ToLowerInvariant() ?? "none";

    // The mark says the word already.
    private string Sentence
    {
        get
        {
            if (Verdict is null)
            {
                return WithoutResult;
            }

            var words = Verdict.Sentence.In(Units);
            var rest = words[(words.StartsWith(Words.Of(Verdict.Kind), StringComparison.Ordinal) ? Words.Of(Verdict.Kind).Length : 0)..];
            rest = rest.TrimStart('.', ':', ' ');
            return rest.Length == 0 ? words : char.ToUpperInvariant(rest[0]) + rest[1..];
        }
    }
}
