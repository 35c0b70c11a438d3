using System.Text;
using System.Text.Json;
using System.Text.Json.Nodes;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.Tests.ProjectFile;

/// <summary>Every refusal names the path, the value and what is allowed.</summary>
public class RefusalTests
{
    [Theory]
    [InlineData("openings[0].barrier.logs.count", "\"six\"", "openings[0].barrier.logs.count: The value is \"six\"; allowed is a whole number from 1 to 100.")]
    [InlineData("openings[0].barrier.logs.count", "2.5", "openings[0].barrier.logs.count: The value is 2.5; allowed is a whole number from 1 to 100.")]
    [InlineData("openings[0].barrier.logs.count", "1e12", "openings[0].barrier.logs.count: The value is 1e12; allowed is a whole number from 1 to 100.")]
    [InlineData("openings[0].sillLevel", "null", "openings[0].sillLevel: The value is null; allowed is a finite number.")]
    [InlineData("openings[0].sillLevel", "1e999", "openings[0].sillLevel: The value is 1e999; allowed is a finite number.")]
    [InlineData("openings[1].clearWidth", "[1]", "openings[1].clearWidth: The value is a list; allowed is a finite number.")]
    [InlineData("openings[0].barrier.bays[1]", "{}", "openings[0].barrier.bays[1]: The value is an object; allowed is a finite number.")]
    [InlineData("openings[0].barrier.bays", "1.6", "openings[0].barrier.bays: The value is 1.6; allowed is a list in brackets.")]
    [InlineData("openings[1]", "7", "openings[1]: The value is 7; allowed is an object in braces.")]
    [InlineData("name", "false", "name: The value is false; allowed is text in double quotes.")]
    [InlineData("designBasis", "\"lrfd\"", "designBasis: The value is \"lrfd\"; allowed is \"allowable-stress\", \"us-strength\" or \"eurocode\".")]
    [InlineData("ownBasis.inland.debris", "true", "ownBasis.inland.debris: The value is true; allowed is a finite number.")]
    [InlineData("ownBasis.strengths[0].family", "\"gold\"", "ownBasis.strengths[0].family: The value is \"gold\"; allowed is \"aluminium\", \"steel\", \"timber\" or \"composite\".")]
    [InlineData("site.floodZone", "\"v\"", "site.floodZone: The value is \"v\"; allowed is \"inland\", \"coastal-a\" or \"coastal-high-hazard\".")]
    [InlineData("site.climateRatePerYear", "\"4 mm\"", "site.climateRatePerYear: The value is \"4 mm\"; allowed is a finite number.")]
    [InlineData("site.designLifeYears", "[30]", "site.designLifeYears: The value is a list; allowed is a finite number.")]
    [InlineData("site.levels[1].level", "null", "site.levels[1].level: The value is null; allowed is a finite number.")]
    [InlineData("site.levels[0].annualProbability", "\"1 in 100\"", "site.levels[0].annualProbability: The value is \"1 in 100\"; allowed is a finite number.")]
    [InlineData("openings[0].actions.wave.kind", "\"big\"", "openings[0].actions.wave.kind: The value is \"big\"; allowed is \"breaking\" or \"non-breaking\".")]
    [InlineData("openings[0].barrier.logs.material", "5", "openings[0].barrier.logs.material: The value is 5; allowed is a library id or a material with its own figures.")]
    [InlineData("openings[0].barrier.posts.profile.shape", "\"round\"", "openings[0].barrier.posts.profile.shape: The value is \"round\"; allowed is \"rectangle\", \"hollow-rectangle\", \"rectangular-tube\", \"i-section\" or \"properties\".")]
    public void Read_WrongValue_NamesPathValueAndWhatIsAllowed(string path, string json, string expected)
    {
        var reading = ProjectFileReader.Read(With(path, json));

        Assert.Null(reading.Project);
        Assert.Equal(expected, Assert.Single(reading.Problems).ToString());
    }

