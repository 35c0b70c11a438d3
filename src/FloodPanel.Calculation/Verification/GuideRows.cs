using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Guides;

namespace FloodPanel.Calculation.Verification;

/// <summary>A guide with its fasteners under fresh water.</summary>
internal static class GuideRows
{
    private const string Guide = "Guide of logs of 3.0 m span under 1.2 m of fresh water";
    private const int Logs = 48;
    private const double Height = 0.025;

    public static IEnumerable<VerificationRow> Rows()
    {
        var row = FastenerRow.Of(Logs * Height, endDistance: 0.1, pitch: 0.25);
        var load = GuideLoad.Of([.. Enumerable.Range(0, Logs).Select(Water)], tributary: 1.5, [.. Enumerable.Repeat(Height, Logs)]);
        string[] published = ["3.60", "3.13", "2.21", "1.29", "0.37"];
        var atSill = 9810 * Logs * Height * 1.5;
        return
        [
            .. published.Select((force, i) => new VerificationRow(
                Guide, $"fastener {i + 1} of 5 from the sill, 250 mm apart", "kN", force, Printed.Kilo(On(load, row.Stretch(i))), Evidence.Derived)),
            new(Guide, "all fasteners together", "kN", "10.59", Printed.Kilo(load.Over(0, load.Length)), Evidence.Derived),
            new(Guide, "lip of 8 mm, lever 12 mm, at the sill: bending", "MPa", "19.9", GuideStrength.LipBending(atSill, 0.012, 0.008) / 1e6, Evidence.Derived),
            new(Guide, "lip of 8 mm at the sill: shear", "MPa", "3.3", GuideStrength.LipShear(atSill, 0.008) / 1e6, Evidence.Derived),
        ];
    }

    private static double On(GuideLoad load, (double From, double To) stretch) => load.Over(stretch.From, stretch.To);

    private static FactoredLoad Water(int log)
    {
        var force = 9810 * (Logs * Height - (log + 0.5) * Height) * Height;
        return new(force, force);
    }
}
