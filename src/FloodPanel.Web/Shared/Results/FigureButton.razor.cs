using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>A number of a result that opens its working.</summary>
public sealed partial class FigureButton
{
    private object? lastRendered;
    private ElementReference button;
    private bool wasOpen;

    /// <summary>What the number is, for those who cannot see where it stands: "Moment of log 3".</summary>
    [Parameter, EditorRequired]
    public string What { get; set; } = "";

    /// <summary>The number [base SI].</summary>
    [Parameter, EditorRequired]
    public double Value { get; set; }

    /// <summary>What it measures.</summary>
    [Parameter, EditorRequired]
    public Dimension Dimension { get; set; }

    /// <summary>The figure whose working it opens; null where there is none.</summary>
    [Parameter, EditorRequired]
    public FigureKey? Opens { get; set; }

    /// <summary>True to print the unit behind the number.</summary>
    [Parameter]
    public bool WithUnit { get; set; }

    /// <summary>The number as its column shows it; null for a number that stands by itself.</summary>
    [Parameter]
    public string? InColumn { get; set; }

    /// <summary>Name for tests.</summary>
    [Parameter]
    public string? TestId { get; set; }

    /// <summary>The figure open on the page.</summary>
    [CascadingParameter]
    public OpenFigure? Open { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private bool IsOpen => Opens is not null && Open?.Key == Opens;

    private string UnitSymbol => Calculation.Units.Of(Dimension, Units).Symbol;

    private string Number => InColumn ?? Calculation.Units.FormatNumber(Value, Dimension, Units);

    private string Spoken => $"{What}, {Calculation.Units.Format(Value, Dimension, Units)}, show the working";

    // A ladder holds hundreds of these; only those that look different are drawn again.
    protected override bool ShouldRender()
    {
        var now = (What, Number, UnitSymbol, IsOpen, Opens is null);
        var same = now.Equals(lastRendered);
        lastRendered = now;
        return !same;
    }

    // Where the panel is closed, the keyboard goes back to the number that it was opened from.
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        var closed = wasOpen && !IsOpen && Open?.Key is null && Opens is not null;
        wasOpen = IsOpen;
        if (closed)
        {
            await button.FocusAsync(preventScroll: true);
        }
    }

    private void Toggle() => Open?.Toggle(Opens!);
}
