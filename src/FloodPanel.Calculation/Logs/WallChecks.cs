namespace FloodPanel.Calculation.Logs;

/// <summary>Bending of a log with regard to its walls.</summary>
internal static class WallChecks
{
    /// <summary>M against M_R of the class or range of the walls; null where there is no such resistance.</summary>
    public static Check? Buckling(LogFurtherChecks.Setting setting)
    {
        if (setting.Strength.Buckling.Resistance is not { } resistance)
        {
            return null;
        }

        return new(
            "log-local-buckling", "Log bending with local buckling", resistance.Source, Dimension.Moment,
            setting.Response.Moment, resistance.Moment, new DeferredSteps<LogFurtherChecks.Setting>(setting, Steps));

        static IReadOnlyList<CalculationStep> Steps(LogFurtherChecks.Setting setting)
        {
            var resistance = setting.Strength.Buckling.Resistance!;
            var steps = LogChecks.MomentSteps(setting);
            steps.Steps.AddRange(resistance.Steps);
            steps.Add("u", "M/M_R", setting.Response.Moment / resistance.Moment, Dimension.Ratio);
            return steps.Done();
        }
    }
}
