using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>The fillet weld between post and plate. Rectangles are welded all round; of an I-section the outer sides of the flanges take the moment, the web takes the shear.</summary>
internal static class WeldChecks
{
    private const string EurocodeAluminium = "EN 1999-1-1, 8.6.3 (from memory)";

    /// <summary>Force per length of weld.</summary>
    /// <param name="Name">"weld", "weld-flange" or "weld-web".</param>
    /// <param name="Title">Title of the check.</param>
    /// <param name="Across">q_n, normal to the plate [N/m].</param>
    /// <param name="Along">q_v, along the weld [N/m].</param>
    /// <param name="Directional">k_ds of AISC 360, J2.4 [-].</param>
    private readonly record struct Demand(string Name, string Title, double Across, double Along, double Directional);

    /// <summary>What the weld still needs, in words; null when it can be checked.</summary>
    public static Sentence? Lacks(BasePlateInput plate, Material post, Material material, DesignBasisKind kind)
    {
        var isAluminium = post.Family == MaterialFamily.Aluminium;
        return plate.WeldLeg is null ? new($"The weld between post and base plate has no size: enter its leg.")
            : plate.WeldStrength is null && (isAluminium || kind != DesignBasisKind.Eurocode)
                ? new($"The weld between post and base plate has no strength: enter the strength of the weld metal.")
            : isAluminium && (post.WeldedUltimate is null || material.WeldedUltimate is null)
                ? new($"The weld between post and base plate needs the ultimate strength beside a weld of both: enter it with the materials of post and plate.")
            : !isAluminium && kind == DesignBasisKind.Eurocode && (post.UltimateStrength is null || material.UltimateStrength is null || post.BendingStrength is null || material.BendingStrength is null)
                ? new($"The weld between post and base plate needs yield and ultimate strength of both: enter them with the materials of post and plate.")
            : null;
    }

    /// <summary>The checks of the weld; it lacks nothing.</summary>
    public static IEnumerable<Check> Of(PlateSetting setting)
    {
        foreach (var (demand, lines) in Demands(setting))
        {
            var isAluminium = setting.Post.Material.Family == MaterialFamily.Aluminium;
            if (isAluminium && setting.Basis.Kind == DesignBasisKind.Eurocode)
            {
                yield return Throat(setting, demand, lines());
                yield return Beside(setting, demand, lines());
            }
            else
            {
                yield return Resultant(setting, demand, lines(), isAluminium);
            }
        }
    }

    private static IEnumerable<(Demand Demand, Lines Lines)> Demands(PlateSetting setting)
    {
        var (b, d) = (setting.Post.Section.Height, setting.Post.Section.Depth);
        if (setting.Post.Profile is ISection section)
        {
            var web = d - 2 * section.Flange;
            yield return (
                new("weld-flange", "Weld of the flange", (setting.Moment / d + setting.Lift / 2) / b, 0, 1.5),
                () => Flange(setting));
            yield return (new("weld-web", "Weld of the web", 0, setting.Shear / (2 * web), 1), () => Web(setting, section));
            yield break;
        }

        var across = setting.Moment / FilletWelds.RectangleModulus(b, d) + setting.Lift / (2 * (b + d));
        yield return (new("weld", "Weld round the post", across, setting.Shear / (2 * d), 1), () => Round(setting));
    }

    /// <summary>A new list of lines that ends in q_n and q_v.</summary>
    private delegate StepList Lines();

    private static StepList Flange(PlateSetting setting)
    {
        var steps = Given(setting);
        steps.Given("b", setting.Post.Section.Height, Dimension.SectionLength);
        steps.Add("q_n", "(M/d + T_u/2)/b", (setting.Moment / setting.Post.Section.Depth + setting.Lift / 2) / setting.Post.Section.Height, Dimension.LineForce);
        steps.Given("q_v", 0, Dimension.LineForce);
        return steps;
    }

