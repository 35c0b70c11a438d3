using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Tests.Bench;

/// <summary>Invented barriers for the tests of screens.</summary>
internal static class Examples
{
    public static Material Aluminium { get; } = new()
    {
        Family = MaterialFamily.Aluminium,
        Name = "Aluminium",
        Density = 2700,
        ElasticModulus = 70e9,
        AllowableBending = 110e6,
        AllowableShear = 63e6,
    };

    /// <summary>Two equal bays of six hollow logs and a post, 0.95 m of water and a slow flow: it holds.</summary>
    public static Opening Garage { get; } = new()
    {
        Id = "garage",
        Name = "Garage door",
        SillLevel = 11.4,
        ClearWidth = 3.3,
        ClearHeight = 2.1,
        Actions = new ActionSet { Flow = new FlowInput { Velocity = 1.2 } },
        Barrier = new Barrier
        {
            Logs = new LogStack
            {
                Material = Aluminium,
                Profile = new HollowRectangle { Height = 0.2, Depth = 0.08, Face = 0.003, Web = 0.003, Webs = 3 },
                Count = 6,
            },
            Bays = [1.6, 1.6],
            Posts = new PostSet
            {
                Material = Aluminium with { AllowableBending = 160e6 },
                Profile = new RectangularTube { Height = 0.1, Depth = 0.16, Wall = 0.008 },
            },
        },
    };

    /// <summary>One bay of four logs.</summary>
    public static Opening Door { get; } = Garage with
    {
        Id = "door",
        Name = "Front door",
        ClearWidth = 1.2,
        Actions = new ActionSet(),
        Barrier = Garage.Barrier with
        {
            Logs = Garage.Barrier.Logs with { Count = 6 },
            Bays = [1.2],
            Posts = null,
        },
    };

    public static Project Mill { get; } = new()
    {
        Name = "Mill Lane 4",
        Site = new Site { DesignStillWaterLevel = 12.35, Freeboard = 0.2 },
        Openings = [Garage, Door],
    };

    public static Library Library { get; } = new(
        [
            new("alloy", "Test alloy", Aluminium, "Invented for tests", "invented"),
            new("remembered", "Remembered alloy", Aluminium, "Invented for tests", "memory"),
        ],
        [new("log", "Test log", (Profile)Garage.Barrier.Logs.Profile, "Invented for tests", "invented")],
        DesignBases.Standard);

    public static OpeningResult Result(Opening opening) =>
        Design.Evaluate(Mill with { Openings = [opening] }, opening, Library.Empty);

    public static Opening WithLogs(this Opening opening, Func<LogStack, LogStack> edit) =>
        opening with { Barrier = opening.Barrier with { Logs = edit(opening.Barrier.Logs) } };
}
