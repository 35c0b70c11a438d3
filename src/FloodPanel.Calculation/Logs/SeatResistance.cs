using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Logs;

/// <summary>What the webs of a log carry at its end, all together, by design basis.</summary>
/// <param name="Force">R_w [N], > 0.</param>
/// <param name="Source">Method and clause.</param>
/// <param name="Steps">The working.</param>
internal sealed record SeatResistance(double Force, string Source, IReadOnlyList<CalculationStep> Steps)
{
    /// <summary>Safety and resistance factors on crippling: ADM 2020 1.95 (Part VII) and 0.75, AISC J10.3 2.00 and 0.75, J10.2 1.50 and 1.00 (from memory).</summary>
    private static readonly Factors Aluminium = new(1.95, 0.75), Crippling = new(2.00, 0.75), Yielding = new(1.50, 1.00);

    /// <summary>The resistance of a metal log; null where the section has no webs to speak of or its strength is missing.</summary>
    /// <param name="log">The log.</param>
    /// <param name="basis">The design basis.</param>
    /// <param name="bearing">N, least length of bearing [m], > 0.</param>
    public static SeatResistance? Of(Member log, DesignBasis basis, double bearing)
    {
        if (log.Material.Family is not (MaterialFamily.Aluminium or MaterialFamily.Steel)
            || ThinWalls.Of(log.Profile) is not { } walls
            || BendingStress.Of(log, basis, isWeldAffected: false) is not { } stress)
        {
            return null;
        }

        var steps = new StepList(24);
        stress.Tell(steps);
        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("t_w", walls.WebThickness, Dimension.SectionLength);
        steps.Given("n_w", walls.Webs, Dimension.Count);
        return (basis.Kind, log.Material.Family) switch
        {
            (DesignBasisKind.Eurocode, _) => Eurocode(steps, log, walls, stress, bearing),
            (_, MaterialFamily.Aluminium) => UsAluminium(steps, log, walls, stress, bearing, basis.Kind),
            _ => Aisc(steps, log, walls, stress, bearing, basis.Kind),
        };
    }

    private static SeatResistance UsAluminium(
        StepList steps, Member log, ThinWalls walls, BendingStress stress, double bearing, DesignBasisKind kind)
    {
        var web = WebCrippling.Aluminium(
            walls.WebThickness, stress.Yield, log.Material.ElasticModulus, bearing, walls.WebThickness, isEnd: true);
        steps.Given("C_w2", WebCrippling.EndReach, Dimension.SectionLength);
        steps.Given("C_w3", WebCrippling.CornerReach, Dimension.SectionLength);
        steps.Add("R_n", "1.2·t_w²·(0.46·f_k + 0.02·√(E·f_k))·(N + C_w2)/(C_w3 + t_w)", web, Dimension.Force);
        var force = Factored(web, walls, kind, Aluminium, out var factor);
        steps.Add("R_w", $"n_w·R_n{factor}", force, Dimension.Force);
        return new(force, "Aluminum Design Manual, web crippling at an end (from memory); inner radius as thick as the web", steps.Done());
    }

    private static SeatResistance Aisc(
        StepList steps, Member log, ThinWalls walls, BendingStress stress, double bearing, DesignBasisKind kind)
    {
        var (modulus, depth) = (log.Material.ElasticModulus, log.Section.Depth);
        var yields = WebCrippling.SteelYielding(walls.WebThickness, walls.FaceThickness, stress.Yield, bearing);
        var spread = WebCrippling.SteelSpread(bearing, depth);
        var cripples = WebCrippling.SteelCrippling(walls.WebThickness, walls.FaceThickness, stress.Yield, modulus, spread);
        steps.Given("t_f", walls.FaceThickness, Dimension.SectionLength);
        steps.Given("d", depth, Dimension.SectionLength);
        steps.Add("R_y", "f_k·t_w·(2.5·t_f + N)", yields, Dimension.Force);
        steps.Add("a", bearing / depth <= 0.2 ? "3·N/d" : "4·N/d − 0.2", spread, Dimension.Ratio);
        steps.Add("R_c", "0.40·t_w²·(1 + a·(t_w/t_f)^1.5)·√(E·f_k·t_f/t_w)", cripples, Dimension.Force);
        var force = Math.Min(
            Factored(yields, walls, kind, Yielding, out var onYield), Factored(cripples, walls, kind, Crippling, out var onCrippling));
        steps.Add("R_w", $"min(n_w·R_y{onYield}, n_w·R_c{onCrippling})", force, Dimension.Force);
        return new(force, "AISC 360, J10.2 and J10.3 at an end (from memory)", steps.Done());
    }

