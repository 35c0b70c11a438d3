namespace FloodPanel.Documents.Drawings;

/// <summary>Moves shapes on the sheet.</summary>
internal static class Moved
{
    /// <summary>The shape, further to the right.</summary>
    public static Shape Right(Shape shape, double by)
    {
        SheetPoint Point(SheetPoint p) => p with { X = p.X + by };
        return shape switch
        {
            Line line => line with { From = Point(line.From), To = Point(line.To) },
            Polyline run => run with { Points = [.. run.Points.Select(Point)] },
            Polygon area => area with { Points = [.. area.Points.Select(Point)] },
            Hatch hatch => hatch with { Segments = [.. hatch.Segments.Select(s => new Segment(Point(s.From), Point(s.To)))] },
            Text text => text with { Baseline = Point(text.Baseline) },
            Mark mark => mark with { Parts = [.. mark.Parts.Select(p => Right(p, by))] },
            _ => throw new InvalidOperationException($"The shape {shape.GetType().Name} cannot be moved."),
        };
    }
}
