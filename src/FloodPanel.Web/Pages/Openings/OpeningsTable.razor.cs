using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Openings;

public sealed partial class OpeningsTable
{
    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<Opening> OnDuplicate { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<(Opening Opening, int By)> OnMove { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<Opening> OnDelete { get; set; }

    private IEnumerable<(Opening Opening, OpeningResult? Result)> Rows =>
        Editor.Project.Openings.Select(o => (o, Editor.ResultFor(o.Id)));

    private string UnitOfLength => Calculation.Units.Of(Dimension.Length, Units).Symbol;

    private string Length(double value) => Calculation.Units.FormatNumber(value, Dimension.Length, Units);

    private bool IsFirst(Opening opening) => Editor.Project.Openings[0].Id == opening.Id;

    private bool IsLast(Opening opening) => Editor.Project.Openings[^1].Id == opening.Id;

    private static string Where(Governing governing) => string.Join(", ",
        new[] { governing.Case is { } name ? CaseNames.InWords(name) : "", governing.Member }.Where(part => part.Length > 0));

    private static string BarrierOf(Opening opening)
    {
        var barrier = opening.Barrier;
        var logs = barrier.Logs.TotalCount == 1 ? "1 log" : $"{barrier.Logs.TotalCount} logs";
        return barrier.Bays.Count switch
        {
            <= 1 => logs,
            2 => $"{logs}, 2 bays, 1 post",
            _ => $"{logs}, {barrier.Bays.Count} bays, {barrier.Bays.Count - 1} posts",
        };
    }

    private string ProblemOf(Opening opening)
    {
        var index = Editor.Project.Openings.TakeWhile(o => o.Id != opening.Id).Count();
        var path = LiveResults.PathOf(index);
        var problem = Editor.Problems.FirstOrDefault(p => p.Path.StartsWith(path, StringComparison.Ordinal))
            ?? Editor.Problems.FirstOrDefault(p => p.Path.StartsWith("site", StringComparison.Ordinal));
        return problem?.Message.In(Units) ?? "The calculation of this opening has stopped; change a figure to run it again.";
    }
}
