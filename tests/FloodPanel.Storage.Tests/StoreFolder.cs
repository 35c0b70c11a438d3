using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;

namespace FloodPanel.Storage.Tests;

/// <summary>A store in a folder of its own, real SQLite, removed at the end.</summary>
internal sealed class StoreFolder : IDisposable
{
    private readonly ServiceProvider services;

    public StoreFolder(TimeProvider? clock = null)
    {
        Folder = Path.Combine(Directory.CreateTempSubdirectory("floodpanel-store-").FullName, "data");
        StoreSetup.Open(Folder);
        var collection = new ServiceCollection();
        if (clock is not null)
        {
            collection.AddSingleton(clock);
        }

        services = collection.AddFloodPanelStorage(Folder).BuildServiceProvider();
        Store = services.GetRequiredService<ProjectStore>();
    }

    public string Folder { get; }

    public ProjectStore Store { get; }

    public string File => Path.Combine(Folder, StoreSetup.FileName);

    public T Scalar<T>(string sql)
    {
        using var connection = new SqliteConnection($"Data Source={File};Pooling=False");
        connection.Open();
        using var command = connection.CreateCommand();
        command.CommandText = sql;
        return (T)command.ExecuteScalar()!;
    }

    public void Execute(string sql)
    {
        using var connection = new SqliteConnection($"Data Source={File};Pooling=False");
        connection.Open();
        using var command = connection.CreateCommand();
        command.CommandText = sql;
        command.ExecuteNonQuery();
    }

    public void Dispose()
    {
        services.Dispose();
        SqliteConnection.ClearAllPools();
        Directory.Delete(Path.GetDirectoryName(Folder)!, recursive: true);
    }
}

/// <summary>A clock that a test sets.</summary>
internal sealed class TestClock : TimeProvider
{
    public DateTimeOffset Now { get; set; } = new(2031, 3, 4, 5, 6, 7, TimeSpan.Zero);

    public override DateTimeOffset GetUtcNow() => Now;
}
