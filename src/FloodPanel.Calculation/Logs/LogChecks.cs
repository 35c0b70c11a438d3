namespace FloodPanel.Calculation.Logs;

/// <summary>The checks of a stop-log as a simply supported beam, and the same working where there is nothing to check against.</summary>
/// <remarks>
/// Limits of all of them: simply supported over L = b + e, line load w spread evenly, a debris share P at mid-span for
/// the moment and the deflection and at the support for the shear; bending deformation only.
/// </remarks>
public static class LogChecks
{
    private const string Statics = "Beam statics, simply supported";

    /// <summary>Bending: M = w·L²/8 + P·L/4 against M_R = f_b·W, the elastic resistance.</summary>
    /// <param name="setting">Where the log stands and what it feels.</param>
    /// <returns>The check; null when there is no design bending stress.</returns>
    public static Check? Bending(LogSetting setting)
    {
        var (log, response) = (setting.Log, setting.Response);
        return log.Bending is null ? null : new(
            "log-bending", "Log bending", log.BendingSource, Dimension.Moment, response.Moment, log.MomentResistance,
            new DeferredSteps<LogSetting>(setting, Steps));

        static IReadOnlyList<CalculationStep> Steps(LogSetting setting)
        {
            var log = setting.Log;
            var steps = MomentSteps(setting);
            steps.Stress("f_b", log.Bending!);
            steps.Given("W", log.Section.Modulus, Dimension.SectionModulus);
            steps.Add("M_R", "f_b·W", log.MomentResistance, Dimension.Moment);
            steps.Add("u", "M/M_R", setting.Response.Bending, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>Shear: V = w·L/2 + P against V_R = f_v·A_v.</summary>
    /// <param name="setting">Where the log stands and what it feels.</param>
    /// <returns>The check; null when there is no design shear stress.</returns>
    public static Check? Shear(LogSetting setting)
    {
        var (log, response) = (setting.Log, setting.Response);
        return log.Shear is null ? null : new(
            "log-shear", "Log shear", log.ShearSource, Dimension.Force, response.Shear, log.ShearResistance,
            new DeferredSteps<LogSetting>(setting, Steps));

        static IReadOnlyList<CalculationStep> Steps(LogSetting setting)
        {
            var log = setting.Log;
            var steps = ShearSteps(setting);
            steps.Stress("f_v", log.Shear!);
            steps.Given("A_v", log.Section.ShearArea, Dimension.SectionArea);
            steps.Add("V_R", "f_v·A_v", log.ShearResistance, Dimension.Force);
            steps.Add("u", "V/V_R", setting.Response.ShearUse, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>Deflection: δ = 5·w_k·L⁴/(384·E·I) + P_k·L³/(48·E·I), unfactored, against L/n, the user's choice.</summary>
    /// <param name="setting">Where the log stands and what it feels.</param>
    public static Check Deflection(LogSetting setting)
    {
        return new(
            "log-deflection", "Log deflection", "Beam statics; limit chosen by the user", Dimension.Deflection,
            setting.Response.Deflection, Limit(setting), new DeferredSteps<LogSetting>(setting, Steps));

        static double Limit(LogSetting setting) => setting.Span / setting.Log.DeflectionLimit;

        static IReadOnlyList<CalculationStep> Steps(LogSetting setting)
        {
            var steps = DeflectionSteps(setting);
            steps.Given("n", setting.Log.DeflectionLimit, Dimension.Count);
            steps.Add("δ_lim", "L/n", Limit(setting), Dimension.Deflection);
            steps.Add("u", "δ/δ_lim", setting.Response.DeflectionUse, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>How the moment came about, where no bending check tells it.</summary>
    internal static Working Moment(LogSetting setting) =>
        new("Moment in the log", Statics, new DeferredSteps<LogSetting>(setting, static s => MomentSteps(s).Done()));

    /// <summary>How the shear force came about, where no shear check tells it.</summary>
    internal static Working ShearForce(LogSetting setting) =>
        new("Shear force in the log", Statics, new DeferredSteps<LogSetting>(setting, static s => ShearSteps(s).Done()));

    /// <summary>How the deflection came about, where it is not judged.</summary>
    internal static Working DeflectionOnly(LogSetting setting) =>
        new("Deflection of the log", Statics, new DeferredSteps<LogSetting>(setting, static s => DeflectionSteps(s).Done()));

    internal static StepList MomentSteps(LogSetting setting)
    {
        var response = setting.Response;
        var steps = Loads(setting, "w", response.Load.Design, "P", response.Point.Design);
        var formula = response.Point.Design == 0 ? "w·L²/8" : "w·L²/8 + P·L/4";
        steps.Add("M", formula, response.Moment, Dimension.Moment);
        return steps;
    }

    internal static StepList ShearSteps(LogSetting setting)
    {
        var response = setting.Response;
        var steps = Loads(setting, "w", response.Load.Design, "P", response.Point.Design);
        steps.Add("V", response.Point.Design == 0 ? "w·L/2" : "w·L/2 + P", response.Shear, Dimension.Force);
        return steps;
    }

    internal static StepList DeflectionSteps(LogSetting setting)
    {
        var (log, response) = (setting.Log, setting.Response);
        var point = response.Point.Characteristic;
        var steps = Loads(setting, "w_k", response.Load.Characteristic, "P_k", point);
        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", log.Section.Inertia, Dimension.SecondMoment);
        var formula = point == 0 ? "5·w_k·L⁴/(384·E·I)" : "5·w_k·L⁴/(384·E·I) + P_k·L³/(48·E·I)";
        steps.Add("δ", formula, response.Deflection, Dimension.Deflection);
        return steps;
    }

    internal static StepList Loads(LogSetting setting, string lineSymbol, double line, string pointSymbol, double point)
    {
        var steps = new StepList(16);
        steps.Span(setting.ClearBay, setting.EndBearing);
        steps.Given(lineSymbol, line, Dimension.LineForce);
        if (point != 0)
        {
            steps.Given(pointSymbol, point, Dimension.Force);
        }

        return steps;
    }
}
