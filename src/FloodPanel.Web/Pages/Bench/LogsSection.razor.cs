using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The stack of stop-logs.</summary>
public sealed partial class LogsSection
{
    private static readonly LogStack Usual = new();
    private static readonly bool[] Insides = [true, false];

    protected override object? Shown => Barrier.Logs;

    /// <summary>Materials and profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;
}
