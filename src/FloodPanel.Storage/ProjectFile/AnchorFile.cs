using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>The anchors of the base plates; optional, left out where nobody has entered them.</summary>
internal static class AnchorFile
{
    public static AnchorInput Read(FileObject anchors)
    {
        var blank = new AnchorInput();
        var read = new AnchorInput
        {
            Method = anchors.Word("method", FileWords.AnchorMethod),
            Kind = anchors.Word("kind", FileWords.AnchorKind, blank.Kind),
            Diameter = anchors.Number("diameter", blank.Diameter),
            StressArea = anchors.Number("stressArea", blank.StressArea),
            Yield = anchors.Number("yield", blank.Yield),
            Ultimate = anchors.Number("ultimate", blank.Ultimate),
            Ductile = anchors.Flag("ductile", blank.Ductile),
            Depth = anchors.Number("depth", blank.Depth),
            HeadArea = anchors.NumberOrNull("headArea"),
            HookLength = anchors.NumberOrNull("hookLength"),
            Pullout = anchors.NumberOrNull("pullout"),
            CriticalEdge = anchors.NumberOrNull("criticalEdge"),
            Category = anchors.WholeNumber("category", AnchorFields.Category, blank.Category),
            InstallationFactor = anchors.Number("installationFactor", blank.InstallationFactor),
            Spacing = anchors.Number("spacing", blank.Spacing),
            EdgeFlood = anchors.NumberOrNull("edgeFlood"),
            EdgeProtected = anchors.NumberOrNull("edgeProtected"),
            EdgeLeft = anchors.NumberOrNull("edgeLeft"),
            EdgeRight = anchors.NumberOrNull("edgeRight"),
            MemberThickness = anchors.Number("memberThickness", blank.MemberThickness),
            Cracked = anchors.Flag("cracked", blank.Cracked),
            SupplementaryReinforcement = anchors.Flag("supplementaryReinforcement", blank.SupplementaryReinforcement),
            SharedShear = anchors.Flag("sharedShear", blank.SharedShear),
            WasherThickness = anchors.NumberOrNull("washerThickness"),
            TensionResistance = anchors.NumberOrNull("tensionResistance"),
            ShearResistance = anchors.NumberOrNull("shearResistance"),
            InteractionLimit = anchors.Number("interactionLimit", blank.InteractionLimit),
            MinimumEdge = anchors.NumberOrNull("minimumEdge"),
            MinimumSpacing = anchors.NumberOrNull("minimumSpacing"),
            Source = anchors.Text("source", blank.Source),
        };
        anchors.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, AnchorInput? anchors)
    {
        if (anchors is null)
        {
            return;
        }

        json.WriteStartObject("anchors");
        json.WriteString("method", FileWords.AnchorMethod.Of(anchors.Method));
        json.WriteString("kind", FileWords.AnchorKind.Of(anchors.Kind));
        json.WriteNumber("diameter", anchors.Diameter);
        json.WriteNumber("stressArea", anchors.StressArea);
        json.WriteNumber("yield", anchors.Yield);
        json.WriteNumber("ultimate", anchors.Ultimate);
        json.WriteBoolean("ductile", anchors.Ductile);
        json.WriteNumber("depth", anchors.Depth);
        json.WriteNumberIfAny("headArea", anchors.HeadArea);
        json.WriteNumberIfAny("hookLength", anchors.HookLength);
        json.WriteNumberIfAny("pullout", anchors.Pullout);
        json.WriteNumberIfAny("criticalEdge", anchors.CriticalEdge);
        json.WriteNumber("category", anchors.Category);
        json.WriteNumber("installationFactor", anchors.InstallationFactor);
        json.WriteNumber("spacing", anchors.Spacing);
        json.WriteNumberIfAny("edgeFlood", anchors.EdgeFlood);
        json.WriteNumberIfAny("edgeProtected", anchors.EdgeProtected);
        json.WriteNumberIfAny("edgeLeft", anchors.EdgeLeft);
        json.WriteNumberIfAny("edgeRight", anchors.EdgeRight);
        json.WriteNumber("memberThickness", anchors.MemberThickness);
        json.WriteBoolean("cracked", anchors.Cracked);
        json.WriteBoolean("supplementaryReinforcement", anchors.SupplementaryReinforcement);
        json.WriteBoolean("sharedShear", anchors.SharedShear);
        json.WriteNumberIfAny("washerThickness", anchors.WasherThickness);
        json.WriteNumberIfAny("tensionResistance", anchors.TensionResistance);
        json.WriteNumberIfAny("shearResistance", anchors.ShearResistance);
        json.WriteNumber("interactionLimit", anchors.InteractionLimit);
        json.WriteNumberIfAny("minimumEdge", anchors.MinimumEdge);
        json.WriteNumberIfAny("minimumSpacing", anchors.MinimumSpacing);
        json.WriteString("source", anchors.Source);
        json.WriteEndObject();
    }
}
