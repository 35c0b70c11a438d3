using FloodPanel.Calculation;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
using MudBlazor;

namespace FloodPanel.Web.Layout;

public sealed partial class ScreenMenu
{
    [Inject]
    public required ScreenSettings Settings { get; init; }

    [Inject]
    public required IJSRuntime JS { get; init; }

    private string Icon => Settings.Theme switch
    {
        ThemeChoice.Light => Icons.Material.Outlined.LightMode,
        ThemeChoice.Dark => Icons.Material.Outlined.DarkMode,
        _ => Icons.Material.Outlined.Contrast,
    };

    private static string Tick(bool chosen) =>
        chosen ? Icons.Material.Outlined.RadioButtonChecked : Icons.Material.Outlined.RadioButtonUnchecked;

    private async Task UseAsync(ThemeChoice theme)
    {
        Settings.Use(theme);
        await JS.InvokeVoidAsync("floodpanel.remember", RememberedSettings.ThemeCookie, RememberedSettings.Word(theme));
    }

    private async Task UseAsync(UnitSystem units)
    {
        Settings.Use(units);
        await JS.InvokeVoidAsync("floodpanel.remember", RememberedSettings.UnitsCookie, RememberedSettings.Word(units));
    }
}
