using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Editing;

/// <summary>
/// The problems and results that belong to the project as it stands. Only openings that changed are calculated
/// anew; an opening with a problem has no result rather than an old one.
/// </summary>
public sealed class LiveResults(Library library)
{
    private readonly Dictionary<string, Calculated> results = [];

    public IReadOnlyList<InputProblem> Problems { get; private set; } = [];

    public OpeningResult? For(string openingId) => results.GetValueOrDefault(openingId)?.Result;

    public void Update(Project project)
    {
        Problems = project.Validate(library);
        var kept = results.Values.Where(r => IsCurrent(r, project)).ToDictionary(r => r.Result.Opening.Id);
        results.Clear();
        for (var i = 0; i < project.Openings.Count; i++)
        {
            if (MayCalculate(i))
            {
                var opening = project.Openings[i];
                results[opening.Id] = kept.TryGetValue(opening.Id, out var old) && ReferenceEquals(old.Result.Opening, opening)
                    ? old
                    : new Calculated(project.Site, project.DesignBasis, project.OwnBasis, Design.Evaluate(project, opening, library));
            }
        }
    }

    private static bool IsCurrent(Calculated calculated, Project project) =>
        calculated.DesignBasis == project.DesignBasis && calculated.OwnBasis == project.OwnBasis && calculated.Site == project.Site;

    // Names and addresses are not calculated with; levels and the opening's own figures are.
    private bool MayCalculate(int opening) => !Problems.Any(p =>
        p.Path.StartsWith("site", StringComparison.Ordinal)
        || p.Path.StartsWith("designBasis", StringComparison.Ordinal)
        || p.Path.StartsWith("ownBasis", StringComparison.Ordinal)
        || p.Path.StartsWith(PathOf(opening), StringComparison.Ordinal));

    /// <summary>Path of an opening in the project file, "openings[0]".</summary>
    public static string PathOf(int opening) => FormattableString.Invariant($"openings[{opening}]");

    private sealed record Calculated(Site Site, DesignBasisKind DesignBasis, DesignBasis? OwnBasis, OpeningResult Result);
}
