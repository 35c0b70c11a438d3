using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.PostBases;

/// <summary>Welds and geometry against arithmetic by hand.</summary>
public class FilletWeldsTests
{
    /// <summary>EN 1993-1-8, 4.5.3.3: a 5 mm, f_u 430 MPa, β_w 0.85: 5·430/(√3·0.85·1.25) = 1168.285 N/mm.</summary>
    [Fact]
    public void SteelEurocode_S275_ByHand() =>
        Assert.Equal(1168.285, FilletWelds.SteelEurocode(0.005, 430e6, FilletWelds.Correlation(275e6)) / 1e3, tolerance: 0.005);

    /// <summary>EN 1993-1-8, Table 4.1 (from memory): S235, S275, S355, above.</summary>
    [Theory]
    [InlineData(235, 0.80)]
    [InlineData(236, 0.85)]
    [InlineData(275, 0.85)]
    [InlineData(355, 0.90)]
    [InlineData(420, 1.0)]
    public void Correlation_ByYield_AsTabulated(double yieldMpa, double expected) =>
        Assert.Equal(expected, FilletWelds.Correlation(yieldMpa * 1e6));

    /// <summary>EN 1999-1-1, 8.6.3: q_n 100, q_v 50 N/mm, a 4 mm: √(2·100² + 3·50²)/4 = 41.458 MPa.</summary>
    [Fact]
    public void ThroatStress_BothDirections_ByHand() =>
        Assert.Equal(41.458, FilletWelds.ThroatStress(100e3, 50e3, 0.004) / 1e6, tolerance: 0.0005);

    /// <summary>
    /// Aluminum Design Manual, J.2: leg 6 mm, filler and parts 165 MPa: metal 0.6·0.85·165·0.707·6 = 356.96, beside it 0.6·165·6 = 594 N/mm;
    /// parts of 90 MPa beside the weld: 0.6·90·6 = 324 N/mm.
    /// </summary>
    [Theory]
    [InlineData(165, 356.96)]
    [InlineData(90, 324)]
    public void AluminiumUs_WeakerOfBoth_ByHand(double besideMpa, double expected) =>
        Assert.Equal(expected, FilletWelds.NominalAluminiumUs(0.006, 165e6, besideMpa * 1e6) / 1e3, tolerance: 0.005);

    [Fact]
    public void SteelUs_Eurocode_IsNoUsBasis() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FilletWelds.SteelUs(1, DesignBasisKind.Eurocode));

    /// <summary>60 x 100 mm: 100²/3 + 60·100 = 9333.3 mm².</summary>
    [Fact]
    public void RectangleModulus_ByHand() => Assert.Equal(9333.333e-6, FilletWelds.RectangleModulus(0.06, 0.1), tolerance: 1e-9);

    /// <summary>A log of 2.0 m and 80 mm, one end 10 mm behind: 10²/4000 + 80·10/2000 = 0.425 mm.</summary>
    [Fact]
    public void LostBearing_ByHand() => Hand.Equal(0.425e-3, PostDrift.LostBearing(0.01, 2, 0.08));
}
