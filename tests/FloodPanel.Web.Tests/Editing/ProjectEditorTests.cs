using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Editing;

public sealed class ProjectEditorTests : IAsyncDisposable
{
    private readonly ManualTime time = new();
    private readonly OpenEditors editors = new();
    private readonly ScreenSettings settings = new();
    private readonly MemoryStore store;
    private readonly ProjectEditor editor;
    private readonly Guid id;

    public ProjectEditorTests()
    {
        store = new MemoryStore(time);
        id = store.Put(Examples.Mill);
        editor = new ProjectEditor(store.Access, Library.Empty, settings, editors, time);
    }

    [Fact]
    public async Task OpenAsync_NoSuchProject_IsFalse()
    {
        Assert.False(await editor.OpenAsync(Guid.NewGuid()));
        Assert.False(editor.IsOpen);
    }

    [Fact]
    public async Task OpenAsync_Project_HasAResultForEachOpening()
    {
        Assert.True(await editor.OpenAsync(id));

        Assert.Empty(editor.Problems);
        Assert.Equal(0.95, editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
        Assert.NotNull(editor.ResultFor("door"));
        Assert.Null(editor.ResultFor("no such opening"));
    }

    [Fact]
    public async Task Change_OneOpening_CalculatesThatOneAlone()
    {
        await editor.OpenAsync(id);
        var (garage, door) = (editor.ResultFor("garage"), editor.ResultFor("door"));

        editor.Change("Sill level", p => WithGarage(p, o => o with { SillLevel = 11.5 }));

        Assert.Equal(0.85, editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
        Assert.NotSame(garage, editor.ResultFor("garage"));
        Assert.Same(door, editor.ResultFor("door"));
    }

    [Fact]
    public async Task Change_Site_CalculatesAll()
    {
        await editor.OpenAsync(id);

        editor.Change("Surge", p => p with { Site = p.Site with { Surge = 0.1 } });

        Assert.Equal(1.05, editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
        Assert.Equal(1.05, editor.ResultFor("door")!.RetainedDepth, tolerance: 1e-12);
    }

    [Fact]
    public async Task Change_ToSomethingThatCannotBeCalculated_HasAProblemAndNoOldResult()
    {
        await editor.OpenAsync(id);

        editor.Change("Clear width", p => WithGarage(p, o => o with { ClearWidth = -1 }));

        Assert.Contains("Clear width is -1 m", editor.ProblemAt("openings[0].clearWidth")!.ToString(), StringComparison.Ordinal);
        Assert.Null(editor.ResultFor("garage"));
        Assert.NotNull(editor.ResultFor("door"));
    }

    [Fact]
    public async Task Change_NameToNothing_KeepsTheResults()
    {
        await editor.OpenAsync(id);

        editor.Change("Project name", p => p with { Name = "" });

        Assert.NotNull(editor.ProblemAt("name"));
        Assert.NotNull(editor.ResultFor("garage"));
    }

    [Fact]
    public async Task Change_ToTheSame_IsNoEdit()
    {
        await editor.OpenAsync(id);

        editor.Change("Client", p => p with { Client = p.Client });

        Assert.False(editor.CanUndo);
        Assert.True(editor.State.IsSafe);
    }

    [Fact]
    public async Task Undo_AfterChange_BringsBackProjectAndResults()
    {
        await editor.OpenAsync(id);
        var before = editor.Project;
        editor.Change("Sill level", p => WithGarage(p, o => o with { SillLevel = 11.5 }));

        editor.Undo();

        Assert.Same(before, editor.Project);
        Assert.Equal(0.95, editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
        editor.Redo();
        Assert.Equal(0.85, editor.ResultFor("garage")!.RetainedDepth, tolerance: 1e-12);
    }

    [Fact]
    public async Task Undo_IsSavedToo()
    {
        await editor.OpenAsync(id);
        editor.Change("Client", p => p with { Client = "A" });
        await editor.SaveNowAsync();

        editor.Undo();
        time.Advance(TimeSpan.FromSeconds(1));

        Assert.Equal(["", "A", ""], store.Revisions(id).Select(p => p.Client));
    }

    [Fact]
    public async Task OpenAsync_AnotherProject_SavesTheFirst()
    {
        var other = store.Put(new Project { Name = "Other" });
        await editor.OpenAsync(id);
        editor.Change("Client", p => p with { Client = "A" });

        await editor.OpenAsync(other);

        Assert.Equal("A", store.Revisions(id)[^1].Client);
        Assert.Equal("Other", editor.Project.Name);
        Assert.False(editor.CanUndo);
    }

    [Fact]
    public async Task OpenAsync_SameProjectAgain_KeepsUndo()
    {
        await editor.OpenAsync(id);
        editor.Change("Client", p => p with { Client = "A" });

        await editor.OpenAsync(id);

        Assert.Equal("A", editor.Project.Client);
        Assert.True(editor.CanUndo);
    }

    [Fact]
    public async Task OpenAsync_SameProjectChangedElsewhere_TakesTheNewest()
    {
        await editor.OpenAsync(id);
        store.SaveByAnother(id, Examples.Mill with { Client = "Theirs" });

        await editor.OpenAsync(id);

        Assert.Equal("Theirs", editor.Project.Client);
    }

    [Fact]
    public async Task ReloadAsync_AfterAConflict_TakesTheirsAndGoesOnSaving()
    {
        await ConflictAsync();

        await editor.ReloadAsync();
        editor.Change("Engineer", p => p with { Engineer = "E" });
        await editor.SaveNowAsync();

        Assert.Equal(["", "Theirs", "Theirs"], store.Revisions(id).Select(p => p.Client));
        Assert.Equal("E", store.Revisions(id)[^1].Engineer);
    }

    [Fact]
    public async Task SaveAsCopyAsync_AfterAConflict_KeepsBoth()
    {
        await ConflictAsync();

        var copy = await editor.SaveAsCopyAsync();

        Assert.Equal("Theirs", store.Revisions(id)[^1].Client);
        Assert.Equal("Mine", store.Revisions(copy)[^1].Client);
        Assert.Equal("Mill Lane 4 (copy)", store.Revisions(copy)[^1].Name);
        Assert.Equal(copy, editor.Id);
        Assert.True(editor.State.IsSafe);
    }

    [Fact]
    public async Task DisposeAsync_WithAConflictUnanswered_StoresACopy()
    {
        await ConflictAsync();

        await editor.DisposeAsync();

        Assert.Equal("Theirs", store.Revisions(id)[^1].Client);
        Assert.Equal("Mine", store.Revisions(store.Ids.Single(i => i != id))[^1].Client);
    }

    [Fact]
    public async Task PutBackAsync_AfterADeletionElsewhere_SavesWhatIsHeld()
    {
        await editor.OpenAsync(id);
        store.DeleteByAnother(id);
        editor.Change("Client", p => p with { Client = "Mine" });
        await editor.SaveNowAsync();
        var gone = editor.State.Step;

        await editor.PutBackAsync();

        Assert.Equal(SaveStep.Gone, gone);
        Assert.Equal("Mine", store.Revisions(id)[^1].Client);
    }

    [Fact]
    public async Task SaveAll_ServerStops_SavesWhatIsHeld()
    {
        await editor.OpenAsync(id);
        editor.Change("Client", p => p with { Client = "Last words" });

        editors.SaveAll();

        Assert.Equal("Last words", store.Revisions(id)[^1].Client);
    }

    [Fact]
    public void Changed_UnitsSwitched_IsRaised()
    {
        var raised = 0;
        editor.Changed += () => raised++;

        settings.Use(UnitSystem.USCustomary);

        Assert.Equal(1, raised);
        Assert.Equal(UnitSystem.USCustomary, editor.Units);
    }

    public ValueTask DisposeAsync() => editor.DisposeAsync();

    private async Task ConflictAsync()
    {
        await editor.OpenAsync(id);
        store.SaveByAnother(id, Examples.Mill with { Client = "Theirs" });
        editor.Change("Client", p => p with { Client = "Mine" });
        await editor.SaveNowAsync();
        Assert.Equal(SaveStep.Conflict, editor.State.Step);
    }

    private static Project WithGarage(Project project, Func<Opening, Opening> edit) =>
        project with { Openings = project.Openings.SetItem(0, edit(project.Openings[0])) };
}
