namespace FloodPanel.Calculation.Actions;

/// <summary>Still water: p(z) = γ·max(0, h − z) on the flood side, less the same of the protected side.</summary>
public static class Hydrostatic
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Hydrostatics, first principles";

    /// <summary>γ = ρ·g, unit weight of water [N/m³].</summary>
    /// <param name="density">ρ, water density [kg/m³], 990 to 1400.</param>
    /// <exception cref="ArgumentOutOfRangeException">The density is out of range.</exception>
    public static double UnitWeight(double density)
    {
        Guard.InRange(density, 990, 1400);

        return density * Physics.Gravity;
    }

    /// <summary>Pressure of still water on one side over the height of the barrier.</summary>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <param name="depth">h, still-water depth above the sill [m]; nothing acts when it is not above zero.</param>
    /// <param name="height">H, vertical height of the barrier [m], > 0; over its top the diagram is a trapezoid.</param>
    /// <param name="factor">γ_F, load factor [-].</param>
    /// <returns>The piece, positive towards the side without this water; of no height without water.</returns>
    /// <remarks>
    /// Source: p = γ·(h − z), first principles. Limits: still water; the draw-down of water flowing over the top is
    /// ignored, which is safe.
    /// </remarks>
    public static PressurePiece Side(double unitWeight, double depth, double height, double factor)
    {
        var top = Math.Max(0, Math.Min(depth, height));
        return new(0, top, unitWeight * depth, unitWeight * (depth - top), factor);
    }

    internal static PressurePiece Opposite(this PressurePiece piece) =>
        piece with { AtBottom = -piece.AtBottom, AtTop = -piece.AtTop };
}
