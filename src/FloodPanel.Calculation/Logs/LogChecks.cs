namespace FloodPanel.Calculation.Logs;

/// <summary>The checks of a stop-log as a simply supported beam.</summary>
public static class LogChecks
{
    /// <summary>Bending: M = w·L²/8 against M_R = f_b·W.</summary>
    /// <param name="response">What the log feels.</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    /// <returns>The check; null when there is no design bending stress.</returns>
    /// <remarks>Source: beam statics, elastic section modulus. Limits: simply supported, uniform load, L = b + e.</remarks>
    public static Check? Bending(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        if (log.Bending is not { } stress)
        {
            return null;
        }

        var steps = new StepList(10);
        steps.Span(clearBay, endBearing);
        steps.Given("w", response.LineLoad, Dimension.LineForce);
        steps.Add("M", "w·L²/8", response.Moment, Dimension.Moment);
        steps.Stress("f_b", stress);
        steps.Given("W", log.Section.Modulus, Dimension.SectionModulus);
        steps.Add("M_R", "f_b·W", log.MomentResistance, Dimension.Moment);
        steps.Add("u", "M/M_R", response.Bending, Dimension.Ratio);
        return new(
            "log-bending", "Log bending", log.BendingSource, Dimension.Moment, response.Moment, log.MomentResistance,
            steps.Done());
    }

    /// <summary>Shear: V = w·L/2 against V_R = f_v·A_v.</summary>
    /// <param name="response">What the log feels.</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    /// <returns>The check; null when there is no design shear stress.</returns>
    /// <remarks>Source: beam statics. Limits: simply supported, uniform load, L = b + e.</remarks>
    public static Check? Shear(in LogResponse response, double clearBay, double endBearing, Member log)
    {
        if (log.Shear is not { } stress)
        {
            return null;
        }

        var steps = new StepList(10);
        steps.Span(clearBay, endBearing);
        steps.Given("w", response.LineLoad, Dimension.LineForce);
        steps.Add("V", "w·L/2", response.Shear, Dimension.Force);
        steps.Stress("f_v", stress);
        steps.Given("A_v", log.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", "f_v·A_v", log.ShearResistance, Dimension.Force);
        steps.Add("u", "V/V_R", response.ShearUse, Dimension.Ratio);
        return new(
            "log-shear", "Log shear", log.ShearSource, Dimension.Force, response.Shear, log.ShearResistance, steps.Done());
    }

    /// <summary>Deflection: δ = 5·w_k·L⁴/(384·E·I), unfactored, against L/n.</summary>
    /// <param name="response">What the log feels.</param>
    /// <param name="characteristicLoad">w_k, unfactored line load [N/m].</param>
    /// <param name="clearBay">b, clear width of the bay [m].</param>
    /// <param name="endBearing">e, length of log that bears at each end [m].</param>
    /// <param name="log">The log.</param>
    /// <remarks>Source: beam statics; the limit is the user's choice. Limits: bending deformation only.</remarks>
    public static Check Deflection(
        in LogResponse response, double characteristicLoad, double clearBay, double endBearing, Member log)
    {
        var limit = (clearBay + endBearing) / log.DeflectionLimit;
        var steps = new StepList(10);
        steps.Span(clearBay, endBearing);
        steps.Given("w_k", characteristicLoad, Dimension.LineForce);
        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", log.Section.Inertia, Dimension.SecondMoment);
        steps.Add("δ", "5·w_k·L⁴/(384·E·I)", response.Deflection, Dimension.Deflection);
        steps.Given("n", log.DeflectionLimit, Dimension.Count);
        steps.Add("δ_lim", "L/n", limit, Dimension.Deflection);
        steps.Add("u", "δ/δ_lim", response.DeflectionUse, Dimension.Ratio);
        return new(
            "log-deflection", "Log deflection", "Beam statics; limit chosen by the user", Dimension.Deflection,
            response.Deflection, limit, steps.Done());
    }
}
