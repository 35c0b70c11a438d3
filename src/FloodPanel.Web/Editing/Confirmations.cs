namespace FloodPanel.Web.Editing;

/// <summary>Which figures from memory the user has confirmed in the open project, and the way to say so or take it back.</summary>
public sealed class Confirmations(ProjectEditor editor)
{
    /// <summary>Raised after each edit of the project, on any thread.</summary>
    public event Action? Changed
    {
        add => editor.Changed += value;
        remove => editor.Changed -= value;
    }

    /// <summary>True when the entry of the library is confirmed.</summary>
    public bool Holds(string id) => editor.Project.Confirmed.Contains(id);

    /// <summary>Confirms an entry of the library, or takes that back.</summary>
    public void Toggle(string id) => editor.Change($"confirm {id}", project => project with
    {
        Confirmed = project.Confirmed.Contains(id) ? [.. project.Confirmed.Where(held => held != id)] : project.Confirmed.Add(id),
    });
}
