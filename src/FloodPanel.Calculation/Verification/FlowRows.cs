using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Verification;

/// <summary>Moving water.</summary>
internal static class FlowRows
{
    private const string Asce = "ASCE 7, 5.4.3, worked by hand with a = 1.25";
    private const string Fema = "FEMA P-55 (2011), Table 8-2";

    public static IEnumerable<VerificationRow> Rows() =>
    [
        Surcharge("1 m/s", 1, "0.064"),
        Surcharge("2 m/s", 2, "0.255"),
        Surcharge("3.05 m/s", 3.05, "0.593"),
        Drag(12, "1.25"),
        Drag(20, "1.3"),
        Drag(32, "1.4"),
        Drag(40, "1.5"),
        Drag(80, "1.75"),
        Drag(120, "1.8"),
        Drag(121, "2.0"),
    ];

    private static VerificationRow Surcharge(string velocity, double value, string published) =>
        new(Asce, $"surcharge depth at {velocity}", "m", published, Flow.SurchargeDepth(value, 1.25), Evidence.Derived);

    private static VerificationRow Drag(double ratio, string published) =>
        new(Fema, FormattableString.Invariant($"drag coefficient at a width of {ratio} depths"), "", published, Flow.DragCoefficient(ratio), Evidence.Memory);
}
