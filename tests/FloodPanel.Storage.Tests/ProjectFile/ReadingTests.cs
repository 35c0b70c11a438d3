using System.Text;

namespace FloodPanel.Storage.Tests.ProjectFile;

public class ReadingTests
{
    /// <summary>Only what the format requires.</summary>
    private const string Least = """
        {
          "format": "floodpanel-project", "version": 1, "name": "Least",
          "site": { "designStillWaterLevel": 2.5 },
          "openings": [ {
            "id": "a", "sillLevel": 2, "clearWidth": 1, "clearHeight": 2,
            "barrier": {
              "logs": { "material": "c24", "profile": { "shape": "rectangle", "height": 0.2, "depth": 0.05 }, "count": 4 },
              "bays": [ 1 ]
            }
          } ]
        }
        """;

    [Fact]
    public void Read_LeastFile_TakesTheDefaultsOfTheTree()
    {
        var project = Example.Read(Encoding.UTF8.GetBytes(Least));

        var expected = new Project
        {
            Name = "Least",
            Site = new Site { DesignStillWaterLevel = 2.5 },
            Openings =
            [
                new Opening
                {
                    Id = "a",
                    SillLevel = 2,
                    ClearWidth = 1,
                    ClearHeight = 2,
                    Barrier = new Barrier
                    {
                        Logs = new LogStack
                        {
                            Material = new LibraryMaterial("c24"),
                            Profile = new Rectangle { Height = 0.2, Depth = 0.05 },
                            Count = 4,
                        },
                        Bays = [1],
                    },
                },
            ],
        };
        Assert.Equal(expected, project);
    }

    [Fact]
    public void Read_CommentedExample_HoldsItsFigures()
    {
        var project = Example.Read(File.ReadAllBytes(Example.SamplePath("example-with-comments.json")));

        var garage = Assert.Single(project.Openings);
        Assert.Equal("Mill Lane 4", project.Name);
        Assert.Equal(12.35, project.Site.DesignFloodLevel);
        Assert.Equal(new BreakingWaveInput { RiskCategory = 2 }, garage.Actions.Wave);
        Assert.Null(garage.Actions.Debris!.Coefficients.Response);
        Assert.Equal(new LibraryMaterial("s275"), garage.Barrier.Posts!.Material);
        Assert.Equal(new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.006 }, garage.Barrier.Posts.Profile);
        Assert.Equal([new DesignedByOthers("anchors", "", "")], garage.Barrier.ByOthers);
    }

    [Fact]
    public void Read_SampleProject_HoldsItsFigures()
    {
        var project = Example.Read(File.ReadAllBytes(Example.SamplePath("sample-project.json")));

        Assert.Equal(["dock", "side"], project.Openings.Select(o => o.Id));
        Assert.Equal(4.45, project.Site.DesignFloodLevel, tolerance: 1e-12);
        Assert.Equal(70e9, Assert.IsType<Material>(project.Openings[0].Barrier.Logs.Material).ElasticModulus);
        Assert.Equal(10, project.Openings[1].RakeDegrees);
    }

    [Fact]
    public void Read_ByteOrderMark_IsPassedOver()
    {
        byte[] file = [0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(Least)];

        Assert.Equal("Least", Example.Read(file).Name);
    }

    [Fact]
    public void Read_WholeNumberWithDecimals_IsTaken()
    {
        var file = Encoding.UTF8.GetBytes(Least.Replace("\"count\": 4", "\"count\": 4.0", StringComparison.Ordinal));

        Assert.Equal(4, Example.Read(file).Openings[0].Barrier.Logs.Count);
    }

    [Fact]
    public void Read_FiguresOutOfRange_AreLeftToValidation()
    {
        var file = Encoding.UTF8.GetBytes(Least.Replace("\"count\": 4", "\"count\": -3", StringComparison.Ordinal));

        Assert.Equal(-3, Example.Read(file).Openings[0].Barrier.Logs.Count);
    }

    [Theory]
    [InlineData("actions")]
    [InlineData("byOthers")]
    [InlineData("posts")]
    [InlineData("basePlate")]
    [InlineData("anchors")]
    [InlineData("guides")]
    [InlineData("footing")]
    public void Read_NullOfAnOptionalPart_IsAbsence(string name)
    {
        var file = name == "actions"
            ? Least.Replace("\"id\":", "\"actions\": null, \"id\":", StringComparison.Ordinal)
            : Least.Replace("\"bays\":", $"\"{name}\": null, \"bays\":", StringComparison.Ordinal);

        Assert.Equal(Example.Read(Encoding.UTF8.GetBytes(Least)), Example.Read(Encoding.UTF8.GetBytes(file)));
    }
}
