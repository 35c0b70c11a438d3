using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>Edits that reach further than one field: bays that share the clear width, posts between bays, declarations.</summary>
public static class OpeningEdits
{
    // Bays are cut to the millimetre; the last takes what is left.
    private const int Decimals = 3;

    /// <summary>A new clear width. Bays that shared the old one evenly share the new one.</summary>
    public static Opening WithClearWidth(Opening opening, double clearWidth)
    {
        var changed = opening with { ClearWidth = clearWidth };
        return IsEven(opening) ? EvenOut(changed) : changed;
    }

    /// <summary>A new post width. Bays that shared the clear width evenly go on doing so.</summary>
    public static Opening WithPostWidth(Opening opening, double width)
    {
        if (opening.Barrier.Posts is not { } posts)
        {
            return opening;
        }

        var changed = opening with { Barrier = opening.Barrier with { Posts = posts with { Width = width } } };
        return IsEven(opening) ? EvenOut(changed) : changed;
    }

    /// <summary>A number of equal bays, with posts between them or without any.</summary>
    /// <param name="opening">The opening.</param>
    /// <param name="bays">Number of bays [-], at least 1.</param>
    /// <param name="posts">The posts to use when there are none yet.</param>
    public static Opening WithBays(Opening opening, int bays, PostSet posts) => EvenOut(opening with
    {
        Barrier = opening.Barrier with
        {
            Bays = Enumerable.Repeat(0.0, bays).ToValueList(),
            Posts = bays > 1 ? opening.Barrier.Posts ?? posts : null,
        },
    });

    /// <summary>The same number of bays, of equal width. Unchanged where posts leave no room for them.</summary>
    public static Opening EvenOut(Opening opening)
    {
        var bays = EvenBays(opening);
        return bays.Count > 0 && bays[^1] <= 0 ? opening : opening with { Barrier = opening.Barrier with { Bays = bays } };
    }

    /// <summary>True where the bays share the clear width evenly.</summary>
    public static bool IsEven(Opening opening)
    {
        var (bays, even) = (opening.Barrier.Bays, EvenBays(opening));
        return bays.Zip(even).All(pair => Math.Abs(pair.First - pair.Second) < 1e-6);
    }

    /// <summary>The posts that a first second bay brings along: of the material of the logs.</summary>
    public static PostSet FirstPosts(Opening opening)
    {
        var logs = opening.Barrier.Logs;
        return new PostSet
        {
            Material = logs.Material,
            Profile = new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.006 },
            Width = Math.Max(0.1, 2 * logs.EndBearing),
        };
    }

    /// <summary>Another declaration for a check, or none with null.</summary>
    public static Opening Declare(Opening opening, string check, DesignedByOthers? declaration)
    {
        var others = opening.Barrier.ByOthers.Where(d => d.Check != check);
        var order = NeededChecks.MayBeByOthers.ToList();
        var all = (declaration is null ? others : others.Append(declaration)).OrderBy(d => order.IndexOf(d.Check));
        return opening with { Barrier = opening.Barrier with { ByOthers = all.ToValueList() } };
    }

    private static ValueList<double> EvenBays(Opening opening)
    {
        var count = opening.Barrier.Bays.Count;
        if (count == 0)
        {
            return [];
        }

        var free = opening.ClearWidth - (count - 1) * (opening.Barrier.Posts?.Width ?? 0);
        var width = Math.Round(free / count, Decimals);
        var last = Math.Round(free - (count - 1) * width, 9);
        return Enumerable.Repeat(width, count - 1).Append(last).ToValueList();
    }
}
