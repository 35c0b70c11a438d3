namespace FloodPanel.Documents.Drawings;

/// <summary>Dimensions of the section: water depth and freeboard in a chain, barrier height, rake.</summary>
internal static class SectionDimensions
{
    public static void Draw(Sketch sketch, DrawingInput input, SectionLayout layout, SectionWater water)
    {
        var (sheet, view) = (sketch.Sheet, layout.Projection);
        var edge = layout.Right + 0.6;
        var inner = layout.Right + 1.5 * sheet.TextSize;
        if (water.FloodSide is > 0 and var depth)
        {
            var label = water.IsDesignFlood
                ? new DimensionLabel(
                    FieldKeys.DesignStillWaterLevel, $"Retained depth {input.LengthWithUnit(depth)}",
                    [$"retained depth {input.Length(depth)}", input.Length(depth)], Overflow.Before)
                : new DimensionLabel(
                    FieldKeys.LogCount, $"Water depth {input.LengthWithUnit(depth)}",
                    [$"water depth {input.Length(depth)}", input.Length(depth)], Overflow.Before);
            sketch.Add(DimensionMarks.Vertical(sheet, label, view.SillY, layout.Shown(depth), inner, edge));
        }

        var freeboard = input.Project.Site.Freeboard;
        if (water.IsDesignFlood && freeboard > 0 && input.FloodHeight > 0)
        {
            var label = new DimensionLabel(
                FieldKeys.Freeboard, $"Freeboard {input.LengthWithUnit(freeboard)}",
                [$"freeboard {input.Length(freeboard)}", input.Length(freeboard)], Overflow.After);
            sketch.Add(DimensionMarks.Vertical(
                sheet, label, layout.Shown(input.FloodHeight), layout.Shown(input.RequiredHeight), inner, edge));
        }

        var height = input.Result.BarrierHeight;
        sketch.Add(DimensionMarks.Vertical(
            sheet,
            new DimensionLabel(
                FieldKeys.LogCount, $"Barrier height {input.LengthWithUnit(height)}",
                [$"barrier {input.Length(height)}", input.Length(height)], Overflow.After),
            view.SillY, layout.Shown(height), inner + sheet.Row, edge));
        if (input.Rake > 0)
        {
            DrawRake(sketch, input, layout);
        }
    }

    /// <summary>The vertical through the foot of the face, with the angle written above the top of the stack.</summary>
    private static void DrawRake(Sketch sketch, DrawingInput input, SectionLayout layout)
    {
        var (sheet, view) = (sketch.Sheet, layout.Projection);
        var top = layout.Shown(input.Result.BarrierHeight);
        var figure = Calculation.Units.Format(input.Opening.RakeDegrees, Calculation.Dimension.Degrees, input.Units);
        sketch.Add(new Mark(
            MarkKind.Dimension, $"Rake {figure} from the vertical", FieldKeys.Rake, null,
            [
                Sketch.Stroke(view.OriginX, view.SillY, view.OriginX, top, LineRole.Extension),
                new Text(
                    figure, new(layout.BarrierRight, top - 0.5 * sheet.TextSize), sheet.TextSize, TextAnchor.End, TextRole.Normal),
            ]));
    }
}
