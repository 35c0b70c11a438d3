using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.ProjectTree;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Footings;

/// <summary>
/// By hand, 1 m long, water of 10 kN/m³: base 2 m × 0.5 m of 24.5166 kN/m³, barrier 1.5 m from the flood edge, 1 m of water. The
/// barrier pushes 5 kN at a third of a metre; the side of the footing takes 5 kN more at 0.25 m above the base.
/// </summary>
public class FootingStabilityTests
{
    private static readonly FootingInput Footing = new()
    {
        Width = 2,
        Thickness = 0.5,
        BarrierFromFloodEdge = 1.5,
        Density = 2500,
        Source = "by hand",
    };

    private static readonly FootingLoad OneMetre = new(Length: 1, Horizontal: 5e3, Moment: 5e3 / 3, UnitWeight: 10e3, Depth: 1, Behind: 0);

    [Fact]
    public void Of_OneMetreOfWater_ForcesAndMomentsByHand()
    {
        var state = FootingStability.Of(Footing, OneMetre);

        Hand.Equal(2500 * 9.80665 * 1, state.Weight);
        Hand.Equal(15e3, state.WaterOnHeel);
        Hand.Equal((15e3 + 5e3) / 2 * 2, state.Uplift);
        Hand.Equal(10e3, state.Driving);
        Hand.Equal(2, state.Contact);

        // 5·(1/3 + 0.5) + 5·0.25 + uplift 10·1 (even part, arm 1) + 10·4/3 (triangle of 10 kN, arm 4/3) = 4.1667 + 1.25 + 23.3333.
        Hand.Equal(5e3 / 3 + 2.5e3 + 1.25e3 + 10e3 * 1 + 10e3 * 4 / 3, state.Overturning);
        Hand.Equal(24_516.625 * 1 + 15e3 * 1.25, state.Resisting);
    }

    /// <summary>Deep water lifts the flood edge: the contact is three times the arm of the resultant under the uplift that the gap brings.</summary>
    [Fact]
    public void Of_BaseLiftsOff_ContactIsThreeTimesTheArm()
    {
        var heavy = Footing with { Thickness = 1, BarrierFromFloodEdge = 1 };
        var state = FootingStability.Of(heavy, OneMetre with { Horizontal = 8e3, Moment = 5e3 });

        Assert.InRange(state.Contact, 0.05, 1.99);
        Assert.Equal(3 * state.ResultantFromToe, state.Contact, 1e-9);
        var gap = heavy.Width - state.Contact;
        Hand.Equal(20e3 * gap + (20e3 + 10e3) / 2 * state.Contact, state.Uplift);
    }

    [Fact]
    public void Of_PushedOver_NothingInContact()
    {
        var state = FootingStability.Of(Footing, OneMetre with { Moment = 60e3 });

        Assert.Equal(0, state.Contact);
    }

    [Fact]
    public void Of_DryGround_NoUplift()
    {
        var state = FootingStability.Of(Footing, OneMetre with { Depth = 0, Horizontal = 500, Moment = 500 });

        Assert.Equal((0, 0, 500), (state.Uplift, state.WaterOnHeel, state.Driving));
    }

    /// <summary>A straight pressure with that greatest and least value carries N at the distance x: read back by its resultant.</summary>
    [Property(MaxTest = 200)]
    public void BearingPressure_AnyResultant_CarriesIt(double seed, double load)
    {
        var (width, vertical) = (2.4, 1e3 * (1 + Math.Abs(load % 100)));
        var x = width * (0.02 + 0.48 * Math.Abs(seed % 1));
        if (!double.IsFinite(x) || !double.IsFinite(vertical))
        {
            return;
        }

        var (greatest, least, contact) = BearingPressure.Of(vertical, x, width);

        var force = (greatest + least) / 2 * contact;
        Assert.Equal(vertical, force, vertical * 1e-12);
        Assert.Equal(x, contact / 3 * (greatest + 2 * least) / (greatest + least), width * 1e-12);
    }

    [Theory]
    [InlineData(0, 1)]
    [InlineData(1, 0)]
    [InlineData(double.NaN, 1)]
    [InlineData(1.2, 1)]
    public void BearingPressure_OutOfRange_Throws(double distance, double width) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => BearingPressure.Of(1, distance, width));
}
