using Microsoft.EntityFrameworkCore.Design;

namespace FloodPanel.Storage;

/// <summary>Lets `dotnet ef migrations add` make a context; nothing else uses it.</summary>
internal sealed class DesignTimeDb : IDesignTimeDbContextFactory<FloodPanelDb>
{
    public FloodPanelDb CreateDbContext(string[] args) => new(StoreSetup.Options("."));
}
