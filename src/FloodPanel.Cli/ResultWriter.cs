using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Leakage;

namespace FloodPanel.Cli;

/// <summary>Writes results as one JSON object, in base SI. The names are fixed: scripts read them.</summary>
internal static class ResultWriter
{
    // Names in any script stay readable; the output is never embedded in a page.
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    public static ReadOnlySpan<byte> Write(ProjectResult result)
    {
        var buffer = new ArrayBufferWriter<byte>(65536);
        using (var json = new Utf8JsonWriter(buffer, Options))
        {
            json.WriteStartObject();
            json.WriteString("project", result.Project.Name);
            json.WriteStartArray("openings");
            foreach (var opening in result.Openings)
            {
                WriteOpening(json, opening);
            }

            json.WriteEndArray();
            CoverWriter.Write(json, result.Covers);
            json.WriteEndObject();
        }

        buffer.Write("\n"u8);
        return buffer.WrittenSpan;
    }

    private static void WriteOpening(Utf8JsonWriter json, OpeningResult opening)
    {
        json.WriteStartObject();
        json.WriteString("id", opening.Opening.Id);
        json.WriteString("verdict", Word(opening.Verdict.Kind));
        json.WriteStartArray("missing");
        foreach (var check in opening.Verdict.Missing)
        {
            json.WriteStringValue(check);
        }

        json.WriteEndArray();
        json.WriteFigure("designFloodLevel", opening.DesignFloodLevel);
        json.WriteFigure("retainedDepth", opening.RetainedDepth);
        json.WriteFigure("barrierHeight", opening.BarrierHeight);
        WriteGoverning(json, opening.Verdict.Governing);
        json.WriteStartArray("cases");
        foreach (var loadCase in opening.Cases)
        {
            CaseWriter.Write(json, loadCase);
        }

        json.WriteEndArray();
        WriteLeakage(json, opening.Leakage);
        WriteNotes(json, [.. opening.Gaps.Select(gap => gap.Note), .. opening.Notes]);
        json.WriteEndObject();
    }

    private static void WriteLeakage(Utf8JsonWriter json, LeakageResult? leakage)
    {
        if (leakage is null)
        {
            return;
        }

        json.WriteStartObject("leakage");
        json.WriteFigure("widthLength", leakage.WidthLength);
        json.WriteFigure("sealLength", leakage.SealLength);
        json.WriteFigure("leak", leakage.Leak);
        json.WriteFigure("rain", leakage.Rain);
        json.WriteFigure("pump", leakage.Pump);
        json.WriteFigure("timeToFill", leakage.TimeToFill);
        json.WriteEndObject();
    }

    private static void WriteGoverning(Utf8JsonWriter json, Governing? governing)
    {
        if (governing is null)
        {
            json.WriteNull("governing");
            return;
        }

        json.WriteStartObject("governing");
        json.WriteString("check", governing.Check);
        json.WriteString("case", governing.Case);
        json.WriteFigure("utilisation", governing.Utilisation);
        json.WriteString("member", governing.Member);
        json.WriteEndObject();
    }

    internal static void WriteNotes(Utf8JsonWriter json, IReadOnlyList<Note> notes)
    {
        json.WriteStartArray("notes");
        foreach (var note in notes)
        {
            json.WriteStartObject();
            json.WriteString("code", note.Code);
            json.WriteString("text", note.Text.In(UnitSystem.SI));
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    internal static string Word(VerdictKind verdict) => verdict switch
    {
        VerdictKind.Adequate => "adequate",
        VerdictKind.Inadequate => "inadequate",
        VerdictKind.Incomplete => "incomplete",
        _ => throw new ArgumentOutOfRangeException(nameof(verdict), verdict, "has no word"),
    };
}
