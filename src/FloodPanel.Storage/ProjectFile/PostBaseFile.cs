using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>The raker of the posts and the plate under them; optional, left out where nobody has entered them.</summary>
internal static class PostBaseFile
{
    public static RakerInput ReadRaker(FileObject raker)
    {
        var blank = new RakerInput();
        var read = new RakerInput
        {
            Material = SectionReader.ReadMaterial(raker),
            Profile = SectionReader.ReadProfile(raker),
            HeadHeight = raker.Number("headHeight"),
            FootDistance = raker.Number("footDistance"),
            LengthFactor = raker.Number("lengthFactor", blank.LengthFactor),
            Play = raker.Number("play", blank.Play),
            FootResistance = raker.NumberOrNull("footResistance"),
        };
        raker.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, RakerInput? raker)
    {
        if (raker is null)
        {
            return;
        }

        json.WriteStartObject("raker");
        SectionWriter.Write(json, raker.Material);
        SectionWriter.Write(json, raker.Profile);
        json.WriteNumber("headHeight", raker.HeadHeight);
        json.WriteNumber("footDistance", raker.FootDistance);
        json.WriteNumber("lengthFactor", raker.LengthFactor);
        json.WriteNumber("play", raker.Play);
        json.WriteNumberIfAny("footResistance", raker.FootResistance);
        json.WriteEndObject();
    }

    public static BasePlateInput ReadPlate(FileObject plate)
    {
        var blank = new BasePlateInput();
        var read = new BasePlateInput
        {
            Material = SectionReader.ReadMaterial(plate),
            Length = plate.Number("length"),
            Width = plate.Number("width"),
            Thickness = plate.Number("thickness"),
            RodDistance = plate.Number("rodDistance"),
            RodsPerRow = plate.WholeNumber("rodsPerRow", BasePlateFields.RodsPerRow, blank.RodsPerRow),
            ConcreteStrength = plate.Number("concreteStrength"),
            AreaRatio = plate.Number("areaRatio", blank.AreaRatio),
            GroutThickness = plate.Number("groutThickness", blank.GroutThickness),
            WeldLeg = plate.NumberOrNull("weldLeg"),
            WeldStrength = plate.NumberOrNull("weldStrength"),
        };
        plate.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, BasePlateInput? plate)
    {
        if (plate is null)
        {
            return;
        }

        json.WriteStartObject("basePlate");
        SectionWriter.Write(json, plate.Material);
        json.WriteNumber("length", plate.Length);
        json.WriteNumber("width", plate.Width);
        json.WriteNumber("thickness", plate.Thickness);
        json.WriteNumber("rodDistance", plate.RodDistance);
        json.WriteNumber("rodsPerRow", plate.RodsPerRow);
        json.WriteNumber("concreteStrength", plate.ConcreteStrength);
        json.WriteNumber("areaRatio", plate.AreaRatio);
        json.WriteNumber("groutThickness", plate.GroutThickness);
        json.WriteNumberIfAny("weldLeg", plate.WeldLeg);
        json.WriteNumberIfAny("weldStrength", plate.WeldStrength);
        json.WriteEndObject();
    }
}
