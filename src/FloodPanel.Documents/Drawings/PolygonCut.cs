namespace FloodPanel.Documents.Drawings;

/// <summary>Cuts lines to the inside of simple polygons, convex or not.</summary>
public static class PolygonCut
{
    private const double Least = 0.02;

    /// <summary>The pieces of a line that lie inside a polygon.</summary>
    /// <param name="line">The line.</param>
    /// <param name="polygon">Corners of the polygon.</param>
    public static IEnumerable<Segment> Inside(Segment line, IReadOnlyList<SheetPoint> polygon)
    {
        var length = Math.Sqrt(Square(line.To.X - line.From.X) + Square(line.To.Y - line.From.Y));
        if (length <= 0)
        {
            yield break;
        }

        var cuts = Crossings(line, polygon);
        for (var i = 0; i + 1 < cuts.Count; i++)
        {
            var inside = Contains(polygon, Along(line, (cuts[i] + cuts[i + 1]) / 2));
            if (inside && (cuts[i + 1] - cuts[i]) * length >= Math.Min(Least, length / 2))
            {
                yield return new Segment(Along(line, cuts[i]), Along(line, cuts[i + 1]));
            }
        }
    }

    /// <summary>True when a point lies inside a polygon (even-odd rule).</summary>
    /// <param name="polygon">Corners of the polygon.</param>
    /// <param name="point">The point.</param>
    public static bool Contains(IReadOnlyList<SheetPoint> polygon, SheetPoint point)
    {
        var inside = false;
        for (int i = 0, j = polygon.Count - 1; i < polygon.Count; j = i++)
        {
            var (a, b) = (polygon[i], polygon[j]);
            if (a.Y > point.Y != b.Y > point.Y && point.X < (b.X - a.X) * (point.Y - a.Y) / (b.Y - a.Y) + a.X)
            {
                inside = !inside;
            }
        }

        return inside;
    }

    private static List<double> Crossings(Segment line, IReadOnlyList<SheetPoint> polygon)
    {
        var cuts = new List<double> { 0, 1 };
        var (dx, dy) = (line.To.X - line.From.X, line.To.Y - line.From.Y);
        for (int i = 0, j = polygon.Count - 1; i < polygon.Count; j = i++)
        {
            var (ex, ey) = (polygon[i].X - polygon[j].X, polygon[i].Y - polygon[j].Y);
            var cross = dx * ey - dy * ex;
            if (Math.Abs(cross) < 1e-12)
            {
                continue;
            }

            var (ox, oy) = (polygon[j].X - line.From.X, polygon[j].Y - line.From.Y);
            var onLine = (ox * ey - oy * ex) / cross;
            var onEdge = (ox * dy - oy * dx) / cross;
            if (onLine is > 0 and < 1 && onEdge is >= 0 and <= 1)
            {
                cuts.Add(onLine);
            }
        }

        cuts.Sort();
        return cuts;
    }

    private static SheetPoint Along(Segment line, double t) =>
        new(line.From.X + t * (line.To.X - line.From.X), line.From.Y + t * (line.To.Y - line.From.Y));

    private static double Square(double x) => x * x;
}
