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

    /// <summary>Draws bays and posts; false when a bay stands without its figure.</summary>
    private static bool DrawChain(Sketch sketch, DrawingInput input, ElevationLayout layout, double y)
    {
        var view = layout.Projection;
        var bays = ElevationBays.Of(input);
        if (bays.Count == 1)
        {
            // The only bay is as wide as the opening.
            return true;
        }

        var chain = new Chain(sketch.Sheet, y, layout.Bottom + 1.9);
        foreach (var i in ElevationBarrier.Shown(bays.Count, view.Cut))
        {
            if (i > 0 && (view.Cut is null || i != view.Cut.Last + 1))
            {
                AddPost(sketch, input, chain, view, bays, i);
            }

            var name = FormattableString.Invariant($"Bay {i + 1}, {input.LengthWithUnit(bays[i].Width)}");
            sketch.Add(chain.Link(
                FieldKeys.Bay(i), name, input.Length(bays[i].Width), view.X(bays[i].Left), view.X(bays[i].Left + bays[i].Width)));
        }

        if (view.Cut is { } cut)
        {
            AddPost(sketch, input, chain, view, bays, cut.First);
            AddPost(sketch, input, chain, view, bays, cut.Last + 1);
            var words = FormattableString.Invariant($"{cut.Count} bays");
            sketch.Add(new Text(
                words, new((view.X(cut.FromX) + view.X(cut.ToX)) / 2, y - 0.3 * sketch.Sheet.TextSize), sketch.Sheet.SmallText,
                TextAnchor.Middle, TextRole.Muted));
        }

        return chain.IsComplete;
    }

    private static void AddPost(
        Sketch sketch, DrawingInput input, Chain chain, Projection view, IReadOnlyList<(double Left, double Width)> bays, int post)
    {
        var width = input.Barrier.Posts?.Width ?? 0;
        var left = bays[post - 1].Left + bays[post - 1].Width;
        var name = FormattableString.Invariant($"Post {post}, width {input.LengthWithUnit(width)}");
        sketch.Add(chain.SmallLink(FieldKeys.PostWidth, name, input.Length(width), view.X(left), view.X(left + width)));
    }

    private static void DrawClearWidth(Sketch sketch, DrawingInput input, ElevationLayout layout, double y, bool chainFits)
    {
        var view = layout.Projection;
        var width = input.Length(input.Opening.ClearWidth);
        var bays = input.Barrier.Bays;
        var areEqual = bays.All(b => input.Length(b) == input.Length(bays[0]));
        string[] figures = chainFits && view.Cut is null
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
        var parts = new List<string>();
        foreach (var group in input.Barrier.Logs.Groups)
        {
            if (input.Library.Find(group.Profile)?.Height is not { } one)
            {
                return [height];
            }

            parts.Add(FormattableString.Invariant($"{group.Count} × {input.Size(one)}"));
        }

        var stack = string.Join(" + ", parts);
        return input.Opening.RakeDegrees == 0
            ? [$"{stack} = {height}", stack, height]
            : [$"{stack}, {height} high", height];
    }
}
