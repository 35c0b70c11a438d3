using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Pdf;

/// <summary>Lays blocks out as strips.</summary>
internal sealed class BlockStrips(Paper paper)
{
    private const double Body = 3.35;
    private const double Small = 2.9;
    private const double Leading = 1.36;

    private double Left => paper.Side;

    private double Width => paper.ContentWidth;

    public IEnumerable<Strip> Of(Block block) => block switch
    {
        Heading heading => Heading(heading),
        Paragraph paragraph => Paragraph(paragraph),
        Facts facts => FactsOf(facts),
        Table table => new TableStrips(paper, table).All(),
        Figure figure => [FigureOf(figure)],
        VerdictLine verdict => [VerdictStrip.Of(verdict, Left, Width, Body, Leading)],
        SignatureLines signature => [Signature(signature)],
        Together together => Joined([.. together.Blocks.SelectMany(Of)]),
        _ => throw new InvalidOperationException($"The block {block.GetType().Name} has no layout."),
    };

    private static IEnumerable<Strip> Joined(IReadOnlyList<Strip> strips) =>
        strips.Select((strip, i) => i == strips.Count - 1 ? strip : strip with { StaysWithNext = true });

    private IEnumerable<Strip> Heading(Heading heading)
    {
        var (size, before, after, most) = heading.Level switch { 1 => (6.4, 0.0, 1.8, 3), 2 => (4.3, 4.4, 1.4, 2), _ => (3.7, 3.0, 1.0, 2) };
        var lines = Wording.Lines(heading.Words, FontFile.Semibold, size, Width, most);
        return lines.Select((line, i) => new Strip(
            size * 1.22 + (i == lines.Count - 1 ? after : 0),
            (canvas, y) => canvas.Words(line, Left, y + 0.92 * size, FontFile.Semibold, size, Ink.Black))
        {
            SpaceBefore = i == 0 ? before : 0,
            StaysWithNext = true,
        });
    }

    private IEnumerable<Strip> Paragraph(Paragraph paragraph) => paragraph.Kind switch
    {
        ParagraphKind.Strong => [Boxed(paragraph.Words)],
        ParagraphKind.Item => [Item(paragraph.Words)],
        _ => Plain(paragraph),
    };

    private IEnumerable<Strip> Plain(Paragraph paragraph)
    {
        var isMuted = paragraph.Kind == ParagraphKind.Muted;
        var (size, color) = isMuted ? (Small, Ink.Muted) : (Body, Ink.Black);
        var lines = Wording.Lines(paragraph.Words, FontFile.Regular, size, Width);
        return lines.Select((line, i) => new Strip(
            size * Leading + (i == lines.Count - 1 ? 1.6 : 0),
            (canvas, y) => canvas.Words(line, Left, y + size, FontFile.Regular, size, color))
        {
            // Neither the first nor the last line stands alone.
            StaysWithNext = i < lines.Count - 1 && (i == 0 || i == lines.Count - 2),
        });
    }

    private Strip Item(string words)
    {
        const double indent = 4.2;
        var lines = Wording.Lines(words, FontFile.Regular, Body, Width - indent);
        return new Strip(
            lines.Count * Body * Leading + 0.4,
            (canvas, y) =>
            {
                canvas.Line(Left + 0.4, y + 0.68 * Body, Left + 2.2, y + 0.68 * Body, Ink.Muted, 0.35);
                Lines(canvas, lines, Left + indent, y, FontFile.Regular);
            });
    }

    private Strip Boxed(string words)
    {
        const double indent = 4.2;
        var lines = Wording.Lines(words, FontFile.Semibold, Body, Width - indent);
        var height = lines.Count * Body * Leading;
        return new Strip(
            height + 2,
            (canvas, y) =>
            {
                canvas.Area(Left, y, 1.1, height + 0.4, Ink.Warning);
                Lines(canvas, lines, Left + indent, y, FontFile.Semibold);
            })
        {
            SpaceBefore = 4,
        };
    }

    /// <summary>Short facts stand two to a line, the others take a line of their own.</summary>
    private IEnumerable<Strip> FactsOf(Facts facts)
    {
        const double nameWidth = 22;
        var column = (Width - 6) / 2;
        var rows = facts.Rows.Where(f => !string.IsNullOrWhiteSpace(f.Value)).ToArray();
        for (var i = 0; i < rows.Length; i++)
        {
            bool IsShort(int at) => FontFile.Regular.Width(Wording.OneLine(rows[at].Value), Body) <= column - nameWidth;
            var isPair = i + 1 < rows.Length && IsShort(i) && IsShort(i + 1);
            var left = FactAt(rows[i], Left, nameWidth, isPair ? column - nameWidth : Width - nameWidth);
            var right = isPair ? FactAt(rows[++i], Left + column + 6, nameWidth, column - nameWidth) : null;
            yield return right is null ? left : new Strip(left.Height, left.Draw + right.Draw);
        }
    }

    private static Strip FactAt((string Name, string Value) fact, double left, double nameWidth, double room)
    {
        var lines = Wording.Lines(fact.Value, FontFile.Regular, Body, room, 3);
        return new Strip(
            lines.Count * Body * Leading,
            (canvas, y) =>
            {
                canvas.Words(fact.Name, left, y + Body, FontFile.Regular, Body, Ink.Muted);
                Lines(canvas, lines, left + nameWidth, y, FontFile.Regular);
            });
    }

    private Strip FigureOf(Figure figure) => new(
        figure.Scene.Height + 1,
        (canvas, y) => PdfSceneWriter.Draw(canvas, figure.Scene, Left, y))
    {
        SpaceBefore = 1.2,
    };

    private Strip Signature(SignatureLines signature)
    {
        const double gap = 6;
        const double room = 11;
        var (nameWidth, signWidth) = (0.36 * Width, 0.38 * Width);
        var dateWidth = Width - nameWidth - signWidth - 2 * gap;
        (string Caption, double Start, double Width)[] lines =
        [
            ("Responsible engineer", Left, nameWidth),
            ("Signature", Left + nameWidth + gap, signWidth),
            ("Date", Left + Width - dateWidth, dateWidth),
        ];
        var name = Wording.Shorten(signature.Name, FontFile.Regular, Body, nameWidth);
        return new Strip(
            room + 5,
            (canvas, y) =>
            {
                canvas.Words(name, Left, y + room - 1.4, FontFile.Regular, Body, Ink.Black);
                foreach (var (caption, start, width) in lines)
                {
                    canvas.Line(start, y + room, start + width, y + room, Ink.Black, 0.25);
                    canvas.Words(caption, start, y + room + 3.6, FontFile.Regular, Small, Ink.Muted);
                }
            });
    }

    private static void Lines(Canvas canvas, IReadOnlyList<string> lines, double x, double y, FontFile font)
    {
        for (var i = 0; i < lines.Count; i++)
        {
            canvas.Words(lines[i], x, y + Body + i * Body * Leading, font, Body, Ink.Black);
        }
    }
}
