using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A cover seen from the flood side, or from above where it lies flat: plate, fasteners, water line, and the pressure beside it.</summary>
public static class CoverDrawing
{
    private const int CircleCorners = 72;
    private const double Fastener = 0.75;

    /// <summary>Height kept for the dimension below the plate [mm].</summary>
    private const double Foot = 10.8;

    /// <summary>Width kept for the pressure beside the plate [mm].</summary>
    private const double DiagramRoom = 42;

    private static readonly Sheet Paper = new(140, 92, 3.0);

    /// <summary>Draws the cover.</summary>
    /// <param name="result">Its calculation.</param>
    /// <param name="site">Water at the site.</param>
    /// <param name="units">The reader's units.</param>
    public static Scene Draw(CoverResult result, Site site, UnitSystem units)
    {
        var frame = Frame.Of(result, units);
        var sketch = new Sketch(Paper);
        sketch.Add(Sketch.Box(0, 0, Paper.Width, frame.SheetHeight, FillRole.Paper, null));
        sketch.Add(DrawnView.TitleText(Paper, frame.IsFlat ? "Seen from above" : "Seen from the flood side"));
        sketch.Add(new Polygon(Outline(frame), FillRole.Post, null));
        Water(sketch, frame);
        Rim(sketch, frame);
        Worst(sketch, frame);
        Dimensions(sketch, frame);
        if (result.Depth > 0)
        {
            Pressure(sketch, frame, site.WaterDensity * Physics.Gravity);
        }

        var water = result.Depth > 0 ? $"{frame.Length(result.Depth)} of water above its lowest point" : "no water on it";
        return new Scene(
            "Cover", $"{result.Cover.Name}: {frame.Length(frame.Width)} by {frame.Length(frame.Height)}, {result.Fasteners} fasteners, {water}.",
            Paper.Width, frame.SheetHeight, frame.Scale, sketch.Shapes, []);
    }

    private static SheetPoint[] Outline(Frame frame)
    {
        if (frame.Result.Cover.Plate is RectangleCover)
        {
            return [frame.At(0, 0), frame.At(frame.Width, 0), frame.At(frame.Width, frame.Height), frame.At(0, frame.Height)];
        }

        var radius = frame.Width / 2;
        return
        [
            .. Enumerable.Range(0, CircleCorners).Select(i => Math.SinCos(2 * Math.PI * i / CircleCorners))
                .Select(c => frame.At(radius * (1 + c.Sin), radius * (1 + c.Cos))),
        ];
    }

    /// <summary>The water before an upright plate, up to a little above it.</summary>
    private static void Water(Sketch sketch, Frame frame)
    {
        if (frame.IsFlat || frame.Result.Depth <= 0)
        {
            return;
        }

        var u = Paper.TextSize;
        var shown = Math.Min(frame.Result.Depth, frame.Height + frame.Above);
        var (left, right, line) = (frame.At(0, 0).X - 2.2 * u, frame.At(frame.Width, 0).X + 2.2 * u, frame.At(0, shown).Y);
        var isOff = shown < frame.Result.Depth;
        sketch.Add(Sketch.Box(left, line, right, frame.At(0, 0).Y, FillRole.Water, null));
        sketch.Add(Sketch.Stroke(left, line, right, line, isOff ? LineRole.Hidden : LineRole.Water));
        sketch.Add(new Polygon([new(left + 1.2, line), new(left + 0.2, line - 1.8), new(left + 2.2, line - 1.8)], FillRole.WaterMark, null));
        var words = isOff ? $"water, {frame.Length(frame.Result.Depth - frame.Height)} above the upper edge" : "water";
        var from = shown < frame.Height ? frame.At(frame.Width, 0).X + 1.2 : left + 2.9;
        sketch.Add(new Text(words, new(from, line - 0.35 * u), Paper.SmallText, TextAnchor.Start, TextRole.Muted));
    }

    private static void Rim(Sketch sketch, Frame frame)
    {
        var outline = Outline(frame);
        if (frame.Result.Cover.Plate is RectangleCover { Support: RectangleSupport.ThreeEdges })
        {
            var free = frame.At(0, frame.Height);
            sketch.Add(new Polyline([outline[3], outline[0], outline[1], outline[2]], LineRole.Outline));
            sketch.Add(Sketch.Stroke(outline[3].X, outline[3].Y, outline[2].X, outline[2].Y, LineRole.Hidden));
            sketch.Add(new Text("free edge", new(free.X + 1.5, free.Y + 1.2 * Paper.TextSize), Paper.SmallText, TextAnchor.Start, TextRole.Muted));
        }
        else
        {
            sketch.Add(new Polygon(outline, null, LineRole.Outline));
        }

        foreach (var place in CoverRim.Of(frame.Result.Cover))
        {
            var (x, y) = (frame.At(place.Across, place.Up).X, frame.At(place.Across, place.Up).Y);
            sketch.Add(new Polygon([new(x - Fastener, y), new(x, y - Fastener), new(x + Fastener, y), new(x, y + Fastener)], FillRole.Ink, null));
        }
    }

