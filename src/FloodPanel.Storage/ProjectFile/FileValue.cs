using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>
/// One value of a file and where it stands. What does not fit is noted as a problem and read as a harmless value,
/// so that reading goes on and finds the other problems; a file with problems gives no project.
/// </summary>
internal readonly record struct FileValue(JsonElement Element, string Path, ProblemList Problems)
{
    public bool IsNull => Element.ValueKind == JsonValueKind.Null;

    public bool IsText => Element.ValueKind == JsonValueKind.String;

    public double AsNumber()
    {
        if (Element.ValueKind == JsonValueKind.Number && Element.TryGetDouble(out var number) && double.IsFinite(number))
        {
            return number;
        }

        Refuse("a finite number");
        return 0;
    }

    /// <summary>A whole number, also when written as 6.0; the field's own range is judged later, with the project.</summary>
    public int AsWholeNumber(Field field)
    {
        if (Element.ValueKind == JsonValueKind.Number && Element.TryGetDouble(out var number)
            && number is >= int.MinValue and <= int.MaxValue && Math.Floor(number) == number)
        {
            return (int)number;
        }

        Refuse($"a whole number {field.Allowed}");
        return 0;
    }

    public bool AsFlag()
    {
        if (Element.ValueKind is JsonValueKind.True or JsonValueKind.False)
        {
            return Element.GetBoolean();
        }

        Refuse("true or false");
        return false;
    }

    public string AsText()
    {
        if (IsText)
        {
            return Element.GetString()!;
        }

        Refuse("text in double quotes");
        return "";
    }

    public T? AsWord<T>(Words<T> words)
    {
        if (IsText && words.TryFind(Element.GetString()!, out var value))
        {
            return value;
        }

        Refuse(words.Allowed);
        return default;
    }

    public FileObject? AsObject(string allowed = "an object in braces")
    {
        if (Element.ValueKind == JsonValueKind.Object)
        {
            return new FileObject(Element, Path, Problems);
        }

        Refuse(allowed);
        return null;
    }

    public List<FileValue> AsList()
    {
        var items = new List<FileValue>();
        if (Element.ValueKind != JsonValueKind.Array)
        {
            Refuse("a list in brackets");
            return items;
        }

        foreach (var item in Element.EnumerateArray())
        {
            items.Add(new FileValue(item, FilePath.Item(Path, items.Count), Problems));
        }

        return items;
    }

    public void Refuse(string allowed) =>
        Problems.Add(Path, $"The value is {FilePath.Excerpt(Element)}; allowed is {allowed}.");
}
