using FloodPanel.Calculation.Covers;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>
/// Circular plates: centre and edge values of handbooks under uniform pressure, the plate equation by finite differences and statics
/// under a pressure that grows with depth.
/// </summary>
public class CircularPlateTests
{
    private const double Poisson = 0.33;

    /// <summary>w₀ = (5 + ν)/(1 + ν)·q·r⁴/(64·D), M₀ = (3 + ν)·q·r²/16.</summary>
    [Fact]
    public void Supported_Uniform_HandbookFormulas()
    {
        var response = new CircularPlate(0.4, Poisson, isClamped: false, 12_000, 0).Worst();

        Hand.Equal(5.33 / 1.33 * 12_000 * Math.Pow(0.4, 4) / 64, response.Bulge);
        Hand.Equal(3.33 * 12_000 * 0.16 / 16, response.Moment);
        Hand.Equal(12_000 * 0.4 / 2, response.Reaction);
        Assert.Equal(0, response.EdgeMoment);
    }

    /// <summary>w₀ = q·r⁴/(64·D), edge moment q·r²/8, M₀ = (1 + ν)·q·r²/16.</summary>
    [Fact]
    public void Clamped_Uniform_HandbookFormulas()
    {
        var plate = new CircularPlate(0.4, Poisson, isClamped: true, 12_000, 0);

        Hand.Equal(12_000 * Math.Pow(0.4, 4) / 64, plate.Worst().Bulge);
        Hand.Equal(12_000 * 0.16 / 8, plate.Worst().EdgeMoment);
        Hand.Equal(12_000 * 0.16 / 8, plate.Worst().Moment);
        Hand.Equal(1.33 * 12_000 * 0.16 / 16, plate.Moments(0, 0).Down);
    }

    /// <summary>∇⁴(D·w) = p at places all over the plate, by nine-point differences of differences.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Bulge_TiltedPressure_SolvesThePlateEquation(bool isClamped)
    {
        var plate = new CircularPlate(1, Poisson, isClamped, middle: 10, rise: 8);
        const double step = 0.02;

        foreach (var (x, y) in new[] { (0.0, 0.0), (0.5, 0.1), (-0.6, 0.3), (0.1, -0.7) })
        {
            Assert.Equal(10 + 8 * x, Laplacian((u, v) => Laplacian(W, u, v), x, y), tolerance: 1e-4);
        }

        double W(double x, double y) => plate.Bulge(Math.Sqrt(x * x + y * y), Math.Atan2(y, x));
        static double Laplacian(Func<double, double, double> f, double x, double y) =>
            (f(x + step, y) + f(x - step, y) + f(x, y + step) + f(x, y - step) - 4 * f(x, y)) / (step * step);
    }

    /// <summary>The edge stays where it is, and does not turn or bends freely.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Edge_TiltedPressure_HeldAsSaid(bool isClamped)
    {
        var plate = new CircularPlate(1, Poisson, isClamped, middle: 10, rise: 8);
        const double step = 1e-5;

        foreach (var angle in new[] { 0, 0.7, 2.2, Math.PI })
        {
            Assert.Equal(0, plate.Bulge(1, angle), tolerance: 1e-12);
            Assert.Equal(0, isClamped ? plate.Bulge(1 - step, angle) / step : plate.Moments(1, angle).Down, tolerance: 1e-4);
        }
    }

    /// <summary>Moments are those of the curvature: M_r = −D·(w'' + ν·w'/r …), at the angle where nothing twists.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Moments_TiltedPressure_FollowTheCurvature(bool isClamped)
    {
        var plate = new CircularPlate(1, Poisson, isClamped, middle: 10, rise: 8);
        const double step = 1e-3;
        const double at = 0.6;
        double W(double x, double y) => plate.Bulge(Math.Sqrt(x * x + y * y), Math.Atan2(y, x));
        var along = (W(at + step, 0) - 2 * W(at, 0) + W(at - step, 0)) / (step * step);
        var ring = (W(at, step) - 2 * W(at, 0) + W(at, -step)) / (step * step);

        Assert.Equal(-(along + Poisson * ring), plate.Moments(at, 0).Down, tolerance: 1e-4);
        Assert.Equal(-(ring + Poisson * along), plate.Moments(at, 0).Across, tolerance: 1e-4);
    }

    /// <summary>About the level diameter: ∮r_n·x ds less what the clamped edge takes is ∫p·x dA = k·π·r⁴/4.</summary>
    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Reaction_TiltedPressure_BalancesTheLoad(bool isClamped)
    {
        const double radius = 0.7;
        var plate = new CircularPlate(radius, Poisson, isClamped, middle: 10, rise: 8);
        const int parts = 720;
        var (force, moment) = (0.0, 0.0);
        for (var i = 0; i < parts; i++)
        {
            var angle = 2 * Math.PI * i / parts;
            var arc = 2 * Math.PI * radius / parts;
            force += plate.Reaction(angle) * arc;
            moment += (plate.Reaction(angle) * radius * Math.Cos(angle) + plate.Moments(1, angle).Down * Math.Cos(angle)) * arc;
        }

        Hand.Equal(10 * Math.PI * radius * radius, force);
        Hand.Equal(8 * Math.PI * Math.Pow(radius, 4) / 4, moment);
    }

    [Theory]
    [InlineData(0, 0.3, 10, 0)]
    [InlineData(1, 0.5, 10, 0)]
    [InlineData(1, 0.3, -1, 0)]
    [InlineData(1, 0.3, 10, 11)]
    public void Plate_OutsideItsLimits_Refused(double radius, double poisson, double middle, double rise) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new CircularPlate(radius, poisson, isClamped: true, middle, rise));
}
