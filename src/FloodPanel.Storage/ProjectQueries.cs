using FloodPanel.Storage.Entities;

namespace FloodPanel.Storage;

internal static class ProjectQueries
{
    /// <summary>Projects that are not deleted.</summary>
    public static IQueryable<ProjectRow> Present(this IQueryable<ProjectRow> projects) => projects.Where(p => p.DeletedAt == null);
}
