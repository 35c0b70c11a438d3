using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;

namespace FloodPanel.Web.Startup;

/// <summary>Where the server listens: this machine only, unless the office says otherwise.</summary>
public static class ListenAddress
{
    private const string Own = "http://localhost:5080";

    private static readonly string[] Settings = ["urls", "http_ports", "https_ports"];

    public static void UseAddressOfOurOwn(this WebApplicationBuilder builder)
    {
        var given = Settings.Any(s => !string.IsNullOrEmpty(builder.Configuration[s]))
            || builder.Configuration.GetSection("Kestrel:Endpoints").Exists();
        if (!given)
        {
            builder.WebHost.UseUrls(Own);
        }
    }

    public static void SayWhereItListens(this WebApplication app, string dataFolder) => app.Lifetime.ApplicationStarted.Register(() =>
    {
        foreach (var address in app.Services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>()?.Addresses ?? [])
        {
            Console.WriteLine($"FloodPanel is ready: open {address} in a browser. Ctrl+C stops it.");
        }

        Console.WriteLine($"Projects are stored in {dataFolder}.");
    });
}
