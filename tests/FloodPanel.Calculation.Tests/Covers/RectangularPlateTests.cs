using FloodPanel.Calculation.Covers;
using MathNet.Numerics.Integration;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>
/// Lévy's series against Navier's double series (four edges), against least energy (<see cref="RitzPlate"/>), and against statics: what
/// the edges and corners carry is the load.
/// </summary>
public class RectangularPlateTests
{
    private const double Poisson = 0.3;

    public static TheoryData<double, double, double> Waters => new()
    {
        { 1.0, 1.0, -1 },
        { 0.7, 1.3, 0.35 },
        { 1.6, 0.8, -0.9 },
        { 2.0, 0.6, 0.5 },
        { 0.3, 2.4, 0 },
    };

    /// <summary>Depth of the upper edge; above the water where negative, so that the line crosses the plate.</summary>
    [Theory]
    [MemberData(nameof(Waters))]
    public void FourEdges_AnyWater_NaviersSeries(double height, double width, double depth)
    {
        var pressure = PlatePressure.Water(1000, Math.Max(depth, -0.6 * height));
        var plate = new RectangularPlate(height, width, Poisson, PlateEdge.Supported, PlateEdge.Supported, pressure);

        foreach (var (x, y) in new[] { (0.5, 0.5), (0.7, 0.5), (0.3, 0.2), (0.85, 0.35) })
        {
            var (bulge, down, across) = Navier(height, width, pressure, x * height, y * width);
            var moments = plate.Moments(x * height, y * width);

            Near(bulge, plate.Bulge(x * height, y * width), 1e-6 * Math.Abs(bulge));
            Near(down, moments.Down, 2e-4 * (Math.Abs(down) + Math.Abs(across)));
            Near(across, moments.Across, 2e-4 * (Math.Abs(down) + Math.Abs(across)));
        }
    }

    /// <summary>A little water at the foot bends the plate in a strip that a coarse search would step over.</summary>
    [Theory]
    [InlineData(-1.37)]
    [InlineData(-1.30)]
    [InlineData(-1.00)]
    public void Worst_StripOfWaterAtTheFoot_NotMissed(double depth)
    {
        var plate = new RectangularPlate(1.42, 0.69, 0.4, PlateEdge.Supported, PlateEdge.Supported, PlatePressure.Water(1000, depth));

        var worst = plate.Worst().Moment;

        var most = Enumerable.Range(0, 1421).Max(x => plate.Moments(x / 1000.0, 0.345).Greatest);
        Assert.InRange(worst, most, 1.01 * most);
    }

    [Theory]
    [InlineData(1.0, 1.0, 0)]
    [InlineData(0.6, 1.5, 0.4)]
    [InlineData(1.5, 1.0, -0.5)]
    [InlineData(2.0, 0.8, 0.2)]
    public void FreeTop_AnyWater_LeastEnergy(double height, double width, double depth)
    {
        var pressure = PlatePressure.Water(1000, depth);
        var plate = new RectangularPlate(height, width, Poisson, PlateEdge.Free, PlateEdge.Supported, pressure);
        var ritz = new RitzPlate(height, width, Poisson, PlateEdge.Free, pressure);
        var (most, worst) = (plate.Worst().Bulge, plate.Worst().Moment);

        foreach (var (x, y) in new[] { (0.0, 0.5), (0.5, 0.5), (0.75, 0.5), (0.4, 0.25) })
        {
            var (bulge, down, across) = ritz.At(x * height, y * width);
            var moments = plate.Moments(x * height, y * width);

            Near(bulge, plate.Bulge(x * height, y * width), 1e-5 * most);
            Near(down, moments.Down, 1e-3 * worst);
            Near(across, moments.Across, 1e-3 * worst);
        }
    }

    /// <summary>A free lower edge is a free upper edge upside down.</summary>
    [Fact]
    public void FreeBottom_UniformPressure_MirrorsFreeTop()
    {
        var up = new RectangularPlate(0.8, 1.1, Poisson, PlateEdge.Free, PlateEdge.Supported, PlatePressure.Uniform(5000));
        var down = new RectangularPlate(0.8, 1.1, Poisson, PlateEdge.Supported, PlateEdge.Free, PlatePressure.Uniform(5000));

        Hand.Equal(up.Worst().Moment, down.Worst().Moment);
        Hand.Equal(up.Worst().Bulge, down.Worst().Bulge);
        Hand.Equal(up.Worst().Reaction, down.Worst().Reaction);
        Hand.Equal(up.Bulge(0, 0.55), down.Bulge(0.8, 0.55));
    }

