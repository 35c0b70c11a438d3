using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// The pressure diagram beside a section, to the section's own heights: pressures stacked by action to the left of
/// an axis that stands for the face, the resultant at the centre of pressure.
/// </summary>
internal static class PressureFigure
{
    /// <summary>Width of the pressures at their greatest, in text sizes.</summary>
    private const double Breadth = 8.6;

    /// <summary>Width that the figure needs [mm].</summary>
    public static double Width(Sheet sheet, DrawingInput input, CaseResult loadCase) =>
        Breadth * sheet.TextSize + RightOfAxis(sheet, input, loadCase);

    /// <summary>Height that the legend needs below the title of the view [mm].</summary>
    public static double LegendHeight(Sheet sheet, DrawingInput input, CaseResult loadCase) =>
        1.4 * sheet.TextSize * (loadCase.Actions.Count + (input.Rake > 0 ? 1 : 0));

    /// <summary>Name of an action, "hydrostatic".</summary>
    public static string Name(ActionKind kind) => kind switch
    {
        ActionKind.Hydrostatic => "hydrostatic",
        ActionKind.Flow => "flow",
        ActionKind.Wave => "wave",
        ActionKind.Debris => "debris",
        ActionKind.Wind => "wind",
        _ => "line load",
    };

    public static IEnumerable<Shape> Draw(Sheet sheet, DrawingInput input, CaseResult loadCase, Projection view, double right)
    {
        var (_, axis) = Reach(sheet, input, loadCase, right);
        var bands = PressureStack.Of(loadCase.Actions);
        var greatest = bands.SelectMany(b => b.Points).Select(p => Math.Max(p.Sum, p.Below)).DefaultIfEmpty(0).Max();
        var top = view.Y(input.Result.BarrierHeight);
        List<Shape> shapes = [.. Legend(sheet, input, loadCase, axis - Breadth * sheet.TextSize)];
        if (greatest > 0)
        {
            var perPascal = Breadth * sheet.TextSize / greatest;
            shapes.AddRange(bands.Select(b => Band(input, b, loadCase, view, axis, perPascal)));
            shapes.AddRange(Edge(bands[^1], view, axis, perPascal));
            shapes.Add(SillPressure(sheet, input, bands[^1], view, axis));
        }

        shapes.Add(Sketch.Stroke(axis, top, axis, view.SillY, LineRole.Outline));
        shapes.Add(Sketch.Stroke(axis - Breadth * sheet.TextSize, view.SillY, axis + 0.6, view.SillY, LineRole.Extension));
        if (loadCase.CentreOfPressure is { } centre)
        {
            shapes.Add(Resultant(sheet, input, loadCase, view, axis, centre, isSpread: greatest > 0));
        }
        else if (loadCase.Actions.All(a => a.Impact is null))
        {
            shapes.Add(new Text(
                "no load in this case", new(axis - 1, view.SillY - sheet.TextSize), sheet.SmallText, TextAnchor.End, TextRole.Muted));
        }

        foreach (var action in loadCase.Actions)
        {
            if (action.Impact is { } impact)
            {
                shapes.Add(Impact(sheet, input, action, view.Y(impact.Height), axis));
            }
        }

        return shapes;
    }

    /// <summary>Sheet x of the axis, and of the left edge of the pressures [mm].</summary>
    public static (double Left, double Axis) Reach(Sheet sheet, DrawingInput input, CaseResult loadCase, double right)
    {
        var axis = right - RightOfAxis(sheet, input, loadCase);
        return (axis - Breadth * sheet.TextSize, axis);
    }

    private static double RightOfAxis(Sheet sheet, DrawingInput input, CaseResult loadCase) => Math.Max(
        sheet.Row + 1.5,
        1.5 + Math.Max(
            Sketch.Width(ResultantFigure(input, loadCase), sheet.TextSize, TextRole.Strong),
            Sketch.Width("resultant", sheet.SmallText, TextRole.Muted)));

    private static string ResultantFigure(DrawingInput input, CaseResult loadCase) =>
        input.Format(loadCase.Resultant, Dimension.LineForce);

    private static IEnumerable<Shape> Legend(Sheet sheet, DrawingInput input, CaseResult loadCase, double left)
    {
        var y = sheet.Margin + 0.75 * sheet.TextSize;
        yield return new Text("Pressure, unfactored", new(left, y), sheet.TextSize, TextAnchor.Start, TextRole.Strong);
        var room = sheet.Width - sheet.Margin - left;
        foreach (var action in loadCase.Actions)
        {
            y += 1.4 * sheet.TextSize;
            var swatch = Sketch.Box(
                left, y - 0.72 * sheet.TextSize, left + 1.3 * sheet.TextSize, y + 0.05 * sheet.TextSize,
                Hatching.Fill(action.Kind), LineRole.Dimension);
            yield return swatch;
            yield return Hatching.Pressure(action.Kind, swatch.Points);
            yield return new Text(
                Name(action.Kind), new(left + 1.7 * sheet.TextSize, y), sheet.SmallText, TextAnchor.Start, TextRole.Normal);
            yield return new Text(
                Figure(input, action), new(left + room, y), sheet.SmallText, TextAnchor.End, TextRole.Normal);
        }

        if (input.Rake > 0)
        {
            y += 1.4 * sheet.TextSize;
            yield return new Text("normal to the raked face", new(left, y), sheet.SmallText, TextAnchor.Start, TextRole.Muted);
        }
    }

