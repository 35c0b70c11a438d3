using FloodPanel.Calculation;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web;

public sealed partial class Routes
{
    [Inject]
    public required ScreenSettings Settings { get; init; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    [Parameter, EditorRequired]
    public required ThemeChoice Theme { get; set; }

    [Parameter, EditorRequired]
    public required bool SystemIsDark { get; set; }

    protected override void OnInitialized() => Settings.Start(Units, Theme, SystemIsDark);
}
