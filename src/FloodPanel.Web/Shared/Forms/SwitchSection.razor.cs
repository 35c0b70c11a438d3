using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>
/// A section of a form that can be switched on and off, with a drawing of what it adds. What the fields held before
/// is the caller's to remember: a section that is off shows nothing.
/// </summary>
public sealed partial class SwitchSection
{
    /// <summary>Title beside the switch.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>Key for the drawing and for tests.</summary>
    [Parameter, EditorRequired]
    public string FieldKey { get; set; } = "";

    /// <summary>True when the section counts.</summary>
    [Parameter, EditorRequired]
    public bool On { get; set; }

    /// <summary>Raised when the switch is moved.</summary>
    [Parameter]
    public EventCallback<bool> OnChanged { get; set; }

    /// <summary>One sentence that says what the section adds.</summary>
    [Parameter]
    public string? Help { get; set; }

    /// <summary>The fields.</summary>
    [Parameter]
    public RenderFragment? ChildContent { get; set; }

    /// <summary>A drawing beside the fields, or null.</summary>
    [Parameter]
    public RenderFragment? Drawing { get; set; }

    private Dictionary<string, object?> TestId => new() { ["data-testid"] = $"switch-{FieldKey}" };
}
