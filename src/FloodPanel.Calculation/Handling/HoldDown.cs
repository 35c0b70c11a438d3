using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Handling;

/// <summary>What keeps the logs of a bay from floating up.</summary>
/// <param name="Bay">Bay from the left, from 1.</param>
/// <param name="Uplift">Net uplift of the stack under water to its top, unfactored [N]; negative where it weighs more.</param>
/// <param name="DesignForce">Force to hold the stack down, with partial factors [N], ≥ 0; each end takes half.</param>
/// <param name="Working">How they came about.</param>
public sealed record HoldDownResult(int Bay, double Uplift, double DesignForce, Working Working);

/// <summary>Hold-down of a stack of logs against buoyancy, water standing to its top.</summary>
public static class HoldDown
{
    /// <summary>Partial factor on uplift [-] (EN 1990, EQU style, from memory).</summary>
    public const double UpliftFactor = 1.1;

    /// <summary>Partial factor on weight, which helps [-] (EN 1990, EQU style, from memory).</summary>
    public const double WeightFactor = 0.9;

    private const string Source = "Archimedes; partial factors 1.1 on uplift and 0.9 on weight, EN 1990 EQU style (from memory); friction in the guides not counted";

    /// <summary>Water displaced by a log per length, as a force [N/m].</summary>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <param name="log">The log.</param>
    /// <param name="isSealed">True when no water gets inside: then the whole outline displaces it, else the material alone.</param>
    public static double Buoyancy(double unitWeight, Member log, bool isSealed) =>
        unitWeight * (isSealed ? log.Section.Height * log.Section.Depth : log.Section.Area);

    /// <summary>Hold-down of the logs of a bay.</summary>
    /// <param name="schedule">Cutting length and number of the logs.</param>
    /// <param name="logs">The stack.</param>
    /// <param name="model">The opening.</param>
    internal static HoldDownResult Of(LogSchedule schedule, LogStack logs, OpeningModel model)
    {
        var (length, preload) = (schedule.CuttingLength, logs.SealPreload);
        var (floats, weighs) = (0.0, 0.0);
        var steps = new StepList(14);
        steps.UnitWeight(model.UnitWeight);
        foreach (var run in model.Runs)
        {
            var index = model.Runs.Count == 1 ? "" : FormattableString.Invariant($"_{run.First}");
            var (buoyancy, weight) = Log(steps, run, logs.Sealed, model.UnitWeight, index);
            floats += run.Count * buoyancy;
            weighs += run.Count * weight;
        }

        var uplift = length * (floats - weighs + preload);
        var force = Math.Max(0, length * (UpliftFactor * (floats + preload) - WeightFactor * weighs));
        steps.Add("u_sum", Sum(model, "u"), floats, Dimension.LineForce);
        steps.Add("w_sum", Sum(model, "w"), weighs, Dimension.LineForce);
        steps.Given("ℓ", length, Dimension.Length);
        steps.Given("q_seal", preload, Dimension.LineForce);
        steps.Add("U", "ℓ·(u_sum − w_sum + q_seal)", uplift, Dimension.Force);
        steps.Add("F", "max(0, ℓ·(1.1·(u_sum + q_seal) − 0.9·w_sum))", force, Dimension.Force);
        return new(schedule.Bay, uplift, force, new("Hold-down of the stack, water to its top; each end takes half", Source, steps.Done()));
    }

    /// <summary>u and w, uplift and weight of one log per length, and their steps.</summary>
    private static (double Buoyancy, double Weight) Log(StepList steps, LogRun run, bool isSealed, double unitWeight, string index)
    {
        var (section, density) = (run.Log.Section, run.Log.Material.Density);
        var (buoyancy, weight) = (Buoyancy(unitWeight, run.Log, isSealed), section.Area * density * Physics.Gravity);
        if (isSealed)
        {
            steps.Given($"t{index}", section.Height, Dimension.SectionLength);
            steps.Given($"d{index}", section.Depth, Dimension.SectionLength);
            steps.Add($"u{index}", $"γ·t{index}·d{index}", buoyancy, Dimension.LineForce);
            steps.Given($"A{index}", section.Area, Dimension.SectionArea);
        }
        else
        {
            steps.Given($"A{index}", section.Area, Dimension.SectionArea);
            steps.Add($"u{index}", $"γ·A{index}", buoyancy, Dimension.LineForce);
        }

        steps.Given($"ρ_s{index}", density, Dimension.Density);
        steps.Add($"w{index}", $"ρ_s{index}·g·A{index}", weight, Dimension.LineForce);
        steps.Given($"n{index}", run.Count, Dimension.Count);
        return (buoyancy, weight);
    }

    private static string Sum(OpeningModel model, string symbol) => model.Runs.Count == 1
        ? $"n·{symbol}"
        : string.Join(" + ", model.Runs.Select(run => FormattableString.Invariant($"n_{run.First}·{symbol}_{run.First}")));
}
