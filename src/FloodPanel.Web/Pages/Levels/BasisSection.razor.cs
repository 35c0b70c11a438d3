using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>The rule set of the project: the factors of the standard one, or a copy that the project adjusts.</summary>
public sealed partial class BasisSection
{
    /// <summary>The project.</summary>
    [Parameter, EditorRequired]
    public Project Project { get; set; } = null!;

    /// <summary>The standard rule sets.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>The problem at a path of the project file.</summary>
    [Parameter, EditorRequired]
    public Func<string, Sentence?> ProblemAt { get; set; } = null!;

    /// <summary>Raised with each edit.</summary>
    [Parameter, EditorRequired]
    public EventCallback<(string What, Func<Project, Project> Apply)> OnEdit { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private DesignBasis Standard => Library.Bases[Project.DesignBasis];

    private FloodZone Zone => Project.Site.FloodZone;

    private string ZoneLeaf => Zone == FloodZone.Inland ? "inland" : "coastal";

    private string Shown(double factor) => Calculation.Units.FormatNumber(factor, Dimension.Ratio, Units);

    // A copy follows its rule set; with another rule set it is dropped, and undo brings it back.
    private Task Choose(DesignBasisKind kind) =>
        Raise("Design basis", p => p.DesignBasis == kind ? p : p with { DesignBasis = kind, OwnBasis = null });

    private Task Copy()
    {
        var copy = Standard with { Title = $"{Standard.Title}, adjusted" };
        return Raise("Own design basis", p => p with { OwnBasis = copy });
    }

    private Task Drop() => Raise("Standard design basis", p => p with { OwnBasis = null });

    private Task Edit(string what, Func<DesignBasis, DesignBasis> apply) =>
        Raise(what, p => p.OwnBasis is { } own ? p with { OwnBasis = apply(own) } : p);

    private Task EditFactors(string what, Func<LoadFactors, LoadFactors> apply) => Edit($"{what} factor", own => Zone == FloodZone.Inland
        ? own with { Inland = apply(own.Inland) }
        : own with { Coastal = apply(own.Coastal) });

    private Task EditRule(int index, Func<StrengthRule, StrengthRule> apply) => Edit(
        "Factor on strength", own => own with { Strengths = own.Strengths.SetItem(index, apply(own.Strengths[index])) });

    private Task Raise(string what, Func<Project, Project> apply) => OnEdit.InvokeAsync((what, apply));
}
