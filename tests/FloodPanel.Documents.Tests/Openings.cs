using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests;

/// <summary>Openings that stretch the drawings in every direction, by name.</summary>
internal static class Openings
{
    private static readonly Dictionary<string, Func<UnitSystem, DrawingInput>> All = new()
    {
        ["garage"] = u => Sample.Input(Sample.Garage, u),
        ["door"] = u => Sample.Input(Sample.Door, u),
        ["half-metre"] = u => Sample.Input(Sample.Gap(0.5, 1, 0.6, 2), u),
        ["tiny"] = u => Sample.Input(Sample.Gap(0.1, 1, 0.1, 1, 0.05), u),
        ["slit"] = u => Sample.Input(Sample.Gap(0.3, 1, 12, 40), u),
        ["twenty-metres"] = u => Sample.Input(Sample.Gap(20, 12, 2.2, 6), u),
        ["hundred-metres"] = u => Sample.Input(Sample.Gap(100, 40, 2.2, 6), u),
        ["forty-logs"] = u => Sample.Input(Sample.Gap(2.4, 1, 6.5, 40, 0.15), u),
        ["hundred-logs"] = u => Sample.Input(Sample.Gap(2.4, 2, 30, 100, 0.3), u),
        ["unequal-bays"] = u => Sample.Input(
            Sample.Garage with { ClearWidth = 6.1, Barrier = Sample.Barrier(6, 0.1, 1.2, 2.8, 0.5, 1.3) }, u),
        ["dry-sill"] = u => Sample.Input(Sample.Garage with { SillLevel = 13.2, GroundLevel = 12.0 }, u),
        ["sill-at-flood"] = u => Sample.Input(Sample.Garage with { SillLevel = 12.35, GroundLevel = 12.35 }, u),
        ["overtopped"] = u => Sample.Input(Sample.Garage with { SillLevel = 10.9, GroundLevel = 10.9 }, u),
        ["drowned"] = u => Sample.Input(Sample.Garage with { SillLevel = -7, GroundLevel = null }, u),
        ["high-ground"] = u => Sample.Input(Sample.Garage with { GroundLevel = 11.75 }, u),
        ["deep-ground"] = u => Sample.Input(Sample.Garage with { GroundLevel = 2 }, u),
        ["both-sides"] = u => Sample.Input(Sample.Garage with { ProtectedSideLevel = 11.7 }, u),
        ["raked"] = u => Sample.Input(Sample.Garage with { RakeDegrees = 20, ProtectedSideLevel = 11.7 }, u),
        ["steep-rake"] = u => Sample.Input(Sample.Garage with { RakeDegrees = 60 }, u),
        ["low-levels"] = u => Sample.Input(
            Sample.Garage with { SillLevel = -8001.25, GroundLevel = -8001.4 }, u,
            Sample.Project with { Site = Sample.Project.Site with { DesignStillWaterLevel = -8000.5 } }),
        ["shallow"] = u => Sample.Input(Sample.Garage with { SillLevel = 12.33, GroundLevel = 12.33 }, u),
        ["timber"] = u => Sample.Input(
            Sample.Garage with
            {
                Wall = WallKind.TimberFrame,
                Barrier = Sample.Garage.Barrier with
                {
                    Logs = Sample.Garage.Barrier.Logs with
                    {
                        Material = Sample.Alloy with { Family = MaterialFamily.Timber, Density = 500 },
                        Profile = new Rectangle { Height = 0.2, Depth = 0.1 },
                    },
                },
            }, u),
        ["footing"] = u => Sample.Input(
            Sample.Garage with
            {
                Barrier = Sample.Garage.Barrier with { Footing = new() { Width = 2.4, Thickness = 0.5, BarrierFromFloodEdge = 1.5, CutOff = 0.8 } },
            }, u),
        ["narrow-footing"] = u => Sample.Input(
            Sample.Garage with
            {
                Barrier = Sample.Garage.Barrier with { Footing = new() { Width = 0.4, Thickness = 0.2, BarrierFromFloodEdge = 0.1 } },
            }, u),
        ["guide-reveal"] = u => Guides(new(), u),
        ["guide-wet-face"] = u => Guides(new() { Mounting = GuideMounting.WetFace, LipLever = 0, BearingDistance = 0.08, LoadOffset = 0.08 }, u),
        ["guide-wet-face-tipping"] = u => Guides(new() { Mounting = GuideMounting.WetFace, LipThickness = 0.012, LoadOffset = 0.15 }, u),
        ["guide-dry-face"] = u => Guides(new() { Mounting = GuideMounting.DryFace, BearingDistance = 0.08, LoadOffset = 0.13 }, u),
        ["guide-dry-face-behind"] = u => Guides(new() { Mounting = GuideMounting.DryFace, LoadOffset = 0.06, LipLever = 0.025 }, u),
        ["guide-far-edge"] = u => Guides(new() { Fasteners = new() { EdgeDistance = 3 } }, u),
        ["guide-far-edge-dry"] = u => Guides(new() { Mounting = GuideMounting.DryFace, Fasteners = new() { EdgeDistance = 3 } }, u),
        ["guide-wide"] = u => Guides(new() { Mounting = GuideMounting.DryFace, BearingDistance = 1, BearingWidth = 1, LoadOffset = 1, LipLever = 0.5, LipThickness = 0.1, BaseThickness = 0.1 }, u),
        ["guide-small"] = u => Guides(
            new() { LipThickness = 0.002, LipLever = 0.004, BaseThickness = 0.002, LoadOffset = 0.006, BearingDistance = 0.004, BearingWidth = 0.002, Fasteners = new() { EdgeDistance = 0.006, HoleDiameter = 0.003 } }, u),
        ["raker"] = u => Propped(u, 0, new() { Material = Sample.Alloy with { BendingStrength = 160e6 }, HeadHeight = 0.9, FootDistance = 0.8 }),
        ["raker-on-a-raked-post"] = u => Propped(u, 30, new() { Material = Sample.Alloy, HeadHeight = 0.5, FootDistance = 1.6 }),
        ["raker-far-foot"] = u => Propped(u, 0, new() { Material = Sample.Alloy with { Family = MaterialFamily.Timber }, HeadHeight = 0.3, FootDistance = 12 }),
        ["base-plate"] = u => Plated(u, new ISection { Height = 0.1, Depth = 0.1, Flange = 0.01, Web = 0.006 }, new() { WeldLeg = 0.006, GroutThickness = 0.025 }),
        ["base-plate-tube"] = u => Plated(u, new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.006 }, new() { RodsPerRow = 1 }),
        ["base-plate-hollow"] = u => Plated(u, new HollowRectangle { Height = 0.12, Depth = 0.08, Face = 0.004, Web = 0.003, Webs = 3 }, new() { RodsPerRow = 4, Width = 1.2 }),
        ["base-plate-bar"] = u => Plated(u, new Rectangle { Height = 0.03, Depth = 0.08 }, new() { Length = 0.12, Width = 0.05, RodDistance = 0.05 }),
        ["anchors"] = u => Anchored(u, new() { Method = AnchorMethod.Aci318, Kind = AnchorKind.Headed, HeadArea = 500e-6, EdgeProtected = 0.15, EdgeLeft = 0.2 }),
        ["anchors-by-approval"] = u => Anchored(u, new() { TensionResistance = 20e3, ShearResistance = 15e3 }),
        ["anchors-in-a-beam"] = u => Anchored(u, new() { Method = AnchorMethod.En1992, Depth = 0.2, EdgeFlood = 0.08, EdgeProtected = 0.08, EdgeLeft = 1.4, EdgeRight = 1.4 }),
        ["mixed-stack"] = u => Sample.Input(
            Sample.Garage with
            {
                Barrier = Sample.Garage.Barrier with
                {
                    Logs = Sample.Garage.Barrier.Logs with
                    {
                        Below =
                        [
                            new LogGroup { Material = Sample.Alloy, Profile = Sample.Plank with { Height = 0.25, Depth = 0.08 }, Count = 2 },
                            new LogGroup { Material = Sample.Alloy with { Family = MaterialFamily.Timber }, Profile = new Rectangle { Height = 0.15, Depth = 0.06 } },
                        ],
                    },
                },
            }, u),
        ["i-section"] = u => Sample.Input(
            Sample.Garage with
            {
                Wall = WallKind.SteelFrame,
                Barrier = Sample.Garage.Barrier with
                {
                    Logs = Sample.Garage.Barrier.Logs with
                    {
                        Profile = new ISection { Height = 0.2, Depth = 0.15, Flange = 0.009, Web = 0.006 },
                    },
                },
            }, u),
        ["long-names"] = u => Sample.Input(
            Sample.Garage with { Name = Sample.LongName }, u, Sample.Project with { Name = Sample.LongName }),
        ["odd-names"] = u => Sample.Input(
            Sample.Garage with { Name = "Door\u0001\n<b>\uFFFE & \uD83D\uDEB0" }, u, Sample.Project with { Name = "\uD800" }),
    };

    private static DrawingInput Guides(GuideSet guides, UnitSystem units) => Sample.Input(
        Sample.Garage with { Wall = WallKind.Masonry, Barrier = Sample.Garage.Barrier with { Guides = guides with { Material = Sample.Alloy } } }, units);

    public static IEnumerable<string> Names => All.Keys;

    public static DrawingInput Input(string name, UnitSystem units) => All[name](units);

    private static DrawingInput Propped(UnitSystem units, double rake, RakerInput raker) => Sample.Input(
        Sample.Garage with
        {
            RakeDegrees = rake,
            Barrier = Sample.Garage.Barrier with { Posts = Sample.Garage.Barrier.Posts! with { Raker = raker with { Profile = new RectangularTube { Height = 0.05, Depth = 0.05, Wall = 0.004 } } } },
        }, units);

    private static DrawingInput Plated(UnitSystem units, Profile post, BasePlateInput plate) => Sample.Input(
        Sample.Garage with
        {
            Barrier = Sample.Garage.Barrier with
            {
                Posts = Sample.Garage.Barrier.Posts! with { Profile = post },
                BasePlate = plate with { Material = Sample.Alloy },
            },
        }, units);

    private static DrawingInput Anchored(UnitSystem units, AnchorInput anchors) => Sample.Input(
        Sample.Garage with { Barrier = Sample.Garage.Barrier with { BasePlate = new() { Material = Sample.Alloy }, Anchors = anchors } }, units);
}
