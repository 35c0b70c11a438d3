using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>One row of a form: label, control, and the sentence when something is wrong with it.</summary>
public partial class FieldRow
{
    /// <summary>Key of the field, for the drawing and for tests.</summary>
    [Parameter, EditorRequired]
    public string Key { get; set; } = "";

    /// <summary>Label.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

    /// <summary>Id of the control that the label belongs to.</summary>
    [Parameter, EditorRequired]
    public string For { get; set; } = "";

    /// <summary>What is meant, shown over the label.</summary>
    [Parameter]
    public string? Help { get; set; }

    /// <summary>What is wrong, or null.</summary>
    [Parameter]
    public string? Problem { get; set; }

    /// <summary>True where the control is a group of buttons, which a label element cannot point at.</summary>
    [Parameter]
    public bool AsGroup { get; set; }

    /// <summary>True where the control takes all the room that the label leaves: words, not numbers.</summary>
    [Parameter]
    public bool Roomy { get; set; }

    /// <summary>True where the control needs the whole width, under its label.</summary>
    [Parameter]
    public bool Wide { get; set; }

    /// <summary>The control.</summary>
    [Parameter, EditorRequired]
    public RenderFragment? ChildContent { get; set; }

    /// <summary>Id of the label, for aria-labelledby.</summary>
    public string LabelId => LabelIdOf(For);

    private string ProblemId => ProblemIdOf(For);

    private string RowClass => $"field-row{(Wide ? " wide" : Roomy ? " roomy" : "")}{(Problem is null ? "" : " refused")}";

    internal static string ProblemIdOf(string control) => control + "-problem";

    internal static string LabelIdOf(string control) => control + "-label";
}
