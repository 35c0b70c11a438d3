namespace FloodPanel.Calculation.Logs;

/// <summary>Tightness: neighbouring logs apart at mid-span, and a log turned at its end seal. Unfactored, by statics.</summary>
internal static class JointChecks
{
    /// <summary>Difference of the deflections of a log and the one above it against the travel of the joint; null where none is entered.</summary>
    public static Check? Travel(LogFurtherChecks.Setting setting, LogSetting above)
    {
        if (setting.Strength.Joint is not { } joint)
        {
            return null;
        }

        var (lower, upper) = (setting.Response.Deflection, above.Response.Deflection);
        var apart = Math.Max(lower, upper) - Math.Min(lower, upper);
        return new(
            "log-joint-travel", "Joint to the log above", "Beam statics: the logs bend apart at mid-span", Dimension.Deflection,
            apart, joint.Travel, new DeferredSteps<LogFurtherChecks.Setting>(setting, _ => Steps()));

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = new StepList(18);
            steps.Span(setting.ClearBay, setting.EndBearing);
            Log(steps, "1", setting);
            Log(steps, "2", above);
            steps.Add("Δ", "max(δ_1, δ_2) − min(δ_1, δ_2)", apart, Dimension.Deflection);
            steps.Given("Δ_lim", joint.Travel, Dimension.Deflection);
            steps.Add("u", "Δ/Δ_lim", apart / joint.Travel, Dimension.Ratio);
            return steps.Done();
        }
    }

    /// <summary>Turn of the end over its bearing, θ·e, against the compression of the seal there; null where none is entered.</summary>
    public static Check? Seal(LogFurtherChecks.Setting setting)
    {
        if (setting.Strength.Joint?.SealCompression is not { } compression)
        {
            return null;
        }

        var (load, point, stiffness) = (setting.Response.Load.Characteristic, setting.Response.Point.Characteristic, setting.Strength.Log.Stiffness);
        var rotation = SimpleBeam.EndRotation(load, setting.Span, stiffness) + SimpleBeam.PointEndRotation(point, setting.Span, stiffness);
        var opening = rotation * setting.EndBearing;
        return new(
            "log-end-seal", "Seal at the log end", "Beam statics: the end turns over its bearing", Dimension.Deflection, opening,
            compression, new DeferredSteps<LogFurtherChecks.Setting>(setting, _ => Steps()));

        IReadOnlyList<CalculationStep> Steps()
        {
            var steps = LogChecks.Loads(setting, "w_k", load, "P_k", point);
            steps.Given("E", setting.Strength.Log.Material.ElasticModulus, Dimension.ElasticModulus);
            steps.Given("I", setting.Strength.Log.Section.Inertia, Dimension.SecondMoment);
            steps.Add("θ", point == 0 ? "w_k·L³/(24·E·I)" : "w_k·L³/(24·E·I) + P_k·L²/(16·E·I)", rotation, Dimension.Angle);
            steps.Add("s", "θ·e", opening, Dimension.Deflection);
            steps.Given("s_lim", compression, Dimension.Deflection);
            steps.Add("u", "s/s_lim", opening / compression, Dimension.Ratio);
            return steps.Done();
        }
    }

    private static void Log(StepList steps, string index, LogSetting setting)
    {
        var (log, response) = (setting.Log, setting.Response);
        var point = response.Point.Characteristic;
        steps.Given($"w_{index}", response.Load.Characteristic, Dimension.LineForce);
        steps.Given($"E_{index}", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given($"I_{index}", log.Section.Inertia, Dimension.SecondMoment);
        if (point != 0)
        {
            steps.Given($"P_{index}", point, Dimension.Force);
        }

        var formula = $"5·w_{index}·L⁴/(384·E_{index}·I_{index})" + (point == 0 ? "" : $" + P_{index}·L³/(48·E_{index}·I_{index})");
        steps.Add($"δ_{index}", formula, response.Deflection, Dimension.Deflection);
    }
}
