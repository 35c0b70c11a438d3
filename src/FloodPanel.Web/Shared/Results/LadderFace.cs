using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;

namespace FloodPanel.Web.Shared.Results;

/// <summary>One action over a band of height: a strip between two lines, as fractions of the greatest pressure and of the height.</summary>
/// <param name="Kind">The action.</param>
/// <param name="Bottom">Lower end, from 0 at the sill to 1 at the top of the barrier.</param>
/// <param name="Top">Upper end.</param>
/// <param name="FromBottom">Where the strip begins at its lower end.</param>
/// <param name="ToBottom">Where it ends at its lower end.</param>
/// <param name="FromTop">Where it begins at its upper end.</param>
/// <param name="ToTop">Where it ends at its upper end.</param>
public readonly record struct FaceStrip(
    ActionKind Kind, double Bottom, double Top, double FromBottom, double ToBottom, double FromTop, double ToTop);

/// <summary>The pressure diagram of a case, stacked by action, to the height of the barrier.</summary>
public static class LadderFace
{
    /// <summary>The strips of a case; none where no pressure acts.</summary>
    public static IReadOnlyList<FaceStrip> Strips(IReadOnlyList<ActionResult> actions, double height)
    {
        var edges = actions.SelectMany(a => a.Pieces).SelectMany(p => new[] { p.Bottom, p.Top })
            .Where(z => z >= 0 && z <= height).Distinct().Order().ToArray();
        var strips = new List<FaceStrip>();
        for (var i = 0; i + 1 < edges.Length; i++)
        {
            AddBand(strips, actions, edges[i], edges[i + 1], height);
        }

        var greatest = strips.Count == 0 ? 0 : strips.Max(s => Math.Max(s.ToBottom, s.ToTop));
        return greatest <= 0 ? [] : [.. strips.Select(s => s with
        {
            FromBottom = s.FromBottom / greatest,
            ToBottom = s.ToBottom / greatest,
            FromTop = s.FromTop / greatest,
            ToTop = s.ToTop / greatest,
        })];
    }

    private static void AddBand(
        List<FaceStrip> strips, IReadOnlyList<ActionResult> actions, double bottom, double top, double height)
    {
        var (below, above) = (0.0, 0.0);
        foreach (var action in actions)
        {
            var (atBottom, atTop) = (0.0, 0.0);
            foreach (var piece in action.Pieces.Where(p => p.Bottom <= bottom && p.Top >= top))
            {
                atBottom += piece.At(bottom);
                atTop += piece.At(top);
            }

            if (atBottom > 0 || atTop > 0)
            {
                strips.Add(new(action.Kind, bottom / height, top / height, below, below + atBottom, above, above + atTop));
                (below, above) = (below + atBottom, above + atTop);
            }
        }
    }
}
