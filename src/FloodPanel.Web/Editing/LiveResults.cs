using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Editing;

/// <summary>
/// The problems and results that belong to the project as it stands. Only openings and covers that changed are calculated
/// anew; one with a problem has no result rather than an old one.
/// </summary>
public sealed class LiveResults(Library library)
{
    private readonly Dictionary<string, Calculated> results = [];
    private CoverResult?[] covers = [];
    private Project? coversOf;

    public IReadOnlyList<InputProblem> Problems { get; private set; } = [];

    public OpeningResult? For(string openingId) => results.GetValueOrDefault(openingId)?.Result;

    public CoverResult? CoverAt(int index) => index < covers.Length ? covers[index] : null;

    public void Update(Project project)
    {
        Problems = project.Validate(library);
        covers = [.. project.Covers.Select((cover, i) => MayCalculate(PathOfCover(i)) ? CoverOf(project, cover) : null)];
        coversOf = project;
        var kept = results.Values.Where(r => IsCurrent(r, project)).ToDictionary(r => r.Result.Opening.Id);
        results.Clear();
        for (var i = 0; i < project.Openings.Count; i++)
        {
            if (MayCalculate(PathOf(i)))
            {
                var opening = project.Openings[i];
                results[opening.Id] = kept.TryGetValue(opening.Id, out var old) && ReferenceEquals(old.Result.Opening, opening)
                    ? old
                    : new Calculated(project.Site, project.DesignBasis, project.OwnBasis, project.Confirmed, Design.Evaluate(project, opening, library));
            }
        }
    }

    /// <summary>A series takes its time: what stands as it stood is kept.</summary>
    private CoverResult CoverOf(Project project, Cover cover)
    {
        var isSame = coversOf is { } old && old.Site == project.Site && old.DesignBasis == project.DesignBasis && old.OwnBasis == project.OwnBasis;
        return (isSame ? covers.FirstOrDefault(c => c is not null && ReferenceEquals(c.Cover, cover)) : null) ?? Design.Evaluate(project, cover, library);
    }

    private static bool IsCurrent(Calculated calculated, Project project) =>
        calculated.DesignBasis == project.DesignBasis && calculated.OwnBasis == project.OwnBasis && calculated.Site == project.Site
        && calculated.Confirmed == project.Confirmed;

    // Names and addresses are not calculated with; levels and the opening's own figures are.
    private bool MayCalculate(string path) => !Problems.Any(p =>
        p.Path.StartsWith("site", StringComparison.Ordinal)
        || p.Path.StartsWith("designBasis", StringComparison.Ordinal)
        || p.Path.StartsWith("ownBasis", StringComparison.Ordinal)
        || p.Path.StartsWith(path, StringComparison.Ordinal));

    /// <summary>Path of an opening in the project file, "openings[0]".</summary>
    public static string PathOf(int opening) => FormattableString.Invariant($"openings[{opening}]");

    /// <summary>Path of a cover in the project file, "covers[0]".</summary>
    public static string PathOfCover(int cover) => FormattableString.Invariant($"covers[{cover}]");

    private sealed record Calculated(Site Site, DesignBasisKind DesignBasis, DesignBasis? OwnBasis, ValueList<string> Confirmed, OpeningResult Result);
}
