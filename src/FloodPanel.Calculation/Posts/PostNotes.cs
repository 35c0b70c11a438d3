using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>Says of the posts which checks are left out, and why.</summary>
internal static class PostNotes
{
    public static IEnumerable<Note> Of(Member post, DesignBasis basis)
    {
        if (post.Material.Family == MaterialFamily.Steel && basis.Kind != DesignBasisKind.Eurocode)
        {
            yield return new("post-no-interaction", new(
                $"Posts: bending and shear are checked each by itself; AISC 360 asks for no interaction of them."));
        }

        if (Lateral(post, basis) is { } lateral)
        {
            yield return new("post-lateral", lateral);
        }
    }

    private static Sentence? Lateral(Member post, DesignBasis basis) => post.Profile switch
    {
        HollowRectangle or RectangularTube => new(
            $"Posts: no check of lateral-torsional buckling, because a closed section is stiff in torsion."),
        Rectangle when post.Section.Depth <= post.Section.Height => new(
            $"Posts: no check of lateral-torsional buckling, because a bar that is no deeper than wide does not buckle so."),
        ISection when PostLateral.IsCovered(post, basis) => null,
        ISection => new(
            $"Posts: lateral-torsional buckling is not checked: it needs the bending strength of a steel or aluminium that the design basis covers."),
        _ => new($"Posts: lateral-torsional buckling is not covered for this section; check it by hand."),
    };
}
