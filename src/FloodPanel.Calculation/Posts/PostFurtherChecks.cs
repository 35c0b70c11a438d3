namespace FloodPanel.Calculation.Posts;

/// <summary>What a post must stand besides bending, shear and deflection by themselves.</summary>
internal static class PostFurtherChecks
{
    /// <summary>The checks of one post that have their inputs.</summary>
    /// <param name="model">The opening.</param>
    /// <param name="post">The post, from 0.</param>
    /// <param name="response">What it feels.</param>
    /// <param name="judgesDeflection">False where deflections are reported and not judged.</param>
    public static IEnumerable<Check> Of(OpeningModel model, int post, PostResponse response, bool judgesDeflection)
    {
        var member = model.Post!;
        Check?[] checks =
        [
            PostInteraction.WithShear(response, member, model.Basis.Kind),
            PostInteraction.WithTension(response, member),
            PostLateral.Of(response, member, model.FaceLength, model.Basis),
            .. PostWalls.Of(model, response),
            .. PostWelded.Of(model, response),
            model.Raker is { } raker ? RakerCompression.Of(response.Prop!, raker, model.Basis) : null,
            judgesDeflection ? PostDrift.Of(model, post, response) : null,
        ];
        return checks.OfType<Check>();
    }
}
