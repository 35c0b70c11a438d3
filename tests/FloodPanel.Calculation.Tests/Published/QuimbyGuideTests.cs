using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// T. B. Quimby, A Beginner's Guide to ASCE 7-10 (2014), Example 6.1: base flood elevation 54 ft, ground 50 ft less
/// 1 ft of erosion, water of 64 pcf, walls 20 ft and 10 ft long. Read in a stored copy.
/// </summary>
public class QuimbyGuideTests
{
    private const double Foot = 0.3048;
    private const double Inch = Foot / 12;

    /// <summary>64 pcf as a mass per volume: with standard gravity the pound of force weighs a pound of mass.</summary>
    private static readonly double Density = Units.ToSI(64, Dimension.Density, UnitSystem.USCustomary);

    [Fact]
    public void Example61_FiveFeetOfWater_BasePressure320PoundsPerSquareFoot()
    {
        var hydrostatic = Case(20).Actions.Single(a => a.Kind == ActionKind.Hydrostatic);

        var pressure = Units.FromSI(hydrostatic.Pieces[0].AtBottom, Dimension.Pressure, UnitSystem.USCustomary);

        Assert.Equal(320, pressure, tolerance: 0.5);
    }

    [Fact]
    public void Example61_FiveFeetOfWater_Resultant800PoundsPerFoot()
    {
        var resultant = Units.FromSI(Case(20).Resultant, Dimension.LineForce, UnitSystem.USCustomary);

        Assert.Equal(800, resultant, tolerance: 0.5);
    }

    /// <summary>Printed 3 ft 4 in below the water surface.</summary>
    [Fact]
    public void Example61_FiveFeetOfWater_ResultantThreeFeetFourInchesDown()
    {
        var down = 5 * Foot - Case(20).CentreOfPressure!.Value;

        Assert.Equal(3 * Foot + 4 * Inch, down, tolerance: Inch / 2);
    }

    [Theory]
    [InlineData(20, 16.0, 0.05)]
    [InlineData(10, 8.00, 0.005)]
    public void Example61_WholeWall_ForceInKips(double wallFeet, double printedKips, double tolerance)
    {
        var force = Case(wallFeet).Resultant * wallFeet * Foot;

        var kips = Units.FromSI(force, Dimension.Force, UnitSystem.USCustomary) / 1000;

        Assert.Equal(printedKips, kips, tolerance);
    }

    private static CaseResult Case(double wallFeet)
    {
        var wall = new Opening
        {
            Id = "wall",
            SillLevel = 49 * Foot,
            ClearWidth = wallFeet * Foot,
            ClearHeight = 8 * Foot,
            Barrier = new()
            {
                Logs = new()
                {
                    Material = SampleProject.Aluminium,
                    Profile = new Rectangle { Height = Foot, Depth = 4 * Inch },
                    Count = 6,
                },
                Bays = [wallFeet * Foot],
            },
        };
        var project = new Project
        {
            Name = "Example 6.1",
            Site = new() { WaterDensity = Density, DesignStillWaterLevel = 54 * Foot, Freeboard = 0 },
            Openings = [wall],
        };

        return SampleProject.Result(project).Cases.Single(c => c.Name == "design-flood");
    }
}
