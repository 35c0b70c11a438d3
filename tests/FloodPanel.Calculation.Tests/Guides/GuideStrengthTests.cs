using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Tests.Guides;

public class GuideStrengthTests
{
    /// <summary>R = 2 kN at 50 mm: 100 N·m on 80 × 10 mm, W = 1333 mm³: 75 MPa.</summary>
    [Fact]
    public void BaseBending_ByHand() => Hand.Equal(75e6, GuideStrength.BaseBending(100, 0.08, 0.01));

    [Theory]
    [InlineData(double.NaN, 0.03, 0.008)]
    [InlineData(1e4, -0.01, 0.008)]
    [InlineData(1e4, 0.03, 0)]
    public void LipBending_OutOfRange_Refuses(double line, double lever, double thickness) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideStrength.LipBending(line, lever, thickness));

    [Fact]
    public void LipShear_NoThickness_Refuses() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideStrength.LipShear(1e4, 0));

    [Fact]
    public void BaseBending_NoWidth_Refuses() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideStrength.BaseBending(100, 0, 0.01));
}
