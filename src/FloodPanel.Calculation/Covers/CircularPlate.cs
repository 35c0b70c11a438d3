namespace FloodPanel.Calculation.Covers;

/// <summary>A circular plate, its edge supported or clamped, under p = p_m + k·x, x down from the middle; in closed form.</summary>
/// <remarks>
/// Source: Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, 2nd ed. (1959), articles 16 and 63 (from memory; derived anew
/// from ∇⁴w = p/D, and held against the centre and edge values of handbooks). Limits: thin isotropic plate, small deflections, pressure
/// over the whole plate.
/// </remarks>
public sealed class CircularPlate
{
    private readonly double poisson;
    private readonly double evenFactor;
    private readonly double tiltFactor;

    /// <summary>Sets up the plate.</summary>
    /// <param name="radius">r [m], > 0.</param>
    /// <param name="poisson">ν [-], 0 to 0.49.</param>
    /// <param name="isClamped">True for an edge that cannot turn.</param>
    /// <param name="middle">p_m, pressure at the middle [Pa], ≥ 0.</param>
    /// <param name="rise">k, growth with depth [Pa/m], ≥ 0 and at most p_m/r: the pressure pulls nowhere.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    public CircularPlate(double radius, double poisson, bool isClamped, double middle, double rise)
    {
        Guard.Positive(radius);
        Guard.InRange(poisson, 0, 0.49);
        Guard.NonNegative(middle);
        Guard.InRange(rise * radius, 0, middle * (1 + 1e-9) + 1e-9, "rise * radius");

        (Radius, this.poisson, IsClamped, Middle, Tilt) = (radius, poisson, isClamped, middle, rise * radius);
        evenFactor = isClamped ? 1 : (5 + poisson) / (1 + poisson);
        tiltFactor = isClamped ? 1 : (7 + poisson) / (3 + poisson);
    }

    /// <summary>r [m].</summary>
    public double Radius { get; }

    /// <summary>True for an edge that cannot turn.</summary>
    public bool IsClamped { get; }

    /// <summary>p_m [Pa].</summary>
    public double Middle { get; }

    /// <summary>p_1 = k·r, by which the pressure at the lowest point exceeds that of the middle [Pa].</summary>
    public double Tilt { get; }

    /// <summary>What the plate feels most.</summary>
    public PlateResponse Worst() => PlateSearch.Of(this);

    /// <summary>D·w, deflection times stiffness [N·m²]: p_m·r⁴/64·(1 − ρ²)·(K − ρ²) + p_1·r⁴/192·ρ·(1 − ρ²)·(K_1 − ρ²)·cos φ.</summary>
    /// <param name="out">ρ, distance from the middle over the radius [-], 0 to 1.</param>
    /// <param name="angle">φ, from straight down [rad].</param>
    public double Bulge(double @out, double angle)
    {
        var square = @out * @out;
        var even = (1 - square) * (evenFactor - square) / 64;
        var tilt = @out * (1 - square) * (tiltFactor - square) / 192;
        return Math.Pow(Radius, 4) * (Middle * even + Tilt * tilt * Math.Cos(angle));
    }

    /// <summary>Moments per width, along the radius and along the ring.</summary>
    /// <param name="out">ρ, distance from the middle over the radius [-], 0 to 1.</param>
    /// <param name="angle">φ, from straight down [rad].</param>
    public PlateMoments Moments(double @out, double angle)
    {
        var (square, even, tilt) = (@out * @out, 2 * (1 + evenFactor), 2 * (1 + tiltFactor) * @out);
        var (alongEven, ringEven) = (12 * square - even, 4 * square - even);
        var (alongTilt, ringTilt) = (20 * square * @out - 3 * tilt, 4 * square * @out - tilt);
        var (p, q) = (Middle * Radius * Radius / 64, Tilt * Radius * Radius / 192);
        var (sine, cosine) = Math.SinCos(angle);
        return new(
            -p * (alongEven + poisson * ringEven) - q * cosine * (alongTilt + poisson * ringTilt),
            -p * (ringEven + poisson * alongEven) - q * cosine * (ringTilt + poisson * alongTilt),
            (1 - poisson) * q * sine * ringTilt);
    }

    /// <summary>Reaction of the edge against the pressure [N/m].</summary>
    /// <param name="angle">φ, from straight down [rad].</param>
    public double Reaction(double angle)
    {
        var tilt = 72 - 8 * (1 + tiltFactor) + (1 - poisson) * (2 * (1 + tiltFactor) - 4);
        return Radius * (Middle / 2 + Tilt * tilt / 192 * Math.Cos(angle));
    }
}
