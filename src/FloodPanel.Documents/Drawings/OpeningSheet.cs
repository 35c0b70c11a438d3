namespace FloodPanel.Documents.Drawings;

/// <summary>Elevation and section of an opening side by side on one sheet, as in the owner's summary.</summary>
public static class OpeningSheet
{
    private const double ElevationShare = 0.645;

    /// <summary>Draws both views. The section shows no pressures: an owner has no use for them.</summary>
    /// <param name="input">What to draw.</param>
    /// <param name="sheet">The sheet; its height is the most that is used.</param>
    public static Scene Draw(DrawingInput input, Sheet sheet)
    {
        var left = sheet with { Width = ElevationShare * sheet.Width, Trim = true };
        var right = sheet with { Width = sheet.Width - left.Width, Trim = true };
        var height = Math.Max(
            ElevationDrawing.View(input, left).Height, SectionDrawing.View(input, "design-flood", right, false).Height);
        (left, right) = (left with { Height = height, Trim = false }, right with { Height = height, Trim = false });
        var elevation = ElevationDrawing.View(input, left);
        var section = SectionDrawing.View(input, "design-flood", right, false);
        IEnumerable<Shape> sectionShapes = [.. section.Shapes, Title(right, section)];
        return new Scene(
            $"{elevation.Title}; {section.Title.ToLowerInvariant()}", $"{elevation.Description} {section.Description}",
            sheet.Width, height, elevation.Scale,
            [
                Sketch.Box(0, 0, sheet.Width, height, FillRole.Paper, null),
                .. elevation.Shapes,
                Title(left, elevation),
                .. sectionShapes.Select(s => Moved.Right(s, left.Width)),
                .. TitleBlock.Draw(sheet, height, input, "as shown"),
            ],
            []);
    }

    private static Text Title(Sheet sheet, DrawnView view) =>
        DrawnView.TitleText(sheet, $"{view.Title}, {view.ScaleWords}");
}
