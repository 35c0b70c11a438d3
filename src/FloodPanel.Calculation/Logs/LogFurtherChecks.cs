using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Logs;

/// <summary>What a log must stand besides bending, shear and deflection as a beam.</summary>
internal static class LogFurtherChecks
{
    /// <summary>Where a log stands and what it feels.</summary>
    internal sealed record Setting(LogStrength Strength, LogResponse Response, double ClearBay, bool IsJudged)
    {
        public double EndBearing => Strength.EndBearing;

        public double Span => ClearBay + EndBearing;
    }

    public static IReadOnlyList<Check> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers, int index, int bay)
    {
        var at = bay * model.LogCount + index;
        var setting = new Setting(model.LogStrength(index), numbers.Logs[at], model.Bays[bay], CaseForces.JudgesDeflection(kind));
        var checks = new List<Check>(6);
        Add(checks, WallChecks.Buckling(setting));
        Add(checks, SkinCheck.Of(setting, Pressure(model, numbers, index)));
        Add(checks, SeatChecks.Webs(setting));
        Add(checks, SeatChecks.Timber(setting));
        if (setting.IsJudged)
        {
            Add(checks, ShearDeflection.Of(setting));
            Add(checks, JointChecks.Seal(setting));
            Add(checks, index + 1 < model.LogCount ? JointChecks.Travel(setting, model.LogMember(index + 1), numbers.Logs[at + 1]) : null);
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
