using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The working behind a figure, line by line: formula, numbers put in, result with its unit, source.</summary>
public sealed partial class WorkingPanel
{
    private readonly string titleId = ControlIds.Next();
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

    // Once for each figure: one that goes and comes back while a number is typed must not take the keyboard away.
    protected override void OnAfterRender(bool firstRender) => focused = Key;

    private async Task OnKey(KeyboardEventArgs key)
    {
        if (key.Key == "Escape")
        {
            await OnClose.InvokeAsync();
        }
    }

    private string Outcome(Check check)
    {
        var demand = Calculation.Units.Format(check.Demand, check.Dimension, Units);
        var capacity = Calculation.Units.Format(check.Capacity, check.Dimension, Units);
        return check.Passes ? $"Passes: {demand} of the allowed {capacity}." : $"Fails: {demand}, allowed are {capacity}.";
    }
}
