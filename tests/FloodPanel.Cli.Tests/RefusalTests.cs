using System.Diagnostics;
using System.Text;
using System.Text.Json.Nodes;

namespace FloodPanel.Cli.Tests;

/// <summary>What cannot be calculated: exit code 2, one line on standard error, nothing on standard output, at once.</summary>
public class RefusalTests
{
    private static readonly Dictionary<string, byte[]> HostileFiles = new()
    {
        ["empty"] = [],
        ["binary"] = [0x7F, 0x45, 0x4C, 0x46, 2, 1, 1, 0, 0xFF, 0xFE],
        ["UTF-16"] = Encoding.Unicode.GetPreamble().Concat(Encoding.Unicode.GetBytes("{\"format\": 1}")).ToArray(),
        ["list at root"] = Utf8("[]"),
        ["truncated"] = Sample()[..(Sample().Length / 2)],
        ["NaN"] = Utf8(Encoding.UTF8.GetString(Sample()).Replace("4.1", "NaN", StringComparison.Ordinal)),
        ["Infinity"] = Utf8(Encoding.UTF8.GetString(Sample()).Replace("4.1", "Infinity", StringComparison.Ordinal)),
        ["1e999"] = Utf8(Encoding.UTF8.GetString(Sample()).Replace("4.1", "1e999", StringComparison.Ordinal)),
        ["100,000 deep"] = Utf8(new string('[', 100_000) + new string(']', 100_000)),
        ["100,000 objects deep"] = Utf8(string.Concat(Enumerable.Repeat("{\"site\":", 100_000))),
        ["50 MB"] = Enumerable.Repeat((byte)' ', 50_000_000).ToArray(),
        ["name with line breaks"] = Utf8("{\"format\": \"floodpanel-project\", \"version\": 1, \"a\\nb\\r\\u2028c\": \"\\n\"}"),
    };

    public static TheoryData<string> Names { get; } = [.. HostileFiles.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void Check_HostileFile_IsRefusedInOneLineWithinASecond(string name)
    {
        using var file = new ProjectOnDisk(HostileFiles[name]);
        var clock = Stopwatch.StartNew();

        var run = Invocation.Of("check", file.Path);

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(1), $"took {clock.Elapsed}");
        AssertRefusedInOneLine(run);
    }

    [Fact]
    public void Check_EndlessDevice_IsRefused()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "Windows has no endless device file.");

        AssertRefusedInOneLine(Invocation.Of("check", "/dev/zero"));
    }

    [Fact]
    public void Check_Folder_IsRefused()
    {
        var run = Invocation.Of("check", AppContext.BaseDirectory);

        AssertRefusedInOneLine(run);
        Assert.Contains("This is a folder", run.Errors, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("site.waterDensity", "10", "site.waterDensity: Water density is 10 kg/m³; allowed is 990 kg/m³ to 1400 kg/m³.")]
    [InlineData("site.waterDensity", "\"salt\"", "site.waterDensity: The value is \"salt\"; allowed is a finite number.")]
    [InlineData("openings[0].barrier.logs.count", "0", "openings[0].barrier.logs.count: Number of logs is 0; allowed is 1 to 100.")]
    [InlineData("openings[0].barrier.logs.count", "true", "openings[0].barrier.logs.count: The value is true; allowed is a whole number from 1 to 100.")]
    [InlineData("openings[1].rake", "75", "openings[1].rake: Rake is 75°; allowed is 0.0° to 60.0°.")]
    [InlineData("openings[0].wall.kind", "\"glass\"", "openings[0].wall.kind: The value is \"glass\"; allowed is \"reinforced-concrete\", \"masonry\", \"cavity-masonry\", \"timber-frame\" or \"steel-frame\".")]
    public void Check_WrongValue_NamesPathValueAndWhatIsAllowed(string path, string json, string expected)
    {
        using var file = new ProjectOnDisk(project => Set(project, path, JsonNode.Parse(json)));

        var run = Invocation.Of("check", file.Path);

        AssertRefusedInOneLine(run);
        Assert.Equal(expected, run.Errors.TrimEnd());
    }

    [Fact]
    public void Check_LibraryIdThatIsNotThere_NamesPathAndValue()
    {
        using var file = new ProjectOnDisk(project => Set(project, "openings[0].barrier.logs.material", "unobtainium"));

        var run = Invocation.Of("check", file.Path);

        AssertRefusedInOneLine(run);
        Assert.StartsWith("openings[0].barrier.logs.material: ", run.Errors);
        Assert.Contains("unobtainium", run.Errors, StringComparison.Ordinal);
    }

    /// <summary>Every figure of the sample, set far out of range: the refusal names a path and the value.</summary>
    [Fact]
    public void Check_EveryFigureFarOutOfRange_IsRefusedWithAPath()
    {
        var sample = JsonNode.Parse(Sample())!;
        foreach (var path in NumberPaths(sample, "").Where(p => p != "version"))
        {
            using var file = new ProjectOnDisk(project => Set(project, path, -1e7));

            var run = Invocation.Of("check", file.Path);

            AssertRefusedInOneLine(run);
            Assert.StartsWith($"{path}: ", run.Errors);
            Assert.Matches("allowed is|must fill", run.Errors);
            Assert.Matches(@"-\d", run.Errors);
        }
    }

    private static void AssertRefusedInOneLine(Invocation run)
    {
        Assert.Equal((2, ""), (run.ExitCode, run.Output));
        var line = Assert.Single(run.Errors.Split(Environment.NewLine, StringSplitOptions.RemoveEmptyEntries));
        Assert.DoesNotContain(line, char.IsControl);
        Assert.EndsWith(".", line);
        Assert.InRange(line.Length, 10, 400);
    }

    private static void Set(JsonObject project, string path, JsonNode? value)
    {
        var keys = path.Replace("[", ".", StringComparison.Ordinal).Replace("]", "", StringComparison.Ordinal).Split('.');
        JsonNode node = project;
        foreach (var key in keys[..^1])
        {
            node = (node is JsonArray list ? list[int.Parse(key)] : node[key])!;
        }

        if (node is JsonArray items)
        {
            items[int.Parse(keys[^1])] = value;
        }
        else
        {
            node[keys[^1]] = value;
        }
    }

    private static IEnumerable<string> NumberPaths(JsonNode? node, string path) => node switch
    {
        JsonObject fields => fields.SelectMany(f => NumberPaths(f.Value, path.Length == 0 ? f.Key : $"{path}.{f.Key}")),
        JsonArray items => items.SelectMany((item, i) => NumberPaths(item, $"{path}[{i}]")),
        JsonValue value when value.GetValueKind() == System.Text.Json.JsonValueKind.Number => [path],
        _ => [],
    };

    private static byte[] Sample() => File.ReadAllBytes(Invocation.Sample("sample-project.json"));

    private static byte[] Utf8(string text) => Encoding.UTF8.GetBytes(text);
}
