using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Writes materials and profiles.</summary>
internal static class SectionWriter
{
    public static void Write(Utf8JsonWriter json, MaterialChoice choice)
    {
        if (choice is LibraryMaterial named)
        {
            json.WriteString("material", named.Id);
            return;
        }

        var material = (Material)choice;
        json.WriteStartObject("material");
        json.WriteString("family", FileWords.Family.Of(material.Family));
        json.WriteString("name", material.Name);
        json.WriteNumber("density", material.Density);
        json.WriteNumber("elasticModulus", material.ElasticModulus);
        json.WriteNumberOrNull("bendingStrength", material.BendingStrength);
        json.WriteNumberOrNull("shearStrength", material.ShearStrength);
        json.WriteNumberOrNull("allowableBending", material.AllowableBending);
        json.WriteNumberOrNull("allowableShear", material.AllowableShear);
        json.WriteNumberIfAny("ultimateStrength", material.UltimateStrength);
        json.WriteNumberIfAny("weldedYield", material.WeldedYield);
        json.WriteNumberIfAny("weldedUltimate", material.WeldedUltimate);
        json.WriteNumberIfAny("shearModulus", material.ShearModulus);
        json.WriteNumberIfAny("crossStrength", material.CrossStrength);
        json.WriteNumberIfAny("crossCompression", material.CrossCompression);
        json.WriteNumberIfAny("characteristicDensity", material.CharacteristicDensity);
        if (material.BucklingClass is { } buckling)
        {
            json.WriteString("bucklingClass", FileWords.Buckling.Of(buckling));
        }

        if (material.Reference != StrengthReference.Characteristic)
        {
            json.WriteString("strengthReference", FileWords.Reference.Of(material.Reference));
        }

        json.WriteEndObject();
    }

    public static void Write(Utf8JsonWriter json, ProfileChoice choice)
    {
        if (choice is LibraryProfile named)
        {
            json.WriteString("profile", named.Id);
            return;
        }

        var profile = (Profile)choice;
        json.WriteStartObject("profile");
        json.WriteString("shape", ShapeOf(profile));
        json.WriteNumber("height", profile.Height);
        json.WriteNumber("depth", profile.Depth);
        WriteDimensions(json, profile);
        json.WriteEndObject();
    }

    private static string ShapeOf(Profile profile) => profile switch
    {
        Rectangle => "rectangle",
        HollowRectangle => "hollow-rectangle",
        RectangularTube => "rectangular-tube",
        ISection => "i-section",
        GivenProperties => "properties",
        _ => throw new InvalidOperationException($"The project file has no form for {profile.GetType().Name}."),
    };

    private static void WriteDimensions(Utf8JsonWriter json, Profile profile)
    {
        switch (profile)
        {
            case HollowRectangle hollow:
                json.WriteNumber("face", hollow.Face);
                json.WriteNumber("web", hollow.Web);
                json.WriteNumber("webs", hollow.Webs);
                break;
            case RectangularTube tube:
                json.WriteNumber("wall", tube.Wall);
                json.WriteNumberIfAny("cornerRadius", tube.CornerRadius);
                json.WriteNumberIfAny("innerRadius", tube.InnerRadius);
                break;
            case ISection section:
                json.WriteNumber("flange", section.Flange);
                json.WriteNumber("web", section.Web);
                break;
            case GivenProperties given:
                json.WriteNumber("area", given.Area);
                json.WriteNumber("inertia", given.Inertia);
                json.WriteNumber("modulus", given.Modulus);
                json.WriteNumber("plasticModulus", given.PlasticModulus);
                json.WriteNumber("shearArea", given.ShearArea);
                break;
        }
    }
}
