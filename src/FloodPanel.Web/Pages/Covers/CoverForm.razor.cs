using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Covers;

/// <summary>The inputs of a cover.</summary>
public sealed partial class CoverForm
{
    private static readonly bool[] Shapes = [false, true];

    private RectangleCover rectangleBefore = new();
    private CircleCover circleBefore = new();

    [Parameter, EditorRequired]
    public required Cover Cover { get; set; }

    /// <summary>Path of the cover in the project file, "covers[0]".</summary>
    [Parameter, EditorRequired]
    public required string Path { get; set; }

    [Parameter, EditorRequired]
    public required IReadOnlyList<InputProblem> Problems { get; set; }

    [Parameter, EditorRequired]
    public required Library Library { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<CoverEdit> OnEdit { get; set; }

    private bool IsFlat => Cover.Position == CoverPosition.Flat;

    private string LevelLabel => IsFlat ? "Level of the plate" : Cover.Plate is CircleCover ? "Level of the middle" : "Level of the lower edge";

    // What one shape was typed to be is there again when it is chosen again.
    protected override void OnParametersSet()
    {
        rectangleBefore = Cover.Plate as RectangleCover ?? rectangleBefore;
        circleBefore = Cover.Plate as CircleCover ?? circleBefore;
    }

    private static string ShapeWords(bool isCircle) => isCircle ? "Circle" : "Rectangle";

    private static string SupportWords(RectangleSupport support) => support == RectangleSupport.FourEdges ? "Four edges" : "All but the upper";

    private static string RimWords(CircleSupport support) => support == CircleSupport.Supported ? "Supported" : "Clamped";

    private static string PositionWords(CoverPosition position) => position == CoverPosition.Upright ? "Upright" : "Flat";

    private static string PressingWords(CoverPressing pressing) => pressing == CoverPressing.Seating ? "Onto its seat" : "Off its seat";

    private Sentence? ProblemAt(string leaf) => Problems.FirstOrDefault(p => p.Path == $"{Path}.{leaf}")?.Message;

    private Task ChooseShape(bool isCircle) => SetPlate("Shape", isCircle ? circleBefore : rectangleBefore);

    private Task SetPlate(string what, CoverPlate plate) => Set(what, c => c with { Plate = plate });

    private Task SetFasteners(string what, Func<CoverFasteners, CoverFasteners> apply) =>
        Set(what, c => c with { Fasteners = apply(c.Fasteners) });

    private Task Set(string what, Func<Cover, Cover> apply) => OnEdit.InvokeAsync(new CoverEdit(what, apply));
}
