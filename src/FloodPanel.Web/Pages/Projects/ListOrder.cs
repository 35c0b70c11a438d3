using FloodPanel.Storage;

namespace FloodPanel.Web.Pages.Projects;

public enum ListColumn
{
    Name,
    Reference,
    Modified,
}

/// <summary>How the list of projects is ordered.</summary>
public sealed record ListOrder(ListColumn Column, bool Descending)
{
    public static ListOrder Newest { get; } = new(ListColumn.Modified, Descending: true);

    /// <summary>The order after a click on a column: turned round, or that column from its natural end.</summary>
    public ListOrder Click(ListColumn column) =>
        column == Column ? this with { Descending = !Descending } : new(column, Descending: column == ListColumn.Modified);

    public IReadOnlyList<ProjectSummary> Sort(IEnumerable<ProjectSummary> rows)
    {
        var ascending = Column switch
        {
            ListColumn.Name => rows.OrderBy(r => r.Name, StringComparer.OrdinalIgnoreCase),
            ListColumn.Reference => rows.OrderBy(r => r.Reference, StringComparer.OrdinalIgnoreCase),
            _ => rows.OrderBy(r => r.ModifiedAt),
        };
        var sorted = ascending.ThenBy(r => r.Id).ToList();
        if (Descending)
        {
            sorted.Reverse();
        }

        return sorted;
    }
}
