namespace FloodPanel.Calculation.Logs;

/// <summary>What a log must stand besides bending, shear and deflection as a beam.</summary>
internal static class LogFurtherChecks
{
    /// <summary>Where a log stands, what it feels and what it resists besides bending and shear as a beam.</summary>
    internal sealed record Setting(LogStrength Strength, LogResponse Response, double ClearBay, double Pressure)
        : LogSetting(Response, ClearBay, Strength.EndBearing, Strength.Log);

    /// <summary>The setting of one log in one bay.</summary>
    public static Setting SettingOf(OpeningModel model, CaseEvaluation numbers, int index, int bay) =>
        new(model.LogStrength(index), numbers.Logs[bay * model.LogCount + index], model.Bays[bay], Pressure(model, numbers, index));

    /// <summary>The checks of one log that have their inputs.</summary>
    /// <param name="setting">The log.</param>
    /// <param name="above">The log above it; null at the top.</param>
    /// <param name="isJudged">False where deflections are reported and not judged.</param>
    public static IReadOnlyList<Check> Of(Setting setting, Setting? above, bool isJudged)
    {
        var checks = new List<Check>(6);
        Add(checks, WallChecks.Buckling(setting));
        Add(checks, SkinCheck.Of(setting));
        Add(checks, SeatChecks.Webs(setting));
        Add(checks, SeatChecks.Timber(setting));
        if (isJudged)
        {
            Add(checks, ShearDeflection.Of(setting));
            Add(checks, JointChecks.Seal(setting));
            Add(checks, above is null ? null : JointChecks.Travel(setting, above));
        }

        return checks;
    }

    /// <summary>p, greatest design pressure at the edges of a log [Pa], just within them: at a step both sides would count.</summary>
    private static double Pressure(OpeningModel model, CaseEvaluation numbers, int index)
    {
        const double inside = 1e-9;
        return Math.Max(
            numbers.Diagram.DesignAt(model.EdgeHeight(index) + inside), numbers.Diagram.DesignAt(model.EdgeHeight(index + 1) - inside));
    }

    private static void Add(List<Check> checks, Check? check)
    {
        if (check is not null)
        {
            checks.Add(check);
        }
    }
}
