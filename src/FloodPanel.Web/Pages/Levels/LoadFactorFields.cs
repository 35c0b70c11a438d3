using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>One load factor of a rule set, for forms.</summary>
/// <param name="Leaf">Its name in the project file.</param>
/// <param name="Label">Its name on screens.</param>
/// <param name="Get">Reads it.</param>
/// <param name="With">A copy with another value.</param>
internal sealed record LoadFactorField(
    string Leaf, string Label, Func<LoadFactors, double> Get, Func<LoadFactors, double, LoadFactors> With);

/// <summary>The load factors in the order in which they are shown.</summary>
internal static class LoadFactorFields
{
    public static IReadOnlyList<LoadFactorField> All { get; } =
    [
        new("floodSide", "Flood-side water, flow, waves", f => f.FloodSide, (f, v) => f with { FloodSide = v }),
        new("protectedSide", "Protected-side water", f => f.ProtectedSide, (f, v) => f with { ProtectedSide = v }),
        new("brimFull", "Brim-full", f => f.BrimFull, (f, v) => f with { BrimFull = v }),
        new("debris", "Debris case", f => f.Debris, (f, v) => f with { Debris = v }),
        new("wind", "Wind", f => f.Wind, (f, v) => f with { Wind = v }),
        new("line", "Line load", f => f.Line, (f, v) => f with { Line = v }),
    ];
}
