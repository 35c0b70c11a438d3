using FloodPanel.Calculation;
using FloodPanel.Calculation.Parts;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Base plates, anchors, guides, walls and footings of a case: each check with demand and capacity.</summary>
public sealed partial class PartTable
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private static string NameOf(PartResult part) => $"{part.Check}-{part.Member.Replace(' ', '-')}";

    private string Shown(double value, Dimension dimension) =>
        double.IsFinite(value) ? Calculation.Units.Format(value, dimension, Units) : "none";
}
