using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

public sealed partial class ConflictNotice
{
    [Inject]
    public required NavigationManager Navigation { get; init; }

    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    // The copy has an address of its own; the page stays the same one.
    private async Task SaveCopyAsync()
    {
        var old = Editor.Id;
        var copy = await Editor.SaveAsCopyAsync();
        Navigation.NavigateTo(Navigation.Uri.Replace(old.ToString(), copy.ToString(), StringComparison.OrdinalIgnoreCase));
    }
}
