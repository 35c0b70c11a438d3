using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Verification;

/// <summary>Base plates, welds, stability of posts, posts with rakers.</summary>
internal static class PostBaseRows
{
    private const string Guide = "AISC Design Guide 1, 3rd ed., Example 4.7-";
    private const string SecondEdition = "AISC Design Guide 1, 2nd ed. (2006), Example B.5.2";
    private const string Manual = "AISC 360 (Design Examples and Manual)";
    private const string European = "Gardner and Nethercot, Designers' Guide to EN 1993-1-1, Example 6.5";
    private const string Aluminum = "Aluminum Design Manual 2020, Part VII, Example 4";
    private const string Propped = "Post under 1.2 m of fresh water, tributary 2.0 m, prop at 0.9 m that does not give";
    private const double Inch = Printed.Foot / 12;

    private static readonly BasePlateInput MomentPlate = Plate(28, 12, 12, 4);
    private static readonly BasePlateInput SquarePlate = Plate(19, 19, 8, 1);

    private static double Kip => 1e3 * Units.ToSI(1, Dimension.Force, UnitSystem.USCustomary);

    public static IEnumerable<VerificationRow> Rows() => [.. Plates(), .. Thicknesses(), .. Welds(), .. Stability(), .. Rakers()];

    private static IEnumerable<VerificationRow> Plates()
    {
        var strength = BasePlates.Respond(MomentPlate, 0, 1200 * Kip * Inch, 0, DesignBases.UsStrength);
        var allowable = BasePlates.Respond(MomentPlate, 0, 816 * Kip * Inch, 0, DesignBases.AllowableStress);
        var eccentric = BasePlates.Respond(Plate(15, 15, 4.25, 4), 0, 75 * Kip * Inch, 0, DesignBases.UsStrength);
        var small = BasePlates.Respond(SquarePlate, 376 * Kip, 940 * Kip * Inch, 0, DesignBases.UsStrength);
        var uplift = BasePlates.Respond(SquarePlate, -100 * Kip, 1000 * Kip * Inch, 0, DesignBases.UsStrength);
        var all = BasePlates.Respond(SquarePlate, -100 * Kip, 100 * Kip * Inch, 0, DesignBases.UsStrength);
        const string rounded = "The guide carries the rounded bearing pressure on.";
        var triangle = BasePlates.TriangularLength(Units.ToSI(3.06, Dimension.Stress, UnitSystem.USCustomary), 14 * Inch, 12.5 * Inch, 5.5 * Inch, 90 * Kip, 720 * Kip * Inch)!.Value;
        return
        [
            new($"{Guide}5", "moment 75 kip-in: block", "in", "0.0967", eccentric.BlockLength / Inch, Evidence.Read),
            new($"{Guide}5", "tension", "kip", "6.41", eccentric.Tension / Kip, Evidence.Read),
            new($"{Guide}9", "moment 1200 kip-in: bearing pressure", "ksi", "4.42", Printed.US(strength.Bearing, Dimension.Stress), Evidence.Read),
            new($"{Guide}9", "block, strength design", "in", "0.886", strength.BlockLength / Inch, Evidence.Read, 0.001, rounded),
            new($"{Guide}9", "tension, strength design", "kip", "47.0", strength.Tension / Kip, Evidence.Read, 0.001, rounded),
            new($"{Guide}9", "block, allowable stress", "in", "0.905", allowable.BlockLength / Inch, Evidence.Read, 0.001, rounded),
            new($"{Guide}9", "tension, allowable stress", "kip", "31.9", allowable.Tension / Kip, Evidence.Read),
            new($"{Guide}10", "small eccentricity: block", "in", "14.0", small.BlockLength / Inch, Evidence.Read),
            new($"{Guide}10", "bearing pressure", "ksi", "1.41", Printed.US(small.Bearing, Dimension.Stress), Evidence.Read),
            new($"{Guide}12", "uplift with moment: tension", "kip", "113", uplift.Tension / Kip, Evidence.Read, 0.012, "The guide rounds a root of 17.226 to 17.2, which moves the block by a tenth."),
            new($"{Guide}13", "uplift with small moment: rod that pulls more", "kip", "28.1", all.Tension / 2 / Kip, Evidence.Read),
            new($"{Guide}13", "rod that pulls less", "kip", "21.9", all.OtherTension / 2 / Kip, Evidence.Read),
            new(SecondEdition, "triangular block", "in", "5.27", triangle / Inch, Evidence.Read, 0.0025, "The page works with rounded figures."),
        ];
    }

