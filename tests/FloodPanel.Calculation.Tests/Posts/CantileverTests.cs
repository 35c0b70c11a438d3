using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Posts;

public class CantileverTests
{
    private const int Elements = 200;

    /// <summary>Where the water breaks within an element, its three Gauss points miss some: (1/200)² and less.</summary>
    private const double ElementTolerance = 1e-4;

    /// <summary>Water to part height, to the top, over it, and with water behind, against 200 beam elements.</summary>
    [Theory]
    [InlineData(0.85, 0, 1)]
    [InlineData(1.2, 0, 1)]
    [InlineData(1.7, 0, 1)]
    [InlineData(1.0, 0.6, 1)]
    [InlineData(0.7, 0.2, 0.8)]
    public void Respond_Water_AgreesWithBeamElements(double depth, double behind, double cosRake)
    {
        const double unitWeight = 10_000, length = 1.2, tributary = 2.1;
        var post = Stretch.Beam(210e9, 4e-6);
        var diagram = PressureDiagram.Of(
            Hydrostatic.Side(unitWeight, depth, length * cosRake, 1),
            Hydrostatic.Side(-unitWeight, behind, length * cosRake, 1));

        var response = Cantilever.Respond(diagram, post, tributary, length, cosRake);
        var (tip, shear, moment) = BeamElements.Cantilever(
            s => tributary * unitWeight * (Math.Max(0, depth - s * cosRake) - Math.Max(0, behind - s * cosRake)),
            length, post.Stiffness, Elements);

        Assert.Equal(tip, response.TipDeflection, tolerance: ElementTolerance * tip);
        Assert.Equal(shear, response.BaseShear, tolerance: ElementTolerance * shear);
        Assert.Equal(moment, response.BaseMoment, tolerance: ElementTolerance * moment);
    }

    /// <summary>Base shear and moment with factors, and the tip by the unit-load theorem, each by Gauss's rule.</summary>
    [Property(MaxTest = 100, Arbitrary = [typeof(Scenarios)])]
    public void Respond_AnyOpening_AgreesWithQuadrature(Scenario generated)
    {
        var scenario = generated.With((Opening o) => o with { Barrier = o.Barrier with { Posts = o.Barrier.Posts is { } p ? p with { Raker = null } : null } });
        var model = scenario.Model;
        Assert.All(scenario.Result.Cases.Where(c => c.Name is not ("debris" or "line")), @case =>
        {
            var water = new HandWater(scenario, @case.Name);
            Assert.All(@case.Posts, post => Assert.Multiple(() => Compare(post, water, model)));
        });
    }

    private static void Compare(PostResult post, HandWater water, OpeningModel model)
    {
        var bays = model.Bays;
        var width = bays[post.Index - 1] / 2 + bays[post.Index] / 2 + model.PostWidth;
        var (cos, height, length) = (model.CosRake, model.Height, model.FaceLength);
        double Bending(double s) => width / (cos * cos) * water.Integral(z => water.Pressure(z) * (z - s * cos), s * cos, height);

        var shear = width / cos * water.Integral(water.Design, 0, height);
        var moment = width / (cos * cos) * water.Integral(z => water.Design(z) * z, 0, height);
        var tip = water.Integral(z => Bending(z / cos) * (length - z / cos), 0, height) / cos / model.Post!.Stiffness;

        var terms = width / cos * water.Integral(water.Terms, 0, height);
        Assert.Equal(shear, post.BaseShear, tolerance: 1e-11 * terms);
        Assert.Equal(moment, post.BaseMoment, tolerance: 1e-11 * terms * length);
        Assert.Equal(tip, post.TipDeflection, tolerance: 1e-11 * terms * Math.Pow(length, 3) / model.Post.Stiffness);
    }
}