    /// <summary>Debris is a single force, everything else a force along the width.</summary>
    private static string Figure(DrawingInput input, ActionResult action) => action.Impact is { } impact
        ? input.Format(impact.Characteristic, Dimension.Force)
        : input.Format(action.Resultant, Dimension.LineForce);

    /// <summary>An impact as a broad arrow in the colour of its action, to tell it from the resultant of the pressures.</summary>
    private static Mark Impact(Sheet sheet, DrawingInput input, ActionResult action, double y, double axis)
    {
        var (tail, neck, half) = (axis - Breadth * sheet.TextSize, axis - 3.4, 0.55);
        var words = $"{Name(action.Kind)} {Figure(input, action)}";
        return new Mark(
            MarkKind.Action, $"{words} at this height on posts and guides", null, $"action-{Name(action.Kind)}",
            [
                new Polygon(
                    [
                        new(tail, y - half), new(neck, y - half), new(neck, y - 1.5), new(axis, y),
                        new(neck, y + 1.5), new(neck, y + half), new(tail, y + half),
                    ],
                    Hatching.Fill(action.Kind), LineRole.Dimension),
                new Text(words, new(tail, y - 1.4), sheet.SmallText, TextAnchor.Start, TextRole.Strong),
            ]);
    }

    private static Mark Band(
        DrawingInput input, StackBand band, CaseResult loadCase, Projection view, double axis, double perPascal)
    {
        SheetPoint[] corners =
        [
            .. band.Points.Select(p => new SheetPoint(axis - p.Below * perPascal, view.Y(p.Z))),
            .. band.Points.Reverse().Select(p => new SheetPoint(axis - p.Sum * perPascal, view.Y(p.Z))),
        ];
        var action = loadCase.Actions.First(a => a.Kind == band.Kind);
        return new Mark(
            MarkKind.Action, $"{Name(band.Kind)} {Figure(input, action)}", null, $"action-{Name(band.Kind).Replace(' ', '-')}",
            [
                new Polygon(corners, Hatching.Fill(band.Kind), Hatching.Line(band.Kind)),
                Hatching.Pressure(band.Kind, corners),
            ]);
    }

    /// <summary>The outer edge of the whole diagram.</summary>
    private static IEnumerable<Shape> Edge(StackBand outermost, Projection view, double axis, double perPascal)
    {
        var points = outermost.Points.Select(p => new SheetPoint(axis - p.Sum * perPascal, view.Y(p.Z))).ToArray();
        yield return new Polyline(
            [new(axis, points[0].Y), .. points, new(axis, points[^1].Y)], LineRole.Dimension);
    }

    private static Text SillPressure(Sheet sheet, DrawingInput input, StackBand outermost, Projection view, double axis)
    {
        var lowest = outermost.Points[0];
        var words = lowest.Z > 0 ? "" : $"{input.Format(lowest.Sum, Dimension.Pressure)} at the sill";
        return new Text(words, new(axis, view.SillY + 1.15 * sheet.TextSize), sheet.TextSize, TextAnchor.End, TextRole.Normal);
    }

    private static Mark Resultant(
        Sheet sheet, DrawingInput input, CaseResult loadCase, Projection view, double axis, double centre, bool isSpread)
    {
        var y = view.Y(centre);
        var tail = axis - (isSpread ? Breadth : 0.6 * Breadth) * sheet.TextSize;
        var figure = ResultantFigure(input, loadCase);
        var height = new DimensionLabel(
            null, $"Centre of pressure {input.LengthWithUnit(centre)} above the sill", [input.Length(centre)], Overflow.Before);
        return new Mark(
            MarkKind.Resultant, $"Resultant {figure}, {input.LengthWithUnit(centre)} above the sill", null, null,
            [
                Sketch.Stroke(tail, y, axis - 2, y, LineRole.Resultant),
                new Polygon([new(axis, y), new(axis - 2.8, y - 1), new(axis - 2.8, y + 1)], FillRole.Ink, null),
                new Text(
                    "resultant", new(axis + 1.2, y - 1.6 * sheet.TextSize), sheet.SmallText, TextAnchor.Start, TextRole.Muted),
                new Text(figure, new(axis + 1.2, y - 0.55 * sheet.TextSize), sheet.TextSize, TextAnchor.Start, TextRole.Strong),
                DimensionMarks.Vertical(sheet, height, view.SillY, y, axis + 0.85 * sheet.Row, axis + 0.6),
            ]);
    }
}
