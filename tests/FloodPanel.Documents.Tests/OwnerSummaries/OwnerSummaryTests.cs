using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.OwnerSummaries;
using FloodPanel.Documents.Reports;

namespace FloodPanel.Documents.Tests.OwnerSummaries;

public class OwnerSummaryTests
{
    [Fact]
    public void Compose_EveryVerdictAdequate_NoBand()
    {
        var report = Compose("adequate");

        Assert.Null(report.Band);
        var verdict = Assert.Single(All(report).OfType<VerdictLine>());
        Assert.Equal(VerdictKind.Adequate, verdict.Kind);
        Assert.Equal("Every check made here has passed; the rest is designed by others, who are named.", verdict.Lead);
        Assert.Contains("Designed by others: logs (Ostrey Anchors, D-12)", verdict.Words, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("none", "No opening has been entered yet")]
    [InlineData("one", "The barrier is not shown to be adequate")]
    [InlineData("inadequate", "The barrier is not shown to be adequate")]
    [InlineData("three", "3 of 3 barriers are not shown to be adequate")]
    public void Compose_AnyVerdictNotAdequate_BandSaysWhy(string project, string reason)
    {
        var report = Compose(project);

        Assert.Equal(new Band("Not for construction", reason), report.Band);
    }

    /// <summary>Covers stand in a table of their own; one that is not adequate keeps the page from being built from.</summary>
    [Fact]
    public void Compose_Covers_TableWithVerdictsBandAndWhatIsMissing()
    {
        var cover = new Cover
        {
            Name = "Cellar vent",
            Plate = new RectangleCover { Width = 0.6, Height = 0.4 },
            Level = Sample.Project.Site.DesignFloodLevel - 0.5,
            Material = new Material { Family = MaterialFamily.Steel, Density = 7850, ElasticModulus = 210e9, AllowableBending = 140e6 },
        };
        var project = Sample.Project with { Openings = [], Covers = [cover] };

        var report = OwnerSummary.Compose(Design.Run(project, Library.Empty), Library.Empty, UnitSystem.SI, 1, new DateOnly(2026, 3, 1));

        var row = All(report).OfType<Table>().Single(t => t.Columns[0].Heading == "Cover").Rows[0];
        Assert.Equal(["Cellar vent", "0.600 × 0.400", "6.0", "14", "0.500", "Incomplete"], row);
        Assert.Equal(new Band("Not for construction", "The cover is not shown to be adequate"), report.Band);
        Assert.Contains(All(report).OfType<Paragraph>(), p => p.Words.StartsWith("Cellar vent: Enter the tension", StringComparison.Ordinal));
    }

    [Fact]
    public void Compose_Actions_AreNamedInTheOwnersWords()
    {
        var project = Sample.Project with
        {
            Openings =
            [
                Sample.Garage with
                {
                    Actions = new()
                    {
                        Flow = new() { Velocity = 1.2 },
                        Wave = new NonBreakingWaveInput { Height = 0.2, Period = 2.5 },
                        Debris = new() { Velocity = 1.2 },
                        Wind = new() { Pressure = 700 },
                    },
                },
            ],
        };

        var report = OwnerSummary.Compose(Design.Run(project, Library.Empty), Library.Empty, UnitSystem.SI, 1, new DateOnly(2026, 3, 1));

        Assert.Contains(
            "Calculated for still water, flow of 1.20 m/s, waves 0.200 m high, a floating object of 450 kg at 1.20 m/s and wind on the dry barrier.",
            All(report).OfType<Paragraph>().Select(p => p.Words));
    }

    [Fact]
    public void Compose_IncompleteVerdict_NamesWhatIsMissingAndForbidsBuilding()
    {
        var report = Compose("one");

        var verdict = Assert.Single(All(report).OfType<VerdictLine>());
        Assert.Contains("must not be built", verdict.Lead, StringComparison.Ordinal);
        Assert.Contains("anchors, guides and supporting wall", verdict.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Compose_InadequateVerdict_NamesTheFailureAndWhatIsMissing()
    {
        var report = Compose("inadequate");

        var verdict = Assert.Single(All(report).OfType<VerdictLine>());
        Assert.Contains("a check fails", verdict.Lead, StringComparison.Ordinal);
        Assert.Contains("Not yet checked are base plates, anchors, guides and supporting wall.", verdict.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Compose_ChecksByOthers_PrintsNameAndReference()
    {
        var report = Compose("adequate");

        var verdict = Assert.Single(All(report).OfType<VerdictLine>());
        Assert.Contains("anchors (Ostrey Anchors, D-12)", verdict.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Compose_Levels_PrintsThemInTheDatumAndAboveTheSill()
    {
        var report = Compose("one");

        // 12.10 + 0.15 + 0.10 = 12.35; 12.35 − 11.70 = 0.65; five logs of 0.20 = 1.00.
        var level = All(report).OfType<Paragraph>().First().Words;
        Assert.Contains("up to 12.350 m", level, StringComparison.Ordinal);
        Assert.Contains("Levels are in Ostrey datum.", level, StringComparison.Ordinal);
        Assert.Equal(
            ["Front door", "0.950", "11.700", "0.650", "1.000", "Incomplete"], All(report).OfType<Table>().First().Rows[0]);
    }

    [Fact]
    public void Compose_BaysAlike_ShareARow()
    {
        var report = Compose("three");

        // Cutting length = clear bay + 2 end bearings − fitting clearance: 1.60 + 0.08 − 0.01.
        var parts = All(report).OfType<Table>().Last();
        Assert.Equal(["Garage door", "1 and 2", "6", "200", "1.670"], parts.Rows[0].Take(5));
        Assert.Equal("1", parts.Rows[0][6]);
        Assert.Equal("none", parts.Rows[1][6]);
        Assert.Equal("1 to 3", parts.Rows[2][1]);
    }

    [Fact]
    public void Compose_SeveralOpenings_CautionsNameTheirOpening()
    {
        var report = Compose("three");

        Assert.Contains(
            All(report).OfType<Paragraph>(),
            p => p.Words.StartsWith("Gap in the yard wall: ", StringComparison.Ordinal)
                && p.Words.Contains("cavity masonry", StringComparison.Ordinal));
    }

    [Fact]
    public void Compose_AnyProject_PrintsTheSafetyWordsOnce()
    {
        var report = Compose("three");

        var safety = All(report).OfType<Paragraph>().Where(p => p.Words.Contains("licensed engineer", StringComparison.Ordinal));
        Assert.Contains("people leave when told to", Assert.Single(safety).Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Compose_UnitSystem_SetsThePaper()
    {
        Assert.Equal(Paper.A4, Compose("one").Paper);
        Assert.Equal(Paper.Letter, Compose("one", UnitSystem.USCustomary).Paper);
    }

    private static Report Compose(string project, UnitSystem units = UnitSystem.SI) =>
        OwnerSummary.Compose(Projects.Run(project), Library.Empty, units, 3, new DateOnly(2026, 12, 1));

    private static IEnumerable<Block> All(Report report) =>
        report.Blocks.SelectMany(b => b is Together together ? together.Blocks : [b]);
}
