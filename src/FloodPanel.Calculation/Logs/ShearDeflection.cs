using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Logs;

/// <summary>Deflection with shear deformation, for timber and composites whose shear modulus is known.</summary>
public static class ShearDeflection
{
    /// <summary>δ_v = w·L²/(8·G·A_s), shear deflection at mid-span under a uniform line load.</summary>
    /// <param name="lineLoad">w [N/m].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">G·A_s [N], > 0.</param>
    /// <returns>δ_v [m].</returns>
    /// <remarks>Source: USDA FPL-GTR-190 (2010), Table 9-1: k_s = 1/8 on W·L/(G·A').</remarks>
    public static double Uniform(double lineLoad, double span, double stiffness)
    {
        Guard.Positive(stiffness);
        return lineLoad * span * span / (8 * stiffness);
    }

    /// <summary>δ_v = P·L/(4·G·A_s), shear deflection at mid-span under a force there.</summary>
    /// <param name="force">P [N].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">G·A_s [N], > 0.</param>
    /// <returns>δ_v [m].</returns>
    /// <remarks>Source: USDA FPL-GTR-190 (2010), Table 9-1: k_s = 1/4 on W·L/(G·A').</remarks>
    public static double Point(double force, double span, double stiffness)
    {
        Guard.Positive(stiffness);
        return force * span / (4 * stiffness);
    }

    /// <summary>A_s, area that shears [m²]: 5/6 of a solid rectangle, the shear area of the other shapes.</summary>
    /// <param name="log">The log.</param>
    /// <remarks>Source: USDA FPL-GTR-190 (2010), 9-1 for the rectangle; webs alone for hollow shapes.</remarks>
    public static double Area(Member log) =>
        log.Profile is Rectangle ? 5 * log.Section.Area / 6 : log.Section.ShearArea;

    /// <summary>Bending and shear deflection together against L/n; null for metals and where G is not known.</summary>
    internal static Check? Of(LogFurtherChecks.Setting setting)
    {
        var (log, response) = (setting.Strength.Log, setting.Response);
        if (log.Material.Family is MaterialFamily.Aluminium or MaterialFamily.Steel || log.Material.ShearModulus is not { } modulus)
        {
            return null;
        }

        var (load, point, area) = (response.Load.Characteristic, response.Point.Characteristic, Area(log));
        var shear = Uniform(load, setting.Span, modulus * area) + Point(point, setting.Span, modulus * area);
        var (whole, limit) = (response.Deflection + shear, setting.Span / log.DeflectionLimit);
        return new(
            "log-deflection-with-shear", "Log deflection with shear", "USDA FPL-GTR-190 (2010), Table 9-1; limit chosen by the user",
            Dimension.Deflection, whole, limit, new DeferredSteps<LogFurtherChecks.Setting>(setting, _ => Steps()));

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = LogChecks.DeflectionSteps(setting);
            steps.Given("G", modulus, Dimension.ElasticModulus);
            steps.Given("A_s", area, Dimension.SectionArea);
            steps.Add("δ_v", point == 0 ? "w_k·L²/(8·G·A_s)" : "w_k·L²/(8·G·A_s) + P_k·L/(4·G·A_s)", shear, Dimension.Deflection);
            steps.Add("δ_sum", "δ + δ_v", whole, Dimension.Deflection);
            steps.Given("n", log.DeflectionLimit, Dimension.Count);
            steps.Add("δ_lim", "L/n", limit, Dimension.Deflection);
            steps.Add("u", "δ_sum/δ_lim", whole / limit, Dimension.Ratio);
            return steps.Done();
        }
    }
}
