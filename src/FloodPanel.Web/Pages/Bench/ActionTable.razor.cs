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

    /// <summary>The figure open on the page.</summary>
    [CascadingParameter]
    public OpenFigure? Open { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private FigureKey How(int index) => new(Figures.Action, Case.Actions[index].Working.Steps[^1].Symbol, Case.Name, index + 1);

    private FigureKey OfAction(int index, string symbol) => new(Figures.ActionResultant, symbol, Case.Name, index + 1);

    private FigureKey Resultant(string symbol) => new(Figures.Resultant, symbol, Case.Name);

    private void Show(FigureKey key) => Open?.Toggle(key);

    /// <summary>The factor on the flood side, and the one on water behind where that differs.</summary>
    private string FactorsOf(ActionResult action)
    {
        var behind = action.Pieces.FirstOrDefault(p => p.Factor != action.Factor);
        var flood = Calculation.Units.FormatNumber(action.Factor, Dimension.Ratio, Units);
        return behind == default ? flood : $"{flood}, behind {Calculation.Units.FormatNumber(behind.Factor, Dimension.Ratio, Units)}";
    }

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
