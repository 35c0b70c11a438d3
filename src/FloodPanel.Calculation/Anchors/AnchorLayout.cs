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

    /// <summary>The edges of one or both rows: flood, protected, left, right [m]; null for those far away.</summary>
    /// <param name="rows">1 for the row on the flood side, 2 for both.</param>
    public double?[] Edges(int rows) => [Flood, rows == 1 ? Protected + RowSpacing : Protected, Left, Right];

    /// <summary>Length from the first to the last anchor of a row [m].</summary>
    public double RowLength => (PerRow - 1) * Spacing;
}

/// <summary>The concrete that anchors in tension tear out, in plan.</summary>
/// <param name="Depth">h, effective depth, reduced where three or more edges are near [m].</param>
/// <param name="Along">a_1, length of the body along the row [m].</param>
/// <param name="Across">a_2, its length across the row [m].</param>
/// <param name="NearestEdge">c_min, nearest edge [m]; null when all are far.</param>
public sealed record BreakoutBody(double Depth, double Along, double Across, double? NearestEdge)
{
    /// <summary>A, area of the body in plan [m²].</summary>
    public double Area => Along * Across;

    /// <summary>A_0 = 9·h², area of a single anchor far from edges [m²].</summary>
    public double SingleArea => 9 * Depth * Depth;

    /// <summary>ψ_ed = 0.7 + 0.3·c_min/(1.5·h) ≤ 1 [-].</summary>
    public double EdgeFactor => NearestEdge is { } edge ? Math.Min(1, 0.7 + 0.3 * edge / (1.5 * Depth)) : 1;

    /// <summary>The body of one or both rows: it reaches 1.5·h beyond the outer anchors, or to the edge.</summary>
    /// <param name="layout">The layout.</param>
    /// <param name="rows">1 for the row on the flood side, 2 for both.</param>
    /// <param name="depth">h_ef, effective depth [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is not finite and above zero.</exception>
    /// <remarks>Source: ACI 318-19, 17.6.2.1; EN 1992-4, 7.2.1.4 (from memory); both alike. Anchors further apart than 3·h count 3·h.</remarks>
    public static BreakoutBody Of(AnchorLayout layout, int rows, double depth)
    {
        Guard.Positive(depth);

        var edges = layout.Edges(rows);
        var h = Reduced(layout, rows, depth, edges);
        double Reach(double? edge) => Math.Min(1.5 * h, edge ?? double.PositiveInfinity);
        var along = (layout.PerRow - 1) * Math.Min(layout.Spacing, 3 * h) + Reach(edges[2]) + Reach(edges[3]);
        var across = (rows - 1) * Math.Min(layout.RowSpacing, 3 * h) + Reach(edges[0]) + Reach(edges[1]);
        return new(h, along, across, edges.Min());
    }

    /// <summary>h = max(c_max/1.5, s_max/3) where three or four edges are nearer than 1.5·h_ef (ACI 318-19, 17.6.2.1.2, from memory).</summary>
    private static double Reduced(AnchorLayout layout, int rows, double depth, double?[] edges)
    {
        var near = edges.OfType<double>().Where(edge => edge < 1.5 * depth).ToArray();
        if (near.Length < 3)
        {
            return depth;
        }

        var along = layout.PerRow > 1 ? layout.Spacing : 0;
        return Math.Min(depth, Math.Max(near.Max() / 1.5, Math.Max(along, rows > 1 ? layout.RowSpacing : 0) / 3));
    }
}

/// <summary>The concrete that a row in shear breaks off towards an edge, seen from that edge.</summary>
/// <param name="EdgeDistance">c_1, from the row to the edge, reduced in a narrow thin member [m].</param>
/// <param name="Width">b, along the edge [m].</param>
/// <param name="Height">min(1.5·c_1, h) [m].</param>
/// <param name="NearestSide">c_2, nearest edge at the side [m]; null when both are far.</param>
/// <param name="Thickness">h, of the concrete [m].</param>
public sealed record EdgeBody(double EdgeDistance, double Width, double Height, double? NearestSide, double Thickness)
{
    /// <summary>A_V, area of the body on the edge [m²].</summary>
    public double Area => Width * Height;

    /// <summary>A_V0 = 4.5·c_1², of a single anchor [m²].</summary>
    public double SingleArea => 4.5 * EdgeDistance * EdgeDistance;

    /// <summary>ψ_ed = 0.7 + 0.3·c_2/(1.5·c_1) ≤ 1 [-].</summary>
    public double SideFactor => NearestSide is { } side ? Math.Min(1, 0.7 + 0.3 * side / (1.5 * EdgeDistance)) : 1;

    /// <summary>ψ_h = √(1.5·c_1/h) ≥ 1 [-].</summary>
    public double ThicknessFactor => Math.Max(1, Math.Sqrt(1.5 * EdgeDistance / Thickness));

    /// <summary>The body of a row.</summary>
    /// <param name="count">Anchors in the row [-], ≥ 1.</param>
    /// <param name="spacing">Distance between them [m].</param>
    /// <param name="edge">c_1, to the edge towards which they push [m], > 0.</param>
    /// <param name="side">Edge at one end of the row [m], or null.</param>
    /// <param name="otherSide">Edge at its other end [m], or null.</param>
    /// <param name="thickness">h, of the concrete [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range.</exception>
    /// <remarks>
    /// Source: ACI 318-19, 17.7.2.1; EN 1992-4, 7.2.2.5 (from memory). Where both sides and the thickness are less than 1.5·c_1, c_1 counts
    /// max(c_2/1.5, h/1.5, s/3).
    /// </remarks>
    public static EdgeBody Of(int count, double spacing, double edge, double? side, double? otherSide, double thickness)
    {
        Guard.Positive(edge);
        Guard.Positive(thickness);

        var isNarrow = side < 1.5 * edge && otherSide < 1.5 * edge && thickness < 1.5 * edge;
        var c = isNarrow
            ? Math.Min(edge, Math.Max(Math.Max(side!.Value, otherSide!.Value) / 1.5, Math.Max(thickness / 1.5, count > 1 ? spacing / 3 : 0)))
            : edge;
        double Reach(double? end) => Math.Min(1.5 * c, end ?? double.PositiveInfinity);
        var width = (count - 1) * Math.Min(spacing, 3 * c) + Reach(side) + Reach(otherSide);
        var nearest = side is { } one && otherSide is { } other ? Math.Min(one, other) : side ?? otherSide;
        return new(c, width, Math.Min(1.5 * c, thickness), nearest, thickness);
    }
}
