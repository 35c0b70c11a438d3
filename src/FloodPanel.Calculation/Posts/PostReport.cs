using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>The anchors at the feet of the rakers, and what the posts still lack.</summary>
internal static class PostReport
{
    /// <summary>The foot of each raker, where its resistance is known.</summary>
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind _, CaseEvaluation numbers)
    {
        var results = new List<PartResult>();
        if (model.Raker is { Input.FootResistance: { } resistance } raker)
        {
            for (var post = 0; post < numbers.Posts.Length; post++)
            {
                results.Add(new(
                    NeededChecks.Anchors, FormattableString.Invariant($"raker of post {post + 1}"),
                    [Foot(numbers.Posts[post].Prop!, raker, resistance)], []));
            }
        }

        return results;
    }

    /// <summary>Walls that no rule covers, a weld beside which the strength is not known, a raker that no formula covers, a foot without an anchor.</summary>
    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (PostWelded.IsWelded(model) && model.Post!.Material.WeldedYield is null)
        {
            yield return new(NeededChecks.Posts, new("post-welded-missing", new(
                $"The posts are of aluminium and welded at their base: enter the yield beside a weld of their material.")));
        }

        if (model.Post is { } post && PostWalls.NotCovered(post, model.Basis) is { } walls)
        {
            yield return new(NeededChecks.Posts, walls);
        }

        if (model.Raker is not { } raker)
        {
            yield break;
        }

        if (!RakerCompression.IsCovered(raker, model.Basis))
        {
            yield return new(NeededChecks.Posts, new("raker-not-covered", raker.Member.Material is { Family: MaterialFamily.Steel or MaterialFamily.Aluminium }
                ? new($"The rakers have no compressive strength: enter the bending strength (yield) of their material.")
                : new($"Rakers of {raker.Member.Material.Family.ToString().ToLowerInvariant()} are not covered: their buckling is checked for steel and aluminium only.")));
        }

        if (raker.Input.FootResistance is null)
        {
            yield return new(NeededChecks.Anchors, new("raker-foot-missing", new(
                $"The feet of the rakers have no anchor resistance: enter the foot anchor resistance against the horizontal thrust.")));
        }
    }

    private static Check Foot(PropResponse prop, RakerModel raker, double resistance)
    {
        var steps = new StepList(12);
        RakerSteps.Geometry(steps, raker);
        steps.Given("N", prop.Compression, Dimension.Force);
        steps.Add("H", raker.Head == raker.Input.HeadHeight ? "N·a/L_r" : "N·(a − c·tan(θ))/L_r", prop.Thrust, Dimension.Force);
        steps.Given("H_R", resistance, Dimension.Force);
        steps.Add("u", "H/H_R", prop.Thrust / resistance, Dimension.Ratio);
        return new(
            "raker-foot", "Thrust on the foot of the raker", "Statics; resistance typed by the user", Dimension.Force,
            prop.Thrust, resistance, steps.Done());
    }
}
