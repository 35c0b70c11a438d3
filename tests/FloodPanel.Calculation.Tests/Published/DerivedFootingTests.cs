using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// A derived example without a published counterpart: N 40 kN/m on a base of 1.2 m. Moment 6 kN·m/m: e 0.15 m, within the
/// middle third, 58.3 and 8.3 kPa. Moment 12 kN·m/m: e 0.30 m, 88.9 kPa over 0.90 m, three quarters of the base.
/// </summary>
public class DerivedFootingTests
{
    [Theory]
    [InlineData(6, 58.3, 8.3, 1.2)]
    [InlineData(12, 88.9, 0, 0.9)]
    public void BearingPressure_FortyKilonewtons_AsDerived(double moment, double greatest, double least, double contact)
    {
        var pressure = BearingPressure.Of(40e3, distance: 0.6 - moment / 40, width: 1.2);

        Assert.Equal(greatest, pressure.Greatest / 1000, tolerance: 0.05);
        Assert.Equal(least, pressure.Least / 1000, tolerance: 0.05);
        Assert.Equal(contact, pressure.Contact, tolerance: 0.005);
    }

    /// <summary>Lane's ratios, from a secondary source: 8.5 for the finest sand down to 1.6 for hardpan.</summary>
    [Fact]
    public void LaneCreep_FirstAndLastGround_AsPublished()
    {
        Assert.Equal(8.5, LaneCreep.Least(CreepSoil.VeryFineSandOrSilt));
        Assert.Equal(1.6, LaneCreep.Least(CreepSoil.Hardpan));
    }
}
