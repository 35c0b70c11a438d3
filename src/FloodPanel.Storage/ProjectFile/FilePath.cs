using System.Globalization;
using System.Text;
using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Paths and values of a file as they stand in messages: short, and always on one line.</summary>
internal static class FilePath
{
    private const int LongestExcerpt = 40;

    public static string Field(string parent, string name)
    {
        if (name.Length is 0 or > LongestExcerpt || !name.All(c => char.IsAsciiLetterOrDigit(c) || c is '_' or '-'))
        {
            return $"{parent}[{Quoted(name)}]";
        }

        return parent.Length == 0 ? name : $"{parent}.{name}";
    }

    public static string Item(string parent, int index) =>
        string.Create(CultureInfo.InvariantCulture, $"{parent}[{index}]");

    public static string Excerpt(JsonElement value) => value.ValueKind switch
    {
        JsonValueKind.Object => "an object",
        JsonValueKind.Array => "a list",
        JsonValueKind.String => Quoted(value.GetString()!),
        JsonValueKind.True => "true",
        JsonValueKind.False => "false",
        JsonValueKind.Null => "null",
        _ => Shortened(value.GetRawText()),
    };

    public static string Quoted(string text) => $"\"{Shortened(text)}\"";

    private static string Shortened(string text)
    {
        var shown = new StringBuilder();
        foreach (var rune in text.EnumerateRunes())
        {
            if (shown.Length >= LongestExcerpt)
            {
                return shown.Append('…').ToString();
            }

            shown.Append(IsPlain(rune) ? rune.ToString() : $"\\u{rune.Value:X4}");
        }

        return shown.ToString();
    }

    private static bool IsPlain(Rune rune) => Rune.GetUnicodeCategory(rune) is not (
        UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.LineSeparator
        or UnicodeCategory.ParagraphSeparator or UnicodeCategory.OtherNotAssigned or UnicodeCategory.PrivateUse);
}
