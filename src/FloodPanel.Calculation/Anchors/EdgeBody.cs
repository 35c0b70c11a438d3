namespace FloodPanel.Calculation.Anchors;

/// <summary>
/// The concrete that a row in shear breaks off towards an edge, seen from that edge. Anchors more than 3·c_1 apart break off a body
/// each; then it is that of the one with the nearest side.
/// </summary>
/// <param name="Count">Anchors that share the body [-].</param>
/// <param name="Spacing">s, between them [m].</param>
/// <param name="Edge">c_e, from the row to the edge [m].</param>
/// <param name="EdgeDistance">c_1, the part of it that counts, reduced in a narrow thin member [m].</param>
/// <param name="Side">Edge at one end of the row [m]; null when far.</param>
/// <param name="OtherSide">Edge at its other end [m]; null when far.</param>
/// <param name="Thickness">h, of the concrete [m].</param>
public sealed record EdgeBody(
    int Count, double Spacing, double Edge, double EdgeDistance, double? Side, double? OtherSide, double Thickness)
{
    /// <summary>The body reaches this far to the sides and down, in edge distances [-].</summary>
    public const double Reach = 1.5;

    /// <summary>b_V, along the edge [m].</summary>
    public double Width => (Count - 1) * Math.Min(Spacing, 2 * Reach * EdgeDistance) + To(Side) + To(OtherSide);

    /// <summary>min(1.5·c_1, h) [m].</summary>
    public double Height => Math.Min(Reach * EdgeDistance, Thickness);

    /// <summary>A_V, area of the body on the edge [m²].</summary>
    public double Area => Width * Height;

    /// <summary>A_V0 = 4.5·c_1², of a single anchor [m²].</summary>
    public double SingleArea => 4.5 * EdgeDistance * EdgeDistance;

    /// <summary>c_2, nearest edge at the side [m]; null when both are far.</summary>
    public double? NearestSide => AnchorLayout.Nearer(Side, OtherSide);

    /// <summary>ψ_ed = 0.7 + 0.3·c_2/(1.5·c_1) ≤ 1 [-].</summary>
    public double SideFactor => NearestSide is { } side ? Math.Min(1, 0.7 + 0.3 * side / (Reach * EdgeDistance)) : 1;

    /// <summary>ψ_h = √(1.5·c_1/h) ≥ 1 [-].</summary>
    public double ThicknessFactor => Math.Max(1, Math.Sqrt(Reach * EdgeDistance / Thickness));

    /// <summary>True where both sides and the thickness are less than 1.5·c_e, so that c_1 is reduced.</summary>
    internal bool IsNarrow => Side < Reach * Edge && OtherSide < Reach * Edge && Thickness < Reach * Edge;

    /// <summary>The body of a row.</summary>
    /// <param name="count">Anchors in the row [-], ≥ 1.</param>
    /// <param name="spacing">Distance between them [m].</param>
    /// <param name="edge">c_e, to the edge towards which they push [m], > 0.</param>
    /// <param name="side">Edge at one end of the row [m], or null.</param>
    /// <param name="otherSide">Edge at its other end [m], or null.</param>
    /// <param name="thickness">h, of the concrete [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range.</exception>
    /// <remarks>
    /// Source: ACI 318-19, 17.7.2.1; EN 1992-4, 7.2.2.5 (from memory). Where both sides and the thickness are less than 1.5·c_e,
    /// c_1 = max(c_2/1.5, h/1.5, s/3), c_2 the greater of both sides.
    /// </remarks>
    public static EdgeBody Of(int count, double spacing, double edge, double? side, double? otherSide, double thickness)
    {
        Guard.Positive(edge);
        Guard.Positive(thickness);

        var whole = count > 1 && spacing > 2 * Reach * edge
            ? new EdgeBody(1, spacing, edge, edge, AnchorLayout.Nearer(side, otherSide), null, thickness)
            : new EdgeBody(count, spacing, edge, edge, side, otherSide, thickness);
        if (!whole.IsNarrow)
        {
            return whole;
        }

        var widest = Math.Max(whole.Side!.Value, whole.OtherSide!.Value);
        var reduced = Math.Max(Math.Max(widest, thickness) / Reach, whole.Count > 1 ? spacing / 3 : 0);
        return whole with { EdgeDistance = Math.Min(edge, reduced) };
    }

    private double To(double? end) => Math.Min(Reach * EdgeDistance, end ?? double.PositiveInfinity);
}
