using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The levels of the site that this opening stands in.</summary>
public sealed partial class WaterSection
{
    /// <summary>The site.</summary>
    [Parameter, EditorRequired]
    public Site Site { get; set; } = null!;

    /// <summary>Address of the page of the site.</summary>
    [Parameter, EditorRequired]
    public string SiteAddress { get; set; } = "";

    protected override object? Shown => null;

    protected override object? Besides => Site;

    private string Level(double value) => Calculation.Units.Format(value, Dimension.Length, Units);
}
