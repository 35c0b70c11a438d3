using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Water;
using FloodPanel.Web.Shared.Results;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The numbers of one case: actions, ladder, posts, guides, what to cut, cautions.</summary>
public sealed partial class BenchResults
{
    private int chosenBay = 1;

    /// <summary>The result of the opening.</summary>
    [Parameter, EditorRequired]
    public OpeningResult Result { get; set; } = null!;

    /// <summary>The load case shown.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>The bay to show at once, because a figure of it is open; null for the user's own choice.</summary>
    [Parameter]
    public int? AskedBay { get; set; }

    /// <summary>True when the numbers are of an earlier state.</summary>
    [Parameter]
    public bool Stale { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private ValueList<double> Widths => Result.Opening.Barrier.Bays;

    // Bays of one width carry the same: one of them stands for all.
    private IReadOnlyList<int> Bays => [.. Enumerable.Range(1, Widths.Count).Where(bay => FirstAsWide(bay) == bay)];

    private int ShownBay => Bays.Contains(FirstAsWide(chosenBay)) ? FirstAsWide(chosenBay) : 1;

    private double GroundDepth => Math.Max(
        0, FloodLevels.Depth(Result.DesignFloodLevel, Result.Opening.GroundLevel ?? Result.Opening.SillLevel));

    private double WidestSpan => Widths.Max() + Result.Opening.Barrier.Logs.EndBearing;

    private string BaysInWords => Widths.Count > 1 ? $"the same in each of {Widths.Count} bays" : "";

    private string LadderWords => CaseWords + (Case.Kind == CaseKind.Debris
        ? " Each log with its share of the impact, one log at a time; deflection is reported, not judged."
        : "");

    private string CaseWords =>
        $"Design values, {Calculation.Units.FormatNumber(Case.Factor, Dimension.Ratio, Units)} × the actions; deflection unfactored.";

    protected override void OnParametersSet() => chosenBay = AskedBay ?? chosenBay;

    private void ChooseBay(int bay) => chosenBay = bay;

    private int FirstAsWide(int bay)
    {
        for (var i = 0; i < Widths.Count; i++)
        {
            if (bay <= Widths.Count && Widths[i] == Widths[bay - 1])
            {
                return i + 1;
            }
        }

        return 1;
    }

    private string BayWords(int bay)
    {
        var twins = Enumerable.Range(1, Widths.Count).Where(other => Widths[other - 1] == Widths[bay - 1]).ToArray();
        return $"{(twins.Length == 1 ? "Bay" : "Bays")} {string.Join(", ", twins)}";
    }
}
