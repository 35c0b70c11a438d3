using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>A line or a few lines of words. A text that is too long stays in the field and is not taken.</summary>
public sealed partial class TextField : IDisposable
{
    private readonly string id = ControlIds.Next();
    private string text = "";
    private string? shownValue;
    private Sentence? refusal;
    private object? lastRendered;

    /// <summary>Label.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

    /// <summary>Key for the drawing and for tests.</summary>
    [Parameter, EditorRequired]
    public string FieldKey { get; set; } = "";

    /// <summary>The words.</summary>
    [Parameter, EditorRequired]
    public string Value { get; set; } = "";

    /// <summary>Raised with each text that is allowed.</summary>
    [Parameter]
    public EventCallback<string> ValueChanged { get; set; }

    /// <summary>Most characters allowed.</summary>
    [Parameter]
    public int MaxLength { get; set; } = 200;

    /// <summary>True when the text must not be empty.</summary>
    [Parameter]
    public bool Required { get; set; }

    /// <summary>Lines of the field.</summary>
    [Parameter]
    public int Lines { get; set; } = 1;

    /// <summary>True where the field stands under its label with the whole width.</summary>
    [Parameter]
    public bool Wide { get; set; }

    /// <summary>What is meant, shown over the label.</summary>
    [Parameter]
    public string? Help { get; set; }

    /// <summary>Shown while the field is empty.</summary>
    [Parameter]
    public string? Placeholder { get; set; }

    /// <summary>A problem found by validation, shown here.</summary>
    [Parameter]
    public Sentence? Problem { get; set; }

    /// <summary>Where refused texts are noted, so that results can say that they are behind.</summary>
    [CascadingParameter]
    public TypedProblems? Typed { get; set; }

    private string? ShownProblem => refusal?.ToString() ?? Problem?.ToString();

    private string? Description => ShownProblem is null ? null : FieldRow.ProblemIdOf(id);

    /// <summary>Takes the field's problem with it.</summary>
    public void Dispose() => Typed?.Set(FieldKey, null);

    protected override void OnParametersSet()
    {
        if (Value != shownValue)
        {
            shownValue = text = Value;
            Refuse(null);
        }
    }

    protected override bool ShouldRender()
    {
        var now = (FieldKey, Label, text, ShownProblem, Placeholder, Lines, Wide);
        var same = now.Equals(lastRendered);
        lastRendered = now;
        return !same;
    }

    private async Task OnTyped(string? typed)
    {
        text = typed ?? "";
        if (Required && string.IsNullOrWhiteSpace(text))
        {
            Refuse(new($"{Label} is empty; write 1 to {MaxLength} characters."));
            return;
        }

        if (text.Length > MaxLength)
        {
            Refuse(new($"{Label} has {text.Length} characters; allowed are at most {MaxLength}."));
            return;
        }

        Refuse(null);
        shownValue = text;
        await ValueChanged.InvokeAsync(text);
    }

    private void Refuse(Sentence? sentence)
    {
        refusal = sentence;
        Typed?.Set(FieldKey, sentence);
    }
}
