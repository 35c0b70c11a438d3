namespace FloodPanel.Calculation.Anchors;

/// <summary>
/// The concrete that anchors in tension tear out, in plan. Anchors more than 3·h_ef apart tear out a body each; then it is that of the
/// one with the nearest edges.
/// </summary>
/// <param name="Layout">The anchors whose body it is.</param>
/// <param name="Rows">Rows that share it, 1 for that on the flood side, or 2.</param>
/// <param name="Embedment">h_ef [m], > 0.</param>
/// <param name="Depth">h′, depth that counts, reduced where three or more edges are near [m].</param>
public sealed record BreakoutBody(AnchorLayout Layout, int Rows, double Embedment, double Depth)
{
    /// <summary>A cone reaches this far at the surface, in depths [-].</summary>
    public const double Reach = 1.5;

    /// <summary>Anchors that share the body [-].</summary>
    public int Count => Rows * Layout.PerRow;

    /// <summary>a_1, length of the body along the row [m].</summary>
    public double Along => (Layout.PerRow - 1) * Math.Min(Layout.Spacing, 2 * Reach * Depth) + To(Layout.Left) + To(Layout.Right);

    /// <summary>a_2, its length across the row [m].</summary>
    public double Across => (Rows - 1) * Math.Min(Layout.RowSpacing, 2 * Reach * Depth) + To(Layout.Edges(Rows)[0]) + To(Layout.Edges(Rows)[1]);

    /// <summary>A, area of the body in plan [m²].</summary>
    public double Area => Along * Across;

    /// <summary>A_0 = 9·h′², area of a single anchor far from edges [m²].</summary>
    public double SingleArea => 9 * Depth * Depth;

    /// <summary>c_min, nearest edge [m]; null when all are far.</summary>
    public double? NearestEdge => Layout.Edges(Rows).Min();

    /// <summary>ψ_ed = 0.7 + 0.3·c_min/(1.5·h′) ≤ 1 [-].</summary>
    public double EdgeFactor => NearestEdge is { } edge ? Math.Min(1, 0.7 + 0.3 * edge / (Reach * Depth)) : 1;

    /// <summary>The body of one or both rows: it reaches 1.5·h′ beyond the outer anchors, or to the edge.</summary>
    /// <param name="layout">The layout.</param>
    /// <param name="rows">1 for the row on the flood side, 2 for both.</param>
    /// <param name="depth">h_ef, effective depth [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is not finite and above zero.</exception>
    /// <remarks>
    /// Source: ACI 318-19, 17.5.1.3 and 17.6.2.1; EN 1992-4, 7.2.1.4 (both from memory); both alike. With three or four edges nearer than 1.5·h_ef,
    /// h′ = max(c_max/1.5, s_max/3), c_max the greatest of those edges (ACI 318-19, 17.6.2.1.2).
    /// </remarks>
    public static BreakoutBody Of(AnchorLayout layout, int rows, double depth)
    {
        Guard.Positive(depth);

        var (acting, together) = (layout, rows);
        if (rows == 2 && layout.RowSpacing > 2 * Reach * depth)
        {
            (acting, together) = (acting with { Flood = AnchorLayout.Nearer(layout.Flood, layout.Protected), Protected = null }, 1);
        }

        if (layout.PerRow > 1 && layout.Spacing > 2 * Reach * depth)
        {
            acting = acting with { PerRow = 1, Left = AnchorLayout.Nearer(layout.Left, layout.Right), Right = null };
        }

        var whole = new BreakoutBody(acting, together, depth, depth);
        return whole.GreatestNearEdge is { } edge
            ? whole with { Depth = Math.Min(depth, Math.Max(edge / Reach, whole.GreatestSpacing / 3)) }
            : whole;
    }

    /// <summary>c_max, the greatest of three or more edges nearer than 1.5·h_ef [m]; null where there are fewer.</summary>
    internal double? GreatestNearEdge
    {
        get
        {
            double[] near = [.. Layout.Edges(Rows).OfType<double>().Where(edge => edge < Reach * Embedment)];
            return near.Length < 3 ? null : near.Max();
        }
    }

    private double GreatestSpacing => Math.Max(Layout.PerRow > 1 ? Layout.Spacing : 0, Rows > 1 ? Layout.RowSpacing : 0);

    private double To(double? edge) => Math.Min(Reach * Depth, edge ?? double.PositiveInfinity);
}
