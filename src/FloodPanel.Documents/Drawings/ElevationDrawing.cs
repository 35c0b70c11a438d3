namespace FloodPanel.Documents.Drawings;

/// <summary>The opening and its barrier seen from the flood side.</summary>
public static class ElevationDrawing
{
    /// <summary>Draws the elevation.</summary>
    /// <param name="input">What to draw.</param>
    /// <param name="sheet">The sheet; <see cref="Sheet.Bench"/> when null.</param>
    public static Scene Draw(DrawingInput input, Sheet? sheet = null)
    {
        var paper = sheet ?? Sheet.Bench;
        return View(input, paper).On(paper, input, []);
    }

    internal static DrawnView View(DrawingInput input, Sheet paper)
    {
        var columnWidth = LevelMarks.ColumnWidth(paper, Levels(input, _ => 0));
        var layout = ElevationLayout.For(input, paper, columnWidth);
        var sketch = new Sketch(paper);
        DrawWall(sketch, input, layout);
        ElevationBarrier.Draw(sketch, input, layout);
        DrawWater(sketch, input, layout);
        DrawGround(sketch, input, layout);
        DrawBreak(sketch, layout);
        ElevationBarrier.DrawNumbers(sketch, input, layout);
        ElevationDimensions.Draw(sketch, input, layout);
        var columnTop = Math.Min(layout.Top, layout.Bottom - 5.5 * 1.32 * paper.TextSize);
        sketch.Add(LevelMarks.Column(
            paper, Levels(input, layout.Shown), layout.Right, 1, columnTop, layout.Bottom + 1.3 * paper.TextSize));
        return new DrawnView(Title, Describe(input), layout.Scale, layout.Height, sketch.Shapes);
    }

    private const string Title = "Elevation from the flood side";

    private static Level[] Levels(DrawingInput input, Func<double, double> y)
    {
        var reach = ElevationLayout.Reach(input);
        Level Mark(double z, string name, string? field, bool isWater = false) =>
            LevelMarks.Level(input, reach, y, z, name, field, isWater);
        return
        [
            Mark(input.RequiredHeight, "required top", FieldKeys.Freeboard),
            Mark(input.Result.BarrierHeight, "barrier top", FieldKeys.LogCount),
            Mark(input.FloodHeight, "design flood", FieldKeys.DesignStillWaterLevel, isWater: true),
            Mark(0, "sill", FieldKeys.SillLevel),
            Mark(input.GroundHeight, "outside ground", FieldKeys.GroundLevel),
        ];
    }

    private static string Describe(DrawingInput input)
    {
        var result = input.Result;
        return $"{input.Opening.Name} seen from the flood side: clear width {input.LengthWithUnit(input.Opening.ClearWidth)}, "
            + $"{input.Barrier.Bays.Count} {(input.Barrier.Bays.Count == 1 ? "bay" : "bays")} of {input.LogCount} logs, "
            + $"barrier {input.LengthWithUnit(result.BarrierHeight)} high, "
            + $"design flood level {input.LengthWithUnit(result.DesignFloodLevel)}.";
    }

    private static void DrawWall(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var view = layout.Projection;
        var (leftReveal, rightReveal) = (view.X(0), view.X(input.Opening.ClearWidth));
        var head = layout.IsBroken ? layout.Top : view.Y(input.Opening.ClearHeight);
        List<Polygon> pieces =
        [
            Sketch.Box(layout.Left, layout.Top, leftReveal, layout.Bottom, FillRole.Wall, null),
            Sketch.Box(rightReveal, layout.Top, layout.Right, layout.Bottom, FillRole.Wall, null),
        ];
        if (!layout.IsBroken)
        {
            pieces.Add(Sketch.Box(leftReveal, layout.Top, rightReveal, head, FillRole.Wall, null));
        }

        if (layout.Bottom > view.SillY)
        {
            pieces.Add(Sketch.Box(leftReveal, view.SillY, rightReveal, layout.Bottom, FillRole.Wall, null));
        }

        foreach (var piece in pieces)
        {
            sketch.Add(piece);
            sketch.Add(Hatching.WallInView(input.Opening.Wall, piece.Points));
        }

        sketch.Add(layout.IsBroken
            ? new Polyline([new(leftReveal, head), new(leftReveal, view.SillY), new(rightReveal, view.SillY), new(rightReveal, head)], LineRole.Outline)
            : Sketch.Box(leftReveal, head, rightReveal, view.SillY, null, LineRole.Outline));
        sketch.Add(BreakLine(layout.Left, layout.Top, layout.Bottom));
        sketch.Add(BreakLine(layout.Right, layout.Top, layout.Bottom));
    }

    /// <summary>A blank strip between two break lines, where bays are left out.</summary>
    private static void DrawBreak(Sketch sketch, ElevationLayout layout)
    {
        if (layout.Projection.Cut is not { } cut)
        {
            return;
        }

        var (left, right) = (layout.Projection.X(cut.FromX), layout.Projection.X(cut.ToX));
        sketch.Add(Sketch.Box(left + 0.4, layout.Top - 0.2, right - 0.4, layout.Bottom + 1.7, FillRole.Paper, null));
        sketch.Add(BreakLine(left + 0.4, layout.Top, layout.Bottom + 1.6));
        sketch.Add(BreakLine(right - 0.4, layout.Top, layout.Bottom + 1.6));
    }

    private static Polyline BreakLine(double x, double top, double bottom)
    {
        var (middle, half) = (top + 0.22 * (bottom - top), Math.Min(1.2, (bottom - top) / 8));
        return new Polyline(
            [new(x, top), new(x, middle - half), new(x - half, middle - half / 2), new(x + half, middle + half / 2), new(x, middle + half), new(x, bottom)],
            LineRole.Extension);
    }

    private static void DrawWater(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        if (input.FloodHeight <= layout.Ground)
        {
            return;
        }

        var (surface, ground) = (layout.Shown(input.FloodHeight), layout.Projection.Y(layout.Ground));
        sketch.Add(Sketch.Box(layout.Left, surface, layout.Right, ground, FillRole.Water, null));
        sketch.Add(Sketch.Stroke(layout.Left, surface, layout.Right, surface, LineRole.Water));
        var x = layout.Right - layout.Pier / 2;
        sketch.Add(Sketch.Stroke(x - 1.6, surface + 0.8, x + 1.6, surface + 0.8, LineRole.Water));
        sketch.Add(Sketch.Stroke(x - 0.8, surface + 1.6, x + 0.8, surface + 1.6, LineRole.Water));
    }

    private static void DrawGround(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var y = layout.Projection.Y(layout.Ground);
        if (y >= layout.Projection.SillY - 0.01)
        {
            sketch.Add(Sketch.Stroke(layout.Left, y, layout.Right, y, LineRole.Ground));
            sketch.Add(Hatching.Earth(layout.Left, layout.Right, y));
            return;
        }

        var (leftReveal, rightReveal) = (layout.Projection.X(0), layout.Projection.X(input.Opening.ClearWidth));
        sketch.Add(Sketch.Stroke(layout.Left, y, leftReveal, y, LineRole.Ground));
        sketch.Add(Sketch.Stroke(leftReveal, y, rightReveal, y, LineRole.Hidden));
        sketch.Add(Sketch.Stroke(rightReveal, y, layout.Right, y, LineRole.Ground));
        sketch.Add(Hatching.Earth(layout.Left, leftReveal, y));
        sketch.Add(Hatching.Earth(rightReveal, layout.Right, y));
    }
}
