using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// The anchors of a post in plan, the flood side below: plate, anchors, edges of the concrete, the body that the row on the flood
/// side tears out and the body that breaks off towards the protected edge.
/// </summary>
public static class AnchorDrawing
{
    private static readonly Sheet Paper = Sheet.Bench;

    /// <summary>The anchors of a barrier; nothing where they or their plate are not entered.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input) =>
        input.Barrier is { Anchors: { } anchors, BasePlate: { } plate, Bays.Count: > 1 } ? [Draw(input, anchors, plate)] : [];

    private static Scene Draw(DrawingInput input, AnchorInput anchors, BasePlateInput plate)
    {
        var u = Paper.TextSize;
        var layout = AnchorLayout.Of(anchors, plate);
        var plan = AnchorPlan.Of(anchors, plate, layout);
        var (roomWide, roomHigh) = (Paper.Width - 26 * u, Paper.Height - Paper.TitleHeight - 11 * u);
        var scale = DrawingScale.Fit(plan.Right - plan.Left, plan.Top - plan.Bottom, roomWide, roomHigh);
        var perMetre = DrawingScale.PerMetre(scale);
        var origin = (Paper.Width - (plan.Right - plan.Left) * perMetre) / 2 - plan.Left * perMetre;
        var view = new Projection(origin, 4.6 * u + plan.Top * perMetre, perMetre);
        var sketch = new Sketch(Paper);
        Concrete(sketch, view, plan, layout);
        Bodies(sketch, view, plan);
        PlateAndRods(sketch, view, anchors, plate, layout);
        Words(sketch, view, plan);
        Dimensions(sketch, input, view, anchors, layout, plan);
        var height = view.Y(plan.Bottom) + 6.2 * u + Paper.TitleHeight;
        var description = $"{2 * plate.RodsPerRow} anchors in two rows {input.Size(layout.RowSpacing)} apart, {input.Size(anchors.Spacing)} within a row.";
        return new DrawnView("Anchors in plan", description, scale, height, sketch.Shapes).On(Paper, input, []);
    }

    /// <summary>The concrete; where an edge is far it runs off without an outline.</summary>
    private static void Concrete(Sketch sketch, Projection view, AnchorPlan plan, AnchorLayout layout)
    {
        var box = Sketch.Box(view.X(plan.Left), view.Y(plan.Top), view.X(plan.Right), view.Y(plan.Bottom), FillRole.Wall, null);
        sketch.Add(box);
        sketch.Add(Hatching.Concrete(box.Points));
        var (left, right, top, bottom) = (view.X(plan.Left), view.X(plan.Right), view.Y(plan.Top), view.Y(plan.Bottom));
        (double? Edge, Line Line)[] edges =
        [
            (layout.Left, Sketch.Stroke(left, top, left, bottom, LineRole.Outline)),
            (layout.Right, Sketch.Stroke(right, top, right, bottom, LineRole.Outline)),
            (layout.Protected, Sketch.Stroke(left, top, right, top, LineRole.Outline)),
            (layout.Flood, Sketch.Stroke(left, bottom, right, bottom, LineRole.Outline)),
        ];
        sketch.Add(edges.Where(e => e.Edge is not null).Select(e => e.Line));
    }

    private static void Bodies(Sketch sketch, Projection view, AnchorPlan plan)
    {
        if (plan.Tension is { } tension)
        {
            sketch.Add(Sketch.Box(view.X(tension.Left), view.Y(tension.Top), view.X(tension.Right), view.Y(tension.Bottom), FillRole.Hydrostatic, LineRole.Hidden));
        }

        if (plan.Shear is { } shear)
        {
            sketch.Add(new Polygon(
                [
                    view.At(shear.InnerLeft, shear.From), view.At(shear.OuterLeft, shear.To),
                    view.At(shear.OuterRight, shear.To), view.At(shear.InnerRight, shear.From),
                ],
                FillRole.Flow, LineRole.Hidden));
        }
    }

