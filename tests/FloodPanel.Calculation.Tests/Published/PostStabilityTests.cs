using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>Gardner and Nethercot, Designers' Guide to EN 1993-1-1. Figures from memory, recomputed.</summary>
public class GardnerNethercotTests
{
    /// <summary>
    /// Example 6.5: 406 x 178 x 74 UB, S275, W_pl 1501 cm³, h_w 380.8, t_w 9.5 mm, V 525 of 689 kN: ρ 0.27, M_y,V,Rd 386.8 kN·m beside 412 without shear.
    /// </summary>
    [Fact]
    public void Example65_HighShear_ReducedMoment()
    {
        const double plastic = 1501e-6, web = 0.3808 * 0.0095, yield = 275e6;

        var reduction = PostInteraction.WebReduction(525e3, 689.2e3);
        var moment = PostInteraction.MomentWithShear(plastic, web * web / (4 * 0.0095), reduction, yield, plastic * yield);

        Assert.Equal(0.27, reduction, tolerance: 0.005);
        Assert.Equal(386.8, moment / 1e3, tolerance: 0.05);
        Assert.Equal(0, PostInteraction.WebReduction(0.5 * 689.2e3, 689.2e3));
    }
}

/// <summary>AISC Manual and Design Examples, stability of steel members. Figures from memory, recomputed.</summary>
public class AiscStabilityTests
{
    private const double Inch = 0.0254;
    private const double Ksi = Columns.Ksi;

    /// <summary>
    /// Design Examples, F.1-2B: W18x50, F_y 50 ksi, L_b 11.7 ft, C_b 1.01: L_p 5.83 ft, L_r 16.9 ft, available 305 kip-ft (LRFD).
    /// </summary>
    [Fact]
    public void DesignExampleF12B_W18x50_LateralTorsionalBuckling()
    {
        var (moment, plastic, elastic) = LateralBuckling.SteelUs(
            50 * Ksi, 29000 * Ksi, 88.9 * Math.Pow(Inch, 3), 101 * Math.Pow(Inch, 3), 1.65 * Inch, 1.98 * Inch,
            1.24 * Math.Pow(Inch, 4), 17.4 * Inch, 35.0 / 3 * 12 * Inch, 1.01);

        Assert.Equal(5.83, plastic / (12 * Inch), tolerance: 0.005);
        Assert.Equal(16.9, elastic / (12 * Inch), tolerance: 0.05);
        Assert.Equal(305, 0.90 * moment / (12 * Inch) / (Ksi * 1000 * Inch * Inch) * 1000, tolerance: 0.6);
    }

    /// <summary>Manual, available critical stress, F_y 50 ksi: K·L/r 100: 21.7 ksi (LRFD) and 14.4 (ASD).</summary>
    [Fact]
    public void AvailableStress_Slenderness100_AsTabulated()
    {
        var stress = Columns.SteelUs(50 * Ksi, 29000 * Ksi, 100) / Ksi;

        Assert.Equal(21.7, 0.90 * stress, tolerance: 0.05);
        Assert.Equal(14.4, stress / 1.67, tolerance: 0.05);
    }
}

/// <summary>EN 1993-1-1, Figure 6.4 and its table of χ at λ = 1.0. Figures from memory, recomputed.</summary>
public class En1993BucklingCurveTests
{
    [Theory]
    [InlineData(0.13, 0.725)]
    [InlineData(0.21, 0.666)]
    [InlineData(0.34, 0.597)]
    [InlineData(0.49, 0.540)]
    [InlineData(0.76, 0.467)]
    public void Curves_RelativeSlenderness1_Chi(double imperfection, double chi) =>
        Assert.Equal(chi, Columns.Reduction(1, imperfection, 0.2), tolerance: 0.0005);

    [Fact]
    public void Curves_Plateau_NothingLost() => Assert.Equal(1, Columns.Reduction(0.2, 0.49, 0.2));
}

