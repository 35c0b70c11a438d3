using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;
using FloodPanel.Web.Shared.Forms;
using FloodPanel.Web.Shared.Results;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>One opening: form, sheet and ladder side by side.</summary>
public sealed partial class BenchView : IDisposable
{
    private readonly OpenFigure open = new();
    private readonly TypedProblems typed = new();
    private string chosenCase = "design-flood";
    private bool formOpen;
    private OpeningResult? shown;
    private Project? shownProject;
    private DrawingInput? drawing;
    private FigureKey? governing;

    /// <summary>The project.</summary>
    [Parameter, EditorRequired]
    public Project Project { get; set; } = null!;

    /// <summary>The opening.</summary>
    [Parameter, EditorRequired]
    public Opening Opening { get; set; } = null!;

    /// <summary>Path of the opening in the project file, "openings[0]".</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>Address of the page of the site.</summary>
    [Parameter, EditorRequired]
    public string SiteAddress { get; set; } = "";

    /// <summary>The result of the opening as it stands; null while problems stand in the way.</summary>
    [Parameter, EditorRequired]
    public OpeningResult? Result { get; set; }

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Materials and profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>The revision in the title block.</summary>
    [Parameter, EditorRequired]
    public string Revision { get; set; } = "";

    /// <summary>Raised with each edit.</summary>
    [Parameter, EditorRequired]
    public EventCallback<OpeningEdit> OnEdit { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    // What is shown is of an earlier state while a problem stands in the way, or while a text was not taken.
    private bool Stale => Result is null || typed.ByField.Count > 0;

    private IReadOnlyList<Sentence> Sentences =>
    [
        .. typed.ByField.Values,
        .. Problems.Where(p => Result is null && IsInTheWay(p)).Select(p => p.Message),
    ];

    private string WithoutResult => Sentences.Count == 1
        ? "One problem is to be mended first."
        : $"{Sentences.Count} problems are to be mended first.";

    private IReadOnlyList<string> CaseNames => [.. shown!.Cases.Select(c => c.Name)];

    private CaseResult? ShownCase => shown?.Cases.FirstOrDefault(c => c.Name == chosenCase) ?? shown?.Cases[0];

    public void Dispose()
    {
        open.Changed -= FollowFigure;
        typed.Changed -= StateHasChanged;
    }

    protected override void OnInitialized()
    {
        open.Changed += FollowFigure;
        typed.Changed += StateHasChanged;
    }

    protected override void OnParametersSet()
    {
        if (Result is not null && !ReferenceEquals(Result, shown))
        {
            (shown, shownProject) = (Result, Project);
            governing = Figures.Governing(Result);
        }

        drawing = shown is null ? null : new DrawingInput(shownProject!, shown, Library, Units, Revision);
    }

    private bool IsInTheWay(InputProblem problem) =>
        problem.Path.StartsWith(Path, StringComparison.Ordinal)
        || problem.Path.StartsWith("site", StringComparison.Ordinal)
        || problem.Path.StartsWith("designBasis", StringComparison.Ordinal);

    // A figure of another case brings its case along.
    private void FollowFigure()
    {
        if (open.Key is { Case.Length: > 0 } key)
        {
            chosenCase = key.Case;
        }

        StateHasChanged();
    }

    private string CaseWords(string name) =>
        governing?.Case == name ? $"{Words.OfCase(name)}, governs" : Words.OfCase(name);

    private void ChooseCase(string name) => chosenCase = name;

    private void ToggleForm() => formOpen = !formOpen;

    // The drawer of a narrow screen closes as drawers do; where the form stands open anyway nothing is seen of it.
    private void OnFormKey(KeyboardEventArgs key) => formOpen = formOpen && key.Key != "Escape";
}