    [Theory]
    [InlineData("name")]
    [InlineData("site")]
    [InlineData("site.designStillWaterLevel")]
    [InlineData("ownBasis.title")]
    [InlineData("ownBasis.coastal")]
    [InlineData("ownBasis.coastal.line")]
    [InlineData("ownBasis.strengths[1].divisor")]
    [InlineData("openings[0].id")]
    [InlineData("openings[0].sillLevel")]
    [InlineData("openings[0].clearWidth")]
    [InlineData("openings[0].clearHeight")]
    [InlineData("openings[0].barrier")]
    [InlineData("openings[0].barrier.logs")]
    [InlineData("openings[0].barrier.logs.material")]
    [InlineData("openings[0].barrier.logs.profile")]
    [InlineData("openings[0].barrier.logs.profile.webs")]
    [InlineData("openings[0].barrier.logs.count")]
    [InlineData("openings[0].barrier.bays")]
    [InlineData("openings[0].barrier.posts.material.family")]
    [InlineData("openings[0].barrier.posts.material.density")]
    [InlineData("openings[0].barrier.posts.material.elasticModulus")]
    [InlineData("openings[0].barrier.posts.profile.shape")]
    [InlineData("openings[0].barrier.posts.raker.material")]
    [InlineData("openings[0].barrier.posts.raker.profile")]
    [InlineData("openings[0].barrier.posts.raker.headHeight")]
    [InlineData("openings[0].barrier.posts.raker.footDistance")]
    [InlineData("openings[0].barrier.basePlate.material")]
    [InlineData("openings[0].barrier.basePlate.length")]
    [InlineData("openings[0].barrier.basePlate.width")]
    [InlineData("openings[0].barrier.basePlate.thickness")]
    [InlineData("openings[0].barrier.basePlate.rodDistance")]
    [InlineData("openings[0].barrier.basePlate.concreteStrength")]
    [InlineData("openings[0].barrier.guides.material")]
    [InlineData("openings[0].barrier.guides.lipThickness")]
    [InlineData("openings[0].barrier.guides.bearingDistance")]
    [InlineData("openings[0].barrier.guides.fasteners")]
    [InlineData("openings[0].barrier.guides.fasteners.pitch")]
    [InlineData("openings[0].actions.flow.velocity")]
    [InlineData("openings[0].actions.line.force")]
    public void Read_RequiredFieldMissing_IsNamed(string path)
    {
        var file = Example.FullJson();
        JsonPlace.Find(file, path).Remove();

        var problem = Assert.Single(ProjectFileReader.Read(Bytes(file)).Problems);

        Assert.Equal(path, problem.Path);
        Assert.StartsWith("The field is missing; needed is ", problem.Message);
    }

    [Fact]
    public void Read_SeveralProblems_AllAreTold()
    {
        var file = Example.FullJson();
        file["site"]!["waterDensity"] = "salt";
        file["openings"]![0]!["colour"] = "red";
        file["openings"]![1]!["clearWidth"] = null;

        var paths = ProjectFileReader.Read(Bytes(file)).Problems.Select(p => p.Path);

        Assert.Equal(["site.waterDensity", "openings[0].colour", "openings[1].clearWidth"], paths);
    }

