using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Writes one opening with its barrier.</summary>
internal static class OpeningWriter
{
    public static void Write(Utf8JsonWriter json, Opening opening)
    {
        json.WriteStartObject();
        json.WriteString("id", opening.Id);
        json.WriteString("name", opening.Name);
        json.WriteNumber("sillLevel", opening.SillLevel);
        json.WriteNumberOrNull("groundLevel", opening.GroundLevel);
        json.WriteNumber("clearWidth", opening.ClearWidth);
        json.WriteNumber("clearHeight", opening.ClearHeight);
        json.WriteNumber("rake", opening.RakeDegrees);
        json.WriteNumberOrNull("protectedSideLevel", opening.ProtectedSideLevel);
        json.WriteStartObject("wall");
        json.WriteString("kind", FileWords.Wall.Of(opening.Wall));
        if (opening.WallBehind is { } behind)
        {
            json.WriteString("measure", FileWords.WallMeasure.Of(behind.Measure));
            json.WriteNumberIfAny("lineResistance", behind.LineResistance);
            json.WriteNumberIfAny("totalResistance", behind.TotalResistance);
            json.WriteString("source", behind.Source);
        }

        json.WriteEndObject();
        ActionWriter.Write(json, opening.Actions);
        WriteBarrier(json, opening.Barrier);
        LeakageFile.Write(json, opening.Leakage);
        json.WriteEndObject();
    }

    public static void WriteNumberOrNull(this Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number)
        {
            json.WriteNumber(name, number);
        }
        else
        {
            json.WriteNull(name);
        }
    }

    /// <summary>Writes an optional field only where it holds something.</summary>
    public static void WriteNumberIfAny(this Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number)
        {
            json.WriteNumber(name, number);
        }
    }

    private static void WriteBarrier(Utf8JsonWriter json, Barrier barrier)
    {
        json.WriteStartObject("barrier");
        WriteLogs(json, barrier.Logs);
        json.WriteStartArray("bays");
        foreach (var bay in barrier.Bays)
        {
            json.WriteNumberValue(bay);
        }

        json.WriteEndArray();
        WritePosts(json, barrier.Posts);
        PostBaseFile.Write(json, barrier.BasePlate);
        AnchorFile.Write(json, barrier.Anchors);
        GuideFile.Write(json, barrier.Guides);
        FootingFile.Write(json, barrier.Footing);
        json.WriteStartArray("byOthers");
        foreach (var declared in barrier.ByOthers)
        {
            json.WriteStartObject();
            json.WriteString("check", declared.Check);
            json.WriteString("name", declared.Name);
            json.WriteString("reference", declared.Reference);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteLogs(Utf8JsonWriter json, LogStack logs)
    {
        json.WriteStartObject("logs");
        SectionWriter.Write(json, logs.Material);
        SectionWriter.Write(json, logs.Profile);
        json.WriteNumber("count", logs.Count);
        json.WriteNumber("endBearing", logs.EndBearing);
        json.WriteNumber("deflectionLimit", logs.DeflectionLimit);
        json.WriteNumber("fittingClearance", logs.FittingClearance);
        json.WriteBoolean("sealed", logs.Sealed);
        json.WriteNumber("sealPreload", logs.SealPreload);
        WriteBelow(json, logs.Below);
        LogServiceFile.Write(json, logs);
        json.WriteEndObject();
    }

    private static void WriteBelow(Utf8JsonWriter json, ValueList<LogGroup> below)
    {
        if (below.Count == 0)
        {
            return;
        }

        json.WriteStartArray("below");
        foreach (var group in below)
        {
            json.WriteStartObject();
            SectionWriter.Write(json, group.Material);
            SectionWriter.Write(json, group.Profile);
            json.WriteNumber("count", group.Count);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void WritePosts(Utf8JsonWriter json, PostSet? posts)
    {
        if (posts is null)
        {
            json.WriteNull("posts");
            return;
        }

        json.WriteStartObject("posts");
        SectionWriter.Write(json, posts.Material);
        SectionWriter.Write(json, posts.Profile);
        json.WriteNumber("width", posts.Width);
        json.WriteNumber("deflectionLimit", posts.DeflectionLimit);
        if (posts.WeldedBase)
        {
            json.WriteBoolean("weldedBase", true);
        }

        PostBaseFile.Write(json, posts.Raker);
        json.WriteEndObject();
    }
}
