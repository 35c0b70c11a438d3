namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>One edge of an outline.</summary>
internal abstract record OutlineEdge
{
    /// <summary>∮f ds along the parts of the edge that stand below a level.</summary>
    public abstract AreaMoments Below(double level);

    /// <summary>Points along the edge, its end left to the next.</summary>
    public abstract IEnumerable<PlanePoint> Drawn();
}

/// <summary>A straight edge.</summary>
internal sealed record StraightEdge(PlanePoint From, PlanePoint To) : OutlineEdge
{
    private static readonly double[] Points = [-Math.Sqrt(0.6), 0, Math.Sqrt(0.6)];
    private static readonly double[] Weights = [5.0 / 18, 8.0 / 18, 5.0 / 18];

    /// <summary>Gauss's rule of three points: exact to the fifth degree, of which x²·s takes three.</summary>
    public override AreaMoments Below(double level)
    {
        var (from, to) = (PartAt(From.S, level), PartAt(To.S, level));
        if (From.S >= level && To.S >= level)
        {
            return default;
        }

        var (start, end) = (From.S > level ? from : 0, To.S > level ? to : 1);
        var rise = (To.S - From.S) * (end - start);
        var sum = default(AreaMoments);
        for (var i = 0; i < Points.Length; i++)
        {
            var part = start + (end - start) * (1 + Points[i]) / 2;
            var (x, s) = (From.X + part * (To.X - From.X), From.S + part * (To.S - From.S));
            sum += Weights[i] * rise * new AreaMoments(x, x * x / 2, x * s, x * s * s, x * x * s / 2);
        }

        return sum;
    }

    public override IEnumerable<PlanePoint> Drawn() => [From];

    /// <summary>Where along the edge, from 0 to 1, it crosses the level.</summary>
    private double PartAt(double s, double level) => s > level && From.S != To.S ? (level - From.S) / (To.S - From.S) : 0;
}

/// <summary>An arc, run through against the clock from one angle to another, measured from the x axis.</summary>
internal sealed record ArcEdge(PlanePoint Middle, double Radius, double From, double To) : OutlineEdge
{
    private const int DrawnPoints = 96;

    public PlanePoint At(double angle) => new(Middle.X + Radius * Math.Cos(angle), Middle.S + Radius * Math.Sin(angle));

    public override AreaMoments Below(double level)
    {
        var ends = new List<double> { From, To };
        var sine = (level - Middle.S) / Radius;
        if (sine is > -1 and < 1)
        {
            var angle = Math.Asin(sine);
            for (var turn = -1; turn <= 1; turn++)
            {
                ends.Add(angle + 2 * Math.PI * turn);
                ends.Add(Math.PI - angle + 2 * Math.PI * turn);
            }
        }

        var inside = ends.Where(a => a >= From && a <= To).Order().ToArray();
        var sum = default(AreaMoments);
        for (var i = 1; i < inside.Length; i++)
        {
            if (At((inside[i - 1] + inside[i]) / 2).S < level)
            {
                sum += Integral(inside[i]) + -1 * Integral(inside[i - 1]);
            }
        }

        return sum;
    }

    public override IEnumerable<PlanePoint> Drawn() =>
        Enumerable.Range(0, DrawnPoints).Select(i => At(From + (To - From) * i / DrawnPoints));

    /// <summary>Antiderivatives of x·ds and the others with x = c_x + r·cos φ, s = c_s + r·sin φ, ds = r·cos φ dφ.</summary>
    private AreaMoments Integral(double angle)
    {
        var (cx, cs, r) = (Middle.X, Middle.S, Radius);
        var (sin, cos) = Math.SinCos(angle);
        var c = sin;
        var cc = angle / 2 + Math.Sin(2 * angle) / 4;
        var ccc = sin - sin * sin * sin / 3;
        var cn = sin * sin / 2;
        var cnn = sin * sin * sin / 3;
        var ccn = -cos * cos * cos / 3;
        var ccnn = angle / 8 - Math.Sin(4 * angle) / 32;
        var cccn = -cos * cos * cos * cos / 4;
        return new(
            r * cx * c + r * r * cc,
            r / 2 * (cx * cx * c + 2 * cx * r * cc + r * r * ccc),
            r * cx * (cs * c + r * cn) + r * r * (cs * cc + r * ccn),
            r * cx * (cs * cs * c + 2 * cs * r * cn + r * r * cnn) + r * r * (cs * cs * cc + 2 * cs * r * ccn + r * r * ccnn),
            r / 2 * (cx * cx * (cs * c + r * cn) + 2 * cx * r * (cs * cc + r * ccn) + r * r * (cs * ccc + r * cccn)));
    }
}
