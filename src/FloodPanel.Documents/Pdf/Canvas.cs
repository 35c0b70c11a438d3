using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Typography;
using PdfSharp.Drawing;

namespace FloodPanel.Documents.Pdf;

/// <summary>A page measured in millimetres from its upper left corner.</summary>
internal sealed class Canvas(XGraphics graphics)
{
    public const double PointsPerMillimetre = 72 / 25.4;

    public void Line(double x1, double y1, double x2, double y2, uint color, double width) =>
        graphics.DrawLine(Pen(color, width), Points(x1), Points(y1), Points(x2), Points(y2));

    public void Area(double x, double y, double width, double height, uint color) =>
        graphics.DrawRectangle(new XSolidBrush(Ink.Color(color)), Points(x), Points(y), Points(width), Points(height));

    /// <summary>A line of words; y is the baseline.</summary>
    public void Words(
        string words, double x, double y, FontFile font, double size, uint color, TextAnchor anchor = TextAnchor.Start)
    {
        if (words.Length == 0)
        {
            return;
        }

        graphics.DrawString(
            words, EmbeddedFonts.Font(font, size), new XSolidBrush(Ink.Color(color)), Points(x), Points(y), Format(anchor));
    }

    /// <summary>Words that read upward from a place on their baseline.</summary>
    public void UpwardWords(string words, SheetPoint at, FontFile font, double size, uint color, TextAnchor anchor)
    {
        var state = graphics.Save();
        graphics.TranslateTransform(Points(at.X), Points(at.Y));
        graphics.RotateTransform(-90);
        Words(words, 0, 0, font, size, color, anchor);
        graphics.Restore(state);
    }

    public void Polygon(IReadOnlyList<SheetPoint> points, XBrush? brush, XPen? pen)
    {
        var path = points.Select(p => new XPoint(Points(p.X), Points(p.Y))).ToArray();
        if (brush is not null)
        {
            graphics.DrawPolygon(brush, path, XFillMode.Alternate);
        }

        if (pen is not null)
        {
            graphics.DrawPolygon(pen, path);
        }
    }

    public void Lines(IReadOnlyList<SheetPoint> points, XPen pen) =>
        graphics.DrawLines(pen, [.. points.Select(p => new XPoint(Points(p.X), Points(p.Y)))]);

    public void Segments(IEnumerable<Segment> segments, XPen pen)
    {
        foreach (var (from, to) in segments)
        {
            graphics.DrawLine(pen, Points(from.X), Points(from.Y), Points(to.X), Points(to.Y));
        }
    }

    public void Circle(double x, double y, double radius, uint color) => graphics.DrawEllipse(
        new XSolidBrush(Ink.Color(color)), Points(x - radius), Points(y - radius), Points(2 * radius), Points(2 * radius));

    public static XPen Pen(uint color, double width) =>
        new(Ink.Color(color), width * PointsPerMillimetre) { LineJoin = XLineJoin.Round };

    private static double Points(double millimetres) => millimetres * PointsPerMillimetre;

    private static XStringFormat Format(TextAnchor anchor) => anchor switch
    {
        TextAnchor.Start => XStringFormats.BaseLineLeft,
        TextAnchor.Middle => XStringFormats.BaseLineCenter,
        _ => XStringFormats.BaseLineRight,
    };
}
