using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A base plate in plan, the flood side below: plate, cut through the post, weld, rods, and its dimensions.</summary>
public static class BasePlatePlan
{
    /// <summary>Diameter of a rod where no anchor is entered [m].</summary>
    private const double UnknownRod = 0.016;

    private static readonly Sheet Paper = Sheet.Bench;

    /// <summary>The base plate of a barrier; nothing where there is none.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input) =>
        input.Barrier is { Posts: { } posts, BasePlate: { } plate, Bays.Count: > 1 } && input.Library.Find(posts.Profile) is { } post
            ? [Draw(input, plate, post)]
            : [];

    private static Scene Draw(DrawingInput input, BasePlateInput plate, Profile post)
    {
        var u = Paper.TextSize;
        var scale = DrawingScale.Fit(plate.Width, plate.Length, Paper.Width - 26 * u, Paper.Height - Paper.TitleHeight - 12 * u);
        var perMetre = DrawingScale.PerMetre(scale);
        var view = new Projection(Paper.Width / 2, 4.6 * u + plate.Length / 2 * perMetre, perMetre);
        var sketch = new Sketch(Paper);
        var (halfWide, halfLong) = (plate.Width / 2, plate.Length / 2);
        sketch.Add(Sketch.Box(view.X(-halfWide), view.Y(halfLong), view.X(halfWide), view.Y(-halfLong), FillRole.Wall, LineRole.Outline));
        sketch.Add(Sketch.Stroke(view.X(0), view.Y(halfLong) - 1.2, view.X(0), view.Y(-halfLong) + 1.2, LineRole.Extension));
        sketch.Add(Sketch.Stroke(view.X(-halfWide) - 1.2, view.Y(0), view.X(halfWide) + 1.2, view.Y(0), LineRole.Extension));
        Weld(sketch, view, plate, post);
        sketch.Add(new Mark(MarkKind.Post, "Post", null, null, [.. PostCut.Of(view, post)]));
        Rods(sketch, view, input, plate);
        Dimensions(sketch, input, view, plate);
        Words(sketch, input, view, plate);
        var height = view.Y(-halfLong) + 7.6 * u + Paper.TitleHeight;
        var description = $"Base plate {input.Size(plate.Length)} by {input.Size(plate.Width)}, {input.Size(plate.Thickness)} thick, {2 * plate.RodsPerRow} rods.";
        return new DrawnView("Base plate in plan", description, scale, height, sketch.Shapes).On(Paper, input, []);
    }

    /// <summary>The leg of the fillet round the outline of the post.</summary>
    private static void Weld(Sketch sketch, Projection view, BasePlateInput plate, Profile post)
    {
        if (plate.WeldLeg is { } leg)
        {
            var (x, y) = (post.Height / 2 + leg, post.Depth / 2 + leg);
            sketch.Add(Sketch.Box(view.X(-x), view.Y(y), view.X(x), view.Y(-y), FillRole.Log, LineRole.Edge));
        }
    }

    private static void Rods(Sketch sketch, Projection view, DrawingInput input, BasePlateInput plate)
    {
        var (diameter, spacing) = input.Barrier.Anchors is { } anchors
            ? (anchors.Diameter > 0 ? anchors.Diameter : UnknownRod, anchors.Spacing)
            : (UnknownRod, 0.6 * plate.Width / Math.Max(1, plate.RodsPerRow - 1));
        var radius = Math.Max(0.7, diameter / 2 * view.PerMetre);
        foreach (var row in new[] { -plate.RodDistance, plate.RodDistance })
        {
            for (var i = 0; i < plate.RodsPerRow; i++)
            {
                var at = view.At((i - (plate.RodsPerRow - 1) / 2.0) * spacing, row);
                sketch.Add(new Polygon(
                    [.. Enumerable.Range(0, 16).Select(k => new SheetPoint(at.X + radius * Math.Cos(k * Math.PI / 8), at.Y + radius * Math.Sin(k * Math.PI / 8)))],
                    FillRole.Paper, LineRole.Outline));
                sketch.Add(Sketch.Stroke(at.X - radius - 0.8, at.Y, at.X + radius + 0.8, at.Y, LineRole.Extension));
                sketch.Add(Sketch.Stroke(at.X, at.Y - radius - 0.8, at.X, at.Y + radius + 0.8, LineRole.Extension));
            }
        }
    }

    private static void Dimensions(Sketch sketch, DrawingInput input, Projection view, BasePlateInput plate)
    {
        var u = Paper.TextSize;
        var (halfWide, halfLong) = (plate.Width / 2, plate.Length / 2);
        sketch.Add(DimensionMarks.Horizontal(
            Paper, Label(input, BasePlateFields.Width, plate.Width), view.X(-halfWide), view.X(halfWide), view.Y(-halfLong) + 2.4 * u, view.Y(-halfLong) + 0.5));
        sketch.Add(DimensionMarks.Vertical(
            Paper, Label(input, BasePlateFields.Length, plate.Length), view.Y(-halfLong), view.Y(halfLong), view.X(halfWide) + 3 * u, view.X(halfWide) + 0.5));
        sketch.Add(DimensionMarks.Vertical(
            Paper, Label(input, BasePlateFields.RodDistance, plate.RodDistance), view.Y(0), view.Y(plate.RodDistance), view.X(-halfWide) - 1.6 * u, view.X(-halfWide) - 0.5));
    }

    private static void Words(Sketch sketch, DrawingInput input, Projection view, BasePlateInput plate)
    {
        var u = Paper.TextSize;
        var below = view.Y(-plate.Length / 2);
        Muted("protected side", view.Y(plate.Length / 2) - 0.9 * u);
        Muted("flood side: the water pushes upward on this plan", below + 4.6 * u);
        var weld = plate.WeldLeg is { } leg ? $", fillet weld {input.Size(leg)} all round" : "";
        var grout = plate.GroutThickness > 0 ? $" on {input.Size(plate.GroutThickness)} of grout" : "";
        Muted($"plate {input.Size(plate.Thickness)} thick{grout}{weld}", below + 6.1 * u);

        void Muted(string words, double y) =>
            sketch.Add(new Text(words, new(view.X(0), y), Paper.SmallText, TextAnchor.Middle, TextRole.Muted));
    }

    private static DimensionLabel Label(DrawingInput input, Field field, double value) => new(
        $"basePlate.{field.Key}", $"{field.Label} {input.Size(value)}", [input.Size(value), input.Size(value).Split(' ')[0]]);
}
