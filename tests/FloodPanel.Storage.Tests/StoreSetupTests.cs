using System.Diagnostics;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace FloodPanel.Storage.Tests;

public sealed class StoreSetupTests : IDisposable
{
    private readonly StoreFolder folder = new();

    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Model_AgainstMigrations_HasNoPendingChanges()
    {
        using var db = new FloodPanelDb(StoreSetup.Options(folder.Folder));

        Assert.False(db.Database.HasPendingModelChanges());
    }

    [Fact]
    public async Task Open_AtASecondStart_KeepsWhatIsStored()
    {
        var created = await folder.Store.CreateAsync(Example.Full, Stop);

        StoreSetup.Open(folder.Folder);

        Assert.Equal(created, await folder.Store.OpenAsync(created.Id, Stop));
    }

    [Fact]
    public void Connections_Always_AreSafeAgainstLossOfPower()
    {
        using var db = new FloodPanelDb(StoreSetup.Options(folder.Folder));
        db.Database.OpenConnection();

        Assert.Equal("wal", Pragma<string>(db, "journal_mode"));
        Assert.Equal(2L, Pragma<long>(db, "synchronous"));
        Assert.Equal(1L, Pragma<long>(db, "foreign_keys"));
        Assert.Equal(10_000L, Pragma<long>(db, "busy_timeout"));
    }

    [Fact]
    public void Open_DatabaseOfANewerVersion_IsRefusedWithASentence()
    {
        folder.Execute("INSERT INTO __EFMigrationsHistory VALUES ('29990101000000_Pumps', '20.0.0')");

        var refusal = Assert.Throws<StoreException>(() => StoreSetup.Open(folder.Folder));

        Assert.Equal(
            $"The database {folder.File} was written by a newer FloodPanel (29990101000000_Pumps); "
            + "start that one, or name another folder with the setting FloodPanel:DataFolder.", refusal.Message);
    }

    [Fact]
    public void Open_FileThatIsNoDatabase_IsRefusedWithASentenceAndKept()
    {
        SqliteConnection.ClearAllPools();
        var other = Path.Combine(folder.Folder, "other");
        Directory.CreateDirectory(other);
        var file = Path.Combine(other, StoreSetup.FileName);
        var text = string.Concat(Enumerable.Repeat("minutes of the meeting\n", 200));
        File.WriteAllText(file, text);

        var refusal = Assert.Throws<StoreException>(() => StoreSetup.Open(other));

        Assert.StartsWith($"The database {file} cannot be read (", refusal.Message);
        Assert.EndsWith("; restore it from a backup, or move it away to start with an empty one.", refusal.Message);
        Assert.Equal(text, File.ReadAllText(file));
    }

    [Fact]
    public async Task Open_DamagedTableOfProjects_IsRefusedWithASentence()
    {
        await folder.Store.CreateAsync(Example.Full, Stop);
        folder.Execute("PRAGMA wal_checkpoint(TRUNCATE)");
        var page = folder.Scalar<long>("SELECT rootpage FROM sqlite_master WHERE name = 'Projects'");
        var size = folder.Scalar<long>("PRAGMA page_size");
        SqliteConnection.ClearAllPools();
        using (var file = File.OpenWrite(folder.File))
        {
            file.Position = (page - 1) * size;
            file.Write(Enumerable.Repeat((byte)0xA5, (int)size).ToArray());
        }

        var refusal = Assert.Throws<StoreException>(() => StoreSetup.Open(folder.Folder));

        Assert.StartsWith($"The database {folder.File} cannot be read (", refusal.Message);
    }

    [Fact]
    public void Open_FolderThatIsAFile_IsRefusedWithASentence()
    {
        var file = Path.Combine(folder.Folder, "taken");
        File.WriteAllText(file, "");

        var refusal = Assert.Throws<StoreException>(() => StoreSetup.Open(file));

        Assert.StartsWith($"The data folder {file} cannot be used: ", refusal.Message);
    }

    /// <summary>A program killed while it migrates leaves the row by which Entity Framework keeps others out.</summary>
    [Fact]
    public async Task Open_AfterAKilledMigration_DoesNotWaitForItsLock()
    {
        var other = Path.Combine(folder.Folder, "other");
        Directory.CreateDirectory(other);
        using (var connection = new SqliteConnection($"Data Source={Path.Combine(other, StoreSetup.FileName)};Pooling=False"))
        {
            connection.Open();
            using var command = connection.CreateCommand();
            command.CommandText = """
                CREATE TABLE "__EFMigrationsLock" ("Id" INTEGER PRIMARY KEY, "Timestamp" TEXT NOT NULL);
                INSERT INTO "__EFMigrationsLock" VALUES (1, '2031-01-01');
                """;
            command.ExecuteNonQuery();
        }

        await Task.Run(() => StoreSetup.Open(other), Stop).WaitAsync(TimeSpan.FromSeconds(20), Stop);

        await using var db = new FloodPanelDb(StoreSetup.Options(other));
        Assert.Empty(await db.Projects.ToListAsync(Stop));
    }

    [Fact]
    public async Task Open_ManyProgramsAtOnce_AllSucceed()
    {
        var other = Path.Combine(folder.Folder, "other");
        var clock = Stopwatch.StartNew();

        await Task.WhenAll(Enumerable.Range(0, 6).Select(_ => Task.Run(() => StoreSetup.Open(other), Stop)));

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(10), $"took {clock.Elapsed}");
    }

    [Fact]
    public void Resolve_Configured_IsAFullPath()
    {
        Assert.Equal(Path.Combine(Environment.CurrentDirectory, "jobs"), DataFolder.Resolve("jobs"));
        Assert.EndsWith("FloodPanel", DataFolder.Resolve(" "));
        Assert.Equal(DataFolder.Resolve(null), DataFolder.Resolve(""));
    }

    [Fact]
    public void Resolve_NoPath_IsRefusedWithASentence()
    {
        var refusal = Assert.Throws<StoreException>(() => DataFolder.Resolve("a\0b"));

        Assert.StartsWith("The setting FloodPanel:DataFolder is \"a", refusal.Message);
    }

    private static T Pragma<T>(FloodPanelDb db, string name)
    {
        using var command = db.Database.GetDbConnection().CreateCommand();
        command.CommandText = $"PRAGMA {name}";
        return (T)command.ExecuteScalar()!;
    }
}
