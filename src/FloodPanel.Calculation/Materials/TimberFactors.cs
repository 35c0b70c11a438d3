using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Materials;

/// <summary>Factors on the strengths of wet timber.</summary>
public static class TimberFactors
{
    /// <summary>k_cr, share of the width without cracks in shear [-] (EN 1995-1-1, 6.1.7(2), from memory).</summary>
    public const double Cracks = 0.67;

    /// <summary>Plank thickness from which k_h is 1 [m] (EN 1995-1-1, 3.2(3)).</summary>
    public const double ReferenceDepth = 0.15;

    /// <summary>Greatest ρ_k for which k_h holds [kg/m³] (EN 1995-1-1, 3.2(3)).</summary>
    public const double HeaviestForDepth = 700;

    /// <summary>C_M on compression across the grain, wet [-] (NDS Supplement, Tables 4A and 4D, from memory).</summary>
    public const double WetBearing = 0.67;

    /// <summary>Sizes from this on are timbers, below it dimension lumber [m]: 5 in nominal, 4½ in dressed (NDS, 4.1.3, from memory).</summary>
    public const double TimberSize = 4.5 * 0.0254;

    /// <summary>F_b·C_F up to which C_M on bending is 1 [Pa]: 1150 psi (NDS Supplement, Table 4A).</summary>
    public const double WetBendingLimit = 1150 * 6894.757293168;

    /// <summary>k_mod of solid timber in service class 3.</summary>
    /// <param name="duration">Load duration class.</param>
    /// <returns>k_mod [-].</returns>
    /// <remarks>Source: EN 1995-1-1, Table 3.1.</remarks>
    public static double Modification(LoadDuration duration) => duration switch
    {
        LoadDuration.Permanent => 0.50,
        LoadDuration.LongTerm => 0.55,
        LoadDuration.MediumTerm => 0.65,
        LoadDuration.ShortTerm => 0.70,
        _ => 0.90,
    };

    /// <summary>C_D, load duration factor on bending and shear.</summary>
    /// <param name="duration">Load duration.</param>
    /// <returns>C_D [-].</returns>
    /// <remarks>Source: NDS, Table 2.3.2: two months read, the others from memory.</remarks>
    public static double Duration(LoadDuration duration) => duration switch
    {
        LoadDuration.Permanent => 0.9,
        LoadDuration.LongTerm => 1.0,
        LoadDuration.MediumTerm => 1.15,
        LoadDuration.ShortTerm => 1.25,
        _ => 1.6,
    };

    /// <summary>k_h = min((150 mm/h)^0.2, 1.3), depth factor on bending.</summary>
    /// <param name="depth">h, thickness of the plank in the direction of the water [m], > 0.</param>
    /// <param name="density">ρ_k [kg/m³], or null where unknown.</param>
    /// <returns>k_h [-]; 1 from 150 mm on, and where ρ_k is unknown or above 700 kg/m³.</returns>
    /// <remarks>Source: EN 1995-1-1, 3.2(3).</remarks>
    public static double Depth(double depth, double? density)
    {
        Guard.Positive(depth);
        return depth < ReferenceDepth && density <= HeaviestForDepth ? Math.Min(Math.Pow(ReferenceDepth / depth, 0.2), 1.3) : 1;
    }

    /// <summary>C_M, wet service factor on bending.</summary>
    /// <param name="reference">F_b, reference value [Pa], > 0.</param>
    /// <param name="sizeFactor">C_F [-], > 0.</param>
    /// <param name="least">Least size of the plank [m], > 0.</param>
    /// <returns>0.85 for dimension lumber above 1150 psi, else 1 [-].</returns>
    /// <remarks>Source: NDS Supplement, Table 4A (read) and 4D (from memory).</remarks>
    public static double WetBending(double reference, double sizeFactor, double least) =>
        least < TimberSize && reference * sizeFactor > WetBendingLimit ? 0.85 : 1;

    /// <summary>C_M, wet service factor on shear along the grain.</summary>
    /// <param name="least">Least size of the plank [m], > 0.</param>
    /// <returns>0.97 for dimension lumber, 1 for timbers [-].</returns>
    /// <remarks>Source: NDS Supplement, Table 4A (read) and 4D (from memory).</remarks>
    public static double WetShear(double least) => least < TimberSize ? 0.97 : 1;
}
