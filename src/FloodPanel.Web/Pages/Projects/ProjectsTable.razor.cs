using System.Globalization;
using FloodPanel.Storage;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Projects;

public sealed partial class ProjectsTable
{
    [Inject]
    public required TimeProvider Time { get; init; }

    [Parameter, EditorRequired]
    public required IReadOnlyList<ProjectSummary> Rows { get; set; }

    [Parameter, EditorRequired]
    public required ListOrder Order { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ListOrder> OnOrder { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ProjectSummary> OnExport { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ProjectSummary> OnDuplicate { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ProjectSummary> OnDelete { get; set; }

    // A project without openings is not described yet; its levels come first.
    private static string AddressOf(ProjectSummary row) =>
        row.OpeningCount == 0 ? ProjectAddress.Site(row.Id) : ProjectAddress.Openings(row.Id);

    private string? SortOf(ListColumn column) => column != Order.Column ? null : Order.Descending ? "descending" : "ascending";

    private string ArrowOf(ListColumn column) => column != Order.Column ? "" : Order.Descending ? " ↓" : " ↑";

    private string When(DateTimeOffset at)
    {
        var local = TimeZoneInfo.ConvertTime(at, Time.LocalTimeZone);
        var isToday = local.Date == Time.GetLocalNow().Date;
        return local.ToString(isToday ? "'today,' HH:mm" : "d MMM yyyy, HH:mm", CultureInfo.InvariantCulture);
    }
}
