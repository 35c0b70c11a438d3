using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>The guides at both ends under a load case, and what their check still lacks.</summary>
internal static class GuideReport
{
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        if (model.Opening.Barrier.Guides is not { } guides)
        {
            return [];
        }

        var (bending, shear) = (DesignStress.Bending(model.GuideMaterial!, model.Basis), DesignStress.Shear(model.GuideMaterial!, model.Basis));
        return BothSides(model, side => Part(new(model, guides, kind, numbers, side), bending, shear));
    }

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (model.Opening.Barrier.Guides is not { } guides)
        {
            yield return Gap("missing", $"The guides have no inputs: enter their mounting and dimensions, or declare them designed by others.");
            yield break;
        }

        if (DesignStress.Bending(model.GuideMaterial!, model.Basis) is null || DesignStress.Shear(model.GuideMaterial!, model.Basis) is null)
        {
            yield return Gap("material", $"The material of the guides has no bending or shear stress under this design basis: enter an allowable or a strength for both.");
        }

        if (guides.WallBearing is null)
        {
            yield return Gap("wall-bearing", $"{GuideFields.WallBearing.Label} under the guides is empty: enter the pressure that the wall may take.");
        }
        else if (string.IsNullOrWhiteSpace(guides.WallBearingSource))
        {
            yield return Gap("wall-bearing", $"{GuideFields.WallBearing.Label} under the guides has no source: enter where the value comes from.");
        }
    }

    /// <summary>Left and right; a right guide whose bay is as wide as the left one's shares its results.</summary>
    public static IEnumerable<PartResult> BothSides(OpeningModel model, Func<bool, PartResult?> part)
    {
        var left = part(false);
        var right = model.Bays[0] == model.Bays[^1] ? left is null ? null : left with { Member = "right guide" } : part(true);
        return new[] { left, right }.OfType<PartResult>();
    }

    private static PartResult? Part(GuideCase guide, DesignStress? bending, DesignStress? shear)
    {
        Check?[] checks =
        [
            bending is null ? null : GuideChecks.LipBending(guide, bending),
            shear is null ? null : GuideChecks.LipShear(guide, shear),
            bending is null ? null : GuideChecks.BaseBending(guide, bending),
            GuideChecks.WallBearing(guide),
        ];
        Check[] made = [.. checks.OfType<Check>()];
        return made.Length == 0 ? null : new(NeededChecks.Guides, guide.Member, made, []);
    }

    private static PartGap Gap(string code, FormattableString text) => new(NeededChecks.Guides, new($"guides-{code}", new(text)));
}
