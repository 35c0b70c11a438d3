using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.Handling;
using FloodPanel.Calculation.Leakage;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation;

/// <summary>The entry to the calculation: pure, synchronous, without I/O.</summary>
public static class Design
{
    /// <summary>Calculates every opening and cover of a project.</summary>
    /// <param name="project">A project without problems, see <see cref="Validation.Validate"/>.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    /// <exception cref="ArgumentException">The site, an opening or a cover has problems that <see cref="Validation.Validate"/> would name.</exception>
    public static ProjectResult Run(Project project, Library library) =>
        new(
            project,
            [.. project.Openings.Select(o => Evaluate(project, o, library))],
            [.. project.Covers.Select(c => Evaluate(project, c, library))]);

    /// <summary>Calculates one cover of a project.</summary>
    /// <param name="project">The project: its site and design basis apply.</param>
    /// <param name="cover">A cover without problems, see <see cref="Validation.Validate"/>.</param>
    /// <param name="library">The materials that it may name.</param>
    /// <exception cref="ArgumentException">The site or the cover has problems that <see cref="Validation.Validate"/> would name.</exception>
    public static CoverResult Evaluate(Project project, Cover cover, Library library)
    {
        RefuseProblems(Validation.Problems(project, cover, library), nameof(cover));
        return CoverReport.Of(project.Site, cover, library.BasisOf(project), library);
    }

    /// <summary>Calculates one opening of a project.</summary>
    /// <param name="project">The project: its site and design basis apply.</param>
    /// <param name="opening">An opening without problems, see <see cref="Validation.Validate"/>.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    /// <exception cref="ArgumentException">The site or the opening has problems that <see cref="Validation.Validate"/> would name.</exception>
    public static OpeningResult Evaluate(Project project, Opening opening, Library library)
    {
        var site = project.Site;
        RefuseProblems(Validation.Problems(project, opening, library), nameof(opening));
        var model = new OpeningModel(site, opening, library.BasisOf(project), library);
        var cases = Cases(model);
        var freeboard = FloodLevels.Freeboard(model.RetainedDepth, site.Freeboard, model.Height);
        var schedule = Schedule(opening.Barrier.Logs, model);
        HoldDownResult[] holdDowns = [.. schedule.DistinctBy(row => row.Bay).Select(row => HoldDown.Of(row, opening.Barrier.Logs, model))];
        PartGap[] gaps = [.. PartRegistry.Gaps(model)];
        var uncovered = Uncovered(model);
        return new()
        {
            Opening = opening,
            DesignFloodLevel = site.DesignFloodLevel,
            RetainedDepth = model.RetainedDepth,
            ProtectedDepth = model.ProtectedDepth,
            BarrierHeight = model.Height,
            Levels = FloodLevels.At(site, opening),
            Cases = cases,
            Freeboard = freeboard,
            Schedule = schedule,
            HoldDowns = holdDowns,
            Leakage = LeakageEstimate.Of(opening.Leakage, model),
            Verdict = VerdictRules.Of(opening, model, cases, freeboard, uncovered, gaps),
            Notes = [.. UnconfirmedValues.Notes(opening, library, project.Confirmed), .. Cautions.Of(site, opening, model, schedule, holdDowns)],
            Gaps = [.. gaps.Where(gap => !VerdictRules.IsByOthers(opening, gap.Check))],
        };
    }

    private static void RefuseProblems(IReadOnlyList<InputProblem> problems, string parameter)
    {
        if (problems.Count > 0)
        {
            throw new ArgumentException($"has problems, the first at {problems[0].Path}: {problems[0].Message}", parameter);
        }
    }

    private static LogSchedule[] Schedule(LogStack logs, OpeningModel model) =>
    [
        .. model.Bays.SelectMany((clear, bay) => model.Runs.Select(run => LogHandling.Schedule(bay + 1, clear, logs, run))),
    ];

    private static CaseResult[] Cases(OpeningModel model)
    {
        var numbers = new CaseEvaluation(model.LogCount, model.Bays.Count);
        var results = new CaseResult[model.Cases.Count];
        for (var i = 0; i < results.Length; i++)
        {
            numbers.Fill(model, model.Cases[i]);
            results[i] = CaseReport.Of(model, model.Cases[i], numbers);
        }

        return results;
    }

    /// <summary>Actions whose load no method here covers, or not wholly: by name.</summary>
    private static List<string> Uncovered(OpeningModel model)
    {
        var names = new List<string>();
        if (model.Flow is { Velocity: > Flow.SurchargeVelocityLimit })
        {
            names.Add("flow");
        }

        if (model.Wave is { IsCovered: false })
        {
            names.Add("wave");
        }

        return names;
    }
}
