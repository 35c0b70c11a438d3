using FloodPanel.Calculation.ProjectTree;
using MathNet.Numerics.Integration;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>
/// The pressure of a case written out as a plain function of height, and its integrals by Gauss's rule between the
/// heights where it breaks: a second way to every resultant, which shares nothing with the pressure diagram.
/// </summary>
internal sealed class HandWater(Scenario scenario, string caseName)
{
    private readonly double unitWeight = scenario.Site.WaterDensity * 9.80665;
    private readonly double height = scenario.Result.BarrierHeight;
    private readonly double flood = caseName switch
    {
        "brim-full" => scenario.Result.BarrierHeight,
        "wind" or "line" => 0,
        _ => scenario.Result.RetainedDepth,
    };

    private readonly HandWave wave = new(scenario);

    private readonly double behind = caseName is "brim-full" or "wind" or "line" ? 0 : scenario.Result.ProtectedDepth;

    /// <summary>True for the cases whose pressure is written out here.</summary>
    public bool Knows => caseName is not "line";

    public double FloodSide(double z) => unitWeight * Math.Max(0, flood - z);

    public double ProtectedSide(double z) => unitWeight * Math.Max(0, behind - z);

    public double Flow(double z)
    {
        var wetted = Math.Min(flood, height);
        if (caseName is "brim-full" or "wind"
            || (caseName is "wave" && scenario.Opening.Actions.Wave is BreakingWaveInput)
            || scenario.Opening.Actions.Flow is not { } flow || z > wetted)
        {
            return 0;
        }

        var square = flow.Velocity * flow.Velocity;
        var surcharge = unitWeight * flow.ShapeCoefficient * square / (2 * 9.80665);
        return flow.Velocity <= 3.05
            ? surcharge
            : Math.Max(surcharge, Drag(scenario.Opening.ClearWidth / wetted) * scenario.Site.WaterDensity * square / 2);
    }

    public double Wind(double z) => caseName == "wind" && z <= height ? scenario.Opening.Actions.Wind!.Pressure : 0;

    public double Wave(double z) => caseName == "wave" ? wave.Pressure(z) : 0;

    /// <summary>Unfactored pressure.</summary>
    public double Pressure(double z) => FloodSide(z) - ProtectedSide(z) + Flow(z) + Wave(z) + Wind(z);

    /// <summary>The same with every difference taken as a sum: rounding errors are in proportion to it.</summary>
    public double Terms(double z) => FloodSide(z) + ProtectedSide(z) + Flow(z) + Wave(z) + Wind(z);

    /// <summary>Factored pressure.</summary>
    public double Design(double z)
    {
        var factors = HandFactors.Of(scenario.Project.DesignBasis, scenario.Site.FloodZone);
        var factor = caseName switch
        {
            "brim-full" => factors.BrimFull,
            "debris" => factors.Debris,
            "wind" => factors.Wind,
            _ => factors.FloodSide,
        };
        return factor * (FloodSide(z) + Flow(z) + Wave(z) + Wind(z)) - factors.ProtectedSide * ProtectedSide(z);
    }

    /// <summary>∫ f dz over a band of height.</summary>
    public double Integral(Func<double, double> function, double bottom, double top)
    {
        double[] ends = [bottom, .. new[] { behind, flood, height, wave.Ground, wave.Crest }.Where(z => z > bottom && z < top).Order(), top];
        var sum = 0.0;
        for (var i = 1; i < ends.Length; i++)
        {
            sum += GaussLegendreRule.Integrate(function, ends[i - 1], ends[i], order: 5);
        }

        return sum;
    }

    private static double Drag(double ratio)
    {
        (double Limit, double Coefficient)[] table =
            [(12, 1.25), (20, 1.3), (32, 1.4), (40, 1.5), (80, 1.75), (120, 1.8), (double.MaxValue, 2.0)];
        return table.First(row => ratio <= row.Limit).Coefficient;
    }
}
