using System.Text.Json;
using FloodPanel.Calculation.Covers;

namespace FloodPanel.Cli;

/// <summary>Writes the covers of a project; left out where there are none.</summary>
internal static class CoverWriter
{
    public static void Write(Utf8JsonWriter json, IReadOnlyList<CoverResult> covers)
    {
        if (covers.Count == 0)
        {
            return;
        }

        json.WriteStartArray("covers");
        foreach (var cover in covers)
        {
            json.WriteStartObject();
            json.WriteString("name", cover.Cover.Name);
            json.WriteString("verdict", ResultWriter.Word(cover.Kind));
            json.WriteFigure("depth", cover.Depth);
            json.WriteFigure("edgeReaction", cover.Response?.Reaction);
            json.WriteFigure("cornerForce", cover.Response?.CornerHold);
            json.WriteNumber("fasteners", cover.Fasteners);
            CaseWriter.WriteChecks(json, cover.Checks);
            ResultWriter.WriteNotes(json, [.. cover.Gaps, .. cover.Notes]);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
