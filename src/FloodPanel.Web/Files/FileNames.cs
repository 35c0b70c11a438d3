namespace FloodPanel.Web.Files;

public static class FileNames
{
    private const int Longest = 80;

    // Not Path.GetInvalidFileNameChars, which on Linux lets pass what Windows refuses.
    private const string Refused = "<>:\"/\\|?*";

    /// <summary>A file name that every system takes, made of a project's name.</summary>
    public static string For(string projectName, string ending)
    {
        var kept = string.Concat(projectName.Select(c => char.IsControl(c) || Refused.Contains(c, StringComparison.Ordinal) ? ' ' : c));
        var words = string.Join(' ', kept.Split(' ', StringSplitOptions.RemoveEmptyEntries));
        var name = words[..Math.Min(words.Length, Longest)].Trim(' ', '.');
        return (name.Length == 0 ? "project" : name) + ending;
    }
}
