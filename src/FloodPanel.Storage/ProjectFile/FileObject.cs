using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>One object of a file: fields are asked for by name, and what nobody asked for is refused at the end.</summary>
internal sealed class FileObject
{
    private readonly Dictionary<string, JsonElement> fields = new(StringComparer.Ordinal);
    private readonly List<string> known = [];
    private readonly string path;
    private readonly ProblemList problems;

    public FileObject(JsonElement element, string path, ProblemList problems)
    {
        this.path = path;
        this.problems = problems;
        foreach (var property in element.EnumerateObject())
        {
            if (!fields.TryAdd(property.Name, property.Value))
            {
                problems.Add(
                    FilePath.Field(path, property.Name),
                    $"The field stands here again, with {FilePath.Excerpt(property.Value)}; allowed is once.");
            }
        }
    }

    /// <summary>The field; null when it is absent.</summary>
    public FileValue? Find(string name)
    {
        known.Add(name);
        return fields.TryGetValue(name, out var element)
            ? new FileValue(element, FilePath.Field(path, name), problems)
            : null;
    }

    /// <summary>The field; null and a problem when it is absent.</summary>
    public FileValue? Need(string name, string allowed)
    {
        var value = Find(name);
        if (value is null)
        {
            problems.Add(FilePath.Field(path, name), $"The field is missing; needed is {allowed}.");
        }

        return value;
    }

    public double Number(string name) => Need(name, "a finite number")?.AsNumber() ?? 0;

    public double Number(string name, double fallback) => Find(name)?.AsNumber() ?? fallback;

    public double? NumberOrNull(string name) => Present(name)?.AsNumber();

    public int WholeNumber(string name, Field field) =>
        Need(name, $"a whole number {field.Allowed}")?.AsWholeNumber(field) ?? 0;

    public int WholeNumber(string name, Field field, int fallback) => Find(name)?.AsWholeNumber(field) ?? fallback;

    public string Text(string name) => Need(name, "text in double quotes")?.AsText() ?? "";

    public string Text(string name, string fallback) => Find(name)?.AsText() ?? fallback;

    public bool Flag(string name, bool fallback) => Find(name)?.AsFlag() ?? fallback;

    public T? Word<T>(string name, Words<T> words) =>
        Need(name, words.Allowed) is { } value ? value.AsWord(words) : default;

    public T Word<T>(string name, Words<T> words, T fallback)
        where T : struct => Find(name)?.AsWord(words) ?? fallback;

    public T? WordOrNull<T>(string name, Words<T> words)
        where T : struct => Present(name) is { } value ? value.AsWord(words) : null;

    /// <summary>The object; null when it is absent or null.</summary>
    public FileObject? Object(string name) => Present(name)?.AsObject();

    /// <summary>The object; null and a problem when it is not one.</summary>
    public FileObject? NeededObject(string name) => Need(name, "an object in braces")?.AsObject();

    /// <summary>The items; none when the list is absent or null.</summary>
    public List<FileValue> List(string name) => Present(name)?.AsList() ?? [];

    /// <summary>Refuses every field that was not asked for.</summary>
    public void Close()
    {
        foreach (var (name, element) in fields)
        {
            if (!known.Contains(name))
            {
                problems.Add(
                    FilePath.Field(path, name),
                    $"The field is unknown here (its value is {FilePath.Excerpt(element)}); allowed are {string.Join(", ", known)}.");
            }
        }
    }

    private FileValue? Present(string name) => Find(name) is { IsNull: false } value ? value : null;
}
