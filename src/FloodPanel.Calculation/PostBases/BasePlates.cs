using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>Equilibrium of a base plate under axial force and moment: rectangular stress block against the rods of the other side.</summary>
public static class BasePlates
{
    /// <summary>Source of the equilibrium, as printed.</summary>
    public const string Source = "AISC Design Guide 1, 3rd ed., 4.3 (stress block)";

    /// <summary>What a plate hands to the concrete and to its rods.</summary>
    /// <param name="plate">The plate, without problems.</param>
    /// <param name="axial">P, axial force of the post [N]; compression positive, uplift negative.</param>
    /// <param name="moment">M, moment about the axis across the opening [N·m]; its sign does not matter.</param>
    /// <param name="shear">V, shear force [N]; its sign does not matter.</param>
    /// <param name="basis">The design basis; the forces stand at its level.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite, or the plate has problems.</exception>
    /// <remarks>
    /// q = f_max·B, e = M/P, e_crit = N/2 − P/(2q). e ≤ e_crit: Y = N − 2e, f_p = P/(B·Y), no tension. Else
    /// Y = (f + N/2) − √((f + N/2)² − 2(M + P·f)/q), T = q·Y − P, which holds for pure moment and for uplift too. Uplift with e ≤ f:
    /// all rods pull, T = |P|/2 + M/(2f). Source: AISC Design Guide 1, 3rd ed., equations 4-32, 4-42 to 4-67; under the Eurocode basis the same block
    /// at the design bearing strength of EN 1993-1-8. Limits: a plate that stays plane, rods in two rows at ±f.
    /// </remarks>
    public static BasePlateResponse Respond(BasePlateInput plate, double axial, double moment, double shear, DesignBasis basis)
    {
        Guard.Finite(axial);
        Guard.Finite(moment);
        Guard.Finite(shear);
        Guard.Positive(plate.RodDistance);

        var strength = ConcreteBearing.Strength(plate.ConcreteStrength, plate.AreaRatio, basis.Kind);
        var turning = Math.Abs(moment);
        var aboutRods = turning + axial * plate.RodDistance;
        var start = new BasePlateResponse(
            BearingKind.StressBlock, 0, strength, 0, 0, 0, Math.Abs(shear) / (2 * plate.RodsPerRow), IsBalanced: true);
        if (axial < 0 && aboutRods <= 0)
        {
            var (share, couple) = (-axial / 2, turning / (2 * plate.RodDistance));
            return start with { Kind = BearingKind.AllTension, Tension = share + couple, OtherTension = share - couple };
        }

        var perLength = strength * plate.Width;
        if (axial > 0 && turning / axial <= plate.Length / 2 - axial / (2 * perLength))
        {
            var length = plate.Length - 2 * turning / axial;
            return start with { Kind = BearingKind.NoTension, BlockLength = length, Bearing = axial / (plate.Width * length) };
        }

        return Block(start, plate, axial, aboutRods, perLength);
    }

    private static BasePlateResponse Block(BasePlateResponse start, BasePlateInput plate, double axial, double aboutRods, double perLength)
    {
        var reach = plate.RodDistance + plate.Length / 2;
        var root = reach * reach - 2 * aboutRods / perLength;
        if (root < 0)
        {
            var pressed = aboutRods / (reach / 2);
            return start with
            {
                BlockLength = reach,
                Bearing = pressed / (plate.Width * reach),
                Tension = Math.Max(0, pressed - axial),
                IsBalanced = false,
            };
        }

        // Y as the quotient: no digits cancel when the block is short.
        var length = 2 * aboutRods / perLength / (reach + Math.Sqrt(root));
        return start with
        {
            BlockLength = length,
            Bearing = length > 0 ? start.BearingStrength : 0,
            Tension = Math.Max(0, perLength * length - axial),
        };
    }

    /// <summary>Length of a triangular bearing block, greatest pressure at the edge of the plate.</summary>
    /// <param name="pressure">f_p, pressure at the edge [Pa], > 0.</param>
    /// <param name="width">B [m], > 0.</param>
    /// <param name="rodsToEdge">N', from the rods to the edge that presses [m], > 0.</param>
    /// <param name="rodsToMiddle">A', from the rods to the middle of the plate [m].</param>
    /// <param name="axial">P, compression positive [N].</param>
    /// <param name="moment">M [N·m], ≥ 0.</param>
    /// <returns>A [m]; null when no triangle of that pressure balances the moment. The rods pull f_p·A·B/2 − P.</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// f' = f_p·B·N'/2, A = (f' − √(f'² − 4·(f_p·B/6)·(P·A' + M)))/(f_p·B/3). Source: AISC Design Guide 1, 2nd ed. (2006), appendix B;
    /// the equation is rebuilt from moments about the rods.
    /// </remarks>
    public static double? TriangularLength(
        double pressure, double width, double rodsToEdge, double rodsToMiddle, double axial, double moment)
    {
        Guard.Positive(pressure);
        Guard.Positive(width);
        Guard.Positive(rodsToEdge);
        Guard.Finite(axial);
        Guard.NonNegative(moment);

        var whole = pressure * width * rodsToEdge / 2;
        var root = whole * whole - 4 * (pressure * width / 6) * (axial * rodsToMiddle + moment);
        return root < 0 ? null : (whole - Math.Sqrt(root)) / (pressure * width / 3);
    }
}
