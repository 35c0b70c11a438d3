using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Covers;

/// <summary>
/// Tension of the worst fastener: its share of the edge reaction where the water pulls the plate off, the corner that wants to lift
/// where the water presses it on, the fixing moment of a clamped rim, and the gasket.
/// </summary>
/// <remarks>
/// Source: plate statics; a fastener takes the greatest reaction over its pitch, one at a corner the corner's force and half a pitch (common
/// practice; safe, because the reaction is less elsewhere). Limits: the seat is stiff; tension by prying of a thin rim is not in it.
/// </remarks>
internal static class CoverTension
{
    /// <summary>True where the water or the gasket pulls on the fasteners.</summary>
    public static bool Pulls(CoverCase cover) =>
        cover.Cover.Pressing == CoverPressing.Unseating || cover.Cover.Fasteners.GasketLoad > 0 || cover.IsClamped
        || cover.Plate?.CornerHold > 0;

    /// <summary>True where every input of the tension is there.</summary>
    public static bool IsKnown(CoverCase cover) => !cover.IsClamped || cover.Cover.Fasteners.FixingLever is not null;

    /// <summary>The tension against what a fastener may take.</summary>
    public static Check Check(CoverCase cover, PlateResponse plate, double allowed)
    {
        var steps = new StepList(24);
        var tension = Explain(cover, plate, steps);
        steps.Given("T_R", allowed, Dimension.Force);
        steps.Add("u", "T/T_R", tension / allowed, Dimension.Ratio);
        var source = $"{CoverChecks.Theory(cover)}; resistance: {cover.Cover.Fasteners.Source.Trim()}";
        return new("cover-fastener-tension", "Tension of the worst fastener", source, Dimension.Force, tension, allowed, steps.Done());
    }

    /// <summary>The tension alone, where there is no value to hold it against.</summary>
    public static Working Working(CoverCase cover, PlateResponse plate)
    {
        var steps = new StepList(24);
        Explain(cover, plate, steps);
        return new("Tension of the worst fastener", CoverChecks.Theory(cover), steps.Done());
    }

    private static double Explain(CoverCase cover, PlateResponse plate, StepList steps)
    {
        cover.ExplainPressure(steps, isDesign: true);
        cover.ExplainReference(steps);
        steps.Given("ν", cover.Cover.PoissonRatio, Dimension.Ratio);
        steps.Given("p", cover.Cover.Fasteners.Pitch, Dimension.SectionLength);
        steps.Given("n_g", cover.Cover.Fasteners.GasketLoad, Dimension.LineForce);
        var (formula, tension) = cover.Cover.Pressing == CoverPressing.Unseating ? Unseating(cover, plate, steps) : Seating(cover, plate, steps);
        steps.Add("T", formula, tension, Dimension.Force);
        return tension;
    }

    private static (string Formula, double Tension) Unseating(CoverCase cover, PlateResponse plate, StepList steps)
    {
        var (pitch, gasket) = (cover.Cover.Fasteners.Pitch, cover.Cover.Fasteners.GasketLoad);
        var reaction = cover.Factor * plate.Reaction;
        steps.Given("κ", plate.Reaction / (cover.Pressure * cover.Reference), Dimension.Ratio);
        steps.Add("v", $"κ·q·{cover.ReferenceSymbol}", reaction, Dimension.LineForce);
        if (cover.IsClamped)
        {
            var fixing = Fixing(cover, plate, steps);
            return ("(v + μ·q·r²/e + n_g)·p", (reaction + fixing + gasket) * pitch);
        }

        if (plate.CornerPush == 0)
        {
            return ("(v + n_g)·p", (reaction + gasket) * pitch);
        }

        var push = cover.Factor * plate.CornerPush;
        steps.Given("λ", plate.CornerPush / (cover.Pressure * cover.Reference * cover.Reference), Dimension.Ratio);
        steps.Add("R_p", "λ·q·b²", push, Dimension.Force);
        return ("max(v·p, R_p + v·p/2) + n_g·p", Math.Max(reaction * pitch, push + reaction * pitch / 2) + gasket * pitch);
    }

    private static (string Formula, double Tension) Seating(CoverCase cover, PlateResponse plate, StepList steps)
    {
        var (pitch, gasket) = (cover.Cover.Fasteners.Pitch, cover.Cover.Fasteners.GasketLoad);
        if (cover.IsClamped)
        {
            var fixing = Fixing(cover, plate, steps);
            return ("(μ·q·r²/e + n_g)·p", (fixing + gasket) * pitch);
        }

        if (plate.CornerHold == 0)
        {
            return ("n_g·p", gasket * pitch);
        }

        var hold = cover.Factor * plate.CornerHold;
        steps.Given("λ", plate.CornerHold / (cover.Pressure * cover.Reference * cover.Reference), Dimension.Ratio);
        steps.Add("R", "λ·q·b²", hold, Dimension.Force);
        return ("R + n_g·p", hold + gasket * pitch);
    }

    /// <summary>m/e, line load of the couple that keeps a clamped rim from turning.</summary>
    private static double Fixing(CoverCase cover, PlateResponse plate, StepList steps)
    {
        var lever = cover.Cover.Fasteners.FixingLever!.Value;
        steps.Given("μ", plate.EdgeMoment / (cover.Pressure * cover.Reference * cover.Reference), Dimension.Ratio);
        steps.Given("e", lever, Dimension.SectionLength);
        return cover.Factor * plate.EdgeMoment / lever;
    }
}
