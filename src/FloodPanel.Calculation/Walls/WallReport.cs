using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Walls;

/// <summary>The wall that receives the guides.</summary>
internal static class WallReport
{
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        if (model.Opening.WallBehind is not { } wall)
        {
            return [];
        }

        if (wall.Measure == WallMeasure.PublishedDepth)
        {
            return kind == CaseKind.DesignFlood && WallDepth.Limit(model.Opening.Wall) is { } limit
                ? [new(NeededChecks.SupportingWall, "wall", [Depth(model, limit)], [])]
                : [];
        }

        var guides = new[] { ("left wall", numbers.LeftGuide), ("right wall", numbers.RightGuide) };
        return guides
            .Select(guide => new PartResult(NeededChecks.SupportingWall, guide.Item1, [.. Reactions(wall, guide.Item2)], []))
            .Where(part => part.Checks.Count > 0);
    }

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (model.Opening.Barrier.Footing is { CarriesGuides: true })
        {
            yield break;
        }

        if (Gap(model.Opening) is { } text)
        {
            yield return new(NeededChecks.SupportingWall, text);
        }
    }

    private static Note? Gap(Opening opening)
    {
        if (opening.WallBehind is not { } wall)
        {
            return new($"{NeededChecks.SupportingWall}-missing", new(
                $"The wall behind is not judged: enter its resistance with its source, or declare it designed by others."));
        }

        if (wall.Measure == WallMeasure.PublishedDepth)
        {
            return WallDepth.Limit(opening.Wall) is null
                ? new("wall-not-covered", new(
                    $"No published depth covers {WallDepth.Name(opening.Wall)}: enter its resistance with its source, or declare it designed by others."))
                : null;
        }

        if (wall.LineResistance is null && wall.TotalResistance is null)
        {
            return new("wall-resistance-missing", new(
                $"The wall behind has no resistance: enter the resistance along its edge or to a guide, or declare it designed by others."));
        }

        return string.IsNullOrWhiteSpace(wall.Source)
            ? new("wall-source-missing", new($"The resistance of the wall behind has no source: enter who gives it, and where."))
            : null;
    }

    private static Check Depth(OpeningModel model, WallDepthLimit limit)
    {
        var depth = WallDepth.Against(model.Site, model.Opening);
        var steps = new StepList(3);
        steps.Given("h_w", depth, Dimension.Length);
        steps.Given("h_lim", limit.Depth, Dimension.Length);
        steps.Add("u", "h_w/h_lim", depth / limit.Depth, Dimension.Ratio);
        return new("wall-depth", "Depth of water against the wall", limit.Source, Dimension.Length, depth, limit.Depth, steps.Done());
    }

    private static IEnumerable<Check> Reactions(WallInput wall, GuideResponse guide)
    {
        if (wall.LineResistance is { } line)
        {
            yield return Against("wall-line-load", "Line load on the edge", Dimension.LineForce, "n", "n_R", guide.PeakLineReaction, line, wall);
        }

        if (wall.TotalResistance is { } total)
        {
            yield return Against("wall-reaction", "Reaction of a guide", Dimension.Force, "R", "R_R", guide.Reaction, total, wall);
        }
    }

    private static Check Against(
        string name, string title, Dimension dimension, string symbol, string limit, double demand, double capacity, WallInput wall)
    {
        var steps = new StepList(3);
        steps.Given(symbol, demand, dimension);
        steps.Given(limit, capacity, dimension);
        steps.Add("u", $"{symbol}/{limit}", demand / capacity, Dimension.Ratio);
        var source = string.IsNullOrWhiteSpace(wall.Source) ? "typed by the user, no source given" : $"typed by the user: {wall.Source.Trim()}";
        return new(name, title, $"Resistance {source}", dimension, demand, capacity, steps.Done());
    }
}
