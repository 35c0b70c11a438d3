using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A post with its raker from the side: water, post, raker, the dimensions that set it, and what it takes in the design flood.</summary>
public static class RakerDrawing
{
    /// <summary>Thickness drawn where the profile is not in the library [m].</summary>
    private const double UnknownDepth = 0.05;

    private static readonly Sheet Paper = Sheet.Bench;

    /// <summary>The raker of a barrier; nothing where there is none.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input) =>
        input.Barrier is { Posts.Raker: { } raker, Bays.Count: > 1 } ? [Draw(input, raker)] : [];

    private static Scene Draw(DrawingInput input, RakerInput raker)
    {
        var u = Paper.TextSize;
        var section = new LogSection(input);
        var right = Math.Max(raker.FootDistance + section.Depth, section.Right);
        var height = Math.Max(input.Result.BarrierHeight, input.Result.RetainedDepth);
        var (roomWide, roomHigh) = (Paper.Width - 24 * u, Paper.Height - Paper.TitleHeight - 11 * u);
        var scale = DrawingScale.Fit(right - section.Left, height, roomWide, roomHigh);
        var perMetre = DrawingScale.PerMetre(scale);
        var origin = (Paper.Width - (right - section.Left) * perMetre) / 2 - section.Left * perMetre;
        var view = new Projection(origin, 4 * u + height * perMetre, perMetre);
        var sketch = new Sketch(Paper);
        Water(sketch, input, view, section);
        var axis = new Axis(section.Depth / 2 * Math.Cos(input.Rake), -section.Depth / 2 * Math.Sin(input.Rake));
        var (head, foot) = (view.At(axis.X + raker.HeadHeight * Math.Tan(input.Rake), raker.HeadHeight), view.At(axis.X + raker.FootDistance, 0));
        Strut(sketch, input, view, raker, head, foot);
        sketch.Add(section.Logs(view));
        if (section.Post(view) is { } post)
        {
            sketch.Add(new Mark(MarkKind.Post, "Post", null, null, [post with { Fill = FillRole.Post, Outline = LineRole.Outline }]));
        }

        Ground(sketch, view, section, right);
        Dimensions(sketch, input, view, raker, axis, right);
        var words = Force(input);
        sketch.Add(new Text(words, new(Paper.Width / 2, view.SillY + 6 * u), Paper.SmallText, TextAnchor.Middle, TextRole.Muted));
        var description = $"Post with a raker at {input.LengthWithUnit(raker.HeadHeight)}, its foot {input.LengthWithUnit(raker.FootDistance)} away; {words}.";
        return new DrawnView("Post and raker", description, scale, view.SillY + 7.4 * u + Paper.TitleHeight, sketch.Shapes).On(Paper, input, []);
    }

    /// <summary>Where the axis of the post meets the sill [m].</summary>
    private readonly record struct Axis(double X, double Z);

    private static void Water(Sketch sketch, DrawingInput input, Projection view, LogSection section)
    {
        var depth = input.Result.RetainedDepth;
        if (depth <= 0)
        {
            return;
        }

        var left = view.X(section.Left) - 8 * Paper.TextSize;
        sketch.Add(new Polygon(
            [new(left, view.Y(depth)), view.At(depth * Math.Tan(input.Rake), depth), view.At(0, 0), new(left, view.SillY)], FillRole.Water, null));
        sketch.Add(Sketch.Stroke(left, view.Y(depth), view.X(depth * Math.Tan(input.Rake)), view.Y(depth), LineRole.Water));
        var mark = left + 2 * Paper.TextSize;
        sketch.Add(new Polygon([new(mark, view.Y(depth)), new(mark - 1, view.Y(depth) - 1.8), new(mark + 1, view.Y(depth) - 1.8)], FillRole.WaterMark, null));
    }

    /// <summary>The raker as a bar of its own depth, with a hinge at each end.</summary>
    private static void Strut(Sketch sketch, DrawingInput input, Projection view, RakerInput raker, SheetPoint head, SheetPoint foot)
    {
        var half = Math.Max(0.5, (input.Library.Find(raker.Profile)?.Depth ?? UnknownDepth) / 2 * view.PerMetre);
        var (x, y) = (foot.X - head.X, foot.Y - head.Y);
        var length = Math.Sqrt(x * x + y * y);
        var (across, up) = (-y / length * half, x / length * half);
        sketch.Add(new Mark(MarkKind.Post, "Raker", null, "raker",
        [
            new Polygon(
                [new(head.X + across, head.Y + up), new(foot.X + across, foot.Y + up), new(foot.X - across, foot.Y - up), new(head.X - across, head.Y - up)],
                FillRole.Post, LineRole.Outline),
            new Line(head, foot, LineRole.Extension),
        ]));
    }

    private static void Ground(Sketch sketch, Projection view, LogSection section, double right)
    {
        var (from, to) = (view.X(section.Left) - 8 * Paper.TextSize, view.X(right) + 4 * Paper.TextSize);
        sketch.Add(Sketch.Stroke(from, view.SillY, to, view.SillY, LineRole.Ground));
        sketch.Add(Hatching.Earth(from, to, view.SillY));
    }

    private static void Dimensions(Sketch sketch, DrawingInput input, Projection view, RakerInput raker, Axis axis, double right)
    {
        var u = Paper.TextSize;
        sketch.Add(DimensionMarks.Horizontal(
            Paper, Label(input, RakerFields.FootDistance, raker.FootDistance),
            view.X(axis.X), view.X(axis.X + raker.FootDistance), view.SillY + 3.6 * u, view.SillY + 1.8));
        sketch.Add(DimensionMarks.Vertical(
            Paper, Label(input, RakerFields.HeadHeight, raker.HeadHeight),
            view.SillY, view.Y(raker.HeadHeight), view.X(right) + 2.6 * u, view.X(axis.X + raker.HeadHeight * Math.Tan(input.Rake)) + 1));
    }

    /// <summary>The greatest force in a raker in the design flood.</summary>
    private static string Force(DrawingInput input)
    {
        var forces = input.Result.Cases[0].Posts.SelectMany(p => p.Others).Where(c => c.Name == "raker-compression").Select(c => c.Demand).ToArray();
        return forces.Length == 0
            ? "the force in the raker is not checked"
            : $"design flood: {input.Format(forces.Max(), Dimension.Force)} along the raker";
    }

    private static DimensionLabel Label(DrawingInput input, Field field, double value) => new(
        $"posts.raker.{field.Key}", $"{field.Label} {input.LengthWithUnit(value)}", [input.LengthWithUnit(value), input.Length(value)]);
}
