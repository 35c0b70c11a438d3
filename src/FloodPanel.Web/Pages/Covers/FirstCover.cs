using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Covers;

/// <summary>The cover that a new one starts as.</summary>
internal static class FirstCover
{
    private const double DepthOfNew = 0.8;
    private const string Usual = "s235";

    /// <summary>A steel plate 0.6 × 0.4 m, its lower edge 0.8 m below the design flood; level to a centimetre.</summary>
    public static Cover For(Project project, Library library) => new()
    {
        Name = NameFor(project),
        Level = Math.Round(project.Site.DesignFloodLevel - DepthOfNew, 2),
        Material = library.Materials.ContainsKey(Usual)
            ? new LibraryMaterial(Usual)
            : new Material { Family = MaterialFamily.Steel, Name = "Steel", Density = 7850, ElasticModulus = 210e9 },
    };

    private static string NameFor(Project project)
    {
        for (var number = project.Covers.Count + 1; ; number++)
        {
            var name = string.Create(CultureInfo.InvariantCulture, $"Cover {number}");
            if (project.Covers.All(c => c.Name != name))
            {
                return name;
            }
        }
    }
}
