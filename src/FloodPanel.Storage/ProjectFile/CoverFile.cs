using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>The covers of a project; optional, left out where there are none.</summary>
internal static class CoverFile
{
    private static readonly Words<Func<FileObject, CoverPlate>> Shapes = new(("rectangle", ReadRectangle), ("circle", ReadCircle));

    private static readonly Words<RectangleSupport> RectangleSupports = new(
        ("four-edges", RectangleSupport.FourEdges),
        ("three-edges", RectangleSupport.ThreeEdges));

    private static readonly Words<CircleSupport> CircleSupports = new(
        ("supported", CircleSupport.Supported),
        ("clamped", CircleSupport.Clamped));

    private static readonly Words<CoverPosition> Positions = new(("upright", CoverPosition.Upright), ("flat", CoverPosition.Flat));

    private static readonly Words<CoverPressing> Pressings = new(("seating", CoverPressing.Seating), ("unseating", CoverPressing.Unseating));

    public static Cover Read(FileValue value)
    {
        var blank = new Cover();
        if (value.AsObject() is not { } cover)
        {
            return blank;
        }

        var read = new Cover
        {
            Name = cover.Text("name"),
            Plate = cover.NeededObject("plate") is { } plate ? ReadPlate(plate) : blank.Plate,
            Position = cover.Word("position", Positions, blank.Position),
            Level = cover.Number("level"),
            Material = SectionReader.ReadMaterial(cover),
            Thickness = cover.Number("thickness"),
            PoissonRatio = cover.Number("poissonRatio", blank.PoissonRatio),
            DeflectionLimit = cover.Number("deflectionLimit", blank.DeflectionLimit),
            Pressing = cover.Word("pressing", Pressings, blank.Pressing),
            Fasteners = cover.NeededObject("fasteners") is { } fasteners ? ReadFasteners(fasteners) : blank.Fasteners,
        };
        cover.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, ValueList<Cover> covers)
    {
        if (covers.Count == 0)
        {
            return;
        }

        json.WriteStartArray("covers");
        foreach (var cover in covers)
        {
            Write(json, cover);
        }

        json.WriteEndArray();
    }

    private static CoverPlate ReadPlate(FileObject plate)
    {
        if (plate.Word("shape", Shapes) is not { } readShape)
        {
            return new RectangleCover();
        }

        var read = readShape(plate);
        plate.Close();
        return read;
    }

    private static RectangleCover ReadRectangle(FileObject plate) => new()
    {
        Width = plate.Number("width"),
        Height = plate.Number("height"),
        Support = plate.Word("support", RectangleSupports, RectangleSupport.FourEdges),
    };

    private static CircleCover ReadCircle(FileObject plate) => new()
    {
        Diameter = plate.Number("diameter"),
        Support = plate.Word("support", CircleSupports, CircleSupport.Supported),
    };

    private static CoverFasteners ReadFasteners(FileObject fasteners)
    {
        var blank = new CoverFasteners();
        var read = new CoverFasteners
        {
            Pitch = fasteners.Number("pitch"),
            GasketLoad = fasteners.Number("gasketLoad", blank.GasketLoad),
            FixingLever = fasteners.NumberOrNull("fixingLever"),
            Tension = fasteners.NumberOrNull("tension"),
            Source = fasteners.Text("source", blank.Source),
        };
        fasteners.Close();
        return read;
    }

    private static void Write(Utf8JsonWriter json, Cover cover)
    {
        json.WriteStartObject();
        json.WriteString("name", cover.Name);
        WritePlate(json, cover.Plate);
        json.WriteString("position", Positions.Of(cover.Position));
        json.WriteNumber("level", cover.Level);
        SectionWriter.Write(json, cover.Material);
        json.WriteNumber("thickness", cover.Thickness);
        json.WriteNumber("poissonRatio", cover.PoissonRatio);
        json.WriteNumber("deflectionLimit", cover.DeflectionLimit);
        json.WriteString("pressing", Pressings.Of(cover.Pressing));
        json.WriteStartObject("fasteners");
        json.WriteNumber("pitch", cover.Fasteners.Pitch);
        json.WriteNumber("gasketLoad", cover.Fasteners.GasketLoad);
        json.WriteNumberIfAny("fixingLever", cover.Fasteners.FixingLever);
        json.WriteNumberIfAny("tension", cover.Fasteners.Tension);
        json.WriteString("source", cover.Fasteners.Source);
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void WritePlate(Utf8JsonWriter json, CoverPlate plate)
    {
        json.WriteStartObject("plate");
        switch (plate)
        {
            case RectangleCover rectangle:
                json.WriteString("shape", "rectangle");
                json.WriteNumber("width", rectangle.Width);
                json.WriteNumber("height", rectangle.Height);
                json.WriteString("support", RectangleSupports.Of(rectangle.Support));
                break;
            case CircleCover circle:
                json.WriteString("shape", "circle");
                json.WriteNumber("diameter", circle.Diameter);
                json.WriteString("support", CircleSupports.Of(circle.Support));
                break;
            default:
                throw new ArgumentOutOfRangeException(nameof(plate), plate, "is not a plate");
        }

        json.WriteEndObject();
    }
}
