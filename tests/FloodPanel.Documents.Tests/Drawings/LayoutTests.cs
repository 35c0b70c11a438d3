using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class LayoutTests
{
    [Theory]
    [InlineData(0.09, 1)]
    [InlineData(0.11, 2)]
    [InlineData(2.0, 20)]
    [InlineData(2.01, 25)]
    [InlineData(10, 100)]
    public void Fit_Width_TakesTheLargestScaleThatFits(double width, int denominator) =>
        Assert.Equal(denominator, DrawingScale.Fit(width, 0.01, roomWide: 100, roomHigh: 100));

    [Fact]
    public void Draw_Scale_IsTrue()
    {
        var scene = ElevationDrawing.Draw(Sample.Input(Sample.Garage));

        // 3.300 m at 1:50 are 66 mm.
        var width = Assert.Single(scene.Shapes.OfType<Mark>(), m => m.Field == FieldKeys.ClearWidth);
        var line = width.Parts.OfType<Line>().Single(l => l.Role == LineRole.Dimension);
        Assert.Equal(50, scene.ScaleDenominator);
        Assert.Equal(66, line.To.X - line.From.X, 1e-9);
    }

    [Fact]
    public void OwnersSheet_LeaningFaceAndWaterOnBothSides_SectionGetsTheRoomItNeeds()
    {
        var scene = OpeningSheet.Draw(Openings.Input("raked", UnitSystem.SI), new Sheet(174, 61, 2.25));

        // About a metre of barrier is 1 cm at 1:100; smaller shows nothing.
        var title = Assert.Single(scene.Shapes.OfType<Text>(), t => t.Words.StartsWith("Section", StringComparison.Ordinal)).Words;
        Assert.InRange(int.Parse(title[(title.LastIndexOf(':') + 1)..], CultureInfo.InvariantCulture), 1, 100);
    }

    [Fact]
    public void Draw_WaterRises_SurfaceRisesByTheScale()
    {
        var low = Surface(Sample.Garage with { SillLevel = 11.40 });
        var high = Surface(Sample.Garage with { SillLevel = 11.30, GroundLevel = 11.15 });

        // 0.10 m more water at 1:25 is 4 mm.
        Assert.Equal(4, high - low, 1e-9);
    }

    [Fact]
    public void Apart_PlacesThatAreFarApart_StayWhereTheyAre() =>
        Assert.Equal([10, 20, 30], Spread.Apart([10, 20, 30], 4, 0, 100));

    [Fact]
    public void Apart_EqualPlaces_MoveEvenlyToBothSides() =>
        Assert.Equal([16, 20, 24], Spread.Apart([20, 20, 20], 4, 0, 100));

    [Fact]
    public void Apart_AtTheEdge_StaysInside() =>
        Assert.Equal([92, 96, 100], Spread.Apart([99, 99, 99], 4, 0, 100));

    [Fact]
    public void Inside_NonConvexPolygon_GivesEachPiece()
    {
        // A U: the line through its arms leaves it between them.
        SheetPoint[] shape = [new(0, 0), new(3, 0), new(3, 3), new(2, 3), new(2, 1), new(1, 1), new(1, 3), new(0, 3)];

        var pieces = PolygonCut.Inside(new Segment(new(-1, 2), new(4, 2)), shape).ToArray();

        Assert.Equal(
            [(0, 1), (2, 3)], pieces.Select(p => (Math.Round(p.From.X, 9), Math.Round(p.To.X, 9))));
    }

    [Fact]
    public void Inside_LineBeside_GivesNothing() =>
        Assert.Empty(PolygonCut.Inside(new Segment(new(5, 0), new(5, 3)), [new(0, 0), new(3, 0), new(3, 3)]));

    [Theory]
    [InlineData(6, 4, new[] { 1, 2, 3, 4, 5, 6 })]
    [InlineData(6, 2, new[] { 1, 3, 5 })]
    [InlineData(40, 0.75, new[] { 1, 10, 15, 20, 25, 30, 35, 40 })]
    public void Numbered_NarrowLogs_SkipsNumbers(int count, double pitch, int[] expected) =>
        Assert.Equal(expected, ElevationBarrier.Numbered(count, pitch, spacing: 3.3));

    [Fact]
    public void Draw_LongBarrier_LeavesBaysOutAndKeepsTheWidth()
    {
        var scene = ElevationDrawing.Draw(Openings.Input("twenty-metres", Calculation.UnitSystem.SI));

        var fields = scene.Shapes.OfType<Mark>().Select(m => m.Field).ToHashSet();
        Assert.Contains("bays[0]", fields);
        Assert.Contains("bays[11]", fields);
        Assert.DoesNotContain("bays[5]", fields);
        var width = scene.Shapes.OfType<Mark>().Single(m => m.Field == FieldKeys.ClearWidth);
        Assert.Equal("20.000, 12 bays of 1.575", width.Parts.OfType<Text>().Single().Words);
    }

    private static double Surface(Calculation.ProjectTree.Opening opening)
    {
        var scene = SectionDrawing.Draw(Sample.Input(opening), "design-flood");
        Assert.Equal(25, scene.ScaleDenominator);
        var sill = scene.Shapes.OfType<Mark>().First(m => m.Kind == MarkKind.Log).Parts.OfType<Polygon>().First().Points.Max(p => p.Y);
        var water = scene.Shapes.OfType<Line>().First(l => l.Role == LineRole.Water);
        return sill - water.From.Y;
    }
}
