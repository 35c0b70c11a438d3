using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Water;

/// <summary>Where the design level and the table of levels do not go together.</summary>
internal static class LevelNotes
{
    public static IEnumerable<Note> Of(Site site)
    {
        if (LevelCurve.Of(site.Levels) is not { } curve)
        {
            yield break;
        }

        if (curve.At(site.AnnualProbability) is not { } level)
        {
            yield return new("level-outside-table", new(
                $"The design probability, {Chance(site.AnnualProbability)}, lies outside the table of levels, {Chance(curve.Points[^1].AnnualProbability)} to {Chance(curve.Points[0].AnnualProbability)}: nothing is extrapolated, and the typed level stands."));
        }
        else if (!curve.Gives(site.AnnualProbability, site.DesignStillWaterLevel))
        {
            yield return new("level-differs-from-table", new(
                $"The design still-water level, {Length(site.DesignStillWaterLevel)}, is not that of the table of levels at this probability, {Length(level)}. The typed level stands."));
        }
    }

    private static Quantity Chance(double value) => new(value, Dimension.Probability);

    private static Quantity Length(double value) => new(value, Dimension.Length);
}
