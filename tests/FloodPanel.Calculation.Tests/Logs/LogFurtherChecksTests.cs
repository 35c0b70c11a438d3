using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FloodPanel.Calculation.Tests.Steps;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Logs;

/// <summary>Checks of a log besides bending, shear and deflection as a beam.</summary>
public class LogFurtherChecksTests
{
    private static readonly Material Alloy = SampleProject.Aluminium with
    {
        AllowableBending = null,
        AllowableShear = null,
        BendingStrength = 200e6,
        ShearStrength = 115e6,
        BucklingClass = BucklingClass.A,
    };

    private static readonly Material Timber = new()
    {
        Family = MaterialFamily.Timber,
        Density = 420,
        ElasticModulus = 11e9,
        BendingStrength = 24e6,
        ShearStrength = 4e6,
        CrossCompression = 2.5e6,
        ShearModulus = 690e6,
    };

    [Theory]
    [InlineData(DesignBasisKind.AllowableStress)]
    [InlineData(DesignBasisKind.UsStrength)]
    [InlineData(DesignBasisKind.Eurocode)]
    public void Of_HollowAluminium_WallsSkinAndWebs(DesignBasisKind basis)
    {
        var log = Bottom(l => l with { Material = Alloy }, basis);

        Assert.Equal(["log-local-buckling", "log-skin", "log-crippling"], log.Others.Select(c => c.Name));
        Assert.All(log.Others, c => Assert.Empty(StepAudit.Complaints(c)));
    }

    /// <summary>AISC 360, J10: steel tube logs.</summary>
    [Theory]
    [InlineData(DesignBasisKind.AllowableStress)]
    [InlineData(DesignBasisKind.UsStrength)]
    [InlineData(DesignBasisKind.Eurocode)]
    public void Of_SteelTube_WallsSkinAndWebs(DesignBasisKind basis)
    {
        var steel = SampleProject.Steel with { AllowableBending = null, BendingStrength = 235e6, ShearStrength = 135e6 };

        foreach (var wall in new[] { 0.004, 0.005, 0.008 })
        {
            var log = Bottom(l => l with { Material = steel, Profile = new RectangularTube { Height = 0.15, Depth = 0.1, Wall = wall } }, basis);

            Assert.Equal(["log-local-buckling", "log-skin", "log-crippling"], log.Others.Select(c => c.Name));
            Assert.All(log.Others, c => Assert.Empty(StepAudit.Complaints(c)));
        }
    }

    /// <summary>One sort of slender steel wall makes the logs incomplete, once, and by a sentence.</summary>
    [Fact]
    public void Gaps_SlenderSteelWalls_LogsIncomplete()
    {
        var steel = SampleProject.Steel with { BendingStrength = 235e6 };

        var result = Result(l => l with { Material = steel, Profile = new RectangularTube { Height = 0.2, Depth = 0.1, Wall = 0.002 } });

        var gap = Assert.Single(result.Gaps, g => g.Check == NeededChecks.Logs);
        Assert.Equal("buckling-slender", gap.Note.Code);
        Assert.Contains(NeededChecks.Logs, result.Verdict.Missing);
    }

    /// <summary>By hand: seat of 40 mm less 10 mm clearance, 200 mm high: σ = V/(0.2·0.03), against 2.5·0.70/1.30 MPa.</summary>
    [Fact]
    public void Of_Timber_SeatBearingAndShearDeflection()
    {
        var log = Bottom(
            l => l with { Material = Timber, Profile = new Rectangle { Height = 0.2, Depth = 0.09 }, FittingClearance = 0.01, Timber = new() },
            DesignBasisKind.Eurocode);

        var seat = log.Others.Single(c => c.Name == "log-seat-bearing");
        Assert.Equal(log.Shear / (0.2 * 0.03), seat.Demand, tolerance: 1e-6);
        Assert.Equal(2.5e6 * 0.70 / 1.30, seat.Capacity, tolerance: 1e-3);
        var deflection = log.Others.Single(c => c.Name == "log-deflection-with-shear");
        var uniform = Load(log) * 2.14 * 2.14 / (8 * 690e6 * 5 * 0.2 * 0.09 / 6);
        Assert.Equal(log.Deflection + uniform, deflection.Demand, tolerance: 1e-12);
        Assert.All(log.Others, c => Assert.Empty(StepAudit.Complaints(c)));
    }

    [Fact]
    public void Of_Composite_SkinAcrossTheFibresByTypedFactors()
    {
        var composite = new Material { Family = MaterialFamily.Composite, Density = 1850, ElasticModulus = 23e9, BendingStrength = 240e6, ShearStrength = 25e6, CrossStrength = 100e6 };

        var log = Bottom(l => l with { Material = composite, Composite = new() { MaterialFactor = 2, ConversionFactor = 0.5 } }, DesignBasisKind.Eurocode);

        Assert.Equal(240e6 * 0.5 / 2 * 2.0 * Inertia / 0.09, log.BendingCheck!.Capacity, tolerance: 1e-6);
        Assert.Equal(25e6, log.Others.Single(c => c.Name == "log-skin").Capacity, tolerance: 1e-6);
        Assert.All(log.Checks, c => Assert.Empty(StepAudit.Complaints(c)));
    }

