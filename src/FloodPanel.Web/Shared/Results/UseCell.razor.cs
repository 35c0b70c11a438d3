using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The worst utilisation of a member: bar, number, pass or fail as a shape, and which check it is.</summary>
public sealed partial class UseCell
{
    /// <summary>The member, "log 3".</summary>
    [Parameter, EditorRequired]
    public string Member { get; set; } = "";

    /// <summary>Name for tests, "log-3".</summary>
    [Parameter, EditorRequired]
    public string Name { get; set; } = "";

    /// <summary>Its checks.</summary>
    [Parameter, EditorRequired]
    public IEnumerable<Check> Checks { get; set; } = [];

    /// <summary>The figure that a check of the member is.</summary>
    [Parameter, EditorRequired]
    public Func<Check, FigureKey> Key { get; set; } = null!;

    /// <summary>The utilisation as its column shows it.</summary>
    [Parameter, EditorRequired]
    public string InColumn { get; set; } = "";

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? GoverningKey { get; set; }

    private Check? Worst => WorstOf(Checks);

    /// <summary>The check that is used most; null when there is none.</summary>
    public static Check? WorstOf(IEnumerable<Check> checks) => checks.MaxBy(check => check.Utilisation);

    private bool Governs => Worst is { } check && GoverningKey == Key(check);
}
