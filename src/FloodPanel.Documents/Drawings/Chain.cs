namespace FloodPanel.Documents.Drawings;

/// <summary>
/// A chain of horizontal dimensions. A figure that does not fit above its link stands below the line, where it does
/// not meet the one before; else it is left to the mark's name.
/// </summary>
internal sealed class Chain(Sheet sheet, double y, double edgeY)
{
    private readonly List<(double Left, double Right)> below = [];

    /// <summary>False once a link stands without its figure.</summary>
    public bool IsComplete { get; private set; } = true;

    /// <summary>A link with extension lines and ticks.</summary>
    public Mark Link(string field, string name, string figure, double left, double right)
    {
        var isAbove = Sketch.Width(figure, sheet.TextSize, TextRole.Normal) <= right - left - 1;
        var mark = DimensionMarks.Horizontal(
            sheet, new DimensionLabel(field, name, isAbove ? [figure] : []), left, right, y, edgeY);
        if (isAbove || Below(figure, left, right) is not { } text)
        {
            IsComplete &= isAbove;
            return mark;
        }

        return mark with { Parts = [.. mark.Parts, text] };
    }

    /// <summary>A narrow link between two others; its figure stands below the line.</summary>
    public Mark SmallLink(string field, string name, string figure, double left, double right)
    {
        List<Shape> parts =
        [
            Sketch.Box(left, y, right, y + sheet.TextSize, FillRole.Reach, null),
            Sketch.Stroke(left, y, right, y, LineRole.Dimension),
        ];
        if (Below(figure, left, right) is { } text)
        {
            parts.Add(text);
        }

        return new Mark(MarkKind.Dimension, name, field, null, parts);
    }

    private Text? Below(string figure, double left, double right)
    {
        var size = sheet.SmallText;
        var half = Sketch.Width(figure, size, TextRole.Normal) / 2;
        var middle = (left + right) / 2;
        if (below.Any(b => middle - half < b.Right + 1 && middle + half > b.Left - 1))
        {
            return null;
        }

        below.Add((middle - half, middle + half));
        return new Text(figure, new(middle, y + 1.15 + 0.72 * size), size, TextAnchor.Middle, TextRole.Normal);
    }
}
