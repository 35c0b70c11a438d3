using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Forms;
using UnitsNet;
using UnitSystem = FloodPanel.Calculation.UnitSystem;

namespace FloodPanel.Web.Tests.Forms;

/// <summary>Factors of typed units against UnitsNet 5.75.1, an independent library of units.</summary>
public class UnitNamesTests
{
    public static TheoryData<string, Dimension, double> Known => new()
    {
        { "1 ft", Dimension.Length, Length.FromFeet(1).Meters },
        { "1 in", Dimension.SectionLength, Length.FromInches(1).Meters },
        { "1 in²", Dimension.SectionArea, Area.FromSquareInches(1).SquareMeters },
        { "1 in³", Dimension.SectionModulus, Volume.FromCubicInches(1).CubicMeters },
        { "1 in⁴", Dimension.SecondMoment, AreaMomentOfInertia.FromInchesToTheFourth(1).MetersToTheFourth },
        { "1 mph", Dimension.Velocity, Speed.FromMilesPerHour(1).MetersPerSecond },
        { "1 km/h", Dimension.Velocity, Speed.FromKilometersPerHour(1).MetersPerSecond },
        { "1 ft/s", Dimension.Velocity, Speed.FromFeetPerSecond(1).MetersPerSecond },
        { "1 lb", Dimension.Mass, Mass.FromPounds(1).Kilograms },
        { "1 lb/ft³", Dimension.Density, Density.FromPoundsPerCubicFoot(1).KilogramsPerCubicMeter },
        { "1 lbf", Dimension.Force, Force.FromPoundsForce(1).Newtons },
        { "1 kip", Dimension.Force, Force.FromKilopoundsForce(1).Newtons },
        { "1 lbf/ft", Dimension.LineForce, ForcePerLength.FromPoundsForcePerFoot(1).NewtonsPerMeter },
        { "1 lbf·ft", Dimension.Moment, Torque.FromPoundForceFeet(1).NewtonMeters },
        { "1 psf", Dimension.Pressure, Pressure.FromPoundsForcePerSquareFoot(1).Pascals },
        { "1 psi", Dimension.Stress, Pressure.FromPoundsForcePerSquareInch(1).Pascals },
        { "1 ksi", Dimension.Stress, Pressure.FromKilopoundsForcePerSquareInch(1).Pascals },
        { "1 bar", Dimension.Pressure, Pressure.FromBars(1).Pascals },
        { "1 N/mm²", Dimension.Stress, Pressure.FromNewtonsPerSquareMillimeter(1).Pascals },
    };

    [Theory]
    [MemberData(nameof(Known))]
    public void Read_OneOfAUnit_AgreesWithUnitsNet(string text, Dimension dimension, double expected)
    {
        var reading = QuantityText.Read(text, dimension, UnitSystem.SI);

        // UnitsNet rounds some of its factors to about nine digits (pound-force per foot, kip).
        Assert.Equal(1, reading.Value!.Value / expected, 1e-8);
    }
}
