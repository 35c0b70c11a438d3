using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Bending of aluminium sections by class, EN 1999-1-1, 6.1.4 and 6.2.5: M_R = α·W·f_o/γ_M1.</summary>
internal static class EurocodeAluminium
{
    /// <summary>ε = √(250 MPa/f_o), base of the slenderness limits (EN 1999-1-1, Table 6.2).</summary>
    private const double ReferenceYield = 250e6;

    /// <summary>β/(h_w/t_w) of a part with the neutral axis at its middle (EN 1999-1-1, 6.1.4.3).</summary>
    private const double WebGradient = 0.40;

    private readonly record struct Part(EurocodeSlenderness Limits, double Relative)
    {
        public int Class => Limits.Class(Relative);

        public double Effective => Limits.EffectiveThickness(Relative);
    }

    public static WallResistance Bending(Member member, ThinWalls walls, BendingStress stress, bool isWelded)
    {
        var buckling = member.Material.BucklingClass ?? BucklingClass.B;
        // Limits beside a weld go with the yield of the alloy itself, which makes them the stricter.
        var yield = isWelded ? member.Material.BendingStrength ?? stress.Yield : stress.Yield;
        var epsilon = Math.Sqrt(ReferenceYield / yield);
        var face = new Part(EurocodeSlenderness.Of(buckling, isWelded, walls.IsOutstand), walls.FaceSlenderness / epsilon);
        var web = new Part(EurocodeSlenderness.Of(buckling, isWelded, isOutstand: false), WebGradient * walls.WebSlenderness / epsilon);
        var steps = WallSteps.Begin(walls, stress);
        steps.Given("f_ref", ReferenceYield, Dimension.Stress);
        if (isWelded)
        {
            steps.Given("f_o", yield, Dimension.Stress);
        }

        steps.Add("ε", isWelded ? "√(f_ref/f_o)" : "√(f_ref/f_k)", epsilon, Dimension.Ratio);
        steps.Add("β_f", "λ_f/ε", face.Relative, Dimension.Ratio);
        steps.Add("β_w", "0.40·λ_w/ε", web.Relative, Dimension.Ratio);
        var section = member.Section;
        steps.Given("W", section.Modulus, Dimension.SectionModulus);
        var shape = Math.Max(face.Class, web.Class) == 4
            ? Effective(steps, section, walls, face, web)
            : Plastic(steps, section, face, web);
        var moment = shape * stress.Design * section.Modulus;
        steps.Add("M_R", "α·f_b·W", moment, Dimension.Moment);
        var known = member.Material.BucklingClass is null ? "; buckling class unknown, taken as B" : "";
        return new(moment, Source(face.Class, web.Class) + known, steps.Done());
    }

    private static string Source(int face, int web) =>
        FormattableString.Invariant($"EN 1999-1-1, 6.1.4 and 6.2.5 (limits from memory): face of class {face}, webs of class {web}");

    /// <summary>α = W_pl/W in classes 1 and 2, and between that and 1 in class 3; the lower of face and webs.</summary>
    private static double Plastic(StepList steps, SectionProperties section, Part face, Part web)
    {
        var plastic = section.PlasticModulus / section.Modulus;
        steps.Given("W_pl", section.PlasticModulus, Dimension.SectionModulus);
        steps.Add("α_pl", "W_pl/W", plastic, Dimension.Ratio);
        var shape = Math.Min(Shape(steps, "f", face, plastic), Shape(steps, "w", web, plastic));
        steps.Add("α", "min(α_f, α_w)", shape, Dimension.Ratio);
        return shape;
    }

    private static double Shape(StepList steps, string index, Part part, double plastic)
    {
        if (part.Class < 3)
        {
            steps.Add($"α_{index}", "α_pl", plastic, Dimension.Ratio);
            return plastic;
        }

        var limits = part.Limits;
        var shape = 1 + (limits.Beta3 - part.Relative) / (limits.Beta3 - limits.Beta2) * (plastic - 1);
        steps.Given($"β_2{index}", limits.Beta2, Dimension.Ratio);
        steps.Given($"β_3{index}", limits.Beta3, Dimension.Ratio);
        steps.Add($"α_{index}", $"1 + (β_3{index} − β_{index})/(β_3{index} − β_2{index})·(α_pl − 1)", shape, Dimension.Ratio);
        return shape;
    }

    /// <summary>α = W_eff/W with effective thicknesses of the parts of class 4.</summary>
    private static double Effective(StepList steps, SectionProperties section, ThinWalls walls, Part face, Part web)
    {
        Thickness(steps, "f", face);
        Thickness(steps, "w", web);
        var effective = EffectiveSection.Of(section, walls, face.Effective, web.Effective);
        steps.Given("k", walls.FaceParts, Dimension.Count);
        steps.Given("n_w", walls.Webs, Dimension.Count);
        steps.Given("d", section.Depth, Dimension.SectionLength);
        steps.Given("A", section.Area, Dimension.SectionArea);
        steps.Given("I", section.Inertia, Dimension.SecondMoment);
        steps.Add("ΔA_f", "(1 − ρ_f)·k·b_f·t_f", effective.RemovedFace, Dimension.SectionArea);
        steps.Add("ΔA_w", "(1 − ρ_w)·n_w·t_w·h_w/2", effective.RemovedWeb, Dimension.SectionArea);
        steps.Add("s", "(ΔA_f·(d − t_f)/2 + ΔA_w·h_w/4)/(A − ΔA_f − ΔA_w)", effective.Shift, Dimension.SectionLength);
        steps.Add(
            "I_eff",
            "I − ΔA_f·((d − t_f)/2)² − k·b_f·t_f³·(1 − ρ_f³)/12 − ΔA_w·h_w²/12 − (A − ΔA_f − ΔA_w)·s²",
            effective.Inertia,
            Dimension.SecondMoment);
        steps.Add("W_eff", "I_eff/(d/2 + s)", effective.Modulus, Dimension.SectionModulus);
        steps.Add("α", "W_eff/W", effective.Modulus / section.Modulus, Dimension.Ratio);
        return effective.Modulus / section.Modulus;
    }

    private static void Thickness(StepList steps, string index, Part part)
    {
        if (part.Class < 4)
        {
            steps.Given($"ρ_{index}", 1, Dimension.Ratio);
            return;
        }

        steps.Given($"C_1{index}", part.Limits.C1, Dimension.Ratio);
        steps.Given($"C_2{index}", part.Limits.C2, Dimension.Ratio);
        steps.Add($"ρ_{index}", $"C_1{index}/β_{index} − C_2{index}/β_{index}²", part.Effective, Dimension.Ratio);
    }
}
