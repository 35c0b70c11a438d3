using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests;

/// <summary>Invented openings for the tests.</summary>
internal static class Sample
{
    public const string LongName =
        "Old granary of the Ostrey Wharf estate, north range, between the weighbridge house and the former malt kiln, "
        + "with the three arched cart entrances that were widened for the fire brigade in the last century";

    public static Material Alloy { get; } = new()
    {
        Family = MaterialFamily.Aluminium,
        Name = "invented alloy",
        Density = 2700,
        ElasticModulus = 70e9,
        AllowableBending = 120e6,
        AllowableShear = 70e6,
    };

    public static HollowRectangle Plank { get; } =
        new() { Height = 0.2, Depth = 0.08, Face = 0.003, Web = 0.003, Webs = 3 };

    public static Project Project { get; } = new()
    {
        Name = "Mill Lane 4",
        Reference = "ML-04",
        Client = "A. Weir",
        Address = "4 Mill Lane, Ostrey",
        Engineer = "R. Holm",
        Site = new Site
        {
            DesignStillWaterLevel = 12.10,
            Surge = 0.15,
            ClimateAllowance = 0.10,
            Freeboard = 0.20,
            Datum = "Ostrey datum",
        },
    };

    /// <summary>Garage door: two bays, a post, flow.</summary>
    public static Opening Garage { get; } = new()
    {
        Id = "garage",
        Name = "Garage door",
        SillLevel = 11.40,
        GroundLevel = 11.25,
        ClearWidth = 3.30,
        ClearHeight = 2.10,
        Actions = new ActionSet { Flow = new FlowInput { Velocity = 1.2 } },
        Barrier = Barrier(6, 0.1, 1.60, 1.60),
    };

    /// <summary>Front door: one bay.</summary>
    public static Opening Door { get; } = new()
    {
        Id = "door",
        Name = "Front door",
        SillLevel = 11.70,
        ClearWidth = 0.95,
        ClearHeight = 2.05,
        Wall = WallKind.Masonry,
        Barrier = Barrier(5, 0.1, 0.95),
    };

    public static Barrier Barrier(int logs, double postWidth, params double[] bays) => new()
    {
        Logs = new LogStack { Material = Alloy, Profile = Plank, Count = logs },
        Bays = bays.ToValueList(),
        Posts = bays.Length > 1
            ? new PostSet
            {
                Material = Alloy,
                Profile = new RectangularTube { Height = postWidth, Depth = 0.1, Wall = 0.006 },
                Width = postWidth,
            }
            : null,
    };

    public static Opening Gap(double width, int bays, double height, int logs, double logHeight = 0.2)
    {
        var bay = (width - (bays - 1) * 0.1) / bays;
        var barrier = Barrier(logs, 0.1, [.. Enumerable.Repeat(bay, bays)]);
        return Garage with
        {
            Id = "gap",
            Name = "Gap in the yard wall",
            ClearWidth = width,
            ClearHeight = height,
            Barrier = barrier with { Logs = barrier.Logs with { Profile = Plank with { Height = logHeight } } },
        };
    }

    public static OpeningResult Evaluate(Opening opening, Project? project = null) =>
        Design.Evaluate((project ?? Project) with { Openings = [opening] }, opening, Library.Empty);

    public static DrawingInput Input(Opening opening, UnitSystem units = UnitSystem.SI, Project? project = null) =>
        new(project ?? Project, Evaluate(opening, project), Library.Empty, units, "3");
}
