using FloodPanel.Calculation;

namespace FloodPanel.Web.Editing;

/// <summary>Addresses of the pages of a project.</summary>
public static class ProjectAddress
{
    public static string Site(Guid id) => $"/projects/{id}/site";

    public static string Openings(Guid id) => $"/projects/{id}/openings";

    public static string CoverPlates(Guid id) => $"/projects/{id}/covers";

    public static string Library(Guid id) => $"/projects/{id}/library";

    public static string Bench(Guid id, string openingId) => $"/projects/{id}/openings/{Uri.EscapeDataString(openingId)}";

    public static string Export(Guid id) => $"/projects/{id}/export";

    public static string OwnerSummary(Guid id, UnitSystem units) =>
        $"/projects/{id}/owner-summary.pdf?units={(units == UnitSystem.SI ? "si" : "us")}";

    /// <summary>True when an address without its leading slash is one of this project's pages.</summary>
    public static bool Covers(string relative, Guid id) =>
        relative.StartsWith($"projects/{id}/", StringComparison.OrdinalIgnoreCase);
}
