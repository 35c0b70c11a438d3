using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Guides;

/// <summary>More of what resists never raises a utilisation, in any case of any opening.</summary>
[Properties(Arbitrary = [typeof(Scenarios)])]
public class GuideMonotonyTests
{
    [Property(MaxTest = 60)]
    public void Evaluate_ThickerLip_NeverUsedMore(Scenario scenario, PositiveInt more) =>
        NeverMore(scenario, guides => guides with { LipThickness = guides.LipThickness * Factor(more) });

    [Property(MaxTest = 60)]
    public void Evaluate_ThickerBase_NeverUsedMore(Scenario scenario, PositiveInt more) =>
        NeverMore(scenario, guides => guides with { BaseThickness = guides.BaseThickness * Factor(more) });

    [Property(MaxTest = 60)]
    public void Evaluate_ShorterLipLever_NeverUsedMore(Scenario scenario, PositiveInt less) =>
        NeverMore(scenario, guides => guides with { LipLever = guides.LipLever / Factor(less) });

    /// <summary>
    /// Nearer, but on a dry face no nearer than the hole allows. There the base is not held to it: the spread at 45° from the fastener shortens
    /// with the offset while the hole stays.
    /// </summary>
    [Property(MaxTest = 60)]
    public void Evaluate_LoadNearer_NeverUsedMore(Scenario scenario, PositiveInt less) => NeverMore(
        scenario,
        guides => guides with { LoadOffset = Math.Max(Math.Min(guides.LoadOffset, 0.0075), guides.LoadOffset / Factor(less)) },
        name => name != "guide-base-bending" || scenario.Opening.Barrier.Guides is { Mounting: not GuideMounting.DryFace });

    /// <summary>
    /// Three spaces for each old one. A closer pitch that does not divide the old one may bring a fastener to a peak, see
    /// <see cref="FastenerRowTests"/>. Not held to it: the least spacing, a limit on closeness itself, and the base, where a hole takes
    /// the greater part of a shorter stretch, whose mean load comes nearer to the peak.
    /// </summary>
    [Property(MaxTest = 60)]
    public void Evaluate_ThirdOfThePitch_FastenersNeverUsedMore(Scenario scenario)
    {
        var spaces = scenario.Opening.Barrier.Guides is { } set
            ? Calculation.Guides.FastenerRow.Of(scenario.Result.BarrierHeight / scenario.Model.CosRake, set.Fasteners.EndDistance, set.Fasteners.Pitch)
            : default;
        NeverMore(
            scenario,
            guides => guides with { Fasteners = guides.Fasteners with { Pitch = spaces.Spacing / 3, HoleDiameter = 0.001 } },
            name => name is not ("fastener-spacing" or "guide-base-bending"));
    }

    [Property(MaxTest = 60)]
    public void Evaluate_FartherFromTheArris_NeverUsedMore(Scenario scenario, PositiveInt more) => NeverMore(
        scenario, guides => guides with { Fasteners = guides.Fasteners with { EdgeDistance = guides.Fasteners.EdgeDistance * Factor(more) } });

    private static double Factor(PositiveInt more) => 1 + more.Get % 100 / 100.0;

    private static void NeverMore(Scenario scenario, Func<GuideSet, GuideSet> change, Func<string, bool>? which = null)
    {
        if (scenario.Opening.Barrier.Guides is null)
        {
            return;
        }

        var better = scenario.With((Opening o) => o with { Barrier = o.Barrier with { Guides = change(o.Barrier.Guides!) } });

        var (before, after) = (Uses(scenario), Uses(better));

        foreach (var (key, use) in after.Where(pair => which?.Invoke(pair.Key.Name) ?? true))
        {
            Assert.True(
                use <= before.GetValueOrDefault(key, double.PositiveInfinity) * (1 + 1e-9), $"{key} rose from {before.GetValueOrDefault(key)} to {use}");
        }
    }

    private static Dictionary<(string Case, string Member, string Name), double> Uses(Scenario scenario) => scenario.Result.Cases
        .SelectMany(c => c.Parts.SelectMany(p => p.Checks.Select(check => (Key: (c.Name, p.Member, check.Name), check.Utilisation))))
        .ToDictionary(pair => pair.Key, pair => pair.Utilisation);
}
