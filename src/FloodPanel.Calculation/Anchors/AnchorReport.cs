using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of the base plates.</summary>
internal static class AnchorReport
{
    public static IEnumerable<PartResult> Of(OpeningModel model, CaseEvaluation numbers)
    {
        var barrier = model.Opening.Barrier;
        if (model.Post is null || barrier is not { Anchors: { } anchors, BasePlate: not null } || Lacks(anchors, model.Basis.Kind) is not null)
        {
            return [];
        }

        var posts = numbers.Posts.ToArray();
        return Enumerable.Range(0, model.PostCount).Select(post => Part(model, anchors, posts[post], post));
    }

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        var barrier = model.Opening.Barrier;
        if (model.Post is null)
        {
            yield break;
        }

        if (barrier.Anchors is not { } anchors)
        {
            yield return Gap("anchors-missing", $"The anchors of the base plates have no inputs: enter them, or declare them designed by others.");
        }
        else if (barrier.BasePlate is null)
        {
            yield return Gap("anchors-no-plate", $"The anchors need the base plate that they hold: enter it, or declare the anchors designed by others.");
        }
        else if (Lacks(anchors, model.Basis.Kind) is { } text)
        {
            yield return new(NeededChecks.Anchors, text);
        }
    }

    /// <summary>Cautions on anchors as entered.</summary>
    public static IEnumerable<Note> Notes(Opening opening)
    {
        if (opening.Barrier is not { Anchors: { } anchors, Posts: not null })
        {
            yield break;
        }

        if (anchors.Kind == AnchorKind.PostInstalled || anchors.Method == AnchorMethod.Approval)
        {
            yield return new("anchor-installation", new(
                $"Drilled anchors hold only as well as they are set: hole, cleaning, torque and inspection follow the approval, and a trained installer sets them (common practice)."));
        }

        if (anchors.Method == AnchorMethod.En1992 && (anchors.Cracked || anchors.CriticalEdge is null))
        {
            yield return new("anchor-splitting", new(
                $"Splitting of the concrete is not checked: reinforcement must hold its cracks to 0.3 mm, and edge distance, spacing and thickness must be at least those of the approval."));
        }

        if (!anchors.Cracked)
        {
            yield return new("anchor-uncracked", new(
                $"The anchors count on concrete that does not crack: show that it stays in compression, or take it as cracked."));
        }
    }

    private static PartResult Part(OpeningModel model, AnchorInput anchors, PostResponse response, int post)
    {
        var setting = new PlateSetting(model, response);
        var demand = new AnchorDemand(
            setting.Response.Tension, setting.Response.OtherTension, setting.Shear, response.BaseMoment < 0, response.BaseShear < 0);
        return new(
            NeededChecks.Anchors, FormattableString.Invariant($"post {post + 1}"),
            AnchorResistance.Checks(anchors, setting.Plate, demand, model.Basis.Kind),
            [new("Tension of the row of anchors", BasePlates.Source, setting.UntilTension().Done())]);
    }

    /// <summary>Why there is no result; null where there is one. Part of the checks alone would say too much.</summary>
    private static Note? Lacks(AnchorInput anchors, DesignBasisKind basis) => NotCovered(anchors, basis) ?? Unfinished(anchors);

    /// <summary>What the method does not cover; null where it covers all.</summary>
    private static Note? NotCovered(AnchorInput anchors, DesignBasisKind basis) => (anchors.Method, basis) switch
    {
        (AnchorMethod.Aci318, DesignBasisKind.Eurocode) => Covered(
            $"ACI 318 does not go with the Eurocode basis: judge the anchors by EN 1992-4 or by approval values."),
        (AnchorMethod.En1992, DesignBasisKind.AllowableStress or DesignBasisKind.UsStrength) => Covered(
            $"EN 1992-4 goes with the Eurocode basis only: judge the anchors by ACI 318 or by approval values."),
        (AnchorMethod.En1992, _) when anchors.Kind == AnchorKind.Hooked => Covered(
            $"EN 1992-4 does not cover hooks: use headed anchors, or approval values."),
        (AnchorMethod.En1992, _) when anchors.Ultimate > EurocodeAnchors.MostUltimate => Covered(
            $"EN 1992-4 covers the shear of steel to an ultimate strength of {new Quantity(EurocodeAnchors.MostUltimate, Dimension.Stress)}; the anchors have {new Quantity(anchors.Ultimate, Dimension.Stress)}."),
        (AnchorMethod.Aci318, _) when anchors.Depth > AciAnchors.GreatestDepth => Covered(
            $"ACI 318 covers breakout to an effective depth of {new Quantity(AciAnchors.GreatestDepth, Dimension.SectionLength)}; the anchors are {new Quantity(anchors.Depth, Dimension.SectionLength)} deep."),
        (AnchorMethod.Aci318, _) when anchors is { Kind: AnchorKind.Hooked, HookLength: { } hook } && hook < 3 * anchors.Diameter => Covered(
            $"ACI 318 covers hooks of at least three diameters, {new Quantity(3 * anchors.Diameter, Dimension.SectionLength)}; the hook is {new Quantity(hook, Dimension.SectionLength)} long."),
        _ => null,
    };

    /// <summary>What is still to be entered; null where nothing is.</summary>
    private static Note? Unfinished(AnchorInput anchors)
    {
        if (anchors.Method == AnchorMethod.Approval)
        {
            return anchors.TensionResistance is null || anchors.ShearResistance is null
                ? new("anchor-values-missing", new($"The anchors have no resistance to tension or shear: enter both from the approval."))
                : NeedsSource(anchors);
        }

        return anchors.Kind switch
        {
            AnchorKind.Headed when anchors.HeadArea is null =>
                new("anchor-head-missing", new($"The anchors are headed: enter the bearing area of the head.")),
            AnchorKind.Hooked when anchors.HookLength is null =>
                new("anchor-hook-missing", new($"The anchors are hooked: enter the length of the hook.")),
            AnchorKind.PostInstalled when anchors.Pullout is null =>
                new("anchor-pullout-missing", new($"The anchors are drilled: enter their pull-out strength from the approval.")),
            AnchorKind.PostInstalled when anchors.MinimumEdge is null || anchors.MinimumSpacing is null =>
                new("anchor-distances-missing", new($"The anchors are drilled: enter the least edge distance and the least spacing of their approval.")),
            AnchorKind.PostInstalled when !anchors.Cracked && anchors.CriticalEdge is null =>
                new("anchor-critical-edge-missing", new($"The anchors are drilled and the concrete does not crack: enter the critical edge distance of their approval, or take the concrete as cracked.")),
            AnchorKind.PostInstalled => NeedsSource(anchors),
            _ => null,
        };
    }

    private static Note? NeedsSource(AnchorInput anchors) => string.IsNullOrWhiteSpace(anchors.Source)
        ? new("anchor-source-missing", new($"The values of the anchors have no source: enter the number of the approval or test report."))
        : null;

    private static Note Covered(FormattableString text) => new("anchor-not-covered", new(text));

    private static PartGap Gap(string code, FormattableString text) => new(NeededChecks.Anchors, new(code, new(text)));
}
