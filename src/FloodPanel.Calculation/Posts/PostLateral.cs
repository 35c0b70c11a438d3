using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Posts;

/// <summary>The lateral-torsional check of a post: an I-section of steel or aluminium whose depth is not less than its width.</summary>
internal static class PostLateral
{
    /// <summary>Poisson's ratio of metals, where no shear modulus is given [-].</summary>
    private const double Poisson = 0.3;

    /// <summary>α and λ_0 of EN 1999-1-1, 6.3.2.2, classes 3 and 4 (from memory) [-].</summary>
    private const double AluminiumImperfection = 0.20, AluminiumPlateau = 0.4;

    /// <summary>True where the shape can turn over sideways: an I-section; tubes hold by their torsion, bars and others are not covered.</summary>
    public static bool CanOccur(Member post) => post.Profile is ISection;

    /// <summary>True where it can occur and a formula and the strength are there.</summary>
    public static bool IsCovered(Member post, DesignBasis basis) =>
        CanOccur(post) && basis.For(post.Material.Family) is not null
        && post.Material is { Family: MaterialFamily.Steel or MaterialFamily.Aluminium, BendingStrength: not null };

    /// <summary>M against M_b over the whole length; null where <see cref="IsCovered"/> says no.</summary>
    public static Check? Of(in PostResponse response, Member post, double length, DesignBasis basis)
    {
        if (!IsCovered(post, basis))
        {
            return null;
        }

        var steps = new StepList(40);
        steps.Given("M", response.PeakMoment, Dimension.Moment);
        Section(steps, post, length);
        var rule = basis.For(post.Material.Family)!;
        var (nominal, source) = basis.Kind == DesignBasisKind.Eurocode ? Eurocode(steps, post, length)
            : post.Material.Family == MaterialFamily.Steel ? SteelUs(steps, post, length)
            : AluminiumUs(steps, post, length);
        var capacity = rule.Factor * nominal;
        steps.Add("M_b", rule.Formula.Replace("f_k", "M_n", StringComparison.Ordinal), capacity, Dimension.Moment);
        steps.Add("u", "M/M_b", response.PeakMoment / capacity, Dimension.Ratio);
        return new(
            "post-lateral", "Post, lateral-torsional buckling", $"{source}; {rule.Source}", Dimension.Moment,
            response.PeakMoment, capacity, steps.Done());
    }

    private static double ShearModulus(Material material) => material.ShearModulus ?? material.ElasticModulus / (2 * (1 + Poisson));

