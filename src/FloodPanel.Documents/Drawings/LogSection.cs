using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// The cut through the stack of logs, in metres: s runs up the slope, n from the flood face into the barrier.
/// </summary>
internal sealed class LogSection
{
    /// <summary>Depth drawn where the profile is not in the library [m].</summary>
    private const double UnknownDepth = 0.08;

    /// <summary>Least thickness of a wall on the sheet, so that thin metal stays visible [mm].</summary>
    private const double LeastWall = 0.28;

    private readonly double sin;
    private readonly double cos;
    private readonly OneLog[] logs;

    public LogSection(DrawingInput input)
    {
        (sin, cos) = Math.SinCos(input.Rake);
        SlopeLength = input.Result.BarrierHeight / cos;
        logs = LogsOf(input, cos);
        Depth = logs.Max(log => log.Depth);
        PostDepth = input.Barrier.Posts is { } posts && input.Barrier.Bays.Count > 1
            ? input.Library.Find(posts.Profile)?.Depth
            : null;
    }

    /// <summary>Size of the deepest log in the direction of the water [m].</summary>
    public double Depth { get; }

    /// <summary>Size of a post in the direction of the water [m]; null without posts.</summary>
    public double? PostDepth { get; }

    /// <summary>Length of the stack along the slope [m].</summary>
    public double SlopeLength { get; }

    /// <summary>Outermost x on the flood side [m].</summary>
    public double Left => Math.Min(0, -PostOverhang * cos);

    /// <summary>Outermost x on the protected side [m].</summary>
    public double Right => SlopeLength * sin + (Depth + Math.Max(0, PostOverhang)) * cos;

    private double PostOverhang => PostDepth is { } depth ? (depth - Depth) / 2 : 0;

    /// <summary>A point of the stack on the sheet.</summary>
    public SheetPoint At(Projection view, double s, double n) => view.At(s * sin + n * cos, s * cos - n * sin);

    /// <summary>The logs from the sill upward.</summary>
    public IEnumerable<Mark> Logs(Projection view)
    {
        for (var log = 1; log <= logs.Length; log++)
        {
            yield return new Mark(
                MarkKind.Log, FormattableString.Invariant($"Log {log}"), null, FormattableString.Invariant($"log-{log}"),
                [.. One(view, logs[log - 1])]);
        }
    }

    /// <summary>A post, seen beyond the cut.</summary>
    public Polygon? Post(Projection view) =>
        PostDepth is null ? null : Box(view, 0, SlopeLength, -PostOverhang, Depth + PostOverhang, null, LineRole.Hidden);

    private static OneLog[] LogsOf(DrawingInput input, double cos)
    {
        var (edges, logs) = (input.LogEdges, new List<OneLog>());
        foreach (var group in input.Barrier.Logs.Groups)
        {
            var profile = input.Library.Find(group.Profile);
            var family = input.Library.Find(group.Material)?.Family ?? MaterialFamily.Aluminium;
            for (var i = 0; i < group.Count; i++)
            {
                logs.Add(new(edges[logs.Count] / cos, edges[logs.Count + 1] / cos, profile?.Depth ?? UnknownDepth, profile, family));
            }
        }

        return [.. logs];
    }

    private IEnumerable<Shape> One(Projection view, OneLog log)
    {
        var high = log.Pitch * view.PerMetre;
        var edge = high >= 1.2 ? LineRole.Edge : LineRole.Hatch;
        if (log.Profile is ISection i && high >= 2)
        {
            yield return ISectionOutline(view, log, i);
            yield break;
        }

        var holes = high >= 2 ? Holes(view, log).ToArray() : [];
        var body = Box(view, log.From, log.To, 0, log.Depth, holes.Length > 0 ? FillRole.Post : FillRole.Log, edge);
        yield return body;
        foreach (var hole in holes)
        {
            yield return hole;
        }

        if (holes.Length == 0 && high >= 1.2)
        {
            yield return Hatching.Cut(log.Family, body.Points);
        }
    }

    private IEnumerable<Polygon> Holes(Projection view, OneLog log)
    {
        var (face, web, webs) = log.Profile switch
        {
            HollowRectangle hollow => (hollow.Face, hollow.Web, hollow.Webs),
            RectangularTube tube => (tube.Wall, tube.Wall, 2),
            _ => (0.0, 0.0, 0),
        };
        var least = LeastWall / view.PerMetre;
        (face, web) = (Math.Max(face, least), Math.Max(web, least));
        var hole = webs < 2 ? 0 : (log.Pitch - webs * web) / (webs - 1);
        if (hole * view.PerMetre < 0.3 || (log.Depth - 2 * face) * view.PerMetre < 0.3)
        {
            yield break;
        }

        for (var k = 0; k < webs - 1; k++)
        {
            var start = log.From + web + k * (hole + web);
            yield return Box(view, start, start + hole, face, log.Depth - face, FillRole.Paper, null);
        }
    }

    /// <summary>Web along the load, flanges at the wet and the dry face.</summary>
    private Polygon ISectionOutline(Projection view, OneLog log, ISection section)
    {
        var (low, high, depth) = (log.From, log.To, log.Depth);
        var (webLow, webHigh) = ((low + high - section.Web) / 2, (low + high + section.Web) / 2);
        var (wet, dry) = (section.Flange, depth - section.Flange);
        (double S, double N)[] corners =
        [
            (low, 0), (high, 0), (high, wet), (webHigh, wet), (webHigh, dry), (high, dry),
            (high, depth), (low, depth), (low, dry), (webLow, dry), (webLow, wet), (low, wet),
        ];
        return new Polygon([.. corners.Select(c => At(view, c.S, c.N))], FillRole.Post, LineRole.Edge);
    }

    private Polygon Box(
        Projection view, double low, double high, double wet, double dry, FillRole? fill, LineRole? outline) =>
        new([At(view, low, wet), At(view, high, wet), At(view, high, dry), At(view, low, dry)], fill, outline);

    /// <summary>One log: from and to along the slope, its depth, profile and material.</summary>
    private sealed record OneLog(double From, double To, double Depth, Profile? Profile, MaterialFamily Family)
    {
        public double Pitch => To - From;
    }
}
