using FloodPanel.Calculation.PlaneAreas;
using FloodPanel.Calculation.Tests.Steps;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using MathNet.Numerics.Integration;

namespace FloodPanel.Calculation.Tests.PlaneAreas;

/// <summary>
/// Still water on plane areas: handbook moments (statics handbooks, from memory: π·D⁴/64, b·t³/12, b·t³/36, 0.10976·r⁴ of a
/// half circle about its centroid), and strips summed by quadrature, which share nothing with the integrals round the outline.
/// </summary>
public class PlaneAreaTests
{
    private const double Weight = 9806.65;

    /// <summary>Circular hatch, D 0.6 m, its lowest point 1.3 m down on a wall: h_c 1.0, y_p = 1 + D²/16.</summary>
    [Fact]
    public void Circle_OnAWall_HandbookMoments()
    {
        var result = Evaluate(new CircleShape(0.6), depth: 1.3);

        Hand.Equal(Weight * Math.PI * 0.09, result.Force);
        Hand.Equal(1.0, result.CentroidDepth);
        Hand.Equal(1.0 + 0.36 / 16, result.CentreOfPressureDepth);
        Assert.True(result.Submerged);
    }

    /// <summary>Rectangle 2 × 1.5 m with its upper side in the water line: F = γ·b·t²/2 at two thirds of the depth.</summary>
    [Fact]
    public void Rectangle_UpToTheWaterLine_TwoThirdsDown()
    {
        var result = Evaluate(new TrapezoidShape(2, 2, 1.5), depth: 1.5);

        Hand.Equal(Weight * 2 * 1.5 * 1.5 / 2, result.Force);
        Hand.Equal(1.0, result.CentreOfPressureDepth);
    }

    /// <summary>Triangle, apex in the water line: y_p = 3/4·t; base in the water line: t/2. F = γ·h_c·b·t/2.</summary>
    [Theory]
    [InlineData(1.2, 0, 2.0 / 3, 3.0 / 4)]
    [InlineData(0, 1.2, 1.0 / 3, 1.0 / 2)]
    public void Triangle_UpToTheWaterLine_HandbookCentres(double bottom, double top, double centroid, double pressure)
    {
        var result = Evaluate(new TrapezoidShape(bottom, top, 0.9), depth: 0.9);

        Hand.Equal(0.9 * centroid, result.CentroidDepth);
        Hand.Equal(0.9 * pressure, result.CentreOfPressureDepth);
        Hand.Equal(Weight * 0.9 * centroid * 1.2 * 0.9 / 2, result.Force);
    }

    /// <summary>Half circle, r 1 m, flat side up in the water line: h_c = 4r/3π, y_p = 3π·r/16.</summary>
    [Fact]
    public void HalfCircle_FlatSideInTheWaterLine_HandbookCentres()
    {
        var result = Evaluate(new SegmentShape(2, 1, ChordBelow: false), depth: 1);

        Hand.Equal(Math.PI / 2, result.WettedArea);
        Hand.Equal(4 / (3 * Math.PI), result.CentroidDepth);
        Hand.Equal(3 * Math.PI / 16, result.CentreOfPressureDepth);
    }

    /// <summary>The other way up, 0.10976·r⁴ about its centroid (handbook digits).</summary>
    [Fact]
    public void HalfCircle_FlatSideDown_HandbookInertia()
    {
        var moments = Outline.Of(new SegmentShape(2, 1, ChordBelow: true)).Below(double.PositiveInfinity);

        var centroid = moments.Up / moments.Area;

        Hand.Equal(4 / (3 * Math.PI), centroid);
        Assert.Equal(0.10976, moments.UpUp - moments.Area * centroid * centroid, tolerance: 0.000005);
    }

    /// <summary>
    /// Face at 60° to the horizontal, 0.9 m of water, γ = 9.81, per metre: 4.588 kN, 0.346 m up the slope (derived, recomputed
    /// outside this code).
    /// </summary>
    [Fact]
    public void Rectangle_Inclined_ForceAndPlaceUpTheSlope()
    {
        var input = new PlaneAreaInput
        {
            Shape = new TrapezoidShape(1, 1, 2),
            InclinationDegrees = 60,
            Depth = 0.9,
            WaterDensity = 9810 / 9.80665,
        };

        var result = PlaneArea.Evaluate(input);

        Assert.Equal(4.588, result.Force / 1000, tolerance: 0.0005);
        Assert.Equal(0.346, result.CentreOfPressure.S, tolerance: 0.0005);
        Assert.False(result.Submerged);
    }

    /// <summary>A right triangle with its legs across and up: I_xs = b²·t²/72 (handbook), so that the resultant leaves the middle.</summary>
    [Fact]
    public void RightTriangle_Unsymmetrical_CentreAside()
    {
        var result = Evaluate(new PolygonShape([new(0, 0), new(0.9, 0), new(0, 1.2)]), depth: 2);

        var (area, down, product) = (0.54, 2 - 0.4, -0.81 * 1.44 / 72);
        Hand.Equal(0.3 - product / (down * area), result.CentreOfPressure.X);
        Hand.Equal(0.54, result.WettedArea);
    }

