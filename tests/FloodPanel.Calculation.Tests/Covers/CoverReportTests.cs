using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>Covers by hand with the coefficients of published tables; what is missing; what is not covered; cautions.</summary>
public class CoverReportTests
{
    private const string Bending = "cover-bending";
    private const string Deflection = "cover-deflection";
    private const string Tension = "cover-fastener-tension";

    /// <summary>Roark case 1a, square: σ = 0.2874·q·b²/t², y = 0.0444·q·b⁴/(E·t³), edge 0.420·q·b; q = 9806.65 Pa.</summary>
    [Fact]
    public void Evaluate_SquareHatch_RoarksCoefficients()
    {
        var result = SampleCovers.Evaluate(SampleCovers.Hatch);
        const double q = SampleCovers.Weight;

        Assert.Equal(0.2874 * q * 0.25 / 64e-6 / 100e6, result.Use(Bending), tolerance: 0.001 * result.Use(Bending));
        Assert.Equal(0.0444 * q * 0.0625 / (70e9 * 512e-9) / (0.5 / 200), result.Use(Deflection), tolerance: 0.002 * result.Use(Deflection));
        Assert.Equal((0.420 * q * 0.5 + 1000) * 0.1 / 2000, result.Use(Tension), tolerance: 0.002 * result.Use(Tension));
        Assert.Equal(VerdictKind.Adequate, result.Kind);
        Assert.Equal("Adequate. Deflection of the plate governs, at 0.30 of the allowable.", result.Sentence.ToString());
    }

    /// <summary>Seating: one corner of a square is held by 0.065·q·b² (Timoshenko), and the gasket.</summary>
    [Fact]
    public void Evaluate_SquareHatchPressedOn_CornerAndGasket()
    {
        var result = SampleCovers.Evaluate(SampleCovers.Hatch with { Pressing = CoverPressing.Seating });

        Assert.Equal(0.065 * SampleCovers.Weight * 0.25 + 100, 2000 * result.Use(Tension), tolerance: 2);
    }

    /// <summary>
    /// Upright, fully under water: uniform part γ·1.1 m and a triangle to γ·1.5 m. At the centre both tables together (a = 0.4, b/a = 1.5, and
    /// width/height 1.5) give M = (0.0812·1.1 + 0.0406·0.4)·γ·0.16; the greatest stands a little lower and is a little more.
    /// </summary>
    [Fact]
    public void Evaluate_UprightVent_TrapezoidOfBothTables()
    {
        var result = SampleCovers.Evaluate(SampleCovers.Vent);
        var centre = (0.0812 * 1.1 + 0.0406 * 0.4) * SampleCovers.Weight * 0.16;

        Assert.InRange(result.Response!.Moment, centre * 0.999, centre * 1.01);
        Assert.InRange(result.Response.MomentDown, 0.2, 0.22);
        Assert.Equal(0.3, result.Response.MomentAcross, tolerance: 1e-9);
    }

    /// <summary>Clamped circle, 0.6 m, 1 m down: v = q·r/2 = 1471 N/m, m = q·r²/8 = 110.3 N, e 50 mm; T = (v + m/e + n_g)·p.</summary>
    [Theory]
    [InlineData(CoverPressing.Unseating, 1471.0)]
    [InlineData(CoverPressing.Seating, 0)]
    public void Evaluate_ClampedCircle_FixingMomentOnTheFasteners(CoverPressing pressing, double reaction)
    {
        var cover = SampleCovers.Hatch with { Plate = new CircleCover { Diameter = 0.6, Support = CircleSupport.Clamped }, Pressing = pressing };

        var result = SampleCovers.Evaluate(cover.WithFasteners(f => f with { FixingLever = 0.05 }));

        Assert.Equal((reaction + 110.32 / 0.05 + 1000) * 0.1, 2000 * result.Use(Tension), tolerance: 0.1);
        Assert.Contains(result.Notes, n => n.Code == "cover-clamped");
    }

    /// <summary>The corner beside a free edge takes a force of its own: R_p + v·p/2 where it is more than v·p.</summary>
    [Fact]
    public void Evaluate_FreeUpperEdge_CornerForceCounts()
    {
        var cover = SampleCovers.Hatch with { Plate = new RectangleCover { Width = 0.5, Height = 0.5, Support = RectangleSupport.ThreeEdges } };

        var result = SampleCovers.Evaluate(cover.WithFasteners(f => f with { GasketLoad = 0, Pitch = 0.05 }));

        var (line, corner) = (result.Step(Tension, "v"), result.Step(Tension, "R_p"));
        Assert.True(corner > line * 0.05);
        Hand.Equal(corner + line * 0.05 / 2, 2000 * result.Use(Tension));
    }

    [Fact]
    public void Evaluate_StrengthBasis_LoadFactorOnStressNotOnDeflection()
    {
        var site = SampleCovers.Project.Site;
        var coastal = SampleCovers.Project with { DesignBasis = DesignBasisKind.UsStrength, Site = site with { FloodZone = FloodZone.CoastalA } };
        var (plain, factored) = (SampleCovers.Evaluate(SampleCovers.Hatch), Design.Evaluate(coastal, SampleCovers.Hatch, Library.Empty));

        Hand.Equal(2 * plain.Use(Bending), factored.Use(Bending));
        Hand.Equal(2 * (plain.Use(Tension) - 0.05), factored.Use(Tension) - 0.05);
        Hand.Equal(plain.Use(Deflection), factored.Use(Deflection));
    }

