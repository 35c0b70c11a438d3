using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests;

/// <summary>An invented project with the shapes that the tests need; no figure of it is expected to come out.</summary>
internal static class SampleProject
{
    public static Material Aluminium { get; } = new()
    {
        Family = MaterialFamily.Aluminium,
        Name = "test alloy",
        Density = 2700,
        ElasticModulus = 70e9,
        AllowableBending = 120e6,
        AllowableShear = 70e6,
    };

    public static Material Steel { get; } = new()
    {
        Family = MaterialFamily.Steel,
        Name = "test steel",
        Density = 7850,
        ElasticModulus = 210e9,
        AllowableBending = 165e6,
        AllowableShear = 95e6,
    };

    public static Opening Dock { get; } = new()
    {
        Id = "dock",
        Name = "Loading dock",
        SillLevel = 3.6,
        ClearWidth = 4.3,
        ClearHeight = 2.6,
        Actions = new() { Flow = new() { Velocity = 1.1, ShapeCoefficient = 1.25 } },
        Barrier = new()
        {
            Logs = new()
            {
                Material = Aluminium,
                Profile = new HollowRectangle { Height = 0.2, Depth = 0.09, Face = 0.0032, Web = 0.003, Webs = 3 },
                Count = 6,
                EndBearing = 0.04,
                DeflectionLimit = 200,
            },
            Bays = [2.1, 2.1],
            Posts = new()
            {
                Material = Steel,
                Profile = new ISection { Height = 0.1, Depth = 0.1, Flange = 0.01, Web = 0.006 },
                Width = 0.1,
                DeflectionLimit = 100,
            },
        },
    };

    public static Project Project { get; } = new()
    {
        Name = "Test wharf (invented)",
        Site = new()
        {
            WaterDensity = 1025,
            DesignStillWaterLevel = 4.1,
            Surge = 0.25,
            ClimateAllowance = 0.1,
            Freeboard = 0.25,
        },
        Openings = [Dock],
    };

    /// <summary>Every check that may be, declared designed by somebody with a name and a reference.</summary>
    public static ValueList<DesignedByOthers> AllByOthers { get; } =
        NeededChecks.MayBeByOthers.Select(c => new DesignedByOthers(c, "A. Designer", "D-1")).ToValueList();

    public static OpeningResult Result(Project project) => Design.Run(project, Library.Empty).Openings[0];
}
