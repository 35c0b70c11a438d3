using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.LibraryData;

/// <summary>Reads materials, profiles and design bases from the data folder. Every row is checked; one bad row refuses the library.</summary>
public static class LibraryFiles
{
    private static readonly string[] MaterialColumns =
    [
        "id", "title", "family", "density_kg_m3", "elastic_modulus_GPa", "bending_strength_MPa", "shear_strength_MPa",
        "ultimate_strength_MPa", "welded_yield_MPa", "welded_ultimate_MPa", "shear_modulus_GPa", "cross_strength_MPa",
        "cross_compression_MPa", "characteristic_density_kg_m3", "buckling_class", "strength_reference",
        "source", "shear_source", "evidence",
    ];

    private static readonly string[] ShapeColumns =
    [
        "face_mm", "web_mm", "webs", "wall_mm", "flange_mm", "corner_radius_mm", "inner_radius_mm", "area_cm2", "inertia_cm4", "modulus_cm3", "plastic_modulus_cm3",
        "shear_area_cm2",
    ];

    private static readonly string[] ProfileColumns =
        ["id", "title", "shape", "height_mm", "depth_mm", .. ShapeColumns, "source", "evidence"];

    private static readonly Words<Func<LibraryRow, Profile>> Shapes = new(
        ("rectangle", ReadRectangle),
        ("hollow-rectangle", ReadHollowRectangle),
        ("rectangular-tube", ReadRectangularTube),
        ("i-section", ReadISection),
        ("properties", ReadProperties));

    /// <summary>The data folder that is delivered beside the program.</summary>
    public static string DeliveredFolder => Path.Combine(AppContext.BaseDirectory, "data");

    /// <summary>Reads materials.csv, profiles.csv and design-bases.json.</summary>
    /// <exception cref="LibraryFileException">A file is missing, or a row is wrong.</exception>
    public static Library Load(string folder)
    {
        var problems = new List<string>();
        var materials = new LibraryTable(folder, "materials.csv", MaterialColumns, problems).Read(ReadMaterial)
            .Select(m => m with { Item = m.Item with { Name = m.Title } });
        var profiles = new LibraryTable(folder, "profiles.csv", ProfileColumns, problems)
            .Read(row => row.Word("shape", Shapes)?.Invoke(row));
        var bases = BasisFile.Read(folder, problems);
        return problems.Count == 0 ? new Library(materials, profiles, bases) : throw new LibraryFileException(problems);
    }

    private static Material ReadMaterial(LibraryRow row) => new()
    {
        Family = row.Word("family", FileWords.Family),
        Density = row.Number("density_kg_m3", Fields.MaterialDensity),
        ElasticModulus = row.Number("elastic_modulus_GPa", Fields.ElasticModulus),
        BendingStrength = row.Number("bending_strength_MPa", Fields.BendingStrength),
        ShearStrength = row.Number("shear_strength_MPa", Fields.ShearStrength),
        UltimateStrength = row.NumberOrNull("ultimate_strength_MPa", MaterialFields.UltimateStrength),
        WeldedYield = row.NumberOrNull("welded_yield_MPa", MaterialFields.WeldedYield),
        WeldedUltimate = row.NumberOrNull("welded_ultimate_MPa", MaterialFields.WeldedUltimate),
        ShearModulus = row.NumberOrNull("shear_modulus_GPa", MaterialFields.ShearModulus),
        CrossStrength = row.NumberOrNull("cross_strength_MPa", MaterialFields.CrossStrength),
        CrossCompression = row.NumberOrNull("cross_compression_MPa", MaterialFields.CrossCompression),
        CharacteristicDensity = row.NumberOrNull("characteristic_density_kg_m3", MaterialFields.CharacteristicDensity),
        BucklingClass = row.WordOrNull("buckling_class", FileWords.Buckling),
        Reference = row.Word("strength_reference", FileWords.Reference),
    };

    private static Rectangle ReadRectangle(LibraryRow row)
    {
        row.Empty(ShapeColumns);
        return new Rectangle { Height = Height(row), Depth = Depth(row) };
    }

    private static HollowRectangle ReadHollowRectangle(LibraryRow row)
    {
        row.Empty(ShapeColumns.Except(["face_mm", "web_mm", "webs"]));
        return new HollowRectangle
        {
            Height = Height(row),
            Depth = Depth(row),
            Face = row.Number("face_mm", Fields.Face),
            Web = row.Number("web_mm", Fields.Web),
            Webs = row.WholeNumber("webs", Fields.Webs),
        };
    }

    private static RectangularTube ReadRectangularTube(LibraryRow row)
    {
        row.Empty(ShapeColumns.Except(["wall_mm", "corner_radius_mm", "inner_radius_mm"]));
        return new RectangularTube
        {
            Height = Height(row),
            Depth = Depth(row),
            Wall = row.Number("wall_mm", Fields.Wall),
            CornerRadius = row.NumberOrNull("corner_radius_mm", Fields.CornerRadius),
            InnerRadius = row.NumberOrNull("inner_radius_mm", Fields.InnerRadius),
        };
    }

    private static ISection ReadISection(LibraryRow row)
    {
        row.Empty(ShapeColumns.Except(["flange_mm", "web_mm"]));
        return new ISection
        {
            Height = Height(row),
            Depth = Depth(row),
            Flange = row.Number("flange_mm", Fields.Flange),
            Web = row.Number("web_mm", Fields.Web),
        };
    }

    private static GivenProperties ReadProperties(LibraryRow row)
    {
        row.Empty(ShapeColumns[..7]);
        return new GivenProperties
        {
            Height = Height(row),
            Depth = Depth(row),
            Area = row.Number("area_cm2", Fields.Area),
            Inertia = row.Number("inertia_cm4", Fields.Inertia),
            Modulus = row.Number("modulus_cm3", Fields.Modulus),
            PlasticModulus = row.Number("plastic_modulus_cm3", Fields.PlasticModulus),
            ShearArea = row.Number("shear_area_cm2", Fields.ShearArea),
        };
    }

    private static double Height(LibraryRow row) => row.Number("height_mm", Fields.ProfileHeight);

    private static double Depth(LibraryRow row) => row.Number("depth_mm", Fields.ProfileDepth);
}
