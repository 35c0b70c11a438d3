using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The page of one opening.</summary>
public sealed partial class BenchPage
{
    [Inject]
    public required Library Library { get; init; }

    [Parameter]
    public required string OpeningId { get; set; }

    private Confirmations Confirmations => field ??= new(Editor);

    private int Index => Enumerable.Range(0, Project.Openings.Count).FirstOrDefault(i => Project.Openings[i].Id == OpeningId, -1);

    private Opening? Opening => Index < 0 ? null : Project.Openings[Index];

    private string Path => LiveResults.PathOf(Index);

    private string Revision => Editor.Revision.ToString(CultureInfo.InvariantCulture);

    // By its id: between typing and applying, openings may have been added or removed.
    private void Apply(OpeningEdit edit) => Editor.Change(edit.What, project => project with
    {
        Openings = project.Openings.Select(o => o.Id == OpeningId ? edit.Apply(o) : o).ToValueList(),
    });
}
