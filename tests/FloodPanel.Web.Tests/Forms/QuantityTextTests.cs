using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Tests.Forms;

public class QuantityTextTests
{
    [Theory]
    [InlineData("3.3", 3.3)]
    [InlineData(" 3.3 ", 3.3)]
    [InlineData("3.", 3.0)]
    [InlineData(".5", 0.5)]
    [InlineData("+2", 2.0)]
    [InlineData("-2.5", -2.5)]
    [InlineData("−2.5", -2.5)]
    [InlineData("12,5", 12.5)]
    [InlineData(",5", 0.5)]
    [InlineData("0,125", 0.125)]
    [InlineData("1250,500", 1250.5)]
    [InlineData("1/2", 0.5)]
    [InlineData("1e2", 100.0)]
    public void Read_NumberWithoutUnit_IsInTheUnitShown(string text, double metres)
    {
        var reading = QuantityText.Read(text, Dimension.Length, UnitSystem.SI);

        Assert.Null(reading.Problem);
        Assert.Equal(metres, reading.Value!.Value, 1e-12);
    }

    [Fact]
    public void Read_NumberWithoutUnitInUS_IsInFeet()
    {
        var reading = QuantityText.Read("10", Dimension.Length, UnitSystem.USCustomary);

        Assert.Equal(3.048, reading.Value!.Value, 1e-12);
    }

    [Theory]
    [InlineData("1067 mm", 1.067)]
    [InlineData("106.7cm", 1.067)]
    [InlineData("106,7 cm", 1.067)]
    [InlineData("1.067 M", 1.067)]
    [InlineData("3 ft 6 in", 42 * 0.0254)]
    [InlineData("3ft6in", 42 * 0.0254)]
    [InlineData("3 ft. 6 in.", 42 * 0.0254)]
    [InlineData("3 feet 6 inches", 42 * 0.0254)]
    [InlineData("3' 6\"", 42 * 0.0254)]
    [InlineData("3′ 6″", 42 * 0.0254)]
    [InlineData("3'-6\"", 42 * 0.0254)]
    [InlineData("3' 6 1/2\"", 42.5 * 0.0254)]
    [InlineData("3'-6-1/2\"", 42.5 * 0.0254)]
    [InlineData("3' 6", 42 * 0.0254)]
    [InlineData("3' 1/2", 36.5 * 0.0254)]
    [InlineData("-1 ft 6 in", -18 * 0.0254)]
    [InlineData("42 in", 42 * 0.0254)]
    [InlineData("3.5 ft", 42 * 0.0254)]
    [InlineData("2 metres", 2.0)]
    public void Read_LengthWithUnit_IsConvertedExactly(string text, double metres)
    {
        foreach (var system in Enum.GetValues<UnitSystem>())
        {
            var reading = QuantityText.Read(text, Dimension.Length, system);

            Assert.Null(reading.Problem);
            Assert.Equal(metres, reading.Value!.Value, 1e-12);
        }
    }

    [Theory]
    [InlineData("250 N/mm²", Dimension.Stress)]
    [InlineData("36 ksi", Dimension.Stress)]
    [InlineData("70 GPa", Dimension.ElasticModulus)]
    [InlineData("10 ft/s", Dimension.Velocity)]
    [InlineData("5 km/h", Dimension.Velocity)]
    [InlineData("62.4 lb/ft³", Dimension.Density)]
    [InlineData("1.025 t/m^3", Dimension.Density)]
    [InlineData("15 psf", Dimension.Pressure)]
    [InlineData("800 Pa", Dimension.Pressure)]
    [InlineData("50 lbf/ft", Dimension.LineForce)]
    [InlineData("12.5 in²", Dimension.SectionArea)]
    [InlineData("400 cm⁴", Dimension.SecondMoment)]
    [InlineData("80 cm3", Dimension.SectionModulus)]
    [InlineData("30 ms", Dimension.Time)]
    public void Read_OtherDimensionsWithUnit_AreTaken(string text, Dimension dimension)
    {
        var reading = QuantityText.Read(text, dimension, UnitSystem.SI);

        Assert.Null(reading.Problem);
        Assert.True(reading.Value > 0);
    }

