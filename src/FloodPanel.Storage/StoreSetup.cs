using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace FloodPanel.Storage;

/// <summary>Makes the database ready at the start of the program.</summary>
public static class StoreSetup
{
    /// <summary>Name of the database in the data folder.</summary>
    public const string FileName = "floodpanel.db";

    private const string LockName = "floodpanel.lock";

    /// <summary>Creates the folder and the database, or brings an older database up to date.</summary>
    /// <param name="folder">The data folder, see <see cref="DataFolder.Resolve"/>.</param>
    /// <exception cref="StoreException">The folder or the database cannot be used, with the reason in a sentence.</exception>
    public static void Open(string folder)
    {
        try
        {
            Directory.CreateDirectory(folder);
            using var alone = HoldLock(folder);
            using var db = new FloodPanelDb(Options(folder));
            RefuseNewer(db, folder);
            Migrate(db);
            CheckList(db);
        }
        catch (InvalidDataException e)
        {
            throw Unreadable(folder, e.Message, e);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            throw new StoreException($"The data folder {folder} cannot be used: {e.Message}", e);
        }
        catch (SqliteException e)
        {
            throw Unreadable(folder, e.Message.TrimEnd('.'), e);
        }
    }

    internal static DbContextOptions<FloodPanelDb> Options(string folder)
    {
        var builder = new DbContextOptionsBuilder<FloodPanelDb>();
        Configure(builder, folder);
        return builder.Options;
    }

    internal static void Configure(DbContextOptionsBuilder builder, string folder)
    {
        var connection = new SqliteConnectionStringBuilder
        {
            DataSource = Path.Combine(folder, FileName),
            ForeignKeys = true,

            // Seconds that a command waits for another writer before it fails.
            DefaultTimeout = 10,
        };
        builder.UseSqlite(connection.ConnectionString).AddInterceptors(ConnectionSettings.Instance);
    }

    /// <summary>
    /// Two programs that start at once on the same folder must not both migrate. The operating system drops this
    /// lock when its holder dies; the lock that Entity Framework keeps in a table would then bar every later start,
    /// so whoever holds this one may clear it.
    /// </summary>
    private static FileStream HoldLock(string folder)
    {
        var path = Path.Combine(folder, LockName);
        for (var waited = 0; ; waited++)
        {
            try
            {
                return new FileStream(path, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
            }
            catch (IOException) when (waited < 100 && File.Exists(path))
            {
                Thread.Sleep(100);
            }
        }
    }

    private static void RefuseNewer(FloodPanelDb db, string folder)
    {
        var unknown = db.Database.GetAppliedMigrations().Except(db.Database.GetMigrations()).ToList();
        if (unknown.Count > 0)
        {
            throw new StoreException(
                $"The database {Path.Combine(folder, FileName)} was written by a newer FloodPanel ({unknown[^1]}); "
                + $"start that one, or name another folder with the setting {DataFolder.Setting}.");
        }
    }

    private static void Migrate(FloodPanelDb db)
    {
        if (!db.Database.GetPendingMigrations().Any())
        {
            return;
        }

        // WAL is a property of the file: once set, it stays.
        db.Database.ExecuteSqlRaw("PRAGMA journal_mode = WAL");
        db.Database.ExecuteSqlRaw("DROP TABLE IF EXISTS \"__EFMigrationsLock\"");
        db.Database.Migrate();
    }

    /// <summary>Checks the list of projects, which every start needs; the revisions may be many and are checked when opened.</summary>
    private static void CheckList(FloodPanelDb db)
    {
        var found = db.Database.SqlQueryRaw<string>("PRAGMA quick_check('Projects')").AsEnumerable().First();
        if (found != "ok")
        {
            throw new InvalidDataException(found.ReplaceLineEndings(", "));
        }
    }

    private static StoreException Unreadable(string folder, string reason, Exception cause) => new(
        $"The database {Path.Combine(folder, FileName)} cannot be read ({reason}); "
        + "restore it from a backup, or move it away to start with an empty one.", cause);
}
