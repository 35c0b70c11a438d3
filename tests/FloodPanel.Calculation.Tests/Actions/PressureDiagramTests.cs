using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Actions;

public class PressureDiagramTests
{
    [Fact]
    public void Force_NoPieces_ZeroWithoutACentre()
    {
        var diagram = new PressureDiagram();

        Assert.Equal(0, diagram.Force);
        Assert.Null(diagram.CentreOfPressure);
        Assert.Equal(0, diagram.At(0.5));
        Assert.Equal(default, diagram.Within(0, 1));
        Assert.Null(diagram.CentreWithin(0, 1));
    }

    [Fact]
    public void Of_PieceOfNoHeightOrNoPressure_LeftOut()
    {
        var diagram = PressureDiagram.Of(
            new PressurePiece(0, 0, 100, 100, 1), new PressurePiece(0, 1, 0, 0, 1), new PressurePiece(0, 1, 100, 0, 1));

        Assert.Equal(1, diagram.Pieces.Length);
    }

    [Fact]
    public void Of_MorePiecesThanRoom_KeepsThemAll()
    {
        var pieces = Enumerable.Range(0, 40).Select(i => new PressurePiece(i, i + 1, 10, 10, 1)).ToArray();

        var diagram = PressureDiagram.Of(pieces);

        Hand.Equal(400, diagram.Force);
        Hand.Equal(20, diagram.CentreOfPressure!.Value);
    }

    /// <summary>Two unlike pieces that overlap between 0.5 and 1: 1000·1 + 2000·0.5, at (1000·0.5 + 1000·0.75)/2000.</summary>
    [Fact]
    public void Force_OverlappingPieces_AddUp()
    {
        var diagram = PressureDiagram.Of(
            new PressurePiece(0, 1, 1000, 1000, 1.5), new PressurePiece(0.5, 1, 2000, 2000, 2));

        Hand.Equal(2000, diagram.Force);
        Hand.Equal(0.625, diagram.CentreOfPressure!.Value);
        Hand.Equal(1000, diagram.At(0.4));
        Hand.Equal(3000, diagram.At(0.7));
        Assert.Equal(0, diagram.At(1.1));
    }

    /// <summary>Band 0.25 to 0.75 of the same: 1000·0.5 + 2000·0.25; with factors 1.5·500 + 2·500.</summary>
    [Fact]
    public void Within_BandAcrossAStep_WithAndWithoutFactors()
    {
        var diagram = PressureDiagram.Of(
            new PressurePiece(0, 1, 1000, 1000, 1.5), new PressurePiece(0.5, 1, 2000, 2000, 2));

        var load = diagram.Within(0.25, 0.75);

        Hand.Equal(1000, load.Characteristic);
        Hand.Equal(1750, load.Design);
        Hand.Equal((500 * 0.5 + 500 * 0.625) / 1000, diagram.CentreWithin(0.25, 0.75)!.Value);
    }

    [Theory]
    [InlineData(2, 3)]
    [InlineData(-2, -1)]
    [InlineData(0.5, 0.5)]
    public void Within_BandThatMeetsNothing_NoLoad(double bottom, double top)
    {
        var diagram = Stretch.Of(0, 1, 1000, 400);

        Assert.Equal(default, diagram.Within(bottom, top));
        Assert.Null(diagram.CentreWithin(bottom, top));
    }

    /// <summary>Equal and opposite pressures have no resultant, and so no height of it.</summary>
    [Fact]
    public void CentreOfPressure_BalancedWater_None()
    {
        var diagram = PressureDiagram.Of(new PressurePiece(0, 0.7, 900, 0, 1), new PressurePiece(0, 0.7, -900, 0, 1));

        Assert.Equal(0, diagram.Force);
        Assert.Null(diagram.CentreOfPressure);
    }

    /// <summary>Resultant, moment and pressure of still water, water behind, flow, waves and wind against Gauss's rule on p(z).</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Force_AnyOpening_AgreesWithQuadrature(Scenario scenario)
    {
        Assert.All(scenario.Result.Cases.Where(c => c.Name is not "line"), @case =>
        {
            var water = new HandWater(scenario, @case.Name);
            var height = scenario.Result.BarrierHeight;
            var cosRake = Math.Cos(scenario.Opening.RakeDegrees * Math.PI / 180);
            var terms = water.Integral(water.Terms, 0, height) / cosRake;

            var resultant = water.Integral(water.Pressure, 0, height) / cosRake;
            var moment = water.Integral(z => water.Pressure(z) * z, 0, height) / cosRake;

            Assert.Equal(resultant, @case.Resultant, tolerance: 1e-11 * terms);
            Assert.Equal(moment, @case.Resultant * (@case.CentreOfPressure ?? 0), tolerance: 1e-11 * terms * height);
        });
    }
}
