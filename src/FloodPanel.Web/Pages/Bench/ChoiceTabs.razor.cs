using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>What is looked at: one of a few, in a row. It changes the view, not the project.</summary>
/// <typeparam name="T">What is chosen.</typeparam>
public sealed partial class ChoiceTabs<T>
    where T : notnull
{
    private readonly string group = ControlIds.Next();

    /// <summary>What is chosen here, for those who cannot see it.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

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

    /// <summary>Name for tests.</summary>
    [Parameter]
    public string? TestId { get; set; }
}
