using FloodPanel.Calculation;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.LibraryTables;

/// <summary>Materials and profiles inside a project, where figures from memory can be confirmed.</summary>
public sealed partial class ProjectLibraryPage
{
    [Inject]
    public required Library Library { get; init; }

    private Confirmations Confirmations => field ??= new(Editor);
}
