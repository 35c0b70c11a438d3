using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Writes the actions that are switched on.</summary>
internal static class ActionWriter
{
    public static void Write(Utf8JsonWriter json, ActionSet actions)
    {
        json.WriteStartObject("actions");
        if (actions.Flow is { } flow)
        {
            json.WriteStartObject("flow");
            json.WriteNumber("velocity", flow.Velocity);
            json.WriteNumber("shapeCoefficient", flow.ShapeCoefficient);
            json.WriteEndObject();
        }

        WriteWave(json, actions.Wave);
        WriteDebris(json, actions.Debris);
        if (actions.Wind is { } wind)
        {
            json.WriteStartObject("wind");
            json.WriteNumber("pressure", wind.Pressure);
            json.WriteEndObject();
        }

        if (actions.Line is { } line)
        {
            json.WriteStartObject("line");
            json.WriteNumber("force", line.Force);
            json.WriteNumber("height", line.Height);
            json.WriteEndObject();
        }

        json.WriteEndObject();
    }

    private static void WriteWave(Utf8JsonWriter json, WaveInput? wave)
    {
        switch (wave)
        {
            case null:
                break;
            case BreakingWaveInput breaking:
                json.WriteStartObject("wave");
                json.WriteString("kind", "breaking");
                json.WriteNumber("riskCategory", breaking.RiskCategory);
                json.WriteEndObject();
                break;
            case NonBreakingWaveInput other:
                json.WriteStartObject("wave");
                json.WriteString("kind", "non-breaking");
                json.WriteNumber("height", other.Height);
                json.WriteNumber("period", other.Period);
                json.WriteNumber("angle", other.AngleDegrees);
                json.WriteNumber("bedSlope", other.BedSlope);
                json.WriteEndObject();
                break;
            default:
                throw new InvalidOperationException($"The project file has no form for {wave.GetType().Name}.");
        }
    }

    private static void WriteDebris(Utf8JsonWriter json, DebrisInput? debris)
    {
        if (debris is null)
        {
            return;
        }

        json.WriteStartObject("debris");
        json.WriteNumber("mass", debris.Mass);
        json.WriteNumber("velocity", debris.Velocity);
        json.WriteNumber("stoppingTime", debris.StoppingTime);
        json.WriteStartObject("coefficients");
        json.WriteNumber("importance", debris.Coefficients.Importance);
        json.WriteNumber("orientation", debris.Coefficients.Orientation);
        json.WriteNumber("depth", debris.Coefficients.Depth);
        json.WriteNumber("blockage", debris.Coefficients.Blockage);
        json.WriteNumberOrNull("response", debris.Coefficients.Response);
        json.WriteEndObject();
        json.WriteEndObject();
    }
}
