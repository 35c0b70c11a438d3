using FloodPanel.Calculation;
using FloodPanel.Calculation.Handling;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Cutting length and mass of the logs, bay by bay.</summary>
public sealed partial class ScheduleTable
{
    /// <summary>The rows.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<LogSchedule> Schedule { get; set; } = [];

    /// <summary>Hold-down of each bay, in the same order.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<HoldDownResult> HoldDowns { get; set; } = [];

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private bool IsMixed => Schedule.Any(row => row.FirstLog > 1);

    private static string NameOf(LogSchedule row) => row.FirstLog == 1
        ? FormattableString.Invariant($"{row.Bay}")
        : FormattableString.Invariant($"{row.Bay}-from-{row.FirstLog}");

    /// <summary>How many; in a mixed stack which: "2 (1 to 2)".</summary>
    private string LogsOf(LogSchedule row)
    {
        var last = row.FirstLog + row.Count - 1;
        return !IsMixed ? FormattableString.Invariant($"{row.Count}")
            : row.Count == 1 ? FormattableString.Invariant($"1 (log {row.FirstLog})")
            : FormattableString.Invariant($"{row.Count} (logs {row.FirstLog} to {last})");
    }

    private static FigureKey Key(string symbol, LogSchedule row) => new(Figures.Schedule, symbol, Index: row.FirstLog, Bay: row.Bay);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
