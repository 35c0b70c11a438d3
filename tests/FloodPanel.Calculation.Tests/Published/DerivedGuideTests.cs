using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// A worked guide, derived and recomputed outside this code; no document prints it. Logs of 3.0 m span under 1.2 m of
/// water of 9.81 kN/m³. Logs 25 mm high: every stretch ends at a joint, so that the steps of the line load integrate to the same.
/// </summary>
public class DerivedGuideTests
{
    private const int Logs = 48;
    private const double Height = 0.025;

    private static readonly GuideLoad Load = GuideLoad.Of(
        [.. Enumerable.Range(0, Logs).Select(Water)], tributary: 1.5, [.. Enumerable.Repeat(Height, Logs)]);

    /// <summary>
    /// Fasteners at 0.10, 0.35, 0.60, 0.85 and 1.10 m hold 0–0.225–0.475–0.725–0.975–1.20 m: 3.60, 3.13, 2.21, 1.29 and 0.37 kN.
    /// </summary>
    [Theory]
    [InlineData(0, 0.10, 0, 0.225, 3.60)]
    [InlineData(1, 0.35, 0.225, 0.475, 3.13)]
    [InlineData(2, 0.60, 0.475, 0.725, 2.21)]
    [InlineData(3, 0.85, 0.725, 0.975, 1.29)]
    [InlineData(4, 1.10, 0.975, 1.20, 0.37)]
    public void Over_EachFastenersStretch_ItsForce(int index, double position, double from, double to, double force)
    {
        var row = FastenerRow.Of(1.2, endDistance: 0.1, pitch: 0.25);

        Assert.Equal(5, row.Count);
        Assert.Equal(position, row.Position(index), 1e-12);
        Assert.Equal(from, row.Stretch(index).From, 1e-12);
        Assert.Equal(to, row.Stretch(index).To, 1e-12);
        Assert.Equal(force, Load.Over(from, to) / 1000, tolerance: 0.005);
    }

    /// <summary>Sum 10.59 kN.</summary>
    [Fact]
    public void Over_WholeGuide_TheWholeReaction() => Assert.Equal(10.59, Load.Over(0, 1.2) / 1000, tolerance: 0.005);

    /// <summary>
    /// Lip of 8 mm with a lever of 12 mm at the sill, n = 17.66 N/mm: m 211.9 N·mm/mm, σ 19.9 MPa, τ 3.3 MPa.
    /// </summary>
    [Fact]
    public void LipBendingAndShear_AtTheSill_Stresses()
    {
        var line = 9810 * 1.2 * 1.5;

        Assert.Equal(211.9, line * 0.012, tolerance: 0.05);
        Assert.Equal(19.9, GuideStrength.LipBending(line, lever: 0.012, thickness: 0.008) / 1e6, tolerance: 0.05);
        Assert.Equal(3.3, GuideStrength.LipShear(line, thickness: 0.008) / 1e6, tolerance: 0.05);
    }

    private static FactoredLoad Water(int log)
    {
        var load = 9810 * (1.2 - (log + 0.5) * Height) * Height;
        return new(load, load);
    }
}
