using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;
using PdfSharp.Drawing;

namespace FloodPanel.Documents.Pdf;

/// <summary>A verdict: a shape and words first, a colour second.</summary>
internal static class VerdictStrip
{
    private const double Indent = 8;

    public static Strip Of(VerdictLine verdict, double left, double width, double size, double leading)
    {
        var lead = Wording.Lines(verdict.Lead, FontFile.Semibold, size, width - Indent);
        var words = Wording.Lines(verdict.Words, FontFile.Regular, size, width - Indent);
        return new Strip(
            (lead.Count + words.Count) * size * leading + 0.8,
            (canvas, y) =>
            {
                Shape(canvas, verdict.Kind, left + 2.6, y + 0.95 * size);
                var baseline = y + size;
                foreach (var (line, font) in lead.Select(l => (l, FontFile.Semibold)).Concat(words.Select(w => (w, FontFile.Regular))))
                {
                    canvas.Words(line, left + Indent, baseline, font, size, Ink.Black);
                    baseline += size * leading;
                }
            });
    }

    /// <summary>A disc with a tick; a solid triangle, or an open diamond, with an exclamation mark.</summary>
    private static void Shape(Canvas canvas, VerdictKind kind, double x, double y)
    {
        SheetPoint At(double dx, double dy) => new(x + dx, y + dy);
        switch (kind)
        {
            case VerdictKind.Adequate:
                canvas.Circle(x, y, 2.1, Ink.Passed);
                canvas.Lines([At(-1.05, 0.1), At(-0.3, 0.85), At(1.05, -0.7)], Canvas.Pen(0xFFFFFF, 0.5));
                break;
            case VerdictKind.Inadequate:
                canvas.Polygon([At(0, -2.2), At(2.4, 2), At(-2.4, 2)], new XSolidBrush(Ink.Color(Ink.Warning)), null);
                Exclamation(canvas, x, y + 0.35, 0xFFFFFF);
                break;
            default:
                canvas.Polygon([At(0, -2.3), At(2.3, 0), At(0, 2.3), At(-2.3, 0)], null, Canvas.Pen(Ink.Warning, 0.5));
                Exclamation(canvas, x, y, Ink.Warning);
                break;
        }
    }

    private static void Exclamation(Canvas canvas, double x, double y, uint color)
    {
        canvas.Line(x, y - 1.1, x, y + 0.35, color, 0.5);
        canvas.Line(x, y + 0.8, x, y + 1.2, color, 0.5);
    }
}
