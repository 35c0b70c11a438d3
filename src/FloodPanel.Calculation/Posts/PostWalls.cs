using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Posts;

/// <summary>Bending of a post with regard to its walls, and beside the weld at its base.</summary>
internal static class PostWalls
{
    /// <summary>The code of a section whose walls no rule here covers.</summary>
    private const string Slender = "buckling-slender";

    /// <summary>The checks that have a resistance.</summary>
    public static IEnumerable<Check> Of(OpeningModel model, PostResponse response)
    {
        if (LocalBuckling.Of(model.Post!, model.Basis).Resistance is { } resistance)
        {
            yield return Check("post-walls", "Post bending, local buckling", response.PeakMoment, resistance);
        }

        if (PostWelded.IsWelded(model) && LocalBuckling.Of(model.Post!, model.Basis, isWeldAffected: true).Resistance is { } beside)
        {
            yield return Check("post-welded-walls", "Post bending beside the weld, local buckling", Math.Abs(response.BaseMoment), beside);
        }
    }

    /// <summary>What the walls lack, as a caution.</summary>
    public static IEnumerable<Note> Notes(Member post, ProjectTree.DesignBasis basis) =>
        LocalBuckling.Of(post, basis).Gap is { } gap && gap.Code != Slender ? [gap with { Code = $"post-{gap.Code}", Text = new($"Posts: {gap.Text}") }] : [];

    /// <summary>Walls too slender for the method; null where they are not.</summary>
    public static Note? NotCovered(Member post, ProjectTree.DesignBasis basis) =>
        LocalBuckling.Of(post, basis).Gap is { Code: Slender } gap ? gap with { Code = $"post-{gap.Code}", Text = new($"Posts: {gap.Text}") } : null;

    private static Check Check(string name, string title, double moment, WallResistance resistance) => new(
        name, title, resistance.Source, Dimension.Moment, moment, resistance.Moment,
        [
            .. resistance.Steps,
            new("M", "", moment, Dimension.Moment),
            new("u", "M/M_R", moment / resistance.Moment, Dimension.Ratio),
        ]);
}
