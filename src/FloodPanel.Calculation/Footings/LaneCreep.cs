using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Footings;

/// <summary>Weighted creep along the base of a footing, after Lane.</summary>
public static class LaneCreep
{
    /// <summary>Source, as printed.</summary>
    public const string Source = "Lane's weighted creep ratio (1935; figures from a secondary source): level contact counts a third; a quick check only, not valid over a confined aquifer";

    /// <summary>C_L, least weighted creep ratio of a kind of ground [-].</summary>
    /// <param name="soil">The ground.</param>
    /// <exception cref="ArgumentOutOfRangeException">The kind is unknown.</exception>
    public static double Least(CreepSoil soil) => soil switch
    {
        CreepSoil.VeryFineSandOrSilt => 8.5,
        CreepSoil.FineSand => 7.0,
        CreepSoil.MediumSand => 6.0,
        CreepSoil.CoarseSand => 5.0,
        CreepSoil.FineGravel => 4.0,
        CreepSoil.MediumGravel => 3.5,
        CreepSoil.CoarseGravel => 3.1,
        CreepSoil.Boulders => 2.5,
        CreepSoil.SoftClay => 3.0,
        CreepSoil.MediumClay => 2.1,
        CreepSoil.HardClay => 1.8,
        CreepSoil.Hardpan => 1.6,
        _ => throw new ArgumentOutOfRangeException(nameof(soil), soil, "is not a known ground"),
    };

    /// <summary>L_w = 2·D + 2·D_c + B/3, weighted length of the path under a footing [m].</summary>
    /// <param name="width">B, width of the base [m], ≥ 0.</param>
    /// <param name="thickness">D, depth of the base below the ground on both sides [m], ≥ 0.</param>
    /// <param name="cutOff">D_c, depth of a cut-off below the base [m], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is negative or not finite.</exception>
    public static double Path(double width, double thickness, double cutOff)
    {
        Guard.NonNegative(width);
        Guard.NonNegative(thickness);
        Guard.NonNegative(cutOff);

        return 2 * thickness + 2 * cutOff + width / 3;
    }
}