    /// <summary>By hand: δ = 5·w·L⁴/384EI of each, θ = w·L³/24EI over 40 mm.</summary>
    [Fact]
    public void Of_Joint_DifferenceOfDeflectionsAndTurnOfTheEnd()
    {
        var result = Result(l => l with { Joint = new() { Travel = 0.004, SealCompression = 0.002 } });
        var (log, above) = (result.Cases[0].Logs[0], result.Cases[0].Logs[1]);

        var travel = log.Others.Single(c => c.Name == "log-joint-travel");
        var seal = log.Others.Single(c => c.Name == "log-end-seal");

        Assert.Equal(log.Deflection - above.Deflection, travel.Demand, tolerance: 1e-15);
        Assert.Equal(0.004, travel.Capacity);
        Assert.Equal(log.Deflection * 16 / (5 * 2.14) * 0.04, seal.Demand, tolerance: 1e-12);
        Assert.Equal(0.002, seal.Capacity);
        Assert.DoesNotContain(result.Cases[0].Logs[5].Others, c => c.Name == "log-joint-travel");
    }

    /// <summary>A softer log beneath a stiffer one bends away from it: neighbours of different kinds are taken as they are.</summary>
    [Fact]
    public void Of_JointBetweenDifferentLogs_EachByItsOwnStiffness()
    {
        var soft = new LogGroup { Count = 1, Material = SampleProject.Aluminium, Profile = new HollowRectangle { Height = 0.2, Depth = 0.05, Face = 0.0032, Web = 0.003, Webs = 3 } };

        var result = Result(l => l with { Joint = new() { Travel = 0.004 }, Below = [soft] });
        var (lower, upper) = (result.Cases[0].Logs[0], result.Cases[0].Logs[1]);

        var travel = lower.Others.Single(c => c.Name == "log-joint-travel");
        Assert.Equal(lower.Deflection - upper.Deflection, travel.Demand, tolerance: 1e-15);
        Assert.Empty(StepAudit.Complaints(travel));
    }

    [Fact]
    public void Of_OldFile_HasNoFurtherChecks()
    {
        Assert.All(SampleProject.Result(SampleProject.Project).Cases.SelectMany(c => c.Logs), log => Assert.Empty(log.Others));
    }

    /// <summary>A wider joint, a more compressible seal or a longer seat never makes a check worse; a longer seat turns more at its seal, which is left out.</summary>
    [Property(MaxTest = 60, Arbitrary = [typeof(Scenarios)])]
    public void Checks_Better_NeverWorse(Scenario scenario)
    {
        NeverWorse(scenario, l => l with { Joint = l.Joint is { } j ? j with { Travel = 2 * j.Travel, SealCompression = 2 * j.SealCompression } : null });
        NeverWorse(scenario, l => l with { FittingClearance = l.FittingClearance / 2 });
        NeverWorse(scenario, l => l with { Composite = l.Composite is { } c ? c with { MaterialFactor = (1 + c.MaterialFactor) / 2 } : null });
    }

    [Fact]
    public void Validate_ServiceOutOfLimits_OneSentenceEach()
    {
        var project = Refused.With((LogStack l) => l with
        {
            Joint = new() { Travel = 0, SealCompression = 0.2 },
            Timber = new() { SizeFactor = 2 },
            Composite = new() { MaterialFactor = 0.5, ConversionFactor = 1.5 },
        });

        var problems = project.Validate(Library.Empty);

        Assert.Equal(
            ["logs.joint.travel", "logs.joint.sealCompression", "logs.timber.sizeFactor", "logs.composite.materialFactor", "logs.composite.conversionFactor"],
            problems.Select(p => p.Path.Replace("openings[0].barrier.", "", StringComparison.Ordinal)));
        Assert.Equal("Joint travel is 0 mm; allowed is above 0.0 mm and at most 100.0 mm.", problems[0].Message.In(UnitSystem.SI));
    }

    private static void NeverWorse(Scenario scenario, Func<LogStack, LogStack> change)
    {
        var changed = scenario.With((Opening o) => o with { Barrier = o.Barrier with { Logs = change(o.Barrier.Logs) } });
        var (before, after) = (Others(scenario), Others(changed));
        foreach (var (name, use) in before)
        {
            Assert.True(after[name] <= use * (1 + 1e-9) + 1e-12, $"{name}: {use:R} became {after[name]:R}");
        }
    }

    private static Dictionary<string, double> Others(Scenario scenario) =>
        scenario.DesignFlood.Logs.SelectMany(l => l.Others.Select(c => ($"{c.Name} {l.Index} {l.Bay}", c.Utilisation))).ToDictionary();

    private static double Load(LogResult log) => log.Deflection * 384 * 11e9 * 0.2 * Math.Pow(0.09, 3) / 12 / 5 / Math.Pow(2.14, 4);

    private static double Inertia => (0.2 * Math.Pow(0.09, 3) - (0.2 - 3 * 0.003) * Math.Pow(0.09 - 2 * 0.0032, 3)) / 12;

    private static LogResult Bottom(Func<LogStack, LogStack> change, DesignBasisKind basis) => Result(change, basis).Cases[0].Logs[0];

    private static OpeningResult Result(Func<LogStack, LogStack> change, DesignBasisKind basis = DesignBasisKind.AllowableStress) =>
        SampleProject.Result(Refused.With(change) with { DesignBasis = basis });
}
