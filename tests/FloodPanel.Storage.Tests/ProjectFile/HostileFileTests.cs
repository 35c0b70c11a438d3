using System.Diagnostics;
using System.Text;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.Tests.ProjectFile;

/// <summary>Files that are damaged, foreign or meant to harm: one plain sentence each, quickly.</summary>
public class HostileFileTests
{
    private const string Head = "{\"format\": \"floodpanel-project\", \"version\": 1, ";

    private static readonly (string What, byte[] File, string Sentence)[] Files =
    [
        ("empty", [], "The file is empty; allowed is a project file."),
        ("blank", " \r\n\t "u8.ToArray(), "The file is empty; allowed is a project file."),
        ("binary", [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A, 0, 0, 0, 0x0D], "The file is not text (byte 8 is zero); allowed is JSON in UTF-8."),
        ("invalid UTF-8", [.. Utf8(Head), (byte)'"', 0xC3, 0x28, (byte)'"'], "The file is not UTF-8 text; allowed is JSON in UTF-8."),
        ("UTF-16", [0xFF, 0xFE, .. Encoding.Unicode.GetBytes(Head)], "The file is UTF-16 text; allowed is UTF-8."),
        ("UTF-16, big end first", [0xFE, 0xFF, .. Encoding.BigEndianUnicode.GetBytes(Head)], "The file is UTF-16 text; allowed is UTF-8."),
        ("list at root", Utf8("[1, 2]"), "The value is a list; allowed is a project file, one object in braces."),
        ("number at root", Utf8("42"), "The value is 42; allowed is a project file, one object in braces."),
        ("prose", Utf8("Dear sir"), "The file stops being JSON at \"Dear\" (line 1, column 1)."),
        ("truncated", Utf8(Head + "\n\"site\": {\"surge\": 0.2"), "site.surge: The file ends too early, in line 2; allowed is a whole project file."),
        ("truncated in a list", Utf8(Head + "\"openings\": [{}, {\"id\": \"a"), "openings[1].id: The file ends too early, in line 1; allowed is a whole project file."),
        ("NaN", Utf8(Head + "\"site\": {\"surge\": NaN}}"), "site.surge: The value is NaN (line 1, column 66); allowed is a finite number."),
        ("Infinity", Utf8(Head + "\"site\": {\"surge\":\n -Infinity}}"), "site.surge: The value is -Infinity (line 2, column 3); allowed is a finite number."),
        ("trailing comma", Utf8("{\"format\": \"floodpanel-project\",\n}"), "The file stops being JSON at \"}\" (line 2, column 1)."),
        ("two roots", Utf8("{} {}"), "The file stops being JSON at \"{\" (line 1, column 4)."),
        ("half a character", Utf8(Head + "\"name\": \"\\ud83d\"}"), "name: The text holds half a character (a \\u escape without its pair); allowed is whole characters."),
        ("half a character in a name", Utf8(Head + "\"\\udc00\": 1}"), "The text holds half a character (a \\u escape without its pair); allowed is whole characters."),
        ("100,000 lists deep", Utf8(new string('[', 100_000)), "The file is nested more than 32 levels deep; a project file is not."),
        ("100,000 objects deep", Utf8(string.Concat(Enumerable.Repeat("{\"a\":", 100_000))), "The file is nested more than 32 levels deep; a project file is not."),
        ("too large", new byte[ProjectFileReader.LargestFile + 1], "The file is larger than 4 MB; a project file is not."),
        ("no format", Utf8("{}"), "format: The field is missing; needed is \"floodpanel-project\"."),
        ("another format", Utf8("{\"format\": \"drawing\", \"sheets\": 4}"), "format: The value is \"drawing\"; allowed is \"floodpanel-project\"."),
        ("no version", Utf8("{\"format\": \"floodpanel-project\"}"), "version: The field is missing; needed is the number 1."),
        ("newer version", Utf8("{\"format\": \"floodpanel-project\", \"version\": 2, \"sensors\": []}"), "version: The value is 2; allowed is 1; the file was written by a newer FloodPanel, which can open it."),
        ("version as text", Utf8("{\"format\": \"floodpanel-project\", \"version\": \"1\"}"), "version: The value is \"1\"; allowed is the number 1."),
        ("comment without end", Utf8("{} /* and so on"), "The file is not JSON; allowed is one object in braces."),
    ];

