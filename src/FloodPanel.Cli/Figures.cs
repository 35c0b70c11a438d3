using System.Globalization;
using System.Text.Json;

namespace FloodPanel.Cli;

/// <summary>Writes calculated numbers.</summary>
internal static class Figures
{
    /// <summary>
    /// Twelve significant figures: a level of 4.45 m is not to read 4.449999999999999. Null where there is no number,
    /// and for an infinite utilisation, which JSON cannot hold; the verdict is then 'inadequate'.
    /// </summary>
    public static void WriteFigure(this Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            json.WriteNumber(name, double.Parse(number.ToString("G12", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture));
        }
        else
        {
            json.WriteNull(name);
        }
    }
}
