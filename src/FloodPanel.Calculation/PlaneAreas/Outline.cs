namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>Integrals over a plane area.</summary>
/// <param name="Area">A = ∫dA [m²].</param>
/// <param name="Across">∫x dA [m³].</param>
/// <param name="Up">∫s dA [m³].</param>
/// <param name="UpUp">∫s² dA [m⁴].</param>
/// <param name="AcrossUp">∫x·s dA [m⁴].</param>
public readonly record struct AreaMoments(double Area, double Across, double Up, double UpUp, double AcrossUp)
{
    /// <summary>The sum of two areas.</summary>
    /// <param name="a">One.</param>
    /// <param name="b">The other.</param>
    public static AreaMoments operator +(AreaMoments a, AreaMoments b) => new(
        a.Area + b.Area, a.Across + b.Across, a.Up + b.Up, a.UpUp + b.UpUp, a.AcrossUp + b.AcrossUp);

    /// <summary>A multiple of an area.</summary>
    /// <param name="factor">Factor [-].</param>
    /// <param name="a">The area.</param>
    public static AreaMoments operator *(double factor, AreaMoments a) => new(
        factor * a.Area, factor * a.Across, factor * a.Up, factor * a.UpUp, factor * a.AcrossUp);
}

/// <summary>The closed outline of a plane area: straight edges and arcs.</summary>
/// <remarks>
/// Area and moments are integrals around the outline in the form ∮f ds (Green's theorem): A = ∮x ds, ∫s dA = ∮x·s ds,
/// ∫s² dA = ∮x·s² ds, ∫x dA = ∮x²/2 ds, ∫x·s dA = ∮x²·s/2 ds. A level line has no ds and adds nothing, so that an area cut by
/// the water line is integrated by leaving out what stands above it. Exact for straight edges and for arcs.
/// </remarks>
public sealed class Outline
{
    private readonly OutlineEdge[] edges;

    private Outline(params OutlineEdge[] edges) => this.edges = edges;

    /// <summary>Highest point [m].</summary>
    public double Top { get; private init; }

    /// <summary>The outline of a shape, its lowest point at s = 0.</summary>
    /// <param name="shape">A shape without problems, see <see cref="PlaneArea.Validate"/>.</param>
    public static Outline Of(PlaneShape shape) => shape switch
    {
        CircleShape circle => new(new ArcEdge(new(0, circle.Diameter / 2), circle.Diameter / 2, 0, 2 * Math.PI)) { Top = circle.Diameter },
        SegmentShape segment => Segment(segment),
        TrapezoidShape t => Closed([new(-t.Bottom / 2, 0), new(t.Bottom / 2, 0), new(t.Top / 2, t.Height), new(-t.Top / 2, t.Height)]),
        PolygonShape polygon => Closed(FromLowest(polygon.Corners)),
        _ => throw new ArgumentOutOfRangeException(nameof(shape), shape, "is not a shape"),
    };

    /// <summary>Area and moments of what stands below a level.</summary>
    /// <param name="level">s of the level [m]; infinity for the whole.</param>
    public AreaMoments Below(double level)
    {
        var sum = default(AreaMoments);
        foreach (var edge in edges)
        {
            sum += edge.Below(level);
        }

        return sum.Area < 0 ? -1 * sum : sum;
    }

    /// <summary>The outline as points close together, for drawing.</summary>
    public IReadOnlyList<PlanePoint> Drawn() => [.. edges.SelectMany(edge => edge.Drawn())];

    private static Outline Segment(SegmentShape segment)
    {
        var radius = segment.Diameter / 2;
        var middle = segment.ChordBelow ? segment.Height - radius : radius;
        var chord = segment.ChordBelow ? 0 : segment.Height;
        var angle = Math.Asin((chord - middle) / radius);
        var (from, to) = segment.ChordBelow ? (angle, Math.PI - angle) : (Math.PI - angle, 2 * Math.PI + angle);
        var arc = new ArcEdge(new(0, middle), radius, from, to);
        return new(arc, new StraightEdge(arc.At(to), arc.At(from))) { Top = segment.Height };
    }

    private static Outline Closed(PlanePoint[] corners)
    {
        var edges = new List<OutlineEdge>();
        for (var i = 0; i < corners.Length; i++)
        {
            edges.Add(new StraightEdge(corners[i], corners[(i + 1) % corners.Length]));
        }

        return new([.. edges]) { Top = corners.Max(c => c.S) };
    }

    private static PlanePoint[] FromLowest(ValueList<PlanePoint> corners)
    {
        var lowest = corners.Min(c => c.S);
        return [.. corners.Select(c => c with { S = c.S - lowest })];
    }
}
