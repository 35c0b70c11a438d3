using System.Globalization;
using UnitsNet;

namespace FloodPanel.Calculation.Tests;

/// <summary>Sizes of the units against a general-purpose library and against their definitions.</summary>
public class UnitsTests
{
    /// <summary>That library's pound per cubic foot is given to nine figures only.</summary>
    private const double LibraryTolerance = 1e-8;

    private const double Foot = 0.3048;
    private const double Pound = 0.45359237;
    private const double PoundForce = Pound * 9.80665;

    /// <summary>Symbols and sizes in base SI: the SI unit first, the US unit second.</summary>
    public static TheoryData<Dimension, string, double, string, double> Sizes => new()
    {
        { Dimension.Ratio, "", 1, "", 1 },
        { Dimension.Count, "", 1, "", 1 },
        { Dimension.Probability, "", 1, "", 1 },
        { Dimension.Years, "years", 1, "years", 1 },
        { Dimension.LengthPerYear, "mm/year", Length.FromMillimeters(1).Meters, "in/year", Length.FromInches(1).Meters },
        { Dimension.Degrees, "°", 1, "°", 1 },
        { Dimension.Angle, "°", Angle.FromDegrees(1).Radians, "°", Angle.FromDegrees(1).Radians },
        { Dimension.Length, "m", 1, "ft", Length.FromFeet(1).Meters },
        { Dimension.SectionLength, "mm", Length.FromMillimeters(1).Meters, "in", Length.FromInches(1).Meters },
        { Dimension.Deflection, "mm", Length.FromMillimeters(1).Meters, "in", Length.FromInches(1).Meters },
        { Dimension.SectionArea, "cm²", Area.FromSquareCentimeters(1).SquareMeters, "in²", Area.FromSquareInches(1).SquareMeters },
        { Dimension.Area, "m²", 1, "ft²", Area.FromSquareFeet(1).SquareMeters },
        { Dimension.AreaInertia, "m⁴", 1, "ft⁴", AreaMomentOfInertia.FromFeetToTheFourth(1).MetersToTheFourth },
        { Dimension.Volume, "L", Volume.FromLiters(1).CubicMeters, "gal", Volume.FromUsGallons(1).CubicMeters },
        { Dimension.FlowRate, "L/h", VolumeFlow.FromLitersPerHour(1).CubicMetersPerSecond, "gal/h", VolumeFlow.FromUsGallonsPerHour(1).CubicMetersPerSecond },
        {
            Dimension.LeakRate, "L/h per m", VolumeFlow.FromLitersPerHour(1).CubicMetersPerSecond,
            "gal/h per ft", VolumeFlow.FromUsGallonsPerHour(1).CubicMetersPerSecond / Length.FromFeet(1).Meters
        },
        {
            Dimension.RainIntensity, "mm/h", Speed.FromMillimetersPerHour(1).MetersPerSecond,
            "in/h", Speed.FromInchesPerHour(1).MetersPerSecond
        },
        { Dimension.SectionModulus, "cm³", Volume.FromCubicCentimeters(1).CubicMeters, "in³", Volume.FromCubicInches(1).CubicMeters },
        {
            Dimension.SecondMoment, "cm⁴", AreaMomentOfInertia.FromCentimetersToTheFourth(1).MetersToTheFourth,
            "in⁴", AreaMomentOfInertia.FromInchesToTheFourth(1).MetersToTheFourth
        },
        { Dimension.Velocity, "m/s", 1, "ft/s", Speed.FromFeetPerSecond(1).MetersPerSecond },
        { Dimension.Acceleration, "m/s²", 1, "ft/s²", Acceleration.FromFeetPerSecondSquared(1).MetersPerSecondSquared },
        { Dimension.Time, "s", 1, "s", 1 },
        { Dimension.WaveNumber, "rad/m", 1, "rad/ft", 1 / 0.3048 },
        { Dimension.Mass, "kg", 1, "lb", Mass.FromPounds(1).Kilograms },
        { Dimension.LineMass, "kg/m", 1, "lb/ft", LinearDensity.FromPoundsPerFoot(1).KilogramsPerMeter },
        { Dimension.Density, "kg/m³", 1, "lb/ft³", Density.FromPoundsPerCubicFoot(1).KilogramsPerCubicMeter },
        {
            Dimension.UnitWeight, "kN/m³", SpecificWeight.FromKilonewtonsPerCubicMeter(1).NewtonsPerCubicMeter,
            "lbf/ft³", SpecificWeight.FromPoundsForcePerCubicFoot(1).NewtonsPerCubicMeter
        },
        { Dimension.Force, "kN", Force.FromKilonewtons(1).Newtons, "lbf", Force.FromPoundsForce(1).Newtons },
        {
            Dimension.LineForce, "kN/m", ForcePerLength.FromKilonewtonsPerMeter(1).NewtonsPerMeter,
            "lbf/ft", ForcePerLength.FromPoundsForcePerFoot(1).NewtonsPerMeter
        },
        { Dimension.Moment, "kN·m", Torque.FromKilonewtonMeters(1).NewtonMeters, "lbf·ft", Torque.FromPoundForceFeet(1).NewtonMeters },
        { Dimension.Stiffness, "kN·m²", 1000, "lbf·ft²", PoundForce * Foot * Foot },
        { Dimension.Pressure, "kPa", Pressure.FromKilopascals(1).Pascals, "psf", Pressure.FromPoundsForcePerSquareFoot(1).Pascals },
        { Dimension.Stress, "MPa", Pressure.FromMegapascals(1).Pascals, "ksi", Pressure.FromKilopoundsForcePerSquareInch(1).Pascals },
        { Dimension.ElasticModulus, "GPa", Pressure.FromGigapascals(1).Pascals, "ksi", Pressure.FromKilopoundsForcePerSquareInch(1).Pascals },
    };

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Of_EachDimension_AgreesWithUnitsNet(
        Dimension dimension, string symbolSI, double sizeSI, string symbolUS, double sizeUS)
    {
        var si = Units.Of(dimension, UnitSystem.SI);
        var us = Units.Of(dimension, UnitSystem.USCustomary);

        Assert.Equal((symbolSI, symbolUS), (si.Symbol, us.Symbol));
        Assert.Equal(1, si.InSI / sizeSI, LibraryTolerance);
        Assert.Equal(1, us.InSI / sizeUS, LibraryTolerance);
    }

