using System.Text.Json.Nodes;
using FloodPanel.Calculation.Cases;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.Tests;

/// <summary>Projects that use every field of the tree, none of them at its default.</summary>
internal static partial class Example
{
    /// <summary>A material with each of its figures.</summary>
    public static Material EveryFigure { get; } = new()
    {
        Family = MaterialFamily.Timber,
        Name = "every figure",
        Density = 520,
        ElasticModulus = 11e9,
        BendingStrength = 24e6,
        ShearStrength = 4e6,
        UltimateStrength = 250e6,
        WeldedYield = 80e6,
        WeldedUltimate = 150e6,
        ShearModulus = 3e9,
        CrossStrength = 50e6,
        CrossCompression = 2.5e6,
        CharacteristicDensity = 350,
        BucklingClass = BucklingClass.B,
        Reference = StrengthReference.NdsReference,
    };

    public static Project Full { get; } = new()
    {
        Name = "Weir Cottage \"north\" \\ Überlauf 水門",
        Reference = "R-7",
        Client = "M. Ashdown",
        Address = "1 Weir Lane\nLower Tarn",
        Engineer = "P. Holm",
        DesignBasis = DesignBasisKind.Eurocode,
        OwnBasis = DesignBases.Eurocode with { Title = "Eurocode with the national annex", Inland = new(1.4, 0.9, 1.2, 1.1, 1.3, 1.6) },
        Confirmed = ["s275", "cf-100-100-5"],
        Site = new Site
        {
            Datum = "ordnance",
            WaterDensity = 1025,
            AnnualProbability = 0.005,
            DesignStillWaterLevel = 12.35,
            Surge = 0.1,
            ClimateAllowance = 1.0 / 3,
            ClimateRatePerYear = 0.0042,
            DesignLifeYears = 45,
            Freeboard = 0.25,
            FloodZone = FloodZone.CoastalA,
            Levels = [new LevelPoint(0.01, 12.2), new LevelPoint(0.005, 12.35)],
        },
        Openings = [Dock, Hatch],
        Covers = [Vent, Port],
    };

    public static string SamplePath(string name) => Path.Combine(AppContext.BaseDirectory, "Samples", name);

    /// <summary>The full example as a JSON tree that a test may spoil.</summary>
    public static JsonObject FullJson() => JsonNode.Parse(ProjectFileWriter.Write(Full))!.AsObject();

    public static Project Read(byte[] file)
    {
        var reading = ProjectFileReader.Read(file);
        Assert.Empty(reading.Problems);
        return reading.Project!;
    }

