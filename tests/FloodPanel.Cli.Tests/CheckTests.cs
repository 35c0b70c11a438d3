using System.Text.Json.Nodes;

namespace FloodPanel.Cli.Tests;

public class CheckTests
{
    private static readonly string[] ByOthers = ["base-plates", "anchors", "guides", "supporting-wall"];

    [Fact]
    public void Check_OpeningsThatAreAdequate_Returns0()
    {
        using var file = new ProjectOnDisk(MakeAdequate);

        var run = Invocation.Of("check", file.Path);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal("", run.Errors);
        Assert.Equal("adequate", run.Result["openings"]![0]!["verdict"]!.GetValue<string>());
        Assert.Empty(run.Result["openings"]![0]!["missing"]!.AsArray());
    }

    /// <summary>A wall with a resistance is a part in each case, with its checks; without inputs there is no list.</summary>
    [Fact]
    public void Check_WallWithResistance_WritesItsChecksInEachCase()
    {
        using var file = new ProjectOnDisk(project => project["openings"]![0]!["wall"] = JsonNode.Parse(
            """{ "kind": "reinforced-concrete", "measure": "resistance", "totalResistance": 50000, "source": "Drawing W-1" }"""));

        var cases = Invocation.Of("check", file.Path).Result["openings"]![0]!["cases"]!.AsArray();

        Assert.All(cases, loadCase =>
        {
            var part = loadCase!["parts"]![0]!;
            Assert.Equal(("supporting-wall", "left wall"), (part["check"]!.GetValue<string>(), part["member"]!.GetValue<string>()));
            var check = part["checks"]![0]!;
            Assert.Equal("wall-reaction", check["name"]!.GetValue<string>());
            Assert.Equal(loadCase["guides"]![0]!["reaction"]!.GetValue<double>(), check["demand"]!.GetValue<double>());
            Assert.Equal(check["demand"]!.GetValue<double>() / 50_000, check["utilisation"]!.GetValue<double>(), 1e-12);
        });
        var plain = Invocation.Of("check", Invocation.Sample("sample-project.json")).Result["openings"]![0]!["cases"]!.AsArray();
        Assert.All(plain, loadCase => Assert.Null(loadCase!["parts"]));
    }

    [Fact]
    public void Check_OpeningWithChecksMissing_Returns1()
    {
        var run = Invocation.Of("check", Invocation.Sample("sample-project.json"));

        Assert.Equal(1, run.ExitCode);
        Assert.Equal("", run.Errors);
        Assert.Equal("incomplete", run.Result["openings"]![0]!["verdict"]!.GetValue<string>());
    }

    [Fact]
    public void Check_OneOpeningThatFails_Returns1AndNamesWhatGoverns()
    {
        using var file = new ProjectOnDisk(project =>
        {
            MakeAdequate(project);
            project["openings"]![0]!["barrier"]!["logs"]!["material"]!["allowableBending"] = 1e6;
        });

        var run = Invocation.Of("check", file.Path);

        Assert.Equal(1, run.ExitCode);
        Assert.Equal("inadequate", run.Result["openings"]![0]!["verdict"]!.GetValue<string>());
        Assert.Equal("log-bending", run.Result["openings"]![0]!["governing"]!["check"]!.GetValue<string>());
        Assert.Equal("log 1 in bay 1", run.Result["openings"]![0]!["governing"]!["member"]!.GetValue<string>());
    }

    [Fact]
    public void Check_ProjectWithoutOpenings_Returns1()
    {
        using var file = new ProjectOnDisk(project => project["openings"] = new JsonArray());

        var run = Invocation.Of("check", file.Path);

        Assert.Equal((1, ""), (run.ExitCode, run.Errors));
        Assert.Empty(run.Result["openings"]!.AsArray());
    }

    /// <summary>A cover counts as an opening does: its verdict decides too, and it may stand alone.</summary>
    [Theory]
    [InlineData(0.01, "adequate", 0)]
    [InlineData(0.001, "inadequate", 1)]
    public void Check_ProjectOfACover_VerdictDecides(double thickness, string verdict, int exitCode)
    {
        using var file = new ProjectOnDisk(project =>
        {
            project["openings"] = new JsonArray();
            project["site"] = JsonNode.Parse("""{ "designStillWaterLevel": 12.35 }""");
            project["covers"] = new JsonArray(JsonNode.Parse($$"""
                {
                  "name": "Vent", "plate": { "shape": "rectangle", "width": 0.6, "height": 0.4 }, "level": 11.4, "material": "s235",
                  "thickness": {{thickness.ToString(System.Globalization.CultureInfo.InvariantCulture)}},
                  "pressing": "unseating", "fasteners": { "pitch": 0.1, "tension": 2000, "source": "Approval" }
                }
                """));
        });

        var run = Invocation.Of("check", file.Path);

        var cover = run.Result["covers"]![0]!;
        Assert.Equal((exitCode, ""), (run.ExitCode, run.Errors));
        Assert.Equal(verdict, cover["verdict"]!.GetValue<string>());
        Assert.Equal("name verdict depth edgeReaction cornerForce fasteners checks notes", Names(cover));
        Assert.Equal(
            ["cover-bending", "cover-deflection", "cover-fastener-tension"],
            cover["checks"]!.AsArray().Select(c => c!["name"]!.GetValue<string>()));
        Assert.Equal(0.95, cover["depth"]!.GetValue<double>());
    }

