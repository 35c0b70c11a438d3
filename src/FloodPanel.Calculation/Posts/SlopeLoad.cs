using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Posts;

/// <summary>The load on a post along its slope distance s: the diagram over its tributary width, and a force. Design or unfactored.</summary>
/// <param name="Diagram">Pressure over height z = s·cos θ.</param>
/// <param name="Force">A force on the post.</param>
/// <param name="Tributary">b_t [m].</param>
/// <param name="CosRake">cos θ [-].</param>
/// <param name="IsDesign">True with the factors of the design basis.</param>
public readonly record struct SlopeLoad(
    PressureDiagram Diagram, ConcentratedForce Force, double Tributary, double CosRake, bool IsDesign)
{
    /// <summary>s of the force [m].</summary>
    public double ForceAt => Force.Height / CosRake;

    /// <summary>∫q·sⁿ ds of n = 0, 1, 2, 3 over a part of the post; the force counts where it stands at its start or within.</summary>
    /// <param name="from">Lower end, along the post [m].</param>
    /// <param name="to">Upper end, along the post [m].</param>
    public LoadMoments Between(double from, double to)
    {
        var sum = default(LoadMoments);
        foreach (ref readonly var piece in Diagram.Pieces)
        {
            var part = piece.Within(from * CosRake, to * CosRake);
            if (part.Height > 0)
            {
                var scale = (IsDesign ? piece.Factor : 1) * Tributary / CosRake;
                sum += new LoadMoments(
                    scale * part.Force,
                    scale * part.FirstMoment / CosRake,
                    scale * part.SecondMoment / (CosRake * CosRake),
                    scale * part.ThirdMoment / (CosRake * CosRake * CosRake));
            }
        }

        var force = IsDesign ? Force.Design : Force.Characteristic;
        var at = ForceAt;
        return force != 0 && at >= from && at < to
            ? sum + new LoadMoments(force, force * at, force * at * at, force * at * at * at)
            : sum;
    }
}

/// <summary>∫q·sⁿ ds over a part of a post.</summary>
/// <param name="Zero">∫q ds [N].</param>
/// <param name="First">∫q·s ds [N·m].</param>
/// <param name="Second">∫q·s² ds [N·m²].</param>
/// <param name="Third">∫q·s³ ds [N·m³].</param>
public readonly record struct LoadMoments(double Zero, double First, double Second, double Third)
{
    /// <summary>Both parts together.</summary>
    public static LoadMoments operator +(LoadMoments a, LoadMoments b) =>
        new(a.Zero + b.Zero, a.First + b.First, a.Second + b.Second, a.Third + b.Third);
}
