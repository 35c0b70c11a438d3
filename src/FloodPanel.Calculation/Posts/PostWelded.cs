using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>The base of an aluminium post beside its weld, where a plate welded all round leaves the whole section the strength of the heat-affected zone.</summary>
internal static class PostWelded
{
    /// <summary>True for aluminium that is welded at its base, by a switch or to a base plate.</summary>
    public static bool IsWelded(OpeningModel model) => model.Post is { Material.Family: MaterialFamily.Aluminium }
        && (model.Opening.Barrier.Posts!.WeldedBase || model.Opening.Barrier.BasePlate?.WeldLeg is not null);

    /// <summary>Bending and shear at the base; nothing where it is not welded or its strength there is not known.</summary>
    public static IEnumerable<Check> Of(OpeningModel model, PostResponse response)
    {
        if (!IsWelded(model) || model.Post!.Material.WeldedYield is not { } welded || model.Basis.For(MaterialFamily.Aluminium) is not { } rule)
        {
            return [];
        }

        var isEurocode = model.Basis.Kind == DesignBasisKind.Eurocode;
        var source = $"{(isEurocode ? "EN 1999-1-1, 6.2.9 and 6.1.6 (from memory)" : "Aluminum Design Manual 2020, B.5.4 and F.1, weld-affected zone")}; {rule.Source}";
        return [Bending(response, model.Post, welded, rule, source), Shear(response, model.Post, welded, rule, source, isEurocode)];
    }

    private static Check Bending(in PostResponse response, Member post, double welded, StrengthRule rule, string source)
    {
        var moment = Math.Abs(response.BaseMoment);
        var capacity = rule.Factor * welded * post.Section.Modulus;
        var steps = Strength(welded, rule);
        steps.Given("M", moment, Dimension.Moment);
        steps.Given("W", post.Section.Modulus, Dimension.SectionModulus);
        steps.Add("M_R", "f_w·W", capacity, Dimension.Moment);
        steps.Add("u", "M/M_R", moment / capacity, Dimension.Ratio);
        return new("post-welded-bending", "Post bending beside the weld", source, Dimension.Moment, moment, capacity, steps.Done());
    }

    private static Check Shear(in PostResponse response, Member post, double welded, StrengthRule rule, string source, bool isEurocode)
    {
        var shear = Math.Abs(response.BaseShear);
        var stress = rule.Factor * welded * (isEurocode ? 1 / Math.Sqrt(3) : 0.6);
        var capacity = stress * post.Section.ShearArea;
        var steps = Strength(welded, rule);
        steps.Given("V", shear, Dimension.Force);
        steps.Given("A_v", post.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", isEurocode ? "f_w/√(3)·A_v" : "0.6·f_w·A_v", capacity, Dimension.Force);
        steps.Add("u", "V/V_R", shear / capacity, Dimension.Ratio);
        return new("post-welded-shear", "Post shear beside the weld", source, Dimension.Force, shear, capacity, steps.Done());
    }

    private static StepList Strength(double welded, StrengthRule rule)
    {
        var steps = new StepList(8);
        steps.Given("f_k", welded, Dimension.Stress);
        steps.Add("f_w", rule.Formula, rule.Factor * welded, Dimension.Stress);
        return steps;
    }
}