    /// <summary>Any of them, wetted to any height, against strips: width of the shape times pressure, by Gauss-Legendre quadrature.</summary>
    [Theory]
    [InlineData(0.3)]
    [InlineData(0.75)]
    [InlineData(1.4)]
    [InlineData(2.6)]
    public void AnyShape_PartlyOrWhollyWetted_AsStrips(double depth)
    {
        Compare(new CircleShape(1.5), s => 2 * Math.Sqrt(Math.Max(0, s * (1.5 - s))), 1.5, depth);
        Compare(new SegmentShape(1.5, 0.5, false), s => 2 * Math.Sqrt(Math.Max(0, s * (1.5 - s))), 0.5, depth);
        Compare(new SegmentShape(1.5, 1.1, true), s => 2 * Math.Sqrt(Math.Max(0, (s + 0.4) * (1.1 - s))), 1.1, depth);
        Compare(new TrapezoidShape(0.7, 1.9, 1.2), s => 0.7 + s, 1.2, depth);
        Compare(new PolygonShape([new(0, 0), new(1, 0), new(1, 1), new(2, 2), new(0, 2)]), s => s <= 1 ? 1 : s, 2, depth);
    }

    /// <summary>The same corners begun elsewhere or run through the other way round are the same area.</summary>
    [Property(MaxTest = 50)]
    public void Polygon_OtherOrder_SameLoad(PositiveInt start)
    {
        PlanePoint[] corners = [new(0, 0.2), new(1.1, 0), new(1.4, 0.9), new(0.6, 0.7), new(-0.2, 1.3)];
        var turned = corners.Select((_, i) => corners[(i + start.Get) % corners.Length]).ToArray();

        var before = Evaluate(new PolygonShape([.. corners]), 1.1);

        Assert.All(new[] { turned, turned.Reverse().ToArray() }, order =>
        {
            var after = Evaluate(new PolygonShape([.. order]), 1.1);
            Hand.Equal(before.Force, after.Force);
            Hand.Equal(before.CentreOfPressure.X, after.CentreOfPressure.X);
            Hand.Equal(before.CentreOfPressure.S, after.CentreOfPressure.S);
        });
    }

    [Property(MaxTest = 100)]
    public Property AnyShape_DeeperWater_NeverLessForce()
    {
        var depths = Gen.Choose(1, 4000).Select(n => n / 1000.0).ToArbitrary();
        return Prop.ForAll(depths, depths, (a, b) => Shapes.All(shape =>
            Evaluate(shape, Math.Max(a, b)).Force >= Evaluate(shape, Math.Min(a, b)).Force * (1 - 1e-9)));
    }

    [Theory]
    [InlineData(0.2)]
    [InlineData(3)]
    public void Working_AnyShape_EveryLineHolds(double depth) => Assert.All(Shapes, shape =>
    {
        var result = PlaneArea.Evaluate(new() { Shape = shape, Depth = depth, InclinationDegrees = 55 });

        Assert.Empty(StepAudit.Complaints("plane area", result.Working.Steps));
        Assert.Equal(result.Force, result.Working.Steps.Single(s => s.Symbol == "F").Value);
        Assert.Equal(result.CentreOfPressureDepth, result.Working.Steps[^1].Value, tolerance: 1e-12);
    });

    private static PlaneShape[] Shapes =>
    [
        new CircleShape(0.9), new SegmentShape(1.2, 0.4, true), new SegmentShape(1.2, 1.0, false), new TrapezoidShape(1, 0, 0.8),
        new TrapezoidShape(0.4, 1.1, 1.3), new PolygonShape([new(3, 5), new(4, 5.5), new(3.6, 6.4), new(2.5, 6)]),
    ];

    private static PlaneAreaResult Evaluate(PlaneShape shape, double depth) =>
        PlaneArea.Evaluate(new() { Shape = shape, Depth = depth });

    private static void Compare(PlaneShape shape, Func<double, double> width, double top, double depth)
    {
        var result = Evaluate(shape, depth);
        var wetted = Math.Min(top, depth);
        // Round edges meet the level at a right angle: strips need many points there for six digits.
        double Strips(Func<double, double> function) => Enumerable.Range(0, 400).Sum(i => GaussLegendreRule.Integrate(
            function, wetted * i / 400, wetted * (i + 1) / 400, order: 16));

        var force = Strips(s => Weight * (depth - s) * width(s));
        var moment = Strips(s => Weight * (depth - s) * width(s) * s);

        Assert.Equal(force, result.Force, tolerance: 1e-6 * force);
        Assert.Equal(moment / force, result.CentreOfPressure.S, tolerance: 1e-6 * top);
        Assert.Equal(Strips(width), result.WettedArea, tolerance: 1e-6 * result.WettedArea);
    }
}
