using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Guides;

/// <summary>The guide cut free of its wall: forces along and across the wall and moments about the fasteners balance.</summary>
public class GuideStaticsTests
{
    /// <summary>Load 60 mm, strip 40 mm from the fasteners; worked by hand for a load of 10.</summary>
    [Theory]
    [InlineData(GuideMounting.WetFace, 5, 0, 15)] // about the strip: T·40 = 10·20; C = 10 + 5
    [InlineData(GuideMounting.DryFace, 25, 0, 15)] // about the strip: T·40 = 10·100; C = 25 − 10
    [InlineData(GuideMounting.Reveal, 15, 10, 15)] // couple: T·40 = 10·60; C = T
    public void Of_LoadBeyondTheStrip_ByHand(GuideMounting mounting, double tension, double shear, double bearing)
    {
        var statics = GuideStatics.Of(mounting, 0.06, 0.04);

        Hand.Equal(tension, 10 * statics.Tension);
        Hand.Equal(shear, 10 * statics.Shear);
        Hand.Equal(bearing, 10 * statics.Bearing);
    }

    [Fact]
    public void Of_WetFaceWithTheLoadOverTheWall_FastenersOnlyHoldTheGuideInPlace()
    {
        var statics = GuideStatics.Of(GuideMounting.WetFace, 0.03, 0.04);

        Assert.Equal((0, 0, 1), (statics.Tension, statics.Shear, statics.Bearing));
    }

    [Property]
    public void Of_AnyDistances_BalanceExactly(PositiveInt load, PositiveInt strip)
    {
        var (a, z) = (load.Get % 500 / 1000.0 + 0.001, strip.Get % 500 / 1000.0 + 0.001);

        foreach (var mounting in Enum.GetValues<GuideMounting>())
        {
            var statics = GuideStatics.Of(mounting, a, z);
            var (across, along, moment) = OnTheGuide(mounting, statics, a, z);
            var scale = 1 + statics.Tension + statics.Bearing;

            Assert.Equal(0, across, 1e-12 * scale);
            Assert.Equal(0, along, 1e-12 * scale);
            Assert.Equal(0, moment, 1e-12 * scale * (a + z));
            Assert.True(statics is { Tension: >= 0, Shear: >= 0, Bearing: >= 0 });
        }
    }

    /// <summary>A load nearer to the fasteners never asks more of them or of the wall.</summary>
    [Property]
    public void Of_NearerLoad_NeverMoreOfAnything(PositiveInt load, PositiveInt strip, PositiveInt nearer)
    {
        var (a, z) = (load.Get % 500 / 1000.0 + 0.001, strip.Get % 500 / 1000.0 + 0.001);
        var closer = a / (1 + nearer.Get % 10);

        foreach (var mounting in Enum.GetValues<GuideMounting>())
        {
            var (before, after) = (GuideStatics.Of(mounting, a, z), GuideStatics.Of(mounting, closer, z));

            Assert.True(after.Tension <= before.Tension && after.Bearing <= before.Bearing && after.Shear <= before.Shear);
        }
    }

    [Theory]
    [InlineData(0, 0.04)]
    [InlineData(0.03, 0)]
    [InlineData(double.NaN, 0.04)]
    [InlineData(0.03, double.PositiveInfinity)]
    public void Of_NoDistance_Refuses(double load, double bearing) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GuideStatics.Of(GuideMounting.Reveal, load, bearing));

    /// <summary>
    /// Sums of the forces on the guide, for a load of 1. On a face: u runs from the fasteners towards the opening, v off the wall.
    /// In a reveal: u runs from the fasteners along the reveal in the direction of the water, v off the wall into the opening.
    /// </summary>
    private static (double Across, double Along, double Moment) OnTheGuide(GuideMounting mounting, GuideStatics statics, double a, double z)
    {
        (double U, double V, double ForceU, double ForceV)[] forces = mounting switch
        {
            GuideMounting.WetFace => [(a, 0, 0, -1), (0, 0, 0, -statics.Tension), (Math.Min(a, z), 0, 0, statics.Bearing)],
            GuideMounting.DryFace => [(a, 0, 0, 1), (0, 0, 0, -statics.Tension), (-z, 0, 0, statics.Bearing)],
            _ => [(0, a, 1, 0), (0, 0, -statics.Shear, -statics.Tension), (z, 0, 0, statics.Bearing)],
        };
        return (forces.Sum(f => f.ForceV), forces.Sum(f => f.ForceU), forces.Sum(f => f.U * f.ForceV - f.V * f.ForceU));
    }
}
