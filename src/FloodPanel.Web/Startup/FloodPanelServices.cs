using FloodPanel.Storage;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Pages.Projects;
using Microsoft.AspNetCore.DataProtection;
using MudBlazor;
using MudBlazor.Services;

namespace FloodPanel.Web.Startup;

public static class FloodPanelServices
{
    public static void AddFloodPanel(this IServiceCollection services, Office office)
    {
        services.AddRazorComponents().AddInteractiveServerComponents();
        services.AddMudServices(options =>
        {
            var notes = options.SnackbarConfiguration;
            notes.PositionClass = Defaults.Classes.Position.BottomLeft;
            (notes.ShowTransitionDuration, notes.HideTransitionDuration) = (100, 100);
            // Long enough to read it, think, and undo.
            notes.VisibleStateDuration = 8000;
            notes.MaximumOpacity = 100;
            notes.HideIcon = true;
        });
        services.AddFloodPanelStorage(office.DataFolder);
        services.AddSingleton(office.Library);
        services.AddSingleton<OpenEditors>();
        services.AddSingleton(s => ProjectAccess.To(s.GetRequiredService<ProjectStore>()));
        services.AddSingleton<ProjectImport>();
        services.AddScoped<ScreenSettings>();
        services.AddScoped<ProjectEditor>();
        // Beside the projects, so that a page that was open during a restart is still trusted.
        services.AddDataProtection().SetApplicationName("FloodPanel")
            .PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(office.DataFolder, "keys")));
    }
}
