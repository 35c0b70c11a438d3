using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Editing;

/// <summary>
/// Undo and redo. The project is immutable, so that an entry is the tree as it stood before. Edits of the same
/// thing in quick succession (the keys of one number) are one entry.
/// </summary>
public sealed class EditHistory(TimeProvider time)
{
    private const int Longest = 500;

    private static readonly TimeSpan SameEdit = TimeSpan.FromSeconds(1.5);

    private readonly List<Entry> undo = [];
    private readonly Stack<Entry> redo = new();
    private DateTimeOffset lastEdit;
    private bool mayGrow;

    public bool CanUndo => undo.Count > 0;

    public bool CanRedo => redo.Count > 0;

    /// <summary>What would be undone; null when nothing.</summary>
    public string? UndoWhat => CanUndo ? undo[^1].What : null;

    /// <summary>What would be redone; null when nothing.</summary>
    public string? RedoWhat => CanRedo ? redo.Peek().What : null;

    public void Record(string what, Project before)
    {
        var now = time.GetUtcNow();
        if (!(mayGrow && CanUndo && undo[^1].What == what && now - lastEdit <= SameEdit))
        {
            undo.Add(new Entry(what, before));
        }

        if (undo.Count > Longest)
        {
            undo.RemoveAt(0);
        }

        redo.Clear();
        (lastEdit, mayGrow) = (now, true);
    }

    /// <summary>The project before the last edit; ask <see cref="CanUndo"/> first.</summary>
    public Project Undo(Project current)
    {
        var entry = undo[^1];
        undo.RemoveAt(undo.Count - 1);
        redo.Push(entry with { Project = current });
        mayGrow = false;
        return entry.Project;
    }

    /// <summary>The project before the last undo; ask <see cref="CanRedo"/> first.</summary>
    public Project Redo(Project current)
    {
        var entry = redo.Pop();
        undo.Add(entry with { Project = current });
        mayGrow = false;
        return entry.Project;
    }

    public void Clear()
    {
        undo.Clear();
        redo.Clear();
        mayGrow = false;
    }

    private readonly record struct Entry(string What, Project Project);
}
