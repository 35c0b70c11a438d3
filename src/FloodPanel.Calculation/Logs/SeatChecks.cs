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
            "log-crippling", "Log webs at the seat", seat.Source, Dimension.Force, setting.Response.Shear, seat.Force,
            new DeferredSteps<LogFurtherChecks.Setting>(setting, Steps));

        static IReadOnlyList<CalculationStep> Steps(LogFurtherChecks.Setting setting)
        {
            var seat = setting.Strength.Seat!;
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

        return new(
            "log-seat-bearing", "Log bearing at the seat", setting.Strength.AcrossSource, Dimension.Stress,
            Bearing(setting), stress.Value, new DeferredSteps<LogFurtherChecks.Setting>(setting, Steps));

        static double Bearing(LogFurtherChecks.Setting setting) =>
            setting.Response.Shear / (setting.Log.Section.Height * setting.Strength.Bearing);

        static IReadOnlyList<CalculationStep> Steps(LogFurtherChecks.Setting setting)
        {
            var (stress, bearing) = (setting.Strength.Across!, Bearing(setting));
            var steps = Begin(setting);
            steps.Given("h", setting.Log.Section.Height, Dimension.SectionLength);
            steps.Add("σ", "V/(h·N)", bearing, Dimension.Stress);
            steps.Stress("f_90", stress);
            steps.Add("u", "σ/f_90", bearing / stress.Value, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>V and N = e − c.</summary>
    private static StepList Begin(LogFurtherChecks.Setting setting)
    {
        var steps = LogChecks.ShearSteps(setting);
        steps.Given("c", setting.Strength.Clearance, Dimension.SectionLength);
        steps.Add("N", "e − c", setting.Strength.Bearing, Dimension.SectionLength);
        return steps;
    }
}
