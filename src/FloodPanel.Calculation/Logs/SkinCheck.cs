using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Logs;

/// <summary>The face of a thin-walled log between its webs under the water pressure.</summary>
/// <remarks>
/// A strip of one bay between webs, p·b²/8, which is safe for all numbers of bays; p·b²/2 for an outstand. Wet face of a sealed
/// log, dry face of one that fills. Stress across and along the log at mid-span are taken with opposite signs, the worse case.
/// </remarks>
public static class SkinCheck
{
    /// <summary>Bending stress in a strip of skin, σ_z = 6·m/t_f².</summary>
    /// <param name="pressure">p [Pa].</param>
    /// <param name="width">b_f, clear width between webs, or of an outstand [m], > 0.</param>
    /// <param name="thickness">t_f [m], > 0.</param>
    /// <param name="isOutstand">True when one edge is held only.</param>
    /// <returns>σ_z [Pa].</returns>
    /// <remarks>Source: statics of a strip: m = p·b²/8, of an outstand p·b²/2.</remarks>
    public static double Stress(double pressure, double width, double thickness, bool isOutstand)
    {
        Guard.Positive(width);
        Guard.Positive(thickness);
        return 6 * pressure * width * width / (isOutstand ? 2 : 8) / (thickness * thickness);
    }

    /// <summary>The check; null for a solid log, a dry one, and where the yield of a metal is not known: an allowable for bending alone says nothing of stresses together.</summary>
    internal static Check? Of(LogFurtherChecks.Setting setting, double pressure)
    {
        var log = setting.Strength.Log;
        if (setting.Strength.Walls is not { } walls || pressure <= 0)
        {
            return null;
        }

        return log.Material.Family == MaterialFamily.Composite
            ? setting.Strength.Cross is { } cross ? Across(pressure, walls, cross) : null
            : log is { Bending: { } stress, Material.BendingStrength: not null } ? Combined(setting, pressure, walls, stress) : null;
    }

    private static Check Across(double pressure, ThinWalls walls, DesignStress stress)
    {
        var skin = Stress(pressure, walls.FacePart, walls.FaceThickness, walls.IsOutstand);
        return Check("Statics of a strip of skin; strength across the fibres", skin, stress.Value, Steps);

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = Strip(pressure, walls, skin);
            steps.Stress("f_90", stress);
            steps.Add("u", "σ_z/f_90", skin / stress.Value, Dimension.Ratio);
            return steps.Done();
        }
    }

    private static Check Combined(LogFurtherChecks.Setting setting, double pressure, ThinWalls walls, DesignStress stress)
    {
        var (moment, modulus, limit) = (setting.Response.Moment, setting.Strength.Log.Section.Modulus, setting.Strength.Combined);
        var (along, skin) = (moment / modulus, Stress(pressure, walls.FacePart, walls.FaceThickness, walls.IsOutstand));
        var together = Math.Sqrt(along * along + along * skin + skin * skin);
        var allowed = Math.Sqrt(limit) * stress.Value;
        return Check(
            limit > 1 ? "Statics of a strip of skin; EN 1999-1-1, 6.2.1, C = 1.2 (from memory)" : "Statics of a strip of skin; von Mises",
            together, allowed, Steps);

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = Strip(pressure, walls, skin);
            steps.Given("M", moment, Dimension.Moment);
            steps.Given("W", modulus, Dimension.SectionModulus);
            steps.Add("σ_x", "M/W", along, Dimension.Stress);
            steps.Add("σ_v", "√(σ_x² + σ_x·σ_z + σ_z²)", together, Dimension.Stress);
            steps.Stress("f_b", stress);
            steps.Given("C", limit, Dimension.Ratio);
            steps.Add("σ_R", "√(C)·f_b", allowed, Dimension.Stress);
            steps.Add("u", "σ_v/σ_R", together / allowed, Dimension.Ratio);
            return steps.Done();
        }
    }

    private static StepList Strip(double pressure, ThinWalls walls, double stress)
    {
        var steps = new StepList(16);
        steps.Given("p", pressure, Dimension.Pressure);
        steps.Given("b_f", walls.FacePart, Dimension.SectionLength);
        steps.Given("t_f", walls.FaceThickness, Dimension.SectionLength);
        steps.Add("σ_z", walls.IsOutstand ? "6·(p·b_f²/2)/t_f²" : "6·(p·b_f²/8)/t_f²", stress, Dimension.Stress);
        return steps;
    }

    private static Check Check(string source, double demand, double capacity, Func<IReadOnlyList<CalculationStep>> steps) =>
        new("log-skin", "Log skin between webs", source, Dimension.Stress, demand, capacity, new DeferredSteps(steps));
}
