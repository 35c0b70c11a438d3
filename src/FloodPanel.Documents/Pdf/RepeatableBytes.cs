using System.Security.Cryptography;
using System.Text;
using System.Text.RegularExpressions;

namespace FloodPanel.Documents.Pdf;

/// <summary>
/// The library names font subsets and the metadata's identifiers at random. Names of the same length, taken from
/// the content, make equal documents equal byte by byte; no offset in the file moves.
/// </summary>
internal static partial class RepeatableBytes
{
    public static byte[] Of(byte[] pdf)
    {
        // Latin-1 maps every byte to one character and back.
        var text = Encoding.Latin1.GetString(pdf);
        var tags = new Dictionary<string, string>();
        var named = SubsetTag().Replace(text, match =>
        {
            tags.TryAdd(match.Value, FormattableString.Invariant($"FP{(char)('A' + tags.Count)}AAA"));
            return tags[match.Value];
        });
        var unsigned = Uuid().Replace(named, Guid.Empty.ToString());
        var content = new Guid(SHA256.HashData(Encoding.Latin1.GetBytes(unsigned)).AsSpan(0, 16));
        return Encoding.Latin1.GetBytes(Uuid().Replace(named, content.ToString()));
    }

    [GeneratedRegex(@"(?<=/)[A-Z]{6}(?=\+Source#20Sans)")]
    private static partial Regex SubsetTag();

    [GeneratedRegex("(?<=>uuid:)[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}(?=<)")]
    private static partial Regex Uuid();
}
