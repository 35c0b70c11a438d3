using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Handling;

/// <summary>Cutting length and mass of logs, and who can lift them.</summary>
public static class LogHandling
{
    /// <summary>Greatest mass for one person under ideal conditions [kg]: NIOSH, 51 lb (23 kg), secondary source.</summary>
    public const double OnePerson = 23;

    /// <summary>Greatest mass for two people [kg]: two thirds of the sum of two (common practice, from memory).</summary>
    public const double TwoPeople = 2 * OnePerson * 2 / 3;

    /// <summary>Cutting length and mass of the logs of one bay.</summary>
    /// <param name="bay">Bay from the left, from 1.</param>
    /// <param name="clearBay">b, clear width of the bay [m], > 0.</param>
    /// <param name="logs">The stack.</param>
    /// <param name="run">The equal logs.</param>
    /// <returns>Length b + 2·e − c [m] and mass A·ρ·length [kg], profile only.</returns>
    /// <remarks>Source: geometry. Limits: fittings, seals and water held inside are not included.</remarks>
    public static LogSchedule Schedule(int bay, double clearBay, LogStack logs, LogRun run)
    {
        var log = run.Log;
        var length = clearBay + 2 * logs.EndBearing - logs.FittingClearance;
        var mass = log.Section.Area * log.Material.Density * length;
        return new(bay, run.First, run.Count, length, mass, new("Cutting length and mass of a log", "Geometry; profile only, without fittings",
        [
            new("b", "", clearBay, Dimension.Length),
            new("e", "", logs.EndBearing, Dimension.SectionLength),
            new("c", "", logs.FittingClearance, Dimension.SectionLength),
            new("ℓ", "b + 2·e − c", length, Dimension.Length),
            new("A", "", log.Section.Area, Dimension.SectionArea),
            new("ρ", "", log.Material.Density, Dimension.Density),
            new("m", "A·ρ·ℓ", mass, Dimension.Mass),
        ]));
    }
}
