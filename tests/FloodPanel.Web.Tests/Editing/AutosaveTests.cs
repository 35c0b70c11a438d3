using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Tests.Editing;

public sealed class AutosaveTests : IAsyncDisposable
{
    private readonly ManualTime time = new();
    private readonly MemoryStore store;
    private readonly Guid id;
    private readonly Autosave autosave;

    public AutosaveTests()
    {
        store = new MemoryStore(time);
        id = store.Put(Named("as opened"));
        autosave = new Autosave(store.Access, time);
        autosave.Start(new StoredProject(id, 1, time.GetUtcNow(), store.Revisions(id)[0]));
    }

    [Fact]
    public void Note_BeforeThePause_SavesNothing()
    {
        autosave.Note(Named("b"));
        time.Advance(TimeSpan.FromMilliseconds(599));

        Assert.Single(store.Revisions(id));
        Assert.Equal(SaveStep.Waiting, autosave.State.Step);
    }

    [Fact]
    public void Note_AfterThePause_AppendsOneRevision()
    {
        autosave.Note(Named("b"));
        time.Advance(TimeSpan.FromMilliseconds(300));
        autosave.Note(Named("bc"));
        time.Advance(TimeSpan.FromMilliseconds(600));

        Assert.Equal(["as opened", "bc"], store.Revisions(id).Select(p => p.Name));
        Assert.Equal(2, autosave.Revision);
        Assert.Equal(new SaveState(SaveStep.Saved, time.GetUtcNow()), autosave.State);
    }

    [Fact]
    public void Note_TypingWithoutAPause_IsSavedAfterThreeSeconds()
    {
        for (var i = 0; i < 31; i++)
        {
            autosave.Note(Named(new string('x', i + 1)));
            time.Advance(TimeSpan.FromMilliseconds(100));
        }

        Assert.Equal(2, store.Revisions(id).Count);
    }

    [Fact]
    public async Task SaveNowAsync_BackToWhatIsStored_AppendsNothing()
    {
        autosave.Note(Named("b"));
        autosave.Note(Named("as opened"));

        await autosave.SaveNowAsync();

        Assert.Single(store.Revisions(id));
        Assert.True(autosave.State.IsSafe);
    }

    [Fact]
    public async Task SaveNowAsync_SomeoneElseSaved_IsAConflictAndOverwritesNothing()
    {
        store.SaveByAnother(id, Named("theirs"));
        autosave.Note(Named("mine"));

        await autosave.SaveNowAsync();
        autosave.Note(Named("mine too"));
        time.Advance(TimeSpan.FromMinutes(1));

        Assert.Equal(SaveStep.Conflict, autosave.State.Step);
        Assert.Equal(["as opened", "theirs"], store.Revisions(id).Select(p => p.Name));
    }

    [Fact]
    public async Task ResumeAsync_AfterADeletionWasUndone_SavesWhatIsHeld()
    {
        store.DeleteByAnother(id);
        autosave.Note(Named("mine"));
        await autosave.SaveNowAsync();
        var gone = autosave.State.Step;
        await store.Access.Restore(id);

        await autosave.ResumeAsync();

        Assert.Equal(SaveStep.Gone, gone);
        Assert.Equal("mine", store.Revisions(id)[^1].Name);
        Assert.True(autosave.State.IsSafe);
    }

    [Fact]
    public async Task SaveNowAsync_StoreFails_SaysWhyAndTriesAgain()
    {
        store.Failure = new IOException("The disk is full.");
        autosave.Note(Named("b"));
        await autosave.SaveNowAsync();
        var failed = autosave.State;
        store.Failure = null;

        time.Advance(TimeSpan.FromSeconds(5));

        Assert.Equal(SaveStep.Failed, failed.Step);
        Assert.Equal("The disk is full.", failed.Reason);
        Assert.Equal("b", store.Revisions(id)[^1].Name);
        Assert.True(autosave.State.IsSafe);
    }

    [Fact]
    public async Task DisposeAsync_WithSomethingUnsaved_SavesIt()
    {
        autosave.Note(Named("last words"));

        await autosave.DisposeAsync();

        Assert.Equal("last words", store.Revisions(id)[^1].Name);
    }

    public ValueTask DisposeAsync() => autosave.DisposeAsync();

    private static Project Named(string name) => new() { Name = name };
}
