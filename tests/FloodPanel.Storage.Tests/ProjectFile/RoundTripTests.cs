using System.Text;
using System.Text.Json.Nodes;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.Tests.ProjectFile;

public class RoundTripTests
{
    public static TheoryData<ProfileChoice> Profiles { get; } =
    [
        new LibraryProfile("log-200-80"),
        new Rectangle { Height = 0.15, Depth = 0.06 },
        new HollowRectangle { Height = 0.2, Depth = 0.08, Face = 0.003, Web = 0.0035, Webs = 4 },
        new RectangularTube { Height = 0.1, Depth = 0.15, Wall = 0.008 },
        new RectangularTube { Height = 0.1, Depth = 0.15, Wall = 0.008, CornerRadius = 0.02 },
        new RectangularTube { Height = 0.1, Depth = 0.15, Wall = 0.008, CornerRadius = 0.012, InnerRadius = 0.008 },
        new ISection { Height = 0.1, Depth = 0.12, Flange = 0.01, Web = 0.006 },
        new GivenProperties
        {
            Height = 0.2, Depth = 0.05, Area = 0.0041, Inertia = 1.7e-6, Modulus = 4.3e-5, PlasticModulus = 5e-5, ShearArea = 4.4e-4,
        },
    ];

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Read_WrittenProject_IsEqual(bool indented)
    {
        var file = ProjectFileWriter.Write(Example.Full, indented);

        var project = Example.Read(file);

        Assert.Equal(Example.Full, project);
    }

    [Theory]
    [MemberData(nameof(Profiles))]
    public void Read_WrittenProfile_IsEqual(ProfileChoice profile)
    {
        var opening = Example.Full.Openings[0];
        var logs = opening.Barrier.Logs with { Profile = profile };
        var written = Example.Full with { Openings = [opening with { Barrier = opening.Barrier with { Logs = logs } }] };

        var read = Example.Read(ProjectFileWriter.Write(written));

        Assert.Equal(profile, read.Openings[0].Barrier.Logs.Profile);
    }

    [Theory]
    [InlineData("sample-project.json")]
    [InlineData("example-with-comments.json")]
    public void Write_ReadFileTwice_IsByteIdentical(string sample)
    {
        var once = ProjectFileWriter.Write(Example.Read(File.ReadAllBytes(Example.SamplePath(sample))));

        var twice = ProjectFileWriter.Write(Example.Read(once));

        Assert.Equal(Encoding.UTF8.GetString(once), Encoding.UTF8.GetString(twice));
    }

    [Fact]
    public void Read_AnyFiniteNumbers_KeepEveryBit()
    {
        var random = new Random(20_250);
        for (var round = 0; round < 200; round++)
        {
            var site = Example.Full.Site with
            {
                WaterDensity = AnyFinite(random),
                DesignStillWaterLevel = AnyFinite(random),
                Surge = random.NextDouble(),
                Levels = [new LevelPoint(AnyFinite(random), Math.Round(random.NextDouble(), 3))],
            };

            var read = Example.Read(ProjectFileWriter.Write(Example.Full with { Site = site })).Site;

            Assert.Equal(site, read);
        }
    }

    [Fact]
    public void Write_Full_HasTheNamesAndOrderOfTheFormat()
    {
        var file = Example.FullJson();

        Assert.Equal("format version name reference client address engineer designBasis ownBasis confirmed site openings covers", Names(file));
        Assert.Equal(
            "id name sillLevel groundLevel clearWidth clearHeight rake protectedSideLevel wall actions barrier leakage",
            Names(file["openings"]![0]!));
        Assert.Equal("logs bays posts basePlate anchors guides footing byOthers", Names(file["openings"]![0]!["barrier"]!));
        Assert.Equal("flow wave debris wind line", Names(file["openings"]![0]!["actions"]!));
    }

    [Fact]
    public void Write_Indented_EndsLinesAlikeEverywhere()
    {
        var text = Encoding.UTF8.GetString(ProjectFileWriter.Write(Example.Full));

        Assert.DoesNotContain('\r', text);
        Assert.EndsWith("}\n", text);
        Assert.Contains("Überlauf 水門", text);
    }

    private static string Names(JsonNode node) => string.Join(' ', node.AsObject().Select(p => p.Key));

    private static double AnyFinite(Random random)
    {
        while (true)
        {
            var value = BitConverter.Int64BitsToDouble(random.NextInt64(long.MinValue, long.MaxValue));
            if (double.IsFinite(value))
            {
                return value;
            }
        }
    }
}
