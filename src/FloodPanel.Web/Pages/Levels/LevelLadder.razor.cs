using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>The levels of the site and the sills of its openings on one scale.</summary>
public sealed partial class LevelLadder
{
    private LevelMarks marks = new(new Project());

    [Parameter, EditorRequired]
    public required Project Project { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    private string Description =>
        $"Ladder of levels: {string.Join(", ", marks.Right.Concat(marks.Left).Select(m => $"{m.Name} {Level(m)}"))}";

    protected override void OnParametersSet() => marks = new LevelMarks(Project);

    private string Level(LevelMark mark) => Calculation.Units.FormatNumber(mark.Level, Dimension.Length, Units);

    private static string Short(string name) => name.Length <= 16 ? name : name[..15].TrimEnd() + "…";

    private static string N(double value) => value.ToString("0.##", CultureInfo.InvariantCulture);
}
