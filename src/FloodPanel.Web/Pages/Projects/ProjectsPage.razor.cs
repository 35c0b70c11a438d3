using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.JSInterop;
using MudBlazor;

namespace FloodPanel.Web.Pages.Projects;

public sealed partial class ProjectsPage
{
    private IReadOnlyList<ProjectSummary> rows = [];
    private ListOrder order = ListOrder.Newest;
    private string search = "";

    [Inject]
    public required ProjectStore Store { get; init; }

    [Inject]
    public required ProjectImport Import { get; init; }

    [Inject]
    public required IDialogService Dialogs { get; init; }

    [Inject]
    public required ISnackbar Snackbar { get; init; }

    [Inject]
    public required NavigationManager Navigation { get; init; }

    [Inject]
    public required IJSRuntime JS { get; init; }

    private bool IsEmpty => rows.Count == 0 && search.Length == 0;

    private IReadOnlyList<ProjectSummary> Sorted => order.Sort(rows);

    protected override Task OnInitializedAsync() => LoadAsync();

    private async Task LoadAsync() => rows = await Store.ListAsync(search);

    private Task SearchAsync(string? words)
    {
        search = words ?? "";
        return LoadAsync();
    }

    private async Task NewAsync()
    {
        var dialog = await Dialogs.ShowAsync<NewProjectDialog>("New project");
        if (await dialog.Result is { Canceled: false, Data: string name })
        {
            var created = await Store.CreateAsync(new Project { Name = name });
            Navigation.NavigateTo(ProjectAddress.Site(created.Id));
        }
    }

    private async Task ExportAsync(ProjectSummary row)
    {
        if (await JS.DownloadAsync(ProjectAddress.Export(row.Id)) is { } refusal)
        {
            Snackbar.Add(refusal, Severity.Error);
        }
    }

    private async Task DuplicateAsync(ProjectSummary row)
    {
        var copy = await Store.DuplicateAsync(row.Id);
        await LoadAsync();
        Snackbar.Add(copy is null ? $"“{row.Name}” is not here any more." : $"“{copy.Project.Name}” added.", copy is null ? Severity.Warning : Severity.Normal);
    }

    private async Task DeleteAsync(ProjectSummary row)
    {
        await Store.DeleteAsync(row.Id);
        await LoadAsync();
        Snackbar.Add($"“{row.Name}” deleted.", Severity.Normal, options =>
        {
            options.Action = "Undo";
            options.OnClick = _ => InvokeAsync(() => PutBackAsync(row));
        });
    }

    private async Task PutBackAsync(ProjectSummary row)
    {
        await Store.RestoreAsync(row.Id);
        await LoadAsync();
        StateHasChanged();
    }

    private async Task ImportAsync(IReadOnlyList<IBrowserFile> files)
    {
        var imports = new List<ImportResult>();
        foreach (var file in files)
        {
            imports.Add(await Import.ReadAsync(file));
        }

        await LoadAsync();
        if (imports.Any(i => i.Problems.Count > 0))
        {
            await Dialogs.ShowAsync<ImportDialog>("Import", new DialogParameters<ImportDialog> { { d => d.Imports, imports } },
                new DialogOptions { MaxWidth = MaxWidth.Medium, FullWidth = true });
        }
        else if (imports is [{ Stored: { } only }])
        {
            Navigation.NavigateTo(ProjectAddress.Openings(only.Id));
        }
        else
        {
            Snackbar.Add($"{imports.Count} projects added.", Severity.Normal);
        }
    }
}
