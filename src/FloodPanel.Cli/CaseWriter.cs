using System.Text.Json;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Parts;

namespace FloodPanel.Cli;

/// <summary>Writes one load case with its logs, posts and guides.</summary>
internal static class CaseWriter
{
    public static void Write(Utf8JsonWriter json, CaseResult result)
    {
        json.WriteStartObject();
        json.WriteString("name", result.Name);
        json.WriteFigure("resultant", result.Resultant);
        json.WriteFigure("centreOfPressure", result.CentreOfPressure);
        json.WriteStartArray("actions");
        foreach (var action in result.Actions)
        {
            json.WriteStartObject();
            json.WriteString("kind", Word(action.Kind));
            json.WriteFigure("resultant", action.Resultant);
            json.WriteFigure("centreOfPressure", action.CentreOfPressure);
            if (action.Impact is { } impact)
            {
                json.WriteFigure("force", impact.Characteristic);
                json.WriteFigure("height", impact.Height);
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
        WriteMembers(json, result);
        WriteParts(json, result.Parts);
        json.WriteEndObject();
    }

    private static void WriteMembers(Utf8JsonWriter json, CaseResult result)
    {
        json.WriteStartArray("logs");
        foreach (var log in result.Logs)
        {
            WriteLog(json, log);
        }

        json.WriteEndArray();
        json.WriteStartArray("posts");
        foreach (var post in result.Posts)
        {
            json.WriteStartObject();
            json.WriteNumber("index", post.Index);
            json.WriteFigure("baseShear", post.BaseShear);
            json.WriteFigure("baseMoment", post.BaseMoment);
            json.WriteFigure("tipDeflection", post.TipDeflection);
            WriteUtilisations(json, post.BendingCheck, post.ShearCheck, post.DeflectionCheck);
            WriteOthers(json, post.Others);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("guides");
        foreach (var guide in result.Guides)
        {
            json.WriteStartObject();
            json.WriteString("side", guide.Side);
            json.WriteFigure("reaction", guide.Reaction);
            json.WriteFigure("peakLineReaction", guide.PeakLineReaction);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    // Left out where no part has inputs.
    private static void WriteParts(Utf8JsonWriter json, IReadOnlyList<PartResult> parts)
    {
        if (parts.Count == 0)
        {
            return;
        }

        json.WriteStartArray("parts");
        foreach (var part in parts)
        {
            json.WriteStartObject();
            json.WriteString("check", part.Check);
            json.WriteString("member", part.Member);
            WriteChecks(json, part.Checks);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    internal static void WriteChecks(Utf8JsonWriter json, IReadOnlyList<Check> checks)
    {
        json.WriteStartArray("checks");
        foreach (var check in checks)
        {
            json.WriteStartObject();
            json.WriteString("name", check.Name);
            json.WriteString("source", check.Source);
            json.WriteFigure("demand", check.Demand);
            json.WriteFigure("capacity", check.Capacity);
            json.WriteFigure("utilisation", check.Utilisation);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WriteLog(Utf8JsonWriter json, LogResult log)
    {
        json.WriteStartObject();
        json.WriteNumber("index", log.Index);
        json.WriteNumber("bay", log.Bay);
        json.WriteFigure("bottom", log.Bottom);
        json.WriteFigure("top", log.Top);
        json.WriteFigure("lineLoad", log.LineLoad);
        json.WriteFigure("moment", log.Moment);
        json.WriteFigure("shear", log.Shear);
        json.WriteFigure("deflection", log.Deflection);
        WriteUtilisations(json, log.BendingCheck, log.ShearCheck, log.DeflectionCheck);
        WriteOthers(json, log.Others);
        json.WriteEndObject();
    }

    private static void WriteOthers(Utf8JsonWriter json, IReadOnlyList<Check> others)
    {
        if (others.Count > 0)
        {
            WriteChecks(json, others);
        }
    }

    // A check without inputs has no utilisation.
    private static void WriteUtilisations(Utf8JsonWriter json, Check? bending, Check? shear, Check? deflection)
    {
        json.WriteStartObject("utilisation");
        json.WriteFigure("bending", bending?.Utilisation);
        json.WriteFigure("shear", shear?.Utilisation);
        json.WriteFigure("deflection", deflection?.Utilisation);
        json.WriteEndObject();
    }

    private static string Word(ActionKind kind) => kind switch
    {
        ActionKind.Hydrostatic => "hydrostatic",
        ActionKind.Flow => "flow",
        ActionKind.Wave => "wave",
        ActionKind.Debris => "debris",
        ActionKind.Wind => "wind",
        ActionKind.Line => "line",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "has no word"),
    };
}