/// <summary>Aluminum Design Manual 2020, Part VII, Example 4 (read in a stored copy): the tube of 6063-T6 of 3 x 3 x 0.095 in.</summary>
public class AluminumStabilityTests
{
    private const double Inch = 0.0254;
    private const double Ksi = Columns.Ksi;

    /// <summary>λ 10.8 below C_c 78, S 1.04 in³, M_np 30.0 in-k (Z 1.20 in³): 28.2 in-k nominal, 17.1 allowable.</summary>
    [Fact]
    public void Example4_LateralTorsional_NominalMoment()
    {
        var inchKip = Ksi * Inch * Inch * Inch;

        var moment = LateralBuckling.AluminiumUs(25 * Ksi, 10100 * Ksi, 1.04 * Inch * Inch * Inch, 30.0 * inchKip, 10.8);

        Assert.Equal(78, Columns.BucklingConstants(25 * Ksi, 10100 * Ksi).Limit, tolerance: 0.5);
        Assert.Equal(28.2, moment / inchKip, tolerance: 0.05);
        Assert.Equal(17.1, moment / 1.65 / inchKip, tolerance: 0.05);
    }

    /// <summary>
    /// For a tube λ = 2.3·√(L_b·S_c/√(I_y·J)): from M_cr with G = E/2.66 the factor is 2.26, which the manual rounds to 2.3. Square 3 in tube,
    /// L_b 40 in, I 1.55, J 2.33 in⁴.
    /// </summary>
    [Fact]
    public void Example4_Slenderness_FromElasticMoment()
    {
        var (modulus, section, inertia, torsion) = (10100 * Ksi, 1.04 * Math.Pow(Inch, 3), 1.55 * Math.Pow(Inch, 4), 2.33 * Math.Pow(Inch, 4));
        var critical = LateralBuckling.ElasticMoment(modulus, modulus / 2.66, inertia, torsion, 1e-9, 40 * Inch);

        Assert.Equal(10.8, Math.PI * Math.Sqrt(modulus * section / critical), tolerance: 0.05 + 10.8 * (1 - 2.26 / 2.3));
    }
}

/// <summary>Section properties across the water, against hand figures of plain shapes.</summary>
public class CrossAxisTests
{
    /// <summary>100 x 60 x 5: (100·60³ − 90·50³)/12 = 862 500 mm⁴ across.</summary>
    [Fact]
    public void Tube_AcrossTheWater_ByHand() => Hand.Equal(
        862_500e-12, CrossAxis.Inertia(new RectangularTube { Depth = 0.1, Height = 0.06, Wall = 0.005 }));

    /// <summary>A hollow section of two webs is a tube.</summary>
    [Fact]
    public void HollowOfTwoWebs_IsATube() => Hand.Equal(
        CrossAxis.Inertia(new RectangularTube { Depth = 0.1, Height = 0.06, Wall = 0.005 }),
        CrossAxis.Inertia(new HollowRectangle { Depth = 0.1, Height = 0.06, Face = 0.005, Web = 0.005, Webs = 2 }));

    /// <summary>
    /// I 200 x 100, flange 10, web 6 mm: I_z = (2·10·100³ + 180·6³)/12 = 1 669 906.67 mm⁴, J = (2·100·10³ + 180·6³)/3 = 79 626.67 mm⁴,
    /// I_w = I_z·190²/4.
    /// </summary>
    [Fact]
    public void ISection_TorsionAndWarping_ByHand()
    {
        var section = new ISection { Depth = 0.2, Height = 0.1, Flange = 0.01, Web = 0.006 };

        Hand.Equal((20e6 + 180 * 216) / 12 * 1e-12, CrossAxis.Inertia(section));
        Hand.Equal((200e3 + 180 * 216) / 3 * 1e-12, CrossAxis.Torsion(section));
        Hand.Equal((20e6 + 180 * 216) / 12 * 190.0 * 190 / 4 * 1e-18, CrossAxis.Warping(section));
    }
}
