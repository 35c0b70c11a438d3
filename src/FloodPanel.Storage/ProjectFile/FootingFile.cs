using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>A footing under a barrier; optional, left out where there is none.</summary>
internal static class FootingFile
{
    public static FootingInput Read(FileObject footing)
    {
        var blank = new FootingInput();
        var read = new FootingInput
        {
            Width = footing.Number("width"),
            Thickness = footing.Number("thickness"),
            BarrierFromFloodEdge = footing.Number("barrierFromFloodEdge"),
            Density = footing.Number("density", blank.Density),
            Friction = footing.Number("friction"),
            Adhesion = footing.Number("adhesion", blank.Adhesion),
            AllowableBearing = footing.Number("allowableBearing"),
            CutOff = footing.Number("cutOff", blank.CutOff),
            Soil = footing.Word("soil", FileWords.Soil, blank.Soil),
            SlidingFactor = footing.Number("slidingFactor", blank.SlidingFactor),
            OverturningFactor = footing.Number("overturningFactor", blank.OverturningFactor),
            FlotationFactor = footing.Number("flotationFactor", blank.FlotationFactor),
            ContactShare = footing.Number("contactShare", blank.ContactShare),
            CarriesGuides = footing.Flag("carriesGuides", blank.CarriesGuides),
            Source = footing.Text("source", blank.Source),
        };
        footing.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, FootingInput? footing)
    {
        if (footing is null)
        {
            return;
        }

        json.WriteStartObject("footing");
        json.WriteNumber("width", footing.Width);
        json.WriteNumber("thickness", footing.Thickness);
        json.WriteNumber("barrierFromFloodEdge", footing.BarrierFromFloodEdge);
        json.WriteNumber("density", footing.Density);
        json.WriteNumber("friction", footing.Friction);
        json.WriteNumber("adhesion", footing.Adhesion);
        json.WriteNumber("allowableBearing", footing.AllowableBearing);
        json.WriteNumber("cutOff", footing.CutOff);
        json.WriteString("soil", FileWords.Soil.Of(footing.Soil));
        json.WriteNumber("slidingFactor", footing.SlidingFactor);
        json.WriteNumber("overturningFactor", footing.OverturningFactor);
        json.WriteNumber("flotationFactor", footing.FlotationFactor);
        json.WriteNumber("contactShare", footing.ContactShare);
        json.WriteBoolean("carriesGuides", footing.CarriesGuides);
        json.WriteString("source", footing.Source);
        json.WriteEndObject();
    }
}