    private static void PlateAndRods(Sketch sketch, Projection view, AnchorInput anchors, BasePlateInput plate, AnchorLayout layout)
    {
        sketch.Add(Sketch.Box(
            view.X(-plate.Width / 2), view.Y(plate.Length / 2), view.X(plate.Width / 2), view.Y(-plate.Length / 2), null, LineRole.Outline));
        var radius = Math.Max(0.7, anchors.Diameter / 2 * view.PerMetre);
        foreach (var row in new[] { -plate.RodDistance, plate.RodDistance })
        {
            for (var i = 0; i < layout.PerRow; i++)
            {
                var at = view.At(-layout.RowLength / 2 + i * layout.Spacing, row);
                sketch.Add(new Polygon(
                    [.. Enumerable.Range(0, 16).Select(k => new SheetPoint(at.X + radius * Math.Cos(k * Math.PI / 8), at.Y + radius * Math.Sin(k * Math.PI / 8)))],
                    FillRole.Post, LineRole.Edge));
                sketch.Add(Sketch.Stroke(at.X - radius - 0.8, at.Y, at.X + radius + 0.8, at.Y, LineRole.Extension));
                sketch.Add(Sketch.Stroke(at.X, at.Y - radius - 0.8, at.X, at.Y + radius + 0.8, LineRole.Extension));
            }
        }
    }

    private static void Words(Sketch sketch, Projection view, AnchorPlan plan)
    {
        var u = Paper.TextSize;
        var middle = (view.X(plan.Left) + view.X(plan.Right)) / 2;
        sketch.Add(new Text("protected side", new(middle, view.Y(plan.Top) - 0.5 * u), Paper.SmallText, TextAnchor.Middle, TextRole.Muted));
        var below = view.Y(plan.Bottom) + 4.9 * u;
        sketch.Add(new Text("flood side: the water pushes upward on this plan", new(middle, below), Paper.SmallText, TextAnchor.Middle, TextRole.Muted));
        if (plan.Tension is { } tension)
        {
            Leader(sketch, new(view.X(tension.Left), view.Y(tension.Bottom)), new(view.X(plan.Left) - 1.2 * u, view.Y(tension.Bottom) + 0.3 * u), "torn out");
        }

        if (plan.Shear is { } shear)
        {
            Leader(sketch, new(view.X(shear.OuterLeft), view.Y(shear.To)), new(view.X(plan.Left) - 1.2 * u, view.Y(shear.To) + 0.9 * u), "broken off");
        }
    }

    private static void Leader(Sketch sketch, SheetPoint from, SheetPoint to, string words)
    {
        sketch.Add(new Polyline([from, new(to.X + 0.4, to.Y - 0.3 * Paper.TextSize)], LineRole.Extension));
        sketch.Add(new Text(words, to, Paper.SmallText, TextAnchor.End, TextRole.Muted));
    }

    private static void Dimensions(
        Sketch sketch, DrawingInput input, Projection view, AnchorInput anchors, AnchorLayout layout, AnchorPlan plan)
    {
        var u = Paper.TextSize;
        var (row, edge) = (view.Y(plan.Bottom) + 2.2 * u, view.Y(plan.Bottom) + 0.5);
        var (first, last) = (-layout.RowLength / 2, layout.RowLength / 2);
        if (layout.PerRow > 1)
        {
            Along(AnchorFields.Spacing, anchors.Spacing, first, first + layout.Spacing);
        }

        if (layout.Left is { } left)
        {
            Along(AnchorFields.EdgeLeft, left, first - left, first);
        }

        if (layout.Right is { } right)
        {
            Along(AnchorFields.EdgeRight, right, last, last + right);
        }

        var half = layout.RowSpacing / 2;
        Across(null, "Between the rows", layout.RowSpacing, -half, half);
        if (layout.Flood is { } flood)
        {
            Across(AnchorFields.EdgeFlood.Key, AnchorFields.EdgeFlood.Label, flood, -half - flood, -half);
        }

        if (layout.Protected is { } ahead)
        {
            Across(AnchorFields.EdgeProtected.Key, AnchorFields.EdgeProtected.Label, ahead, half, half + ahead);
        }

        void Along(Field field, double value, double from, double to) => sketch.Add(DimensionMarks.Horizontal(
            Paper, new(field.Key, $"{field.Label} {input.Size(value)}", [input.Size(value), Bare(input, value)]), view.X(from), view.X(to), row, edge));

        void Across(string? key, string label, double value, double from, double to) => sketch.Add(DimensionMarks.Vertical(
            Paper, new(key, $"{label} {input.Size(value)}", [input.Size(value), Bare(input, value)]), view.Y(from), view.Y(to), view.X(plan.Right) + 3 * u, view.X(plan.Right) + 0.5));
    }

    private static string Bare(DrawingInput input, double value) => input.Size(value).Split(' ')[0];
}
