using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Routing;

namespace FloodPanel.Web.Layout;

public sealed partial class TopBar : IDisposable
{
    [Inject]
    public required ProjectEditor Editor { get; init; }

    [Inject]
    public required NavigationManager Navigation { get; init; }

    private bool InProject => Editor.IsOpen && ProjectAddress.Covers(Navigation.ToBaseRelativePath(Navigation.Uri), Editor.Id);

    private string ProjectName => Editor.Project.Name.Length > 0 ? Editor.Project.Name : "Project without a name";

    protected override void OnInitialized()
    {
        Editor.Changed += Show;
        Navigation.LocationChanged += ShowLocation;
    }

    private void Show() => _ = InvokeAsync(StateHasChanged);

    private void ShowLocation(object? sender, LocationChangedEventArgs e) => Show();

    public void Dispose()
    {
        Editor.Changed -= Show;
        Navigation.LocationChanged -= ShowLocation;
    }
}
