namespace FloodPanel.Documents.Drawings;

/// <summary>A view before it has a frame: one sheet may hold several.</summary>
/// <param name="Title">Title of the view.</param>
/// <param name="Description">What is shown, in a sentence.</param>
/// <param name="Scale">n in the scale 1:n.</param>
/// <param name="Height">Height of the sheet that it needs [mm].</param>
/// <param name="Shapes">From back to front.</param>
internal sealed record DrawnView(string Title, string Description, int Scale, double Height, IReadOnlyList<Shape> Shapes)
{
    public string ScaleWords => FormattableString.Invariant($"1:{Scale}");

    /// <summary>The title of the view, at its upper left corner.</summary>
    public static Text TitleText(Sheet sheet, string title) => new(
        title, new(sheet.Margin, sheet.Margin + 0.75 * sheet.TextSize), sheet.TextSize, TextAnchor.Start, TextRole.Strong);

    /// <summary>The view on a sheet of its own.</summary>
    public Scene On(Sheet sheet, DrawingInput input, IReadOnlyList<Calculation.Actions.ActionKind> legend) => new(
        Title, Description, sheet.Width, Height, Scale,
        [
            Sketch.Box(0, 0, sheet.Width, Height, FillRole.Paper, null),
            .. Shapes,
            TitleText(sheet, Title),
            .. TitleBlock.Draw(sheet, Height, input, ScaleWords),
        ],
        legend);
}
