using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.LibraryTables;

/// <summary>Materials and profiles, outside any project.</summary>
public sealed partial class LibraryPage
{
    [Inject]
    public required Library Library { get; init; }
}
