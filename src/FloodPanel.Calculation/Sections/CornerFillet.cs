namespace FloodPanel.Calculation.Sections;

/// <summary>The area between a sharp corner and the quarter circle that rounds it, about the mid-depth axis of the section.</summary>
/// <param name="Area">A_g = (1 − π/4)·r² [m²].</param>
/// <param name="FirstMoment">A_g·h_g, first moment about mid-depth [m³].</param>
/// <param name="Inertia">I_g + A_g·h_g², second moment about mid-depth [m⁴].</param>
/// <remarks>
/// Source: EN 10210-2 and EN 10219-2, annex B (from memory), which give A_g, h_g and I_g in this form; the same follows
/// from the square r × r less a quarter circle.
/// </remarks>
public readonly record struct CornerFillet(double Area, double FirstMoment, double Inertia)
{
    /// <summary>The fillet of one corner.</summary>
    /// <param name="radius">r, radius of the corner [m], ≥ 0, at most the distance: beyond it the corners would meet.</param>
    /// <param name="distance">Distance of the sharp corner from mid-depth [m], ≥ 0.</param>
    public static CornerFillet Of(double radius, double distance)
    {
        Guard.NonNegative(radius);
        Guard.NonNegative(distance);

        var area = (1 - Math.PI / 4) * radius * radius;
        var arm = distance - radius * (10 - 3 * Math.PI) / (12 - 3 * Math.PI);
        var own = (1.0 / 3 - Math.PI / 16 - 1 / (3 * (12 - 3 * Math.PI))) * radius * radius * radius * radius;
        return new(area, area * arm, own + area * arm * arm);
    }
}
