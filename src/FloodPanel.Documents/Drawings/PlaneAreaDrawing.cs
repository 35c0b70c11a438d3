using FloodPanel.Calculation;
using FloodPanel.Calculation.PlaneAreas;

namespace FloodPanel.Documents.Drawings;

/// <summary>A plane area as it is seen at right angles to its plane: outline, water line, centroid, centre of pressure.</summary>
public static class PlaneAreaDrawing
{
    private static readonly Sheet Paper = new(120, 96, 3.2);

    /// <summary>Draws the area.</summary>
    /// <param name="input">The area.</param>
    /// <param name="result">Its load.</param>
    /// <param name="units">The reader's units.</param>
    public static Scene Draw(PlaneAreaInput input, PlaneAreaResult result, UnitSystem units)
    {
        var u = Paper.TextSize;
        var points = Outline.Of(input.Shape).Drawn();
        var (left, right) = (points.Min(p => p.X), points.Max(p => p.X));
        var top = points.Max(p => p.S);
        var shownTop = Math.Min(Math.Max(top, result.WaterLine), 1.6 * top);
        var (room, head) = (Paper.Width - 18 * u, 3.4 * u);
        var scale = DrawingScale.Fit(right - left, shownTop, room, Paper.Height - head - 3 * u);
        var perMetre = DrawingScale.PerMetre(scale);
        var middle = Paper.Width / 2 - (left + right) / 2 * perMetre;
        var bottom = Paper.Height - 2 * u;
        SheetPoint At(PlanePoint p) => new(middle + p.X * perMetre, bottom - p.S * perMetre);
        var sketch = new Sketch(Paper);
        sketch.Add(Sketch.Box(0, 0, Paper.Width, Paper.Height, FillRole.Paper, null));
        sketch.Add(DrawnView.TitleText(Paper, "Seen at right angles to the plane"));
        sketch.Add(new Polygon([.. points.Select(At)], FillRole.Log, null));
        sketch.Add(new Polygon([.. Below(points, result.WaterLine).Select(At)], FillRole.Water, null));
        sketch.Add(new Polygon([.. points.Select(At)], null, LineRole.Outline));
        WaterLine(sketch, result, shownTop, p => At(p).Y, At(new(left, 0)).X - 4 * u, At(new(right, 0)).X + 4 * u);
        Cross(sketch, At(result.Centroid), "centroid", At(new(right, 0)).X + u, LineRole.Dimension);
        Centre(sketch, At(result.CentreOfPressure), $"centre of pressure, {Units.Format(result.CentreOfPressureDepth, Dimension.Length, units)} deep", At(new(left, 0)).X - u);
        var description = $"Force {Units.Format(result.Force, Dimension.Force, units)} at {Units.Format(result.CentreOfPressureDepth, Dimension.Length, units)} below the water.";
        return new Scene("Plane area", description, Paper.Width, Paper.Height, scale, sketch.Shapes, []);
    }

    private static void WaterLine(Sketch sketch, PlaneAreaResult result, double shownTop, Func<PlanePoint, double> y, double from, double to)
    {
        var u = Paper.TextSize;
        var isOff = result.WaterLine > shownTop + 1e-9;
        var line = y(new(0, Math.Min(result.WaterLine, shownTop)));
        sketch.Add(Sketch.Stroke(from, line, to, line, LineRole.Water));
        sketch.Add(new Polygon([new(from, line), new(from - 1, line - 1.8), new(from + 1, line - 1.8)], FillRole.WaterMark, null));
        sketch.Add(new Text(isOff ? "water, off scale" : "water", new(to, line - 0.4 * u), Paper.SmallText, TextAnchor.End, TextRole.Muted));
    }

    private static void Cross(Sketch sketch, SheetPoint at, string words, double wordsX, LineRole role)
    {
        sketch.Add(Sketch.Stroke(at.X - 1.5, at.Y, at.X + 1.5, at.Y, role));
        sketch.Add(Sketch.Stroke(at.X, at.Y - 1.5, at.X, at.Y + 1.5, role));
        sketch.Add(Sketch.Stroke(at.X + 1.5, at.Y, wordsX - 0.5, at.Y, LineRole.Extension));
        sketch.Add(new Text(words, new(wordsX, at.Y + 0.3 * Paper.TextSize), Paper.SmallText, TextAnchor.Start, TextRole.Muted));
    }

    private static void Centre(Sketch sketch, SheetPoint at, string words, double wordsX)
    {
        sketch.Add(new Polygon([new(at.X - 1.1, at.Y), new(at.X, at.Y - 1.1), new(at.X + 1.1, at.Y), new(at.X, at.Y + 1.1)], FillRole.Ink, null));
        sketch.Add(Sketch.Stroke(wordsX + 0.5, at.Y, at.X - 1.1, at.Y, LineRole.Extension));
        var half = words.IndexOf(',', StringComparison.Ordinal) + 1;
        sketch.Add(new Text(words[..half], new(wordsX, at.Y - 0.2 * Paper.TextSize), Paper.SmallText, TextAnchor.End, TextRole.Strong));
        sketch.Add(new Text(words[half..].TrimStart(), new(wordsX, at.Y + 0.85 * Paper.TextSize), Paper.SmallText, TextAnchor.End, TextRole.Strong));
    }

    /// <summary>The part of an outline below a level, for its tint.</summary>
    private static IEnumerable<PlanePoint> Below(IReadOnlyList<PlanePoint> points, double level)
    {
        for (var i = 0; i < points.Count; i++)
        {
            var (from, to) = (points[i], points[(i + 1) % points.Count]);
            if (from.S <= level)
            {
                yield return from;
            }

            if (from.S <= level != to.S <= level)
            {
                yield return new(from.X + (to.X - from.X) * (level - from.S) / (to.S - from.S), level);
            }
        }
    }
}
