using FloodPanel.Calculation;
using FloodPanel.Calculation.PlaneAreas;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.PlaneAreas;

/// <summary>A shape to choose from.</summary>
public enum ShapeKind
{
    Circle,
    Segment,
    Rectangle,
    Triangle,
    Trapezoid,
    Polygon,
}

/// <summary>Still water on any plane outline: form, drawing, figures, steps.</summary>
public sealed partial class PlaneAreasPage
{
    private static readonly ShapeKind[] Kinds = Enum.GetValues<ShapeKind>();

    private readonly Dictionary<ShapeKind, PlaneShape> remembered = new()
    {
        [ShapeKind.Circle] = new CircleShape(0.6),
        [ShapeKind.Segment] = new SegmentShape(0.6, 0.3, ChordBelow: false),
        [ShapeKind.Rectangle] = new TrapezoidShape(1, 1, 0.8),
        [ShapeKind.Triangle] = new TrapezoidShape(1, 0, 0.8),
        [ShapeKind.Trapezoid] = new TrapezoidShape(0.8, 1.2, 0.8),
        [ShapeKind.Polygon] = new PolygonShape([new(0, 0), new(1, 0), new(1, 0.6), new(0.4, 1)]),
    };

    private ShapeKind kind = ShapeKind.Circle;
    private PlaneAreaInput input = new();
    private IReadOnlyList<InputProblem> problems = [];
    private PlaneAreaResult? result;
    private MarkupString drawing;
    private UnitSystem drawnUnits;

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    protected override void OnInitialized() => Calculate();

    protected override void OnParametersSet()
    {
        if (Units != drawnUnits)
        {
            Calculate();
        }
    }

    private static string Name(ShapeKind kind) => kind switch
    {
        ShapeKind.Segment => "Segment of a circle",
        _ => kind.ToString(),
    };

    private void Choose(ShapeKind chosen)
    {
        remembered[kind] = input.Shape;
        kind = chosen;
        Change(i => i with { Shape = remembered[chosen] });
    }

    private void Change(Func<PlaneAreaInput, PlaneAreaInput> edit)
    {
        input = edit(input);
        Calculate();
    }

    // While a problem stands in the way, the last good result stays, greyed.
    private void Calculate()
    {
        problems = PlaneArea.Validate(input);
        if (problems.Count == 0)
        {
            result = PlaneArea.Evaluate(input);
            drawing = new MarkupString(SvgWriter.WriteText(PlaneAreaDrawing.Draw(input, result, Units)));
            drawnUnits = Units;
        }
    }

    private Sentence? ProblemAt(string path) => problems.FirstOrDefault(p => p.Path == path)?.Message;

    private string Shown(double value, Dimension dimension) => Calculation.Units.Format(value, dimension, Units);
}
