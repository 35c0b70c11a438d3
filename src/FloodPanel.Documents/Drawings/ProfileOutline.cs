using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>The edges of a cross-section about its middle [m]: depth along the water to the right, height upward.</summary>
/// <param name="Outer">The outer edge.</param>
/// <param name="Holes">The edges of its hollows.</param>
internal sealed record ProfileOutline(IReadOnlyList<SheetPoint> Outer, IReadOnlyList<IReadOnlyList<SheetPoint>> Holes)
{
    /// <summary>Straight pieces that stand for a quarter circle.</summary>
    private const int Pieces = 16;

    public static ProfileOutline Of(Profile profile) => profile switch
    {
        HollowRectangle hollow => new(Rounded(hollow.Depth, hollow.Height, 0), [.. Hollows(hollow)]),
        RectangularTube tube => new(
            Rounded(tube.Depth, tube.Height, tube.OuterCorner),
            [Rounded(tube.Depth - 2 * tube.Wall, tube.Height - 2 * tube.Wall, tube.InnerCorner)]),
        ISection section => new(Flanged(section), []),
        _ => new(Rounded(profile.Depth, profile.Height, 0), []),
    };

    private static SheetPoint[] Rounded(double wide, double high, double radius, double middle = 0)
    {
        var (x, y) = (wide / 2 - radius, high / 2 - radius);
        if (radius <= 0)
        {
            return [new(-x, middle - y), new(x, middle - y), new(x, middle + y), new(-x, middle + y)];
        }

        (double X, double Y)[] centres = [(x, y), (-x, y), (-x, -y), (x, -y)];
        return
        [
            .. centres.SelectMany((centre, quarter) => Enumerable.Range(0, Pieces + 1).Select(piece =>
            {
                var (sin, cos) = Math.SinCos((quarter + (double)piece / Pieces) * Math.PI / 2);
                return new SheetPoint(centre.X + radius * cos, middle + centre.Y + radius * sin);
            })),
        ];
    }

    private static IEnumerable<IReadOnlyList<SheetPoint>> Hollows(HollowRectangle hollow)
    {
        var clear = (hollow.Height - hollow.Webs * hollow.Web) / (hollow.Webs - 1);
        for (var i = 0; i < hollow.Webs - 1; i++)
        {
            yield return Rounded(hollow.Depth - 2 * hollow.Face, clear, 0, -hollow.Height / 2 + hollow.Web + clear / 2 + i * (clear + hollow.Web));
        }
    }

    private static SheetPoint[] Flanged(ISection section)
    {
        var (end, root, half, web) = (section.Depth / 2, section.Depth / 2 - section.Flange, section.Height / 2, section.Web / 2);
        return
        [
            new(-end, -half), new(-root, -half), new(-root, -web), new(root, -web), new(root, -half), new(end, -half),
            new(end, half), new(root, half), new(root, web), new(-root, web), new(-root, half), new(-end, half),
        ];
    }
}
