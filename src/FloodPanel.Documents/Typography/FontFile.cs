using System.Buffers.Binary;
using System.Collections.Frozen;
using System.Text;

namespace FloodPanel.Documents.Typography;

/// <summary>
/// A TrueType font with as much of it read as layout needs: the advance width of each character. Drawings are laid
/// out with these widths, so that the browser and the PDF break and shorten words at the same place.
/// </summary>
/// <remarks>Source: OpenType specification 1.9, tables head, hhea, hmtx and cmap (formats 4 and 12).</remarks>
public sealed class FontFile
{
    private readonly FrozenDictionary<int, int> glyphs;
    private readonly ushort[] advances;
    private readonly double unitsPerEm;

    private FontFile(string name, byte[] data)
    {
        Name = name;
        Data = data;
        var tables = ReadTables(data);
        unitsPerEm = UInt16(tables["head"] + 18);
        var metrics = UInt16(tables["hhea"] + 34);
        advances = new ushort[metrics];
        for (var i = 0; i < metrics; i++)
        {
            advances[i] = UInt16(tables["hmtx"] + 4 * i);
        }

        glyphs = ReadCharacterMap(tables["cmap"]).ToFrozenDictionary();
    }

    /// <summary>Source Sans 3, regular.</summary>
    public static FontFile Regular { get; } = Load("SourceSans3-Regular.ttf");

    /// <summary>Source Sans 3, semibold.</summary>
    public static FontFile Semibold { get; } = Load("SourceSans3-Semibold.ttf");

    /// <summary>File name.</summary>
    public string Name { get; }

    /// <summary>The font program, as embedded in PDFs.</summary>
    internal byte[] Data { get; }

    /// <summary>Width of a line of text, in the unit of the size.</summary>
    /// <param name="text">The words.</param>
    /// <param name="size">Font size.</param>
    public double Width(string text, double size)
    {
        var sum = 0;
        foreach (var rune in text.EnumerateRunes())
        {
            sum += advances[Math.Min(glyphs.GetValueOrDefault(rune.Value), advances.Length - 1)];
        }

        return sum * size / unitsPerEm;
    }

    /// <summary>True when the font can show a character.</summary>
    /// <param name="rune">The character.</param>
    public bool Has(Rune rune) => glyphs.ContainsKey(rune.Value);

    private static FontFile Load(string name)
    {
        using var stream = typeof(FontFile).Assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException($"Font {name} is not in the assembly.");
        var data = new byte[stream.Length];
        stream.ReadExactly(data);
        return new FontFile(name, data);
    }

    private static Dictionary<string, int> ReadTables(byte[] data)
    {
        var tables = new Dictionary<string, int>();
        var count = BinaryPrimitives.ReadUInt16BigEndian(data.AsSpan(4));
        for (var i = 0; i < count; i++)
        {
            var row = data.AsSpan(12 + 16 * i, 16);
            tables[Encoding.ASCII.GetString(row[..4])] = (int)BinaryPrimitives.ReadUInt32BigEndian(row[8..]);
        }

        return tables;
    }

    private Dictionary<int, int> ReadCharacterMap(int table)
    {
        var map = new Dictionary<int, int>();
        for (var i = 0; i < UInt16(table + 2); i++)
        {
            var subtable = table + (int)UInt32(table + 4 + 8 * i + 4);
            if (UInt16(subtable) == 4)
            {
                ReadSegments(subtable, map);
            }
            else if (UInt16(subtable) == 12)
            {
                ReadGroups(subtable, map);
            }
        }

        return map;
    }

    private void ReadSegments(int subtable, Dictionary<int, int> map)
    {
        var doubleCount = UInt16(subtable + 6);
        for (var i = 0; i < doubleCount; i += 2)
        {
            var end = UInt16(subtable + 14 + i);
            var start = UInt16(subtable + 16 + doubleCount + i);
            var delta = UInt16(subtable + 16 + 2 * doubleCount + i);
            var offsetAt = subtable + 16 + 3 * doubleCount + i;
            var offset = UInt16(offsetAt);
            for (int code = start; code <= end && code != 0xFFFF; code++)
            {
                var raw = offset == 0 ? code : UInt16(offsetAt + offset + 2 * (code - start));
                map.TryAdd(code, raw == 0 ? 0 : (raw + delta) & 0xFFFF);
            }
        }
    }

    private void ReadGroups(int subtable, Dictionary<int, int> map)
    {
        for (var i = 0; i < UInt32(subtable + 12); i++)
        {
            var group = subtable + 16 + 12 * i;
            var start = (int)UInt32(group);
            for (var code = start; code <= UInt32(group + 4); code++)
            {
                map[code] = (int)UInt32(group + 8) + code - start;
            }
        }
    }

    private ushort UInt16(int at) => BinaryPrimitives.ReadUInt16BigEndian(Data.AsSpan(at));

    private uint UInt32(int at) => BinaryPrimitives.ReadUInt32BigEndian(Data.AsSpan(at));
}
