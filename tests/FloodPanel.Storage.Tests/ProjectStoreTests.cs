namespace FloodPanel.Storage.Tests;

public sealed class ProjectStoreTests : IDisposable
{
    private readonly TestClock clock = new();
    private readonly StoreFolder folder;

    public ProjectStoreTests() => folder = new StoreFolder(clock);

    private ProjectStore Store => folder.Store;

    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    public void Dispose() => folder.Dispose();

    [Fact]
    public async Task Open_CreatedProject_IsEqual()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);

        var opened = await Store.OpenAsync(created.Id, Stop);

        Assert.Equal(created, opened);
        Assert.Equal(Example.Full, opened!.Project);
        Assert.Equal(1, opened.Revision);
        Assert.Equal(clock.Now, opened.SavedAt);
    }

    [Fact]
    public async Task Open_UnknownProject_IsNull() => Assert.Null(await Store.OpenAsync(Guid.NewGuid(), Stop));

    [Fact]
    public async Task Save_ChangedProject_AppendsARevision()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        clock.Now += TimeSpan.FromMinutes(5);
        var changed = Example.Full with { Name = "Renamed", Client = "B. Rowe", Openings = [] };

        var outcome = await Store.SaveAsync(created.Id, 1, changed, Stop);

        Assert.Equal(new ProjectSaved(2, clock.Now), outcome);
        Assert.Equal(new StoredProject(created.Id, 2, clock.Now, changed), await Store.OpenAsync(created.Id, Stop));
        var row = Assert.Single(await Store.ListAsync(cancellation: Stop));
        Assert.Equal(("Renamed", "R-7", "B. Rowe", 0, 2), (row.Name, row.Reference, row.Client, row.OpeningCount, row.Revision));
        Assert.Equal((created.SavedAt, clock.Now), (row.CreatedAt, row.ModifiedAt));
        Assert.Equal([2, 1], (await Store.RevisionsAsync(created.Id, Stop)).Select(r => r.Number));
    }

    [Fact]
    public async Task Save_UnchangedProject_KeepsTheRevision()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        clock.Now += TimeSpan.FromMinutes(5);

        var outcome = await Store.SaveAsync(created.Id, 1, Example.Full with { }, Stop);

        Assert.Equal(new ProjectSaved(1, created.SavedAt), outcome);
        Assert.Single(await Store.RevisionsAsync(created.Id, Stop));
    }

    [Fact]
    public async Task Save_OverANewerRevision_IsAConflictAndWritesNothing()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        var first = Example.Full with { Reference = "first tab" };
        await Store.SaveAsync(created.Id, 1, first, Stop);

        var outcome = await Store.SaveAsync(created.Id, 1, Example.Full with { Reference = "second tab" }, Stop);

        var conflict = Assert.IsType<SaveConflict>(outcome);
        Assert.Equal(new StoredProject(created.Id, 2, clock.Now, first), conflict.Newer);
        Assert.Equal(conflict.Newer, await Store.OpenAsync(created.Id, Stop));
        Assert.Equal(2, (await Store.RevisionsAsync(created.Id, Stop)).Count);
    }

    [Fact]
    public async Task Save_AgainAfterALostAnswer_IsSaved()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        var changed = Example.Full with { Reference = "sent twice" };
        await Store.SaveAsync(created.Id, 1, changed, Stop);

        Assert.Equal(new ProjectSaved(2, clock.Now), await Store.SaveAsync(created.Id, 1, changed, Stop));
    }

    [Fact]
    public async Task Save_UnknownOrDeletedProject_IsGone()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        await Store.DeleteAsync(created.Id, Stop);

        Assert.IsType<ProjectGone>(await Store.SaveAsync(created.Id, 1, Example.Full with { Reference = "late" }, Stop));
        Assert.IsType<ProjectGone>(await Store.SaveAsync(Guid.NewGuid(), 1, Example.Full, Stop));
        Assert.Equal(1L, folder.Scalar<long>("SELECT count(*) FROM Revisions"));
    }

    [Fact]
    public async Task Save_TwentySaversAtOnce_EachRevisionIsWrittenByExactlyOne()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);

        var outcomes = await Task.WhenAll(Enumerable.Range(0, 20).Select(i => Task.Run(
            () => Store.SaveAsync(created.Id, 1, Example.Full with { Reference = $"saver {i}" }, Stop), Stop)));

        Assert.Single(outcomes.OfType<ProjectSaved>());
        Assert.Equal(19, outcomes.OfType<SaveConflict>().Count());
        Assert.Equal(2, (await Store.OpenAsync(created.Id, Stop))!.Revision);
    }

    [Fact]
    public async Task Save_TwoSaversWhoReopenAfterConflicts_LoseNothing()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);

        await Task.WhenAll(Enumerable.Range(0, 2).Select(saver => Task.Run(() => AddTenAsync(created.Id, $"s{saver}"), Stop)));

        var saved = (await Store.OpenAsync(created.Id, Stop))!;
        Assert.Equal(21, saved.Revision);
        Assert.Equal(
            Enumerable.Range(0, 10).SelectMany(i => new[] { $"s0-{i}", $"s1-{i}" }).Order(),
            saved.Project.Openings.Skip(2).Select(o => o.Id).Order());
    }

    [Fact]
    public async Task Save_NumberThatIsNotFinite_IsRefusedWithASentence()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        var broken = Example.Full with { Site = Example.Full.Site with { Surge = double.NaN } };

        var refusal = await Assert.ThrowsAsync<StoreException>(() => Store.SaveAsync(created.Id, 1, broken, Stop));

        Assert.Equal("The project cannot be stored: it holds a number that is not finite.", refusal.Message);
    }

    [Fact]
    public async Task Create_ProjectThatCouldNotBeOpenedAgain_IsRefusedWithASentence()
    {
        var refusal = await Assert.ThrowsAsync<StoreException>(
            () => Store.CreateAsync(Example.Full with { Address = new string('x', 5_000_000) }, Stop));

        Assert.Equal("The project cannot be stored. The file is larger than 4 MB; a project file is not.", refusal.Message);
    }

    [Fact]
    public async Task Open_DamagedText_IsRefusedWithASentence()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        folder.Execute("UPDATE Revisions SET Json = substr(Json, 1, 300)");

        var refusal = await Assert.ThrowsAsync<StoreException>(() => Store.OpenAsync(created.Id, Stop));

        Assert.StartsWith("Revision 1 of the stored project is damaged. ", refusal.Message);
    }

    [Fact]
    public async Task Save_DatabaseThatFails_IsToldInASentence()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        folder.Execute("CREATE TRIGGER full BEFORE INSERT ON Revisions BEGIN SELECT RAISE(ABORT, 'disk is full'); END");

        var refusal = await Assert.ThrowsAsync<StoreException>(
            () => Store.SaveAsync(created.Id, 1, Example.Full with { Reference = "lost" }, Stop));

        Assert.StartsWith("The database does not answer (", refusal.Message);
        Assert.Contains("disk is full", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(created, await Store.OpenAsync(created.Id, Stop));
    }

    [Fact]
    public async Task Duplicate_Project_IsASeparateProjectAtRevision1()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);
        await Store.SaveAsync(created.Id, 1, Example.Full with { Reference = "newest" }, Stop);

        var copy = await Store.DuplicateAsync(created.Id, Stop);

        Assert.Equal(Example.Full with { Name = Example.Full.Name + " (copy)", Reference = "newest" }, copy!.Project);
        Assert.Equal(1, copy.Revision);
        Assert.NotEqual(created.Id, copy.Id);
        Assert.Equal(2, (await Store.ListAsync(cancellation: Stop)).Count);
        Assert.Null(await Store.DuplicateAsync(Guid.NewGuid(), Stop));
    }

    [Fact]
    public async Task Delete_ThenRestore_BringsEverythingBack()
    {
        var created = await Store.CreateAsync(Example.Full, Stop);

        Assert.True(await Store.DeleteAsync(created.Id, Stop));
        Assert.Empty(await Store.ListAsync(cancellation: Stop));
        Assert.Null(await Store.OpenAsync(created.Id, Stop));
        Assert.False(await Store.DeleteAsync(created.Id, Stop));

        Assert.True(await Store.RestoreAsync(created.Id, Stop));
        Assert.Single(await Store.ListAsync(cancellation: Stop));
        Assert.Equal(created, await Store.OpenAsync(created.Id, Stop));
        Assert.False(await Store.RestoreAsync(created.Id, Stop));
    }

    [Theory]
    [InlineData(null, "Tide house|Weir 50%|Ölmühle")]
    [InlineData("  ", "Tide house|Weir 50%|Ölmühle")]
    [InlineData("ölMÜHLE", "Ölmühle")]
    [InlineData("house tide", "Tide house")]
    [InlineData("rowe", "Tide house")]
    [InlineData("K-2", "Weir 50%")]
    [InlineData("%", "Weir 50%")]
    [InlineData("tide K-2", "")]
    public async Task List_Search_FindsWordsInNameReferenceAndClient(string? search, string expected)
    {
        await Store.CreateAsync(new Project { Name = "Ölmühle" }, Stop);
        await Store.CreateAsync(new Project { Name = "Tide house", Client = "B. Rowe" }, Stop);
        await Store.CreateAsync(new Project { Name = "Weir 50%", Reference = "K-2" }, Stop);

        var found = await Store.ListAsync(search, Stop);

        Assert.Equal(expected, string.Join('|', found.Select(p => p.Name).Order(StringComparer.Ordinal)));
    }

    [Fact]
    public async Task List_Order_IsLastModifiedFirst()
    {
        var old = await Store.CreateAsync(new Project { Name = "old" }, Stop);
        clock.Now += TimeSpan.FromDays(1);
        await Store.CreateAsync(new Project { Name = "new" }, Stop);
        clock.Now += TimeSpan.FromDays(1);
        await Store.SaveAsync(old.Id, 1, new Project { Name = "old, touched" }, Stop);

        Assert.Equal(["old, touched", "new"], (await Store.ListAsync(cancellation: Stop)).Select(p => p.Name));
    }

    private async Task AddTenAsync(Guid id, string saver)
    {
        for (var i = 0; i < 10;)
        {
            var opened = (await Store.OpenAsync(id, Stop))!;
            var opening = new Opening { Id = $"{saver}-{i}", Barrier = new Barrier { Bays = [1] } };
            var outcome = await Store.SaveAsync(
                id, opened.Revision, opened.Project with { Openings = opened.Project.Openings.Add(opening) }, Stop);
            i += outcome is ProjectSaved ? 1 : 0;
        }
    }
}
