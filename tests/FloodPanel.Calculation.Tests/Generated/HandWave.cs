using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>
/// The pressure of a wave beyond still water, written out a second time as a plain function of height: the two
/// triangles of a breaking wave less still water, or Goda's two lines with the wave length found by halving.
/// </summary>
internal sealed class HandWave
{
    private const double Gravity = 9.80665;

    private readonly double ground;
    private readonly Func<double, double> aboveGround = _ => 0;

    public HandWave(Scenario scenario)
    {
        var still = scenario.Result.RetainedDepth;
        var depth = Math.Round(
            scenario.Result.DesignFloodLevel - (scenario.Opening.GroundLevel ?? scenario.Opening.SillLevel), 10);
        var unitWeight = scenario.Site.WaterDensity * Gravity;
        ground = still - depth;
        if (depth <= 0)
        {
            return;
        }

        (aboveGround, Crest) = scenario.Opening.Actions.Wave switch
        {
            BreakingWaveInput wave => (y => Breaking(y, depth, wave.RiskCategory) * unitWeight, ground + 2.2 * depth),
            NonBreakingWaveInput wave => (Goda(wave, depth, unitWeight), still + Reach(wave)),
            _ => (aboveGround, Crest),
        };
    }

    public double Ground => ground;

    public double Crest { get; }

    /// <summary>Below ground as at ground.</summary>
    public double Pressure(double z) => aboveGround(Math.Max(0, z - ground));

    private static double Breaking(double y, double depth, int category)
    {
        var coefficient = category == 1 ? 1.6 : category == 2 ? 2.8 : category == 3 ? 3.2 : 3.5;
        var raised = Math.Max(0, 2.2 * depth - y);
        var still = Math.Max(0, depth - y);
        return raised - still + coefficient * Math.Min(y, raised / 1.2);
    }

    private static double Reach(NonBreakingWaveInput wave) =>
        0.75 * (1 + Math.Cos(wave.AngleDegrees * Math.PI / 180)) * wave.Height;

    private static Func<double, double> Goda(NonBreakingWaveInput wave, double depth, double unitWeight)
    {
        var cosine = Math.Cos(wave.AngleDegrees * Math.PI / 180);
        var kh = RelativeDepth(4 * Math.PI * Math.PI * depth / (Gravity * wave.Period * wave.Period));
        var seaward = depth + 5 * wave.Height / 1.8 * wave.BedSlope;
        var alpha1 = 0.6 + 2 * Math.Pow(kh / Math.Sinh(2 * kh), 2);
        var alpha2 = Math.Min(
            (seaward - depth) / (3 * seaward) * Math.Pow(wave.Height / depth, 2), 2 * depth / wave.Height);
        var peak = (1 + cosine) / 2 * (alpha1 + alpha2 * cosine * cosine) * unitWeight * wave.Height;
        var foot = peak / Math.Cosh(kh);
        var reach = Reach(wave);
        return y => y <= depth ? foot + (peak - foot) * y / depth : peak * Math.Max(0, 1 - (y - depth) / reach);
    }

    /// <summary>x of x·tanh(x) = a by halving.</summary>
    private static double RelativeDepth(double a)
    {
        var (low, high) = (0.0, a + 1);
        for (var i = 0; i < 200; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = middle * Math.Tanh(middle) < a ? (middle, high) : (low, middle);
        }

        return low;
    }
}
