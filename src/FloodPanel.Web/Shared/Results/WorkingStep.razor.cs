using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>One line of a working: formula, numbers put in, result with its unit.</summary>
public sealed partial class WorkingStep
{
    private ElementReference line;

    /// <summary>The line.</summary>
    [Parameter, EditorRequired]
    public CalculationStep Step { get; set; }

    /// <summary>The lines before it.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<CalculationStep> Earlier { get; set; } = [];

    /// <summary>True for the line that was asked for.</summary>
    [Parameter]
    public bool Asked { get; set; }

    /// <summary>True when that line is to take the focus, which brings it into view.</summary>
    [Parameter]
    public bool TakesFocus { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private string Number => Calculation.Units.FormatNumber(Step.Value, Step.Dimension, Units);

    private string Symbol => Calculation.Units.Of(Step.Dimension, Units).Symbol;

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender && Asked && TakesFocus)
        {
            await line.FocusAsync();
        }
    }
}
