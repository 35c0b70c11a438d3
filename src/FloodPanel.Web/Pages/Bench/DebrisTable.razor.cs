using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>How widely published methods differ for the same floating object.</summary>
public sealed partial class DebrisTable
{
    /// <summary>The debris as entered.</summary>
    [Parameter, EditorRequired]
    public DebrisInput Input { get; set; } = null!;

    /// <summary>The debris case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>Still water above outside ground [m].</summary>
    [Parameter, EditorRequired]
    public double GroundDepth { get; set; }

    /// <summary>Effective span of the widest bay [m].</summary>
    [Parameter, EditorRequired]
    public double Span { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private IReadOnlyList<DebrisEstimate> Estimates =>
        DebrisComparison.Of(Input, Case.Actions.First(a => a.Kind == ActionKind.Debris).Impact!.Value.Characteristic, GroundDepth, Span);
}
