namespace FloodPanel.Calculation.Actions;

/// <summary>
/// One piece of a pressure diagram: pressure running straight from one value to another over a band of height,
/// positive towards the protected side. The integrals below are those of that first-degree polynomial times a power
/// of z; written with the two end values they have no differences in them, so that nothing cancels.
/// </summary>
/// <param name="Bottom">z_a, lower end of the band above the sill [m].</param>
/// <param name="Top">z_b, upper end of the band above the sill [m].</param>
/// <param name="AtBottom">p_a, unfactored pressure at the lower end [Pa].</param>
/// <param name="AtTop">p_b, unfactored pressure at the upper end [Pa].</param>
/// <param name="Factor">γ_F, load factor of the design basis on this piece [-].</param>
public readonly record struct PressurePiece(double Bottom, double Top, double AtBottom, double AtTop, double Factor)
{
    /// <summary>Height of the band [m].</summary>
    public double Height => Top - Bottom;

    /// <summary>Unfactored pressure at a height within the band, both ends included [Pa]; 0 outside.</summary>
    /// <param name="z">Height above the sill [m].</param>
    public double At(double z) =>
        z >= Bottom && z <= Top ? (AtBottom * (Top - z) + AtTop * (z - Bottom)) / Height : 0;

    /// <summary>The part of this piece within a band of height; of no height where they do not meet.</summary>
    /// <param name="bottom">Lower end [m].</param>
    /// <param name="top">Upper end [m].</param>
    public PressurePiece Within(double bottom, double top)
    {
        var from = Math.Max(bottom, Bottom);
        var to = Math.Max(from, Math.Min(top, Top));
        var perMetre = 1 / Height;
        return new(
            from,
            to,
            (AtBottom * (Top - from) + AtTop * (from - Bottom)) * perMetre,
            (AtBottom * (Top - to) + AtTop * (to - Bottom)) * perMetre,
            Factor);
    }

    /// <summary>∫p dz over the band [N/m].</summary>
    public double Force => Height / 2 * (AtBottom + AtTop);

    /// <summary>∫p·z dz over the band [N].</summary>
    public double FirstMoment => Height / 6 * (AtBottom * (2 * Bottom + Top) + AtTop * (Bottom + 2 * Top));

    /// <summary>∫p·z² dz over the band [N·m].</summary>
    public double SecondMoment
    {
        get
        {
            var (a, b) = (Bottom, Top);
            return Height / 12 * (AtBottom * (3 * a * a + 2 * a * b + b * b) + AtTop * (a * a + 2 * a * b + 3 * b * b));
        }
    }

    /// <summary>∫p·z³ dz over the band [N·m²].</summary>
    public double ThirdMoment
    {
        get
        {
            var (a, b) = (Bottom, Top);
            return Height / 20 * (
                AtBottom * (4 * a * a * a + 3 * a * a * b + 2 * a * b * b + b * b * b)
                + AtTop * (a * a * a + 2 * a * a * b + 3 * a * b * b + 4 * b * b * b));
        }
    }
}