    /// <summary>Reactions of the edges less the forces that hold the corners down are the load: the slow part is the side edges' ends.</summary>
    [Theory]
    [InlineData(PlateEdge.Supported, 1.0, 1.0, 0.5)]
    [InlineData(PlateEdge.Supported, 0.5, 1.4, -0.2)]
    [InlineData(PlateEdge.Free, 1.0, 1.0, 0.5)]
    [InlineData(PlateEdge.Free, 1.4, 0.9, -0.6)]
    public void Reactions_AnyWater_CarryTheLoad(PlateEdge top, double height, double width, double depth)
    {
        var pressure = PlatePressure.Water(1000, depth);
        var plate = new RectangularPlate(height, width, Poisson, top, PlateEdge.Supported, pressure);
        var wet = height - pressure.Start;
        var load = width * (pressure.AtTop * height + pressure.Rise * wet * wet / 2);

        var edges = GaussLegendreRule.Integrate(plate.BottomReaction, 0, width, 64)
            + GaussLegendreRule.Integrate(plate.TopReaction, 0, width, 64)
            + 2 * GaussLegendreRule.Integrate(plate.SideReaction, 0, height, 64);
        var corners = 2 * (plate.TopCornerHold + plate.BottomCornerHold);

        Near(load, edges - corners, 2e-3 * load);
    }

    /// <summary>A long plate bends as a strip across its short side: w = 5·q·a⁴/(384·D), M = q·a²/8, r = q·a/2.</summary>
    [Fact]
    public void FourEdges_TenTimesAsLong_Strip()
    {
        var plate = new RectangularPlate(10, 1, Poisson, PlateEdge.Supported, PlateEdge.Supported, PlatePressure.Uniform(1));

        Near(5.0 / 384, plate.Bulge(5, 0.5), 1e-6);
        Near(1.0 / 8, plate.Moments(5, 0.5).Across, 1e-5);
        Near(1.0 / 2, plate.SideReaction(5), 1e-5);
    }

    [Theory]
    [InlineData(0, 1, 0.3)]
    [InlineData(1, double.NaN, 0.3)]
    [InlineData(1, 1, 0.5)]
    [InlineData(10.1, 1, 0.3)]
    [InlineData(1, 10.1, 0.3)]
    public void Plate_OutsideItsLimits_Refused(double height, double width, double poisson) =>
        Assert.Throws<ArgumentOutOfRangeException>(() =>
            new RectangularPlate(height, width, poisson, PlateEdge.Supported, PlateEdge.Supported, PlatePressure.Uniform(1)));

    private static void Near(double expected, double actual, double tolerance) => Assert.Equal(expected, actual, tolerance);

    private static (double Bulge, double Down, double Across) Navier(double a, double b, PlatePressure pressure, double x, double y)
    {
        const int last = 401;
        var (bulge, down, across) = (0.0, 0.0, 0.0);
        for (var m = 1; m <= last; m++)
        {
            var mu = m * Math.PI / a;
            var (c, end) = (pressure.Start, a);
            var ramp = pressure.Rise * (-(end - c) * Math.Cos(mu * end) / mu + (Math.Sin(mu * end) - Math.Sin(mu * c)) / (mu * mu));
            var along = 2 / a * (ramp + pressure.AtTop * (1 - Math.Cos(mu * a)) / mu);
            for (var n = 1; n <= last; n += 2)
            {
                var alpha = n * Math.PI / b;
                var sum = mu * mu + alpha * alpha;
                var w = along * 4 / (n * Math.PI) / (sum * sum) * Math.Sin(mu * x) * Math.Sin(alpha * y);
                bulge += w;
                down += (mu * mu + Poisson * alpha * alpha) * w;
                across += (alpha * alpha + Poisson * mu * mu) * w;
            }
        }

        return (bulge, down, across);
    }
}
