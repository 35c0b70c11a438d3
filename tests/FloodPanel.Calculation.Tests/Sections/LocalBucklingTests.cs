using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Calculation.Tests.Steps;

namespace FloodPanel.Calculation.Tests.Sections;

public class LocalBucklingTests
{
    private static readonly Material Alloy = new()
    {
        Family = MaterialFamily.Aluminium,
        ElasticModulus = 70e9,
        BendingStrength = 200e6,
        WeldedYield = 115e6,
        WeldedUltimate = 165e6,
        UltimateStrength = 250e6,
        BucklingClass = BucklingClass.A,
    };

    private static readonly Material Steel = new() { Family = MaterialFamily.Steel, ElasticModulus = 210e9, BendingStrength = 235e6 };

    public static TheoryData<DesignBasisKind, bool, double> Walls()
    {
        var data = new TheoryData<DesignBasisKind, bool, double>();
        foreach (var basis in Enum.GetValues<DesignBasisKind>())
        {
            foreach (var isWelded in new[] { false, true })
            {
                foreach (var wall in new[] { 0.0012, 0.002, 0.003, 0.005, 0.012 })
                {
                    data.Add(basis, isWelded, wall);
                }
            }
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Walls))]
    public void Of_AluminiumTubesHollowsAndIs_StepsWorkOut(DesignBasisKind basis, bool isWelded, double wall)
    {
        Profile[] profiles =
        [
            new RectangularTube { Height = 0.15, Depth = 0.1, Wall = wall },
            new HollowRectangle { Height = 0.25, Depth = 0.12, Face = wall, Web = wall, Webs = 4 },
            new ISection { Height = 0.15, Depth = 0.3, Flange = wall, Web = wall },
        ];

        foreach (var profile in profiles)
        {
            var resistance = LocalBuckling.Of(Member(Alloy, profile, basis), Basis(basis), isWelded).Resistance!;

            Assert.Empty(StepAudit.Complaints(resistance.Source, resistance.Steps));
            Assert.True(resistance.Moment > 0);
        }
    }

    [Theory]
    [InlineData(DesignBasisKind.AllowableStress)]
    [InlineData(DesignBasisKind.UsStrength)]
    [InlineData(DesignBasisKind.Eurocode)]
    public void Of_ThickerWall_NeverCarriesLess(DesignBasisKind basis)
    {
        var last = 0.0;
        for (var wall = 0.001; wall < 0.02; wall += 0.00025)
        {
            var moment = LocalBuckling.Of(Member(Alloy, Tube(wall), basis), Basis(basis)).Resistance!.Moment;

            Assert.True(moment >= last, $"{wall}: {moment} after {last}");
            last = moment;
        }
    }

    /// <summary>Steel 235, tube 100 × 100: clear width/wall 31.3 is class 1 (W_pl), 43.4 class 4 by EN 1993-1-1, Table 5.2: 33, 38, 42.</summary>
    [Fact]
    public void Of_SteelByEurocode_PlasticThenElasticThenNotCovered()
    {
        var thick = Member(Steel, Tube(0.003), DesignBasisKind.Eurocode);
        var third = Member(Steel, Tube(0.1 / 42), DesignBasisKind.Eurocode);
        var thin = Member(Steel, Tube(0.0022), DesignBasisKind.Eurocode);

        Assert.Equal(235e6 * thick.Section.PlasticModulus, LocalBuckling.Of(thick, DesignBases.Eurocode).Resistance!.Moment, 1e-6);
        Assert.Equal(235e6 * third.Section.Modulus, LocalBuckling.Of(third, DesignBases.Eurocode).Resistance!.Moment, 1e-6);
        Assert.Equal("buckling-slender", LocalBuckling.Of(thin, DesignBases.Eurocode).Gap!.Code);
    }

    /// <summary>AISC 360, Table B4.1b: 1.12·√(E/F_y) = 33.5 compact, 1.40·√(E/F_y) = 41.9 at 210 GPa and 235 MPa.</summary>
    [Fact]
    public void Of_SteelByAisc_CompactThenElasticThenNotCovered()
    {
        var thick = Member(Steel, Tube(0.003), DesignBasisKind.AllowableStress);
        var third = Member(Steel, Tube(0.1 / 42), DesignBasisKind.AllowableStress);
        var thin = Member(Steel, Tube(0.0022), DesignBasisKind.AllowableStress);

        Assert.Equal(235e6 / 1.67 * thick.Section.PlasticModulus, LocalBuckling.Of(thick, DesignBases.AllowableStress).Resistance!.Moment, 1e-6);
        Assert.Equal(235e6 / 1.67 * third.Section.Modulus, LocalBuckling.Of(third, DesignBases.AllowableStress).Resistance!.Moment, 1e-6);
        Assert.Equal("buckling-slender", LocalBuckling.Of(thin, DesignBases.AllowableStress).Gap!.Code);
    }

    [Fact]
    public void Of_MissingInputs_NamesThem()
    {
        var typed = Member(Alloy with { BendingStrength = null, AllowableBending = 100e6 }, Tube(0.003), DesignBasisKind.Eurocode);
        var given = Member(Alloy, new GivenProperties { Height = 0.1, Depth = 0.1, Modulus = 1e-5 }, DesignBasisKind.Eurocode);

        Assert.Equal("buckling-strength", LocalBuckling.Of(typed, DesignBases.Eurocode).Gap!.Code);
        Assert.Equal("buckling-profile", LocalBuckling.Of(given, DesignBases.Eurocode).Gap!.Code);
        Assert.Equal(new(null, null), LocalBuckling.Of(Member(Alloy, new Rectangle { Height = 0.1, Depth = 0.1 }, DesignBasisKind.Eurocode), DesignBases.Eurocode));
    }

    [Fact]
    public void Of_UnknownBucklingClass_IsTakenAsB()
    {
        var unknown = LocalBuckling.Of(Member(Alloy with { BucklingClass = null }, Tube(0.003), DesignBasisKind.Eurocode), DesignBases.Eurocode);
        var named = LocalBuckling.Of(Member(Alloy with { BucklingClass = BucklingClass.B }, Tube(0.003), DesignBasisKind.Eurocode), DesignBases.Eurocode);

        Assert.Equal(named.Resistance!.Moment, unknown.Resistance!.Moment);
        Assert.EndsWith("taken as B", unknown.Resistance.Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_TypedAllowable_Wins()
    {
        var derived = Member(Alloy, Tube(0.005), DesignBasisKind.Eurocode);
        var typed = Member(Alloy with { AllowableBending = 100e6 }, Tube(0.005), DesignBasisKind.Eurocode);

        var ratio = LocalBuckling.Of(typed, DesignBases.Eurocode).Resistance!.Moment
            / LocalBuckling.Of(derived, DesignBases.Eurocode).Resistance!.Moment;

        Assert.Equal(100 / (200 / 1.1), ratio, 1e-9);
    }

    private static RectangularTube Tube(double wall) => new() { Height = 0.1, Depth = 0.1, Wall = wall };

    private static DesignBasis Basis(DesignBasisKind kind) => DesignBases.Standard.Single(b => b.Kind == kind);

    private static Member Member(Material material, Profile profile, DesignBasisKind basis) => new(
        material, profile, SectionProperties.Of(profile), DesignStress.Bending(material, Basis(basis)), null, 200);
}