    [Fact]
    public void Of_Dimensions_AllCoveredAbove() =>
        Assert.Equal(Enum.GetValues<Dimension>(), Sizes.Select(row => row.Data.Item1));

    /// <summary>International yard and pound agreement (1959): 1 yd = 0.9144 m, 1 lb = 0.45359237 kg, exactly.</summary>
    [Fact]
    public void ToSI_FootPoundAndPoundForce_AsDefined()
    {
        Assert.Equal(0.9144, Units.ToSI(3, Dimension.Length, UnitSystem.USCustomary), tolerance: 1e-15);
        Assert.Equal(0.45359237, Units.ToSI(1, Dimension.Mass, UnitSystem.USCustomary));
        Assert.Equal(4.4482216152605, Units.ToSI(1, Dimension.Force, UnitSystem.USCustomary), tolerance: 1e-13);
        Assert.Equal(6.894757, Units.ToSI(1, Dimension.Stress, UnitSystem.USCustomary) / 1e6, tolerance: 5e-7);
    }

    /// <summary>Compound units from the foot, the pound and standard gravity.</summary>
    [Theory]
    [InlineData(Dimension.LineMass, Pound / Foot)]
    [InlineData(Dimension.Density, Pound / (Foot * Foot * Foot))]
    [InlineData(Dimension.UnitWeight, PoundForce / (Foot * Foot * Foot))]
    [InlineData(Dimension.LineForce, PoundForce / Foot)]
    [InlineData(Dimension.Moment, PoundForce * Foot)]
    [InlineData(Dimension.Stiffness, PoundForce * Foot * Foot)]
    [InlineData(Dimension.Pressure, PoundForce / (Foot * Foot))]
    [InlineData(Dimension.Stress, 144_000 * PoundForce / (Foot * Foot))]
    [InlineData(Dimension.ElasticModulus, 144_000 * PoundForce / (Foot * Foot))]
    public void ToSI_CompoundUnit_AsDefined(Dimension dimension, double size) =>
        Assert.Equal(1, Units.ToSI(1, dimension, UnitSystem.USCustomary) / size, tolerance: 1e-14);

    [Fact]
    public void FromSI_OfToSI_GivesTheNumberBack() =>
        Assert.All(Enum.GetValues<Dimension>(), dimension =>
            Assert.All(Enum.GetValues<UnitSystem>(), system =>
                Hand.Equal(12.345, Units.FromSI(Units.ToSI(12.345, dimension, system), dimension, system))));

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Format_EachDimension_NumberAndSymbol(Dimension dimension, string symbolSI, double sizeSI, string symbolUS, double sizeUS)
    {
        Assert.Equal(Expected(5 * sizeSI, dimension, UnitSystem.SI, symbolSI), Units.Format(5 * sizeSI, dimension, UnitSystem.SI));
        Assert.Equal(Expected(5 * sizeUS, dimension, UnitSystem.USCustomary, symbolUS), Units.Format(5 * sizeUS, dimension, UnitSystem.USCustomary));
        Assert.Equal(5, double.Parse(Units.FormatNumber(5 * sizeUS, dimension, UnitSystem.USCustomary), CultureInfo.InvariantCulture));
    }

    private static string Expected(double value, Dimension dimension, UnitSystem system, string symbol)
    {
        var number = Units.FormatNumber(value, dimension, system);
        return symbol.Length == 0 ? number : symbol == "°" ? $"{number}°" : $"{number} {symbol}";
    }
}