    private static SeatResistance Eurocode(StepList steps, Member log, ThinWalls walls, BendingStress stress, double bearing)
    {
        var (modulus, reference) = (log.Material.ElasticModulus, log.Material.Family == MaterialFamily.Aluminium ? 250e6 : 235e6);
        var (t, depth, flange) = (walls.WebThickness, walls.WebDepth, walls.FaceThickness);
        var helps = Math.Min(log.Section.Height / walls.Webs, 30 * Math.Sqrt(reference / stress.Yield) * flange);
        var factor = WebCrippling.BucklingFactor(bearing, depth);
        var reach = Math.Min(factor * modulus * t * t / (2 * stress.Yield * depth), bearing);
        var length = WebCrippling.YieldLength(reach, bearing, flange, helps / t);
        var critical = 0.9 * factor * modulus * t * t * t / depth;
        var slenderness = Math.Sqrt(length * t * stress.Yield / critical);
        var reduction = WebCrippling.Reduction(slenderness);
        var force = walls.Webs * reduction * length * t * stress.Design;
        steps.Given("h_w", depth, Dimension.SectionLength);
        steps.Given("t_f", flange, Dimension.SectionLength);
        steps.Given("h", log.Section.Height, Dimension.SectionLength);
        steps.Given("f_ref", reference, Dimension.Stress);
        steps.Add("b_f", "min(h/n_w, 30·√(f_ref/f_k)·t_f)", helps, Dimension.SectionLength);
        steps.Add("k_F", "min(2 + 6·N/h_w, 6)", factor, Dimension.Ratio);
        steps.Add("l_e", "min(k_F·E·t_w²/(2·f_k·h_w), N)", reach, Dimension.SectionLength);
        steps.Add(
            "l_y", "min(min(l_e + t_f·√(b_f/(2·t_w) + (l_e/t_f)²), l_e + t_f·√(b_f/t_w)), N + 2·t_f·(1 + √(b_f/t_w)))", length,
            Dimension.SectionLength);
        steps.Add("F_cr", "0.9·k_F·E·t_w³/h_w", critical, Dimension.Force);
        steps.Add("λ_F", "√(l_y·t_w·f_k/F_cr)", slenderness, Dimension.Ratio);
        steps.Add("χ_F", "min(0.5/λ_F, 1)", reduction, Dimension.Ratio);
        steps.Add("R_w", "n_w·χ_F·l_y·t_w·f_b", force, Dimension.Force);
        var source = log.Material.Family == MaterialFamily.Aluminium ? "EN 1999-1-1, 6.7.5" : "EN 1993-1-5, 6.2 to 6.5";
        return new(force, $"{source}, force at an unstiffened end (from memory)", steps.Done());
    }

    private static double Factored(double web, ThinWalls walls, DesignBasisKind kind, Factors factors, out string written)
    {
        var isAllowable = kind == DesignBasisKind.AllowableStress;
        written = isAllowable
            ? FormattableString.Invariant($"/{factors.Safety:0.00}")
            : FormattableString.Invariant($"·{factors.Resistance:0.00}");
        return walls.Webs * (isAllowable ? web / factors.Safety : web * factors.Resistance);
    }

    private readonly record struct Factors(double Safety, double Resistance);
}
