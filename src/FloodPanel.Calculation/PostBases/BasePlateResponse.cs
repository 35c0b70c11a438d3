namespace FloodPanel.Calculation.PostBases;

/// <summary>How a plate stands under its force and moment.</summary>
public enum BearingKind
{
    /// <summary>The concrete alone balances a small eccentricity; no rod pulls.</summary>
    NoTension,

    /// <summary>A stress block under one edge and the rods of the other side.</summary>
    StressBlock,

    /// <summary>Uplift: nothing presses on the concrete, all rods pull.</summary>
    AllTension,
}

/// <summary>What a base plate hands to the concrete and to its rods, at the level of the forces given.</summary>
/// <param name="Kind">How the plate stands.</param>
/// <param name="Bearing">f_p, pressure under the block [Pa]; 0 where nothing bears.</param>
/// <param name="BearingStrength">f_max, greatest design pressure [Pa].</param>
/// <param name="BlockLength">Y, length of the block from the edge [m]; 0 where nothing bears.</param>
/// <param name="Tension">T, of all rods in the row that pulls more [N], ≥ 0.</param>
/// <param name="OtherTension">Of all rods in the other row [N], ≥ 0; not zero only where all rods pull.</param>
/// <param name="ShearPerRod">V over the rods of both rows [N].</param>
/// <param name="IsBalanced">
/// False when no block of the design pressure balances the moment: the plate fails, and <paramref name="Tension"/> is what a block up to the
/// rods would ask for at a pressure above the strength.
/// </param>
public readonly record struct BasePlateResponse(
    BearingKind Kind,
    double Bearing,
    double BearingStrength,
    double BlockLength,
    double Tension,
    double OtherTension,
    double ShearPerRod,
    bool IsBalanced);
