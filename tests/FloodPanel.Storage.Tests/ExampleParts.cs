namespace FloodPanel.Storage.Tests;

/// <summary>The guides, covers and second opening of the example, each field other than its default.</summary>
internal static partial class Example
{
    private static GuideSet Guides => new()
    {
        Mounting = GuideMounting.DryFace,
        Material = new LibraryMaterial("s275"),
        LipThickness = 0.007,
        LipLever = 0.025,
        BaseThickness = 0.009,
        LoadOffset = 0.035,
        BearingDistance = 0.045,
        BearingWidth = 0.022,
        WallBearing = 4.5e6,
        WallBearingSource = "EN 1996-1-1",
        Fasteners = new GuideFasteners
        {
            Pitch = 0.3,
            EndDistance = 0.12,
            EdgeDistance = 0.11,
            HoleDiameter = 0.013,
            ValuesFor = DesignBasisKind.Eurocode,
            Tension = 4200,
            Shear = 5100,
            MinimumEdge = 0.1,
            MinimumSpacing = 0.15,
            InteractionLimit = 1.1,
            Source = "Pull tests of March",
        },
    };

    private static Cover Vent => new()
    {
        Name = "Cellar vent",
        Plate = new RectangleCover { Width = 0.75, Height = 0.45, Support = RectangleSupport.ThreeEdges },
        Level = 11.2,
        Material = new LibraryMaterial("s275"),
        Thickness = 0.008,
        PoissonRatio = 0.29,
        DeflectionLimit = 180,
        Pressing = CoverPressing.Unseating,
        Fasteners = new CoverFasteners { Pitch = 0.14, GasketLoad = 900, FixingLever = 0.035, Tension = 5200, Source = "Approval C-3" },
    };

    private static Cover Port => new()
    {
        Name = "Cable port",
        Plate = new CircleCover { Diameter = 0.35, Support = CircleSupport.Clamped },
        Position = CoverPosition.Flat,
        Level = 10.9,
        Material = EveryFigure,
        Thickness = 0.005,
        Fasteners = new CoverFasteners { Pitch = 0.1 },
    };

    private static Opening Hatch => new()
    {
        Id = "hatch",
        Name = "Hatch",
        SillLevel = 11.9,
        ClearWidth = 1,
        ClearHeight = 1,
        Actions = new ActionSet { Wave = new BreakingWaveInput { RiskCategory = 3 } },
        Barrier = new Barrier
        {
            Logs = new LogStack
            {
                Material = new LibraryMaterial("c24"),
                Profile = new GivenProperties
                {
                    Height = 0.2,
                    Depth = 0.05,
                    Area = 0.0041,
                    Inertia = 1.7e-6,
                    Modulus = 4.3e-5,
                    PlasticModulus = 5e-5,
                    ShearArea = 4.4e-4,
                },
                Count = 3,
            },
            Bays = [1],
        },
    };
}
