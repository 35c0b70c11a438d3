namespace FloodPanel.Storage.ProjectFile;

/// <summary>
/// Reads the actions of an opening. The figure that makes an action (a velocity, a height, a force) must be there:
/// a default of zero would leave the load away without a word.
/// </summary>
internal static class ActionReader
{
    private static readonly Words<Func<FileObject, WaveInput>> Waves = new(
        ("breaking", ReadBreaking),
        ("non-breaking", ReadNonBreaking));

    public static ActionSet Read(FileObject actions)
    {
        var read = new ActionSet
        {
            Flow = actions.Object("flow") is { } flow ? ReadFlow(flow) : null,
            Wave = actions.Object("wave") is { } wave ? ReadWave(wave) : null,
            Debris = actions.Object("debris") is { } debris ? ReadDebris(debris) : null,
            Wind = actions.Object("wind") is { } wind ? ReadWind(wind) : null,
            Line = actions.Object("line") is { } line ? ReadLine(line) : null,
        };
        actions.Close();
        return read;
    }

    private static FlowInput ReadFlow(FileObject flow)
    {
        var read = new FlowInput
        {
            Velocity = flow.Number("velocity"),
            ShapeCoefficient = flow.Number("shapeCoefficient", new FlowInput().ShapeCoefficient),
        };
        flow.Close();
        return read;
    }

    private static WaveInput? ReadWave(FileObject wave)
    {
        var read = wave.Word("kind", Waves)?.Invoke(wave);
        if (read is not null)
        {
            wave.Close();
        }

        return read;
    }

    private static BreakingWaveInput ReadBreaking(FileObject wave) => new()
    {
        RiskCategory = wave.WholeNumber("riskCategory", Fields.RiskCategory, new BreakingWaveInput().RiskCategory),
    };

    private static NonBreakingWaveInput ReadNonBreaking(FileObject wave)
    {
        var blank = new NonBreakingWaveInput();
        return new NonBreakingWaveInput
        {
            Height = wave.Number("height"),
            Period = wave.Number("period"),
            AngleDegrees = wave.Number("angle", blank.AngleDegrees),
            BedSlope = wave.Number("bedSlope", blank.BedSlope),
        };
    }

    private static DebrisInput ReadDebris(FileObject debris)
    {
        var blank = new DebrisInput();
        var read = new DebrisInput
        {
            Mass = debris.Number("mass", blank.Mass),
            Velocity = debris.Number("velocity"),
            StoppingTime = debris.Number("stoppingTime", blank.StoppingTime),
            Coefficients = debris.Object("coefficients") is { } factors ? ReadCoefficients(factors) : blank.Coefficients,
        };
        debris.Close();
        return read;
    }

    private static DebrisCoefficients ReadCoefficients(FileObject factors)
    {
        var blank = new DebrisCoefficients();
        var read = new DebrisCoefficients
        {
            Importance = factors.Number("importance", blank.Importance),
            Orientation = factors.Number("orientation", blank.Orientation),
            Depth = factors.Number("depth", blank.Depth),
            Blockage = factors.Number("blockage", blank.Blockage),
            Response = factors.NumberOrNull("response"),
        };
        factors.Close();
        return read;
    }

    private static WindInput ReadWind(FileObject wind)
    {
        var read = new WindInput { Pressure = wind.Number("pressure") };
        wind.Close();
        return read;
    }

    private static LineInput ReadLine(FileObject line)
    {
        var read = new LineInput { Force = line.Number("force"), Height = line.Number("height") };
        line.Close();
        return read;
    }
}
