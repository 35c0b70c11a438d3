using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The line of fasteners along a guide, with the values of their approval.</summary>
public sealed partial class GuideFastenerFields
{
    private static readonly DesignBasisKind[] Bases = Enum.GetValues<DesignBasisKind>();

    /// <summary>The fasteners.</summary>
    [Parameter, EditorRequired]
    public GuideFasteners Fasteners { get; set; } = null!;

    /// <summary>Path of the fasteners in the project file.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with each edit.</summary>
    [Parameter, EditorRequired]
    public EventCallback<GuideFasteners> OnChange { get; set; }

    private static string Name(DesignBasisKind basis) => basis switch
    {
        DesignBasisKind.AllowableStress => "Allowable loads",
        DesignBasisKind.UsStrength => "US design strengths",
        _ => "Eurocode design resistances",
    };

    private Sentence? Problem(string leaf) => Problems.FirstOrDefault(p => p.Path == $"{Path}.{leaf}")?.Message;

    private Task Change(GuideFasteners fasteners) => OnChange.InvokeAsync(fasteners);
}
