using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Web.Shared.Results;

namespace FloodPanel.Web.Tests.Results;

public class LadderFaceTests
{
    private static readonly Working None = new("", "", []);

    [Fact]
    public void Strips_StillWaterHalfWayUp_IsATriangleToHalfTheHeight()
    {
        ActionResult[] actions = [Action(ActionKind.Hydrostatic, new PressurePiece(0, 1, 10_000, 0, 1))];

        var strips = LadderFace.Strips(actions, height: 2);

        Assert.Equal([new FaceStrip(ActionKind.Hydrostatic, 0, 0.5, 0, 1, 0, 0)], strips);
    }

    [Fact]
    public void Strips_SecondAction_StandsOnTheFirst()
    {
        ActionResult[] actions =
        [
            Action(ActionKind.Hydrostatic, new PressurePiece(0, 1, 6_000, 0, 1)),
            Action(ActionKind.Flow, new PressurePiece(0, 1, 2_000, 2_000, 1)),
        ];

        var strips = LadderFace.Strips(actions, height: 1);

        Assert.Equal(2, strips.Count);
        Assert.Equal(new FaceStrip(ActionKind.Flow, 0, 1, 0.75, 1, 0, 0.25), strips[1]);
    }

    [Fact]
    public void Strips_PiecesThatOverlap_AddUp()
    {
        ActionResult[] actions =
        [
            Action(ActionKind.Hydrostatic, new PressurePiece(0, 2, 8_000, 0, 1), new PressurePiece(0, 1, -4_000, 0, 1)),
        ];

        var strips = LadderFace.Strips(actions, height: 2);

        Assert.Equal([new(ActionKind.Hydrostatic, 0, 0.5, 0, 1, 0, 1), new(ActionKind.Hydrostatic, 0.5, 1, 0, 1, 0, 0)], strips);
    }

    [Fact]
    public void Strips_NoPressure_AreNone() => Assert.Empty(LadderFace.Strips([Action(ActionKind.Hydrostatic)], height: 1));

    private static ActionResult Action(ActionKind kind, params PressurePiece[] pieces) => new(kind, pieces, 0, null, 1, None, None);
}
