using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Benchmarks;

/// <summary>An invented opening with a stack of 12 logs, 3 bays, 2 posts, flow and water behind.</summary>
internal static class BenchmarkOpening
{
    public static Project Project { get; } = new()
    {
        Name = "Benchmark (invented)",
        Site = new() { WaterDensity = 1000, DesignStillWaterLevel = 11.6, Freeboard = 0.3 },
        Openings = [Opening()],
    };

    private static Opening Opening() => new()
    {
        Id = "gate",
        Name = "Gate",
        SillLevel = 10,
        ClearWidth = 6.2,
        ClearHeight = 3,
        ProtectedSideLevel = 10.1,
        Actions = new() { Flow = new() { Velocity = 1.2 } },
        Barrier = new()
        {
            Logs = new()
            {
                Material = new Material
                {
                    Family = MaterialFamily.Aluminium,
                    Name = "alloy",
                    Density = 2700,
                    ElasticModulus = 70e9,
                    BendingStrength = 200e6,
                    ShearStrength = 115e6,
                },
                Profile = new HollowRectangle { Height = 0.165, Depth = 0.08, Face = 0.003, Web = 0.003, Webs = 3 },
                Count = 12,
                EndBearing = 0.04,
            },
            Bays = [2.0, 2.1, 1.9],
            Posts = new()
            {
                Material = new Material
                {
                    Family = MaterialFamily.Steel,
                    Name = "steel",
                    Density = 7850,
                    ElasticModulus = 210e9,
                    BendingStrength = 275e6,
                    ShearStrength = 158e6,
                },
                Profile = new RectangularTube { Height = 0.1, Depth = 0.16, Wall = 0.008 },
                Width = 0.1,
            },
        },
    };
}
