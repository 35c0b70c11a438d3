using FloodPanel.Calculation;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Drawings;

/// <summary>Frame and title block at the foot of a sheet.</summary>
internal static class TitleBlock
{
    /// <summary>The frame, the block and the title of the view.</summary>
    /// <param name="sheet">The sheet.</param>
    /// <param name="height">Height of the sheet as drawn [mm].</param>
    /// <param name="input">The project, the opening, the revision and the units.</param>
    /// <param name="viewTitle">Title of the view.</param>
    /// <param name="scale">n in the scale 1:n.</param>
    public static IEnumerable<Shape> Draw(Sheet sheet, double height, DrawingInput input, string viewTitle, int scale)
    {
        var inset = 0.25;
        var top = height - sheet.TitleHeight;
        yield return Sketch.Box(inset, inset, sheet.Width - inset, height - inset, null, LineRole.Frame);
        yield return Sketch.Stroke(inset, top, sheet.Width - inset, top, LineRole.Dimension);
        yield return new Text(
            viewTitle, new(sheet.Margin, sheet.Margin + 0.75 * sheet.TextSize), sheet.TextSize, TextAnchor.Start, TextRole.Strong);

        var left = inset;
        foreach (var (heading, words, width) in Cells(sheet, input, scale))
        {
            if (left > inset)
            {
                yield return Sketch.Stroke(left, top, left, height - inset, LineRole.Extension);
            }

            var room = width - 2;
            yield return new Text(heading, new(left + 1, top + sheet.TinyText), sheet.TinyText, TextAnchor.Start, TextRole.Muted);
            yield return new Text(
                Wording.Shorten(words, FontFile.Regular, sheet.TextSize, room),
                new(left + 1, height - 0.26 * sheet.TitleHeight), sheet.TextSize, TextAnchor.Start, TextRole.Normal);
            left += width;
        }
    }

    private static IEnumerable<(string Heading, string Words, double Width)> Cells(Sheet sheet, DrawingInput input, int scale)
    {
        var unit = Calculation.Units.Of(Dimension.Length, input.Units).Symbol;
        var small = 4.6 * sheet.TextSize;
        var names = sheet.Width - 0.5 - 3 * small;
        yield return ("Project", input.Project.Name, 0.55 * names);
        yield return ("Opening", input.Opening.Name, 0.45 * names);
        yield return ("Scale", FormattableString.Invariant($"1:{scale}"), small);
        yield return ("Lengths", unit, small);
        yield return ("Revision", input.Revision, small);
    }
}
