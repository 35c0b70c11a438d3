using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Joints of the logs, what timber endures, factors on composites; each optional, left out where there is none.</summary>
internal static class LogServiceFile
{
    public static LogJoint? ReadJoint(FileObject logs)
    {
        if (logs.Object("joint") is not { } joint)
        {
            return null;
        }

        var read = new LogJoint { Travel = joint.Number("travel"), SealCompression = joint.NumberOrNull("sealCompression") };
        joint.Close();
        return read;
    }

    public static TimberService? ReadTimber(FileObject logs)
    {
        if (logs.Object("timber") is not { } timber)
        {
            return null;
        }

        var blank = new TimberService();
        var read = new TimberService
        {
            Duration = timber.Word("duration", FileWords.Duration, blank.Duration),
            SizeFactor = timber.Number("sizeFactor", blank.SizeFactor),
        };
        timber.Close();
        return read;
    }

    public static CompositeService? ReadComposite(FileObject logs)
    {
        if (logs.Object("composite") is not { } composite)
        {
            return null;
        }

        var read = new CompositeService
        {
            MaterialFactor = composite.Number("materialFactor"),
            ConversionFactor = composite.Number("conversionFactor"),
        };
        composite.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, LogStack logs)
    {
        if (logs.Joint is { } joint)
        {
            json.WriteStartObject("joint");
            json.WriteNumber("travel", joint.Travel);
            if (joint.SealCompression is { } compression)
            {
                json.WriteNumber("sealCompression", compression);
            }

            json.WriteEndObject();
        }

        if (logs.Timber is { } timber)
        {
            json.WriteStartObject("timber");
            json.WriteString("duration", FileWords.Duration.Of(timber.Duration));
            json.WriteNumber("sizeFactor", timber.SizeFactor);
            json.WriteEndObject();
        }

        if (logs.Composite is { } composite)
        {
            json.WriteStartObject("composite");
            json.WriteNumber("materialFactor", composite.MaterialFactor);
            json.WriteNumber("conversionFactor", composite.ConversionFactor);
            json.WriteEndObject();
        }
    }
}