    [Fact]
    public void Check_Result_HasTheNamesOfTheFormat()
    {
        var opening = Invocation.Of("check", Invocation.Sample("sample-project.json")).Result["openings"]![0]!;
        var loadCase = opening["cases"]![0]!;

        Assert.Equal(
            "id verdict missing designFloodLevel retainedDepth barrierHeight governing cases notes", Names(opening));
        Assert.Equal("check case utilisation member", Names(opening["governing"]!));
        Assert.Equal("name resultant centreOfPressure actions logs posts guides", Names(loadCase));
        Assert.Equal("kind resultant centreOfPressure", Names(loadCase["actions"]![0]!));
        Assert.Equal("index bay bottom top lineLoad moment shear deflection utilisation", Names(loadCase["logs"]![0]!));
        Assert.Equal("bending shear deflection", Names(loadCase["logs"]![0]!["utilisation"]!));
        Assert.Equal("index baseShear baseMoment tipDeflection utilisation checks", Names(loadCase["posts"]![0]!));
        Assert.Equal("side reaction peakLineReaction", Names(loadCase["guides"]![0]!));
        Assert.Equal("code text", Names(opening["notes"]![0]!));
    }

    [Fact]
    public void Check_MaterialWithoutStrength_HasNoUtilisationForIt()
    {
        using var file = new ProjectOnDisk(project =>
            project["openings"]![1]!["barrier"]!["logs"]!["material"]!.AsObject().Remove("allowableShear"));

        var side = Invocation.Of("check", file.Path).Result["openings"]![1]!;

        var utilisation = side["cases"]![0]!["logs"]![0]!["utilisation"]!;
        Assert.Null(utilisation["shear"]);
        Assert.NotNull(utilisation["bending"]);
        Assert.Contains("logs", side["missing"]!.AsArray().Select(m => m!.GetValue<string>()));
    }

    [Fact]
    public void Check_SillAboveTheFlood_HasNoCentreOfPressure()
    {
        using var file = new ProjectOnDisk(project =>
        {
            project["openings"]![0]!["actions"] = null;
            project["openings"]![0]!["sillLevel"] = 5;
        });

        var designFlood = Invocation.Of("check", file.Path).Result["openings"]![0]!["cases"]![0]!;

        Assert.Equal(0, designFlood["resultant"]!.GetValue<double>());
        Assert.Null(designFlood["centreOfPressure"]);
    }

    [Fact]
    public void Check_Levels_ReadAsTyped()
    {
        var run = Invocation.Of("check", Invocation.Sample("sample-project.json"));

        Assert.Contains("\"designFloodLevel\": 4.45,", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Program_SampleProject_WritesPureJsonAndReturns1()
    {
        var run = await Invocation.OfProgramAsync("check", Invocation.Sample("sample-project.json"));

        Assert.Equal(1, run.ExitCode);
        Assert.Equal("", run.Errors);
        Assert.Equal('{', run.Output[0]);
        Assert.EndsWith("}\n", run.Output);
        Assert.Equal(Invocation.Of("check", Invocation.Sample("sample-project.json")).Output, run.Output);
    }

    [Fact]
    public async Task Program_AdequateProject_Returns0()
    {
        using var file = new ProjectOnDisk(MakeAdequate);

        var run = await Invocation.OfProgramAsync("check", file.Path);

        Assert.Equal((0, ""), (run.ExitCode, run.Errors));
    }

    [Fact]
    public async Task Program_FileItCannotRead_Returns2WithOneLineOnStandardErrorOnly()
    {
        var run = await Invocation.OfProgramAsync("check", "nowhere.json");

        Assert.Equal((2, ""), (run.ExitCode, run.Output));
        Assert.Equal("nowhere.json: There is no such file.", run.Errors.TrimEnd());
    }

    [Theory]
    [InlineData("--help")]
    [InlineData("-h")]
    [InlineData("help")]
    [InlineData("check", "--help")]
    public void Help_Asked_IsOnStandardOutput(params string[] arguments)
    {
        var run = Invocation.Of(arguments);

        Assert.Equal((0, ""), (run.ExitCode, run.Errors));
        Assert.StartsWith("usage: floodpanel check FILE", run.Output);
        Assert.Contains("people leave when told to", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData]
    [InlineData("calculate", "a.json")]
    [InlineData("check")]
    [InlineData("check", "a.json", "b.json")]
    public void Command_Unknown_ShowsUsageOnStandardError(params string[] arguments)
    {
        var run = Invocation.Of(arguments);

        Assert.Equal((2, ""), (run.ExitCode, run.Output));
        Assert.StartsWith("usage: floodpanel check FILE", run.Errors);
    }

    private static string Names(JsonNode node) => string.Join(' ', node.AsObject().Select(p => p.Key));

    /// <summary>The dock alone, still water and flow only, with every part that is not calculated declared by others.</summary>
    private static void MakeAdequate(JsonObject project)
    {
        var dock = project["openings"]![0]!.DeepClone();
        dock["actions"] = new JsonObject { ["flow"] = new JsonObject { ["velocity"] = 1.1 } };
        dock["barrier"]!["byOthers"] = new JsonArray(
            [.. ByOthers.Select(check => new JsonObject
            {
                ["check"] = check,
                ["name"] = "N. Lund",
                ["reference"] = "A-12",
            })]);
        project["openings"] = new JsonArray(dock);
    }
}