    [Fact]
    public void Read_UnknownFieldAnywhere_IsRefusedWithItsPath()
    {
        foreach (var place in JsonPlace.All(Example.FullJson()).Where(p => p.Node is JsonObject))
        {
            var file = Example.FullJson();
            JsonPlace.Find(file, place.Path).Node!.AsObject()["colour"] = "red";

            var problem = Assert.Single(ProjectFileReader.Read(Bytes(file)).Problems);

            Assert.Equal(place.Path.Length == 0 ? "colour" : $"{place.Path}.colour", problem.Path);
            Assert.Contains("\"red\"", problem.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Read_WrongTypeAnywhere_IsRefusedWithItsPath()
    {
        string[] others = ["true", "-12.5", "\"Ø\\n\\\"\"", "[]", "{}", "null"];
        foreach (var place in JsonPlace.All(Example.FullJson()).Where(p => p.Path.Length > 0))
        {
            foreach (var other in others.Where(o => !MayHold(place, o)))
            {
                var problems = ProjectFileReader.Read(With(place.Path, other)).Problems;

                Assert.True(problems.Count > 0, $"{place.Path} took {other}");
                Assert.All(problems, p => Assert.StartsWith(place.Path, p.Path));
                Assert.All(problems, p => Assert.DoesNotContain('\n', p.ToString()));
            }
        }
    }

    [Fact]
    public void Read_FieldStandingTwiceAnywhere_IsRefusedWithItsPath()
    {
        var text = Encoding.UTF8.GetString(ProjectFileWriter.Write(Example.Full));
        var lines = text.Split('\n');
        for (var i = 0; i < lines.Length; i++)
        {
            if (!lines[i].Contains("\": ", StringComparison.Ordinal) || lines[i].EndsWith('{') || lines[i].EndsWith('['))
            {
                continue;
            }

            var twice = string.Join('\n', [.. lines[..i], lines[i].TrimEnd(',') + ",", .. lines[i..]]);
            var problem = Assert.Single(ProjectFileReader.Read(Encoding.UTF8.GetBytes(twice)).Problems);

            Assert.EndsWith(lines[i].Split('"')[1], problem.Path);
            Assert.StartsWith("The field stands here again, with ", problem.Message);
        }
    }

    [Fact]
    public void Read_HundredsOfProblems_TellsTheFirstHundredAndCountsTheRest()
    {
        var file = Example.FullJson();
        for (var i = 0; i < 734; i++)
        {
            file[$"x{i}"] = i;
        }

        var problems = ProjectFileReader.Read(Bytes(file)).Problems;

        Assert.Equal(101, problems.Count);
        Assert.Equal("There are 634 further problems.", problems[^1].ToString());
    }

    private static byte[] With(string path, string json)
    {
        var file = Example.FullJson();
        JsonPlace.Find(file, path).Replace(JsonNode.Parse(json));
        return Bytes(file);
    }

    private static byte[] Bytes(JsonNode file) => Encoding.UTF8.GetBytes(file.ToJsonString());

    /// <summary>What the format allows at a place besides the type that stands there.</summary>
    private static bool MayHold(JsonPlace place, string other)
    {
        string[] nullable =
        [
            "ownBasis", "confirmed", "cornerRadius", "innerRadius", "leakage", "strengths", "openings", "levels", "wall", "actions", "flow", "wave", "debris", "coefficients", "wind", "line", "posts", "byOthers", "groundLevel",
            "protectedSideLevel", "response", "bendingStrength", "shearStrength", "allowableBending", "allowableShear",
            "below", "ultimateStrength", "weldedYield", "weldedUltimate", "shearModulus", "crossStrength", "crossCompression", "characteristicDensity", "bucklingClass",
            "raker", "footResistance", "basePlate", "weldLeg", "weldStrength",
            "guides", "wallBearing", "tension", "shear", "minimumEdge", "minimumSpacing",
            "anchors", "headArea", "hookLength", "pullout", "criticalEdge", "edgeFlood", "edgeProtected", "edgeLeft", "edgeRight", "washerThickness", "tensionResistance", "shearResistance",
            "covers", "fixingLever",
            "joint", "sealCompression", "timber", "composite",
            "footing", "measure", "lineResistance", "totalResistance",
        ];
        string[] whole = ["count", "webs", "riskCategory", "category", "rodsPerRow"];
        string[] emptyAllowed = ["confirmed", "covers", "leakage", "timber", "strengths", "openings", "levels", "bays", "byOthers", "below", "wall", "actions", "coefficients"];
        string[] libraryId = ["material", "profile"];
        string[] words = ["format", "designBasis", "floodZone", "kind", "family", "shape", "bucklingClass", "strengthReference", "mounting", "valuesFor", "measure", "soil", "duration", "method", "support", "position", "pressing"];
        var name = place.Name;
        return other switch
        {
            "null" => nullable.Contains(name),
            "-12.5" => (place.Node is null ? name != "posts" : place.Node.GetValueKind() == JsonValueKind.Number)
                && !whole.Contains(name) && name != "version",
            "[]" => place.Node is JsonArray && emptyAllowed.Contains(name),
            "{}" => place.Node is JsonObject && emptyAllowed.Contains(name),
            "true" => name is "backFlowClosed" or "sealed" or "carriesGuides" or "weldedBase" or "ductile" or "cracked" or "supplementaryReinforcement" or "sharedShear",
            _ => (place.Node?.GetValueKind() == JsonValueKind.String && !words.Contains(name)) || libraryId.Contains(name),
        };
    }
}
