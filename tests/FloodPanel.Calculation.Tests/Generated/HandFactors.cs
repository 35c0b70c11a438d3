using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>The table of load factors, written down a second time from the standards.</summary>
/// <remarks>
/// ASCE 7-16, 2.4.2 (1.5 in coastal zones) and 2.3.2 (2.0 in coastal zones; 1.4 on a fluid of known greatest height;
/// 1.6 on a live load, 1.0 on wind); EN 1990 (from memory): 1.5 variable, 1.0 favourable, 1.35 where geometry limits the
/// level, 1.0 on every action in an accidental situation.
/// </remarks>
internal static class HandFactors
{
    public static LoadFactors Of(DesignBasisKind basis, FloodZone zone) =>
        (basis, zone) switch
        {
            (DesignBasisKind.AllowableStress, FloodZone.Inland) => new(1.0, 1.0, 1.0, 1.0, 1.0, 1.0),
            (DesignBasisKind.AllowableStress, _) => new(1.5, 1.5, 1.5, 1.5, 1.0, 1.0),
            (DesignBasisKind.UsStrength, FloodZone.Inland) => new(1.0, 1.0, 1.4, 1.0, 1.0, 1.6),
            (DesignBasisKind.UsStrength, _) => new(2.0, 2.0, 2.0, 2.0, 1.0, 1.6),
            (DesignBasisKind.Eurocode, _) => new(1.5, 1.0, 1.35, 1.0, 1.5, 1.5),
            _ => throw new ArgumentOutOfRangeException(nameof(basis), basis, "has no row here"),
        };
}
