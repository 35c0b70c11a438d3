using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>One mark on the ladder of levels: a level with its name, and where its label stands.</summary>
/// <param name="Name">What stands at the level.</param>
/// <param name="Level">The level [m].</param>
/// <param name="Y">Height of the mark in the drawing, downward.</param>
/// <param name="LabelY">Height of its label, moved so that labels do not overlap.</param>
/// <param name="Kind">"water", "top" or "sill".</param>
public sealed record LevelMark(string Name, double Level, double Y, double LabelY, string Kind);

/// <summary>Places the levels of a site and its openings on a vertical scale.</summary>
public sealed class LevelMarks
{
    public const double Height = 300;
    public const double LabelPitch = 17;

    private const double Margin = 22;

    public LevelMarks(Project project)
    {
        var site = project.Site;
        var water = new List<(string, double, string)>
        {
            ("Required top", RequiredTop.Of(site), "top"),
            ("Design flood level", site.DesignFloodLevel, "water"),
        };
        if (site.DesignFloodLevel != site.DesignStillWaterLevel)
        {
            water.Add(("Still water", site.DesignStillWaterLevel, "still"));
        }

        var sills = project.Openings.Select(o => (o.Name.Length > 0 ? o.Name : o.Id, o.SillLevel, "sill")).ToList();
        var levels = water.Concat(sills).Select(m => m.Item2).ToList();
        var (least, most) = (levels.Min(), levels.Max());
        // A ladder of no height would divide by nothing; a metre below the water is shown then.
        Bottom = most - least < 0.5 ? least - 1 : least - 0.15 * (most - least);
        Top = most;
        Right = Spread(water);
        Left = Spread(Labelled(sills));
        SillTicks = [.. sills.Select(s => YOf(s.Item2)).Distinct()];
        WaterY = YOf(site.DesignFloodLevel);
    }

    public double Bottom { get; }

    public double Top { get; }

    public double WaterY { get; }

    public IReadOnlyList<LevelMark> Left { get; }

    public IReadOnlyList<LevelMark> Right { get; }

    public IReadOnlyList<double> SillTicks { get; }

    private double YOf(double level) => Margin + (Top - level) / (Top - Bottom) * (Height - 2 * Margin);

    // As many labels as stand above each other; of more openings the highest and the lowest sills are named.
    private static List<(string, double, string)> Labelled(List<(string Name, double Level, string Kind)> sills)
    {
        const int most = (int)((Height - Margin) / LabelPitch);
        var sorted = sills.OrderByDescending(s => s.Level).ToList();
        return sorted.Count <= most ? sorted : [.. sorted.Take(most / 2), .. sorted.TakeLast(most - most / 2)];
    }

    private List<LevelMark> Spread(IEnumerable<(string Name, double Level, string Kind)> marks)
    {
        var placed = marks.OrderByDescending(m => m.Level)
            .Select(m => new LevelMark(m.Name, m.Level, YOf(m.Level), YOf(m.Level), m.Kind)).ToList();
        for (var i = 1; i < placed.Count; i++)
        {
            placed[i] = placed[i] with { LabelY = Math.Max(placed[i].LabelY, placed[i - 1].LabelY + LabelPitch) };
        }

        // What was pushed out at the bottom pushes back up.
        var floor = Height - 6;
        for (var i = placed.Count - 1; i >= 0; i--)
        {
            placed[i] = placed[i] with { LabelY = Math.Min(placed[i].LabelY, floor) };
            floor = placed[i].LabelY - LabelPitch;
        }

        return placed;
    }
}
