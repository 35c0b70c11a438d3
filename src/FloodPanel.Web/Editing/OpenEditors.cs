using System.Collections.Concurrent;

namespace FloodPanel.Web.Editing;

/// <summary>
/// The editors of all connected browsers. A server that is told to stop drops its circuits without closing them;
/// what was typed in the last moment is saved before that.
/// </summary>
public sealed class OpenEditors
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(5);

    private readonly ConcurrentDictionary<ProjectEditor, bool> editors = new();

    public void Add(ProjectEditor editor) => editors[editor] = true;

    public void Remove(ProjectEditor editor) => editors.TryRemove(editor, out _);

    /// <summary>Saves what every editor holds; for the moment in which the server stops.</summary>
    public void SaveAll() => Task.WaitAll([.. editors.Keys.Select(e => Task.Run(e.SaveNowAsync))], Patience);
}
