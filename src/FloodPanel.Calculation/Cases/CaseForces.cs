using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Cases;

/// <summary>The forces of a case that are no pressure: debris and a line load, and what they do to each member.</summary>
internal static class CaseForces
{
    /// <summary>Deflections under debris are reported, not judged: an accidental impact may bend what still stands.</summary>
    public static bool JudgesDeflection(CaseKind kind) => kind != CaseKind.Debris;

    /// <summary>The line load of its case [N/m]; null in the others.</summary>
    public static ConcentratedForce? LineLoad(OpeningModel model, CaseKind kind) =>
        kind == CaseKind.Line && model.Line is { } line
            ? new(line.Force, CaseDiagram.Factor(model.Factors, kind), Math.Min(line.Height, model.Height))
            : null;

    /// <summary>P, the share of an impact that one log may take [N]; each log by itself, not all at a time.</summary>
    public static FactoredLoad OnLog(OpeningModel model, CaseKind kind, int bay, int index)
    {
        if (kind != CaseKind.Debris || model.Debris is not { } debris || !debris.Strikes(model.EdgeHeight(index)))
        {
            return default;
        }

        var share = debris.Force(bay) * DebrisModel.Share(model.LogHeights[index]);
        return new(share, CaseDiagram.Factor(model.Factors, kind) * share);
    }

    /// <summary>F on a post [N]: the whole impact, or the line load over its tributary width.</summary>
    public static ConcentratedForce OnPost(OpeningModel model, CaseKind kind, int post)
    {
        if (kind == CaseKind.Debris && model.Debris is { } debris)
        {
            return Impact(model, Math.Max(debris.Force(post), debris.Force(post + 1)));
        }

        return LineLoad(model, kind)?.Over(model.PostTributary(post)) ?? default;
    }

    /// <summary>Debris on the guide of a bay.</summary>
    public static GuideImpact OnGuide(OpeningModel model, CaseKind kind, int bay)
    {
        if (kind != CaseKind.Debris || model.Debris is not { } debris)
        {
            return default;
        }

        var struck = 0;
        while (struck < model.LogCount && debris.Strikes(model.EdgeHeight(struck)))
        {
            struck++;
        }

        return new(Impact(model, debris.Force(bay)).Design, struck);
    }

    /// <summary>An impact at the water line, or at the top of a barrier that is lower.</summary>
    public static ConcentratedForce Impact(OpeningModel model, double force) =>
        new(force, CaseDiagram.Factor(model.Factors, CaseKind.Debris), model.Debris!.StrikeHeight);
}
