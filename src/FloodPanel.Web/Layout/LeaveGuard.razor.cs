using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Routing;
using MudBlazor;

namespace FloodPanel.Web.Layout;

/// <summary>Saves before a project is left, and holds the user back when that cannot be done.</summary>
public sealed partial class LeaveGuard
{
    [Inject]
    public required NavigationManager Navigation { get; init; }

    [Inject]
    public required ISnackbar Snackbar { get; init; }

    [Inject]
    public required IDialogService Dialogs { get; init; }

    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    private async Task GuardAsync(LocationChangingContext leaving)
    {
        await Editor.SaveNowAsync();
        var target = Navigation.ToBaseRelativePath(Navigation.ToAbsoluteUri(leaving.TargetLocation).ToString());
        if (Editor.State.IsSafe || ProjectAddress.Covers(target, Editor.Id))
        {
            return;
        }

        if (Editor.State.NeedsChoice)
        {
            leaving.PreventNavigation();
            Snackbar.Add("Choose first what to do with what is not saved; see the note at the top of the page.", Severity.Warning);
        }
        else if (await Dialogs.ShowMessageBoxAsync(
            "Leave without saving?", $"The last changes are not saved: {Editor.State.Reason}", yesText: "Leave", cancelText: "Stay") != true)
        {
            leaving.PreventNavigation();
        }
    }
}
