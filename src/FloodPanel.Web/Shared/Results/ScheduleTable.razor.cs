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

    private static FigureKey Key(string symbol, LogSchedule row) => new(Figures.Schedule, symbol, Bay: row.Bay);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;
}