    private static IEnumerable<VerificationRow> Thicknesses()
    {
        var stress = 0.90 * Units.ToSI(50, Dimension.Stress, UnitSystem.USCustomary);
        var response = BasePlates.Respond(MomentPlate, 0, 1200 * Kip * Inch, 0, DesignBases.UsStrength);
        var column = new ISection { Depth = 18.2 * Inch, Height = 11 * Inch, Flange = 0.68 * Inch, Web = 0.4 * Inch };
        var lever = PlateBending.PulledLever(MomentPlate.RodDistance, column.Depth, column.Flange);
        var pressed = PlateBending.PressedMoment(response.Bearing, response.BlockLength, PlateBending.Overhang(MomentPlate, column));
        return
        [
            new($"{Guide}9", "plate on the side of the rods", "in", "1.06", PlateBending.PlasticThickness(response.Tension * lever / MomentPlate.Width, stress) / Inch, Evidence.Read),
            new($"{Guide}9", "plate on the side that presses", "in", "1.31", PlateBending.PlasticThickness(pressed, stress) / Inch, Evidence.Read),
            new($"{Guide}3", "plate beside a web", "in", "0.882", PlateBending.PlasticThickness(17.5 * Kip * 1.83 * Inch / (3.66 * Inch), stress) / Inch, Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Welds()
    {
        var electrode = Units.ToSI(70, Dimension.Stress, UnitSystem.USCustomary);
        double Strength(double inches) =>
            FilletWelds.SteelUs(FilletWelds.NominalSteelUs(inches * Inch, electrode, 1.5), DesignBasisKind.UsStrength) / (Kip / Inch);
        return
        [
            new($"{Guide}3", "fillet weld of 3/16 in across its length", "kip/in", "6.26", Strength(0.1875), Evidence.Read),
            new($"{Guide}5", "fillet weld of 5/16 in across its length", "kip/in", "10.4", Strength(0.3125), Evidence.Read),
            new($"{Guide}9", "flange weld of 1/4 in on 11 in", "kip", "92.3", 11 * Strength(0.25), Evidence.Read, 0.005, "The formula gives 8.35 kip/in; the printed figure is that of 8.39."),
        ];
    }

    private static IEnumerable<VerificationRow> Stability()
    {
        var (yield, modulus) = (Units.ToSI(50, Dimension.Stress, UnitSystem.USCustomary), Units.ToSI(29000, Dimension.Stress, UnitSystem.USCustomary));
        var (soft, light) = (Units.ToSI(25, Dimension.Stress, UnitSystem.USCustomary), Units.ToSI(10100, Dimension.Stress, UnitSystem.USCustomary));
        var cubic = Inch * Inch * Inch;
        var beam = LateralBuckling.SteelUs(
            yield, modulus, 88.9 * cubic, 101 * cubic, 1.65 * Inch, 1.98 * Inch, 1.24 * cubic * Inch, 17.4 * Inch, 140 * Inch, 1.01);
        var tube = LateralBuckling.AluminiumUs(soft, light, 1.04 * cubic, 30 * Kip * Inch, 10.8);
        const double web = 0.3808 * 0.0095;
        var sheared = PostInteraction.MomentWithShear(
            1501e-6, web * web / (4 * 0.0095), PostInteraction.WebReduction(525e3, 689.2e3), 275e6, 1501e-6 * 275e6);
        return
        [
            new(European, "moment beside 525 kN of shear", "kN·m", "386.8", Printed.Kilo(sheared), Evidence.Memory),
            new(Manual, "Example F.1-2B, W18x50: L_p", "ft", "5.83", beam.PlasticLength / Printed.Foot, Evidence.Memory),
            new(Manual, "L_r", "ft", "16.9", beam.ElasticLength / Printed.Foot, Evidence.Memory),
            new(Manual, "critical stress at slenderness 100, strength design", "ksi", "21.7", Printed.US(0.90 * Columns.SteelUs(yield, modulus, 100), Dimension.Stress), Evidence.Memory),
            new("EN 1993-1-1, 6.3.1.2", "χ of curve c at relative slenderness 1.0", "", "0.540", Columns.Reduction(1, 0.49, 0.2), Evidence.Memory),
            new(Aluminum, "lateral-torsional moment of a tube", "in-k", "28.2", tube / (Kip * Inch), Evidence.Read),
        ];
    }

    private static IEnumerable<VerificationRow> Rakers()
    {
        var raker = RakerModel.Of(
            new()
            {
                Material = new Material { Density = 1, ElasticModulus = 1e12 },
                Profile = new GivenProperties { Height = 1, Depth = 1, Area = 1e6, Inertia = 1, Modulus = 1, PlasticModulus = 1, ShearArea = 1 },
                HeadHeight = 0.9,
                FootDistance = 0.9,
            },
            0, DesignBases.UsStrength, Library.Empty);
        var water = Hydrostatic.Side(Hydrostatic.UnitWeight(9810 / Physics.Gravity), 1.2, 1.2, 1);
        var load = new SlopeLoad(PressureDiagram.Of(water), default, 2, 1, IsDesign: true);
        var (held, turning) = (ProppedPost.Solve(load, 1.2, 1e6, raker, isPinned: false), ProppedPost.Solve(load, 1.2, 1e6, raker, isPinned: true));
        return
        [
            new(Propped, "prop force, fixed base", "kN", "4.61", Printed.Kilo(held.HeadForce), Evidence.Derived),
            new(Propped, "base moment, fixed base", "kN·m", "1.51", Printed.Kilo(held.Moment(0)), Evidence.Derived),
            new(Propped, "base shear, fixed base", "kN", "9.52", Printed.Kilo(held.Shear(0)), Evidence.Derived),
            new(Propped, "raker at 45°, fixed base", "kN", "6.51", Printed.Kilo(held.HeadForce / raker.CosNormal), Evidence.Derived),
            new(Propped, "prop force, base that turns", "kN", "6.28", Printed.Kilo(turning.HeadForce), Evidence.Derived),
            new(Propped, "span moment, base that turns", "kN·m", "1.46", Printed.Kilo(turning.PeakMoment().Moment), Evidence.Derived),
        ];
    }

    private static BasePlateInput Plate(double lengthInches, double widthInches, double rodInches, double areaRatio) => new()
    {
        Length = lengthInches * Inch,
        Width = widthInches * Inch,
        RodDistance = rodInches * Inch,
        ConcreteStrength = Units.ToSI(4, Dimension.Stress, UnitSystem.USCustomary),
        AreaRatio = areaRatio,
    };
}
