using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The posts of a case.</summary>
public sealed partial class PostTable
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private FigureKey Key(string name, string symbol, PostResult post) => new(name, symbol, Case.Name, post.Index);

    private IReadOnlyList<string> Column(Func<PostResult, double> figure, Dimension dimension) =>
        Calculation.Units.FormatColumn([.. Case.Posts.Select(figure)], dimension, Units);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
