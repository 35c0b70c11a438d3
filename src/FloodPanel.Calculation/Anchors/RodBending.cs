namespace FloodPanel.Calculation.Anchors;

/// <summary>An anchor rod that carries its shear by bending between a welded washer and the concrete.</summary>
/// <param name="ShearStress">f_v [Pa].</param>
/// <param name="Bending">M [N·m].</param>
/// <param name="BendingStress">f_b [Pa].</param>
/// <param name="AxialStress">f_a [Pa].</param>
/// <param name="Allowed">F'_nt, available tensile stress beside that shear, factored [Pa].</param>
public readonly record struct RodBending(double ShearStress, double Bending, double BendingStress, double AxialStress, double Allowed)
{
    /// <summary>Source, as printed.</summary>
    public const string Source = "AISC Design Guide 1, 3rd ed., Example 4.7-6; AISC 360, J3.7";

    /// <summary>φ of AISC 360, J3 [-].</summary>
    public const double ResistanceFactor = 0.75;

    /// <summary>f_a + f_b [Pa].</summary>
    public double Total => AxialStress + BendingStress;

    /// <summary>The stresses in a rod.</summary>
    /// <param name="tension">N_u, of one rod [N], ≥ 0.</param>
    /// <param name="shear">V_u, of one rod [N], ≥ 0.</param>
    /// <param name="diameter">d [m], > 0.</param>
    /// <param name="plate">Thickness of the plate [m], > 0.</param>
    /// <param name="washer">Thickness of the welded washer [m], ≥ 0.</param>
    /// <param name="ultimate">F_u [Pa], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range.</exception>
    /// <remarks>
    /// Lever (t + t_w/2)/2, Z = d³/6, areas of the full shank; F'_nt = 1.3·F_nt − F_nt·f_v/(φ·F_nv) ≤ F_nt, F_nt = 0.75·F_u, F_nv = 0.45·F_u.
    /// </remarks>
    public static RodBending Of(double tension, double shear, double diameter, double plate, double washer, double ultimate)
    {
        Guard.NonNegative(tension);
        Guard.NonNegative(shear);
        Guard.Positive(diameter);
        Guard.Positive(plate);
        Guard.NonNegative(washer);
        Guard.Positive(ultimate);

        var area = Math.PI * diameter * diameter / 4;
        var moment = shear * (plate + washer / 2) / 2;
        var stress = shear / area;
        var (nominal, inShear) = (0.75 * ultimate, 0.45 * ultimate);
        var beside = Math.Min(nominal, 1.3 * nominal - nominal * stress / (ResistanceFactor * inShear));
        return new(stress, moment, moment / (diameter * diameter * diameter / 6), tension / area, ResistanceFactor * beside);
    }
}
