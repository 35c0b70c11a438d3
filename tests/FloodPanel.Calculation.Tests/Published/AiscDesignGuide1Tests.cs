using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// AISC, Design Guide 1: Base Connection Design for Steel Structures, 3rd ed., chapter 4, worked examples. Read in a stored copy, a
/// machine transcription whose numbers recompute; where the guide rounds Y and carries it on, that is said.
/// </summary>
public class AiscDesignGuide1Tests
{
    private const double Inch = 0.0254;
    private const double Pound = 0.45359237 * 9.80665;
    private const double Kip = 1000 * Pound;
    private const double KipInch = Kip * Inch;
    private const double Ksi = Kip / (Inch * Inch);
    private const double ResistanceFactor = 0.90;
    private const double SafetyFactor = 1.67;

    private static readonly BasePlateInput MomentPlate = new()
    {
        Length = 28 * Inch,
        Width = 12 * Inch,
        RodDistance = 12 * Inch,
        ConcreteStrength = 4 * Ksi,
        AreaRatio = 4,
    };

    private static readonly ISection MomentColumn = new() { Depth = 18.2 * Inch, Height = 11.0 * Inch, Flange = 0.680 * Inch, Web = 0.4 * Inch };

    private static readonly BasePlateInput SquarePlate = new()
    {
        Length = 19 * Inch,
        Width = 19 * Inch,
        RodDistance = 8 * Inch,
        ConcreteStrength = 4 * Ksi,
        AreaRatio = 1,
    };

    private static readonly ISection SquareColumn = new() { Depth = 12.7 * Inch, Height = 12.2 * Inch, Flange = 0.9 * Inch, Web = 0.5 * Inch };

    /// <summary>Example 4.7-3: four rods at uplift 70 kips; plate beside a web, a 1.83 in, b_eff 3.66 in, F_y 50: t 0.882 in; moment 32.0 kip-in.</summary>
    [Fact]
    public void Example3_UpliftPlate_Thickness()
    {
        var (force, lever) = (17.5 * Kip, 1.83 * Inch);
        var width = PlateBending.PulledWidth(20 * Inch, lever, 1);

        var thickness = PlateBending.PlasticThickness(force * lever / width, ResistanceFactor * 50 * Ksi);

        Assert.Equal(3.66, width / Inch, tolerance: 0.005);
        Assert.Equal(32.0, force * lever / KipInch, tolerance: 0.05);
        Assert.Equal(0.882, thickness / Inch, tolerance: 0.0005);
    }

    /// <summary>Example 4.7-3: 3/16 in transverse fillet, 70 ksi: 8.35 nominal and 6.26 kip/in design.</summary>
    [Fact]
    public void Example3_Weld_Strength()
    {
        var nominal = FilletWelds.NominalSteelUs(0.1875 * Inch, 70 * Ksi, 1.5);

        Assert.Equal(8.35, nominal / (Kip / Inch), tolerance: 0.005);
        Assert.Equal(6.26, FilletWelds.SteelUs(nominal, DesignBasisKind.UsStrength) / (Kip / Inch), tolerance: 0.005);
    }

    /// <summary>Example 4.7-5: 15 x 15 in plate, rods at 4.25 in, 75.0 kip-in: f_p 4.42 ksi, q 66.3 k/in, Y 0.0967 in, T 6.41 kips.</summary>
    [Fact]
    public void Example5_PureMoment_BlockAndTension()
    {
        var plate = new BasePlateInput
        {
            Length = 15 * Inch,
            Width = 15 * Inch,
            RodDistance = 4.25 * Inch,
            ConcreteStrength = 4 * Ksi,
            AreaRatio = 4,
        };

        var response = BasePlates.Respond(plate, 0, 75.0 * KipInch, 25 * Kip, DesignBases.UsStrength);

        Assert.Equal(4.42, response.BearingStrength / Ksi, tolerance: 0.005);
        Assert.Equal(66.3, response.BearingStrength * plate.Width / (Kip / Inch), tolerance: 0.05);
        Assert.Equal(0.0967, response.BlockLength / Inch, tolerance: 0.00005);
        Assert.Equal(6.41, response.Tension / Kip, tolerance: 0.005);
    }

