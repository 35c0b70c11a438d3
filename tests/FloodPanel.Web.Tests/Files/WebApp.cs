using FloodPanel.Storage;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;

namespace FloodPanel.Web.Tests.Files;

/// <summary>The whole server in memory, on a data folder of its own.</summary>
public sealed class WebApp : WebApplicationFactory<App>
{
    private readonly string folder = Directory.CreateTempSubdirectory("floodpanel-web-").FullName;

    public ProjectStore Store => Services.GetRequiredService<ProjectStore>();

    protected override void ConfigureWebHost(IWebHostBuilder builder) => builder.UseSetting(DataFolder.Setting, folder);

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        if (disposing && Directory.Exists(folder))
        {
            SqliteConnection.ClearAllPools();
            Directory.Delete(folder, recursive: true);
        }
    }
}
