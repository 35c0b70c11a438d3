using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The bays and the posts between them.</summary>
public sealed partial class BaysSection
{
    private static readonly PostSet Usual = new();

    // The file holds bays; people count posts.
    private static readonly Field PostCount = new(
        "postCount", "Number of posts", Dimension.Count, 0, 49, "Posts stand between bays; none means one bay.");

    private PostSet? remembered;

    /// <summary>Materials and profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    protected override void OnParametersSet() => remembered = Barrier.Posts ?? remembered;

    private Task SetPosts(int posts) => Edit("number of posts", o =>
        OpeningEdits.WithBays(o, posts + 1, remembered ?? OpeningEdits.FirstPosts(o)));

    private Task SetBay(int bay, double width) => EditBarrier($"clear bay {bay + 1}", b => b with { Bays = b.Bays.SetItem(bay, width) });
}
