using FloodPanel.Calculation;
using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// The footing in section: barrier and water, dimensions, uplift under the base and, below it, the pressure of the
/// ground, for the case that presses hardest.
/// </summary>
public static class FootingDrawing
{
    private const double DiagramHeight = 9;

    private static readonly Sheet Paper = Sheet.Bench;

    /// <summary>Draws the footing of a barrier; nothing where there is none.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input)
    {
        if (input.Barrier.Footing is { } footing)
        {
            yield return Draw(input, footing);
        }
    }

    private static Scene Draw(DrawingInput input, FootingInput footing)
    {
        var u = Paper.TextSize;
        var depth = Math.Max(0, input.Result.RetainedDepth);
        var height = Math.Max(input.Result.BarrierHeight, depth);
        var below = footing.Thickness + footing.CutOff;
        var foot = 2.4 * u + 2 * (DiagramHeight + 1.6 * u) + Paper.TitleHeight + 0.7 * u;
        var (roomWide, roomHigh) = (Paper.Width - 26 * u, Paper.Height - 3 * u - foot);
        var scale = DrawingScale.Fit(footing.Width, height + below, roomWide, roomHigh);
        var perMetre = DrawingScale.PerMetre(scale);
        var view = new Projection((Paper.Width - footing.Width * perMetre) / 2, 3 * u + height * perMetre, perMetre);
        var sketch = new Sketch(Paper);
        var sheetHeight = view.Y(-below) + foot;
        Water(sketch, input, footing, view, depth);
        Concrete(sketch, input, footing, view);
        var diagrams = view.Y(-below) + 2.2 * u;
        Diagrams(sketch, input, footing, view, diagrams);
        Dimensions(sketch, input, footing, view);
        var state = State(input, footing);
        var description = $"Footing {input.LengthWithUnit(footing.Width)} wide and {input.LengthWithUnit(footing.Thickness)} thick; "
            + $"{input.LengthWithUnit(state.Contact)} of its base in contact in the design flood.";
        return new DrawnView("Footing, design flood", description, scale, sheetHeight, sketch.Shapes).On(Paper, input, []);
    }

    /// <summary>The footing in the design flood, as its checks find it.</summary>
    private static FootingStability State(DrawingInput input, FootingInput footing)
    {
        var result = input.Result.Cases[0];
        var (length, unit) = (input.Opening.ClearWidth, input.Project.Site.WaterDensity * Physics.Gravity);
        var horizontal = result.Resultant * Math.Cos(input.Rake) * length;
        var load = new FootingLoad(
            length, horizontal, horizontal * (result.CentreOfPressure ?? 0), unit,
            Math.Max(0, input.Result.RetainedDepth), Math.Min(input.Result.ProtectedDepth, Math.Max(0, input.Result.RetainedDepth)));
        return FootingStability.Of(footing, load);
    }

    private static void Water(Sketch sketch, DrawingInput input, FootingInput footing, Projection view, double depth)
    {
        var left = view.X(0) - 9 * Paper.TextSize;
        var right = view.X(footing.Width) + 6 * Paper.TextSize;
        var face = view.X(footing.BarrierFromFloodEdge);
        if (depth > 0)
        {
            sketch.Add(Sketch.Box(left, view.Y(depth), face, view.SillY, FillRole.Water, null));
            sketch.Add(Sketch.Stroke(left, view.Y(depth), face, view.Y(depth), LineRole.Water));
            var mark = left + 2 * Paper.TextSize;
            sketch.Add(new Polygon([new(mark, view.Y(depth)), new(mark - 1, view.Y(depth) - 1.8), new(mark + 1, view.Y(depth) - 1.8)], FillRole.WaterMark, null));
        }

        sketch.Add(Sketch.Stroke(left, view.SillY, view.X(0), view.SillY, LineRole.Ground));
        sketch.Add(Sketch.Stroke(view.X(footing.Width), view.SillY, right, view.SillY, LineRole.Ground));
        sketch.Add(Hatching.Earth(left, view.X(0) - 0.5, view.SillY));
        sketch.Add(Hatching.Earth(view.X(footing.Width) + 0.5, right, view.SillY));
        var thick = Math.Max(1, new LogSection(input).Depth * view.PerMetre);
        sketch.Add(Sketch.Box(face, view.Y(input.Result.BarrierHeight), face + thick, view.SillY, FillRole.Post, LineRole.Outline));
    }

