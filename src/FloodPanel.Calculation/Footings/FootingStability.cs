using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Footings;

/// <summary>What pushes on a footing: unfactored, over its whole length. Heights from the sill.</summary>
/// <param name="Length">ℓ, length of the footing along the barrier [m], > 0.</param>
/// <param name="Horizontal">H_0, horizontal force of the barrier [N], ≥ 0.</param>
/// <param name="Moment">M_0, its moment about the sill [N·m], ≥ 0.</param>
/// <param name="UnitWeight">γ, unit weight of water [N/m³], > 0.</param>
/// <param name="Depth">h, water above the sill on the flood side [m], ≥ 0; 0 means dry ground.</param>
/// <param name="Behind">h′, water above the sill on the protected side [m], 0 to h.</param>
public readonly record struct FootingLoad(
    double Length, double Horizontal, double Moment, double UnitWeight, double Depth, double Behind);

/// <summary>
/// A footing under its barrier: forces and moments about the toe, its lower edge on the protected side. The uplift
/// falls in a straight line from the full head at the flood edge to the tailwater at the toe; where the base has
/// lifted off, the full head stands in the gap. Ground above the base is taken to push alike on both sides and to
/// hold nothing; the weight of the barrier is left out, which is safe.
/// </summary>
/// <param name="Load">What pushes.</param>
/// <param name="Contact">c, width of base in contact [m]; 0 when it overturns or floats.</param>
/// <param name="Weight">W, weight of the footing [N].</param>
/// <param name="WaterOnHeel">W_h, water on it before the barrier [N].</param>
/// <param name="WaterOnToe">W_t, water on it behind the barrier [N].</param>
/// <param name="Uplift">U, water pressure on the base [N].</param>
/// <param name="UpliftMoment">M_U, its moment about the toe [N·m].</param>
/// <param name="Driving">H, horizontal force with the water on the side of the footing [N].</param>
/// <param name="Overturning">M_o, overturning moment about the toe, uplift included [N·m].</param>
/// <param name="Resisting">M_r, resisting moment about the toe [N·m].</param>
public sealed record FootingStability(
    FootingLoad Load,
    double Contact,
    double Weight,
    double WaterOnHeel,
    double WaterOnToe,
    double Uplift,
    double UpliftMoment,
    double Driving,
    double Overturning,
    double Resisting)
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Statics about the toe; uplift along the base and over an open gap, USACE EM 1110-2-2100";

    private const int MostIterations = 2000;

    /// <summary>N, vertical force on the ground [N]; negative when the footing floats.</summary>
    public double Vertical => Weight + WaterOnHeel + WaterOnToe - Uplift;

    /// <summary>x, from the toe to the resultant [m]; meaningless unless <see cref="Vertical"/> is above zero.</summary>
    public double ResultantFromToe => Vertical > 0 ? (Resisting - Overturning) / Vertical : 0;

    /// <summary>The footing in equilibrium: as much base in contact as the resultant and the uplift allow.</summary>
    /// <param name="footing">A footing without problems, see <see cref="Validation"/>.</param>
    /// <param name="load">What pushes.</param>
    /// <remarks>
    /// A gap raises the uplift, which widens the gap: the contact is narrowed until it stands, from the whole base down, which
    /// finds the widest that does; where none does, none is in contact.
    /// </remarks>
    public static FootingStability Of(FootingInput footing, FootingLoad load)
    {
        var contact = footing.Width;
        for (var i = 0; i < MostIterations; i++)
        {
            var state = At(footing, load, contact);
            if (!(state.Vertical > 0) || !(state.ResultantFromToe > 0))
            {
                return At(footing, load, 0);
            }

            var next = Math.Min(footing.Width, 3 * state.ResultantFromToe);
            if (next >= contact - 1e-12 * footing.Width)
            {
                return state;
            }

            contact = next;
        }

        return At(footing, load, 0);
    }

    private static FootingStability At(FootingInput footing, FootingLoad load, double contact)
    {
        var (width, thick, edge, length) = (footing.Width, footing.Thickness, footing.BarrierFromFloodEdge, load.Length);
        var (depth, behind, unit) = (load.Depth, load.Behind, load.UnitWeight);
        var isWet = depth > 0;
        var atEdge = isWet ? unit * (depth + thick) : 0;
        var atToe = isWet ? unit * (behind + thick) : 0;
        var gap = width - contact;
        var uplift = length * (atEdge * gap + (atEdge + atToe) / 2 * contact);
        var upliftMoment = length * (atEdge * gap * (contact + gap / 2) + contact * contact * (atToe / 6 + atEdge / 3));
        var weight = footing.Density * Physics.Gravity * width * thick * length;
        var onHeel = unit * depth * edge * length;
        var onToe = unit * behind * (width - edge) * length;
        var side = unit * (depth - behind) * thick * length;
        return new(
            load, contact, weight, onHeel, onToe, uplift, upliftMoment,
            Driving: load.Horizontal + side,
            Overturning: load.Moment + load.Horizontal * thick + side * thick / 2 + upliftMoment,
            Resisting: weight * width / 2 + onHeel * (width - edge / 2) + onToe * (width - edge) / 2);
    }
}
