using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Calculation.Water;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Pages.Openings;

/// <summary>
/// A barrier to begin with for a new opening: hollow aluminium logs up to the required top, steel tube posts where
/// the opening is wide: the lightest stack of the library, and the lightest posts, of which no check fails. The engineer changes it on the Bench.
/// </summary>
public static class OpeningProposal
{
    /// <summary>Openings wider than this get posts [m]: longer logs are awkward to carry and to store.</summary>
    public const double WidestBay = 2.5;

    private const string PreferredLogMaterial = "en-aw-6005a-t6";
    private const string PreferredPostMaterial = "s235";

    public static Opening For(Project project, Library library, OpeningBasics basics)
    {
        var bare = Bare(project, basics);
        Opening? last = null;
        foreach (var candidate in Candidates(project, library, bare))
        {
            last = candidate;
            if (Holds(project, library, candidate))
            {
                return candidate;
            }
        }

        // None holds, or the library is empty: the strongest, and the Bench shows what fails.
        return last ?? bare;
    }

    /// <summary>What is proposed, in a sentence or two.</summary>
    public static Sentence Describe(Project project, Library library, Opening opening)
    {
        var barrier = opening.Barrier;
        var depth = new Quantity(Math.Max(0, project.Site.DesignFloodLevel - opening.SillLevel), Dimension.Length);
        var height = new Quantity(barrier.Logs.Count * (library.Find(barrier.Logs.Profile)?.Height ?? 0), Dimension.Length);
        var log = barrier.Logs.Profile is LibraryProfile named ? library.Profiles[named.Id].Title : "log";
        var bay = new Quantity(barrier.Bays[0], Dimension.Length);
        var posts = barrier.Bays.Count == 2 ? "1 post" : FormattableString.Invariant($"{barrier.Bays.Count - 1} posts");
        return barrier.Bays.Count == 1
            ? new($"Retained depth {depth}. Proposed: {barrier.Logs.Count} × {log}, {height} high, in one bay of {bay}.")
            : new($"Retained depth {depth}. Proposed: {barrier.Logs.Count} × {log}, {height} high, in {barrier.Bays.Count} bays of {bay} with {posts} between.");
    }

    /// <summary>An identifier made of a name, "garage-door", not used in the project yet.</summary>
    public static string IdFor(Project project, string name)
    {
        var words = name.ToLowerInvariant().Split([.. name.ToLowerInvariant().Where(c => !char.IsAsciiLetterOrDigit(c))],
            StringSplitOptions.RemoveEmptyEntries);
        var stem = string.Join('-', words);
        stem = stem.Length == 0 ? "opening" : stem[..Math.Min(stem.Length, 50)];
        var id = stem;
        for (var n = 2; project.Openings.Any(o => o.Id == id); n++)
        {
            id = FormattableString.Invariant($"{stem}-{n}");
        }

        return id;
    }

    private static Opening Bare(Project project, OpeningBasics basics) => new()
    {
        Id = IdFor(project, basics.Name),
        Name = basics.Name,
        SillLevel = basics.SillLevel,
        ClearWidth = basics.ClearWidth,
        ClearHeight = basics.ClearHeight,
        Barrier = new Barrier { Bays = [basics.ClearWidth] },
    };

    private static IEnumerable<Opening> Candidates(Project project, Library library, Opening bare)
    {
        var logMaterial = MaterialOf(library, MaterialFamily.Aluminium, PreferredLogMaterial);
        var postMaterial = MaterialOf(library, MaterialFamily.Steel, PreferredPostMaterial);
        IReadOnlyList<PostSet?> posts = bare.ClearWidth > WidestBay && postMaterial is not null
            ? [.. ByMass<RectangularTube>(library).Select(p => PostsOf(postMaterial, p))]
            : [null];
        if (logMaterial is null)
        {
            yield break;
        }

        var stacks = ByMass<HollowRectangle>(library)
            .Select(log => (Log: log, Count: CountFor(project.Site, bare.SillLevel, log.Item.Height)))
            .OrderBy(stack => stack.Count * SectionProperties.Of(stack.Log.Item).Area);
        foreach (var (log, count) in stacks)
        {
            var logs = new LogStack { Material = logMaterial, Profile = new LibraryProfile(log.Id), Count = count };
            foreach (var post in posts)
            {
                yield return bare with { Barrier = new Barrier { Logs = logs, Posts = post, Bays = BaysFor(bare.ClearWidth, post?.Width) } };
            }
        }
    }

    private static bool Holds(Project project, Library library, Opening candidate)
    {
        var alone = project with { Openings = [candidate] };
        return !alone.Validate(library).Any(p => p.Path.StartsWith("openings", StringComparison.Ordinal) || p.Path.StartsWith("site", StringComparison.Ordinal))
            && Design.Evaluate(alone, candidate, library).Verdict.Kind != VerdictKind.Inadequate;
    }

    private static int CountFor(Site site, double sillLevel, double logHeight)
    {
        var required = site.DesignFloodLevel + site.Freeboard - sillLevel - FloodLevels.HeightTolerance;
        return (int)Math.Clamp(Math.Ceiling(required / logHeight), Fields.LogCount.Minimum, Fields.LogCount.Maximum);
    }

    // Whole millimetres, as they are set out on site; the last bay takes what is left over.
    private static ValueList<double> BaysFor(double clearWidth, double? postWidth)
    {
        if (postWidth is not { } post)
        {
            return [clearWidth];
        }

        var count = (int)Math.Ceiling((clearWidth + post) / (WidestBay + post));
        var bay = Math.Round((clearWidth - (count - 1) * post) / count, 3);
        var last = clearWidth - (count - 1) * (bay + post);
        return [.. Enumerable.Repeat(bay, count - 1), Math.Round(last, 6)];
    }

    private static PostSet PostsOf(LibraryMaterial material, LibraryEntry<Profile> profile) =>
        new() { Material = material, Profile = new LibraryProfile(profile.Id), Width = profile.Item.Height };

    // A proposal does not rest on figures that somebody has yet to confirm.
    private static IEnumerable<LibraryEntry<Profile>> ByMass<T>(Library library)
        where T : Profile =>
        library.Profiles.Values.Where(p => p.Item is T && !p.FromMemory).OrderBy(p => SectionProperties.Of(p.Item).Area).ThenBy(p => p.Id, StringComparer.Ordinal);

    private static LibraryMaterial? MaterialOf(Library library, MaterialFamily family, string preferred) =>
        library.Materials.ContainsKey(preferred)
            ? new LibraryMaterial(preferred)
            : library.Materials.Values.Where(m => m.Item.Family == family).OrderBy(m => m.Id, StringComparer.Ordinal)
                .Select(m => new LibraryMaterial(m.Id)).FirstOrDefault();
}