    /// <summary>
    /// Example 4.7-5: 5/16 in transverse fillet of the lug, 10.4 kip/in design. Its demand, 7.91, comes from a lug under the plate,
    /// which this calculation does not have.
    /// </summary>
    [Fact]
    public void Example5_Weld_Strength() => Assert.Equal(
        10.4, FilletWelds.SteelUs(FilletWelds.NominalSteelUs(0.3125 * Inch, 70 * Ksi, 1.5), DesignBasisKind.UsStrength) / (Kip / Inch), tolerance: 0.05);

    /// <summary>
    /// Example 4.7-9, strength design: f_p 4.42 ksi, Y 0.886 in, T 47.0 kips; allowable stress: 2.94, 0.905, 31.9. The guide carries the rounded f_p on;
    /// unrounded Y is 0.8852 and 0.9042, T 46.95 and 31.94.
    /// </summary>
    [Theory]
    [InlineData(true, 1200, 4.42, 0.886, 47.0)]
    [InlineData(false, 816, 2.94, 0.905, 31.9)]
    public void Example9_PureMoment_BlockAndTension(bool strengthDesign, double momentKipInch, double pressure, double block, double tension)
    {
        var basis = strengthDesign ? DesignBases.UsStrength : DesignBases.AllowableStress;

        var response = BasePlates.Respond(MomentPlate, 0, momentKipInch * KipInch, 0, basis);

        Assert.Equal(pressure, response.BearingStrength / Ksi, tolerance: 0.005);
        Assert.Equal(block, response.BlockLength / Inch, tolerance: 0.001);
        Assert.Equal(tension, response.Tension / Kip, tolerance: 0.06);
    }

    /// <summary>Example 4.7-9: x 3.24 in, needed 1.06 and 1.07 in on the side of the rods, m 5.36, needed 1.31 and 1.32 in on the side that presses.</summary>
    [Theory]
    [InlineData(true, 1200, 1.06, 1.31)]
    [InlineData(false, 816, 1.07, 1.32)]
    public void Example9_Thickness_BothSides(bool strengthDesign, double momentKipInch, double pulled, double pressed)
    {
        var basis = strengthDesign ? DesignBases.UsStrength : DesignBases.AllowableStress;
        var stress = 50 * Ksi * (strengthDesign ? ResistanceFactor : 1 / SafetyFactor);
        var response = BasePlates.Respond(MomentPlate, 0, momentKipInch * KipInch, 0, basis);
        var lever = PlateBending.PulledLever(MomentPlate.RodDistance, MomentColumn.Depth, MomentColumn.Flange);
        var overhang = PlateBending.Overhang(MomentPlate, MomentColumn);

        var onRods = PlateBending.PlasticThickness(
            response.Tension * lever / PlateBending.PulledWidth(MomentPlate.Width, lever, 2), stress);
        var onConcrete = PlateBending.PlasticThickness(
            PlateBending.PressedMoment(response.Bearing, response.BlockLength, overhang), stress);

        Assert.Equal(3.24, lever / Inch, tolerance: 0.005);
        Assert.Equal(5.36, overhang / Inch, tolerance: 0.0051);
        Assert.Equal(pulled, onRods / Inch, tolerance: 0.005);
        Assert.Equal(pressed, onConcrete / Inch, tolerance: 0.005);
    }

    /// <summary>
    /// Example 4.7-9: 1/4 in fillet on the outside of an 11 in flange, 65.9 kips demand against 92.3. The printed figure corresponds
    /// to 8.39 kip/in; the formula gives 8.35, so 91.9 kips.
    /// </summary>
    [Fact]
    public void Example9_FlangeWeld_DemandAndStrength()
    {
        var perLength = FilletWelds.SteelUs(FilletWelds.NominalSteelUs(0.25 * Inch, 70 * Ksi, 1.5), DesignBasisKind.UsStrength);
        var strength = perLength * MomentColumn.Height;

        Assert.Equal(65.9, 1200 * KipInch / MomentColumn.Depth / Kip, tolerance: 0.05);
        Assert.Equal(92.3, strength / Kip, tolerance: 0.05 + 0.005 * 92.3);
    }

