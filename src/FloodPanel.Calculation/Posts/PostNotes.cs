using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>Which checks of a post are left out: why none is needed stands beside the check of its kind, what no method covers is a note.</summary>
internal static class PostNotes
{
    /// <summary>Words for the source of the bending check where lateral-torsional buckling needs none; empty else.</summary>
    public static string BesideBending(Member post) => post.Profile switch
    {
        HollowRectangle or RectangularTube => "; no lateral-torsional buckling, a closed section is stiff in torsion",
        Rectangle when !IsDeepBar(post) => "; no lateral-torsional buckling, a bar no deeper than wide",
        _ => "",
    };

    /// <summary>Words for the source of the shear check where no rule asks for its interaction with bending; empty else.</summary>
    public static string BesideShear(Member post, DesignBasis basis) =>
        post.Material.Family == MaterialFamily.Steel && basis.Kind != DesignBasisKind.Eurocode
            ? "; AISC 360 asks for no interaction with bending"
            : "";

    /// <summary>Buckling of the walls and lateral-torsional buckling that can occur and are not checked.</summary>
    public static IEnumerable<Note> Of(Member post, DesignBasis basis)
    {
        foreach (var note in PostWalls.Notes(post, basis))
        {
            yield return note;
        }

        if (PostLateral.CanOccur(post) && !PostLateral.IsCovered(post, basis))
        {
            yield return Lateral(new(
                $"Posts: lateral-torsional buckling is not checked: it needs the bending strength of a steel or aluminium that the design basis covers."));
        }
        else if (post.Profile is GivenProperties || IsDeepBar(post))
        {
            yield return Lateral(new($"Posts: lateral-torsional buckling is not covered for this section; check it by hand."));
        }
    }

    private static bool IsDeepBar(Member post) => post.Profile is Rectangle && post.Section.Depth > post.Section.Height;

    private static Note Lateral(Sentence text) => new("post-lateral", text);
}