    /// <summary>Where the plate bends most.</summary>
    private static void Worst(Sketch sketch, Frame frame)
    {
        if (frame.Result.Response is not { } plate)
        {
            return;
        }

        var at = frame.At(plate.MomentAcross, frame.Height - plate.MomentDown);
        sketch.Add(Sketch.Stroke(at.X - 1.5, at.Y, at.X + 1.5, at.Y, LineRole.Tick));
        sketch.Add(Sketch.Stroke(at.X, at.Y - 1.5, at.X, at.Y + 1.5, LineRole.Tick));
        if (frame.Width * frame.PerMetre > 26 && frame.Height * frame.PerMetre > 14)
        {
            var isLow = frame.At(0, 0).Y - at.Y < 2.5 * Paper.TextSize;
            sketch.Add(new Text("bends most", at with { Y = isLow ? at.Y - 2.2 : at.Y + 1.2 * Paper.TextSize + 1.2 }, Paper.SmallText, TextAnchor.Middle, TextRole.Muted));
        }
    }

    private static void Dimensions(Sketch sketch, Frame frame)
    {
        var u = Paper.TextSize;
        var (corner, other) = (frame.At(0, 0), frame.At(frame.Width, frame.Height));
        if (frame.Result.Cover.Plate is CircleCover)
        {
            sketch.Add(Across(CoverFields.Diameter));
            return;
        }

        sketch.Add(Across(CoverFields.Width));
        var x = corner.X - 3.2 * u;
        var label = new DimensionLabel(CoverFields.Height.Key, $"Height {frame.Length(frame.Height)}", [frame.Length(frame.Height)], Overflow.After);
        sketch.Add(DimensionMarks.Vertical(Paper, label, corner.Y, other.Y, x, corner.X - 0.8));

        Mark Across(Field field)
        {
            var words = new DimensionLabel(field.Key, $"{field.Label} {frame.Length(frame.Width)}", [frame.Length(frame.Width)], Overflow.After);
            return DimensionMarks.Horizontal(Paper, words, corner.X, other.X, corner.Y + 2.2 * u, corner.Y + 1);
        }
    }

    /// <summary>The unfactored pressure as it is calculated with, to its own scale.</summary>
    private static void Pressure(Sketch sketch, Frame frame, double unitWeight)
    {
        var u = Paper.TextSize;
        var (left, reach) = (Paper.Width - DiagramRoom + 3, DiagramRoom - 24);
        var (bottom, depth) = (frame.At(0, 0).Y, frame.Result.Depth);
        var wet = frame.IsFlat || frame.Result.Cover.Plate is CircleCover ? frame.Height : Math.Min(depth, frame.Height);
        var top = frame.IsFlat ? depth : Math.Max(0, depth - frame.Height);
        var end = frame.At(0, wet).Y;
        sketch.Add(new Polygon(
            [new(left, bottom), new(left + reach, bottom), new(left + reach * top / depth, end), new(left, end)], FillRole.Hydrostatic, LineRole.Hydrostatic));
        sketch.Add(Sketch.Stroke(left, frame.At(0, frame.Height).Y, left, bottom, LineRole.Outline));
        sketch.Add(new Text(frame.Pressure(unitWeight * depth), new(left + reach + 0.5 * u, bottom), u, TextAnchor.Start, TextRole.Normal));
        if (top > 0 && !frame.IsFlat && bottom - end > 2 * u)
        {
            sketch.Add(new Text(frame.Pressure(unitWeight * top), new(left + reach * top / depth + 0.5 * u, end + 0.8 * u), u, TextAnchor.Start, TextRole.Normal));
        }

        sketch.Add(new Text("pressure", new(left, bottom + 1.3 * u), Paper.SmallText, TextAnchor.Start, TextRole.Muted));
    }

    /// <summary>Where the plate stands on the sheet.</summary>
    private sealed record Frame(CoverResult Result, UnitSystem Units, double Width, double Height, int Scale, SheetPoint Corner)
    {
        public bool IsFlat => Result.Cover.Position == CoverPosition.Flat;

        public double PerMetre => DrawingScale.PerMetre(Scale);

        /// <summary>The sheet is no higher than what is drawn.</summary>
        public double SheetHeight => Corner.Y + Foot;

        /// <summary>Water shown above the plate at most [m].</summary>
        public double Above => 3 / PerMetre;

        public static Frame Of(CoverResult result, UnitSystem units)
        {
            var u = Paper.TextSize;
            var (width, height) = result.Cover.Plate switch
            {
                RectangleCover rectangle => (rectangle.Width, rectangle.Height),
                CircleCover circle => (circle.Diameter, circle.Diameter),
                _ => throw new ArgumentOutOfRangeException(nameof(result), result.Cover.Plate, "is not a plate"),
            };
            var (from, head) = (6.5 * u, 5.2 * u);
            var room = Paper.Width - DiagramRoom - from - 2.5 * u;
            var scale = DrawingScale.Fit(width, height, room, Paper.Height - Foot - head);
            var perMetre = DrawingScale.PerMetre(scale);
            return new(result, units, width, height, scale, new(from + (room - width * perMetre) / 2, head + height * perMetre));
        }

        /// <summary>A place measured from the lower left corner.</summary>
        public SheetPoint At(double across, double up) => new(Corner.X + across * PerMetre, Corner.Y - up * PerMetre);

        public string Length(double value) => Calculation.Units.Format(value, Dimension.Length, Units);

        public string Pressure(double value) => Calculation.Units.Format(value, Dimension.Pressure, Units);
    }
}
