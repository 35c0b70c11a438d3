using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;

namespace FloodPanel.Storage;

/// <summary>Adds the store to a program's services.</summary>
public static class StoreRegistration
{
    /// <summary>Adds <see cref="ProjectStore"/>. Call <see cref="StoreSetup.Open"/> before the first use.</summary>
    /// <param name="services">The services.</param>
    /// <param name="folder">The data folder, see <see cref="DataFolder.Resolve"/>.</param>
    public static IServiceCollection AddFloodPanelStorage(this IServiceCollection services, string folder)
    {
        services.AddDbContextFactory<FloodPanelDb>(options => StoreSetup.Configure(options, folder));
        services.TryAddSingleton(TimeProvider.System);
        return services.AddSingleton<ProjectStore>();
    }
}
