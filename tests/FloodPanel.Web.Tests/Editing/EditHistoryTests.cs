using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;

namespace FloodPanel.Web.Tests.Editing;

public class EditHistoryTests
{
    private readonly ManualTime time = new();

    [Fact]
    public void Record_SameThingWithinAMoment_IsOneEntry()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named(""));
        time.Advance(TimeSpan.FromSeconds(1.4));
        history.Record("Name", Named("M"));
        time.Advance(TimeSpan.FromSeconds(1.4));
        history.Record("Name", Named("Mi"));

        var undone = history.Undo(Named("Mil"));

        Assert.Equal("", undone.Name);
        Assert.False(history.CanUndo);
    }

    [Fact]
    public void Record_SameThingAfterAPause_IsTwoEntries()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named("a"));
        time.Advance(TimeSpan.FromSeconds(1.6));
        history.Record("Name", Named("b"));

        var undone = history.Undo(Named("c"));

        Assert.Equal("b", undone.Name);
        Assert.True(history.CanUndo);
    }

    [Fact]
    public void Record_OtherThing_IsTwoEntries()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named("a"));
        history.Record("Client", Named("b"));

        Assert.Equal("Client", history.UndoWhat);
        Assert.Equal("b", history.Undo(Named("c")).Name);
        Assert.Equal("Name", history.UndoWhat);
    }

    [Fact]
    public void Record_SameThingAfterAnUndo_IsANewEntry()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named("a"));
        time.Advance(TimeSpan.FromSeconds(5));
        history.Record("Name", Named("b"));
        history.Undo(Named("c"));
        history.Record("Name", Named("b"));

        Assert.Equal("b", history.Undo(Named("d")).Name);
        Assert.Equal("a", history.Undo(Named("b")).Name);
    }

    [Fact]
    public void Redo_AfterUndo_GivesBackWhatWasUndone()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named("a"));

        var undone = history.Undo(Named("b"));
        var redone = history.Redo(undone);

        Assert.Equal("b", redone.Name);
        Assert.True(history.CanUndo);
        Assert.False(history.CanRedo);
    }

    [Fact]
    public void Record_AfterUndo_ForgetsWhatCouldBeRedone()
    {
        var history = new EditHistory(time);
        history.Record("Name", Named("a"));
        history.Undo(Named("b"));

        history.Record("Client", Named("a"));

        Assert.False(history.CanRedo);
        Assert.Null(history.RedoWhat);
    }

    private static Project Named(string name) => new() { Name = name };
}