    private static Opening Dock => new()
    {
        Id = "dock",
        Name = "Loading dock",
        SillLevel = 11.4,
        GroundLevel = 11.3,
        ClearWidth = 3.3,
        ClearHeight = 2.1,
        RakeDegrees = 12.5,
        ProtectedSideLevel = 11.55,
        Wall = WallKind.CavityMasonry,
        WallBehind = new WallInput { LineResistance = 12e3, TotalResistance = 9e3, Source = "Drawing W-1" },
        Actions = new ActionSet
        {
            Flow = new FlowInput { Velocity = 1.2, ShapeCoefficient = 1.5 },
            Wave = new NonBreakingWaveInput { Height = 0.4, Period = 3.1, AngleDegrees = 15, BedSlope = 0.02 },
            Debris = new DebrisInput
            {
                Mass = 300,
                Velocity = 1.1,
                StoppingTime = 0.1,
                Coefficients = new DebrisCoefficients { Importance = 1.2, Orientation = 0.8, Depth = 0.75, Blockage = 0.6, Response = 1.3 },
            },
            Wind = new WindInput { Pressure = 800 },
            Line = new LineInput { Force = 740, Height = 1.1 },
        },
        Barrier = new Barrier
        {
            Logs = new LogStack
            {
                Material = new LibraryMaterial("en-aw-6005a-t6"),
                Profile = new HollowRectangle { Height = 0.2, Depth = 0.08, Face = 0.003, Web = 0.0035, Webs = 4 },
                Count = 7,
                EndBearing = 0.045,
                DeflectionLimit = 150,
                FittingClearance = 0.012,
                Sealed = false,
                SealPreload = 150,
                Joint = new LogJoint { Travel = 0.006, SealCompression = 0.004 },
                Timber = new TimberService { Duration = LoadDuration.MediumTerm, SizeFactor = 1.2 },
                Composite = new CompositeService { MaterialFactor = 2.5, ConversionFactor = 0.6 },
                Below =
                [
                    new LogGroup { Material = new LibraryMaterial("en-aw-6005a-t6"), Profile = new RectangularTube { Height = 0.25, Depth = 0.08, Wall = 0.006, CornerRadius = 0.009, InnerRadius = 0.006 }, Count = 1 },
                    new LogGroup { Material = EveryFigure, Profile = new LibraryProfile("log-200-50"), Count = 2 },
                ],
            },
            Bays = [1.6, 1.6],
            Posts = new PostSet
            {
                Material = new Material
                {
                    Family = MaterialFamily.Steel,
                    Name = "tested steel",
                    Density = 7850,
                    ElasticModulus = 210e9,
                    BendingStrength = 275e6,
                    ShearStrength = 158e6,
                    AllowableBending = 165e6,
                    AllowableShear = 95e6,
                },
                Profile = new ISection { Height = 0.1, Depth = 0.12, Flange = 0.01, Web = 0.006 },
                Width = 0.1,
                DeflectionLimit = 120,
                WeldedBase = true,
                Raker = new RakerInput
                {
                    Material = EveryFigure,
                    Profile = new RectangularTube { Height = 0.06, Depth = 0.06, Wall = 0.004 },
                    HeadHeight = 0.95,
                    FootDistance = 1.25,
                    LengthFactor = 0.9,
                    Play = 0.0015,
                    FootResistance = 14e3,
                },
            },
            BasePlate = new BasePlateInput
            {
                Material = EveryFigure,
                Length = 0.32,
                Width = 0.21,
                Thickness = 0.022,
                RodDistance = 0.12,
                RodsPerRow = 3,
                ConcreteStrength = 30e6,
                AreaRatio = 2.5,
                GroutThickness = 0.03,
                WeldLeg = 0.007,
                WeldStrength = 480e6,
            },
            Anchors = new AnchorInput
            {
                Method = AnchorMethod.En1992,
                Kind = AnchorKind.Headed,
                Diameter = 0.02,
                StressArea = 245e-6,
                Yield = 300e6,
                Ultimate = 500e6,
                Ductile = false,
                Depth = 0.18,
                HeadArea = 600e-6,
                HookLength = 0.07,
                Pullout = 40e3,
                CriticalEdge = 0.31,
                Category = 2,
                InstallationFactor = 1.2,
                Spacing = 0.14,
                EdgeFlood = 0.3,
                EdgeProtected = 0.25,
                EdgeLeft = 0.4,
                EdgeRight = 0.45,
                MemberThickness = 0.35,
                Cracked = false,
                SupplementaryReinforcement = true,
                SharedShear = true,
                WasherThickness = 0.01,
                TensionResistance = 31e3,
                ShearResistance = 22e3,
                InteractionLimit = 1.2,
                MinimumEdge = 0.09,
                MinimumSpacing = 0.11,
                Source = "Approval A-7",
            },
            Guides = Guides,
            Footing = new FootingInput
            {
                Width = 2.2,
                Thickness = 0.55,
                BarrierFromFloodEdge = 1.3,
                Density = 2350,
                Friction = 0.45,
                Adhesion = 2e3,
                AllowableBearing = 90e3,
                CutOff = 0.8,
                Soil = CreepSoil.FineSand,
                SlidingFactor = 1.4,
                OverturningFactor = 1.6,
                FlotationFactor = 1.2,
                ContactShare = 0.75,
                CarriesGuides = true,
                Source = "Report G-2",
            },
            ByOthers = [new DesignedByOthers("anchors", "N. Lund", "A-12")],
        },
        Leakage = new LeakageInput
        {
            Convention = LeakConvention.Seal,
            Rate = 2e-7,
            RainIntensity = 1.4e-5,
            RainArea = 22,
            RunoffCoefficient = 0.8,
            SumpVolume = 0.12,
            PumpMargin = 2,
            BackFlowClosed = true,
        },
    };
}
