using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>Bending of a base plate beside the post, and the thickness that it needs.</summary>
public static class PlateBending
{
    /// <summary>Part of the outer size of a post that holds the plate: depth of any shape, and width of a tube or bar [-].</summary>
    private const double HeldPart = 0.95;

    /// <summary>The same for the flange width of an I-section [-].</summary>
    private const double HeldFlange = 0.80;

    /// <summary>l, longest overhang of a plate beyond the post.</summary>
    /// <param name="plate">The plate, no smaller than the post.</param>
    /// <param name="post">The profile of the post.</param>
    /// <returns>l = max(m, n) [m], m = (N − 0.95·d)/2, n = (B − 0.80·b)/2 for an I-section, (B − 0.95·b)/2 else.</returns>
    /// <remarks>Source: AISC Design Guide 1, 3rd ed., 4.3; the longer overhang in both directions (2nd ed., 3.3, from memory).</remarks>
    public static double Overhang(BasePlateInput plate, Profile post) => Math.Max(
        (plate.Length - HeldPart * post.Depth) / 2,
        (plate.Width - (post is ISection ? HeldFlange : HeldPart) * post.Height) / 2);

    /// <summary>Moment per width of the plate where the concrete presses.</summary>
    /// <param name="pressure">f_p [Pa], ≥ 0.</param>
    /// <param name="block">Y, length of the block [m], ≥ 0.</param>
    /// <param name="overhang">l [m], ≥ 0.</param>
    /// <returns>f_p·l²/2 when the block reaches to the post, else f_p·Y·(l − Y/2) [N·m per m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is negative or not finite.</exception>
    public static double PressedMoment(double pressure, double block, double overhang)
    {
        Guard.NonNegative(pressure);
        Guard.NonNegative(block);
        Guard.NonNegative(overhang);

        return block >= overhang ? pressure * overhang * overhang / 2 : pressure * block * (overhang - block / 2);
    }

    /// <summary>x, from the rods to the middle of the flange or wall that pulls.</summary>
    /// <param name="rodDistance">f [m].</param>
    /// <param name="depth">d, depth of the post [m].</param>
    /// <param name="flange">t_f, thickness of flange, face or wall [m]; 0 for a bar.</param>
    public static double PulledLever(double rodDistance, double depth, double flange) => rodDistance - depth / 2 + flange / 2;

    /// <summary>Width of plate that bends with the rods: 45° each side of each rod, no more than the plate.</summary>
    /// <param name="width">B [m].</param>
    /// <param name="lever">x [m].</param>
    /// <param name="rods">Rods in the row [-].</param>
    /// <remarks>Source: AISC Design Guide 1, 3rd ed., Example 4.7-3.</remarks>
    public static double PulledWidth(double width, double lever, int rods) => Math.Min(width, 2 * lever * rods);

    /// <summary>Thickness that a plate needs at its plastic moment, t = √(4·m/f).</summary>
    /// <param name="moment">m, moment per width [N·m per m], ≥ 0.</param>
    /// <param name="stress">f, design stress of the plate [Pa], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: AISC Design Guide 1, 3rd ed., 4.3, whose factors 1.49, 1.83, 2.11 and 2.58 are √2/√0.9, √(2·1.67), √4/√0.9 and √(4·1.67).</remarks>
    public static double PlasticThickness(double moment, double stress) => Thickness(4, moment, stress);

    /// <summary>Thickness that a plate needs at its elastic moment, t = √(6·m/f).</summary>
    /// <param name="moment">m, moment per width [N·m per m], ≥ 0.</param>
    /// <param name="stress">f, design stress of the plate [Pa], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: EN 1993-1-8, 6.2.5(4), spread c = t·√(f_y/(3·f_jd·γ_M0)) solved for t (from memory).</remarks>
    public static double ElasticThickness(double moment, double stress) => Thickness(6, moment, stress);

    private static double Thickness(double factor, double moment, double stress)
    {
        Guard.NonNegative(moment);
        Guard.Positive(stress);

        return Math.Sqrt(factor * moment / stress);
    }
}
