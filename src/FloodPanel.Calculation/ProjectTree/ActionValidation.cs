using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in the actions of an opening.</summary>
internal static class ActionValidation
{
    public static void Validate(Opening opening, string openingPath, ProblemList problems, Library library)
    {
        var (actions, path) = (opening.Actions, $"{openingPath}.actions");
        if (actions.Flow is { } flow)
        {
            problems.Check(Fields.FlowVelocity, flow.Velocity, $"{path}.flow");
            problems.Check(Fields.ShapeCoefficient, flow.ShapeCoefficient, $"{path}.flow");
        }

        Wave(actions.Wave, $"{path}.wave", problems);
        Debris(actions.Debris, $"{path}.debris", problems);
        problems.Check(Fields.WindPressure, actions.Wind?.Pressure, $"{path}.wind");
        if (actions.Line is { } line)
        {
            problems.Check(Fields.LineLoadForce, line.Force, $"{path}.line");
            problems.Check(Fields.LineLoadHeight, line.Height, $"{path}.line");
            LineHeight(opening, line, $"{path}.line", problems, library);
        }
    }

    private static void Wave(WaveInput? wave, string path, ProblemList problems)
    {
        switch (wave)
        {
            case BreakingWaveInput breaking:
                problems.Check(Fields.RiskCategory, breaking.RiskCategory, path);
                break;
            case NonBreakingWaveInput regular:
                problems.Check(Fields.WaveHeight, regular.Height, path);
                problems.Check(Fields.WavePeriod, regular.Period, path);
                problems.Check(Fields.WaveAngle, regular.AngleDegrees, path);
                problems.Check(Fields.BedSlope, regular.BedSlope, path);
                break;
        }
    }

    private static void Debris(DebrisInput? debris, string path, ProblemList problems)
    {
        if (debris is null)
        {
            return;
        }

        problems.Check(Fields.DebrisMass, debris.Mass, path);
        problems.Check(Fields.DebrisVelocity, debris.Velocity, path);
        problems.Check(Fields.StoppingTime, debris.StoppingTime, path);
        var coefficients = debris.Coefficients;
        problems.CheckAt(Fields.DebrisCoefficient, coefficients.Importance, $"{path}.coefficients.importance");
        problems.CheckAt(Fields.DebrisCoefficient, coefficients.Orientation, $"{path}.coefficients.orientation");
        problems.CheckAt(Fields.DebrisCoefficient, coefficients.Depth, $"{path}.coefficients.depth");
        problems.CheckAt(Fields.DebrisCoefficient, coefficients.Blockage, $"{path}.coefficients.blockage");
        problems.CheckAt(Fields.DebrisCoefficient, coefficients.Response ?? 0, $"{path}.coefficients.response");
    }

    private static void LineHeight(Opening opening, LineInput line, string path, ProblemList problems, Library library)
    {
        if (BarrierHeight.Of(opening, library) is not { } height)
        {
            return;
        }

        if (line.Height > height + FloodLevels.HeightTolerance)
        {
            problems.Add($"{path}.height", $"Line load height is {new Quantity(line.Height, Dimension.Length):typed}; allowed is up to the top of the barrier, {new Quantity(height, Dimension.Length)}.");
        }
    }
}
