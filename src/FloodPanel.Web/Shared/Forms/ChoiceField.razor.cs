using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>One of a few: buttons for up to three options, a list for more.</summary>
/// <typeparam name="T">What is chosen: an enum or a value that compares by value.</typeparam>
public sealed partial class ChoiceField<T>
    where T : notnull
{
    private const int MostButtons = 3;

    private readonly string id = ControlIds.Next();

    /// <summary>Label.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

    /// <summary>Key for the drawing and for tests.</summary>
    [Parameter, EditorRequired]
    public string FieldKey { get; set; } = "";

    /// <summary>The option chosen.</summary>
    [Parameter, EditorRequired]
    public T Value { get; set; } = default!;

    /// <summary>Raised with the option chosen.</summary>
    [Parameter]
    public EventCallback<T> ValueChanged { get; set; }

    /// <summary>The options in the order shown.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<T> Options { get; set; } = [];

    /// <summary>The words for an option.</summary>
    [Parameter, EditorRequired]
    public Func<T, string> Words { get; set; } = option => option.ToString() ?? "";

    /// <summary>Words shown in a list while the value is none of the options.</summary>
    [Parameter]
    public string? Unlisted { get; set; }

    /// <summary>True for a list however few the options are.</summary>
    [Parameter]
    public bool AlwaysList { get; set; }

    /// <summary>True where the control stands under its label with the whole width.</summary>
    [Parameter]
    public bool Wide { get; set; }

    /// <summary>What is meant, shown over the label.</summary>
    [Parameter]
    public string? Help { get; set; }

    /// <summary>A problem found by validation, shown here.</summary>
    [Parameter]
    public Sentence? Problem { get; set; }

    private bool AsButtons => !AlwaysList && Options.Count <= MostButtons;

    private string? Description => Problem is null ? null : FieldRow.ProblemIdOf(id);

    private int ChosenIndex
    {
        get
        {
            for (var i = 0; i < Options.Count; i++)
            {
                if (IsChosen(Options[i]))
                {
                    return i;
                }
            }

            return -1;
        }
    }

    private bool IsChosen(T option) => EqualityComparer<T>.Default.Equals(option, Value);

    private Task ChooseAt(int index) => index < 0 ? Task.CompletedTask : Choose(Options[index]);

    private Task Choose(T option) => ValueChanged.InvokeAsync(option);
}
