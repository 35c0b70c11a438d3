using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Writes a project's own design basis.</summary>
internal static class BasisWriter
{
    public static void Write(Utf8JsonWriter json, DesignBasis basis)
    {
        json.WriteStartObject("ownBasis");
        json.WriteString("title", basis.Title);
        json.WriteString("loadSource", basis.LoadSource);
        WriteFactors(json, "inland", basis.Inland);
        WriteFactors(json, "coastal", basis.Coastal);
        json.WriteStartArray("strengths");
        foreach (var rule in basis.Strengths)
        {
            json.WriteStartObject();
            json.WriteString("family", FileWords.Family.Of(rule.Family));
            json.WriteNumber("multiplier", rule.Multiplier);
            json.WriteNumber("divisor", rule.Divisor);
            json.WriteString("source", rule.Source);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteFactors(Utf8JsonWriter json, string name, LoadFactors factors)
    {
        json.WriteStartObject(name);
        json.WriteNumber("floodSide", factors.FloodSide);
        json.WriteNumber("protectedSide", factors.ProtectedSide);
        json.WriteNumber("brimFull", factors.BrimFull);
        json.WriteNumber("debris", factors.Debris);
        json.WriteNumber("wind", factors.Wind);
        json.WriteNumber("line", factors.Line);
        json.WriteEndObject();
    }
}
