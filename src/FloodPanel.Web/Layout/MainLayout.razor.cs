using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Routing;
using Microsoft.JSInterop;

namespace FloodPanel.Web.Layout;

public sealed partial class MainLayout : IAsyncDisposable
{
    private DotNetObjectReference<MainLayout>? self;
    private PageBoundary? boundary;

    [Inject]
    public required ScreenSettings Settings { get; init; }

    [Inject]
    public required NavigationManager Navigation { get; init; }

    [Inject]
    public required IJSRuntime JS { get; init; }

    // With a base address in the page, "#main" alone would lead to the first page.
    private string SkipTarget => $"/{Navigation.ToBaseRelativePath(Navigation.Uri).Split('#')[0]}#main";

    protected override void OnInitialized()
    {
        Settings.Changed += Show;
        Navigation.LocationChanged += RecoverOnLeaving;
    }

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            self = DotNetObjectReference.Create(this);
            var dark = await JS.InvokeAsync<bool>("floodpanel.watchSystem", self);
            if (dark != Settings.SystemIsDark)
            {
                Settings.ReportSystem(dark);
            }
        }
    }

    [JSInvokable]
    public void SystemThemeChanged(bool isDark) => Settings.ReportSystem(isDark);

    private void Show() => _ = InvokeAsync(StateHasChanged);

    private void RecoverOnLeaving(object? sender, LocationChangedEventArgs e) => boundary?.Recover();

    public async ValueTask DisposeAsync()
    {
        Settings.Changed -= Show;
        Navigation.LocationChanged -= RecoverOnLeaving;
        if (self is not null)
        {
            try
            {
                await JS.InvokeVoidAsync("floodpanel.watchSystem", null);
            }
            catch (JSDisconnectedException)
            {
                // The browser is gone, and its listener with it.
            }

            self.Dispose();
        }
    }
}
