using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Everything that stands in the way of a result, each in a sentence.</summary>
public sealed partial class ProblemList
{
    /// <summary>The sentences.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<Sentence> Sentences { get; set; } = [];

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }
}
