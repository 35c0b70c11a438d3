using System.Text;

namespace FloodPanel.Documents.Typography;

/// <summary>Makes words that users typed fit to be printed.</summary>
public static class Wording
{
    private const string Ellipsis = "…";

    /// <summary>One line without control characters, unpaired surrogates or runs of spaces.</summary>
    /// <param name="text">As typed.</param>
    public static string OneLine(string text)
    {
        var clean = new StringBuilder(text.Length);
        foreach (var rune in text.EnumerateRunes())
        {
            var blank = Rune.IsWhiteSpace(rune) || Rune.IsControl(rune) || rune.Value is 0xFFFE or 0xFFFF;
            if (!blank)
            {
                clean.Append(rune.ToString());
            }
            else if (clean.Length > 0 && clean[^1] != ' ')
            {
                clean.Append(' ');
            }
        }

        return clean.ToString().TrimEnd();
    }

    /// <summary>The text, or as much of it as fits, ending in an ellipsis.</summary>
    /// <param name="text">The words.</param>
    /// <param name="font">The font.</param>
    /// <param name="size">Font size.</param>
    /// <param name="width">Room, in the unit of the size.</param>
    public static string Shorten(string text, FontFile font, double size, double width)
    {
        var line = OneLine(text);
        if (font.Width(line, size) <= width)
        {
            return line;
        }

        var kept = new StringBuilder();
        var used = font.Width(Ellipsis, size);
        foreach (var rune in line.EnumerateRunes())
        {
            used += font.Width(rune.ToString(), size);
            if (used > width)
            {
                break;
            }

            kept.Append(rune.ToString());
        }

        return kept.Length == 0 ? "" : kept.ToString().TrimEnd() + Ellipsis;
    }

    /// <summary>The text in lines that fit; words too long for a line are broken, what does not fit in the last line is cut.</summary>
    /// <param name="text">The words.</param>
    /// <param name="font">The font.</param>
    /// <param name="size">Font size.</param>
    /// <param name="width">Room, in the unit of the size.</param>
    /// <param name="most">Greatest number of lines.</param>
    public static IReadOnlyList<string> Lines(string text, FontFile font, double size, double width, int most = int.MaxValue)
    {
        var lines = new List<string>();
        var rest = OneLine(text);
        while (rest.Length > 0 && lines.Count < most)
        {
            var line = lines.Count == most - 1 ? Shorten(rest, font, size, width) : FirstLine(rest, font, size, width);
            lines.Add(line);
            rest = lines.Count == most ? "" : rest[line.Length..].TrimStart();
        }

        return lines;
    }

    private static string FirstLine(string text, FontFile font, double size, double width)
    {
        var (end, breakAt, used) = (0, 0, 0.0);
        foreach (var rune in text.EnumerateRunes())
        {
            used += font.Width(rune.ToString(), size);
            if (used > width && end > 0)
            {
                return text[..(breakAt > 0 && rune.Value != ' ' ? breakAt : end)].TrimEnd();
            }

            end += rune.Utf16SequenceLength;
            breakAt = rune.Value is ' ' or '-' ? end : breakAt;
        }

        return text;
    }
}
