using FloodPanel.Calculation;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// Reads the pressure diagram out: strips that the eye does not see, each with the height and the pressure at its
/// middle, of which the screen shows the one under the pointer.
/// </summary>
internal static class PressureReadings
{
    private const int Strips = 30;

    public static IEnumerable<Shape> Draw(Sheet sheet, DrawingInput input, CaseResult loadCase, Projection view, double right)
    {
        var (left, axis) = PressureFigure.Reach(sheet, input, loadCase, right);
        var strip = input.Result.BarrierHeight / Strips;
        var words = new SheetPoint(axis, view.SillY + 2.35 * sheet.TextSize);
        for (var i = 0; i < Strips; i++)
        {
            var z = (i + 0.5) * strip;
            var pressure = loadCase.Actions.SelectMany(a => a.Pieces).Sum(piece => piece.At(z));
            var reading = $"{input.Format(pressure, Dimension.Pressure)} at {input.LengthWithUnit(z)} above the sill";
            yield return new Mark(
                MarkKind.Reading, reading, null, null,
                [
                    Sketch.Box(left, view.Y((i + 1) * strip), axis, view.Y(i * strip), FillRole.Reach, null),
                    Sketch.Stroke(left, view.Y(z), axis, view.Y(z), LineRole.Dimension),
                    new Text(reading, words, sheet.SmallText, TextAnchor.End, TextRole.Strong),
                ]);
        }
    }
}
