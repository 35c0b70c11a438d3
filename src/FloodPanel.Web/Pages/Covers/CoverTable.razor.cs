using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Covers;

/// <summary>The covers of a project with their verdicts; one is selected.</summary>
public sealed partial class CoverTable
{
    [Parameter, EditorRequired]
    public required ValueList<Cover> Covers { get; set; }

    /// <summary>Result by place; null for a cover with a problem.</summary>
    [Parameter, EditorRequired]
    public required Func<int, CoverResult?> ResultAt { get; set; }

    /// <summary>The first problem of a cover by place, in words.</summary>
    [Parameter, EditorRequired]
    public required Func<int, string?> ProblemIn { get; set; }

    [Parameter, EditorRequired]
    public required int Selected { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<int> OnSelect { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<int> OnDuplicate { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<int> OnDelete { get; set; }

    private string NameOf(int index) =>
        string.IsNullOrWhiteSpace(Covers[index].Name) ? FormattableString.Invariant($"Cover {index + 1}") : Covers[index].Name;
}
