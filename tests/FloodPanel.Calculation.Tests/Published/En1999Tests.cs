using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// EN 1999-1-1:2007, 6.1.4 and 6.2.5: classes and effective thickness. Limits and constants from memory; the printed pairs
/// meet at β₃, and the worked log was recomputed outside this code (ribs of 3, 2.5 and 3 mm; only their sum counts in bending).
/// </summary>
public class En1999Tests
{
    /// <summary>Tables 6.2 and 6.3: C₁/β₃ − C₂/β₃² = 1.000 in all eight rows, and β₁ &lt; β₂ &lt; β₃.</summary>
    [Theory]
    [InlineData(BucklingClass.A, 22, 18, 6, 5)]
    [InlineData(BucklingClass.B, 18, 15, 5, 4)]
    public void Tables62And63_EffectiveThicknessAtClass3Limit_IsFull(
        BucklingClass buckling, double plain, double welded, double outstand, double weldedOutstand)
    {
        (double Limit, bool IsWelded, bool IsOutstand)[] rows =
            [(plain, false, false), (welded, true, false), (outstand, false, true), (weldedOutstand, true, true)];

        foreach (var (limit, isWelded, isOutstand) in rows)
        {
            var row = EurocodeSlenderness.Of(buckling, isWelded, isOutstand);

            Assert.Equal(limit, row.Beta3);
            Assert.Equal(1.000, row.C1 / limit - row.C2 / (limit * limit), tolerance: 0.0005);
            Assert.Equal(3, row.Class(limit));
            Assert.Equal(4, row.Class(limit * 1.0001));
        }
    }

    /// <summary>
    /// Ribbed log 200 × 50 of 6060 T66, f_o 160 MPa: face bay 95.75 mm, β 31.9, β/ε 25.5 above 22, class 4: ρ_c 0.916, 48.4 mm²
    /// left out, shift 0.745 mm, I_eff 696 283 mm⁴, W_eff 27 045 mm³, M_Rd 3.93 kN·m.
    /// </summary>
    [Fact]
    public void RibbedLog_FaceOfClass4_EffectiveSectionAndMoment()
    {
        var alloy = new Material
        {
            Family = MaterialFamily.Aluminium,
            ElasticModulus = 70e9,
            BendingStrength = 160e6,
            BucklingClass = BucklingClass.A,
        };
        var profile = new HollowRectangle { Height = 0.2, Depth = 0.05, Face = 0.003, Web = 0.0085 / 3, Webs = 3 };
        var log = new Member(
            alloy, profile, SectionProperties.Of(profile), DesignStress.Bending(alloy, DesignBases.Eurocode), null, 200);

        var resistance = LocalBuckling.Of(log, DesignBases.Eurocode).Resistance!;

        double Step(string symbol) => resistance.Steps.Single(s => s.Symbol == symbol).Value;
        Assert.Equal(95.75, Step("b_f") * 1e3, tolerance: 0.005);
        Assert.Equal(31.9, Step("λ_f"), tolerance: 0.05);
        Assert.Equal(25.5, Step("β_f"), tolerance: 0.05);
        Assert.Equal(0.916, Step("ρ_f"), tolerance: 0.0005);
        Assert.Equal(48.4, Step("ΔA_f") * 1e6, tolerance: 0.05);
        Assert.Equal(0.745, Step("s") * 1e3, tolerance: 0.0005);
        Assert.Equal(696_283, Step("I_eff") * 1e12, tolerance: 0.5);
        Assert.Equal(27_045, Step("W_eff") * 1e9, tolerance: 0.5);
        Assert.Equal(3.93, resistance.Moment / 1000, tolerance: 0.005);
    }
}
