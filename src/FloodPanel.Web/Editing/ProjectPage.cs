using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Editing;

/// <summary>
/// A page inside a project: opens it in the editor and is drawn anew after each change. Its markup stands in a
/// <see cref="Shared.ProjectFrame"/>, which shows what to do when the project is not there.
/// </summary>
public abstract class ProjectPage : ComponentBase, IDisposable
{
    [Inject]
    public required ProjectEditor Editor { get; init; }

    [Parameter, EditorRequired]
    public required Guid Id { get; set; }

    /// <summary>Whether the project exists; null while it is being opened.</summary>
    protected bool? Found { get; private set; }

    protected Project Project => Editor.Project;

    protected UnitSystem Units => Editor.Units;

    protected override void OnInitialized() => Editor.Changed += Show;

    protected override async Task OnParametersSetAsync()
    {
        Found = Editor.Id == Id ? true : null;
        Found = await Editor.OpenAsync(Id);
    }

    private void Show() => _ = InvokeAsync(StateHasChanged);

    public void Dispose()
    {
        Dispose(true);
        GC.SuppressFinalize(this);
    }

    protected virtual void Dispose(bool disposing) => Editor.Changed -= Show;
}
