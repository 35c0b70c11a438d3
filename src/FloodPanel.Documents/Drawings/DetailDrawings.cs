namespace FloodPanel.Documents.Drawings;

/// <summary>The drawings of the parts of a barrier, below its elevation and section. A new part joins the list.</summary>
public static class DetailDrawings
{
    // Each draws what it finds inputs for, and nothing else.
    private static readonly Func<DrawingInput, IEnumerable<Scene>>[] Sources =
    [
        RakerDrawing.Of,
        BasePlatePlan.Of,
        AnchorDrawing.Of,
        GuideDrawing.Of,
        FootingDrawing.Of,
    ];

    /// <summary>The details of a barrier; a part without inputs has none.</summary>
    /// <param name="input">What to draw.</param>
    public static IEnumerable<Scene> Of(DrawingInput input) => Sources.SelectMany(source => source(input));
}
