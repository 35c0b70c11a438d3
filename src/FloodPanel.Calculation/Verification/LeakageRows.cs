using FloodPanel.Calculation.Leakage;

namespace FloodPanel.Calculation.Verification;

/// <summary>Rain behind the barrier.</summary>
internal static class LeakageRows
{
    private const string Manual = "FHWA HEC-22, 3rd ed. (2009), Example 3-3";

    public static IEnumerable<VerificationRow> Rows() =>
    [
        Row("existing, C 0.235, 48 mm/h on 17.55 ha", 0.235, 48, "0.55"),
        Row("developed, C 0.315, 58 mm/h on 17.55 ha", 0.315, 58, "0.89"),
    ];

    private static VerificationRow Row(string quantity, double coefficient, double millimetresPerHour, string published) => new(
        Manual, quantity, "m³/s", published, LeakageEstimate.Runoff(coefficient, millimetresPerHour * 1e-3 / 3600, 17.55e4), Evidence.Secondary);
}
