using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Posts;

/// <summary>A post with a raker against an own plane frame of 200 elements, and against statics.</summary>
public class ProppedPostTests
{
    private const int Elements = 200;

    /// <summary>Gauss points miss a little where the water breaks within an element; the frame's post is not wholly rigid along itself.</summary>
    private const double ElementTolerance = 5e-4;

    /// <summary>Upright and raked, stiff and soft rakers, water below and above the head, fixed base and base that turns.</summary>
    [Theory]
    [InlineData(1.2, 0, 150, 0.9, 3e-4, false)]
    [InlineData(1.2, 0, 150, 0.9, 3e-4, true)]
    [InlineData(0.7, 0, 180, 0.6, 3e-4, false)]
    [InlineData(1.5, 0, 100, 1.4, 1e-6, false)]
    [InlineData(1.5, 0, 200, 1.4, 1e-5, true)]
    [InlineData(1.0, 0.4, 140, 1.2, 5e-5, false)]
    [InlineData(1.0, 0.4, 140, 1.2, 5e-5, true)]
    public void Solve_Water_AgreesWithFrameOfElements(double depth, double rake, int headNode, double foot, double area, bool isPinned)
    {
        const double unitWeight = 10_000, length = 1.2, tributary = 2.0, modulus = 210e9;
        var (cos, stiffness) = (Math.Cos(rake), modulus * 4e-6);
        var raker = Raker(headNode * length / Elements * cos, foot, area, rake, modulus);
        var diagram = PressureDiagram.Of(Hydrostatic.Side(unitWeight, depth, length * cos, 1));

        var propped = ProppedPost.Solve(new(diagram, default, tributary, cos, IsDesign: true), length, stiffness, raker, isPinned);
        var frame = FrameElements.Solve(
            s => tributary * unitWeight * Math.Max(0, depth - s * cos), length, stiffness, rake, headNode, foot, modulus * area, isPinned, Elements);

        var moment = tributary * unitWeight * depth * depth * depth / 6;
        Assert.Multiple(
            () => Close(frame.Raker, propped.HeadForce / raker.CosNormal),
            () => Close(frame.Shear, propped.Shear(0)),
            () => Assert.Equal(frame.Moment, propped.Moment(0), tolerance: ElementTolerance * moment),
            () => Close(frame.Uplift, propped.HeadForce * raker.LiftRatio),
            () => Close(frame.Deflection, propped.PeakDeflection()));
    }

    /// <summary>Without a raker the frame is the cantilever.</summary>
    [Fact]
    public void Cantilever_Water_AgreesWithFrameOfElements()
    {
        const double unitWeight = 10_000, length = 1.2, tributary = 2.0;
        var post = Stretch.Beam(210e9, 4e-6);

        var response = Cantilever.Respond(PressureDiagram.Of(Hydrostatic.Side(unitWeight, 1.0, length, 1)), post, tributary, length, 1);
        var frame = FrameElements.Solve(
            s => tributary * unitWeight * Math.Max(0, 1.0 - s), length, post.Stiffness, 0, 100, 0.9, axial: 0, isPinned: false, Elements);

        Close(frame.Shear, response.BaseShear);
        Close(frame.Moment, response.BaseMoment);
        Close(frame.Deflection, response.TipDeflection);
    }

    /// <summary>The peak is the greatest of 2000 points along the post.</summary>
    [Property(MaxTest = 100)]
    public Property Peaks_AnyPost_AreTheGreatestAlongIt() => Prop.ForAll(Posts(), propped =>
    {
        var points = Enumerable.Range(0, 2001).Select(i => 1.2 * i / 2000).ToArray();

        var moment = points.Max(s => Math.Abs(propped.Moment(s)));
        var shear = points.Max(s => Math.Abs(propped.Shear(s)));
        var deflection = points.Max(s => Math.Abs(propped.Deflection(s)));

        // The kink of the moment and the step of the shear at the head stand between two points.
        Assert.InRange(propped.PeakMoment().Moment, moment * (1 - 1e-9), moment + propped.PeakShear() * 1.2 / 2000);
        Assert.InRange(propped.PeakShear(), shear * (1 - 1e-9), shear + 2 * 10_000 * 1.8 * 1.2 / 2000);
        Assert.Equal(deflection, propped.PeakDeflection(), tolerance: 1e-3 * deflection);
    });

    /// <summary>Play takes force from the raker and gives moment to the base; with much of it the raker is not reached.</summary>
    [Fact]
    public void Solve_MorePlay_LessForceInTheRaker()
    {
        var load = new SlopeLoad(PressureDiagram.Of(Hydrostatic.Side(10_000, 1.2, 1.2, 1)), default, 2, 1, IsDesign: true);
        ProppedPost[] solved = [.. new[] { 0, 0.0005, 0.001, 0.05 }.Select(play =>
            ProppedPost.Solve(load, 1.2, 840e3, Raker(0.9, 0.9, 3e-4, 0, 210e9) with { Input = new() { Play = play } }, isPinned: false))];

        Assert.True(solved[0].HeadForce > solved[1].HeadForce && solved[1].HeadForce > solved[2].HeadForce);
        Assert.Equal(0, solved[3].HeadForce);
        Assert.Equal(2 * 10_000 * Math.Pow(1.2, 3) / 6, solved[3].Moment(0), tolerance: 1e-6);
    }

    private static Arbitrary<ProppedPost> Posts() => (
        from depth in Numbers.From(0.2, 1.8)
        from head in Numbers.From(0.3, 1.2)
        from foot in Numbers.From(0.3, 2)
        from area in Numbers.From(1e-5, 1e-3, 1e-5)
        from isPinned in Gen.Elements(false, true)
        select ProppedPost.Solve(
            new(PressureDiagram.Of(Hydrostatic.Side(10_000, depth, 1.2, 1)), default, 2, 1, IsDesign: true),
            1.2, 840e3, Raker(head, foot, area, 0, 210e9), isPinned)).ToArbitrary();

    /// <summary>The raker as the calculation sees it, put together from the geometry in the doc of its record.</summary>
    private static RakerModel Raker(double head, double foot, double area, double rake, double modulus)
    {
        var opening = new RakerInput
        {
            Material = new Material { Density = 7850, ElasticModulus = modulus },
            Profile = new GivenProperties { Height = 0.05, Depth = 0.05, Area = area, Inertia = 1e-8, Modulus = 1e-6, PlasticModulus = 1e-6, ShearArea = area },
            HeadHeight = head,
            FootDistance = foot,
        };
        return RakerModel.Of(opening, rake, DesignBases.UsStrength, Library.Empty);
    }

    private static void Close(double expected, double actual) =>
        Assert.Equal(expected, actual, tolerance: ElementTolerance * Math.Abs(expected) + 1e-9);
}
