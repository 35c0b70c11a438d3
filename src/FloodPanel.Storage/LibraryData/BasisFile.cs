using System.Text.Json;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.LibraryData;

/// <summary>Reads design-bases.json: the rule sets with their factors and sources, one of each kind.</summary>
internal static class BasisFile
{
    public const string Name = "design-bases.json";

    /// <summary>The bases; none, and problems, when the file is missing or wrong.</summary>
    public static IReadOnlyList<DesignBasis> Read(string folder, List<string> problems)
    {
        try
        {
            var found = new ProblemList();
            var bases = Read(File.ReadAllBytes(Path.Combine(folder, Name)), found);
            problems.AddRange(found.ToList().Select(p => $"{Name}: {p}"));
            return bases;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            problems.Add($"{Name} cannot be read in the data folder {folder}: {e.Message}");
            return [];
        }
    }

    private static List<DesignBasis> Read(byte[] utf8, ProblemList problems)
    {
        try
        {
            using var document = JsonDocument.Parse(utf8, new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip });
            return Read(document.RootElement, problems);
        }
        catch (JsonException exception)
        {
            problems.Add("", $"The file is not JSON: {exception.Message}");
            return [];
        }
    }

    private static List<DesignBasis> Read(JsonElement root, ProblemList problems)
    {
        var bases = new List<DesignBasis>();
        if (new FileValue(root, "", problems).AsObject() is not { } file)
        {
            return bases;
        }

        foreach (var item in file.List("bases").Select(b => b.AsObject()).OfType<FileObject>())
        {
            var kind = item.Word("kind", FileWords.DesignBasis);
            bases.Add(BasisReader.Read(item, kind));
        }

        file.Close();
        foreach (var kind in Enum.GetValues<DesignBasisKind>().Where(kind => bases.Count(b => b.Kind == kind) != 1))
        {
            problems.Add("bases", $"The basis \"{FileWords.DesignBasis.Of(kind)}\" stands there {bases.Count(b => b.Kind == kind)} times; needed is once.");
        }

        return bases;
    }
}
