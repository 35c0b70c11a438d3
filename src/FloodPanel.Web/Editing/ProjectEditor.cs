using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;

namespace FloodPanel.Web.Editing;

/// <summary>
/// The open project of one browser tab: the tree, its results as they stand after each key, undo, and autosave.
/// It outlives the pages, so that a page that fails loses nothing.
/// </summary>
public sealed class ProjectEditor : IAsyncDisposable
{
    private readonly ProjectAccess access;
    private readonly ScreenSettings settings;
    private readonly OpenEditors editors;
    private readonly LiveResults results;
    private readonly EditHistory history;
    private readonly Autosave autosave;

    public ProjectEditor(ProjectAccess access, Library library, ScreenSettings settings, OpenEditors editors, TimeProvider time)
    {
        (this.access, this.settings, this.editors) = (access, settings, editors);
        results = new LiveResults(library);
        history = new EditHistory(time);
        autosave = new Autosave(access, time);
        autosave.Changed += Show;
        settings.Changed += Show;
        editors.Add(this);
    }

    /// <summary>The open project; empty before the first one is opened.</summary>
    public Guid Id => autosave.Id;

    public bool IsOpen => Id != Guid.Empty;

    /// <summary>The newest revision that this tab knows of.</summary>
    public int Revision => autosave.Revision;

    public Project Project { get; private set; } = new();

    public UnitSystem Units => settings.Units;

    public IReadOnlyList<InputProblem> Problems => results.Problems;

    public SaveState State => autosave.State;

    public bool CanUndo => history.CanUndo;

    public bool CanRedo => history.CanRedo;

    public string? UndoWhat => history.UndoWhat;

    public string? RedoWhat => history.RedoWhat;

    /// <summary>Raised after an edit, a save or a change of units; on any thread, so answer with InvokeAsync.</summary>
    public event Action? Changed;

    /// <summary>The result of an opening; null when it has a problem or does not exist.</summary>
    public OpeningResult? ResultFor(string openingId) => results.For(openingId);

    /// <summary>The result of a cover by its place in the list; null when it has a problem.</summary>
    public CoverResult? CoverAt(int index) => results.CoverAt(index);

    /// <summary>The problem of one field by its path in the project file, "openings[0].clearWidth"; null when it has none.</summary>
    public Sentence? ProblemAt(string path) => Problems.FirstOrDefault(p => p.Path == path)?.Message;

    /// <summary>Opens a project, saving the one that was open; false when there is no such project.</summary>
    public async Task<bool> OpenAsync(Guid id)
    {
        await autosave.SaveNowAsync();
        if (id == Id && !State.IsSafe)
        {
            return true;
        }

        var opened = await access.Open(id);
        if (opened is null)
        {
            return false;
        }

        if (id != Id || opened.Revision != Revision)
        {
            Load(opened);
        }

        return true;
    }

    /// <summary>Edits the project. Edits of the same <paramref name="what"/> in quick succession are undone together.</summary>
    public void Change(string what, Func<Project, Project> edit)
    {
        var before = Project;
        var after = edit(before);
        if (after != before)
        {
            history.Record(what, before);
            Use(after);
        }
    }

    public void Undo()
    {
        if (CanUndo)
        {
            Use(history.Undo(Project));
        }
    }

    public void Redo()
    {
        if (CanRedo)
        {
            Use(history.Redo(Project));
        }
    }

    /// <summary>Saves now; see <see cref="State"/> for what became of it.</summary>
    public Task SaveNowAsync() => autosave.SaveNowAsync();

    /// <summary>Answers a conflict: drops what this tab has not saved and takes the newest revision.</summary>
    public async Task ReloadAsync()
    {
        if (await access.Open(Id) is { } opened)
        {
            Load(opened);
        }
    }

    /// <summary>Answers a conflict: stores what this tab holds as a project of its own and goes on with that one.</summary>
    public async Task<Guid> SaveAsCopyAsync()
    {
        var copy = Project with { Name = $"{Project.Name} (copy)" };
        var opened = await access.Create(copy);
        Project = opened.Project;
        results.Update(Project);
        autosave.Start(opened);
        return opened.Id;
    }

    /// <summary>Answers a deletion by someone else: brings the project back and saves what this tab holds.</summary>
    public async Task PutBackAsync()
    {
        await access.Restore(Id);
        await autosave.ResumeAsync();
    }

    private void Load(StoredProject opened)
    {
        history.Clear();
        Project = opened.Project;
        autosave.Start(opened);
        results.Update(Project);
        Show();
    }

    // First kept and noted for saving, then calculated: a fault in the calculation must not cost what was typed.
    private void Use(Project project)
    {
        Project = project;
        autosave.Note(project);
        results.Update(project);
        Show();
    }

    private void Show() => Changed?.Invoke();

    public async ValueTask DisposeAsync()
    {
        editors.Remove(this);
        settings.Changed -= Show;
        autosave.Changed -= Show;
        await autosave.SaveNowAsync();
        if (State.NeedsChoice)
        {
            // The tab was closed before the choice was made; a copy loses nothing and overwrites nothing.
            await SaveAsCopyAsync();
        }

        await autosave.DisposeAsync();
    }
}
