using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The gap itself: name, width and height, levels, rake, wall.</summary>
public sealed partial class OpeningSection
{
    private static readonly WallKind[] Walls = Enum.GetValues<WallKind>();
}
