using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>The table of load factors, written down a second time from the standards.</summary>
/// <remarks>
/// ASCE 7-16, 2.4.2 (1.5 in coastal zones) and 2.3.2 (2.0 in coastal zones; 1.4 on a fluid of known greatest height);
/// EN 1990 (from memory): 1.5 variable, 1.0 favourable, 1.35 where geometry limits the level.
/// </remarks>
internal static class HandFactors
{
    public static (double FloodSide, double ProtectedSide, double BrimFull) Of(DesignBasisKind basis, FloodZone zone) =>
        (basis, zone) switch
        {
            (DesignBasisKind.AllowableStress, FloodZone.Inland) => (1.0, 1.0, 1.0),
            (DesignBasisKind.AllowableStress, FloodZone.CoastalA) => (1.5, 1.5, 1.5),
            (DesignBasisKind.AllowableStress, FloodZone.CoastalHighHazard) => (1.5, 1.5, 1.5),
            (DesignBasisKind.UsStrength, FloodZone.Inland) => (1.0, 1.0, 1.4),
            (DesignBasisKind.UsStrength, FloodZone.CoastalA) => (2.0, 2.0, 2.0),
            (DesignBasisKind.UsStrength, FloodZone.CoastalHighHazard) => (2.0, 2.0, 2.0),
            (DesignBasisKind.Eurocode, _) => (1.5, 1.0, 1.35),
            _ => throw new ArgumentOutOfRangeException(nameof(basis), basis, "has no row here"),
        };
}
