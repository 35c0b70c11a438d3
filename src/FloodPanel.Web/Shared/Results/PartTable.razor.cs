using FloodPanel.Calculation;
using FloodPanel.Calculation.Parts;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Base plates, anchors, guides, walls and footings of a case: each check with demand and capacity.</summary>
public sealed partial class PartTable
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    /// <summary>Parts in their order; those of one kind that carry the same share their rows, under the names of all.</summary>
    private IEnumerable<(PartResult Part, string Members)> Groups =>
        from part in Case.Parts
        group part by new { part.Check, Figures = Fingerprint(part) } into alike
        select (alike.First(), string.Join(", ", alike.Select(p => p.Member)));

    /// <summary>Utilisations as their column shows them.</summary>
    private Dictionary<object, string> Uses
    {
        get
        {
            // Both guides may hold the very same checks.
            var checks = Case.Parts.SelectMany(p => p.Checks).Distinct<Check>(ReferenceEqualityComparer.Instance).ToArray();
            var shown = Calculation.Units.FormatColumn([.. checks.Select(c => c.Utilisation)], Dimension.Ratio, Units);
            return checks.Zip(shown).ToDictionary(pair => (object)pair.First, pair => pair.Second, ReferenceEqualityComparer.Instance);
        }
    }

    // Sums taken in another order differ in their last digits.
    private static string Fingerprint(PartResult part) => string.Join(
        ';', part.Checks.Select(c => FormattableString.Invariant($"{c.Name} {c.Demand:G9} {c.Capacity:G9}")));

    private static string NameOf(PartResult part) => $"{part.Check}-{part.Member.Replace(' ', '-')}";

    private string Shown(double value, Dimension dimension) =>
        double.IsFinite(value) ? Calculation.Units.Format(value, dimension, Units) : "none";
}