    /// <summary>Example 4.7-10: small eccentricity, 2.50 in. Y 14.0 in; f_p 1.41 and 0.977 ksi; needed 1.16 and 1.18 in.</summary>
    [Theory]
    [InlineData(true, 376, 940, 2.21, 1.41, 0.005, 1.16)]
    [InlineData(false, 260, 650, 1.47, 0.977, 0.0005, 1.18)]
    public void Example10_SmallEccentricity_NoTension(
        bool strengthDesign, double kips, double kipInches, double strength, double pressure, double half, double thickness)
    {
        var basis = strengthDesign ? DesignBases.UsStrength : DesignBases.AllowableStress;
        var stress = 50 * Ksi * (strengthDesign ? ResistanceFactor : 1 / SafetyFactor);

        var response = BasePlates.Respond(SquarePlate, kips * Kip, kipInches * KipInch, 0, basis);
        var needed = PlateBending.PlasticThickness(
            PlateBending.PressedMoment(response.Bearing, response.BlockLength, PlateBending.Overhang(SquarePlate, SquareColumn)), stress);

        Assert.Equal(BearingKind.NoTension, response.Kind);
        Assert.Equal(strength, response.BearingStrength / Ksi, tolerance: 0.005);
        Assert.Equal(14.0, response.BlockLength / Inch, tolerance: 0.05);
        Assert.Equal(pressure, response.Bearing / Ksi, tolerance: half);
        Assert.Equal(0, response.Tension);
        Assert.Equal(thickness, needed / Inch, tolerance: 0.005);
    }

    /// <summary>
    /// Example 4.7-12: uplift 100 kips with 1000 kip-in: printed Y 0.300 in and T 113 kips. The guide rounds a root of 17.226 to 17.2, which moves
    /// Y by 0.026 in; unrounded it is 0.274 in and 111.5 kips.
    /// </summary>
    [Fact]
    public void Example12_UpliftWithMoment_BlockAndTension()
    {
        var response = BasePlates.Respond(SquarePlate, -100 * Kip, 1000 * KipInch, 0, DesignBases.UsStrength);

        Assert.Equal(42.0, response.BearingStrength * SquarePlate.Width / (Kip / Inch), tolerance: 0.05);
        Assert.Equal(0.300, response.BlockLength / Inch, tolerance: 0.0005 + 0.026);
        Assert.Equal(113, response.Tension / Kip, tolerance: 0.5 + 0.026 * 42.0);
    }

    /// <summary>Example 4.7-13: uplift 100 kips with 100 kip-in: all four rods pull, 28.1 and 21.9 kips each.</summary>
    [Fact]
    public void Example13_UpliftSmallMoment_AllRodsPull()
    {
        var response = BasePlates.Respond(SquarePlate, -100 * Kip, 100 * KipInch, 0, DesignBases.UsStrength);

        Assert.Equal(BearingKind.AllTension, response.Kind);
        Assert.Equal(28.1, response.Tension / 2 / Kip, tolerance: 0.05);
        Assert.Equal(21.9, response.OtherTension / 2 / Kip, tolerance: 0.05);
    }

    /// <summary>
    /// 2nd ed. (2006), Example B.5.2, p. 60, partly read: P 90 kips, M 720 kip-in, 14 x 14 in, A' 5.5, N' 12.5 in, f_p 3.06 ksi: f' 268 kips,
    /// A 5.27 in (printed from rounded figures; unrounded 5.28). T 23.1 kips is not printed there: it follows from equilibrium.
    /// </summary>
    [Fact]
    public void SecondEditionB52_Triangle_LengthAndTension()
    {
        var (pressure, width) = (3.06 * Ksi, 14 * Inch);

        var length = BasePlates.TriangularLength(pressure, width, 12.5 * Inch, 5.5 * Inch, 90 * Kip, 720 * KipInch)!.Value;

        Assert.Equal(268, pressure * width * 12.5 * Inch / 2 / Kip, tolerance: 0.5);
        Assert.Equal(5.27, length / Inch, tolerance: 0.005 + 0.01);
        Assert.Equal(23.1, (pressure * length * width / 2 - 90 * Kip) / Kip, tolerance: 0.05);
    }
}
