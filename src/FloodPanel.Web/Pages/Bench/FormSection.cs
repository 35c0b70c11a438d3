using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>A section of the form of an opening: shows it, finds its problems, raises its edits.</summary>
public abstract class FormSection : ComponentBase
{
    private (object?, IReadOnlyList<InputProblem>?, UnitSystem, object?) lastRendered;

    /// <summary>The opening.</summary>
    [Parameter, EditorRequired]
    public Opening Opening { get; set; } = null!;

    /// <summary>Path of the opening in the project file, "openings[0]".</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with each edit.</summary>
    [Parameter, EditorRequired]
    public EventCallback<OpeningEdit> OnEdit { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    protected Barrier Barrier => Opening.Barrier;

    /// <summary>The part of the opening that the section shows: a key typed elsewhere does not draw it again.</summary>
    protected virtual object? Shown => Opening;

    /// <summary>What a section shows besides the opening; when it changes the section is drawn again.</summary>
    protected virtual object? Besides => null;

    protected override bool ShouldRender()
    {
        var now = (Shown, Problems, Units, Besides);
        var sameProblems = ReferenceEquals(now.Problems, lastRendered.Item2) || (now.Problems.Count == 0 && lastRendered.Item2?.Count == 0);
        var same = Equals(now.Shown, lastRendered.Item1) && sameProblems
            && now.Units == lastRendered.Item3 && Equals(now.Besides, lastRendered.Item4);
        lastRendered = now;
        return !same;
    }

    protected Task Edit(string what, Func<Opening, Opening> apply) => OnEdit.InvokeAsync(new OpeningEdit(what, apply));

    protected Task EditBarrier(string what, Func<Barrier, Barrier> apply) =>
        Edit(what, opening => opening with { Barrier = apply(opening.Barrier) });

    protected Task EditLogs(string what, Func<LogStack, LogStack> apply) =>
        EditBarrier(what, barrier => barrier with { Logs = apply(barrier.Logs) });

    protected Task EditPosts(string what, Func<PostSet, PostSet> apply) =>
        EditBarrier(what, barrier => barrier.Posts is { } posts ? barrier with { Posts = apply(posts) } : barrier);

    /// <summary>A problem that ties this field to others; what a field's own limits refuse never gets this far by typing.</summary>
    protected Sentence? ProblemAt(string leaf) => Problems.FirstOrDefault(p => p.Path == $"{Path}.{leaf}")?.Message;
}
