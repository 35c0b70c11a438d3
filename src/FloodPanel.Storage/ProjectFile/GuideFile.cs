using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>The guides of a barrier with their fasteners; optional, left out where nobody has entered them.</summary>
internal static class GuideFile
{
    public static GuideSet Read(FileObject guides)
    {
        var blank = new GuideSet();
        var read = new GuideSet
        {
            Mounting = guides.Word("mounting", FileWords.Mounting, blank.Mounting),
            Material = SectionReader.ReadMaterial(guides),
            LipThickness = guides.Number("lipThickness"),
            LipLever = guides.Number("lipLever"),
            BaseThickness = guides.Number("baseThickness"),
            LoadOffset = guides.Number("loadOffset"),
            BearingDistance = guides.Number("bearingDistance"),
            BearingWidth = guides.Number("bearingWidth"),
            WallBearing = guides.NumberOrNull("wallBearing"),
            WallBearingSource = guides.Text("wallBearingSource", ""),
            Fasteners = guides.NeededObject("fasteners") is { } fasteners ? ReadFasteners(fasteners) : blank.Fasteners,
        };
        guides.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, GuideSet? guides)
    {
        if (guides is null)
        {
            return;
        }

        json.WriteStartObject("guides");
        json.WriteString("mounting", FileWords.Mounting.Of(guides.Mounting));
        SectionWriter.Write(json, guides.Material);
        json.WriteNumber("lipThickness", guides.LipThickness);
        json.WriteNumber("lipLever", guides.LipLever);
        json.WriteNumber("baseThickness", guides.BaseThickness);
        json.WriteNumber("loadOffset", guides.LoadOffset);
        json.WriteNumber("bearingDistance", guides.BearingDistance);
        json.WriteNumber("bearingWidth", guides.BearingWidth);
        json.WriteNumberIfAny("wallBearing", guides.WallBearing);
        json.WriteString("wallBearingSource", guides.WallBearingSource);
        WriteFasteners(json, guides.Fasteners);
        json.WriteEndObject();
    }

    private static GuideFasteners ReadFasteners(FileObject fasteners)
    {
        var blank = new GuideFasteners();
        var read = new GuideFasteners
        {
            Pitch = fasteners.Number("pitch"),
            EndDistance = fasteners.Number("endDistance"),
            EdgeDistance = fasteners.Number("edgeDistance"),
            HoleDiameter = fasteners.Number("holeDiameter"),
            ValuesFor = fasteners.Word("valuesFor", FileWords.DesignBasis, blank.ValuesFor),
            Tension = fasteners.NumberOrNull("tension"),
            Shear = fasteners.NumberOrNull("shear"),
            MinimumEdge = fasteners.NumberOrNull("minimumEdge"),
            MinimumSpacing = fasteners.NumberOrNull("minimumSpacing"),
            InteractionLimit = fasteners.Number("interactionLimit", blank.InteractionLimit),
            Source = fasteners.Text("source", ""),
        };
        fasteners.Close();
        return read;
    }

    private static void WriteFasteners(Utf8JsonWriter json, GuideFasteners fasteners)
    {
        json.WriteStartObject("fasteners");
        json.WriteNumber("pitch", fasteners.Pitch);
        json.WriteNumber("endDistance", fasteners.EndDistance);
        json.WriteNumber("edgeDistance", fasteners.EdgeDistance);
        json.WriteNumber("holeDiameter", fasteners.HoleDiameter);
        json.WriteString("valuesFor", FileWords.DesignBasis.Of(fasteners.ValuesFor));
        json.WriteNumberIfAny("tension", fasteners.Tension);
        json.WriteNumberIfAny("shear", fasteners.Shear);
        json.WriteNumberIfAny("minimumEdge", fasteners.MinimumEdge);
        json.WriteNumberIfAny("minimumSpacing", fasteners.MinimumSpacing);
        json.WriteNumber("interactionLimit", fasteners.InteractionLimit);
        json.WriteString("source", fasteners.Source);
        json.WriteEndObject();
    }
}
