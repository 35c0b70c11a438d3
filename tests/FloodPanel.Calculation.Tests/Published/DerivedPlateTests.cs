using FloodPanel.Calculation.Covers;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>Worked figures without a published counterpart: a circular cover, diameter 600, t 6 mm, E 70 GPa, ν 0.33, 20 kPa.</summary>
public class DerivedPlateTests
{
    private const double Stiffness = 70e9 * 0.006 * 0.006 * 0.006 / (12 * (1 - 0.33 * 0.33));

    /// <summary>D 1.414e6 N·mm; w 7.17 mm, M 374.6 N, σ 62.4 MPa.</summary>
    [Fact]
    public void CircularCover_Supported()
    {
        var response = new CircularPlate(0.3, 0.33, isClamped: false, 20e3, 0).Worst();

        Assert.Equal(1.414e3, Stiffness, tolerance: 0.5);
        Assert.Equal(7.17e-3, response.Bulge / Stiffness, tolerance: 0.5e-5);
        Assert.Equal(374.6, response.Moment, tolerance: 0.05);
        Assert.Equal(62.4e6, 6 * response.Moment / (0.006 * 0.006), tolerance: 0.05e6);
    }

    /// <summary>w 1.79 mm, edge M 225 N, σ 37.5 MPa.</summary>
    [Fact]
    public void CircularCover_Clamped()
    {
        var response = new CircularPlate(0.3, 0.33, isClamped: true, 20e3, 0).Worst();

        Assert.Equal(1.79e-3, response.Bulge / Stiffness, tolerance: 0.5e-5);
        Assert.Equal(225, response.EdgeMoment, tolerance: 0.5);
        Assert.Equal(37.5e6, 6 * response.Moment / (0.006 * 0.006), tolerance: 0.05e6);
    }

    /// <summary>Deflections at the centre, supported over clamped, at ν = 0.3: 4.08.</summary>
    [Fact]
    public void CircularCover_SupportedOverClamped()
    {
        var supported = new CircularPlate(0.3, 0.3, isClamped: false, 20e3, 0).Worst();
        var clamped = new CircularPlate(0.3, 0.3, isClamped: true, 20e3, 0).Worst();

        Assert.Equal(4.08, supported.Bulge / clamped.Bulge, tolerance: 0.005);
    }
}
