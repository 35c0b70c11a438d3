using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.LibraryTables;

/// <summary>Materials, one in each row, with unit, source and mark.</summary>
public sealed partial class MaterialTable
{
    private static readonly Column[] Columns =
    [
        new("f", "Yield or bending strength", Dimension.Stress, m => m.BendingStrength),
        new("f_v", "Shear strength", Dimension.Stress, m => m.ShearStrength),
        new("f_u", "Ultimate strength", Dimension.Stress, m => m.UltimateStrength),
        new("f_w", "Yield beside a weld", Dimension.Stress, m => m.WeldedYield),
        new("f_uw", "Ultimate beside a weld", Dimension.Stress, m => m.WeldedUltimate),
        new("f_90", "Across grain or fibres", Dimension.Stress, m => m.CrossCompression ?? m.CrossStrength),
        new("E", "Elastic modulus", Dimension.ElasticModulus, m => m.ElasticModulus),
        new("G", "Shear modulus", Dimension.ElasticModulus, m => m.ShearModulus),
        new("ρ", "Density", Dimension.Density, m => m.Density),
    ];

    /// <summary>The rows.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<LibraryEntry<Material>> Entries { get; set; } = [];

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private string Unit(Column column) => Calculation.Units.Of(column.Dimension, Units).Symbol;

    private string Shown(Column column, Material material) =>
        column.Of(material) is { } value ? Calculation.Units.FormatNumber(value, column.Dimension, Units) : "";

    private string Remark(Material material) =>
        (material.BucklingClass is { } buckling ? $" Buckling class {buckling}." : "")
        + (material.CharacteristicDensity is { } density ? $" Characteristic density {Calculation.Units.Format(density, Dimension.Density, Units)}." : "")
        + (material.Reference == StrengthReference.NdsReference ? " Reference values, to be adjusted." : "");

    private sealed record Column(string Name, string Meaning, Dimension Dimension, Func<Material, double?> Of);
}
