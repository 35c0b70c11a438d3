using FloodPanel.Calculation.Actions.Waves;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// USACE, Coastal Engineering Manual, EM 1110-2-1100, Part II-1 (2002), Example II-1-1, p. II-1-11: a wave of 10 s in
/// 3 m of water. Printed: d/L 0.05641, L 53.2 m, C 5.32 m/s, transitional water. Read in a stored copy. The page is
/// inconsistent with itself: L is 53.2 m in the solution and 53.3 m where the approximation is judged, and 3/0.05641
/// is 53.18. Its figures come from tables of d/L; the dispersion relation itself gives 53.15 m, 0.1 % less.
/// </summary>
public class CoastalEngineeringManualTests
{
    /// <summary>Relative; half a unit of the last printed digit comes on top.</summary>
    private const double OfTables = 0.001;

    private static readonly double Length = 2 * Math.PI / Dispersion.WaveNumber(period: 10, depth: 3);

    [Fact]
    public void ExampleII11_Length_AsPrinted() => Assert.Equal(53.2, Length, tolerance: OfTables * 53.2 + 0.05);

    [Fact]
    public void ExampleII11_DepthOverLength_AsPrinted() => Assert.Equal(0.05641, 3 / Length, tolerance: OfTables * 0.05641 + 0.000005);

    [Fact]
    public void ExampleII11_Celerity_AsPrinted() => Assert.Equal(5.32, Length / 10, tolerance: OfTables * 5.32 + 0.005);

    /// <summary>Transitional: d/L from 1/20 to 1/2.</summary>
    [Fact]
    public void ExampleII11_DepthOverLength_Transitional() => Assert.InRange(3 / Length, 1.0 / 20, 1.0 / 2);

    /// <summary>Printed: L_0·√tanh(2π·d/L_0) is off by about 1.5 %; 54.1 m against 53.15 m is 1.8 %.</summary>
    [Fact]
    public void ExampleII11_ApproximateFormula_LessThanTwoPercentHigh()
    {
        var deep = Dispersion.DeepWaterLength(10);

        var approximate = deep * Math.Sqrt(Math.Tanh(2 * Math.PI * 3 / deep));

        Assert.InRange(approximate / Length, 1.015, 1.02);
    }
}
