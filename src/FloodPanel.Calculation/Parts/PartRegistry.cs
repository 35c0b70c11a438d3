using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Footings;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.Walls;

namespace FloodPanel.Calculation.Parts;

/// <summary>The checks of one part of the barrier.</summary>
/// <param name="Of">The part under a load case; nothing where it has no inputs.</param>
/// <param name="Gaps">Why its needed check has no result; nothing where it has one.</param>
internal sealed record PartSource(
    Func<OpeningModel, CaseKind, CaseEvaluation, IEnumerable<PartResult>> Of,
    Func<OpeningModel, IEnumerable<PartGap>> Gaps);

/// <summary>Everything besides logs and posts that must resist. A new part joins the list.</summary>
internal static class PartRegistry
{
    private static readonly PartSource[] Sources =
    [
        new((_, _, _) => [], LogNotes.Gaps),
        new(BasePlateReport.Of, BasePlateReport.Gaps),
        new(PostReport.Of, PostReport.Gaps),
        new((model, _, numbers) => AnchorReport.Of(model, numbers), AnchorReport.Gaps),
        new(FastenerReport.Of, FastenerReport.Gaps),
        new(GuideReport.Of, GuideReport.Gaps),
        new(WallReport.Of, WallReport.Gaps),
        new(FootingReport.Of, FootingReport.Gaps),
    ];

    /// <summary>The parts with their checks under a load case.</summary>
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers) =>
        Sources.SelectMany(source => source.Of(model, kind, numbers));

    /// <summary>Why needed checks have no result; a needed check without a gap is complete.</summary>
    public static IEnumerable<PartGap> Gaps(OpeningModel model) => Sources.SelectMany(source => source.Gaps(model));
}
