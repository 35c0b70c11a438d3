using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>The fasteners of the guides under a load case, and what their check still lacks.</summary>
internal static class FastenerReport
{
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers) =>
        model.Opening.Barrier.Guides is { } guides
            ? GuideReport.BothSides(model, side => Part(new(model, guides, kind, numbers, side), HasValues(guides, model)))
            : [];

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (model.Opening.Barrier.Guides is not { } guides)
        {
            yield return Gap("missing", $"The fasteners of the guides have no inputs: enter the guides, or declare the anchors designed by others.");
            yield break;
        }

        var (fasteners, statics) = (guides.Fasteners, GuideStatics.Of(guides));
        Field[] empty =
        [
            .. Empty(statics.Tension > 0 && fasteners.Tension is null, GuideFields.Tension),
            .. Empty(statics.Shear > 0 && fasteners.Shear is null, GuideFields.Shear),
            .. Empty(fasteners.MinimumEdge is null, GuideFields.MinimumEdge),
            .. Empty(fasteners.MinimumSpacing is null, GuideFields.MinimumSpacing),
        ];
        if (empty.Length > 0)
        {
            yield return Gap("values", $"The fasteners of the guides lack values: enter {string.Join(", ", empty.Select(field => field.Label.ToLowerInvariant()))}, from their approval or from tests on the wall.");
        }

        if (string.IsNullOrWhiteSpace(fasteners.Source))
        {
            yield return Gap("source", $"The values of the guides' fasteners have no source: enter the approval or test that they come from.");
        }

        if (fasteners.ValuesFor != model.Basis.Kind)
        {
            yield return Gap("basis", $"The values of the guides' fasteners belong to another design basis than the project's: enter those of this one.");
        }
    }

    private static bool HasValues(GuideSet guides, OpeningModel model) =>
        guides.Fasteners.ValuesFor == model.Basis.Kind && !string.IsNullOrWhiteSpace(guides.Fasteners.Source);

    private static PartResult? Part(GuideCase guide, bool hasValues)
    {
        Check?[] checks = hasValues
            ?
            [
                FastenerChecks.Tension(guide),
                FastenerChecks.Shear(guide),
                FastenerChecks.Interaction(guide),
                FastenerChecks.EdgeDistance(guide),
                FastenerChecks.Spacing(guide),
            ]
            : [];
        Check[] made = [.. checks.OfType<Check>()];
        Working[] workings = [.. FastenerChecks.Forces(guide, hasValues)];
        return made.Length + workings.Length == 0 ? null : new(NeededChecks.Anchors, guide.Member, made, workings);
    }

    private static IEnumerable<Field> Empty(bool isEmpty, Field field) => isEmpty ? [field] : [];

    private static PartGap Gap(string code, FormattableString text) => new(NeededChecks.Anchors, new($"guide-fasteners-{code}", new(text)));
}
