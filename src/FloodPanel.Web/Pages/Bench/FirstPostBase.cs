using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The raker and the base plate that a switch begins with: sizes that fit the post, for the user to change. No strength is assumed.</summary>
public static class FirstPostBase
{
    /// <summary>Part of the height of the barrier at which a raker holds a post [-].</summary>
    private const double HeadPart = 0.75;

    /// <summary>Plate beyond the post on each side: room for a rod and its nut [m].</summary>
    private const double BeyondAlong = 0.1, BeyondAcross = 0.05;

    /// <summary>Sizes to which people work [m].</summary>
    private const double Centimetre = 0.01;

    /// <summary>The first raker: of the material of the posts, at 45° to an upright post.</summary>
    /// <param name="opening">The opening, with posts.</param>
    /// <param name="library">The library.</param>
    public static RakerInput Raker(Opening opening, Library library)
    {
        var slope = opening.Barrier.Logs.Groups.Sum(group => group.Count * (library.Find(group.Profile)?.Height ?? 0));
        var rake = double.DegreesToRadians(opening.RakeDegrees);
        var head = Math.Max(Centimetre, Down(HeadPart * slope * Math.Cos(rake)));
        return new()
        {
            Material = opening.Barrier.Posts!.Material,
            Profile = new RectangularTube { Height = 0.05, Depth = 0.05, Wall = 0.004 },
            HeadHeight = head,
            FootDistance = Up(head * (1 + Math.Tan(rake))),
        };
    }

    /// <summary>The first base plate: of the material of the posts, the rods in the middle of what stands out.</summary>
    /// <param name="barrier">The barrier, with posts.</param>
    /// <param name="library">The library.</param>
    public static BasePlateInput Plate(Barrier barrier, Library library)
    {
        var blank = new BasePlateInput { Material = barrier.Posts!.Material };
        if (library.Find(barrier.Posts.Profile) is not { } post)
        {
            return blank;
        }

        var length = Up(post.Depth + 2 * BeyondAlong);
        return blank with
        {
            Length = length,
            Width = Up(post.Height + 2 * BeyondAcross),
            RodDistance = Math.Round((post.Depth + length) / 4, 3),
        };
    }

    private static double Down(double value) => Math.Round(Math.Floor(value / Centimetre) * Centimetre, 2);

    private static double Up(double value) => Math.Round(Math.Ceiling(value / Centimetre - 1e-9) * Centimetre, 2);
}
