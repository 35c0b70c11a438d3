using System.Globalization;
using CsvHelper;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.LibraryData;

/// <summary>One row of a library file. What does not fit is noted with file, line and field.</summary>
internal sealed class LibraryRow(CsvReader csv, string file, List<string> problems)
{
    private static readonly string[] EvidenceWords = ["read", "derived", "memory", "invented"];

    public string Text(string column)
    {
        var text = csv.GetString(column).Trim();
        if (text.Length == 0)
        {
            Refuse($"{column} is empty; needed is text");
        }

        return text;
    }

    public string Id(string column, IEnumerable<string> taken)
    {
        var id = Text(column);
        if (!id.All(c => char.IsAsciiLetterLower(c) || char.IsAsciiDigit(c) || c == '-'))
        {
            Refuse($"{column} is \"{id}\"; allowed are small letters, digits and hyphens");
        }

        if (taken.Contains(id))
        {
            Refuse($"{column} is \"{id}\" again; allowed is once");
        }

        return id;
    }

    public T? Word<T>(string column, Words<T> words)
    {
        var text = csv.GetString(column);
        if (!words.TryFind(text, out var value))
        {
            Refuse($"{column} is \"{text}\"; allowed is {words.Allowed}");
        }

        return value;
    }

    /// <summary>The word; null where the field is empty.</summary>
    public T? WordOrNull<T>(string column, Words<T> words)
        where T : struct => csv.GetString(column).Length == 0 ? null : Word(column, words);

    /// <summary>A number in the unit in which its dimension is shown, which is the one named in the column's header.</summary>
    public double Number(string column, Field field)
    {
        var text = csv.GetString(column);
        if (double.TryParse(text, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var shown)
            && Units.ToSI(shown, field.Dimension, UnitSystem.SI) is var number && field.Allows(number))
        {
            return number;
        }

        Refuse($"{column} is \"{text}\"; allowed is a number {field.Allowed}");
        return 0;
    }

    /// <summary>The number; null where the field is empty.</summary>
    public double? NumberOrNull(string column, Field field) => csv.GetString(column).Length == 0 ? null : Number(column, field);

    public int WholeNumber(string column, Field field)
    {
        var text = csv.GetString(column);
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && field.Allows(number))
        {
            return number;
        }

        Refuse($"{column} is \"{text}\"; allowed is a whole number {field.Allowed}");
        return 0;
    }

    /// <summary>Columns that belong to other shapes must be empty, or a slip of a column would pass.</summary>
    public void Empty(IEnumerable<string> columns)
    {
        foreach (var column in columns.Where(c => csv.GetString(c).Length > 0))
        {
            Refuse($"{column} is \"{csv.GetString(column)}\"; this shape has none, the field must be empty");
        }
    }

    public string Source() =>
        csv.Headers.Contains("shear_source") ? $"{Text("source")}; shear: {Text("shear_source")}" : Text("source");

    public string Evidence()
    {
        var word = Text("evidence");
        if (!EvidenceWords.Contains(word))
        {
            Refuse($"evidence is \"{word}\"; allowed is {string.Join(", ", EvidenceWords)}");
        }

        return word;
    }

    public void Refuse(string reason) => problems.Add(
        string.Create(CultureInfo.InvariantCulture, $"{file}, line {csv.LineNumber}: {reason}."));
}
