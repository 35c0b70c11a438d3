namespace FloodPanel.Calculation.Actions;

/// <summary>One physical cause of load.</summary>
public enum ActionKind
{
    /// <summary>Still water on both sides.</summary>
    Hydrostatic,

    /// <summary>Moving water.</summary>
    Flow,

    /// <summary>Waves.</summary>
    Wave,

    /// <summary>Floating debris.</summary>
    Debris,

    /// <summary>Wind.</summary>
    Wind,

    /// <summary>A line load.</summary>
    Line,
}

/// <summary>
/// A band of height over which the pressure is p(z) = <paramref name="AtZero"/> + <paramref name="Gradient"/>·z, z
/// upward from the sill, positive towards the protected side.
/// </summary>
/// <param name="Bottom">Lower end of the band [m].</param>
/// <param name="Top">Upper end of the band [m].</param>
/// <param name="AtZero">The line's value at z = 0 [Pa].</param>
/// <param name="Gradient">dp/dz [Pa/m].</param>
/// <param name="Factor">Load factor of the design basis on this piece [-].</param>
public readonly record struct PressurePiece(double Bottom, double Top, double AtZero, double Gradient, double Factor)
{
    /// <summary>Unfactored pressure at a height [Pa]; 0 outside the band.</summary>
    /// <param name="z">Height above the sill [m].</param>
    public double At(double z) => z >= Bottom && z <= Top ? AtZero + Gradient * z : 0;
}