    private static void Concrete(Sketch sketch, DrawingInput input, FootingInput footing, Projection view)
    {
        var box = Sketch.Box(view.X(0), view.SillY, view.X(footing.Width), view.Y(-footing.Thickness), FillRole.Wall, LineRole.Outline);
        sketch.Add(box);
        sketch.Add(Hatching.Concrete(box.Points));
        if (footing.CutOff > 0)
        {
            var x = view.X(0) + 0.8;
            sketch.Add(new Mark(
                MarkKind.Dimension, $"Cut-off {input.LengthWithUnit(footing.CutOff)}", FootingFields.CutOff.Key, null,
                [Sketch.Stroke(x, view.Y(-footing.Thickness), x, view.Y(-footing.Thickness - footing.CutOff), LineRole.Outline)]));
        }
    }

    /// <summary>Uplift and ground pressure, each to its own scale, with their greatest figures.</summary>
    private static void Diagrams(Sketch sketch, DrawingInput input, FootingInput footing, Projection view, double top)
    {
        var state = State(input, footing);
        var (load, left, right) = (state.Load, view.X(0), view.X(footing.Width));
        if (load.Depth > 0)
        {
            var (atEdge, atToe) = (load.UnitWeight * (load.Depth + footing.Thickness), load.UnitWeight * (load.Behind + footing.Thickness));
            var gap = view.X(footing.Width - state.Contact);
            Diagram(
                sketch, top, "uplift",
                [new(left, 1), new(gap, 1), new(right, atToe / atEdge)],
                [(left, TextAnchor.End, input.Format(atEdge, Dimension.Pressure)), (right, TextAnchor.Start, input.Format(atToe, Dimension.Pressure))]);
        }

        if (state.Vertical > 0 && state.ResultantFromToe > 0 && state.ResultantFromToe < footing.Width)
        {
            var pressure = BearingPressure.Of(state.Vertical / load.Length, state.ResultantFromToe, footing.Width);
            var (toe, heel) = state.ResultantFromToe <= footing.Width / 2 ? (pressure.Greatest, pressure.Least) : (pressure.Least, pressure.Greatest);
            var (from, to) = toe >= heel ? (view.X(footing.Width - pressure.Contact), right) : (left, view.X(pressure.Contact));
            var greatest = Math.Max(toe, heel);
            Diagram(
                sketch, top + DiagramHeight + 1.6 * Paper.TextSize, "ground",
                [new(from, heel / greatest), new(to, toe / greatest)],
                [(left, TextAnchor.End, input.Format(heel, Dimension.Pressure)), (right, TextAnchor.Start, input.Format(toe, Dimension.Pressure))]);
        }
    }

    /// <summary>Ordinates hang from a base line; their words stand beside it.</summary>
    private static void Diagram(
        Sketch sketch, double top, string name, SheetPoint[] ordinates, (double X, TextAnchor Anchor, string Words)[] figures)
    {
        var u = Paper.TextSize;
        SheetPoint[] outline =
        [
            new(ordinates[0].X, top), .. ordinates.Select(o => new SheetPoint(o.X, top + o.Y * DiagramHeight)), new(ordinates[^1].X, top),
        ];
        sketch.Add(new Polygon(outline, FillRole.Hydrostatic, LineRole.Hydrostatic));
        foreach (var (x, anchor, words) in figures)
        {
            var shift = anchor == TextAnchor.End ? -0.6 * u : 0.6 * u;
            sketch.Add(new Text(words, new(x + shift, top + u), u, anchor, TextRole.Normal));
        }

        sketch.Add(new Text(name, new(figures[0].X - 0.6 * u, top + 2.1 * u), Paper.SmallText, TextAnchor.End, TextRole.Muted));
    }

    private static void Dimensions(Sketch sketch, DrawingInput input, FootingInput footing, Projection view)
    {
        var u = Paper.TextSize;
        var (left, right, face) = (view.X(0), view.X(footing.Width), view.X(footing.BarrierFromFloodEdge));
        var row = view.Y(-footing.Thickness) + 1.7 * u;
        sketch.Add(DimensionMarks.Horizontal(
            Paper, Label(FootingFields.Width, footing.Width, input, Overflow.After), left, right, row, view.Y(-footing.Thickness) + 0.5));
        sketch.Add(DimensionMarks.Horizontal(
            Paper, Label(FootingFields.BarrierFromFloodEdge, footing.BarrierFromFloodEdge, input, Overflow.Before),
            left, face, view.SillY - 0.6 * u, view.SillY - 0.3));
        sketch.Add(DimensionMarks.Vertical(
            Paper, Label(FootingFields.Thickness, footing.Thickness, input, Overflow.After), view.Y(-footing.Thickness), view.SillY, right + 8 * u, right + 0.6));
    }

    private static DimensionLabel Label(Field field, double value, DrawingInput input, Overflow overflow) =>
        new(field.Key, $"{field.Label} {input.LengthWithUnit(value)}", [input.Length(value)], overflow);
}
