namespace FloodPanel.Documents.Drawings;

/// <summary>Slab, ground and water of a section.</summary>
internal static class SectionGround
{
    public static void Draw(Sketch sketch, SectionLayout layout)
    {
        var (sill, ground) = (layout.Projection.SillY, layout.Projection.Y(layout.Ground));
        var foot = Math.Max(sill, ground) + 2.0 * layout.Sheet.TextSize;
        var slab = Sketch.Box(layout.Nose, sill, layout.Right, foot, FillRole.Wall, null);
        sketch.Add(slab);
        sketch.Add(Hatching.Concrete(slab.Points));
        sketch.Add(new Polyline([new(layout.Nose, foot), new(layout.Nose, Math.Min(sill, ground)), new(layout.Nose, sill), new(layout.Right, sill)], LineRole.Outline));
        sketch.Add(Sketch.Stroke(layout.Nose, foot, layout.Right, foot, LineRole.Extension));
        sketch.Add(Sketch.Stroke(layout.Left, ground, layout.Nose, ground, LineRole.Ground));
        sketch.Add(Hatching.Earth(layout.Left, layout.Nose, ground));
    }

    public static void DrawWater(
        Sketch sketch, DrawingInput input, SectionLayout layout, SectionWater water, LogSection stack)
    {
        if (water.FloodSide is { } height && height > Math.Min(0, layout.Ground))
        {
            DrawFloodSide(sketch, layout, stack, layout.Shown(height));
        }

        if (water.ProtectedSide > 0)
        {
            DrawProtectedSide(sketch, input, layout, stack, water.ProtectedSide);
        }
    }

    private static void DrawFloodSide(
        Sketch sketch, SectionLayout layout, LogSection stack, double surface)
    {
        var view = layout.Projection;
        var (sill, ground) = (view.SillY, view.Y(layout.Ground));
        var left = surface < ground ? layout.Left : layout.Nose;
        List<SheetPoint> corners = left == layout.Left ? [new(left, ground), new(left, surface)] : [new(left, surface)];
        double shore;
        if (surface >= sill)
        {
            shore = layout.Nose;
            corners.AddRange([new(shore, surface), new(shore, Math.Max(ground, surface))]);
        }
        else
        {
            var face = stack.At(view, 0, 0);
            var top = stack.At(view, stack.SlopeLength, 0);
            var isOver = surface < top.Y;
            var dry = stack.At(view, stack.SlopeLength, stack.Depth);
            shore = isOver ? dry.X : face.X + (top.X - face.X) * (sill - surface) / Math.Max(sill - top.Y, 1e-9);
            corners.Add(new(shore, surface));
            corners.AddRange(isOver ? [dry, top, face] : [face]);
            corners.AddRange([new(layout.Nose, sill), new(layout.Nose, Math.Min(Math.Max(ground, surface), sill)), new(layout.Nose, ground)]);
        }

        sketch.Add(new Polygon(corners, FillRole.Water, null));
        sketch.Add(Sketch.Stroke(left, surface, shore, surface, LineRole.Water));
        Ripples(sketch, left + 3.2, surface);
    }

    private static void DrawProtectedSide(
        Sketch sketch, DrawingInput input, SectionLayout layout, LogSection stack, double depth)
    {
        var (view, sheet) = (layout.Projection, layout.Sheet);
        var surface = layout.Shown(depth);
        var foot = stack.At(view, 0, stack.Depth);
        var head = stack.At(view, stack.SlopeLength, stack.Depth);
        double FaceAt(double y) => foot.X + (head.X - foot.X) * (foot.Y - y) / Math.Max(foot.Y - head.Y, 1e-9);
        var shore = FaceAt(surface);
        sketch.Add(new Polygon(
            [new(shore, surface), new(layout.Right, surface), new(layout.Right, view.SillY), new(FaceAt(view.SillY), view.SillY)],
            FillRole.Water, null));
        var middle = (layout.BarrierRight + layout.Right) / 2;
        var figure = input.Length(input.Opening.SillLevel + depth);
        sketch.Add(Sketch.Stroke(shore, surface, layout.Right, surface, LineRole.Water));
        sketch.Add(new Mark(
            MarkKind.Level, $"protected-side water {figure}", FieldKeys.ProtectedSideLevel, null,
            [
                Sketch.Box(layout.BarrierRight, surface - 2.4 * sheet.TextSize, layout.Right, surface, FillRole.Reach, null),
                new Polygon(
                    [new(middle, surface), new(middle - 0.95, surface - 1.5), new(middle + 0.95, surface - 1.5)],
                    FillRole.WaterMark, LineRole.Dimension),
                new Text(figure, new(middle, surface - 2.1), sheet.TextSize, TextAnchor.Middle, TextRole.Normal),
            ]));
    }

    private static void Ripples(Sketch sketch, double x, double surface)
    {
        sketch.Add(Sketch.Stroke(x - 1.6, surface + 0.8, x + 1.6, surface + 0.8, LineRole.Water));
        sketch.Add(Sketch.Stroke(x - 0.8, surface + 1.6, x + 0.8, surface + 1.6, LineRole.Water));
    }
}