    [Fact]
    public void Evaluate_AboveTheWater_AdequateWithoutChecks()
    {
        var result = SampleCovers.Evaluate(SampleCovers.Vent with { Level = 10.01 });

        Assert.Empty(result.Checks);
        Assert.Empty(result.Gaps);
        Assert.Equal(VerdictKind.Adequate, result.Kind);
        Assert.Equal("cover-dry", Assert.Single(result.Notes).Code);
    }

    /// <summary>Nothing above the water line: a plate twice as high, its upper half in air, carries the same force as its wet half.</summary>
    [Fact]
    public void Evaluate_WaterLineOnThePlate_ExactAndSaid()
    {
        var half = SampleCovers.Vent with { Level = 9.8, Plate = new RectangleCover { Width = 0.6, Height = 0.4 } };

        var result = SampleCovers.Evaluate(half);

        Assert.Contains(result.Notes, n => n.Code == "cover-partly-wet");
        Assert.InRange(result.Response!.MomentDown, 0.2, 0.4);
        Assert.True(result.Use(Bending) < SampleCovers.Evaluate(half with { Level = 9.6 }).Use(Bending));
    }

    [Fact]
    public void Evaluate_WaterLineOnACircle_TakenStraightFromTheTop()
    {
        var circle = SampleCovers.Hatch with { Plate = new CircleCover { Diameter = 0.6 }, Position = CoverPosition.Upright, Level = 10 };

        var result = SampleCovers.Evaluate(circle);

        Hand.Equal(0.3 * SampleCovers.Weight * 0.3 * (1.0 / 2 + 1.0 / 4) / 2, result.Response!.Reaction);
        Assert.Contains(result.Notes, n => n.Code == "cover-partly-wet");
    }

    [Fact]
    public void Evaluate_ThinPlate_LargeDeflectionSaid()
    {
        Assert.DoesNotContain(SampleCovers.Evaluate(SampleCovers.Hatch).Notes, n => n.Code == "cover-large-deflection");
        Assert.Contains(SampleCovers.Evaluate(SampleCovers.Hatch with { Thickness = 0.003 }).Notes, n => n.Code == "cover-large-deflection");
    }

    [Fact]
    public void Evaluate_InputsMissing_IncompleteAndSaysWhich()
    {
        Gap("cover-tension", SampleCovers.Hatch.WithFasteners(f => f with { Tension = null }));
        Gap("cover-tension-source", SampleCovers.Hatch.WithFasteners(f => f with { Source = " " }));
        Gap("cover-stress", SampleCovers.Hatch with { Material = SampleCovers.Plate with { AllowableBending = null } });
        Gap("cover-material", SampleCovers.Hatch with { Material = SampleCovers.Plate with { Family = MaterialFamily.Timber } });
        Gap("cover-fixing-lever", SampleCovers.Hatch with { Plate = new CircleCover { Support = CircleSupport.Clamped } });
        Gap("cover-shape", SampleCovers.Hatch with { Plate = new RectangleCover { Width = 0.1, Height = 1.01 } });

        static void Gap(string code, Cover cover)
        {
            var result = SampleCovers.Evaluate(cover);
            Assert.Equal(code, Assert.Single(result.Gaps).Code);
            Assert.Equal(VerdictKind.Incomplete, result.Kind);
            Assert.StartsWith("Incomplete. ", result.Sentence.ToString());
        }
    }

    /// <summary>Pressed onto its seat without a gasket, a round plate asks nothing of its fasteners.</summary>
    [Fact]
    public void Evaluate_RoundAndPressedOn_NoTensionNeeded()
    {
        var cover = SampleCovers.Hatch with { Plate = new CircleCover(), Pressing = CoverPressing.Seating };

        var result = SampleCovers.Evaluate(cover.WithFasteners(f => f with { GasketLoad = 0, Tension = null }));

        Assert.Equal(VerdictKind.Adequate, result.Kind);
        Assert.DoesNotContain(result.Checks, c => c.Name == Tension);
    }

    [Fact]
    public void Evaluate_CheckFails_InadequateAlsoWithAGap()
    {
        var result = SampleCovers.Evaluate((SampleCovers.Hatch with { Thickness = 0.001 }).WithFasteners(f => f with { Tension = null }));

        Assert.Equal(VerdictKind.Inadequate, result.Kind);
        Assert.NotEmpty(result.Gaps);
    }

    /// <summary>0.5 m at no more than 0.1 m: five spaces a side, twenty fasteners; 0.55 m: six.</summary>
    [Theory]
    [InlineData(0.5, RectangleSupport.FourEdges, 20)]
    [InlineData(0.55, RectangleSupport.FourEdges, 22)]
    [InlineData(0.5, RectangleSupport.ThreeEdges, 16)]
    public void Evaluate_Rectangle_FastenersCounted(double width, RectangleSupport support, int count) => Assert.Equal(
        count, SampleCovers.Evaluate(SampleCovers.Hatch with { Plate = new RectangleCover { Width = width, Height = 0.5, Support = support } }).Fasteners);

    [Fact]
    public void Run_ProjectWithCovers_OneResultEach() => Assert.Equal(
        ["Hatch", "Vent"],
        Design.Run(SampleCovers.Project with { Covers = [SampleCovers.Hatch, SampleCovers.Vent] }, Library.Empty).Covers.Select(c => c.Cover.Name));
}
