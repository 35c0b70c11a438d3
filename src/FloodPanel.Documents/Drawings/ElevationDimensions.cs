namespace FloodPanel.Documents.Drawings;

/// <summary>Dimensions of the elevation: bays and posts, clear width, barrier, clear height.</summary>
internal static class ElevationDimensions
{
    public static void Draw(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var (first, second) = ElevationLayout.RowsBelow(input, sketch.Sheet);
        var chainFits = DrawChain(sketch, input, layout, layout.Bottom + first);
        DrawClearWidth(sketch, input, layout, layout.Bottom + second, chainFits);
        DrawHeights(sketch, input, layout);
    }

    /// <summary>Draws bays and posts; false when some bay is too narrow for its figure.</summary>
    private static bool DrawChain(Sketch sketch, DrawingInput input, ElevationLayout layout, double y)
    {
        var (sheet, view) = (sketch.Sheet, layout.Projection);
        var bays = ElevationBarrier.Bays(input);
        var narrowest = bays.Min(b => b.Width) * view.PerMetre;
        var fits = bays.All(b => Sketch.Width(input.Length(b.Width), sheet.TextSize, TextRole.Normal) <= narrowest - 1);
        var edge = layout.Bottom + 1.9;
        var lastFigureEnd = double.NegativeInfinity;
        for (var i = 0; i < bays.Count; i++)
        {
            var (left, right) = (view.X(bays[i].Left), view.X(bays[i].Left + bays[i].Width));
            var name = FormattableString.Invariant($"Bay {i + 1}, {input.LengthWithUnit(bays[i].Width)}");
            string[] figures = fits || bays.Count == 1 ? [input.Length(bays[i].Width)] : [];
            var overflow = bays.Count == 1 ? Overflow.After : Overflow.Omit;
            sketch.Add(DimensionMarks.Horizontal(
                sheet, new DimensionLabel(FieldKeys.Bay(i), name, figures, overflow), left, right, y, edge));
            if (i > 0)
            {
                lastFigureEnd = DrawPostWidth(sketch, input, view.X(bays[i - 1].Left + bays[i - 1].Width), left, y, lastFigureEnd, i);
            }
        }

        return fits;
    }

    /// <summary>Posts are narrower than their figure: it stands below the line, where it does not meet the last one.</summary>
    private static double DrawPostWidth(
        Sketch sketch, DrawingInput input, double left, double right, double y, double lastFigureEnd, int post)
    {
        var sheet = sketch.Sheet;
        var width = input.Barrier.Posts?.Width ?? 0;
        var figure = input.Length(width);
        var half = Sketch.Width(figure, sheet.SmallText, TextRole.Normal) / 2;
        var middle = (left + right) / 2;
        List<Shape> parts =
        [
            Sketch.Box(left, y, right, y + sheet.TextSize, FillRole.Reach, null),
            Sketch.Stroke(left, y, right, y, LineRole.Dimension),
        ];
        if (middle - half > lastFigureEnd + 1)
        {
            lastFigureEnd = middle + half;
            parts.Add(new Text(
                figure, new(middle, y + 0.5 + 0.8 * sheet.SmallText), sheet.SmallText, TextAnchor.Middle, TextRole.Normal));
        }

        var name = FormattableString.Invariant($"Post {post}, width {input.LengthWithUnit(width)}");
        sketch.Add(new Mark(MarkKind.Dimension, name, FieldKeys.PostWidth, null, parts));
        return lastFigureEnd;
    }

    private static void DrawClearWidth(Sketch sketch, DrawingInput input, ElevationLayout layout, double y, bool chainFits)
    {
        var view = layout.Projection;
        var width = input.Length(input.Opening.ClearWidth);
        var bays = input.Barrier.Bays;
        var areEqual = bays.All(b => input.Length(b) == input.Length(bays[0]));
        string[] figures = chainFits || bays.Count == 1
            ? [width]
            : areEqual
                ? [FormattableString.Invariant($"{width}, {bays.Count} bays of {input.Length(bays[0])}"), width]
                : [FormattableString.Invariant($"{width}, {bays.Count} bays"), width];
        var name = $"Clear width {input.LengthWithUnit(input.Opening.ClearWidth)}";
        sketch.Add(DimensionMarks.Horizontal(
            sketch.Sheet, new DimensionLabel(FieldKeys.ClearWidth, name, figures, Overflow.After),
            view.X(0), view.X(input.Opening.ClearWidth), y, layout.Bottom + 1.9));
    }

    private static void DrawHeights(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var (sheet, view) = (sketch.Sheet, layout.Projection);
        var edge = layout.Left - 0.6;
        var inner = layout.Left - 0.4 * sheet.TextSize;
        var height = input.Result.BarrierHeight;
        sketch.Add(DimensionMarks.Vertical(
            sheet,
            new DimensionLabel(
                FieldKeys.LogCount, $"Barrier height {input.LengthWithUnit(height)}", StackFigures(input), Overflow.After),
            view.SillY, layout.Shown(height), inner, edge));

        var clear = input.Opening.ClearHeight;
        var label = new DimensionLabel(
            FieldKeys.ClearHeight, $"Clear height {input.LengthWithUnit(clear)}", [input.Length(clear)], Overflow.After);
        var outer = inner - sheet.Row;
        var upperEnd = layout.IsBroken ? layout.Top : view.Y(clear);
        sketch.Add(DimensionMarks.Vertical(sheet, label, view.SillY, upperEnd, outer, edge, layout.IsBroken));
    }

    /// <summary>The wordings for the height of the stack, the fullest first.</summary>
    internal static string[] StackFigures(DrawingInput input)
    {
        var height = input.Length(input.Result.BarrierHeight);
        var logHeight = input.Library.Find(input.Barrier.Logs.Profile)?.Height;
        var count = FormattableString.Invariant($"{input.LogCount}");
        return logHeight is { } one
            ? input.Opening.RakeDegrees == 0
                ? [$"{count} × {input.Size(one)} = {height}", $"{count} × {input.Size(one)}", height]
                : [$"{count} × {input.Size(one)}, {height} high", height]
            : [height];
    }
}
