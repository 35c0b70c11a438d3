namespace FloodPanel.Storage.ProjectFile;

/// <summary>Reads materials and profiles: a library id, or figures of their own.</summary>
internal static class SectionReader
{
    private const string MaterialAllowed = "a library id or a material with its own figures";
    private const string ProfileAllowed = "a library id or a profile with its own dimensions";

    private static readonly Words<Func<FileObject, Profile>> Shapes = new(
        ("rectangle", ReadRectangle),
        ("hollow-rectangle", ReadHollowRectangle),
        ("rectangular-tube", ReadRectangularTube),
        ("i-section", ReadISection),
        ("properties", ReadProperties));

    public static MaterialChoice ReadMaterial(FileObject member)
    {
        var value = member.Need("material", MaterialAllowed);
        if (value is { IsText: true } id)
        {
            return new LibraryMaterial(id.AsText());
        }

        return value?.AsObject(MaterialAllowed) is { } inline ? ReadInline(inline) : new Material();
    }

    public static ProfileChoice ReadProfile(FileObject member)
    {
        var value = member.Need("profile", ProfileAllowed);
        if (value is { IsText: true } id)
        {
            return new LibraryProfile(id.AsText());
        }

        if (value?.AsObject(ProfileAllowed) is not { } inline || inline.Word("shape", Shapes) is not { } readShape)
        {
            return new Rectangle();
        }

        var profile = readShape(inline);
        inline.Close();
        return profile;
    }

    private static Material ReadInline(FileObject material)
    {
        var read = new Material
        {
            Family = material.Word("family", FileWords.Family),
            Name = material.Text("name", ""),
            Density = material.Number("density"),
            ElasticModulus = material.Number("elasticModulus"),
            BendingStrength = material.NumberOrNull("bendingStrength"),
            ShearStrength = material.NumberOrNull("shearStrength"),
            AllowableBending = material.NumberOrNull("allowableBending"),
            AllowableShear = material.NumberOrNull("allowableShear"),
            UltimateStrength = material.NumberOrNull("ultimateStrength"),
            WeldedYield = material.NumberOrNull("weldedYield"),
            WeldedUltimate = material.NumberOrNull("weldedUltimate"),
            ShearModulus = material.NumberOrNull("shearModulus"),
            CrossStrength = material.NumberOrNull("crossStrength"),
            CrossCompression = material.NumberOrNull("crossCompression"),
            CharacteristicDensity = material.NumberOrNull("characteristicDensity"),
            BucklingClass = material.WordOrNull("bucklingClass", FileWords.Buckling),
            Reference = material.Word("strengthReference", FileWords.Reference, StrengthReference.Characteristic),
        };
        material.Close();
        return read;
    }

    private static Rectangle ReadRectangle(FileObject profile) => new()
    {
        Height = profile.Number("height"),
        Depth = profile.Number("depth"),
    };

    private static HollowRectangle ReadHollowRectangle(FileObject profile) => new()
    {
        Height = profile.Number("height"),
        Depth = profile.Number("depth"),
        Face = profile.Number("face"),
        Web = profile.Number("web"),
        Webs = profile.WholeNumber("webs", Fields.Webs),
    };

    private static RectangularTube ReadRectangularTube(FileObject profile) => new()
    {
        Height = profile.Number("height"),
        Depth = profile.Number("depth"),
        Wall = profile.Number("wall"),
        CornerRadius = profile.NumberOrNull("cornerRadius"),
        InnerRadius = profile.NumberOrNull("innerRadius"),
    };

    private static ISection ReadISection(FileObject profile) => new()
    {
        Height = profile.Number("height"),
        Depth = profile.Number("depth"),
        Flange = profile.Number("flange"),
        Web = profile.Number("web"),
    };

    private static GivenProperties ReadProperties(FileObject profile) => new()
    {
        Height = profile.Number("height"),
        Depth = profile.Number("depth"),
        Area = profile.Number("area"),
        Inertia = profile.Number("inertia"),
        Modulus = profile.Number("modulus"),
        PlasticModulus = profile.Number("plasticModulus"),
        ShearArea = profile.Number("shearArea"),
    };
}
