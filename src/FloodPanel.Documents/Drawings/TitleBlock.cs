using FloodPanel.Calculation;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Drawings;

/// <summary>Frame and title block at the foot of a sheet.</summary>
internal static class TitleBlock
{
    /// <summary>The frame and the block.</summary>
    /// <param name="sheet">The sheet.</param>
    /// <param name="height">Height of the sheet as drawn [mm].</param>
    /// <param name="input">The project, the opening, the revision and the units.</param>
    /// <param name="scale">The scale in words, "1:50".</param>
    public static IEnumerable<Shape> Draw(Sheet sheet, double height, DrawingInput input, string scale)
    {
        var inset = 0.25;
        var top = height - sheet.TitleHeight;
        yield return Sketch.Box(inset, inset, sheet.Width - inset, height - inset, null, LineRole.Frame);
        yield return Sketch.Stroke(inset, top, sheet.Width - inset, top, LineRole.Dimension);
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

    private static IEnumerable<(string Heading, string Words, double Width)> Cells(Sheet sheet, DrawingInput input, string scale)
    {
        var unit = Calculation.Units.Of(Dimension.Length, input.Units).Symbol;
        double Small(string words) => Math.Max(4.6 * sheet.TextSize, 2.2 + Sketch.Width(words, sheet.TextSize, TextRole.Normal));
        var names = sheet.Width - 0.5 - Small(scale) - Small(unit) - Small(input.Revision);
        yield return ("Project", input.Project.Name, 0.55 * names);
        yield return ("Opening", input.Opening.Name, 0.45 * names);
        yield return ("Scale", scale, Small(scale));
        yield return ("Lengths", unit, Small(unit));
        yield return ("Revision", input.Revision, Small(input.Revision));
    }
}
