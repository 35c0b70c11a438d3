using System.Text.Json;
using System.Text.Json.Nodes;

namespace FloodPanel.Cli.Tests;

/// <summary>sample-results.json: figures of sample-project.json from an independent numerical integration.</summary>
public class SampleResultsTests
{
    private const double Tolerance = 0.001;

    [Theory]
    [InlineData("dock", "design-flood", 118)]
    [InlineData("dock", "wave", 118)]
    [InlineData("dock", "debris", 118)]
    [InlineData("dock", "brim-full", 118)]
    [InlineData("dock", "wind", 118)]
    [InlineData("dock", "line", 118)]
    [InlineData("side", "design-flood", 69)]
    [InlineData("side", "wave", 69)]
    [InlineData("side", "brim-full", 69)]
    public void Check_SampleProject_AgreesWithin1In1000(string opening, string loadCase, int figures)
    {
        var expected = Case(Expected(), opening, loadCase);

        var actual = Case(Invocation.Of("check", Invocation.Sample("sample-project.json")).Result, opening, loadCase);

        var compared = 0;
        Compare(expected, actual, $"{opening} {loadCase}", ref compared);
        Assert.Equal(figures, compared);
    }

    [Theory]
    [InlineData("dock")]
    [InlineData("side")]
    public void Check_SampleProject_AgreesInLevels(string opening)
    {
        var expected = Opening(Expected(), opening);
        var actual = Opening(Invocation.Of("check", Invocation.Sample("sample-project.json")).Result, opening);

        foreach (var name in new[] { "designFloodLevel", "retainedDepth", "barrierHeight" })
        {
            Assert.Equal(expected[name]!.GetValue<double>(), actual[name]!.GetValue<double>(), tolerance: 1e-6);
        }
    }

    [Theory]
    [InlineData("dock")]
    [InlineData("side")]
    public void Check_SampleProject_HasTheSameCases(string opening)
    {
        var result = Invocation.Of("check", Invocation.Sample("sample-project.json")).Result;

        Assert.Equal(CaseNames(Opening(Expected(), opening)), CaseNames(Opening(result, opening)));
    }

    private static IEnumerable<string> CaseNames(JsonNode opening) =>
        opening["cases"]!.AsArray().Select(c => c!["name"]!.GetValue<string>());

    private static JsonObject Expected() => JsonNode.Parse(File.ReadAllText(Invocation.Sample("sample-results.json")))!.AsObject();

    private static JsonNode Opening(JsonObject result, string id) =>
        result["openings"]!.AsArray().Single(o => o!["id"]!.GetValue<string>() == id)!;

    private static JsonNode Case(JsonObject result, string opening, string name) =>
        Opening(result, opening)["cases"]!.AsArray().Single(c => c!["name"]!.GetValue<string>() == name)!;

    /// <summary>Everything that stands in the expected result must stand in ours; ours may hold more.</summary>
    private static void Compare(JsonNode expected, JsonNode? actual, string path, ref int compared)
    {
        switch (expected)
        {
            case JsonObject fields:
                foreach (var (name, value) in fields)
                {
                    Compare(value!, actual![name], $"{path}.{name}", ref compared);
                }

                break;
            case JsonArray items:
                Assert.Equal(items.Count, actual!.AsArray().Count);
                for (var i = 0; i < items.Count; i++)
                {
                    Compare(items[i]!, actual[i], $"{path}[{i}]", ref compared);
                }

                break;
            case var _ when expected.GetValueKind() == JsonValueKind.Number:
                var (sought, found) = (expected.GetValue<double>(), actual!.GetValue<double>());
                Assert.True(Math.Abs(found - sought) <= Tolerance * Math.Abs(sought) + 1e-9, $"{path} is {found}, expected {sought}");
                compared++;
                break;
            default:
                Assert.Equal(expected.GetValue<string>(), actual!.GetValue<string>());
                break;
        }
    }
}