    private static StepList Web(PlateSetting setting, ISection section)
    {
        var steps = new StepList(16);
        steps.Given("V", setting.Shear, Dimension.Force);
        steps.Given("d", section.Depth, Dimension.SectionLength);
        steps.Given("t_f", section.Flange, Dimension.SectionLength);
        steps.Given("q_n", 0, Dimension.LineForce);
        steps.Add("q_v", "V/(2·(d − 2·t_f))", setting.Shear / (2 * (section.Depth - 2 * section.Flange)), Dimension.LineForce);
        return steps;
    }

    private static StepList Round(PlateSetting setting)
    {
        var (b, d) = (setting.Post.Section.Height, setting.Post.Section.Depth);
        var modulus = FilletWelds.RectangleModulus(b, d);
        var steps = Given(setting);
        steps.Given("b", b, Dimension.SectionLength);
        steps.Given("V", setting.Shear, Dimension.Force);
        steps.Add("W_l", "d²/3 + b·d", modulus, Dimension.SectionArea);
        steps.Add("q_n", "M/W_l + T_u/(2·(b + d))", setting.Moment / modulus + setting.Lift / (2 * (b + d)), Dimension.LineForce);
        steps.Add("q_v", "V/(2·d)", setting.Shear / (2 * d), Dimension.LineForce);
        return steps;
    }

    private static StepList Given(PlateSetting setting)
    {
        var steps = new StepList(18);
        steps.Given("M", setting.Moment, Dimension.Moment);
        steps.Given("T_u", setting.Lift, Dimension.Force);
        steps.Given("d", setting.Post.Section.Depth, Dimension.SectionLength);
        return steps;
    }

    /// <summary>Resultant force per length against the strength of the fillet: AISC, EN 1993-1-8 simplified, Aluminum Design Manual.</summary>
    private static Check Resultant(PlateSetting setting, Demand demand, StepList steps, bool isAluminium)
    {
        var force = Math.Sqrt(demand.Across * demand.Across + demand.Along * demand.Along);
        steps.Add("q_w", "√(q_n² + q_v²)", force, Dimension.LineForce);
        steps.Given("w", setting.Plate.WeldLeg!.Value, Dimension.SectionLength);
        var (strength, source) = isAluminium ? AluminiumUs(setting, steps)
            : setting.Basis.Kind == DesignBasisKind.Eurocode ? SteelEurocode(setting, steps)
            : SteelUs(setting, demand, steps);
        steps.Add("u", "q_w/r_w", force / strength, Dimension.Ratio);
        return new(demand.Name, demand.Title, source, Dimension.LineForce, force, strength, steps.Done());
    }

    private static (double Strength, string Source) SteelUs(PlateSetting setting, Demand demand, StepList steps)
    {
        var nominal = FilletWelds.NominalSteelUs(setting.Plate.WeldLeg!.Value, setting.Plate.WeldStrength!.Value, demand.Directional);
        var strength = FilletWelds.SteelUs(nominal, setting.Basis.Kind);
        steps.Given("F_w", setting.Plate.WeldStrength.Value, Dimension.Stress);
        steps.Given("k_ds", demand.Directional, Dimension.Ratio);
        steps.Add("r_n", "0.60·F_w·0.707·w·k_ds", nominal, Dimension.LineForce);
        steps.Add("r_w", setting.Basis.Kind == DesignBasisKind.AllowableStress ? "r_n/2.00" : "0.75·r_n", strength, Dimension.LineForce);
        return (strength, "AISC 360, J2.4");
    }

