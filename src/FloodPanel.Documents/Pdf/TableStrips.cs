using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Pdf;

/// <summary>Lays a table out as strips: its head, and a strip for each row.</summary>
internal sealed class TableStrips
{
    private const double Size = 3.1;
    private const double Leading = 1.28;
    private const double Padding = 0.9;
    private const double Gutter = 3.4;
    private const int MostLines = 3;

    private readonly Table table;
    private readonly double left;
    private readonly double width;
    private readonly double[] starts;
    private readonly double[] widths;
    private readonly double[] fractions;

    public TableStrips(Paper paper, Table table)
    {
        this.table = table;
        (left, width) = (paper.Side, paper.ContentWidth);
        var shares = table.Columns.Sum(c => c.Share);
        widths = [.. table.Columns.Select(c => c.Share / shares * (width + Gutter) - Gutter)];
        starts = [.. widths.Select((_, i) => left + widths.Take(i).Sum(w => w + Gutter))];
        fractions = [.. table.Columns.Select((_, i) => table.Rows.Select(r => Fraction(r[i])).DefaultIfEmpty(0).Max())];
    }

    public IEnumerable<Strip> All()
    {
        var head = Head();
        yield return head with { StaysWithNext = true };
        for (var i = 0; i < table.Rows.Count; i++)
        {
            yield return Row(table.Rows[i], isLast: i == table.Rows.Count - 1) with { Head = head };
        }
    }

    private Strip Head()
    {
        var cells = table.Columns.Select((c, i) => Wording.Lines(c.Heading, FontFile.Semibold, Size, widths[i])).ToArray();
        int Lines(int i) => cells[i].Count + (table.Columns[i].Unit.Length > 0 ? 1 : 0);
        var lines = Enumerable.Range(0, cells.Length).Max(Lines);
        var height = lines * Size * Leading + Padding;
        return new Strip(
            height,
            (canvas, y) =>
            {
                for (var i = 0; i < cells.Length; i++)
                {
                    // Headings stand on the rule below them, their units between.
                    Cell(canvas, cells[i], i, y + (lines - Lines(i)) * Size * Leading, FontFile.Semibold, isHeading: true);
                    canvas.Words(
                        table.Columns[i].Unit, starts[i] + widths[i], y + (lines - 1) * Size * Leading + 0.95 * Size,
                        FontFile.Regular, Size, Ink.Muted, TextAnchor.End);
                }

                canvas.Line(left, y + height - 0.2, left + width, y + height - 0.2, Ink.Black, 0.35);
            });
    }

    private Strip Row(IReadOnlyList<string> row, bool isLast)
    {
        var cells = row.Select((text, i) => Wording.Lines(text, FontFile.Regular, Size, widths[i], MostLines)).ToArray();
        var height = Math.Max(1, cells.Max(c => c.Count)) * Size * Leading + 2 * Padding;
        return new Strip(
            height,
            (canvas, y) =>
            {
                for (var i = 0; i < cells.Length; i++)
                {
                    Cell(canvas, cells[i], i, y + Padding, FontFile.Regular, isHeading: false);
                }

                canvas.Line(left, y + height, left + width, y + height, isLast ? Ink.Black : Ink.Rule, isLast ? 0.35 : 0.13);
            });
    }

    private void Cell(Canvas canvas, IReadOnlyList<string> lines, int column, double top, FontFile font, bool isHeading)
    {
        var isNumber = table.Columns[column].IsNumber;
        for (var i = 0; i < lines.Count; i++)
        {
            var shift = isNumber && !isHeading ? fractions[column] - Fraction(lines[i]) : 0;
            var x = isNumber ? starts[column] + widths[column] - shift : starts[column];
            canvas.Words(
                lines[i], x, top + 0.95 * Size + i * Size * Leading, font, Size, Ink.Black,
                isNumber ? TextAnchor.End : TextAnchor.Start);
        }
    }

    /// <summary>Width of a number from its decimal point on.</summary>
    private static double Fraction(string number)
    {
        var point = number.IndexOf('.', StringComparison.Ordinal);
        return point < 0 ? 0 : FontFile.Regular.Width(number[point..], Size);
    }
}
