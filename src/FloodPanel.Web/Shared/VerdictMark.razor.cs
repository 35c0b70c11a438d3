using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

/// <summary>The verdict as a shape and a word; null where there is no result yet.</summary>
public sealed partial class VerdictMark
{
    [Parameter, EditorRequired]
    public required VerdictKind? Kind { get; set; }

    /// <summary>Shows the shape alone; the word stays for screen readers.</summary>
    [Parameter]
    public bool ShapeOnly { get; set; }

    private string Word => Kind switch
    {
        VerdictKind.Adequate => "Adequate",
        VerdictKind.Inadequate => "Inadequate",
        VerdictKind.Incomplete => "Incomplete",
        _ => "No result",
    };

    private string Class => Kind switch
    {
        VerdictKind.Adequate => "adequate",
        VerdictKind.Inadequate => "inadequate",
        VerdictKind.Incomplete => "incomplete",
        _ => "none",
    };
}
