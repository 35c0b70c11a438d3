using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Bending of aluminium sections by the Aluminum Design Manual 2020, chapter F: yield, rupture and local buckling by weighted average.</summary>
internal static class UsAluminium
{
    /// <summary>Safety factor on rupture (ADM 2020, F.1).</summary>
    private const double RuptureSafety = 1.95;

    /// <summary>Resistance factor on rupture (ADM 2020, F.1, from memory).</summary>
    private const double RuptureFactor = 0.75;

    public static WallResistance Bending(
        Member member, ThinWalls walls, BendingStress stress, DesignBasisKind basis, bool isWelded)
    {
        var (section, modulus) = (member.Section, member.Material.ElasticModulus);
        var face = AluminiumBuckling.Compression(stress.Yield, modulus, walls.IsOutstand, isWelded);
        var web = AluminiumBuckling.WebBending(stress.Yield, modulus);
        var steps = WallSteps.Begin(walls, stress);
        steps.Given("κ", AluminiumBuckling.Ksi, Dimension.Stress);
        steps.Given("E", modulus, Dimension.ElasticModulus);
        Face(steps, face, walls, isWelded);
        Web(steps, web, walls);
        var nominal = Nominal(steps, section, walls, stress, face, web);
        var moment = nominal * stress.Design / stress.Yield;
        var ultimate = isWelded ? member.Material.WeldedUltimate : member.Material.UltimateStrength;
        if (ultimate is not { } rupture)
        {
            steps.Add("M_R", "M_n·f_b/f_k", moment, Dimension.Moment);
            return new(moment, Source(face, web, walls), steps.Done());
        }

        var isAllowable = basis == DesignBasisKind.AllowableStress;
        var torn = section.PlasticModulus * rupture * (isAllowable ? 1 / RuptureSafety : RuptureFactor);
        steps.Given("F_tu", rupture, Dimension.Stress);
        steps.Add("M_u", isAllowable ? "W_pl·F_tu/1.95" : "0.75·W_pl·F_tu", torn, Dimension.Moment);
        steps.Add("M_R", "min(M_n·f_b/f_k, M_u)", Math.Min(moment, torn), Dimension.Moment);
        return new(Math.Min(moment, torn), Source(face, web, walls), steps.Done());
    }

    private static void Face(StepList steps, AluminiumBuckling.Line line, ThinWalls walls, bool isWelded)
    {
        steps.Add("B_p", isWelded ? "f_k·(1 + (f_k/(440·κ))^(1/3))" : "f_k·(1 + (f_k/(1500·κ))^(1/3))", line.Intercept, Dimension.Stress);
        steps.Add("D_p", isWelded ? "B_p/20·√(6·B_p/E)" : "B_p/10·√(B_p/E)", line.Slope, Dimension.Stress);
        var (edge, k1, k2) = (walls.IsOutstand ? "5.0" : "1.6", isWelded ? "0.50" : "0.35", isWelded ? "2.04" : "2.27");
        steps.Add("λ_1f", $"(B_p − f_k)/({edge}·D_p)", line.Lower, Dimension.Ratio);
        steps.Add("λ_2f", $"{k1}·B_p/({edge}·D_p)", line.Upper, Dimension.Ratio);
        var formula = line.At(walls.FaceSlenderness) switch
        {
            AluminiumBuckling.Range.Yield => "f_k",
            AluminiumBuckling.Range.Inelastic => $"B_p − {edge}·D_p·λ_f",
            _ => $"{k2}·√(B_p·E)/({edge}·λ_f)",
        };
        steps.Add("F_c", formula, line.Stress(walls.FaceSlenderness), Dimension.Stress);
    }

    private static void Web(StepList steps, AluminiumBuckling.Line line, ThinWalls walls)
    {
        steps.Add("B_br", "1.3·f_k·(1 + (f_k/(340·κ))^(1/3))", line.Intercept, Dimension.Stress);
        steps.Add("D_br", "B_br/20·√(6·B_br/E)", line.Slope, Dimension.Stress);
        steps.Add("λ_1w", "(B_br − 1.5·f_k)/(0.65·D_br)", line.Lower, Dimension.Ratio);
        steps.Add("λ_2w", "0.50·B_br/(0.65·D_br)", line.Upper, Dimension.Ratio);
        var formula = line.At(walls.WebSlenderness) switch
        {
            AluminiumBuckling.Range.Yield => "1.5·f_k",
            AluminiumBuckling.Range.Inelastic => "B_br − 0.65·D_br·λ_w",
            _ => "2.04·√(B_br·E)/(0.65·λ_w)",
        };
        steps.Add("F_b", formula, line.Stress(walls.WebSlenderness), Dimension.Stress);
    }

    /// <summary>M_n, the lower of yield and local buckling [N·m].</summary>
    private static double Nominal(
        StepList steps, SectionProperties section, ThinWalls walls, BendingStress stress, AluminiumBuckling.Line face, AluminiumBuckling.Line web)
    {
        var (arm, half) = ((section.Depth - walls.FaceThickness) / 2, walls.WebDepth / 2);
        var webs = walls.Webs * walls.WebThickness * walls.WebDepth * walls.WebDepth * walls.WebDepth / 12;
        var faces = section.Inertia - webs;
        var local = face.Stress(walls.FaceSlenderness) * faces / arm + web.Stress(walls.WebSlenderness) * webs / half;
        var yields = Math.Min(section.PlasticModulus * stress.Yield, 1.5 * section.Modulus * stress.Yield);
        steps.Given("d", section.Depth, Dimension.SectionLength);
        steps.Given("n_w", walls.Webs, Dimension.Count);
        steps.Given("I", section.Inertia, Dimension.SecondMoment);
        steps.Given("W", section.Modulus, Dimension.SectionModulus);
        steps.Given("W_pl", section.PlasticModulus, Dimension.SectionModulus);
        steps.Add("I_w", "n_w·t_w·h_w³/12", webs, Dimension.SecondMoment);
        steps.Add("I_f", "I − I_w", faces, Dimension.SecondMoment);
        steps.Add("M_loc", "F_c·I_f/((d − t_f)/2) + F_b·I_w/(h_w/2)", local, Dimension.Moment);
        steps.Add("M_y", "min(W_pl·f_k, 1.5·W·f_k)", yields, Dimension.Moment);
        steps.Add("M_n", "min(M_y, M_loc)", Math.Min(yields, local), Dimension.Moment);
        return Math.Min(yields, local);
    }

    private static string Source(AluminiumBuckling.Line face, AluminiumBuckling.Line web, ThinWalls walls) =>
        $"Aluminum Design Manual 2020, B.5 and F.3, tempers T5 to T9: face {Word(face.At(walls.FaceSlenderness))}, webs {Word(web.At(walls.WebSlenderness))}";

    private static string Word(AluminiumBuckling.Range range) => range switch
    {
        AluminiumBuckling.Range.Yield => "at yield",
        AluminiumBuckling.Range.Inelastic => "in inelastic buckling",
        _ => "beyond buckling",
    };
}
