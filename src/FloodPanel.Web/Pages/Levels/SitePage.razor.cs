using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

public sealed partial class SitePage
{
    [Inject]
    public required Library Library { get; init; }

    private Site Site => Project.Site;

    private string Risk => ExceedanceRisk.InWords(Site.AnnualProbability, Site.DesignLifeYears);

    private Sentence? ProblemOf(Field field) => Editor.ProblemAt($"site.{field.Key}");

    private void Set(string what, Func<Project, Project> edit) => Editor.Change(what, edit);

    private void SetSite(string what, Func<Site, Site> edit) =>
        Editor.Change(what, p => p with { Site = edit(p.Site) });

    private void SetLevels(ValueList<LevelPoint> levels) => SetSite("Known levels", s => s with { Levels = levels });

    private void UseLevel(LevelPoint point) => SetSite("Design level from the known levels",
        s => s with { DesignStillWaterLevel = point.Level, AnnualProbability = point.AnnualProbability });
}
