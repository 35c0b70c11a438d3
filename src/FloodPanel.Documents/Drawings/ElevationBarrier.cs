using System.Globalization;

namespace FloodPanel.Documents.Drawings;

/// <summary>Logs, posts and guides in elevation.</summary>
internal static class ElevationBarrier
{
    private const double LeastLog = 1.2;

    public static void Draw(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var view = layout.Projection;
        var (top, sill) = (layout.Shown(input.Result.BarrierHeight), view.SillY);
        var bays = ElevationBays.Of(input);
        foreach (var bay in Shown(bays.Count, view.Cut))
        {
            DrawLogs(sketch, input, view, bays[bay], bay + 1, top);
        }

        foreach (var post in ShownPosts(bays.Count, view.Cut))
        {
            var (left, right) = (view.X(bays[post - 1].Left + bays[post - 1].Width), view.X(bays[post].Left));
            var number = post.ToString(CultureInfo.InvariantCulture);
            sketch.Add(new Mark(MarkKind.Post, $"Post {number}", null, $"post-{number}",
                [Sketch.Box(left, top, right, sill, FillRole.Post, LineRole.Outline)]));
        }

        var width = Math.Clamp(1.4 * input.Barrier.Logs.EndBearing * view.PerMetre, 0.9, 0.7 * layout.Pier);
        var (leftReveal, rightReveal) = (view.X(0), view.X(input.Opening.ClearWidth));
        sketch.Add(Guide("left", leftReveal - width, top, leftReveal, sill));
        sketch.Add(Guide("right", rightReveal, top, rightReveal + width, sill));
    }

    /// <summary>Numbers of the logs, from the bottom; over the water, so that they stay dark.</summary>
    public static void DrawNumbers(Sketch sketch, DrawingInput input, ElevationLayout layout)
    {
        var view = layout.Projection;
        var edges = EdgesOf(input, view.SillY, layout.Shown(input.Result.BarrierHeight));
        var pitch = edges.Zip(edges.Skip(1), (low, high) => low - high).Min();
        var size = Math.Min(sketch.Sheet.SmallText, 0.92 * sketch.Sheet.TextSize);
        var widest = Sketch.Width(input.LogCount.ToString(CultureInfo.InvariantCulture), size, TextRole.Normal);
        var bays = ElevationBays.Of(input);
        var (low, high) = (view.SillY - 0.5 * size, edges[^1] + 0.5 * size);
        foreach (var (left, width) in Shown(bays.Count, view.Cut).Select(bay => bays[bay]))
        {
            if (width * view.PerMetre < widest + 0.8)
            {
                continue;
            }

            foreach (var number in Numbered(input.LogCount, pitch, 1.25 * size))
            {
                var y = Math.Clamp((edges[number - 1] + edges[number]) / 2, Math.Min(high, low), low) + 0.33 * size;
                sketch.Add(new Text(
                    number.ToString(CultureInfo.InvariantCulture), new(view.X(left + width / 2), y), size,
                    TextAnchor.Middle, TextRole.Normal));
            }
        }
    }

    /// <summary>The bays that are drawn, from 0.</summary>
    public static IEnumerable<int> Shown(int count, BayCut? cut) =>
        Enumerable.Range(0, count).Where(bay => cut is null || !cut.Omits(bay));

    /// <summary>The posts that are drawn, from 1; a post stands on each side of a break.</summary>
    public static IEnumerable<int> ShownPosts(int bays, BayCut? cut) =>
        Enumerable.Range(1, bays - 1).Where(post => cut is null || post <= cut.First || post > cut.Last);

    private static void DrawLogs(
        Sketch sketch, DrawingInput input, Projection view, (double Left, double Width) bay, int number, double top)
    {
        var (left, right) = (view.X(bay.Left), view.X(bay.Left + bay.Width));
        var edges = EdgesOf(input, view.SillY, top);
        var pitch = edges.Zip(edges.Skip(1), (low, high) => low - high).Min();
        if (pitch >= LeastLog)
        {
            for (var log = 1; log <= input.LogCount; log++)
            {
                sketch.Add(new Mark(
                    MarkKind.Log, FormattableString.Invariant($"Log {log}, bay {number}"), null,
                    FormattableString.Invariant($"bay-{number}-log-{log}"),
                    [Sketch.Box(left, edges[log], right, edges[log - 1], FillRole.Log, LineRole.Edge)]));
            }
        }
        else
        {
            sketch.Add(Sketch.Box(left, top, right, view.SillY, FillRole.Log, null));
            var every = (int)Math.Ceiling(0.5 / pitch);
            sketch.Add(new Hatch(
                [.. Enumerable.Range(1, input.LogCount - 1).Where(i => i % every == 0)
                    .Select(i => new Segment(new(left, edges[i]), new(right, edges[i])))],
                LineRole.Hatch));
        }

        sketch.Add(Sketch.Box(left, top, right, view.SillY, null, LineRole.Outline));
    }

    /// <summary>Sheet y of each joint, from the sill to the top of the barrier.</summary>
    private static double[] EdgesOf(DrawingInput input, double sill, double top) =>
        [.. input.LogEdges.Select(z => sill - z / input.Result.BarrierHeight * (sill - top))];

    private static Mark Guide(string side, double left, double top, double right, double bottom) => new(
        MarkKind.Guide, $"Guide, {side}", null, $"guide-{side}",
        [Sketch.Box(left, top, right, bottom, FillRole.Post, LineRole.Outline)]);

    /// <summary>The logs that get a number: all, or the first and every few from there.</summary>
    internal static IEnumerable<int> Numbered(int count, double pitch, double spacing)
    {
        int[] steps = [1, 2, 5, 10, 20, 50, 100];
        var step = steps.FirstOrDefault(s => s * pitch >= spacing, int.MaxValue);
        if (step == int.MaxValue)
        {
            yield break;
        }

        for (var number = 1; number <= count; number++)
        {
            var isRound = step switch
            {
                1 => true,
                2 => number % 2 == 1,
                _ => number % step == 0 && (number - 1) * pitch >= spacing,
            };
            if (isRound || number == 1)
            {
                yield return number;
            }
        }
    }
}
