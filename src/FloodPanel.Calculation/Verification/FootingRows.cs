using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Verification;

/// <summary>Pressure under a footing, and the creep ratios of the ground.</summary>
internal static class FootingRows
{
    private const string Base = "Base of 1.2 m under 40 kN/m";
    private const string Lane = "Lane's weighted creep ratio (1935)";

    public static IEnumerable<VerificationRow> Rows()
    {
        var whole = BearingPressure.Of(40e3, distance: 0.6 - 6.0 / 40, width: 1.2);
        var part = BearingPressure.Of(40e3, distance: 0.6 - 12.0 / 40, width: 1.2);
        return
        [
            new(Base, "moment 6 kN·m/m: greatest pressure", "kPa", "58.3", whole.Greatest / 1e3, Evidence.Derived),
            new(Base, "least pressure", "kPa", "8.3", whole.Least / 1e3, Evidence.Derived),
            new(Base, "moment 12 kN·m/m: greatest pressure", "kPa", "88.9", part.Greatest / 1e3, Evidence.Derived),
            new(Base, "width in contact", "m", "0.90", part.Contact, Evidence.Derived),
            new(Lane, "very fine sand or silt: least weighted creep ratio", "", "8.5", LaneCreep.Least(CreepSoil.VeryFineSandOrSilt), Evidence.Secondary),
            new(Lane, "hardpan: least weighted creep ratio", "", "1.6", LaneCreep.Least(CreepSoil.Hardpan), Evidence.Secondary),
        ];
    }
}
