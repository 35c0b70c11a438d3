using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Annual greatest sea levels at Port Pirie, 1923 to 1987 (data set portpirie of the R package evd 2.3). Gumbel fit by maximum
/// likelihood, recomputed outside this code (derived): μ 3.86944 m, σ 0.19489 m, x_10 4.3080 m, x_100 4.7660 m.
/// </summary>
public class PortPirieTests
{
    private const double Location = 3.86944;
    private const double Scale = 0.19489;
    private static readonly LevelCurve Printed = LevelCurve.Of([new(0.01, 4.7660), new(0.1, 4.3080)])!;

    /// <summary>x_T = μ − σ·ln y, y = −ln(1 − 1/T); the two ends are rounded to 0.00005 m, and so is what lies between.</summary>
    [Theory]
    [InlineData(20)]
    [InlineData(25)]
    [InlineData(50)]
    public void At_BetweenThePrintedLevels_IsTheGumbelLevel(double years)
    {
        var level = Location - Scale * Math.Log(-Math.Log(1 - 1 / years));

        Assert.Equal(level, Printed.At(1 / years)!.Value, tolerance: 0.00006);
    }

    /// <summary>50 years by hand: 1 − 1/50 = 0.98, −ln 0.98 = 0.0202027, ln of it −3.90194: 3.86944 + 0.19489·3.90194 = 4.62989.</summary>
    [Fact]
    public void At_FiftyYears_ByHand() => Assert.Equal(4.6299, Printed.At(0.02)!.Value, tolerance: 0.00006);

    /// <summary>The slope of the line over the variate is the scale of the fit; ends to half a digit over a run of 2.35 give ± 0.00005.</summary>
    [Fact]
    public void Slope_OfThePrintedLevels_IsTheScale() =>
        Assert.Equal(Scale, (4.7660 - 4.3080) / (LevelCurve.Variate(0.01) - LevelCurve.Variate(0.1)), tolerance: 0.00005);

    /// <summary>Three points of the fit lie on one straight line: the middle one changes nothing.</summary>
    [Fact]
    public void At_PointsOfTheFit_LieOnOneLine()
    {
        var ends = LevelCurve.Of([Fitted(0.5), Fitted(0.001)])!;

        Assert.All([0.1, 0.02, 0.01, 0.005], p => Assert.Equal(Fitted(p).Level, ends.At(p)!.Value, tolerance: 1e-12));
    }

    private static LevelPoint Fitted(double probability) => new(probability, Location - Scale * Math.Log(-Math.Log(1 - probability)));
}
