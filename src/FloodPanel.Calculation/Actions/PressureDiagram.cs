namespace FloodPanel.Calculation.Actions;

/// <summary>A load with and without the factors of the design basis.</summary>
/// <param name="Characteristic">Unfactored.</param>
/// <param name="Design">Factored.</param>
public readonly record struct FactoredLoad(double Characteristic, double Design);

/// <summary>
/// The pressure of one load case over the height of the barrier, as pieces that add up where they overlap. Every
/// resultant, log load and post load is an integral of this one object. z is upward from the sill.
/// </summary>
public sealed class PressureDiagram
{
    private PressurePiece[] pieces;
    private int count;

    /// <summary>An empty diagram.</summary>
    /// <param name="capacity">Pieces that it takes before it must grow [-].</param>
    public PressureDiagram(int capacity = 8) => pieces = new PressurePiece[capacity];

    /// <summary>A diagram of the given pieces.</summary>
    /// <param name="pieces">The pieces; those of no height or no pressure are left out.</param>
    public static PressureDiagram Of(params ReadOnlySpan<PressurePiece> pieces)
    {
        var diagram = new PressureDiagram(pieces.Length);
        foreach (var piece in pieces)
        {
            diagram.Add(piece);
        }

        return diagram;
    }

    /// <summary>The pieces, in the order in which their actions were added.</summary>
    public ReadOnlySpan<PressurePiece> Pieces => pieces.AsSpan(0, count);

    /// <summary>R, unfactored ∫p dz [N/m].</summary>
    public double Force
    {
        get
        {
            var sum = 0.0;
            foreach (ref readonly var piece in Pieces)
            {
                sum += piece.Force;
            }

            return sum;
        }
    }

    /// <summary>z_R, height of the unfactored resultant above the sill [m]; null when the resultant is zero.</summary>
    public double? CentreOfPressure => CentreWithin(double.NegativeInfinity, double.PositiveInfinity);

    /// <summary>Unfactored pressure at a height [Pa]. At a step both sides count: ask just above or below it.</summary>
    /// <param name="z">Height above the sill [m].</param>
    public double At(double z)
    {
        var sum = 0.0;
        foreach (ref readonly var piece in Pieces)
        {
            sum += piece.At(z);
        }

        return sum;
    }

    /// <summary>Factored pressure at a height [Pa]. At a step both sides count: ask just above or below it.</summary>
    /// <param name="z">Height above the sill [m].</param>
    public double DesignAt(double z)
    {
        var sum = 0.0;
        foreach (ref readonly var piece in Pieces)
        {
            sum += piece.Factor * piece.At(z);
        }

        return sum;
    }

    /// <summary>∫p dz over a band of height, without and with factors [N/m].</summary>
    /// <param name="bottom">Lower end [m].</param>
    /// <param name="top">Upper end [m].</param>
    public FactoredLoad Within(double bottom, double top)
    {
        var (characteristic, design) = (0.0, 0.0);
        foreach (ref readonly var piece in Pieces)
        {
            if (piece.Bottom < top && piece.Top > bottom)
            {
                var force = piece.Within(bottom, top).Force;
                characteristic += force;
                design += piece.Factor * force;
            }
        }

        return new(characteristic, design);
    }

    /// <summary>Height of the unfactored resultant of a band above the sill [m]; null when that is zero.</summary>
    /// <param name="bottom">Lower end [m].</param>
    /// <param name="top">Upper end [m].</param>
    public double? CentreWithin(double bottom, double top)
    {
        var (force, moment) = (0.0, 0.0);
        foreach (ref readonly var piece in Pieces)
        {
            var part = piece.Within(bottom, top);
            force += part.Force;
            moment += part.FirstMoment;
        }

        return force == 0 ? null : moment / force;
    }

    internal void Clear() => count = 0;

    internal void Add(in PressurePiece piece)
    {
        if (!(piece.Height > 0) || (piece.AtBottom == 0 && piece.AtTop == 0))
        {
            return;
        }

        if (count == pieces.Length)
        {
            Array.Resize(ref pieces, 2 * count + 1);
        }

        pieces[count++] = piece;
    }
}
