using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>
/// Writes project files. Defaults are written out, so that a file keeps its meaning if a default ever changes.
/// Doubles are written with the fewest digits that read back to the same number.
/// </summary>
public static class ProjectFileWriter
{
    /// <summary>The project as UTF-8 JSON.</summary>
    /// <param name="project">A project of finite numbers.</param>
    /// <param name="indented">True for files that people read; false for the store.</param>
    public static byte[] Write(Project project, bool indented = true)
    {
        var buffer = new ArrayBufferWriter<byte>(8192);
        using (var json = new Utf8JsonWriter(buffer, Options(indented)))
        {
            WriteProject(json, project);
        }

        if (indented)
        {
            buffer.Write("\n"u8);
        }

        return buffer.WrittenSpan.ToArray();
    }

    // The relaxed encoder keeps names in any script readable; the file is never embedded in a page.
    private static JsonWriterOptions Options(bool indented) => new()
    {
        Indented = indented,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    private static void WriteProject(Utf8JsonWriter json, Project project)
    {
        json.WriteStartObject();
        json.WriteString("format", ProjectFileReader.Format);
        json.WriteNumber("version", ProjectFileReader.Version);
        json.WriteString("name", project.Name);
        json.WriteString("reference", project.Reference);
        json.WriteString("client", project.Client);
        json.WriteString("address", project.Address);
        json.WriteString("engineer", project.Engineer);
        json.WriteString("designBasis", FileWords.DesignBasis.Of(project.DesignBasis));
        if (project.OwnBasis is { } basis)
        {
            BasisWriter.Write(json, basis);
        }

        WriteConfirmed(json, project.Confirmed);
        WriteSite(json, project.Site);
        json.WriteStartArray("openings");
        foreach (var opening in project.Openings)
        {
            OpeningWriter.Write(json, opening);
        }

        json.WriteEndArray();
        CoverFile.Write(json, project.Covers);
        json.WriteEndObject();
    }

    private static void WriteConfirmed(Utf8JsonWriter json, ValueList<string> confirmed)
    {
        if (confirmed.Count == 0)
        {
            return;
        }

        json.WriteStartArray("confirmed");
        foreach (var id in confirmed)
        {
            json.WriteStringValue(id);
        }

        json.WriteEndArray();
    }

    private static void WriteSite(Utf8JsonWriter json, Site site)
    {
        json.WriteStartObject("site");
        json.WriteString("datum", site.Datum);
        json.WriteNumber("waterDensity", site.WaterDensity);
        json.WriteNumber("annualProbability", site.AnnualProbability);
        json.WriteNumber("designStillWaterLevel", site.DesignStillWaterLevel);
        json.WriteNumber("surge", site.Surge);
        json.WriteNumber("climateAllowance", site.ClimateAllowance);
        json.WriteNumber("climateRatePerYear", site.ClimateRatePerYear);
        json.WriteNumber("designLifeYears", site.DesignLifeYears);
        json.WriteNumber("freeboard", site.Freeboard);
        json.WriteString("floodZone", FileWords.FloodZone.Of(site.FloodZone));
        json.WriteStartArray("levels");
        foreach (var level in site.Levels)
        {
            json.WriteStartObject();
            json.WriteNumber("annualProbability", level.AnnualProbability);
            json.WriteNumber("level", level.Level);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }
}
