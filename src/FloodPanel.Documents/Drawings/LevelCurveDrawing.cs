using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Documents.Drawings;

/// <summary>Levels over the Gumbel reduced variate: the known ones, the lines between them, the design probability.</summary>
public static class LevelCurveDrawing
{
    private static readonly Sheet Paper = new(90, 58, 4.0);

    /// <summary>Draws the curve.</summary>
    /// <param name="curve">The levels.</param>
    /// <param name="site">The site, whose design probability is marked.</param>
    /// <param name="units">The reader's units.</param>
    public static Scene Draw(LevelCurve curve, Site site, UnitSystem units)
    {
        var u = Paper.TextSize;
        var points = curve.Points.Select(p => (Y: LevelCurve.Variate(p.AnnualProbability), p.Level, p.AnnualProbability)).ToArray();
        var (low, high) = (points[0].Level, points[^1].Level);
        var rise = Math.Max(high - low, 0.01);
        var left = Paper.Margin + Sketch.Width(Figure(high), u, TextRole.Normal) + u;
        var (right, top, bottom) = (Paper.Width - 4 * u, Paper.Margin + 1.6 * u, Paper.Height - 3.2 * u);
        double X(double variate) => left + (right - left) * (variate - points[0].Y) / (points[^1].Y - points[0].Y);
        double Y(double level) => bottom - (bottom - top) * (level - low) / rise;
        var sketch = new Sketch(Paper);
        sketch.Add(Sketch.Box(0, 0, Paper.Width, Paper.Height, FillRole.Paper, null));
        sketch.Add(new Text($"Level [{Units.Of(Dimension.Length, units).Symbol}] by annual probability", new(Paper.Margin, Paper.Margin + 0.5 * u), 0.9 * u, TextAnchor.Start, TextRole.Muted));
        sketch.Add(Sketch.Stroke(left, bottom, right, bottom, LineRole.Dimension));
        foreach (var point in points)
        {
            Mark(sketch, new(X(point.Y), Y(point.Level)), bottom, Chance(point.AnnualProbability), Figure(point.Level), left);
        }

        sketch.Add(new Polyline([.. points.Select(p => new SheetPoint(X(p.Y), Y(p.Level)))], LineRole.Water));
        if (curve.At(site.AnnualProbability) is { } design)
        {
            var x = X(LevelCurve.Variate(site.AnnualProbability));
            sketch.Add(Sketch.Stroke(x, bottom, x, Y(design), LineRole.Hidden));
            sketch.Add(Sketch.Box(x - 1.1, Y(design) - 1.1, x + 1.1, Y(design) + 1.1, FillRole.WaterMark, null));
        }

        var description = $"{points.Length} known levels from {Figure(low)} to {Figure(high)}.";
        return new Scene("Known levels", description, Paper.Width, Paper.Height, 1, sketch.Shapes, []);

        string Figure(double level) => Units.FormatNumber(level, Dimension.Length, units);

        string Chance(double probability) => Units.FormatInput(probability, Dimension.Probability, units);
    }

    private static void Mark(Sketch sketch, SheetPoint at, double bottom, string chance, string level, double left)
    {
        var u = Paper.TextSize;
        sketch.Add(Sketch.Stroke(left, at.Y, at.X, at.Y, LineRole.Extension));
        sketch.Add(Sketch.Stroke(at.X, bottom, at.X, bottom + 0.4 * u, LineRole.Dimension));
        sketch.Add(Sketch.Box(at.X - 0.7, at.Y - 0.7, at.X + 0.7, at.Y + 0.7, FillRole.Ink, null));
        sketch.Add(new Text(chance, new(at.X, bottom + 1.6 * u), 0.9 * u, TextAnchor.Middle, TextRole.Normal));
        sketch.Add(new Text(level, new(left - 0.5 * u, at.Y + 0.35 * u), 0.9 * u, TextAnchor.End, TextRole.Normal));
    }
}
