using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>A material of the library, or one with its own figures.</summary>
public sealed partial class MaterialPicker
{
    private const string Own = "";

    private static readonly MaterialFamily[] Families = Enum.GetValues<MaterialFamily>();

    private Material? remembered;
    private string[] ids = [];
    private Library? listed;

    /// <summary>Key of the field, "logs.material".</summary>
    [Parameter, EditorRequired]
    public string Key { get; set; } = "";

    /// <summary>What is chosen.</summary>
    [Parameter, EditorRequired]
    public MaterialChoice Choice { get; set; } = null!;

    /// <summary>Materials to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>Path of the choice in the project file.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with another choice.</summary>
    [Parameter, EditorRequired]
    public EventCallback<MaterialChoice> OnChange { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private string[] Ids => ids;

    private string ChosenId => Choice is LibraryMaterial named ? named.Id : Own;

    private LibraryEntry<Material>? Entry => Choice is LibraryMaterial named ? Library.Materials.GetValueOrDefault(named.Id) : null;

    protected override void OnParametersSet()
    {
        remembered = Choice as Material ?? remembered;
        if (!ReferenceEquals(listed, Library))
        {
            listed = Library;
            ids = [.. Library.Materials.Values.OrderBy(m => m.Item.Family).ThenBy(m => m.Title, StringComparer.Ordinal).Select(m => m.Id), Own];
        }
    }

    private string TitleOf(string id) => id == Own ? "Own figures" : Library.Materials.GetValueOrDefault(id)?.Title ?? id;

    private Sentence? ProblemAt(string leaf) => Problems.FirstOrDefault(p => p.Path == Path + leaf)?.Message;

    // Own figures start from those of the library, or from what they were before.
    private Task Choose(string id) => id == Own
        ? Edit(remembered ?? Library.Find(Choice) ?? new Material { Density = 2700, ElasticModulus = 70e9 })
        : OnChange.InvokeAsync(new LibraryMaterial(id));

    private Task Edit(Material own) => OnChange.InvokeAsync(own);

    private string Summary(Material material)
    {
        var parts = new List<string> { $"E {Shown(material.ElasticModulus, Dimension.ElasticModulus)}", Shown(material.Density, Dimension.Density) };
        Add(parts, "bending", material.AllowableBending ?? material.BendingStrength);
        Add(parts, "shear", material.AllowableShear ?? material.ShearStrength);
        return string.Join(", ", parts);
    }

    private void Add(List<string> parts, string name, double? stress)
    {
        if (stress is { } value)
        {
            parts.Add($"{name} {Shown(value, Dimension.Stress)}");
        }
    }

    // Number and unit stay on one line.
    private string Shown(double value, Dimension dimension) =>
        Calculation.Units.Format(value, dimension, Units).Replace(' ', '\u00A0');

    private static string SourceOf(LibraryEntry<Material> entry) => entry.Evidence switch
    {
        "invented" => "Demonstration figures.",
        "memory" => $"{entry.Source} (from memory).",
        _ => $"{entry.Source}.",
    };
}
