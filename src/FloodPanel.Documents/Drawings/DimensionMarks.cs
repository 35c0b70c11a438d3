namespace FloodPanel.Documents.Drawings;

/// <summary>Where the figure of a dimension goes when it does not fit between the ticks.</summary>
internal enum Overflow
{
    /// <summary>It is left out; the mark's name still says it.</summary>
    Omit,

    /// <summary>Beyond the lower or left end.</summary>
    Before,

    /// <summary>Beyond the upper or right end.</summary>
    After,
}

/// <summary>What a dimension says.</summary>
/// <param name="Field">The field that sets it, or null.</param>
/// <param name="Name">Name and figure.</param>
/// <param name="Figures">The figure, the fullest wording first.</param>
/// <param name="Overflow">Where it goes when none of them fits.</param>
internal sealed record DimensionLabel(
    string? Field, string Name, IReadOnlyList<string> Figures, Overflow Overflow = Overflow.Omit);

/// <summary>Draws dimensions with oblique ticks.</summary>
internal static class DimensionMarks
{
    private const double Tick = 0.9;
    private const double Past = 1.0;

    /// <summary>A dimension along a horizontal line.</summary>
    /// <param name="sheet">The sheet.</param>
    /// <param name="label">What it says.</param>
    /// <param name="fromX">Left end [mm].</param>
    /// <param name="toX">Right end [mm].</param>
    /// <param name="y">The dimension line [mm].</param>
    /// <param name="edgeY">Where the extension lines begin [mm].</param>
    /// <param name="below">True when the figure stands below the line.</param>
    public static Mark Horizontal(
        Sheet sheet, DimensionLabel label, double fromX, double toX, double y, double edgeY, bool below = false)
    {
        List<Shape> parts =
        [
            Sketch.Box(fromX, y - sheet.TextSize, toX, y + 0.6, FillRole.Reach, null),
            Sketch.Stroke(fromX, edgeY, fromX, y + Past, LineRole.Extension),
            Sketch.Stroke(toX, edgeY, toX, y + Past, LineRole.Extension),
            Sketch.Stroke(fromX, y, toX, y, LineRole.Dimension),
            TickAt(fromX, y),
            TickAt(toX, y),
        ];

        var baseline = below ? y + 0.35 + 0.8 * sheet.TextSize : y - 0.3 * sheet.TextSize;
        var figure = Fitting(label.Figures, sheet.TextSize, toX - fromX - 1);
        if (figure is not null)
        {
            parts.Add(new Text(figure, new((fromX + toX) / 2, baseline), sheet.TextSize, TextAnchor.Middle, TextRole.Normal));
        }
        else if (label.Overflow != Overflow.Omit)
        {
            var after = label.Overflow == Overflow.After;
            parts.Add(new Text(
                label.Figures[^1], new(after ? toX + 1.2 : fromX - 1.2, baseline), sheet.TextSize,
                after ? TextAnchor.Start : TextAnchor.End, TextRole.Normal));
        }

        return new Mark(MarkKind.Dimension, label.Name, label.Field, null, parts);
    }

    /// <summary>A dimension along a vertical line; its figure reads upward, left of the line.</summary>
    /// <param name="sheet">The sheet.</param>
    /// <param name="label">What it says.</param>
    /// <param name="fromY">Lower end [mm].</param>
    /// <param name="toY">Upper end [mm], less than the lower.</param>
    /// <param name="x">The dimension line [mm].</param>
    /// <param name="edgeX">Where the extension lines begin [mm].</param>
    /// <param name="isCut">True when the upper end lies beyond the sheet.</param>
    public static Mark Vertical(
        Sheet sheet, DimensionLabel label, double fromY, double toY, double x, double edgeX, bool isCut = false)
    {
        var past = edgeX > x ? -Past : Past;
        List<Shape> parts =
        [
            Sketch.Box(x - sheet.TextSize, toY, x + 0.6, fromY, FillRole.Reach, null),
            Sketch.Stroke(x, fromY, x, toY, LineRole.Dimension),
            .. EndMark(x, fromY, edgeX, past),
            .. isCut ? CutMark(x, toY) : EndMark(x, toY, edgeX, past),
        ];

        var baseline = x - 0.3 * sheet.TextSize;
        var figure = Fitting(label.Figures, sheet.TextSize, fromY - toY - 1);
        if (figure is not null)
        {
            parts.Add(new Text(
                figure, new(baseline, (fromY + toY) / 2), sheet.TextSize, TextAnchor.Middle, TextRole.Normal, Upward: true));
        }
        else if (label.Overflow != Overflow.Omit)
        {
            var after = label.Overflow == Overflow.After;
            parts.Add(new Text(
                label.Figures[^1], new(baseline, after ? toY - 1.2 : fromY + 1.2), sheet.TextSize,
                after ? TextAnchor.Start : TextAnchor.End, TextRole.Normal, Upward: true));
        }

        return new Mark(MarkKind.Dimension, label.Name, label.Field, null, parts);
    }

    private static IEnumerable<Shape> EndMark(double x, double y, double edgeX, double past) =>
        [Sketch.Stroke(edgeX, y, x + past, y, LineRole.Extension), TickAt(x, y)];

    /// <summary>An arrowhead and a break: the dimension runs on beyond the sheet.</summary>
    private static IEnumerable<Shape> CutMark(double x, double y) =>
    [
        new Polygon([new(x, y), new(x - 0.6, y + 1.9), new(x + 0.6, y + 1.9)], FillRole.Ink, null),
        new Polyline([new(x, y + 2.6), new(x - 0.9, y + 3), new(x + 0.9, y + 3.8), new(x, y + 4.2)], LineRole.Dimension),
    ];

    private static Line TickAt(double x, double y) => Sketch.Stroke(x - Tick, y + Tick, x + Tick, y - Tick, LineRole.Tick);

    private static string? Fitting(IReadOnlyList<string> figures, double size, double room) =>
        figures.FirstOrDefault(f => Sketch.Width(f, size, TextRole.Normal) <= room);
}
