using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Logs;

/// <summary>
/// A plank 200 × 60 over a bay of 1.75 m with 50 mm of bearing, L = 1.8 m, under 2 kN/m of which 1.6 unfactored, by
/// hand: M 0.81 kN·m, V 1.8 kN, W 120 cm³, A_v 80 cm², E·I 10 GPa · 360 cm⁴.
/// </summary>
public class LogChecksTests
{
    private static readonly Rectangle Profile = new() { Height = 0.2, Depth = 0.06 };

    private static readonly Member Plank = new(
        new Material { Density = 500, ElasticModulus = 10e9 },
        Profile,
        SectionProperties.Of(Profile),
        new DesignStress(9e6, null, "", "typed"),
        new DesignStress(1e6, null, "", "typed"),
        200);

    private static readonly LogResponse Response = LogResponse.Of(new(1_600, 2_000), 1.8, Plank);

    private static readonly LogSetting Setting = new(Response, 1.75, 0.05, Plank);

    [Fact]
    public void Bending_Plank_ByHand()
    {
        var check = LogChecks.Bending(Setting)!;

        Hand.Equal(810, check.Demand);
        Hand.Equal(1_080, check.Capacity);
        Hand.Equal(0.75, check.Utilisation);
        Assert.Equal(("log-bending", Dimension.Moment), (check.Name, check.Dimension));
    }

    [Fact]
    public void Shear_Plank_ByHand()
    {
        var check = LogChecks.Shear(Setting)!;

        Hand.Equal(1_800, check.Demand);
        Hand.Equal(8_000, check.Capacity);
        Hand.Equal(0.225, check.Utilisation);
    }

    /// <summary>Unfactored: 5·1600·1.8⁴/(384·36000) = 6.075 mm against 9 mm.</summary>
    [Fact]
    public void Deflection_Plank_ByHand()
    {
        var check = LogChecks.Deflection(Setting);

        Hand.Equal(0.006075, check.Demand);
        Hand.Equal(0.009, check.Capacity);
        Hand.Equal(0.675, check.Utilisation);
    }

    [Fact]
    public void BendingAndShear_NoStress_NoCheck()
    {
        var unknown = new Member(Plank.Material, Plank.Profile, Plank.Section, null, null, 200);
        var response = LogResponse.Of(new(1_600, 2_000), 1.8, unknown);
        var setting = new LogSetting(response, 1.75, 0.05, unknown);

        Assert.Null(LogChecks.Bending(setting));
        Assert.Null(LogChecks.Shear(setting));
        Assert.Equal((0, 0), (response.Bending, response.ShearUse));
        Assert.False(unknown.IsComplete);
    }
}
