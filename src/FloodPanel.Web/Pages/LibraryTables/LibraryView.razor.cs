using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.LibraryTables;

/// <summary>The tables of materials and profiles, filtered by family.</summary>
public sealed partial class LibraryView
{
    private const string All = "All";

    private static readonly bool[] Tables = [false, true];
    private static readonly string[] Families = [All, .. Enum.GetValues<MaterialFamily>().Select(Words.Of)];
    private static readonly Type[] ShapeTypes = [typeof(HollowRectangle), typeof(Rectangle), typeof(RectangularTube), typeof(ISection), typeof(GivenProperties)];
    private static readonly string[] Shapes = [All, .. ShapeTypes.Select(Words.OfShape)];

    private bool profiles;
    private string family = All;
    private string shape = All;

    /// <summary>The library.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    private IReadOnlyList<LibraryEntry<Material>> ShownMaterials =>
    [
        .. Library.Materials.Values.Where(m => family == All || Words.Of(m.Item.Family) == family)
            .OrderBy(m => m.Item.Family).ThenBy(m => m.Title, StringComparer.Ordinal),
    ];

    private IReadOnlyList<LibraryEntry<Profile>> ShownProfiles =>
    [
        .. Library.Profiles.Values.Where(p => shape == All || Words.Of(p.Item) == shape)
            .OrderBy(p => Array.IndexOf(ShapeTypes, p.Item.GetType())).ThenBy(p => p.Evidence, StringComparer.Ordinal)
            .ThenBy(p => p.Id.Split('-')[0], StringComparer.Ordinal).ThenBy(p => p.Item.Depth).ThenBy(p => p.Item.Height)
            .ThenBy(p => p.Id, StringComparer.Ordinal),
    ];
}