    private static (double Strength, string Source) AluminiumUs(PlateSetting setting, StepList steps)
    {
        var beside = WeakerBeside(setting);
        var nominal = FilletWelds.NominalAluminiumUs(setting.Plate.WeldLeg!.Value, setting.Plate.WeldStrength!.Value, beside);
        var isAllowable = setting.Basis.Kind == DesignBasisKind.AllowableStress;
        var strength = isAllowable ? nominal / FilletWelds.AluminiumSafety : FilletWelds.AluminiumResistance * nominal;
        steps.Given("F_w", setting.Plate.WeldStrength.Value, Dimension.Stress);
        steps.Given("F_h", beside, Dimension.Stress);
        steps.Add("r_n", "min(0.6·0.85·F_w·0.707·w, 0.6·F_h·w)", nominal, Dimension.LineForce);
        steps.Add("r_w", isAllowable ? "r_n/1.95" : "0.75·r_n", strength, Dimension.LineForce);
        return (strength, isAllowable ? "Aluminum Design Manual 2020, J.2" : "Aluminum Design Manual 2020, J.2; resistance factor 0.75 from memory");
    }

    private static (double Strength, string Source) SteelEurocode(PlateSetting setting, StepList steps)
    {
        var ultimate = Math.Min(setting.Post.Material.UltimateStrength!.Value, setting.Material.UltimateStrength!.Value);
        var yield = Math.Max(setting.Post.Material.BendingStrength!.Value, setting.Material.BendingStrength!.Value);
        var throat = FilletWelds.Throat * setting.Plate.WeldLeg!.Value;
        var correlation = FilletWelds.Correlation(yield);
        var strength = FilletWelds.SteelEurocode(throat, ultimate, correlation);
        steps.Add("a_w", "0.707·w", throat, Dimension.SectionLength);
        steps.Given("f_u", ultimate, Dimension.Stress);
        steps.Given("β_w", correlation, Dimension.Ratio);
        steps.Add("r_w", "a_w·f_u/(√(3)·β_w·1.25)", strength, Dimension.LineForce);
        return (strength, "EN 1993-1-8, 4.5.3.3 (from memory)");
    }

    private static Check Throat(PlateSetting setting, Demand demand, StepList steps)
    {
        var throat = FilletWelds.Throat * setting.Plate.WeldLeg!.Value;
        var stress = FilletWelds.ThroatStress(demand.Across, demand.Along, throat);
        var strength = setting.Plate.WeldStrength!.Value / FilletWelds.PartialFactor;
        steps.Given("w", setting.Plate.WeldLeg.Value, Dimension.SectionLength);
        steps.Add("a_w", "0.707·w", throat, Dimension.SectionLength);
        steps.Add("σ_w", "√(2·q_n² + 3·q_v²)/a_w", stress, Dimension.Stress);
        steps.Given("f_w", setting.Plate.WeldStrength.Value, Dimension.Stress);
        steps.Add("f_wd", "f_w/1.25", strength, Dimension.Stress);
        steps.Add("u", "σ_w/f_wd", stress / strength, Dimension.Ratio);
        return new($"{demand.Name}-metal", $"{demand.Title}, weld metal", EurocodeAluminium, Dimension.Stress, stress, strength, steps.Done());
    }

    private static Check Beside(PlateSetting setting, Demand demand, StepList steps)
    {
        var leg = setting.Plate.WeldLeg!.Value;
        var stress = Math.Sqrt(demand.Across * demand.Across + 3 * demand.Along * demand.Along) / leg;
        var strength = WeakerBeside(setting) / FilletWelds.PartialFactor;
        steps.Given("w", leg, Dimension.SectionLength);
        steps.Add("σ_h", "√(q_n² + 3·q_v²)/w", stress, Dimension.Stress);
        steps.Given("f_h", WeakerBeside(setting), Dimension.Stress);
        steps.Add("f_hd", "f_h/1.25", strength, Dimension.Stress);
        steps.Add("u", "σ_h/f_hd", stress / strength, Dimension.Ratio);
        return new($"{demand.Name}-beside", $"{demand.Title}, metal beside it", EurocodeAluminium, Dimension.Stress, stress, strength, steps.Done());
    }

    private static double WeakerBeside(PlateSetting setting) =>
        Math.Min(setting.Post.Material.WeldedUltimate!.Value, setting.Material.WeldedUltimate!.Value);
}