    [Theory]
    [InlineData(Dimension.Length)]
    [InlineData(Dimension.SectionLength)]
    [InlineData(Dimension.Moment)]
    [InlineData(Dimension.Degrees)]
    [InlineData(Dimension.SecondMoment)]
    [InlineData(Dimension.UnitWeight)]
    public void Read_WhatUnitsPrints_GivesTheSameValue(Dimension dimension)
    {
        foreach (var system in Enum.GetValues<UnitSystem>())
        {
            var size = Units.Of(dimension, system).InSI;

            var reading = QuantityText.Read(Units.Format(12 * size, dimension, system), dimension, system);

            Assert.Equal(12 * size, reading.Value!.Value, 1e-9 * size);
        }
    }

    [Theory]
    [InlineData("1,250")]
    [InlineData("12,125")]
    [InlineData("125,000 mm")]
    public void Read_CommaThatCouldSeparateThousands_IsRefusedWithBothReadings(string text)
    {
        var reading = QuantityText.Read(text, Dimension.Length, UnitSystem.SI);

        Assert.Null(reading.Value);
        Assert.Contains("could mean", reading.Problem);
    }

    [Theory]
    [InlineData("abc")]
    [InlineData("-")]
    [InlineData("1.2.3")]
    [InlineData("1,250.5")]
    [InlineData("1,250,000")]
    [InlineData("12 500")]
    [InlineData("3 m 6 in")]
    [InlineData("3 in 6 ft")]
    [InlineData("3 ft 6 in 2 in")]
    [InlineData("5 kg")]
    [InlineData("5²")]
    [InlineData("5·2")]
    [InlineData("1/0")]
    [InlineData("1e999")]
    [InlineData("NaN")]
    [InlineData("∞")]
    [InlineData("--5")]
    [InlineData("3 mmm")]
    [InlineData("3 miles")]
    public void Read_WhatIsNotOneQuantity_IsRefusedWithASentence(string text)
    {
        var reading = QuantityText.Read(text, Dimension.Length, UnitSystem.SI);

        Assert.Null(reading.Value);
        Assert.EndsWith(".", reading.Problem);
    }

    [Fact]
    public void Read_UnitOfAnotherDimension_NamesTheUnitsThatFit()
    {
        var reading = QuantityText.Read("5 kg", Dimension.Length, UnitSystem.SI);

        Assert.Equal("“kg” is not a unit that fits here. Units: m, cm, mm, ft, in.", reading.Problem);
    }

    [Theory]
    [InlineData("")]
    [InlineData("   ")]
    public void Read_Blank_IsNeitherValueNorProblem(string text)
    {
        var reading = QuantityText.Read(text, Dimension.Length, UnitSystem.SI);

        Assert.Equal(default, reading);
    }

    [Theory]
    [InlineData(3.3, Dimension.Length, UnitSystem.SI, "3.3")]
    [InlineData(1234.56789, Dimension.Length, UnitSystem.SI, "1234.56789")]
    [InlineData(3.3, Dimension.Length, UnitSystem.USCustomary, "10.8268")]
    [InlineData(3.048, Dimension.Length, UnitSystem.USCustomary, "10")]
    [InlineData(0.04, Dimension.SectionLength, UnitSystem.USCustomary, "1.5748")]
    [InlineData(1e-9, Dimension.SecondMoment, UnitSystem.USCustomary, "0.002403")]
    [InlineData(42 * 0.0254, Dimension.Length, UnitSystem.SI, "1.0668")]
    [InlineData(0, Dimension.Length, UnitSystem.USCustomary, "0")]
    public void Write_Value_HasTheDigitsThatMatter(double value, Dimension dimension, UnitSystem system, string text) =>
        Assert.Equal(text, QuantityText.Write(value, dimension, system));

    [Fact]
    public void Read_PercentForARatio_IsAHundredth()
    {
        var reading = QuantityText.Read("1 %", Dimension.Ratio, UnitSystem.SI);

        Assert.Equal(0.01, reading.Value!.Value, 1e-15);
    }
}
