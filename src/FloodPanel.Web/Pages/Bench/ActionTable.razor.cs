using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The actions of a case, which is also the legend of its drawing.</summary>
public sealed partial class ActionTable
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private FigureKey KeyOf(int index) => new(Figures.Action, Case.Actions[index].Working.Steps[^1].Symbol, Case.Name, index + 1);

    private FigureKey Resultant(string symbol) => new(Figures.Resultant, symbol, Case.Name);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
