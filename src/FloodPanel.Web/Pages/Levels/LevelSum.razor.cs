using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>The design flood level and the required top as a sum, in the order in which one adds up.</summary>
public sealed partial class LevelSum
{
    [Parameter, EditorRequired]
    public required Site Site { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    private string Symbol => Calculation.Units.Of(Dimension.Length, Units).Symbol;

    private string Chance => string.Create(CultureInfo.InvariantCulture, $"{Site.AnnualProbability * 100:0.####} %");

    private string Risk => ExceedanceRisk.InWords(Site.AnnualProbability, Site.DesignLifeYears);

    private string Length(double value) => Calculation.Units.FormatNumber(value, Dimension.Length, Units);
}
