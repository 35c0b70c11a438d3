using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A post cut level with its plate: x across the opening, y in the direction of the water, from its middle.</summary>
internal static class PostCut
{
    public static IEnumerable<Shape> Of(Projection view, Profile post)
    {
        var (x, y) = (post.Height / 2, post.Depth / 2);
        switch (post)
        {
            case ISection section:
                yield return Outline(view, section);
                break;
            case HollowRectangle hollow:
                yield return Box(view, -x, -y, x, y, FillRole.Post);
                foreach (var hole in Holes(view, hollow))
                {
                    yield return hole;
                }

                break;
            case RectangularTube tube:
                yield return Box(view, -x, -y, x, y, FillRole.Post);
                yield return Box(view, -x + tube.Wall, -y + tube.Wall, x - tube.Wall, y - tube.Wall, FillRole.Paper);
                break;
            default:
                yield return Box(view, -x, -y, x, y, FillRole.Post);
                break;
        }
    }

    private static IEnumerable<Shape> Holes(Projection view, HollowRectangle hollow)
    {
        var width = (hollow.Height - hollow.Webs * hollow.Web) / (hollow.Webs - 1);
        for (var i = 0; i < hollow.Webs - 1; i++)
        {
            var left = -hollow.Height / 2 + hollow.Web + i * (width + hollow.Web);
            yield return Box(view, left, -hollow.Depth / 2 + hollow.Face, left + width, hollow.Depth / 2 - hollow.Face, FillRole.Paper);
        }
    }

    private static Polygon Outline(Projection view, ISection section)
    {
        var (x, y, web, flange) = (section.Height / 2, section.Depth / 2, section.Web / 2, section.Depth / 2 - section.Flange);
        (double X, double Y)[] corners =
        [
            (-x, -y), (x, -y), (x, -flange), (web, -flange), (web, flange), (x, flange),
            (x, y), (-x, y), (-x, flange), (-web, flange), (-web, -flange), (-x, -flange),
        ];
        return new Polygon([.. corners.Select(c => view.At(c.X, c.Y))], FillRole.Post, LineRole.Outline);
    }

    private static Polygon Box(Projection view, double left, double bottom, double right, double top, FillRole fill) =>
        Sketch.Box(view.X(left), view.Y(top), view.X(right), view.Y(bottom), fill, LineRole.Outline);
}
