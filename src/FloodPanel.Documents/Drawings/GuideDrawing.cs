using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>Plan section of the left guide: wall, guide, fastener, end of the log, and what is typed about them.</summary>
public static class GuideDrawing
{
    private const string Title = "Guide in plan";

    /// <summary>Depth of a log whose profile is not in the library [m].</summary>
    private const double UnknownDepth = 0.08;

    private static readonly Sheet Paper = Sheet.Bench;

    /// <summary>The guide of a barrier; nothing where none is entered.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input) => input.Barrier.Guides is { } guides ? [Draw(input, guides)] : [];

    private static Scene Draw(DrawingInput input, GuideSet guides)
    {
        var logs = input.Barrier.Logs;
        var plan = GuidePlan.Of(guides, logs.Groups.Max(group => input.Library.Find(group.Profile)?.Depth ?? UnknownDepth), logs.EndBearing);
        var view = new GuideView(Paper, plan, guides.Mounting);
        var sketch = new Sketch(Paper);
        Wall(sketch, view, input.Opening.Wall);
        Log(sketch, view);
        sketch.Add(Strip(view));
        var family = input.Library.Find(guides.Material)?.Family ?? MaterialFamily.Steel;
        var outline = view.All(plan.Guide);
        sketch.Add(new Polygon(outline, FillRole.Post, null));
        sketch.Add(Hatching.Cut(family, outline));
        sketch.Add(new Polygon(outline, null, LineRole.Outline));
        Fastener(sketch, view, guides);
        Load(sketch, view, guides);
        Words(sketch, view, input, guides);
        sketch.Add(GuideDimensions.Of(view, input, guides));
        var drawn = new DrawnView(Title, Description(input, guides), view.Scale, view.Height, sketch.Shapes);
        return drawn.On(Paper, input, []);
    }

    private static string Description(DrawingInput input, GuideSet guides)
    {
        var place = guides.Mounting switch
        {
            GuideMounting.WetFace => "on the wet face of the wall",
            GuideMounting.DryFace => "on the dry face of the wall",
            _ => "in the reveal",
        };
        return $"Guide fixed {place}: load {input.Size(guides.LoadOffset)}, bearing strip {input.Size(guides.BearingDistance)} and arris {input.Size(guides.Fasteners.EdgeDistance)} from the fasteners, which stand at most {input.Size(guides.Fasteners.Pitch)} apart.";
    }

    private static void Wall(Sketch sketch, GuideView view, WallKind wall)
    {
        var area = view.All(view.Plan.Wall);
        sketch.Add(new Polygon(area, FillRole.Wall, null));
        sketch.Add(Hatching.WallInView(wall, area));
        sketch.Add(new Polyline([.. area.Take(3)], LineRole.Outline));
    }

    /// <summary>The log runs on to the right; between it and the lip the seal.</summary>
    private static void Log(Sketch sketch, GuideView view)
    {
        var ((left, lower, upper), right) = (view.Plan.Log, view.Plan.LogRight);
        var (foot, head) = (view.At(new(left, lower)), view.At(new(right, upper)));
        sketch.Add(Sketch.Box(foot.X, head.Y, head.X, foot.Y, FillRole.Log, null));
        sketch.Add(new Polyline([head, new(foot.X, head.Y), foot, new(head.X, foot.Y)], LineRole.Outline));
        var middle = (head.Y + foot.Y) / 2;
        sketch.Add(new Polyline([head, new(head.X, middle - 1), new(head.X - 1, middle - 0.4), new(head.X + 1, middle + 0.4), new(head.X, middle + 1), new(head.X, foot.Y)], LineRole.Dimension));
        var lip = view.At(new(view.Plan.Lip.Right, view.Plan.LipFace));
        sketch.Add(Sketch.Box(foot.X, lip.Y, lip.X, head.Y, FillRole.Ink, null));
    }

    private static Polygon Strip(GuideView view)
    {
        const double half = 0.7;
        var (from, to) = (view.At(view.Plan.Strip.From), view.At(view.Plan.Strip.To));
        return Sketch.Box(
            Math.Min(from.X, to.X) - (from.X == to.X ? half : 0), Math.Min(from.Y, to.Y) - (from.Y == to.Y ? half : 0),
            Math.Max(from.X, to.X) + (from.X == to.X ? half : 0), Math.Max(from.Y, to.Y) + (from.Y == to.Y ? half : 0), FillRole.Ink, null);
    }

