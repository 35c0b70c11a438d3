using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>A free-standing footing or sill beam under the barrier.</summary>
public sealed partial class FootingSection
{
    private static readonly FootingInput Usual = new();
    private static readonly CreepSoil[] Soils = Enum.GetValues<CreepSoil>();
    private static readonly Dictionary<string, object?> CarriesId = new() { ["data-testid"] = "footing-carries-guides" };

    private FootingInput remembered = Usual;

    protected override object? Shown => Barrier.Footing;

    private static string Name(CreepSoil soil) =>
        FormattableString.Invariant($"{Words.OfSoil(soil)}, {LaneCreep.Least(soil):0.0}");

    // Switched off and on again, it is what it was.
    private Task Switch(bool on)
    {
        remembered = Barrier.Footing ?? remembered;
        var footing = on ? remembered : null;
        return EditBarrier("footing", b => b with { Footing = footing });
    }

    private Task Change(string what, Func<FootingInput, FootingInput> apply) =>
        EditBarrier(what, b => b.Footing is { } footing ? b with { Footing = apply(footing) } : b);
}
