using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>Bending together with shear, and with the axial force that a raker puts into the post.</summary>
public static class PostInteraction
{
    /// <summary>ρ, part of the yield strength that shear takes from the webs.</summary>
    /// <param name="shear">V [N], ≥ 0.</param>
    /// <param name="resistance">V_R [N], > 0.</param>
    /// <returns>(2·V/V_R − 1)² above half of the resistance, else 0 [-].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: EN 1993-1-1, 6.2.8(3); EN 1999-1-1, 6.2.8(2) (both from memory).</remarks>
    public static double WebReduction(double shear, double resistance)
    {
        Guard.NonNegative(shear);
        Guard.Positive(resistance);

        var excess = Math.Max(0, 2 * shear / resistance - 1);
        return excess * excess;
    }

    /// <summary>Moment resistance beside a shear force, (W_pl − ρ·W_w)·f, no more than <paramref name="limit"/>.</summary>
    /// <param name="plastic">W_pl [m³], > 0.</param>
    /// <param name="webs">W_w, plastic modulus of the webs alone, A_w²/(4·t_w) of each [m³], ≥ 0.</param>
    /// <param name="reduction">ρ [-], 0 to 1.</param>
    /// <param name="stress">f, design stress [Pa], > 0.</param>
    /// <param name="limit">Resistance without shear [N·m]: elastic where plastic hinges are not counted on.</param>
    /// <returns>M_V [N·m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: EN 1993-1-1, 6.2.8(5) (from memory).</remarks>
    public static double MomentWithShear(double plastic, double webs, double reduction, double stress, double limit)
    {
        Guard.Positive(plastic);
        Guard.NonNegative(webs);
        Guard.InRange(reduction, 0, 1);
        Guard.Positive(stress);

        return Math.Min(limit, (plastic - reduction * webs) * stress);
    }

    /// <summary>W_w, plastic modulus of the webs: t_w·h_w²/4 of each; all of a bar, and of a section whose webs nobody has given.</summary>
    /// <param name="post">The post.</param>
    internal static double WebModulus(Member post)
    {
        var (height, face) = post.Profile switch
        {
            HollowRectangle hollow => (hollow.Webs * hollow.Web, hollow.Face),
            RectangularTube tube => (2 * tube.Wall, tube.Wall),
            ISection section => (section.Web, section.Flange),
            _ => (0, 0),
        };
        var web = post.Section.Depth - 2 * face;
        return height > 0 ? height * web * web / 4 : post.Section.PlasticModulus;
    }

    /// <summary>True where the basis asks for a check of bending beside shear: European rules for metals, and the US ones for aluminium.</summary>
    internal static bool IsAskedFor(Member post, DesignBasisKind kind) => post.Material.Family switch
    {
        MaterialFamily.Aluminium => true,
        MaterialFamily.Steel => kind == DesignBasisKind.Eurocode,
        _ => false,
    };

    /// <summary>M beside V; null where no rule asks for it, a stress is missing, or the shear alone is too much, which its own check says.</summary>
    internal static Check? WithShear(in PostResponse response, Member post, DesignBasisKind kind)
    {
        if (!post.IsComplete || !IsAskedFor(post, kind) || Math.Abs(response.PeakShear) >= post.ShearResistance)
        {
            return null;
        }

        var steps = new StepList(16);
        steps.Given("M", response.PeakMoment, Dimension.Moment);
        steps.Given("V", response.PeakShear, Dimension.Force);
        steps.Stress("f_b", post.Bending!);
        steps.Given("f_v", post.Shear!.Value, Dimension.Stress);
        steps.Given("A_v", post.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", "f_v·A_v", post.ShearResistance, Dimension.Force);
        steps.Given("W", post.Section.Modulus, Dimension.SectionModulus);
        return kind == DesignBasisKind.Eurocode ? Eurocode(steps, response, post) : Aluminium(steps, response, post);
    }

    /// <summary>M and the axial force T_u of a raker; null without one or without a design stress.</summary>
    internal static Check? WithTension(in PostResponse response, Member post)
    {
        if (response.Prop is not { } prop || post.Bending is not { } stress)
        {
            return null;
        }

        var combined = response.PeakMoment / post.Section.Modulus + Math.Abs(prop.Uplift) / post.Section.Area;
        var steps = new StepList(8);
        steps.Given("M", response.PeakMoment, Dimension.Moment);
        steps.Given("T_u", prop.Uplift, Dimension.Force);
        steps.Given("W", post.Section.Modulus, Dimension.SectionModulus);
        steps.Given("A", post.Section.Area, Dimension.SectionArea);
        steps.Add("σ", "M/W + √(T_u²)/A", combined, Dimension.Stress);
        steps.Stress("f_b", stress);
        steps.Add("u", "σ/f_b", combined / stress.Value, Dimension.Ratio);
        return new(
            "post-axial", "Post bending and axial force", $"Elastic stresses added; {stress.Source}", Dimension.Stress,
            combined, stress.Value, steps.Done());
    }

    private static Check Eurocode(StepList steps, in PostResponse response, Member post)
    {
        var reduction = WebReduction(Math.Abs(response.PeakShear), post.ShearResistance);
        var webs = WebModulus(post);
        var capacity = MomentWithShear(post.Section.PlasticModulus, webs, reduction, post.Bending!.Value, post.MomentResistance);
        steps.Add("ρ_v", "max(0, 2·V/V_R − 1)²", reduction, Dimension.Ratio);
        steps.Given("W_pl", post.Section.PlasticModulus, Dimension.SectionModulus);
        steps.Given("W_w", webs, Dimension.SectionModulus);
        steps.Add("M_V", "min(W·f_b, (W_pl − ρ_v·W_w)·f_b)", capacity, Dimension.Moment);
        steps.Add("u", "M/M_V", response.PeakMoment / capacity, Dimension.Ratio);
        var clause = post.Material.Family == MaterialFamily.Steel ? "EN 1993-1-1, 6.2.8" : "EN 1999-1-1, 6.2.8";
        return new(
            "post-bending-shear", "Post bending with shear", $"{clause} (from memory)", Dimension.Moment,
            response.PeakMoment, capacity, steps.Done());
    }

    private static Check Aluminium(StepList steps, in PostResponse response, Member post)
    {
        var (bending, shear) = (response.PeakMoment / post.MomentResistance, response.PeakShear / post.ShearResistance);
        var combined = Math.Sqrt(bending * bending + shear * shear);
        steps.Add("M_R", "f_b·W", post.MomentResistance, Dimension.Moment);
        steps.Given("u_1", 1, Dimension.Ratio);
        steps.Add("u", "√((M/M_R)² + (V/V_R)²)", combined, Dimension.Ratio);
        return new(
            "post-bending-shear", "Post bending with shear", "Aluminum Design Manual 2020, H.3 (from memory)", Dimension.Ratio,
            combined, 1, steps.Done());
    }
}
