using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The working behind a figure, line by line: formula, numbers put in, result with its unit, source.</summary>
public sealed partial class WorkingPanel
{
    private readonly string titleId = ControlIds.Next();
    private ElementReference close;
    private FigureKey? focused;

    /// <summary>The figure that is open; null when none is.</summary>
    [Parameter, EditorRequired]
    public FigureKey? Key { get; set; }

    /// <summary>The result that holds it.</summary>
    [Parameter, EditorRequired]
    public OpeningResult? Result { get; set; }

    /// <summary>Raised when the panel is closed.</summary>
    [Parameter]
    public EventCallback OnClose { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private FigureWorking? Working => Key is { } key && Result is { } result ? Figures.Find(result, key) : null;

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (Key == focused)
        {
            return;
        }

        focused = Key;
        if (Working is not null)
        {
            await close.FocusAsync(preventScroll: true);
        }
    }

    private async Task OnKey(KeyboardEventArgs key)
    {
        if (key.Key == "Escape")
        {
            await OnClose.InvokeAsync();
        }
    }

    private string StepClass(CalculationStep step) => step.Symbol == Key?.Symbol ? "step asked" : "step";

    private string Number(CalculationStep step) => Calculation.Units.FormatNumber(step.Value, step.Dimension, Units);

    private string Symbol(CalculationStep step) => Calculation.Units.Of(step.Dimension, Units).Symbol;

    private string Outcome(Check check)
    {
        var demand = Calculation.Units.Format(check.Demand, check.Dimension, Units);
        var capacity = Calculation.Units.Format(check.Capacity, check.Dimension, Units);
        return check.Passes ? $"Passes: {demand} of the allowed {capacity}." : $"Fails: {demand}, allowed are {capacity}.";
    }
}
