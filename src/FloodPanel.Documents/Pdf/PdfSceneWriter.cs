using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Typography;
using PdfSharp.Drawing;

namespace FloodPanel.Documents.Pdf;

/// <summary>Draws a scene into a PDF as vectors, at its true scale.</summary>
internal static class PdfSceneWriter
{
    /// <summary>Draws the scene with its upper left corner at a place on the page [mm].</summary>
    public static void Draw(Canvas canvas, Scene scene, double x, double y)
    {
        foreach (var shape in scene.Shapes)
        {
            Draw(canvas, shape, x, y);
        }
    }

    private static void Draw(Canvas canvas, Shape shape, double x, double y)
    {
        SheetPoint Move(SheetPoint p) => new(p.X + x, p.Y + y);
        switch (shape)
        {
            case Line line:
                canvas.Lines([Move(line.From), Move(line.To)], Pen(line.Role));
                break;
            case Polyline run:
                canvas.Lines([.. run.Points.Select(Move)], Pen(run.Role));
                break;
            case Hatch hatch:
                canvas.Segments(hatch.Segments.Select(s => new Segment(Move(s.From), Move(s.To))), Pen(hatch.Role));
                break;
            case Polygon { Fill: not FillRole.Reach } area:
                canvas.Polygon([.. area.Points.Select(Move)], Brush(area.Fill), area.Outline is { } edge ? Pen(edge) : null);
                break;
            case Polygon:
                break;
            case Text text:
                DrawText(canvas, text, Move(text.Baseline));
                break;
            case Mark mark:
                foreach (var part in mark.Parts)
                {
                    Draw(canvas, part, x, y);
                }

                break;
            default:
                throw new InvalidOperationException($"The shape {shape.GetType().Name} has no PDF form.");
        }
    }

    private static void DrawText(Canvas canvas, Text text, SheetPoint at)
    {
        var font = text.Role == TextRole.Strong ? FontFile.Semibold : FontFile.Regular;
        var color = text.Role == TextRole.Muted ? Ink.Muted : Ink.Black;
        var words = Wording.OneLine(text.Words);
        if (text.Upward)
        {
            canvas.UpwardWords(words, at, font, text.Size, color, text.Anchor);
        }
        else
        {
            canvas.Words(words, at.X, at.Y, font, text.Size, color, text.Anchor);
        }
    }

    private static XSolidBrush? Brush(FillRole? role) =>
        role is { } fill ? new XSolidBrush(Ink.Color(Ink.Of(fill), Ink.Opacity(fill))) : null;

    private static XPen Pen(LineRole role)
    {
        var width = LineWeights.Of(role);
        var pen = Canvas.Pen(Ink.Of(role), width);
        if (role == LineRole.Hidden)
        {
            // The library measures dashes in line widths.
            pen.DashPattern = [.. LineWeights.HiddenDash.Select(d => d / width)];
        }

        return pen;
    }
}
