using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Water;

/// <summary>Design flood level, retained depth and the height that the barrier must reach.</summary>
public static class FloodLevels
{
    /// <summary>A barrier lower than required by no more than this is as high as required [m], 1 mm.</summary>
    public const double HeightTolerance = 0.001;

    /// <summary>Levels that differ by no more are the same level [m], 1 µm: sums of lengths in feet, shown with nine figures, are no better.</summary>
    public const double LevelTolerance = 1e-6;

    private const string Source = "Levels in the project's datum";

    /// <summary>Depth of water above a sill [m]; negative where the level is below it.</summary>
    /// <param name="level">Water level [m, project datum].</param>
    /// <param name="sillLevel">Sill level [m, project datum].</param>
    /// <remarks>
    /// Rounded to 1e-10 m. Levels are sums of decimals, and the noise of their binary fractions must not decide
    /// whether water stands as high as a sill or as the water behind it. Adding zero makes a negative zero positive.
    /// </remarks>
    public static double Depth(double level, double sillLevel) => Math.Round(level - sillLevel, 10) + 0.0;

    /// <summary>Working of the design flood level of a site.</summary>
    /// <param name="site">The site.</param>
    public static Working DesignLevel(Site site) => new("Design flood level", SourceOf(site), [.. Level(site)]);

    /// <summary>Working of the levels at an opening.</summary>
    /// <param name="site">The site.</param>
    /// <param name="opening">The opening.</param>
    public static Working At(Site site, Opening opening) => new("Retained depth", SourceOf(site),
    [
        .. Level(site),
        new("z_sill", "", opening.SillLevel, Dimension.Length),
        new("h", "z_dfl − z_sill", Depth(site.DesignFloodLevel, opening.SillLevel), Dimension.Length),
    ]);

    /// <summary>Freeboard: required height of the barrier above the sill against its height.</summary>
    /// <param name="retainedDepth">h, design flood level less sill level [m].</param>
    /// <param name="freeboard">f, freeboard wanted [m], ≥ 0.</param>
    /// <param name="barrierHeight">H, vertical height of the barrier [m], > 0.</param>
    /// <remarks>Source: the project's freeboard. Limits: still water; wave crests are a matter of their own.</remarks>
    public static Check Freeboard(double retainedDepth, double freeboard, double barrierHeight)
    {
        Guard.Finite(retainedDepth);
        Guard.NonNegative(freeboard);
        Guard.Positive(barrierHeight);

        var required = Math.Max(0, retainedDepth + freeboard);
        var counted = barrierHeight + HeightTolerance;
        return new("freeboard", "Freeboard", "Freeboard chosen for the project; tolerance 1 mm", Dimension.Length, required, counted,
        [
            new("h", "", retainedDepth, Dimension.Length),
            new("f", "", freeboard, Dimension.Length),
            new("H_req", "max(0, h + f)", required, Dimension.Length),
            new("H", "", barrierHeight, Dimension.Length),
            new("Δ", "", HeightTolerance, Dimension.SectionLength),
            new("u", "H_req/(H + Δ)", required / counted, Dimension.Ratio),
        ]);
    }

    private static string SourceOf(Site site) => Table(site) is null ? Source : $"{Source}; {LevelCurve.Source}";

    /// <summary>The table that the level comes from; a level from elsewhere owes it nothing, and a note tells where the two differ.</summary>
    private static LevelCurve? Table(Site site) =>
        LevelCurve.Of(site.Levels) is { } curve && curve.Gives(site.AnnualProbability, site.DesignStillWaterLevel) ? curve : null;

    private static List<CalculationStep> Level(Site site)
    {
        var steps = new List<CalculationStep>(Table(site)?.Steps(site.AnnualProbability) ?? [])
        {
            new("z_swl", "", site.DesignStillWaterLevel, Dimension.Length),
            new("s", "", site.Surge, Dimension.Length),
            new("c", "", site.ClimateAllowance, Dimension.Length),
        };
        var grows = site.ClimateRatePerYear > 0;
        if (grows)
        {
            steps.Add(new("r", "", site.ClimateRatePerYear, Dimension.LengthPerYear));
            steps.Add(new("n", "", site.DesignLifeYears, Dimension.Years));
        }

        steps.Add(new("z_dfl", grows ? "z_swl + s + c + r·n" : "z_swl + s + c", site.DesignFloodLevel, Dimension.Length));
        return steps;
    }
}
