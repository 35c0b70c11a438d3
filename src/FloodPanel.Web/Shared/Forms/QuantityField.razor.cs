using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>
/// A number with its unit. What is typed is taken at once when it can be read and is allowed; else the text stays,
/// the last good value stays, and a sentence says what is allowed.
/// </summary>
public sealed partial class QuantityField : IDisposable
{
    // "3 f" and "2" are on the way to "3 ft" and "200": the sentence waits until typing pauses.
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(500);

    private readonly string id = ControlIds.Next();
    private string text = "";
    private double? shownValue;
    private UnitSystem shownUnits;
    private Field? shownField;
    private Sentence? refusal;
    private bool refusalShown;
    private CancellationTokenSource? pause;
    private object? lastRendered;

    /// <summary>Label, dimension, limits and help.</summary>
    [Parameter, EditorRequired]
    public Field Field { get; set; } = null!;

    /// <summary>The value [base SI]; null when empty.</summary>
    [Parameter, EditorRequired]
    public double? Value { get; set; }

    /// <summary>Raised with each value that is allowed.</summary>
    [Parameter]
    public EventCallback<double?> ValueChanged { get; set; }

    /// <summary>True when the field may be empty.</summary>
    [Parameter]
    public bool Optional { get; set; }

    /// <summary>The value meant when the field is empty, or to which it can be reset [base SI].</summary>
    [Parameter]
    public double? Default { get; set; }

    /// <summary>What an empty field means, shown in it: "as sill".</summary>
    [Parameter]
    public string? EmptyText { get; set; }

    /// <summary>The units in which the number is shown and typed.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    /// <summary>Where refused texts are noted, so that results can say that they are behind.</summary>
    [CascadingParameter]
    public TypedProblems? Typed { get; set; }

    /// <summary>A problem found by validation, shown here.</summary>
    [Parameter]
    public Sentence? Problem { get; set; }

    /// <summary>Key for the drawing and for tests, where the field's own is not unique.</summary>
    [Parameter]
    public string? FieldKey { get; set; }

    /// <summary>Label, where the field's own does not fit.</summary>
    [Parameter]
    public string? Label { get; set; }

    private string Key => FieldKey ?? Field.Key;

    private string ShownLabel => Label ?? Field.Label;

    private string UnitSymbol => Calculation.Units.Of(Field.Dimension, Units).Symbol;

    private string UnitId => id + "-unit";

    private string InputMode => Field.Dimension == Dimension.Count ? "numeric" : "text";

    private string? Placeholder => Default is { } value ? QuantityText.Write(value, Field.Dimension, Units) : EmptyText;

    private bool CanReset => Default is { } value && Value is { } current && current != value;

    private string ResetTitle => $"Back to {Calculation.Units.Format(Default ?? 0, Field.Dimension, Units)}";

    private string? ShownProblem => (refusalShown ? refusal : null)?.In(Units) ?? Problem?.In(Units);

    private string? Description =>
        string.Join(' ', new[] { UnitSymbol.Length > 0 ? UnitId : null, ShownProblem is null ? null : FieldRow.ProblemIdOf(id) }
            .Where(part => part is not null)) is { Length: > 0 } parts ? parts : null;

    /// <summary>Stops the clock of a pause in typing, and takes the field's problem with it.</summary>
    public void Dispose()
    {
        pause?.Cancel();
        pause?.Dispose();
        Typed?.Set(Key, null);
    }

    protected override void OnParametersSet()
    {
        var fromOutside = Value != shownValue || shownField is null;
        if (fromOutside || (refusal is null && (Units != shownUnits || Field != shownField)))
        {
            shownValue = Value;
            ShowValue();
        }

        shownUnits = Units;
        shownField = Field;
    }

    // Forms hold dozens of these; only those that look different are drawn again.
    protected override bool ShouldRender()
    {
        var now = (Key, ShownLabel, text, Value, Units, ShownProblem, Default, Field.Dimension);
        var same = now.Equals(lastRendered);
        lastRendered = now;
        return !same;
    }

    private async Task OnTyped(string typed)
    {
        text = typed;
        var reading = QuantityText.Read(typed, Field.Dimension, Units);
        refusal = Refusal(reading);
        if (refusal is not null)
        {
            await RefuseAfterPause();
            return;
        }

        Settle();
        await Take(reading.Value);
    }

    private Sentence? Refusal(QuantityReading reading)
    {
        if (reading.Problem is { } problem)
        {
            return new($"{ShownLabel} reads “{text.Trim()}”: {problem} Allowed is {Field.Allowed.In(Units)}.");
        }

        if (reading.Value is { } value)
        {
            return Field.Dimension == Dimension.Count && value != Math.Floor(value)
                ? new($"{ShownLabel} is {text.Trim()}; it must be a whole number, {Field.Allowed.In(Units)}.")
                : (Label is null ? Field : Field with { Label = Label }).Refusal(value);
        }

        return Optional || Default is not null ? null : new($"{ShownLabel} is empty; allowed is {Field.Allowed.In(Units)}.");
    }

    private async Task Take(double? value)
    {
        value ??= Optional ? null : Default;
        if (value == shownValue)
        {
            return;
        }

        shownValue = value;
        await ValueChanged.InvokeAsync(value);
    }

    private void OnLeft()
    {
        if (refusal is null)
        {
            ShowValue();
        }
        else
        {
            ShowRefusal();
        }
    }

    private async Task OnKey(KeyboardEventArgs key)
    {
        switch (key.Key)
        {
            case "Enter":
                OnLeft();
                break;
            case "Escape":
                ShowValue();
                break;
            case "ArrowUp" or "ArrowDown" when !key.AltKey && !key.CtrlKey:
                await Step((key.Key == "ArrowUp" ? 1 : -1) * (key.ShiftKey ? 10 : 1));
                break;
        }
    }

    private async Task Step(int steps)
    {
        var start = shownValue ?? Default ?? Math.Clamp(0, Field.Minimum, Field.Maximum);
        var moved = QuantityStep.Move(start, steps, Field.Dimension, Units);
        if (Field.Allows(moved))
        {
            await Take(moved);
            ShowValue();
        }
    }

    private async Task Reset()
    {
        await Take(Optional ? null : Default);
        ShowValue();
    }

    private void ShowValue()
    {
        text = shownValue is { } value ? QuantityText.Write(value, Field.Dimension, Units) : "";
        refusal = null;
        Settle();
    }

    private void ShowRefusal()
    {
        pause?.Cancel();
        refusalShown = true;
        Typed?.Set(Key, refusal);
    }

    private void Settle()
    {
        pause?.Cancel();
        refusalShown = false;
        Typed?.Set(Key, null);
    }

    private async Task RefuseAfterPause()
    {
        if (refusalShown)
        {
            ShowRefusal();
            return;
        }

        pause?.Cancel();
        pause?.Dispose();
        pause = new CancellationTokenSource();
        var token = pause.Token;
        await Task.Delay(Pause, token).ConfigureAwait(ConfigureAwaitOptions.SuppressThrowing | ConfigureAwaitOptions.ContinueOnCapturedContext);
        if (!token.IsCancellationRequested)
        {
            ShowRefusal();
        }
    }
}
