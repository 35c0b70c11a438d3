using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Verification;

/// <summary>Levels by probability, and risk over years.</summary>
internal static class LevelRows
{
    private const string Risk = "Risk over n years, 1 − (1 − p)ⁿ";
    private const string PortPirie = "Port Pirie annual greatest sea levels, Gumbel fit by maximum likelihood";

    public static IEnumerable<VerificationRow> Rows() =>
    [
        OfRisk("1 %", 0.01, 30, "26.0"),
        OfRisk("1 %", 0.01, 50, "39.5"),
        OfRisk("1 %", 0.01, 100, "63.4"),
        OfRisk("0.2 %", 0.002, 50, "9.5"),
        OfRisk("2 %", 0.02, 25, "39.7"),
        .. Gumbel(),
    ];

    private static VerificationRow OfRisk(string chance, double probability, double years, string published) => new(
        Risk, FormattableString.Invariant($"{chance} over {years} years"), "%", published, 100 * ExceedanceRisk.Of(probability, years), Evidence.Derived);

    /// <summary>μ 3.86944, σ 0.19489: on the variate the fit is a straight line, so that its ends give what lies between.</summary>
    private static IEnumerable<VerificationRow> Gumbel()
    {
        const double location = 3.86944, scale = 0.19489;
        double Level(double probability) => location + scale * LevelCurve.Variate(probability);
        var curve = LevelCurve.Of([new LevelPoint(0.5, Level(0.5)), new LevelPoint(0.001, Level(0.001))])!;
        return
        [
            new(PortPirie, "10-year level, interpolated from those of 2 and 1000 years", "m", "4.3080", curve.At(0.1)!.Value, Evidence.Derived),
            new(PortPirie, "100-year level, interpolated likewise", "m", "4.7660", curve.At(0.01)!.Value, Evidence.Derived),
        ];
    }
}
