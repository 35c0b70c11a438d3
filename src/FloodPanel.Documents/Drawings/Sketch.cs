using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Drawings;

/// <summary>A sheet while it is being drawn.</summary>
internal sealed class Sketch(Sheet sheet)
{
    private readonly List<Shape> shapes = [];

    public Sheet Sheet => sheet;

    public IReadOnlyList<Shape> Shapes => shapes;

    public void Add(Shape shape) => shapes.Add(shape);

    public void Add(IEnumerable<Shape> more) => shapes.AddRange(more);

    public static Polygon Box(double left, double top, double right, double bottom, FillRole? fill, LineRole? outline) =>
        new([new(left, top), new(right, top), new(right, bottom), new(left, bottom)], fill, outline);

    public static Line Stroke(double x1, double y1, double x2, double y2, LineRole role) => new(new(x1, y1), new(x2, y2), role);

    /// <summary>The font of a role.</summary>
    public static FontFile Font(TextRole role) => role == TextRole.Strong ? FontFile.Semibold : FontFile.Regular;

    /// <summary>Width of a line of words [mm].</summary>
    public static double Width(string words, double size, TextRole role) => Font(role).Width(words, size);
}
