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
        var buoyancy = Buoyancy(model.UnitWeight, model.Log, logs.Sealed);
        var weight = model.Log.Section.Area * model.Log.Material.Density * Physics.Gravity;
        var (length, count, preload) = (schedule.CuttingLength, logs.Count, logs.SealPreload);
        var uplift = length * (count * (buoyancy - weight) + preload);
        var force = Math.Max(0, length * (count * (UpliftFactor * buoyancy - WeightFactor * weight) + UpliftFactor * preload));
        var steps = new StepList(14);
        steps.UnitWeight(model.UnitWeight);
        Displaced(steps, model.Log, logs.Sealed, buoyancy);
        steps.Given("ρ_s", model.Log.Material.Density, Dimension.Density);
        steps.Add("w_s", logs.Sealed ? "ρ_s·g·A_s" : "ρ_s·g·A", weight, Dimension.LineForce);
        steps.Given("n", count, Dimension.Count);
        steps.Given("ℓ", length, Dimension.Length);
        steps.Given("q_seal", preload, Dimension.LineForce);
        steps.Add("U", "ℓ·(n·(u − w_s) + q_seal)", uplift, Dimension.Force);
        steps.Add("F", "max(0, ℓ·(n·(1.1·u − 0.9·w_s) + 1.1·q_seal))", force, Dimension.Force);
        return new(schedule.Bay, uplift, force, new("Hold-down of the stack, water to its top; each end takes half", Source, steps.Done()));
    }

    private static void Displaced(StepList steps, Member log, bool isSealed, double buoyancy)
    {
        if (isSealed)
        {
            steps.Given("t", log.Section.Height, Dimension.SectionLength);
            steps.Given("d", log.Section.Depth, Dimension.SectionLength);
            steps.Add("u", "γ·t·d", buoyancy, Dimension.LineForce);
            steps.Given("A_s", log.Section.Area, Dimension.SectionArea);
        }
        else
        {
            steps.Given("A", log.Section.Area, Dimension.SectionArea);
            steps.Add("u", "γ·A", buoyancy, Dimension.LineForce);
        }
    }
}
