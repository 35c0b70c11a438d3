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
}
