using System.Text.Json.Nodes;

namespace FloodPanel.Cli.Tests;

/// <summary>A file for one test, the sample project unless the test spoils it.</summary>
internal sealed class ProjectOnDisk : IDisposable
{
    public ProjectOnDisk(byte[] bytes) => File.WriteAllBytes(Path, bytes);

    public ProjectOnDisk(Action<JsonObject> change)
    {
        var file = JsonNode.Parse(File.ReadAllText(Invocation.Sample("sample-project.json")))!.AsObject();
        change(file);
        File.WriteAllText(Path, file.ToJsonString());
    }

    public string Path { get; } = System.IO.Path.Combine(System.IO.Path.GetTempPath(), $"floodpanel-{Guid.NewGuid():N}.json");

    public void Dispose() => File.Delete(Path);
}