    /// <summary>Shank into the wall, washer and head on the guide, centre line.</summary>
    private static void Fastener(Sketch sketch, GuideView view, GuideSet guides)
    {
        var (into, hole, thick) = (view.Plan.Into, guides.Fasteners.HoleDiameter, guides.BaseThickness);
        var deep = 0.75 * GuidePlan.WallShown;
        sketch.Add(Along(view, into, -thick, deep, 0.42 * hole, FillRole.Paper));
        sketch.Add(Along(view, into, -thick - 0.15 * hole, -thick, hole, FillRole.Paper));
        sketch.Add(Along(view, into, -thick - 0.7 * hole, -thick - 0.15 * hole, 0.7 * hole, FillRole.Paper));
        var (head, tip) = (Spot(into, -thick - 1.4 * hole), Spot(into, deep + 0.5 * hole));
        sketch.Add(new Line(view.At(head), view.At(tip), LineRole.Hidden));
    }

    private static PlanSpot Spot(PlanSpot into, double along, double across = 0) =>
        new(into.X * along + into.Y * across, into.Y * along + into.X * across);

    private static Polygon Along(GuideView view, PlanSpot into, double from, double to, double half, FillRole fill) => new(
        view.All([Spot(into, from, -half), Spot(into, to, -half), Spot(into, to, half), Spot(into, from, half)]), fill, LineRole.Edge);

    /// <summary>n at the middle of the bearing, against the lip.</summary>
    private static void Load(Sketch sketch, GuideView view, GuideSet guides)
    {
        var tip = view.At(new(guides.LoadOffset, view.Plan.Log.Upper));
        var start = tip.Y + Math.Max(6, 0.7 * (view.At(new(0, view.Plan.Log.Lower)).Y - tip.Y));
        sketch.Add(new Mark(MarkKind.Resultant, "Line load of the logs", null, null,
        [
            Sketch.Stroke(tip.X, start, tip.X, tip.Y + 2.4, LineRole.Resultant),
            new Polygon([tip, new(tip.X - 1, tip.Y + 2.6), new(tip.X + 1, tip.Y + 2.6)], FillRole.Ink, null),
            new Text("n", new(tip.X + 1.2, start - 0.3), Paper.TextSize, TextAnchor.Start, TextRole.Strong),
        ]));
    }

    private static void Words(Sketch sketch, GuideView view, DrawingInput input, GuideSet guides)
    {
        var (fasteners, load) = (guides.Fasteners, guides.LoadOffset);
        var foot = view.Height - Paper.TitleHeight - 0.5 * Paper.TextSize;
        var along = $"Fasteners at most {input.Size(fasteners.Pitch)} apart, {input.Size(fasteners.EndDistance)} from each end";
        sketch.Add(new Mark(MarkKind.Dimension, along, "guides.fasteners.pitch", null,
        [
            new Text(along, new(Paper.Margin, foot), Paper.SmallText, TextAnchor.Start, TextRole.Muted),
        ]));
        var right = Paper.Width - Paper.Margin;
        sketch.Add(new Text("protected side", new(right, Paper.Margin + 0.75 * Paper.TextSize), Paper.SmallText, TextAnchor.End, TextRole.Muted));
        sketch.Add(new Text("flood side", new(right, foot), Paper.SmallText, TextAnchor.End, TextRole.Muted));
        var log = view.At(new(view.Plan.LogRight, (view.Plan.Log.Lower + view.Plan.Log.Upper) / 2));
        var nextToLoad = view.At(new(load, 0)).X + 2 * Paper.TextSize;
        if (log.X - 2.5 - Sketch.Width("log", Paper.SmallText, TextRole.Muted) > nextToLoad)
        {
            sketch.Add(new Text("log", new(log.X - 2.5, log.Y + 0.3 * Paper.TextSize), Paper.SmallText, TextAnchor.End, TextRole.Muted));
        }
    }
}