    private static void Section(StepList steps, Member post, double length)
    {
        var section = (ISection)post.Profile;
        steps.Given("ℓ", length, Dimension.Length);
        steps.Given("f_k", post.Material.BendingStrength!.Value, Dimension.Stress);
        steps.Given("E", post.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("b", section.Height, Dimension.SectionLength);
        steps.Given("d", section.Depth, Dimension.SectionLength);
        steps.Given("t_f", section.Flange, Dimension.SectionLength);
        steps.Given("t_w", section.Web, Dimension.SectionLength);
        steps.Given("W", post.Section.Modulus, Dimension.SectionModulus);
        steps.Add("h_o", "d − t_f", section.Depth - section.Flange, Dimension.SectionLength);
        steps.Add("I_z", "(2·t_f·b³ + (d − 2·t_f)·t_w³)/12", CrossAxis.Inertia(section), Dimension.SecondMoment);
        steps.Add("J", "(2·b·t_f³ + (d − 2·t_f)·t_w³)/3", CrossAxis.Torsion(section), Dimension.SecondMoment);
    }

    private static (double Nominal, string Source) SteelUs(StepList steps, Member post, double length)
    {
        var (section, inertia, torsion) = ((ISection)post.Profile, CrossAxis.Inertia(post.Profile), CrossAxis.Torsion((ISection)post.Profile));
        var (yield, modulus, flanges) = (post.Material.BendingStrength!.Value, post.Material.ElasticModulus, section.Depth - section.Flange);
        var radius = Math.Sqrt(inertia / post.Section.Area);
        var effective = Math.Sqrt(inertia * flanges / (2 * post.Section.Modulus));
        var (moment, plasticLength, elasticLength) = LateralBuckling.SteelUs(
            yield, modulus, post.Section.Modulus, post.Section.PlasticModulus, radius, effective, torsion, flanges, length);
        steps.Given("A", post.Section.Area, Dimension.SectionArea);
        steps.Given("W_pl", post.Section.PlasticModulus, Dimension.SectionModulus);
        steps.Add("r_y", "√(I_z/A)", radius, Dimension.SectionLength);
        steps.Add("r_ts", "√(I_z·h_o/(2·W))", effective, Dimension.SectionLength);
        steps.Add("L_p", "1.76·r_y·√(E/f_k)", plasticLength, Dimension.Length);
        steps.Add(
            "L_r", "1.95·r_ts·E/(0.7·f_k)·√(J/(W·h_o) + √((J/(W·h_o))² + 6.76·(0.7·f_k/E)²))", elasticLength, Dimension.Length);
        steps.Add("M_p", "f_k·W_pl", yield * post.Section.PlasticModulus, Dimension.Moment);
        var formula = length <= plasticLength ? "M_p"
            : length <= elasticLength ? "min(M_p, M_p − (M_p − 0.7·f_k·W)·(ℓ − L_p)/(L_r − L_p))"
            : "min(M_p, W·π²·E/(ℓ/r_ts)²·√(1 + 0.078·J/(W·h_o)·(ℓ/r_ts)²))";
        steps.Add("M_n", formula, moment, Dimension.Moment);
        return (moment, "AISC 360, F2 with C_b = 1 (from memory)");
    }

    private static (double Nominal, string Source) AluminiumUs(StepList steps, Member post, double length)
    {
        var (yield, modulus) = (post.Material.BendingStrength!.Value, post.Material.ElasticModulus);
        var critical = Critical(steps, post, length);
        var plastic = Math.Min(post.Section.PlasticModulus, 1.5 * post.Section.Modulus) * yield;
        var slenderness = Math.PI * Math.Sqrt(modulus * post.Section.Modulus / critical);
        var moment = LateralBuckling.AluminiumUs(yield, modulus, post.Section.Modulus, plastic, slenderness);
        steps.Given("W_pl", post.Section.PlasticModulus, Dimension.SectionModulus);
        RakerCompression.AluminiumConstants(steps, yield, modulus, "E");
        steps.Add("λ", "π·√(E·W/M_cr)", slenderness, Dimension.Ratio);
        steps.Add("M_p", "min(W_pl, 1.5·W)·f_k", plastic, Dimension.Moment);
        steps.Add(
            "M_n",
            slenderness < Columns.BucklingConstants(yield, modulus).Limit
                ? "M_p·(1 − λ/C_c) + π²·E·λ·W/C_c³"
                : "π²·E·W/λ²",
            moment,
            Dimension.Moment);
        return (moment, "Aluminum Design Manual 2020, F.4 with C_b = 1 (read for tubes)");
    }

    private static (double Nominal, string Source) Eurocode(StepList steps, Member post, double length)
    {
        var isSteel = post.Material.Family == MaterialFamily.Steel;
        var moment = post.Section.Modulus * post.Material.BendingStrength!.Value;
        var relative = Math.Sqrt(moment / Critical(steps, post, length));
        steps.Add("λ", "√(W·f_k/M_cr)", relative, Dimension.Ratio);
        // Welded sections have the greater imperfections: safe for rolled ones.
        var imperfection = !isSteel ? AluminiumImperfection : post.Section.Depth <= 2 * post.Section.Height ? 0.49 : 0.76;
        var reduction = RakerSteps.Reduction(steps, "λ", relative, imperfection, isSteel ? 0.2 : AluminiumPlateau);
        steps.Add("M_n", "χ·W·f_k", reduction * moment, Dimension.Moment);
        return (reduction * moment, isSteel
            ? "EN 1993-1-1, 6.3.2.2, curves c and d as for welded sections (from memory)"
            : "EN 1999-1-1, 6.3.2.2 (from memory)");
    }

    /// <summary>G and M_cr.</summary>
    private static double Critical(StepList steps, Member post, double length)
    {
        var section = (ISection)post.Profile;
        var shearModulus = ShearModulus(post.Material);
        var critical = LateralBuckling.ElasticMoment(
            post.Material.ElasticModulus, shearModulus, CrossAxis.Inertia(section), CrossAxis.Torsion(section),
            section.Depth - section.Flange, length);
        steps.Add("G", post.Material.ShearModulus is null ? "E/2.6" : "", shearModulus, Dimension.ElasticModulus);
        steps.Add("M_cr", "π/ℓ·√(E·I_z·(G·J + π²·E·I_z·h_o²/(4·ℓ²)))", critical, Dimension.Moment);
        return critical;
    }
}
