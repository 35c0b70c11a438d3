using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>What the guides at both ends receive in a case.</summary>
public sealed partial class GuideTable
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private FigureKey Key(string symbol, GuideResult guide) => new(Figures.Guide, symbol, Case.Name, Side: guide.Side);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
