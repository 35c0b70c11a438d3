using System.Data.Common;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace FloodPanel.Storage;

/// <summary>
/// Settings that SQLite keeps for a connection only. FULL: what was acknowledged as saved survives a loss of power.
/// </summary>
internal sealed class ConnectionSettings : DbConnectionInterceptor
{
    public static readonly ConnectionSettings Instance = new();

    private const string Pragmas = "PRAGMA synchronous = FULL; PRAGMA busy_timeout = 10000;";

    public override void ConnectionOpened(DbConnection connection, ConnectionEndEventData eventData)
    {
        using var command = connection.CreateCommand();
        command.CommandText = Pragmas;
        command.ExecuteNonQuery();
    }

    public override async Task ConnectionOpenedAsync(
        DbConnection connection, ConnectionEndEventData eventData, CancellationToken cancellationToken = default)
    {
        await using var command = connection.CreateCommand();
        command.CommandText = Pragmas;
        await command.ExecuteNonQueryAsync(cancellationToken);
    }
}
