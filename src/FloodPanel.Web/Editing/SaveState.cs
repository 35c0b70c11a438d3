namespace FloodPanel.Web.Editing;

public enum SaveStep
{
    /// <summary>Everything typed stands in the store.</summary>
    Saved,

    /// <summary>Typed, and to be saved in a moment.</summary>
    Waiting,

    Saving,

    /// <summary>The store refused; it is tried again.</summary>
    Failed,

    /// <summary>Someone else saved the project in between; the user must choose.</summary>
    Conflict,

    /// <summary>Someone else deleted the project in between; the user must choose.</summary>
    Gone,
}

/// <summary>How what is typed stands to what is stored.</summary>
/// <param name="Step">The step.</param>
/// <param name="SavedAt">When the last revision was stored.</param>
/// <param name="Reason">Why a save failed; else null.</param>
public sealed record SaveState(SaveStep Step, DateTimeOffset SavedAt, string? Reason = null)
{
    public bool IsSafe => Step == SaveStep.Saved;

    /// <summary>Nothing is saved until the user has chosen.</summary>
    public bool NeedsChoice => Step is SaveStep.Conflict or SaveStep.Gone;
}
