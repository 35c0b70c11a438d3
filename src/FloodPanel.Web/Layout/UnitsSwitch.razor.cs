using FloodPanel.Calculation;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace FloodPanel.Web.Layout;

public sealed partial class UnitsSwitch
{
    [Inject]
    public required ScreenSettings Settings { get; init; }

    [Inject]
    public required IJSRuntime JS { get; init; }

    private async Task UseAsync(UnitSystem units)
    {
        Settings.Use(units);
        await JS.InvokeVoidAsync("floodpanel.remember", RememberedSettings.UnitsCookie, RememberedSettings.Word(units));
    }
}
