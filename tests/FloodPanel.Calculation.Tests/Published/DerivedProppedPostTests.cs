using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Propped posts by the force method, with a prop that does not give. The closed forms were derived and checked numerically outside this code; the case
/// of a prop at the water line and the uniform load are those of Roark's Formulas, Table 8.1 and of the AISC Manual, Table 3-23, case 12 (numbers from memory).
/// </summary>
public class DerivedProppedPostTests
{
    private const double Rigid = 1e6;

    /// <summary>
    /// Water 1.2 m, tributary 2.0 m, γ 9810 N/m³, prop at 0.9 m: fixed base R 4.61 kN, M 1.51 kN·m, V 9.52 kN, span −0.72 kN·m at 0.515 m;
    /// base that turns R 6.28, V 7.85 kN, span 1.46 kN·m at 0.40 m.
    /// </summary>
    [Fact]
    public void PostWithStrut_FreshWater_BothBases()
    {
        var (fixedBase, turning) = (Solve(Water(1.2), 0.9, false), Solve(Water(1.2), 0.9, true));

        Assert.Multiple(
            () => Assert.Equal(4.61, fixedBase.HeadForce / 1e3, tolerance: 0.005),
            () => Assert.Equal(1.51, fixedBase.Moment(0) / 1e3, tolerance: 0.005),
            () => Assert.Equal(9.52, fixedBase.Shear(0) / 1e3, tolerance: 0.005),
            () => Assert.Equal(-0.72, fixedBase.Moment(0.515) / 1e3, tolerance: 0.005),
            () => Assert.Equal(0, fixedBase.Shear(0.515) / 1e3, tolerance: 0.01),
            () => Assert.Equal(6.28, turning.HeadForce / 1e3, tolerance: 0.005),
            () => Assert.Equal(7.85, turning.Shear(0) / 1e3, tolerance: 0.005),
            () => Assert.Equal(1.46, turning.PeakMoment().Moment / 1e3, tolerance: 0.005),
            () => Assert.Equal(0.40, turning.PeakMoment().At, tolerance: 0.005));
    }

    /// <summary>The same at 45° with a fixed base: 6.51 kN in the strut, 4.61 kN uplift.</summary>
    [Fact]
    public void StrutAt45Degrees_FixedBase_ForceAndUplift()
    {
        var force = Solve(Water(1.2), 0.9, false).HeadForce;
        var raker = Prop(0.9, 0.9);

        Assert.Equal(6.51, force / raker.CosNormal / 1e3, tolerance: 0.005);
        Assert.Equal(4.61, force * raker.LiftRatio / 1e3, tolerance: 0.005);
        Assert.Equal(4.61, force / raker.CosNormal * raker.ThrustRatio / 1e3, tolerance: 0.005);
    }

    /// <summary>Prop at the water line: R = w0·h/10, M = w0·h²/15, span 0.02981·w0·h², deflection 0.002385·w0·h⁴/EI.</summary>
    [Fact]
    public void PropAtWaterLine_ClosedForms()
    {
        var solved = Solve(Water(1.2), 1.2, false);
        const double w0 = 2 * 9810 * 1.2;

        Assert.Equal(w0 * 1.2 / 10, solved.HeadForce, tolerance: 0.01);
        Assert.Equal(w0 * 1.44 / 15, solved.Moment(0), tolerance: 0.01);
        Assert.Equal(0.02981, -solved.Moment(1.2 - 1.2 / Math.Sqrt(5)) / (w0 * 1.44), tolerance: 0.000005);
        Assert.Equal(0.002385, solved.PeakDeflection() * Stiffness / (w0 * Math.Pow(1.2, 4)), tolerance: 0.0000005);
    }

    /// <summary>
    /// A base that turns and a prop at the top make a strip on two supports under a triangle of water. Deflection 0.00652·w·L⁴/EI (read in a stored
    /// formula page, which has it at 0.5192·L); greatest moment 0.06415·w·L² at 0.5774·L from the end without load (integration).
    /// </summary>
    [Fact]
    public void PropAtTheTop_TurningBase_StripUnderATriangle()
    {
        var solved = Solve(Water(1.2), 1.2, true);
        const double w0 = 2 * 9810 * 1.2;

        Assert.Equal(0.00652, solved.PeakDeflection() * Stiffness / (w0 * Math.Pow(1.2, 4)), tolerance: 0.000005);
        Assert.Equal(0.06415, solved.PeakMoment().Moment / (w0 * 1.44), tolerance: 0.000005);
        Assert.Equal(1 - 0.5774, solved.PeakMoment().At / 1.2, tolerance: 0.0005);
    }

    /// <summary>Prop above the water: R = w0·h³·(5c − h)/(40·c³); below it: R = w0·(10h³ − 10h²c + 5hc² − c³)/(40·h·c).</summary>
    [Theory]
    [InlineData(0.8, 1.1)]
    [InlineData(0.5, 1.2)]
    [InlineData(1.2, 0.5)]
    [InlineData(1.0, 0.8)]
    public void PropAnywhere_ForceMethod(double h, double c)
    {
        var w0 = 2 * 9810 * h;
        var expected = c > h
            ? w0 * h * h * h * (5 * c - h) / (40 * c * c * c)
            : w0 * (10 * h * h * h - 10 * h * h * c + 5 * h * c * c - c * c * c) / (40 * h * c);

        Assert.Equal(expected, Solve(Water(h), c, false).HeadForce, tolerance: 1e-5 * expected);
        Assert.Equal(w0 * h * h / (6 * c), Solve(Water(h), c, true).HeadForce, tolerance: 1e-5 * expected);
    }

    /// <summary>Uniform load, prop at the top: R = 3wL/8, V = 5wL/8, M = wL²/8, span 9wL²/128, deflection wL⁴/185EI (from memory).</summary>
    [Fact]
    public void Uniform_PropAtTop_HandbookFigures()
    {
        const double w = 2 * 5000, l = 1.2;

        var solved = Solve(new(0, l, 5000, 5000, 1), l, false);

        Assert.Equal(3 * w * l / 8, solved.HeadForce, tolerance: 0.01);
        Assert.Equal(5 * w * l / 8, solved.Shear(0), tolerance: 0.01);
        Assert.Equal(w * l * l / 8, solved.Moment(0), tolerance: 0.01);
        Assert.Equal(9 * w * l * l / 128, -solved.Moment(5 * l / 8), tolerance: 0.01);
        Assert.Equal(185, w * Math.Pow(l, 4) / (solved.PeakDeflection() * Stiffness), tolerance: 0.5);
    }

    private const double Stiffness = 840e3;

    private static PressurePiece Water(double depth) => Hydrostatic.Side(9810, depth, 1.2, 1);

    private static ProppedPost Solve(PressurePiece load, double head, bool isPinned) => ProppedPost.Solve(
        new(PressureDiagram.Of(load), default, 2, 1, IsDesign: true), 1.2, Stiffness, Prop(head, head), isPinned);

    /// <summary>A prop so stiff that it does not give.</summary>
    private static RakerModel Prop(double head, double foot)
    {
        var raker = new RakerInput
        {
            Material = new Material { Density = 1, ElasticModulus = 1e12 },
            Profile = new GivenProperties { Height = 1, Depth = 1, Area = Rigid, Inertia = 1, Modulus = 1, PlasticModulus = 1, ShearArea = 1 },
            HeadHeight = head,
            FootDistance = foot,
        };
        return RakerModel.Of(raker, 0, DesignBases.UsStrength, Library.Empty);
    }
}
