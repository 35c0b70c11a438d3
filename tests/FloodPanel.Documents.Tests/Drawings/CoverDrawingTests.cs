using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class CoverDrawingTests
{
    private static readonly Project Project = new() { Name = "covers", Site = new Site { DesignStillWaterLevel = 10 } };

    public static TheoryData<CoverPlate, CoverPosition, double> Covers => new MatrixTheoryData<CoverPlate, CoverPosition, double>(
        [
            new RectangleCover { Width = 0.6, Height = 0.4 }, new RectangleCover { Width = 20, Height = 2, Support = RectangleSupport.ThreeEdges },
            new RectangleCover { Width = 0.05, Height = 0.5 }, new CircleCover { Diameter = 0.8 },
        ],
        [CoverPosition.Upright, CoverPosition.Flat],
        [8, 9.9, 15]);

    /// <summary>Wide, slender, round; dry, partly wetted, deep: everything stands on the sheet.</summary>
    [Theory]
    [MemberData(nameof(Covers))]
    public void Draw_AnyCover_StaysOnTheSheet(CoverPlate plate, CoverPosition position, double level)
    {
        foreach (var units in Enum.GetValues<UnitSystem>())
        {
            var scene = Draw(new Cover { Plate = plate, Position = position, Level = level }, units);

            Assert.All(TextBox.Of(scene), box => Assert.True(box.Left >= -0.01 && box.Right <= scene.Width + 0.01 && box.Top >= -0.01 && box.Bottom <= scene.Height + 0.01, box.ToString()));
            Assert.Contains("svg", SvgWriter.WriteText(scene), StringComparison.Ordinal);
        }
    }

    /// <summary>Dimensions lead to their fields, the water to its figures.</summary>
    [Fact]
    public void Draw_Vent_SaysWhatMatters()
    {
        var scene = Draw(new Cover { Name = "Vent", Plate = new RectangleCover(), Level = 9 }, UnitSystem.SI);

        Assert.Equal(["width", "height"], scene.Shapes.OfType<Mark>().Select(m => m.Field!));
        var words = scene.Shapes.OfType<Text>().Select(t => t.Words).ToArray();
        Assert.Contains("water, 0.600 m above the upper edge", words);
        Assert.Contains("9.81 kPa", words);
        Assert.Equal("Vent: 0.600 m by 0.400 m, 14 fasteners, 1.000 m of water above its lowest point.", scene.Description);
    }

    [Fact]
    public void Draw_AboveTheWater_NoPressure()
    {
        var scene = Draw(new Cover { Plate = new RectangleCover(), Level = 11 }, UnitSystem.SI);

        Assert.DoesNotContain(scene.Shapes.OfType<Polygon>(), p => p.Fill is FillRole.Hydrostatic or FillRole.Water);
    }

    private static Scene Draw(Cover cover, UnitSystem units)
    {
        var named = cover with
        {
            Name = cover.Name.Length > 0 ? cover.Name : "cover",
            Material = new Material { Family = MaterialFamily.Steel, Density = 7850, ElasticModulus = 210e9, AllowableBending = 140e6 },
        };
        return CoverDrawing.Draw(Design.Evaluate(Project, named, Library.Empty), Project.Site, units);
    }
}
