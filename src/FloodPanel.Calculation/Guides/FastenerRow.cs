namespace FloodPanel.Calculation.Guides;

/// <summary>Fasteners spaced evenly along a guide, each with the stretch of guide that it holds.</summary>
/// <param name="Length">H, length of the guide along the face [m].</param>
/// <param name="EndDistance">e_1, from each end to the nearest fastener [m].</param>
/// <param name="Spaces">N, spaces between fasteners [-], > 0.</param>
public readonly record struct FastenerRow(double Length, double EndDistance, int Spaces)
{
    /// <summary>A whole number of spaces may miss by this share of a space without another fastener [-].</summary>
    private const double Rounding = 1e-9;

    /// <summary>s, distance between fasteners [m].</summary>
    public double Spacing => (Length - 2 * EndDistance) / Spaces;

    /// <summary>Number of fasteners [-].</summary>
    public int Count => Spaces + 1;

    /// <summary>The fewest fasteners that stand no further apart than the pitch.</summary>
    /// <param name="length">H, length of the guide along the face [m], > 2·e_1.</param>
    /// <param name="endDistance">e_1, from each end to the nearest fastener [m], > 0.</param>
    /// <param name="pitch">p, greatest distance between fasteners [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    public static FastenerRow Of(double length, double endDistance, double pitch)
    {
        Guard.Positive(endDistance);
        Guard.Positive(pitch);
        Guard.Positive(length - 2 * endDistance);

        return new(length, endDistance, Math.Max(1, (int)Math.Ceiling((length - 2 * endDistance) / pitch - Rounding)));
    }

    /// <summary>Distance of a fastener from the lower end [m].</summary>
    /// <param name="index">From the lower end, from 0.</param>
    public double Position(int index) => EndDistance + index * Spacing;

    /// <summary>The stretch that a fastener holds: half of the space on each side, and the whole of an end [m].</summary>
    /// <param name="index">From the lower end, from 0.</param>
    /// <remarks>
    /// Statics of a guide cut between its fasteners; a stiff guide spreads a peak over more of them. With a line load that only
    /// falls, or with an odd number of new spaces for each old one, closer fasteners never receive more, because the stretches
    /// nest. In general a closer pitch may move a fastener to a peak; no fastener then receives more than the greatest load on
    /// any stretch as long as the space, or than that on an end with half a space.
    /// </remarks>
    public (double From, double To) Stretch(int index) => (
        index == 0 ? 0 : Position(index) - Spacing / 2,
        index == Spaces ? Length : Position(index) + Spacing / 2);
}
