using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The optional figures of a material of one's own, those of its family only.</summary>
public sealed partial class MaterialFigures
{
    private static readonly BucklingClass?[] Classes = [null, BucklingClass.A, BucklingClass.B];
    private static readonly string[] ClassNames = [.. Classes.Select(NameOf)];
    private static readonly StrengthReference[] References = Enum.GetValues<StrengthReference>();

    /// <summary>Key of the field, "logs.material".</summary>
    [Parameter, EditorRequired]
    public string Key { get; set; } = "";

    /// <summary>The material.</summary>
    [Parameter, EditorRequired]
    public Material Own { get; set; } = null!;

    /// <summary>Path of the material in the project file.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with another figure.</summary>
    [Parameter, EditorRequired]
    public EventCallback<Material> OnChange { get; set; }

    private static string NameOf(BucklingClass? buckling) => buckling?.ToString() ?? "Unknown";

    private static string NameOf(StrengthReference reference) =>
        reference == StrengthReference.Characteristic ? "Characteristic" : "NDS reference values";

    private Sentence? ProblemAt(string leaf) => Problems.FirstOrDefault(p => p.Path == $"{Path}.{leaf}")?.Message;

    private Task Edit(Material own) => OnChange.InvokeAsync(own);
}
