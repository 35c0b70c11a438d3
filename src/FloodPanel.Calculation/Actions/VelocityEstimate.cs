namespace FloodPanel.Calculation.Actions;

/// <summary>Bounds of flood velocity estimated from depth, where nobody has measured or modelled it.</summary>
public static class VelocityEstimate
{
    /// <summary>Source of the estimate, as printed.</summary>
    public const string Source = "ASCE 7, C5.4; FEMA P-55 (2011), Eq. 8.2";

    /// <summary>V = d_s/(1 s), lower bound [m/s].</summary>
    /// <param name="depth">d_s, still-water depth above ground [m], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is negative or not finite.</exception>
    public static double Lower(double depth)
    {
        Guard.NonNegative(depth);

        const double second = 1;
        return depth / second;
    }

    /// <summary>V = √(g·d_s), upper bound [m/s].</summary>
    /// <param name="depth">d_s, still-water depth above ground [m], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is negative or not finite.</exception>
    public static double Upper(double depth)
    {
        Guard.NonNegative(depth);

        return Math.Sqrt(Physics.Gravity * depth);
    }
}
