using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>
/// Two equal rows of anchors in plan. An edge that is null is far away. The row on the flood side pulls; the row on the
/// protected side stands nearest the edge towards which the shear pushes.
/// </summary>
/// <param name="PerRow">n, anchors in a row [-], ≥ 1.</param>
/// <param name="Spacing">s, between the anchors of a row [m], > 0.</param>
/// <param name="RowSpacing">s_2, between the rows [m], > 0.</param>
/// <param name="Flood">From the row on the flood side to the edge there [m].</param>
/// <param name="Protected">From the row on the protected side to the edge there [m].</param>
/// <param name="Left">From the outer anchors to the edge on the left [m].</param>
/// <param name="Right">From the outer anchors to the edge on the right [m].</param>
/// <param name="Thickness">h, of the concrete [m], > 0.</param>
public sealed record AnchorLayout(
    int PerRow, double Spacing, double RowSpacing, double? Flood, double? Protected, double? Left, double? Right, double Thickness)
{
    /// <summary>The layout of the anchors of a plate.</summary>
    /// <param name="anchors">The anchors.</param>
    /// <param name="plate">The plate that they hold.</param>
    public static AnchorLayout Of(AnchorInput anchors, BasePlateInput plate) => new(
        plate.RodsPerRow, anchors.Spacing, 2 * plate.RodDistance,
        anchors.EdgeFlood, anchors.EdgeProtected, anchors.EdgeLeft, anchors.EdgeRight, anchors.MemberThickness);

    /// <summary>Seen from the other side: flood and protected side change places, for a row there that pulls, or a shear that pushes back.</summary>
    public AnchorLayout Turned => this with { Flood = Protected, Protected = Flood };

    /// <summary>Length from the first to the last anchor of a row [m].</summary>
    public double RowLength => (PerRow - 1) * Spacing;

    /// <summary>The edges of one or both rows: flood, protected, left, right [m]; null for those far away.</summary>
    /// <param name="rows">1 for the row on the flood side, 2 for both.</param>
    public double?[] Edges(int rows) => [Flood, rows == 1 ? Protected + RowSpacing : Protected, Left, Right];

    /// <summary>The smaller of two edges, one of which may be far.</summary>
    internal static double? Nearer(double? one, double? other) => one is { } a && other is { } b ? Math.Min(a, b) : one ?? other;
}
