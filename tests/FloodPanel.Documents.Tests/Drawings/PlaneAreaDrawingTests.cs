using FloodPanel.Calculation;
using FloodPanel.Calculation.PlaneAreas;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Tests.Drawings;

public class PlaneAreaDrawingTests
{
    public static TheoryData<PlaneShape, double> Areas => new MatrixTheoryData<PlaneShape, double>(
        [new CircleShape(0.6), new SegmentShape(2, 0.4, true), new TrapezoidShape(8, 0, 0.5), new PolygonShape([new(0, 0), new(1, 0), new(0, 9)])],
        [0.2, 0.45, 30]);

    /// <summary>However flat, slender, deep or shallow: everything stands on the sheet.</summary>
    [Theory]
    [MemberData(nameof(Areas))]
    public void Draw_AnyArea_StaysOnTheSheet(PlaneShape shape, double depth)
    {
        var input = new PlaneAreaInput { Shape = shape, Depth = depth, InclinationDegrees = 60 };

        var scene = PlaneAreaDrawing.Draw(input, PlaneArea.Evaluate(input), UnitSystem.SI);

        Assert.All(Points(scene), p =>
        {
            Assert.InRange(p.X, -0.01, scene.Width + 0.01);
            Assert.InRange(p.Y, -0.01, scene.Height + 0.01);
        });
        Assert.Contains("svg", SvgWriter.WriteText(scene), StringComparison.Ordinal);
    }

    private static IEnumerable<SheetPoint> Points(Scene scene) => scene.Shapes.SelectMany(shape => shape switch
    {
        Line line => [line.From, line.To],
        Polygon area => area.Points,
        Polyline run => run.Points,
        Text text => Ends(text),
        _ => Array.Empty<SheetPoint>(),
    });

    private static SheetPoint[] Ends(Text text)
    {
        var width = FontFile.Regular.Width(text.Words, text.Size);
        var left = text.Anchor switch
        {
            TextAnchor.End => text.Baseline.X - width,
            TextAnchor.Middle => text.Baseline.X - width / 2,
            _ => text.Baseline.X,
        };
        return [text.Baseline with { X = left }, text.Baseline with { X = left + width }];
    }
}
