using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.LibraryTables;

/// <summary>Profiles, one in each row, with unit, source and mark; the chosen one is drawn.</summary>
public sealed partial class ProfileTable
{
    private static readonly Column[] Columns =
    [
        new("A", "Area", Dimension.SectionArea, s => s.Area),
        new("I", "Second moment", Dimension.SecondMoment, s => s.Inertia),
        new("W", "Elastic modulus", Dimension.SectionModulus, s => s.Modulus),
        new("W_pl", "Plastic modulus", Dimension.SectionModulus, s => s.PlasticModulus),
        new("A_v", "Shear area", Dimension.SectionArea, s => s.ShearArea),
    ];

    private static readonly Material Aluminium = new() { Family = MaterialFamily.Aluminium, Density = 2700 };
    private static readonly Material Timber = new() { Family = MaterialFamily.Timber, Density = 420 };
    private static readonly Material Steel = new() { Family = MaterialFamily.Steel, Density = 7850 };

    private string? chosen;

    /// <summary>The rows.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<LibraryEntry<Profile>> Entries { get; set; } = [];

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    /// <summary>What such a profile is usually made of; its density is shown beside the mass.</summary>
    private static Material Usual(Profile profile) => profile switch
    {
        HollowRectangle => Aluminium,
        Rectangle => Timber,
        _ => Steel,
    };

    private string Unit(Column column) => Calculation.Units.Of(column.Dimension, Units).Symbol;

    private void Choose(string id) => chosen = chosen == id ? null : id;

    private sealed record Column(string Name, string Meaning, Dimension Dimension, Func<SectionProperties, double> Of);
}
