using FloodPanel.Calculation.Leakage;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>Leak rate, rain behind the barrier, sump and pump.</summary>
public sealed partial class LeakageSection
{
    private static readonly LeakConvention[] Conventions = Enum.GetValues<LeakConvention>();
    private static readonly Dictionary<string, object?> BackFlowId = new() { ["data-testid"] = "leakage-back-flow" };

    private LeakageInput remembered = new();

    protected override object? Shown => Opening.Leakage;

    private static string Name(LeakConvention convention) => convention == LeakConvention.Width ? "Clear width" : "Wetted seal";

    /// <summary>The published rate that stands in the fields; one that is in no list when none does.</summary>
    private static LeakRate Published(LeakageInput leakage) =>
        LeakRates.All.FirstOrDefault(rate => rate.Rate == leakage.Rate && rate.Convention == leakage.Convention)
        ?? new("", leakage.Rate, leakage.Convention);

    // Switched off and on again, it is what it was.
    private Task Switch(bool on)
    {
        remembered = Opening.Leakage ?? remembered;
        var leakage = on ? remembered : null;
        return Edit("leakage", o => o with { Leakage = leakage });
    }

    private Task Change(string what, Func<LeakageInput, LeakageInput> apply) =>
        Edit(what, o => o.Leakage is { } leakage ? o with { Leakage = apply(leakage) } : o);
}
