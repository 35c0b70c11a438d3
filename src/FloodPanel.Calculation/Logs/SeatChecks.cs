namespace FloodPanel.Calculation.Logs;

/// <summary>The end of a log on its seat: the webs of a metal log, timber across its grain.</summary>
internal static class SeatChecks
{
    /// <summary>V against what the webs carry over the least bearing N = e − c; null where no web is to be checked.</summary>
    public static Check? Webs(LogFurtherChecks.Setting setting)
    {
        if (setting.Strength.Seat is not { } seat)
        {
            return null;
        }

        return new(
            "log-crippling", "Log webs at the seat", seat.Source, Dimension.Force, setting.Response.Shear, seat.Force, new DeferredSteps(Steps));

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = Begin(setting);
            steps.Steps.AddRange(seat.Steps);
            steps.Add("u", "V/R_w", setting.Response.Shear / seat.Force, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>σ = V/(h·N) across the grain against its design stress, k_c,90 = 1; null where that is unknown.</summary>
    public static Check? Timber(LogFurtherChecks.Setting setting)
    {
        if (setting.Strength.Across is not { } stress)
        {
            return null;
        }

        var height = setting.Strength.Log.Section.Height;
        var bearing = setting.Response.Shear / (height * setting.Strength.Bearing);
        return new(
            "log-seat-bearing", "Log bearing at the seat", $"Contact area alone, no spread; {stress.Source}", Dimension.Stress,
            bearing, stress.Value, new DeferredSteps(Steps));

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = Begin(setting);
            steps.Given("h", height, Dimension.SectionLength);
            steps.Add("σ", "V/(h·N)", bearing, Dimension.Stress);
            steps.Stress("f_90", stress);
            steps.Add("u", "σ/f_90", bearing / stress.Value, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>V and N = e − c.</summary>
    private static StepList Begin(LogFurtherChecks.Setting setting)
    {
        var steps = LogChecks.ShearSteps(setting.Response, setting.ClearBay, setting.EndBearing);
        steps.Given("c", setting.Strength.Clearance, Dimension.SectionLength);
        steps.Add("N", "e − c", setting.Strength.Bearing, Dimension.SectionLength);
        return steps;
    }
}
