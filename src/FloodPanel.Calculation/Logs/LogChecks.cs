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
    /// <param name="response">What the log feels.</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    /// <returns>The check; null when there is no design bending stress.</returns>
    public static Check? Bending(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        if (log.Bending is not { } stress)
        {
            return null;
        }

        var steps = MomentSteps(response, clearBay, endBearing);
        steps.Stress("f_b", stress);
        steps.Given("W", log.Section.Modulus, Dimension.SectionModulus);
        steps.Add("M_R", "f_b·W", log.MomentResistance, Dimension.Moment);
        steps.Add("u", "M/M_R", response.Bending, Dimension.Ratio);
        return new(
            "log-bending", "Log bending", log.BendingSource, Dimension.Moment, response.Moment, log.MomentResistance,
            steps.Done());
    }

    /// <summary>Shear: V = w·L/2 + P against V_R = f_v·A_v.</summary>
    /// <param name="response">What the log feels.</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    /// <returns>The check; null when there is no design shear stress.</returns>
    public static Check? Shear(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        if (log.Shear is not { } stress)
        {
            return null;
        }

        var steps = ShearSteps(response, clearBay, endBearing);
        steps.Stress("f_v", stress);
        steps.Given("A_v", log.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", "f_v·A_v", log.ShearResistance, Dimension.Force);
        steps.Add("u", "V/V_R", response.ShearUse, Dimension.Ratio);
        return new(
            "log-shear", "Log shear", log.ShearSource, Dimension.Force, response.Shear, log.ShearResistance, steps.Done());
    }

    /// <summary>Deflection: δ = 5·w_k·L⁴/(384·E·I) + P_k·L³/(48·E·I), unfactored, against L/n, the user's choice.</summary>
    /// <param name="response">What the log feels.</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    public static Check Deflection(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        var limit = (clearBay + endBearing) / log.DeflectionLimit;
        var steps = DeflectionSteps(response, clearBay, endBearing, log);
        steps.Given("n", log.DeflectionLimit, Dimension.Count);
        steps.Add("δ_lim", "L/n", limit, Dimension.Deflection);
        steps.Add("u", "δ/δ_lim", response.DeflectionUse, Dimension.Ratio);
        return new(
            "log-deflection", "Log deflection", "Beam statics; limit chosen by the user", Dimension.Deflection,
            response.Deflection, limit, steps.Done());
    }

    /// <summary>How the moment came about, where no bending check tells it.</summary>
    internal static Working Moment(in LogResponse response, double clearBay, double endBearing) =>
        new("Moment in the log", Statics, MomentSteps(response, clearBay, endBearing).Done());

    /// <summary>How the shear force came about, where no shear check tells it.</summary>
    internal static Working ShearForce(in LogResponse response, double clearBay, double endBearing) =>
        new("Shear force in the log", Statics, ShearSteps(response, clearBay, endBearing).Done());

    /// <summary>How the deflection came about, where it is not judged.</summary>
    internal static Working DeflectionOnly(in LogResponse response, double clearBay, double endBearing, Member log) =>
        new("Deflection of the log", Statics, DeflectionSteps(response, clearBay, endBearing, log).Done());

    internal static StepList MomentSteps(in LogResponse response, double clearBay, double endBearing)
    {
        var steps = Loads(clearBay, endBearing, "w", response.Load.Design, "P", response.Point.Design);
        var formula = response.Point.Design == 0 ? "w·L²/8" : "w·L²/8 + P·L/4";
        steps.Add("M", formula, response.Moment, Dimension.Moment);
        return steps;
    }

    internal static StepList ShearSteps(in LogResponse response, double clearBay, double endBearing)
    {
        var steps = Loads(clearBay, endBearing, "w", response.Load.Design, "P", response.Point.Design);
        steps.Add("V", response.Point.Design == 0 ? "w·L/2" : "w·L/2 + P", response.Shear, Dimension.Force);
        return steps;
    }

    internal static StepList DeflectionSteps(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        var point = response.Point.Characteristic;
        var steps = Loads(clearBay, endBearing, "w_k", response.Load.Characteristic, "P_k", point);
        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", log.Section.Inertia, Dimension.SecondMoment);
        var formula = point == 0 ? "5·w_k·L⁴/(384·E·I)" : "5·w_k·L⁴/(384·E·I) + P_k·L³/(48·E·I)";
        steps.Add("δ", formula, response.Deflection, Dimension.Deflection);
        return steps;
    }

    internal static StepList Loads(
        double clearBay, double endBearing, string lineSymbol, double line, string pointSymbol, double point)
    {
        var steps = new StepList(12);
        steps.Span(clearBay, endBearing);
        steps.Given(lineSymbol, line, Dimension.LineForce);
        if (point != 0)
        {
            steps.Given(pointSymbol, point, Dimension.Force);
        }

        return steps;
    }
}
