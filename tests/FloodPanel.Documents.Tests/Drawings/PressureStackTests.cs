using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class PressureStackTests
{
    private static readonly Working NoWorking = new("", "", []);

    [Fact]
    public void Of_TwoActions_SecondStandsOnFirst()
    {
        var still = Action(ActionKind.Hydrostatic, new PressurePiece(0, 1, 9810, 0, 1));
        var flow = Action(ActionKind.Flow, new PressurePiece(0, 1, 500, 500, 1));

        var bands = PressureStack.Of([still, flow]);

        Assert.Equal([ActionKind.Hydrostatic, ActionKind.Flow], bands.Select(b => b.Kind));
        Assert.Equal([new StackPoint(0, 0, 9810), new StackPoint(1, 0, 0)], bands[0].Points);
        Assert.Equal([new StackPoint(0, 9810, 10310), new StackPoint(1, 0, 500)], bands[1].Points);
    }

    [Fact]
    public void Of_PressureJumps_HasTwoPointsAtTheHeight()
    {
        var debris = Action(ActionKind.Wind, new PressurePiece(0.4, 0.6, 800, 800, 1));
        var still = Action(ActionKind.Hydrostatic, new PressurePiece(0, 1, 1000, 0, 1));

        var bands = PressureStack.Of([still, debris]);

        var sums = bands[1].Points.Select(p => (p.Z, Math.Round(p.Sum, 6)));
        Assert.Equal([(0, 1000), (0.4, 600), (0.4, 1400), (0.6, 1200), (0.6, 400), (1, 0)], sums);
    }

    [Fact]
    public void Of_PiecesThatOverlap_AddUp()
    {
        var bothSides = Action(
            ActionKind.Hydrostatic, new PressurePiece(0, 1, 10, 0, 1), new PressurePiece(0, 0.5, -5, 0, 1));

        var points = PressureStack.Of([bothSides])[0].Points;

        Assert.Equal([(0, 5), (0.5, 5), (0.5, 5), (1, 0)], points.Select(p => (p.Z, p.Sum)));
    }

    [Fact]
    public void Of_ActionWithoutPressure_IsLeftOut()
    {
        Assert.Empty(PressureStack.Of([Action(ActionKind.Flow)]));
    }

    [Fact]
    public void Of_AnyCase_AreaIsTheResultant()
    {
        var result = Sample.Evaluate(Sample.Garage with { ProtectedSideLevel = 11.7, SillLevel = 11.2 });

        Assert.All(result.Cases, loadCase =>
        {
            var points = PressureStack.Of(loadCase.Actions)[^1].Points;
            var area = points.Zip(points.Skip(1), (a, b) => (b.Z - a.Z) * (a.Sum + b.Sum) / 2).Sum();
            Assert.Equal(loadCase.Resultant, area, 1e-9 * loadCase.Resultant);
        });
    }

    private static ActionResult Action(ActionKind kind, params PressurePiece[] pieces) =>
        new(kind, pieces, pieces.Sum(p => p.Force), null, 1, NoWorking, NoWorking);
}
