using System.Globalization;
using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The logs of one bay in one case: a row for each, the top log on top, beside the pressure that it carries.</summary>
public sealed partial class LogLadder
{
    /// <summary>The load case.</summary>
    [Parameter, EditorRequired]
    public CaseResult Case { get; set; } = null!;

    /// <summary>The bay, from 1.</summary>
    [Parameter, EditorRequired]
    public int Bay { get; set; } = 1;

    /// <summary>Height of the barrier [m].</summary>
    [Parameter, EditorRequired]
    public double Height { get; set; }

    /// <summary>The figure that governs the opening.</summary>
    [Parameter]
    public FigureKey? Governing { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private List<LogResult> Rows { get; set; } = [];

    protected override void OnParametersSet() =>
        Rows = [.. Case.Logs.Where(log => log.Bay == Bay).OrderByDescending(log => log.Index)];

    private IReadOnlyList<string> Column(Func<LogResult, double> figure, Dimension dimension) =>
        Calculation.Units.FormatColumn([.. Rows.Select(figure)], dimension, Units);

    private FigureKey Key(string name, string symbol, LogResult log) => new(name, symbol, Case.Name, log.Index, log.Bay);

    private string UnitOf(Dimension dimension) => Calculation.Units.Of(dimension, Units).Symbol;

    private string? RowClass(LogResult log)
    {
        var fails = log.Checks.Any(check => check is { Passes: false });
        var governs = Governing is { } key && key.Case == Case.Name && key.Bay == log.Bay && key.Index == log.Index
            && key.Name.StartsWith("log", StringComparison.Ordinal);
        return fails && governs ? "fails governing" : fails ? "fails" : governs ? "governing" : null;
    }

    // The face stands at the right, the pressure pushes on it from the left.
    private static string Points(FaceStrip strip) =>
        $"{X(strip.FromBottom)},{Down(strip.Bottom)} {X(strip.ToBottom)},{Down(strip.Bottom)} {X(strip.ToTop)},{Down(strip.Top)} {X(strip.FromTop)},{Down(strip.Top)}";

    private static string X(double share) => Figure(100 - 92 * share);

    private static string Down(double share) => Figure(100 - 100 * share);

    private string Y(double z) => Down(z / Height);

    private static string Figure(double value) => value.ToString("0.##", CultureInfo.InvariantCulture);
}
