namespace FloodPanel.Documents.Drawings;

/// <summary>A level to be marked.</summary>
/// <param name="Y">Where it stands on the sheet [mm].</param>
/// <param name="Figure">The level, "12.350".</param>
/// <param name="Name">Its name, "design flood".</param>
/// <param name="Field">The field that sets it, or null.</param>
/// <param name="IsWater">True for a water surface: its triangle is solid.</param>
internal sealed record Level(double Y, string Figure, string Name, string? Field, bool IsWater = false);

/// <summary>Draws level marks in a column beside the view, moved apart where levels lie close together.</summary>
internal static class LevelMarks
{
    private const double Triangle = 1.9;

    /// <summary>A level at a height; the name says so when it lies beyond what is drawn.</summary>
    public static Level Level(
        DrawingInput input, (double Low, double High) reach, Func<double, double> y, double z, string name, string? field,
        bool isWater)
    {
        var isOff = z < reach.Low - 0.001 || z > reach.High + 0.001;
        return new(y(z), input.Length(input.Opening.SillLevel + z), isOff ? $"{name}, off scale" : name, field, isWater);
    }

    /// <summary>Width that the widest of the marks needs, triangle and leader included [mm].</summary>
    public static double ColumnWidth(Sheet sheet, IEnumerable<Level> levels) =>
        levels.Max(l => LabelWidth(sheet, l)) + Knee(sheet);

    /// <summary>The marks of a column.</summary>
    /// <param name="sheet">The sheet.</param>
    /// <param name="levels">The levels.</param>
    /// <param name="edgeX">Edge of the view, where the leaders begin [mm].</param>
    /// <param name="side">1 for a column to the right of the view, −1 for one to its left.</param>
    /// <param name="top">Upper end of the column [mm].</param>
    /// <param name="bottom">Lower end of the column [mm].</param>
    public static IEnumerable<Mark> Column(
        Sheet sheet, IReadOnlyList<Level> levels, double edgeX, int side, double top, double bottom)
    {
        var sorted = levels.OrderBy(l => l.Y).ToArray();
        var spacing = 1.32 * sheet.TextSize;
        var places = Spread.Apart([.. sorted.Select(l => l.Y)], spacing, top + spacing, bottom);
        return sorted.Select((level, i) => One(sheet, level, edgeX, side, places[i]));
    }

    private static Mark One(Sheet sheet, Level level, double edgeX, int side, double y)
    {
        var start = edgeX + side * Knee(sheet);
        var end = start + side * LabelWidth(sheet, level);
        var tip = start + side * Triangle / 2;
        var baseline = y - 0.22 * sheet.TextSize;
        var textX = side > 0 ? start + Triangle + 0.7 : end;
        var figureWidth = Sketch.Width(level.Figure, sheet.TextSize, TextRole.Normal);
        List<Shape> parts =
        [
            Sketch.Box(Math.Min(start, end), y - sheet.TextSize, Math.Max(start, end), y + 0.3, FillRole.Reach, null),
            new Polyline(
                [new(edgeX, level.Y), new(edgeX + side * 1.2, level.Y), new(start - side * 0.4, y), new(end, y)],
                LineRole.Extension),
            new Polygon(
                [new(tip, y), new(tip - Triangle / 2, y - 1.5), new(tip + Triangle / 2, y - 1.5)],
                level.IsWater ? FillRole.WaterMark : FillRole.Paper, LineRole.Dimension),
            new Text(level.Figure, new(textX, baseline), sheet.TextSize, TextAnchor.Start, TextRole.Normal),
            new Text(
                level.Name, new(textX + figureWidth + 0.8, baseline), sheet.SmallText, TextAnchor.Start, TextRole.Muted),
        ];
        return new Mark(MarkKind.Level, $"{level.Name} {level.Figure}", level.Field, null, parts);
    }

    private static double Knee(Sheet sheet) => 1.3 * sheet.TextSize;

    private static double LabelWidth(Sheet sheet, Level level) =>
        Triangle + 1.6 + Sketch.Width(level.Figure, sheet.TextSize, TextRole.Normal)
        + Sketch.Width(level.Name, sheet.SmallText, TextRole.Muted);
}
