using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>A project of one opening.</summary>
public sealed record Scenario(Project Project)
{
    internal Opening Opening => Project.Openings[0];

    internal Site Site => Project.Site;

    internal OpeningResult Result => Design.Evaluate(Project, Opening, Library.Empty);

    internal OpeningModel Model => new(Site, Opening, Library.Empty.BasisOf(Project), Library.Empty);

    internal CaseResult DesignFlood => Result.Cases.Single(c => c.Name == "design-flood");

    internal Scenario With(Func<Opening, Opening> change) =>
        new(Project with { Openings = [change(Opening)] });

    internal Scenario With(Func<Site, Site> change) => new(Project with { Site = change(Site) });

    /// <summary>The same with the still-water level so that water stands this deep above the sill.</summary>
    internal Scenario WithDepth(double depth) =>
        With((Site site) => site with { DesignStillWaterLevel = Opening.SillLevel + depth - site.Surge - site.TotalClimateAllowance });
}
