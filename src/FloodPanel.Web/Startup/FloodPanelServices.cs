using FloodPanel.Storage;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Pages.Projects;
using Microsoft.AspNetCore.DataProtection;
using MudBlazor.Services;

namespace FloodPanel.Web.Startup;

public static class FloodPanelServices
{
    public static void AddFloodPanel(this IServiceCollection services, Office office)
    {
        services.AddRazorComponents().AddInteractiveServerComponents();
        services.AddMudServices(options => options.SnackbarConfiguration.PositionClass = "mud-snackbar-location-bottom-left");
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
