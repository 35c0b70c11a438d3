using System.Diagnostics;
using System.Globalization;
using System.Text;
using FloodPanel.Storage.ProjectFile;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace FloodPanel.Storage.Tests;

/// <summary>The program is killed without warning in the middle of saving. What it acknowledged must be there afterwards.</summary>
public class CrashTests
{
    private const int Rounds = 20;

    /// <summary>In every so many rounds the kill may fall into the making of a new database.</summary>
    private const int FreshEvery = 5;

    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Save_ProcessKilledInABurst_EveryAcknowledgedRevisionIsThere()
    {
        var random = new Random(1953);
        var parent = Directory.CreateTempSubdirectory("floodpanel-crash-").FullName;
        var folder = Path.Combine(parent, "0");
        var acknowledged = new List<Acknowledged>();
        var total = 0;
        for (var round = 0; round < Rounds; round++)
        {
            var fresh = round % FreshEvery == FreshEvery - 1;
            if (fresh)
            {
                folder = Path.Combine(parent, $"{round}");
                acknowledged.Clear();
            }

            var lines = await KillInBurstAsync(folder, random, afterFirstSave: !fresh);
            acknowledged.AddRange(lines.Select(Acknowledged.Parse));
            total += lines.Count;
            await AssertIntactAsync(folder, acknowledged);
        }

        Assert.True(total >= Rounds - Rounds / FreshEvery, $"only {total} saves were acknowledged in {Rounds} rounds");
        TestContext.Current.SendDiagnosticMessage($"{total} saves acknowledged in {Rounds} rounds");
        SqliteConnection.ClearAllPools();
        Directory.Delete(parent, recursive: true);
    }

    private static async Task<List<string>> KillInBurstAsync(string folder, Random random, bool afterFirstSave)
    {
        using var writer = Process.Start(new ProcessStartInfo
        {
            FileName = "dotnet",
            ArgumentList = { Path.Combine(AppContext.BaseDirectory, "FloodPanel.Storage.CrashWriter.dll"), folder },
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        })!;
        var errors = writer.StandardError.ReadToEndAsync(Stop);
        var lines = new List<string>();
        if (afterFirstSave && await writer.StandardOutput.ReadLineAsync(Stop) is { } first)
        {
            lines.Add(first);
        }

        await Task.Delay(random.Next(afterFirstSave ? 150 : 900), Stop);
        writer.Kill();
        var rest = await writer.StandardOutput.ReadToEndAsync(Stop);
        await writer.WaitForExitAsync(Stop);
        Assert.Equal("", await errors);

        // A line cut off by the kill was never wholly said, so it acknowledges nothing.
        lines.AddRange(rest[..(rest.LastIndexOf('\n') + 1)].Split('\n', StringSplitOptions.RemoveEmptyEntries));
        return lines;
    }

    private static async Task AssertIntactAsync(string folder, List<Acknowledged> acknowledged)
    {
        StoreSetup.Open(folder);
        await using var db = new FloodPanelDb(StoreSetup.Options(folder));
        Assert.Equal("ok", Assert.Single(await db.Database.SqlQueryRaw<string>("PRAGMA integrity_check").ToListAsync(Stop)));

        var revisions = await db.Revisions.AsNoTracking().OrderBy(r => r.Number).ToListAsync(Stop);
        Assert.Equal(Enumerable.Range(1, revisions.Count), revisions.Select(r => r.Number));
        foreach (var one in acknowledged)
        {
            var stored = revisions[one.Revision - 1];
            Assert.Equal(one.Project, stored.ProjectId);
            Assert.Contains($"\"reference\":\"{one.Reference}\"", stored.Json, StringComparison.Ordinal);
        }

        Assert.All(revisions, r => Assert.Empty(ProjectFileReader.Read(Encoding.UTF8.GetBytes(r.Json)).Problems));
        var project = await db.Projects.SingleOrDefaultAsync(Stop);
        Assert.Equal(revisions.Count, project?.CurrentRevision ?? 0);
    }

    private sealed record Acknowledged(Guid Project, int Revision, string Reference)
    {
        public static Acknowledged Parse(string line) => line.Split(' ') is [var project, var revision, var reference]
            ? new Acknowledged(Guid.Parse(project), int.Parse(revision, CultureInfo.InvariantCulture), reference)
            : throw new FormatException($"\"{line}\" acknowledges nothing.");
    }
}
