using FloodPanel.Calculation.PlaneAreas;

namespace FloodPanel.Calculation.Tests.PlaneAreas;

public class PlaneAreaValidationTests
{
    [Theory]
    [InlineData(0, 90, 1000, "depth")]
    [InlineData(double.NaN, 90, 1000, "depth")]
    [InlineData(1, 0, 1000, "inclination")]
    [InlineData(1, 91, 1000, "inclination")]
    [InlineData(1, 90, 900, "waterDensity")]
    public void Validate_OutOfRange_NamesTheField(double depth, double inclination, double density, string path)
    {
        var input = new PlaneAreaInput { Depth = depth, InclinationDegrees = inclination, WaterDensity = density };

        Assert.Equal(path, Assert.Single(PlaneArea.Validate(input)).Path);
        Assert.Throws<ArgumentException>(() => PlaneArea.Evaluate(input));
    }

    [Fact]
    public void Validate_ShapesThatCannotBe_Refused()
    {
        Assert.Equal("diameter", Path(new CircleShape(0)));
        Assert.Equal("height", Path(new SegmentShape(1, 1, true)));
        Assert.Equal("bottom", Path(new TrapezoidShape(0, 0, 1)));
        Assert.Equal("corners", Path(new PolygonShape([new(0, 0), new(1, 0)])));
        Assert.Equal("corners[1].x", Path(new PolygonShape([new(0, 0), new(200, 0), new(0, 1)])));
        Assert.Equal("corners", Path(new PolygonShape([new(0, 0), new(1, 0), new(2, 0)])));
    }

    [Fact]
    public void Validate_PolygonThatCutsItself_NamesTheSides()
    {
        var problem = Assert.Single(PlaneArea.Validate(new() { Shape = new PolygonShape([new(0, 0), new(1, 1), new(1, 0), new(0, 1)]) }));

        Assert.Equal(
            "The side from corner 1 meets the side from corner 3; enter the corners in order, so that the sides do not cross.",
            problem.Message.ToString());
    }

    [Fact]
    public void Validate_PolygonWithManyCorners_Refused()
    {
        var corners = Enumerable.Range(0, 31).Select(i => new PlanePoint(Math.Cos(i * 0.2), Math.Sin(i * 0.2))).ToValueList();

        Assert.Equal("The polygon has 31 corners; allowed are 3 to 30.", PlaneArea.Validate(new() { Shape = new PolygonShape(corners) })[0].Message.ToString());
    }

    private static string Path(PlaneShape shape) => Assert.Single(PlaneArea.Validate(new() { Shape = shape })).Path;
}
