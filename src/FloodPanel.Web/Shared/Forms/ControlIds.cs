using System.Globalization;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>Ids that tie labels and sentences to their controls.</summary>
internal static class ControlIds
{
    private static long last;

    public static string Next() => "f" + Interlocked.Increment(ref last).ToString(CultureInfo.InvariantCulture);
}
