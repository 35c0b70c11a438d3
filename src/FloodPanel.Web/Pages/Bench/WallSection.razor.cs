using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>How the wall that receives the guides is judged.</summary>
public sealed partial class WallSection
{
    private static readonly WallMeasure[] Measures = Enum.GetValues<WallMeasure>();

    private WallInput remembered = new();

    protected override object? Shown => Opening.WallBehind;

    private static string Name(WallMeasure measure) =>
        measure == WallMeasure.Resistance ? "Its resistance" : "Published depth";

    // Switched off and on again, it is what it was.
    private Task Switch(bool on)
    {
        remembered = Opening.WallBehind ?? remembered;
        var wall = on ? remembered : null;
        return Edit("wall behind", o => o with { WallBehind = wall });
    }

    private Task Change(string what, Func<WallInput, WallInput> apply) =>
        Edit(what, o => o.WallBehind is { } wall ? o with { WallBehind = apply(wall) } : o);
}
