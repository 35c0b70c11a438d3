using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The guides that a mounting begins with: dimensions that fit the logs, for the user to change. No strength is assumed.</summary>
public static class FirstGuides
{
    /// <summary>Play between the end of a log and its guide [m].</summary>
    private const double Play = 0.005;

    /// <summary>The first guides of a barrier.</summary>
    /// <param name="barrier">The barrier: its end bearing, its materials.</param>
    /// <param name="library">The library.</param>
    /// <param name="basis">The design basis that fastener values will be values of.</param>
    /// <param name="mounting">Where the guides are fixed.</param>
    public static GuideSet Of(Barrier barrier, Library library, DesignBasisKind basis, GuideMounting mounting)
    {
        var blank = new GuideSet();
        var first = blank with { Mounting = mounting, Material = MaterialOf(barrier, library), Fasteners = blank.Fasteners with { ValuesFor = basis } };
        var (half, edge) = (barrier.Logs.EndBearing / 2, first.Fasteners.EdgeDistance);
        return mounting switch
        {
            // The load over the strip beside the arris: nothing tips, and the lip lies on the wall.
            GuideMounting.WetFace => first with { LipLever = 0, BearingDistance = edge - first.BearingWidth, LoadOffset = edge - first.BearingWidth },

            // The logs in the opening, behind a plate that reaches past the arris.
            GuideMounting.DryFace => first with { LipLever = half + Play, BearingDistance = 0.08, LoadOffset = edge + Play + half },
            _ => first with { LipLever = half + Play, LoadOffset = half + Play + first.BaseThickness },
        };
    }

    /// <summary>That of the posts, else that of metal logs, else the first steel of the library.</summary>
    private static MaterialChoice MaterialOf(Barrier barrier, Library library)
    {
        var logs = barrier.Logs.Material;
        if (barrier.Posts is { } posts)
        {
            return posts.Material;
        }

        var steel = library.Materials.Values.Where(entry => entry.Item.Family == MaterialFamily.Steel).MinBy(entry => entry.Id, StringComparer.Ordinal);
        return steel is null || library.Find(logs)?.Family is MaterialFamily.Aluminium or MaterialFamily.Steel ? logs : new LibraryMaterial(steel.Id);
    }
}
