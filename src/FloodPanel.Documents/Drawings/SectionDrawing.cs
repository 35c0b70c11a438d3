using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;

namespace FloodPanel.Documents.Drawings;

/// <summary>Section through the barrier under one load case, flood side on the left, with the pressures beside it.</summary>
public static class SectionDrawing
{
    /// <summary>Draws the section.</summary>
    /// <param name="input">What to draw.</param>
    /// <param name="caseName">The load case, "design-flood".</param>
    /// <param name="sheet">The sheet; <see cref="Sheet.Bench"/> when null.</param>
    /// <param name="withPressures">False leaves the pressure diagram out.</param>
    /// <param name="withReadings">True for a screen: the diagram reads out height and pressure under the pointer.</param>
    public static Scene Draw(
        DrawingInput input, string caseName, Sheet? sheet = null, bool withPressures = true, bool withReadings = false)
    {
        var paper = sheet ?? Sheet.Bench;
        ActionKind[] legend = withPressures ? [.. Case(input, caseName).Actions.Select(a => a.Kind)] : [];
        return View(input, caseName, paper, withPressures, withReadings).On(paper, input, legend);
    }

    internal static DrawnView View(
        DrawingInput input, string caseName, Sheet paper, bool withPressures, bool withReadings = false)
    {
        var loadCase = Case(input, caseName);
        var water = SectionWater.In(input, caseName);
        var columnWidth = LevelMarks.ColumnWidth(paper, Levels(input, water, _ => 0));
        var layout = SectionLayout.For(input, water, withPressures ? loadCase : null, paper, columnWidth);
        var sketch = new Sketch(paper);
        SectionGround.Draw(sketch, layout);
        var stack = new LogSection(input);
        if (stack.Post(layout.Projection) is { } post)
        {
            sketch.Add(post);
        }

        sketch.Add(stack.Logs(layout.Projection));
        SectionGround.DrawWater(sketch, input, layout, water, stack);
        DrawTops(sketch, input, layout);
        SectionDimensions.Draw(sketch, input, layout, water);
        sketch.Add(LevelMarks.Column(
            paper, Levels(input, water, layout.Shown), layout.Left, -1,
            Math.Min(layout.Top, layout.Bottom - 5.5 * 1.32 * paper.TextSize), layout.Bottom + 1.3 * paper.TextSize));
        if (withPressures)
        {
            sketch.Add(PressureFigure.Draw(paper, input, loadCase, layout.Projection, layout.FigureRight));
            if (withReadings)
            {
                sketch.Add(PressureReadings.Draw(paper, input, loadCase, layout.Projection, layout.FigureRight));
            }
        }

        var title = $"Section, {CaseNames.InWords(caseName)}";
        return new DrawnView(title, Describe(input, loadCase), layout.Scale, layout.Height, sketch.Shapes);
    }

    private static CaseResult Case(DrawingInput input, string name) =>
        input.Result.Cases.FirstOrDefault(c => c.Name == name)
        ?? throw new ArgumentException($"The opening has no load case {name}.", nameof(name));

    /// <summary>Thin lines that carry the top of the barrier and the top required across to the barrier.</summary>
    private static void DrawTops(Sketch sketch, DrawingInput input, SectionLayout layout)
    {
        foreach (var z in new[] { input.Result.BarrierHeight, input.RequiredHeight })
        {
            var y = layout.Shown(z);
            sketch.Add(Sketch.Stroke(layout.Left, y, layout.BarrierRight, y, LineRole.Extension));
        }
    }

    private static Level[] Levels(DrawingInput input, SectionWater water, Func<double, double> y)
    {
        var reach = SectionLayout.Reach(input, water);
        Level Mark(double z, string name, string? field, bool isWater = false) =>
            LevelMarks.Level(input, reach, y, z, name, field, isWater);
        return
        [
            Mark(input.RequiredHeight, "required top", FieldKeys.Freeboard),
            Mark(input.Result.BarrierHeight, "barrier top", FieldKeys.LogCount),
            Mark(input.FloodHeight, "design flood", FieldKeys.DesignStillWaterLevel, water.IsDesignFlood),
            Mark(0, "sill", FieldKeys.SillLevel),
            Mark(input.GroundHeight, "outside ground", FieldKeys.GroundLevel),
        ];
    }

    private static string Describe(DrawingInput input, CaseResult loadCase)
    {
        var resultant = loadCase.CentreOfPressure is { } centre
            ? $"The unfactored resultant is {input.Format(loadCase.Resultant, Dimension.LineForce)}, "
                + $"{input.LengthWithUnit(centre)} above the sill."
            : "There is no load in this case.";
        return $"{input.Opening.Name}, {input.LogCount} logs, {input.LengthWithUnit(input.Result.BarrierHeight)} high. {resultant}";
    }
}
