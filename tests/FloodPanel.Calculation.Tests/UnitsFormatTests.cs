using System.Globalization;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

public class UnitsFormatTests
{
    /// <summary>Three significant figures, also where rounding carries into the next power of ten.</summary>
    [Theory]
    [InlineData(0, "0")]
    [InlineData(1, "1.00")]
    [InlineData(9.994, "9.99")]
    [InlineData(9.996, "10.0")]
    [InlineData(99.94, "99.9")]
    [InlineData(99.96, "100")]
    [InlineData(999.4, "999")]
    [InlineData(999.6, "1000")]
    [InlineData(0.9996, "1.00")]
    [InlineData(0.09996, "0.100")]
    [InlineData(0.012345, "0.0123")]
    [InlineData(12_345, "12300")]
    [InlineData(12_260, "12300")]
    [InlineData(-9.996, "-10.0")]
    [InlineData(1.234e-8, "0.000000012")]
    [InlineData(1.234e-12, "0")]
    [InlineData(-1.234e-12, "0")]
    [InlineData(1.235e15, "1240000000000000")]
    public void FormatNumber_Ratio_ThreeSignificantFigures(double value, string text) =>
        Assert.Equal(text, Units.FormatNumber(value, Dimension.Ratio, UnitSystem.SI));

    [Theory]
    [InlineData(1.23456, "1.235")]
    [InlineData(-0.0004, "0.000")]
    [InlineData(-0.0, "0.000")]
    [InlineData(-1.5, "-1.500")]
    [InlineData(9000, "9000.000")]
    public void FormatNumber_Length_ThreeDecimalsOfAMetre(double value, string text) =>
        Assert.Equal(text, Units.FormatNumber(value, Dimension.Length, UnitSystem.SI));

    [Theory]
    [InlineData(double.NaN, "–")]
    [InlineData(double.PositiveInfinity, "∞")]
    [InlineData(double.NegativeInfinity, "−∞")]
    public void FormatNumber_NotFinite_OneSignInEveryDimension(double value, string text) =>
        Assert.All(Enum.GetValues<Dimension>(), dimension =>
            Assert.All(Enum.GetValues<UnitSystem>(), system =>
                Assert.Equal(text, Units.FormatNumber(value, dimension, system))));

    [Theory]
    [InlineData(new[] { 1746.0, 966, 139, 2.25, 0 }, new[] { "1.75", "0.97", "0.14", "0.00", "0.00" })]
    [InlineData(new[] { 23_400.0, 1746 }, new[] { "23.4", "1.7" })]
    [InlineData(new[] { 234_000.0, -1746 }, new[] { "234", "-2" })]
    [InlineData(new[] { 1746.0, -0.1, double.PositiveInfinity }, new[] { "1.75", "0.00", "∞" })]
    [InlineData(new[] { 0.0, 0.0 }, new[] { "0", "0" })]
    [InlineData(new double[0], new string[0])]
    public void FormatColumn_Forces_TakeTheDecimalsOfTheLargest(double[] values, string[] texts) =>
        Assert.Equal(texts, Units.FormatColumn(values, Dimension.Force, UnitSystem.SI));

    [Fact]
    public void FormatColumn_Lengths_KeepTheirFixedDecimals() =>
        Assert.Equal(["100.000", "0.500"], Units.FormatColumn([100, 0.5], Dimension.Length, UnitSystem.SI));

    /// <summary>4448.2216152605 N is 1000 lbf; 47.88 Pa is 1 psf.</summary>
    [Theory]
    [InlineData(4448.2216152605, Dimension.Force, UnitSystem.SI, "4.45 kN")]
    [InlineData(4448.2216152605, Dimension.Force, UnitSystem.USCustomary, "1000 lbf")]
    [InlineData(1000, Dimension.Density, UnitSystem.SI, "1000 kg/m³")]
    [InlineData(1000, Dimension.Density, UnitSystem.USCustomary, "62.4 lb/ft³")]
    [InlineData(15_321.6, Dimension.Pressure, UnitSystem.USCustomary, "320 psf")]
    [InlineData(0.5235987755982988, Dimension.Angle, UnitSystem.SI, "30.0°")]
    [InlineData(30, Dimension.Degrees, UnitSystem.USCustomary, "30.0°")]
    [InlineData(0.0127, Dimension.SectionLength, UnitSystem.USCustomary, "0.500 in")]
    [InlineData(0.85, Dimension.Ratio, UnitSystem.SI, "0.850")]
    [InlineData(200, Dimension.Count, UnitSystem.SI, "200")]
    public void Format_NumberAndUnit_AsPrinted(double value, Dimension dimension, UnitSystem system, string text) =>
        Assert.Equal(text, Units.Format(value, dimension, system));

    [Theory]
    [InlineData(1.0668, Dimension.Length, UnitSystem.USCustomary, "3.5")]
    [InlineData(1.0668, Dimension.Length, UnitSystem.SI, "1.0668")]
    [InlineData(-0.0, Dimension.Length, UnitSystem.SI, "0")]
    [InlineData(1e-6, Dimension.Ratio, UnitSystem.SI, "0.000001")]
    [InlineData(1.23456789e-12, Dimension.Ratio, UnitSystem.SI, "0.00000000000123456789")]
    [InlineData(1.5e12, Dimension.Ratio, UnitSystem.SI, "1500000000000")]
    [InlineData(0.1 + 0.2, Dimension.Length, UnitSystem.SI, "0.3")]
    public void FormatInput_AsTyped_NoNoiseNoExponent(double value, Dimension dimension, UnitSystem system, string text) =>
        Assert.Equal(text, Units.FormatInput(value, dimension, system));

    /// <summary>What a form shows means the same number again, to the nine figures that it shows.</summary>
    [Property]
    public bool FormatInput_ReadBack_GivesTheNumber(FsCheck.NormalFloat number, int exponent, Dimension dimension, UnitSystem system)
    {
        var value = Math.CopySign(1 + Math.Abs(number.Get % 9), number.Get) * Math.Pow(10, exponent % 13);

        var text = Units.FormatInput(value, dimension, system);
        var readBack = Units.ToSI(double.Parse(text, CultureInfo.InvariantCulture), dimension, system);

        return !text.Contains('E', StringComparison.Ordinal) && Math.Abs(readBack - value) <= 5.1e-9 * Math.Abs(value);
    }

    [Fact]
    public void FormatNumber_AnyCultureOfTheThread_PointAndNoGroups()
    {
        var before = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = new CultureInfo("") { NumberFormat = { NumberDecimalSeparator = ",", NegativeSign = "~" } };
        try
        {
            Assert.Equal("-12345.679", Units.FormatNumber(-12_345.6789, Dimension.Length, UnitSystem.SI));
            Assert.Equal("-12345.6789", Units.FormatInput(-12_345.6789, Dimension.Length, UnitSystem.SI));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
