using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// EN 1995-1-1: X_d = k_mod·X_k/γ_M (2.4.1) with k_mod = 0.70 (Table 3.1, solid timber, service class 3, short term)
/// and γ_M = 1.30 (Table 2.3); strengths of EN 338:2016, Tables 1 and 3. Figures read in public transcriptions; the
/// quotients worked by hand.
/// </summary>
public class En1995Tests
{
    /// <summary>C16 16 and 3.2, C24 24 and 4.0, D30 30 and 3.9 MPa.</summary>
    [Theory]
    [InlineData(16, 3.2, 8.62, 1.72)]
    [InlineData(24, 4.0, 12.92, 2.15)]
    [InlineData(30, 3.9, 16.15, 2.10)]
    public void Section241_StrengthClasses_DesignStrengths(
        double bendingMpa, double shearMpa, double designBendingMpa, double designShearMpa)
    {
        var timber = new Material
        {
            Family = MaterialFamily.Timber,
            BendingStrength = bendingMpa * 1e6,
            ShearStrength = shearMpa * 1e6,
        };

        var bending = DesignStress.Bending(timber, DesignBases.Eurocode)!.Value / 1e6;
        var shear = DesignStress.Shear(timber, DesignBases.Eurocode)!.Value / 1e6;

        Assert.Equal(designBendingMpa, bending, tolerance: 0.005);
        Assert.Equal(designShearMpa, shear, tolerance: 0.005);
    }

    /// <summary>Table 3.1, solid timber, service class 3.</summary>
    [Theory]
    [InlineData(LoadDuration.Permanent, 0.50)]
    [InlineData(LoadDuration.LongTerm, 0.55)]
    [InlineData(LoadDuration.MediumTerm, 0.65)]
    [InlineData(LoadDuration.ShortTerm, 0.70)]
    [InlineData(LoadDuration.Instantaneous, 0.90)]
    public void Table31_ServiceClass3_Modification(LoadDuration duration, double printed) =>
        Assert.Equal(printed, TimberFactors.Modification(duration));

    /// <summary>3.2(3): (150/h)^0.2 up to 1.3, for h below 150 mm and ρ_k up to 700 kg/m³.</summary>
    [Theory]
    [InlineData(0.075, 350.0, 1.149)]
    [InlineData(0.030, 350.0, 1.300)]
    [InlineData(0.150, 350.0, 1)]
    [InlineData(0.075, 701.0, 1)]
    [InlineData(0.075, null, 1)]
    public void Section323_ThinPlanks_DepthFactor(double depth, double? density, double expected) =>
        Assert.Equal(expected, TimberFactors.Depth(depth, density), tolerance: 0.0005);

    /// <summary>
    /// Plank of C24, 75 × 200, span 1.2 m, 9 kPa, short term, service class 3, recomputed outside this code: f_m,d 14.84 MPa, M_Rd 2.78
    /// kN·m; V_Rd 14.4 kN with k_cr 0.67; deflection 0.63 mm by bending and 0.04 mm by shear (G 690 MPa).
    /// </summary>
    [Fact]
    public void Plank_ShortTermWet_ResistancesAndDeflections()
    {
        var timber = new Material
        {
            Family = MaterialFamily.Timber,
            Density = 420,
            ElasticModulus = 11e9,
            BendingStrength = 24e6,
            ShearStrength = 4e6,
            ShearModulus = 690e6,
            CharacteristicDensity = 350,
        };
        var (profile, stack) = (new Rectangle { Height = 0.2, Depth = 0.075 }, new LogStack { Timber = new() });
        var plank = new Member(
            timber, profile, SectionProperties.Of(profile), LogStress.Bending(timber, profile, stack, DesignBases.Eurocode),
            LogStress.Shear(timber, profile, stack, DesignBases.Eurocode), 200);

        Assert.Equal(14.84, plank.Bending!.Value / 1e6, tolerance: 0.005);
        Assert.Equal(2.78, plank.MomentResistance / 1e3, tolerance: 0.005);
        Assert.Equal(14.4, plank.ShearResistance / 1e3, tolerance: 0.05);
        Assert.Equal(0.63, SimpleBeam.Deflection(1800, 1.2, plank.Stiffness) * 1e3, tolerance: 0.005);
        Assert.Equal(0.04, ShearDeflection.Uniform(1800, 1.2, 690e6 * ShearDeflection.Area(plank)) * 1e3, tolerance: 0.005);
    }
}
