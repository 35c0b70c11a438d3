using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Tests.Drawings;

/// <summary>Where the words of a scene stand, from the font's widths and its ascent and descent for digits and letters.</summary>
internal sealed record TextBox(string Words, double Left, double Top, double Right, double Bottom)
{
    /// <summary>Height of capitals and ascenders, and depth of descenders, in font sizes.</summary>
    private const double Ascent = 0.70;
    private const double Descent = 0.20;

    public static IReadOnlyList<TextBox> Of(Scene scene) => [.. Texts(scene.Shapes).Select(Box)];

    public bool Overlaps(TextBox other) =>
        Left < other.Right && other.Left < Right && Top < other.Bottom && other.Top < Bottom;

    public static IEnumerable<Text> Texts(IEnumerable<Shape> shapes) => shapes.SelectMany(s => s switch
    {
        Text text => [text],
        Mark mark => Texts(mark.Parts),
        _ => [],
    });

    private static TextBox Box(Text text)
    {
        var font = text.Role == TextRole.Strong ? FontFile.Semibold : FontFile.Regular;
        var width = font.Width(text.Words, text.Size);
        var start = text.Anchor switch { TextAnchor.Start => 0, TextAnchor.Middle => -width / 2, _ => -width };
        var (x, y) = text.Baseline;
        var (up, down) = (Ascent * text.Size, Descent * text.Size);
        return text.Upward
            ? new(text.Words, x - up, y - start - width, x + down, y - start)
            : new(text.Words, x + start, y - up, x + start + width, y + down);
    }
}
