using FloodPanel.Calculation.Leakage;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// FHWA, HEC-22, Urban Drainage Design Manual, 3rd ed. (2009), Example 3-3: 17.55 ha before and after development. Printed
/// 0.55 and 0.89 m³/s; figures read in a public transcription.
/// </summary>
public class Hec22Tests
{
    [Theory]
    [InlineData(0.235, 48, 0.55)]
    [InlineData(0.315, 58, 0.89)]
    public void Example33_RationalMethod_AsPrinted(double coefficient, double millimetresPerHour, double printed)
    {
        var runoff = LeakageEstimate.Runoff(coefficient, millimetresPerHour * 1e-3 / 3600, 17.55e4);

        Assert.Equal(printed, runoff, tolerance: 0.005);
    }

    /// <summary>20 m² paved, C 0.9, 50 mm/h, worked by hand: 0.25 L/s.</summary>
    [Fact]
    public void RationalMethod_SmallYard_ByHand() => Hand.Equal(0.25e-3, LeakageEstimate.Runoff(0.9, 0.05 / 3600, 20));

    [Theory]
    [InlineData(-0.1, 1, 1)]
    [InlineData(1.1, 1, 1)]
    [InlineData(1, -1, 1)]
    [InlineData(1, 1, double.NaN)]
    public void RationalMethod_OutOfRange_Throws(double coefficient, double intensity, double area) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => LeakageEstimate.Runoff(coefficient, intensity, area));
}
