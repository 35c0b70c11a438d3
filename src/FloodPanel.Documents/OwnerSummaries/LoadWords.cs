using FloodPanel.Calculation;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Reports;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>What a barrier was checked against, in the owner's words.</summary>
internal static class LoadWords
{
    /// <summary>"Calculated for still water and flow of 1.20 m/s."; nothing where still water is all.</summary>
    public static IEnumerable<Block> Of(OpeningResult result, UnitSystem units)
    {
        var actions = result.Opening.Actions;
        var cases = result.Cases.Select(c => c.Kind).ToHashSet();
        string Shown(double value, Dimension dimension) => Units.Format(value, dimension, units);
        List<string> words = ["still water"];
        if (actions.Flow is { } flow)
        {
            words.Add($"flow of {Shown(flow.Velocity, Dimension.Velocity)}");
        }

        if (cases.Contains(CaseKind.Wave))
        {
            words.Add(actions.Wave is NonBreakingWaveInput wave ? $"waves {Shown(wave.Height, Dimension.Length)} high" : "breaking waves");
        }

        if (cases.Contains(CaseKind.Debris) && actions.Debris is { } debris)
        {
            words.Add($"a floating object of {Shown(debris.Mass, Dimension.Mass)} at {Shown(debris.Velocity, Dimension.Velocity)}");
        }

        if (cases.Contains(CaseKind.Wind))
        {
            words.Add("wind on the dry barrier");
        }

        if (cases.Contains(CaseKind.Line))
        {
            words.Add("people leaning on the dry barrier");
        }

        return words.Count > 1 ? [new Paragraph($"Calculated for {OwnerAdvice.List(words)}.")] : [];
    }
}
