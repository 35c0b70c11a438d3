using System.Buffers;
using System.Text;
using System.Text.Json;
using System.Text.Unicode;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>
/// Finds what keeps bytes from being JSON that can be read safely, and says where. Done before the document is
/// built, because the parser's own messages neither name the field nor speak to an engineer.
/// </summary>
internal static class SyntaxScan
{
    /// <summary>Far above any project; keeps a wrong file from filling the memory.</summary>
    public const int LargestFile = 4 * 1024 * 1024;

    private const int DeepestNesting = 32;

    private static readonly SearchValues<byte> Delimiters = SearchValues.Create(",:[]{}\" \t\r\n"u8);

    public static FileProblem? FirstProblem(ReadOnlySpan<byte> utf8)
    {
        if (NotText(utf8) is { } reason)
        {
            return new FileProblem("", reason);
        }

        var place = new ScanPlace();
        var reader = new Utf8JsonReader(utf8, isFinalBlock: false, new JsonReaderState(new JsonReaderOptions
        {
            CommentHandling = JsonCommentHandling.Skip,
            MaxDepth = 1000,
        }));
        try
        {
            while (reader.Read())
            {
                if (reader.CurrentDepth > DeepestNesting)
                {
                    return new FileProblem("", $"The file is nested more than {DeepestNesting} levels deep; a project file is not.");
                }

                place.Pass(ref reader);
                if (place.Crowd is { } crowd)
                {
                    return new FileProblem(place.Path, crowd);
                }
            }
        }
        catch (JsonException e)
        {
            return new FileProblem(place.Path, NotJson(utf8, e));
        }
        catch (InvalidOperationException)
        {
            // Thrown by the reader when an escape sequence holds half a surrogate pair.
            return new FileProblem(place.Path, "The text holds half a character (a \\u escape without its pair); allowed is whole characters.");
        }

        return reader.CurrentDepth > 0 && !place.IsAtEnd
            ? new FileProblem(place.Path, $"The file ends too early, in line {LineCount(utf8)}; allowed is a whole project file.")
            : null;
    }

    private static string? NotText(ReadOnlySpan<byte> bytes)
    {
        if (bytes.Length > LargestFile)
        {
            return $"The file is larger than {LargestFile / (1024 * 1024)} MB; a project file is not.";
        }

        if (bytes.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || bytes.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            return "The file is UTF-16 text; allowed is UTF-8.";
        }

        if (bytes.IndexOf((byte)0) is >= 0 and var zero)
        {
            return $"The file is not text (byte {zero} is zero); allowed is JSON in UTF-8.";
        }

        if (!Utf8.IsValid(bytes))
        {
            return "The file is not UTF-8 text; allowed is JSON in UTF-8.";
        }

        return bytes.ContainsAnyExcept(" \t\r\n"u8) ? null : "The file is empty; allowed is a project file.";
    }

    private static string NotJson(ReadOnlySpan<byte> utf8, JsonException e)
    {
        var line = (int)(e.LineNumber ?? 0);
        var lineStart = LineStart(utf8, line);
        var at = Math.Min(lineStart + (int)(e.BytePositionInLine ?? 0), utf8.Length);
        var column = Encoding.UTF8.GetCharCount(utf8[lineStart..at]) + 1;
        var word = WordAround(utf8, at);
        if (word is "NaN" or "Infinity" or "-Infinity" or "+Infinity")
        {
            return $"The value is {word} (line {line + 1}, column {column}); allowed is a finite number.";
        }

        var found = word.Length > 0 ? FilePath.Quoted(word) : at < utf8.Length ? FilePath.Quoted(((char)utf8[at]).ToString()) : "the end";
        return $"The file stops being JSON at {found} (line {line + 1}, column {column}).";
    }

    private static string WordAround(ReadOnlySpan<byte> utf8, int at)
    {
        var start = utf8[..at].LastIndexOfAny(Delimiters) + 1;
        var length = utf8[start..].IndexOfAny(Delimiters);
        var word = length < 0 ? utf8[start..] : utf8.Slice(start, length);
        return Encoding.UTF8.GetString(word[..Math.Min(word.Length, 200)]);
    }

    private static int LineStart(ReadOnlySpan<byte> utf8, int line)
    {
        var start = 0;
        for (var i = 0; i < line; i++)
        {
            start += utf8[start..].IndexOf((byte)'\n') + 1;
        }

        return start;
    }

    private static int LineCount(ReadOnlySpan<byte> utf8) => utf8.Count((byte)'\n') + 1;
}
