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

    /// <summary>Which logs of the stack a group is: "Logs 1 to 2, at the bottom".</summary>
    private string Position(int index)
    {
        var first = 1 + Barrier.Logs.Below.Take(index).Sum(group => group.Count);
        var last = first + Barrier.Logs.Below[index].Count - 1;
        var which = first == last ? FormattableString.Invariant($"Log {first}") : FormattableString.Invariant($"Logs {first} to {last}");
        return first == 1 ? $"{which}, at the bottom" : which;
    }

    // A group starts as one more log of the kind above it; next to nothing changes until its profile is chosen.
    private Task Add() => EditLogs("add logs beneath", l => l with
    {
        Count = Math.Max(1, l.Count - 1),
        Below = [.. l.Below, new LogGroup { Material = l.Material, Profile = l.Profile, Count = 1 }],
    });

    // The number of logs stays what it was.
    private Task Remove(int index) => EditLogs("delete logs beneath", l => l with
    {
        Count = Math.Min((int)Fields.LogCount.Maximum, l.Count + l.Below[index].Count),
        Below = [.. l.Below.Where((_, i) => i != index)],
    });

    private Task Set(int index, Func<LogGroup, LogGroup> apply) => EditLogs("logs beneath", l => index < l.Below.Count
        ? l with { Below = l.Below.SetItem(index, apply(l.Below[index])) }
        : l);
}
