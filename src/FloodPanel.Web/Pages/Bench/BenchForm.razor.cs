using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>Everything that is typed for one opening.</summary>
public sealed partial class BenchForm
{
    /// <summary>The opening.</summary>
    [Parameter, EditorRequired]
    public Opening Opening { get; set; } = null!;

    /// <summary>Path of the opening in the project file, "openings[0]".</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The site.</summary>
    [Parameter, EditorRequired]
    public Site Site { get; set; } = null!;

    /// <summary>Address of the page of the site.</summary>
    [Parameter, EditorRequired]
    public string SiteAddress { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Materials and profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>The design basis of the project.</summary>
    [Parameter, EditorRequired]
    public DesignBasisKind Basis { get; set; }

    /// <summary>Raised with each edit.</summary>
    [Parameter, EditorRequired]
    public EventCallback<OpeningEdit> OnEdit { get; set; }
}
