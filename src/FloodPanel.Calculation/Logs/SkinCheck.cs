using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

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
    internal static Check? Of(LogFurtherChecks.Setting setting)
    {
        if (setting.Strength.Walls is null || setting.Pressure <= 0)
        {
            return null;
        }

        return setting.Log.Material.Family == MaterialFamily.Composite
            ? setting.Strength.Cross is { } cross ? Across(setting, cross) : null
            : setting.Log is { Bending: { } stress, Material.BendingStrength: not null } ? Combined(setting, stress) : null;
    }

    private static Check Across(LogFurtherChecks.Setting setting, DesignStress stress)
    {
        return Check("Statics of a strip of skin; strength across the fibres", Stress(setting), stress.Value, setting, Steps);

        static IReadOnlyList<CalculationStep> Steps(LogFurtherChecks.Setting setting)
        {
            var stress = setting.Strength.Cross!;
            var steps = Strip(setting);
            steps.Stress("f_90", stress);
            steps.Add("u", "σ_z/f_90", Stress(setting) / stress.Value, Dimension.Ratio);
            return steps.Done();
        }
    }

    private static Check Combined(LogFurtherChecks.Setting setting, DesignStress stress)
    {
        var limit = setting.Strength.Combined;
        return Check(
            limit > 1 ? "Statics of a strip of skin; EN 1999-1-1, 6.2.1, C = 1.2 (from memory)" : "Statics of a strip of skin; von Mises",
            Together(setting), Math.Sqrt(limit) * stress.Value, setting, Steps);

        static double Together(LogFurtherChecks.Setting setting)
        {
            var (along, skin) = (setting.Response.Moment / setting.Log.Section.Modulus, Stress(setting));
            return Math.Sqrt(along * along + along * skin + skin * skin);
        }

        static IReadOnlyList<CalculationStep> Steps(LogFurtherChecks.Setting setting)
        {
            var (moment, modulus, stress) = (setting.Response.Moment, setting.Log.Section.Modulus, setting.Log.Bending!);
            var (together, allowed) = (Together(setting), Math.Sqrt(setting.Strength.Combined) * stress.Value);
            var steps = Strip(setting);
            steps.Given("M", moment, Dimension.Moment);
            steps.Given("W", modulus, Dimension.SectionModulus);
            steps.Add("σ_x", "M/W", moment / modulus, Dimension.Stress);
            steps.Add("σ_v", "√(σ_x² + σ_x·σ_z + σ_z²)", together, Dimension.Stress);
            steps.Stress("f_b", stress);
            steps.Given("C", setting.Strength.Combined, Dimension.Ratio);
            steps.Add("σ_R", "√(C)·f_b", allowed, Dimension.Stress);
            steps.Add("u", "σ_v/σ_R", together / allowed, Dimension.Ratio);
            return steps.Done();
        }
    }

    private static double Stress(LogFurtherChecks.Setting setting)
    {
        var walls = setting.Strength.Walls!;
        return Stress(setting.Pressure, walls.FacePart, walls.FaceThickness, walls.IsOutstand);
    }

    private static StepList Strip(LogFurtherChecks.Setting setting)
    {
        var walls = setting.Strength.Walls!;
        var steps = new StepList(16);
        steps.Given("p", setting.Pressure, Dimension.Pressure);
        steps.Given("b_f", walls.FacePart, Dimension.SectionLength);
        steps.Given("t_f", walls.FaceThickness, Dimension.SectionLength);
        steps.Add("σ_z", walls.IsOutstand ? "6·(p·b_f²/2)/t_f²" : "6·(p·b_f²/8)/t_f²", Stress(setting), Dimension.Stress);
        return steps;
    }

    private static Check Check(
        string source, double demand, double capacity, LogFurtherChecks.Setting setting, Func<LogFurtherChecks.Setting, IReadOnlyList<CalculationStep>> steps) =>
        new("log-skin", "Log skin between webs", source, Dimension.Stress, demand, capacity, new DeferredSteps<LogFurtherChecks.Setting>(setting, steps));
}
