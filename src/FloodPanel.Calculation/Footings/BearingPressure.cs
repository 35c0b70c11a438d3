namespace FloodPanel.Calculation.Footings;

/// <summary>Pressure under a base that cannot pull on the ground.</summary>
/// <param name="Greatest">q_max, pressure at the pressed edge [Pa].</param>
/// <param name="Least">q_min, pressure at the other edge [Pa]; 0 where it has lifted off.</param>
/// <param name="Contact">Width in contact [m].</param>
public readonly record struct BearingPressure(double Greatest, double Least, double Contact)
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Statics: straight-line pressure; beyond the middle third 2·N/(3·x) over the contact 3·x";

    /// <summary>
    /// Pressure from the distance x of the resultant to the pressed edge: N/B·(1 ± 6·e/B) within the middle third,
    /// e = B/2 − x; else q_max = 2·N/(3·x) over the contact length 3·x.
    /// </summary>
    /// <param name="vertical">N, vertical force per length [N/m], ≥ 0.</param>
    /// <param name="distance">x, from the pressed edge to the resultant [m], above 0, at most B.</param>
    /// <param name="width">B, width of the base [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public static BearingPressure Of(double vertical, double distance, double width)
    {
        Guard.NonNegative(vertical);
        Guard.Positive(distance);
        Guard.Positive(width);

        // A resultant beyond the middle presses the other edge in the same way.
        var near = Math.Min(distance, width - distance);
        if (near < width / 3)
        {
            Guard.Positive(near, nameof(distance));
            return new(2 * vertical / (3 * near), 0, 3 * near);
        }

        var eccentricity = width / 2 - near;
        var mean = vertical / width;
        return new(mean * (1 + 6 * eccentricity / width), mean * (1 - 6 * eccentricity / width), width);
    }
}
