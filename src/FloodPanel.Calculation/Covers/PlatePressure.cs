namespace FloodPanel.Calculation.Covers;

/// <summary>Pressure on a plate that grows straight with depth: p(x) = p_t + k·max(0, x − c), x down from the upper edge.</summary>
/// <param name="AtTop">p_t, at the upper edge [Pa], ≥ 0; 0 where the water line crosses the plate.</param>
/// <param name="Start">c, where the pressure begins to grow [m], ≥ 0: the water line, or the upper edge.</param>
/// <param name="Rise">k, growth with depth [Pa/m], ≥ 0.</param>
public readonly record struct PlatePressure(double AtTop, double Start, double Rise)
{
    /// <summary>The same pressure all over.</summary>
    /// <param name="pressure">p [Pa], ≥ 0.</param>
    public static PlatePressure Uniform(double pressure) => new(pressure, 0, 0);

    /// <summary>Still water on a plate that stands upright.</summary>
    /// <param name="unitWeight">γ [N/m³], > 0.</param>
    /// <param name="depthOfTop">Depth of the upper edge below the water [m]; negative where it stands above it.</param>
    /// <remarks>Source: p = γ·depth, first principles; nothing acts above the water.</remarks>
    public static PlatePressure Water(double unitWeight, double depthOfTop) =>
        new(unitWeight * Math.Max(0, depthOfTop), Math.Max(0, -depthOfTop), unitWeight);

    /// <summary>p at a distance below the upper edge [Pa].</summary>
    /// <param name="x">Distance [m].</param>
    public double At(double x) => AtTop + Rise * Math.Max(0, x - Start);

    /// <summary>Growth at a distance below the upper edge [Pa/m].</summary>
    /// <param name="x">Distance [m].</param>
    internal double RiseAt(double x) => x >= Start ? Rise : 0;
}

/// <summary>How an edge of a plate is held.</summary>
public enum PlateEdge
{
    /// <summary>It cannot move, but turns; corners are held down.</summary>
    Supported,

    /// <summary>Nothing holds it.</summary>
    Free,
}

/// <summary>Bending and twisting moments per width at a place of a plate [N·m/m]; positive bending pulls on the side away from the pressure.</summary>
/// <param name="Down">M_x, bends a strip that runs up and down; on a circle that of a radius.</param>
/// <param name="Across">M_y, bends a strip that runs across; on a circle that of a ring.</param>
/// <param name="Twist">M_xy.</param>
public readonly record struct PlateMoments(double Down, double Across, double Twist)
{
    /// <summary>The greater of the principal moments, whichever its sign [N·m/m], ≥ 0.</summary>
    public double Greatest => Math.Abs(Down + Across) / 2 + Math.Sqrt((Down - Across) * (Down - Across) / 4 + Twist * Twist);
}

/// <summary>What a plate feels under a pressure, and what its edges pass on.</summary>
/// <param name="Moment">M, greatest principal moment per width [N·m/m].</param>
/// <param name="MomentDown">Where it acts, below the upper edge [m].</param>
/// <param name="MomentAcross">Where it acts, from the left edge [m].</param>
/// <param name="Bulge">D·w, greatest deflection times stiffness [N·m²].</param>
/// <param name="Reaction">r, greatest reaction of an edge [N/m].</param>
/// <param name="CornerHold">R, greatest force that holds a corner down, with the pressure [N], ≥ 0; 0 for a circle.</param>
/// <param name="CornerPush">R_p, greatest force by which a corner beside a free edge holds against the pressure [N], ≥ 0; 0 without one.</param>
/// <param name="EdgeMoment">m, greatest fixing moment of an edge [N·m/m], ≥ 0; 0 where it turns.</param>
public sealed record PlateResponse(
    double Moment, double MomentDown, double MomentAcross, double Bulge, double Reaction, double CornerHold, double CornerPush, double EdgeMoment);
