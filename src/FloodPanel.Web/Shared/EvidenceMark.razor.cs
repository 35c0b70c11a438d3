using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

/// <summary>The mark of library figures that are from memory, with the button that confirms them in the open project.</summary>
public sealed partial class EvidenceMark : IDisposable
{
    private bool held;

    /// <summary>The entry of the library.</summary>
    [Parameter, EditorRequired]
    public string Id { get; set; } = "";

    /// <summary>Its title.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>True when its figures are from memory; nothing is shown else.</summary>
    [Parameter, EditorRequired]
    public bool FromMemory { get; set; }

    /// <summary>What the open project confirms; null outside a project.</summary>
    [CascadingParameter]
    public Confirmations? Confirmations { get; set; }

    private string Action => held
        ? $"Take back the confirmation of {Title}"
        : $"I have checked the figures of {Title} against the source";

    public void Dispose()
    {
        if (Confirmations is not null)
        {
            Confirmations.Changed -= Follow;
        }
    }

    protected override void OnInitialized()
    {
        if (Confirmations is not null)
        {
            Confirmations.Changed += Follow;
        }
    }

    protected override void OnParametersSet() => held = Confirmations?.Holds(Id) == true;

    private void Follow() => _ = InvokeAsync(() =>
    {
        if (Confirmations!.Holds(Id) != held)
        {
            held = !held;
            StateHasChanged();
        }
    });
}