    public static TheoryData<string> Names { get; } = [.. Files.Select(f => f.What)];

    [Theory]
    [MemberData(nameof(Names))]
    public void Read_HostileFile_IsRefusedInOneSentenceAtOnce(string what)
    {
        var (_, file, expected) = Files.Single(f => f.What == what);
        var clock = Stopwatch.StartNew();

        var reading = ProjectFileReader.Read(file);

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(1), $"{what} took {clock.Elapsed}");
        Assert.Null(reading.Project);
        Assert.Equal(expected, Assert.Single(reading.Problems).ToString());
    }

    [Fact]
    public void Read_EveryTruncationOfAFile_IsRefused()
    {
        var file = ProjectFileWriter.Write(Example.Full, indented: false);
        for (var length = 0; length < file.Length; length++)
        {
            var reading = ProjectFileReader.Read(file.AsMemory(0, length));

            Assert.Null(reading.Project);
            Assert.Single(reading.Problems);
        }
    }

    [Fact]
    public void Read_RandomDamage_NeverThrowsAndStaysOnOneLine()
    {
        var random = new Random(7);
        var whole = ProjectFileWriter.Write(Example.Full);
        for (var round = 0; round < 3000; round++)
        {
            var file = whole.ToArray();
            for (var hits = random.Next(1, 4); hits > 0; hits--)
            {
                file[random.Next(file.Length)] = (byte)random.Next(1, 128);
            }

            var reading = ProjectFileReader.Read(file);

            Assert.Equal(reading.Project is null, reading.Problems.Count > 0);
            Assert.All(reading.Problems, p => Assert.DoesNotContain('\n', p.ToString()));
        }
    }

    [Fact]
    public void Read_HugeListOfNumbers_IsRefusedAtOnce()
    {
        var file = Utf8(Head + "\"name\": \"x\", \"site\": {\"designStillWaterLevel\": 1}, \"openings\": ["
            + string.Join(',', Enumerable.Repeat("1", 1_500_000)) + "]}");
        var clock = Stopwatch.StartNew();

        var problems = ProjectFileReader.Read(file).Problems;

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(1), $"took {clock.Elapsed}");
        Assert.Equal("openings: The list has more than 10000 items; allowed are at most 10000.", Assert.Single(problems).ToString());
    }

    [Fact]
    public void Read_HugeNumberOfFields_IsRefusedAtOnce()
    {
        var file = Utf8(Head + string.Join(',', Enumerable.Range(0, 300_000).Select(i => $"\"x{i}\":1")) + "}");
        var clock = Stopwatch.StartNew();

        var problems = ProjectFileReader.Read(file).Problems;

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(1), $"took {clock.Elapsed}");
        Assert.Equal("The object has more than 10000 fields; a project file has fewer.", Assert.Single(problems).ToString());
    }

    [Fact]
    public void Read_NamesThatWouldBreakALine_AreEscapedAndShortened()
    {
        var file = Utf8(Head + "\"name\": \"x\", \"site\": {\"designStillWaterLevel\": 1}, \"a\\nb\\u202E" + new string('z', 100_000) + "\": \"p\\u0000q\"}");

        var problem = Assert.Single(ProjectFileReader.Read(file).Problems).ToString();

        Assert.StartsWith("[\"a\\u000Ab\\u202Ezzz", problem);
        Assert.Contains("\"p\\u0000q\"", problem, StringComparison.Ordinal);
        Assert.InRange(problem.Length, 1, 300);
    }

    private static byte[] Utf8(string text) => Encoding.UTF8.GetBytes(text);
}
