namespace FloodPanel.Documents.Drawings;

/// <summary>Elevation and section of an opening side by side on one sheet, as in the owner's summary.</summary>
public static class OpeningSheet
{
    // Widths that the elevation may have. A section that leans, or with water on both sides, needs more than the rest of the usual one.
    private static readonly double[] ElevationShares = [0.645, 0.6, 0.55, 0.5];

    /// <summary>Draws both views. The section shows no pressures: an owner has no use for them.</summary>
    /// <param name="input">What to draw.</param>
    /// <param name="sheet">The sheet; its height is the most that is used.</param>
    public static Scene Draw(DrawingInput input, Sheet sheet)
    {
        var (left, right) = ElevationShares.Select(share => Split(sheet, share)).MinBy(halves => Smallness(input, halves.Left, halves.Right));
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

    private static (Sheet Left, Sheet Right) Split(Sheet sheet, double share) =>
        (sheet with { Width = share * sheet.Width, Trim = true }, sheet with { Width = (1 - share) * sheet.Width, Trim = true });

    /// <summary>How small both views come out: the product of their n in 1:n.</summary>
    private static double Smallness(DrawingInput input, Sheet left, Sheet right) =>
        (double)ElevationDrawing.View(input, left).Scale * SectionDrawing.View(input, "design-flood", right, false).Scale;

    private static Text Title(Sheet sheet, DrawnView view) =>
        DrawnView.TitleText(sheet, $"{view.Title}, {view.ScaleWords}");
}
