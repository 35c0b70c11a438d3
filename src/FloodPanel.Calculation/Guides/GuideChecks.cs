using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>Checks of a guide itself and of the wall under it.</summary>
internal static class GuideChecks
{
    private const string Spread = "width by a spread at 45°, AISC Design Guide 1, 3rd ed., Example 4.7-3";

    /// <summary>Bending at the root of the lip.</summary>
    public static Check LipBending(GuideCase guide, DesignStress allowed)
    {
        var (lever, thickness) = (guide.Guides.LipLever, guide.Guides.LipThickness);
        var stress = GuideStrength.LipBending(guide.PeakLine, lever, thickness);
        var steps = new StepList(14);
        guide.ExplainPeak(steps);
        steps.Given("l", lever, Dimension.SectionLength);
        steps.Given("t", thickness, Dimension.SectionLength);
        steps.Add("σ", "6·n·l/t²", stress, Dimension.Stress);
        steps.Stress("f_b", allowed);
        steps.Add("u", "σ/f_b", stress / allowed.Value, Dimension.Ratio);
        return new("guide-lip-bending", "Bending of the lip", $"Cantilever lip, 6·n·l/t²; {allowed.Source}", Dimension.Stress, stress, allowed.Value, steps.Done());
    }

    /// <summary>Shear in the lip.</summary>
    public static Check LipShear(GuideCase guide, DesignStress allowed)
    {
        var stress = GuideStrength.LipShear(guide.PeakLine, guide.Guides.LipThickness);
        var steps = new StepList(12);
        guide.ExplainPeak(steps);
        steps.Given("t", guide.Guides.LipThickness, Dimension.SectionLength);
        steps.Add("τ", "1.5·n/t", stress, Dimension.Stress);
        steps.Stress("f_v", allowed);
        steps.Add("u", "τ/f_v", stress / allowed.Value, Dimension.Ratio);
        return new("guide-lip-shear", "Shear of the lip", $"Solid rectangle, 1.5·n/t; {allowed.Source}", Dimension.Stress, stress, allowed.Value, steps.Done());
    }

    /// <summary>Bending of the part that is fixed to the wall; null where the wall takes the load beneath it.</summary>
    public static Check? BaseBending(GuideCase guide, DesignStress allowed)
    {
        var guides = guide.Guides;
        if (guide.Statics.Tension == 0)
        {
            return null;
        }

        var worst = guide.Worst(index => Stress(guide, index));
        var stress = Stress(guide, worst);
        var steps = new StepList(40);
        guide.ExplainFastener(steps, worst);
        steps.Given("a", guides.LoadOffset, Dimension.SectionLength);
        steps.Given("z", guides.BearingDistance, Dimension.SectionLength);
        steps.Add("M", MomentFormula(guides.Mounting), Moment(guide, worst), Dimension.Moment);
        if (guides.Mounting == GuideMounting.DryFace)
        {
            steps.Given("d_0", guides.Fasteners.HoleDiameter, Dimension.SectionLength);
        }

        steps.Add("b_eff", WidthFormula(guides.Mounting), Width(guide, worst), Dimension.SectionLength);
        steps.Given("t_b", guides.BaseThickness, Dimension.SectionLength);
        steps.Add("σ", "6·M/(b_eff·t_b²)", stress, Dimension.Stress);
        steps.Stress("f_b", allowed);
        steps.Add("u", "σ/f_b", stress / allowed.Value, Dimension.Ratio);
        return new("guide-base-bending", "Bending of the base", $"{GuideStatics.Source}; {Spread}; {allowed.Source}", Dimension.Stress, stress, allowed.Value, steps.Done());
    }

    /// <summary>Pressure on the wall under the bearing strip; null where the wall's figure or its source is missing.</summary>
    public static Check? WallBearing(GuideCase guide)
    {
        var guides = guide.Guides;
        if (guides.WallBearing is not { } allowed || string.IsNullOrWhiteSpace(guides.WallBearingSource))
        {
            return null;
        }

        var pressure = guide.PeakLine * guide.Statics.Bearing / guides.BearingWidth;
        var steps = new StepList(15);
        guide.ExplainPeak(steps);
        steps.Given("a", guides.LoadOffset, Dimension.SectionLength);
        steps.Given("z", guides.BearingDistance, Dimension.SectionLength);
        steps.Add("C", guide.Statics.BearingFormula.Length > 0 ? $"n·{guide.Statics.BearingFormula}" : "n", guide.PeakLine * guide.Statics.Bearing, Dimension.LineForce);
        steps.Given("c", guides.BearingWidth, Dimension.SectionLength);
        steps.Add("p", "C/c", pressure, Dimension.Stress);
        steps.Given("p_R", allowed, Dimension.Stress);
        steps.Add("u", "p/p_R", pressure / allowed, Dimension.Ratio);
        return new("guide-wall-bearing", "Pressure on the wall", $"{GuideStatics.Source}; wall: {guides.WallBearingSource.Trim()}", Dimension.Stress, pressure, allowed, steps.Done());
    }

    /// <summary>M, at the fasteners on a dry face, else at the bearing strip [N·m].</summary>
    private static double Moment(GuideCase guide, int index)
    {
        var (guides, load) = (guide.Guides, guide.OnFastener(index));
        return guides.Mounting == GuideMounting.WetFace ? load * (guides.LoadOffset - guides.BearingDistance) : load * guides.LoadOffset;
    }

    private static string MomentFormula(GuideMounting mounting) => mounting == GuideMounting.WetFace ? "R·(a − z)" : "R·a";

    /// <summary>b_eff, no more than the stretch and the spread from the fastener to where the moment is [m].</summary>
    private static double Width(GuideCase guide, int index)
    {
        var (guides, (from, to)) = (guide.Guides, guide.Row.Stretch(index));
        return guides.Mounting == GuideMounting.DryFace
            ? Math.Min(to - from, 2 * Math.Min(guides.LoadOffset, guides.BearingDistance)) - guides.Fasteners.HoleDiameter
            : Math.Min(to - from, 2 * guides.BearingDistance);
    }

    private static string WidthFormula(GuideMounting mounting) =>
        mounting == GuideMounting.DryFace ? "min(y_2 − y_1, 2·min(a, z)) − d_0" : "min(y_2 − y_1, 2·z)";

    private static double Stress(GuideCase guide, int index) =>
        GuideStrength.BaseBending(Moment(guide, index), Width(guide, index), guide.Guides.BaseThickness);
}
