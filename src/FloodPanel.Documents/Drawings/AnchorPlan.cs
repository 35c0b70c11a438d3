using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A box in plan [m]: x across the opening from the middle of the plate, y towards the protected side.</summary>
internal sealed record PlanBox(double Left, double Bottom, double Right, double Top);

/// <summary>What breaks off towards the protected edge [m]: from the row, widening to the edge.</summary>
internal sealed record PlanWedge(double InnerLeft, double InnerRight, double From, double OuterLeft, double OuterRight, double To);

/// <summary>The anchors of a post laid out in plan [m], x across the opening, y towards the protected side, from the middle of the plate.</summary>
internal sealed record AnchorPlan(double Left, double Right, double Bottom, double Top, PlanBox? Tension, PlanWedge? Shear)
{
    public static AnchorPlan Of(AnchorInput anchors, BasePlateInput plate, AnchorLayout layout)
    {
        var (half, row) = (layout.RowLength / 2, layout.RowSpacing / 2);
        var isConcrete = anchors.Method != AnchorMethod.Approval;
        var depth = isConcrete ? BreakoutBody.Of(layout, 1, anchors.Depth).Depth : 0;
        var reach = 1.5 * depth;

        // A far edge is cut a little beyond the bodies, or beyond the plate.
        var spread = isConcrete && layout.Protected is { } edge ? 1.5 * edge : 0;
        double Shown(double? given, double widest, double beyondPlate) => given ?? Math.Max(1.1 * widest, beyondPlate);
        double Beside(double? given) => half + Shown(given, Math.Max(reach, spread), plate.Width / 2 - half + 0.05);
        double Along(double? given) => row + Shown(given, reach, plate.Length / 2 - row + 0.05);
        var (left, right, flood, ahead) = (Beside(layout.Left), Beside(layout.Right), Along(layout.Flood), Along(layout.Protected));
        var tension = !isConcrete ? null : new PlanBox(
            -half - Math.Min(reach, layout.Left ?? reach), -row - Math.Min(reach, layout.Flood ?? reach),
            half + Math.Min(reach, layout.Right ?? reach), -row + Math.Min(reach, layout.Protected + layout.RowSpacing ?? reach));
        return new(-left, right, -flood, ahead, tension, isConcrete ? Wedge(layout, half, row) : null);
    }

    private static PlanWedge? Wedge(AnchorLayout layout, double half, double row)
    {
        if (layout.Protected is not { } edge)
        {
            return null;
        }

        var spread = 1.5 * edge;
        return new(
            -half, half, row,
            -half - Math.Min(spread, layout.Left ?? spread), half + Math.Min(spread, layout.Right ?? spread), row + edge);
    }
}
