using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Leakage;
using FloodPanel.Web.Shared.Results;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>What leaks, what rains, and the pump for both.</summary>
public sealed partial class LeakageFigures
{
    /// <summary>The estimate.</summary>
    [Parameter, EditorRequired]
    public LeakageResult Result { get; set; } = null!;

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private static FigureKey Key(string symbol) => new(Figures.Leakage, symbol);

    private string Length(double value) => Calculation.Units.Format(value, Dimension.Length, Units);

    // Minutes up to two hours, hours beyond.
    private static string Minutes(double seconds) => seconds < 7200
        ? string.Create(CultureInfo.InvariantCulture, $"{seconds / 60:0} min")
        : string.Create(CultureInfo.InvariantCulture, $"{seconds / 3600:0.0} h");
}
