using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

/// <summary>What every page of a project shares: opening, not found, and the choice after a conflict.</summary>
public sealed partial class ProjectFrame
{
    private string? refusal;

    [Inject]
    public required ProjectAccess Access { get; init; }

    [Inject]
    public required NavigationManager Navigation { get; init; }

    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    /// <summary>The project asked for.</summary>
    [Parameter, EditorRequired]
    public required Guid Id { get; set; }

    /// <summary>From the page: whether the project exists; null while it is being opened.</summary>
    [Parameter, EditorRequired]
    public required bool? Found { get; set; }

    /// <summary>Name of the page, for the title of the browser tab.</summary>
    [Parameter, EditorRequired]
    public required string Title { get; set; }

    [Parameter, EditorRequired]
    public required RenderFragment ChildContent { get; set; }

    private async Task PutBackAsync()
    {
        if (await Access.Restore(Id))
        {
            Navigation.Refresh(forceReload: true);
        }
        else
        {
            refusal = "There is no such project here, deleted or not. Look for it in the list of projects.";
        }
    }
}
