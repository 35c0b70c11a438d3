using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
using MudBlazor;

namespace FloodPanel.Web.Pages.Openings;

/// <summary>Documents are made of what is stored, so that they carry a revision; hence saving comes first.</summary>
public sealed partial class DocumentButtons
{
    private bool busy;

    [Inject]
    public required IJSRuntime JS { get; init; }

    [Inject]
    public required ISnackbar Snackbar { get; init; }

    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    private bool HasOpenings => Editor.Project.Openings.Count > 0;

    private Task SummaryAsync() => DownloadAsync(ProjectAddress.OwnerSummary(Editor.Id, Editor.Units));

    private Task ExportAsync() => DownloadAsync(ProjectAddress.Export(Editor.Id));

    private async Task DownloadAsync(string address)
    {
        busy = true;
        await Editor.SaveNowAsync();
        var refusal = Editor.State.IsSafe
            ? await JS.DownloadAsync(address)
            : "The project is not saved yet, and documents are made of what is saved. See the note at the top of the page.";
        busy = false;
        if (refusal is not null)
        {
            Snackbar.Add(refusal, Severity.Error);
        }
    }
}
