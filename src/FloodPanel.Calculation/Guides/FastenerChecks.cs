namespace FloodPanel.Calculation.Guides;

/// <summary>Checks of the fasteners of a guide: the worst of them against the values of their approval.</summary>
internal static class FastenerChecks
{
    /// <summary>Tension; null where there is none, or no value for it.</summary>
    public static Check? Tension(GuideCase guide)
    {
        if (guide.Statics.Tension == 0 || guide.Guides.Fasteners.Tension is not { } allowed)
        {
            return null;
        }

        var steps = new StepList(40);
        var tension = ExplainTension(guide, steps);
        steps.Given("N_R", allowed, Dimension.Force);
        steps.Add("u", "T/N_R", tension / allowed, Dimension.Ratio);
        return new("fastener-tension", "Tension of the worst fastener", Source(guide), Dimension.Force, tension, allowed, steps.Done());
    }

    /// <summary>Shear; null where there is none, or no value for it.</summary>
    public static Check? Shear(GuideCase guide)
    {
        if (guide.Statics.Shear == 0 || guide.Guides.Fasteners.Shear is not { } allowed)
        {
            return null;
        }

        var steps = new StepList(40);
        var shear = ExplainShear(guide, steps);
        steps.Given("V_R", allowed, Dimension.Force);
        steps.Add("u", "V/V_R", shear / allowed, Dimension.Ratio);
        return new("fastener-shear", "Shear of the worst fastener", Source(guide), Dimension.Force, shear, allowed, steps.Done());
    }

    /// <summary>Tension and shear together; null where one of them is absent or has no value.</summary>
    public static Check? Interaction(GuideCase guide)
    {
        var fasteners = guide.Guides.Fasteners;
        if (guide.Statics.Shear == 0 || guide.Statics.Tension == 0 || fasteners.Tension is not { } tensile || fasteners.Shear is not { } shearing)
        {
            return null;
        }

        var steps = new StepList(45);
        var tension = ExplainTension(guide, steps);
        var shear = guide.Statics.Shear * guide.OnFastener(Worst(guide));
        steps.Add("V", "R", shear, Dimension.Force);
        steps.Given("N_R", tensile, Dimension.Force);
        steps.Given("V_R", shearing, Dimension.Force);
        var sum = tension / tensile + shear / shearing;
        steps.Add("u_NV", "T/N_R + V/V_R", sum, Dimension.Ratio);
        steps.Given("u_R", fasteners.InteractionLimit, Dimension.Ratio);
        steps.Add("u", "u_NV/u_R", sum / fasteners.InteractionLimit, Dimension.Ratio);
        return new("fastener-interaction", "Tension and shear together", $"Sum of the utilisations; {Source(guide)}", Dimension.Ratio, sum, fasteners.InteractionLimit, steps.Done());
    }

    /// <summary>Edge distance to the arris; null without the least one.</summary>
    public static Check? EdgeDistance(GuideCase guide)
    {
        var fasteners = guide.Guides.Fasteners;
        if (fasteners.MinimumEdge is not { } least)
        {
            return null;
        }

        var steps = new StepList(3);
        steps.Given("c_min", least, Dimension.SectionLength);
        steps.Given("c_1", fasteners.EdgeDistance, Dimension.SectionLength);
        steps.Add("u", "c_min/c_1", least / fasteners.EdgeDistance, Dimension.Ratio);
        return new("fastener-edge-distance", "Edge distance to the arris", fasteners.Source.Trim(), Dimension.SectionLength, least, fasteners.EdgeDistance, steps.Done()) { IsDetailing = true };
    }

    /// <summary>Spacing; null without the least one.</summary>
    public static Check? Spacing(GuideCase guide)
    {
        if (guide.Guides.Fasteners.MinimumSpacing is not { } least)
        {
            return null;
        }

        var row = guide.Row;
        var steps = new StepList(6);
        steps.Given("s_min", least, Dimension.SectionLength);
        steps.Given("H", row.Length, Dimension.Length);
        steps.Given("e_1", row.EndDistance, Dimension.SectionLength);
        steps.Given("N", row.Spaces, Dimension.Count);
        steps.Add("s", "(H − 2·e_1)/N", row.Spacing, Dimension.SectionLength);
        steps.Add("u", "s_min/s", least / row.Spacing, Dimension.Ratio);
        return new("fastener-spacing", "Spacing of the fasteners", guide.Guides.Fasteners.Source.Trim(), Dimension.SectionLength, least, row.Spacing, steps.Done()) { IsDetailing = true };
    }

    /// <summary>What the worst fastener receives, where no value is there to hold it against; nothing where the wall takes it all.</summary>
    public static IEnumerable<Working> Forces(GuideCase guide, bool hasValues)
    {
        var fasteners = guide.Guides.Fasteners;
        if (guide.Statics.Tension > 0 && !(hasValues && fasteners.Tension is not null))
        {
            var steps = new StepList(40);
            ExplainTension(guide, steps);
            yield return new("Tension of the worst fastener", GuideStatics.Source, steps.Done());
        }

        if (guide.Statics.Shear > 0 && !(hasValues && fasteners.Shear is not null))
        {
            var steps = new StepList(40);
            ExplainShear(guide, steps);
            yield return new("Shear of the worst fastener", GuideStatics.Source, steps.Done());
        }
    }

    private static int Worst(GuideCase guide) => guide.Worst(guide.OnFastener);

    private static double ExplainTension(GuideCase guide, StepList steps)
    {
        var worst = Worst(guide);
        var tension = guide.Statics.Tension * guide.OnFastener(worst);
        guide.ExplainFastener(steps, worst);
        steps.Given("a", guide.Guides.LoadOffset, Dimension.SectionLength);
        steps.Given("z", guide.Guides.BearingDistance, Dimension.SectionLength);
        steps.Add("T", $"R·{guide.Statics.TensionFormula}", tension, Dimension.Force);
        return tension;
    }

    private static double ExplainShear(GuideCase guide, StepList steps)
    {
        var worst = Worst(guide);
        var shear = guide.Statics.Shear * guide.OnFastener(worst);
        guide.ExplainFastener(steps, worst);
        steps.Add("V", "R", shear, Dimension.Force);
        return shear;
    }

    private static string Source(GuideCase guide) => $"{GuideStatics.Source}; resistance: {guide.Guides.Fasteners.Source.Trim()}";
}
