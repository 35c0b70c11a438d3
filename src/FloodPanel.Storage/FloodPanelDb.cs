using FloodPanel.Storage.Entities;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace FloodPanel.Storage;

/// <summary>The database of projects. One context per operation.</summary>
public class FloodPanelDb(DbContextOptions<FloodPanelDb> options) : DbContext(options)
{
    public DbSet<ProjectRow> Projects => Set<ProjectRow>();

    public DbSet<RevisionRow> Revisions => Set<RevisionRow>();

    protected override void OnModelCreating(ModelBuilder modelBuilder) =>
        modelBuilder.ApplyConfigurationsFromAssembly(typeof(FloodPanelDb).Assembly);

    // SQLite has no type for times: as text they would sort by their offset.
    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder) =>
        configurationBuilder.Properties<DateTimeOffset>().HaveConversion<UnixMilliseconds>();

    private sealed class UnixMilliseconds()
        : ValueConverter<DateTimeOffset, long>(time => time.ToUnixTimeMilliseconds(), stored => DateTimeOffset.FromUnixTimeMilliseconds(stored));
}
