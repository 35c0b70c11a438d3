using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Leakage, rain and pump of an opening; optional, left out where nobody asks.</summary>
internal static class LeakageFile
{
    public static LeakageInput Read(FileObject leakage)
    {
        var blank = new LeakageInput();
        var read = new LeakageInput
        {
            Convention = leakage.Word("convention", FileWords.Leak, blank.Convention),
            Rate = leakage.Number("rate", blank.Rate),
            RainIntensity = leakage.Number("rainIntensity", blank.RainIntensity),
            RainArea = leakage.Number("rainArea", blank.RainArea),
            RunoffCoefficient = leakage.Number("runoffCoefficient", blank.RunoffCoefficient),
            SumpVolume = leakage.Number("sumpVolume", blank.SumpVolume),
            PumpMargin = leakage.Number("pumpMargin", blank.PumpMargin),
            BackFlowClosed = leakage.Flag("backFlowClosed", blank.BackFlowClosed),
        };
        leakage.Close();
        return read;
    }

    public static void Write(Utf8JsonWriter json, LeakageInput? leakage)
    {
        if (leakage is null)
        {
            return;
        }

        json.WriteStartObject("leakage");
        json.WriteString("convention", FileWords.Leak.Of(leakage.Convention));
        json.WriteNumber("rate", leakage.Rate);
        json.WriteNumber("rainIntensity", leakage.RainIntensity);
        json.WriteNumber("rainArea", leakage.RainArea);
        json.WriteNumber("runoffCoefficient", leakage.RunoffCoefficient);
        json.WriteNumber("sumpVolume", leakage.SumpVolume);
        json.WriteNumber("pumpMargin", leakage.PumpMargin);
        json.WriteBoolean("backFlowClosed", leakage.BackFlowClosed);
        json.WriteEndObject();
    }
}
