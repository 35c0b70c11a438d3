using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A point of a plan section [m]: x to the right, y towards the protected side.</summary>
internal readonly record struct PlanSpot(double X, double Y);

/// <summary>
/// Plan section of the left guide in metres, the fasteners at the origin. What is typed is to scale; how far the wall and the log
/// reach, the seal and the leg that keeps the logs in are drawn as usual.
/// </summary>
internal sealed record GuidePlan
{
    /// <summary>Wall and log are shown this far [m].</summary>
    private const double Reach = 0.07;

    /// <summary>Seal and play as drawn [m].</summary>
    private const double Seal = 0.004;

    private const double Play = 0.005;

    /// <summary>Outline of the wall; the first three corners are its two true edges, with the arris between.</summary>
    public required PlanSpot[] Wall { get; init; }

    /// <summary>Outline of the guide.</summary>
    public required PlanSpot[] Guide { get; init; }

    /// <summary>End of the log: left, lower, upper edge; it runs on to the right.</summary>
    public required (double Left, double Lower, double Upper) Log { get; init; }

    /// <summary>The log is shown up to here.</summary>
    public required double LogRight { get; init; }

    /// <summary>Face of the lip that the seal touches.</summary>
    public required double LipFace { get; init; }

    /// <summary>Lip from its free end back, and its thickness in y.</summary>
    public required (double Right, double Lower, double Upper) Lip { get; init; }

    /// <summary>Ends of the strip that bears on the wall.</summary>
    public required (PlanSpot From, PlanSpot To) Strip { get; init; }

    /// <summary>Direction of the fasteners into the wall.</summary>
    public required PlanSpot Into { get; init; }

    /// <summary>From the surface of the wall to its far edge on the drawing [m].</summary>
    public static double WallShown => Reach;

    public static double SealShown => Seal;

    public static GuidePlan Of(GuideSet guides, double logDepth, double endBearing) => guides.Mounting switch
    {
        GuideMounting.WetFace => WetFace(guides, logDepth, endBearing),
        GuideMounting.DryFace => DryFace(guides, logDepth, endBearing),
        _ => Reveal(guides, logDepth, endBearing),
    };

    private static GuidePlan WetFace(GuideSet guides, double depth, double bearing)
    {
        var (load, end, right) = (guides.LoadOffset, guides.LoadOffset - bearing / 2, guides.LoadOffset + bearing / 2);
        var (left, arris) = (-Math.Max(guides.BearingDistance, 2 * guides.Fasteners.HoleDiameter), guides.Fasteners.EdgeDistance);
        var (face, leg) = (-guides.LipThickness, end - Play);
        var (log, thick) = (face - Seal, guides.BaseThickness);

        // A leg keeps the logs in where it does not stand on the fasteners.
        var hasLeg = leg - thick > 2 * guides.Fasteners.HoleDiameter;
        PlanSpot[] keeper = hasLeg
            ? [new(leg, face), new(leg, log - depth), new(leg - thick, log - depth), new(leg - thick, -thick)]
            : [new(end, face), new(end, -thick)];
        return new()
        {
            Wall = [new(left - Reach / 3, 0), new(arris, 0), new(arris, Reach), new(left - Reach / 3, Reach)],
            Guide = [new(left, 0), new(right, 0), new(right, face), .. keeper, new(left, -thick)],
            Log = (end, log - depth, log),
            LogRight = Math.Max(load, arris) + 0.6 * Reach,
            LipFace = face,
            Lip = (right, face, 0),
            Strip = (new(guides.BearingDistance - guides.BearingWidth / 2, 0), new(guides.BearingDistance + guides.BearingWidth / 2, 0)),
            Into = new(0, 1),
        };
    }

    private static GuidePlan DryFace(GuideSet guides, double depth, double bearing)
    {
        var (end, right, arris) = (guides.LoadOffset - bearing / 2, guides.LoadOffset + bearing / 2, guides.Fasteners.EdgeDistance);
        var left = -(guides.BearingDistance + guides.BearingWidth / 2);
        var (thick, lip) = (guides.BaseThickness, guides.LipThickness);

        // A log that reaches past the arris stands behind the wall, in a guide with an upright leg; else in the opening, under a flat plate.
        var isBehind = end < arris;
        var face = isBehind ? Play + depth + Seal : 0;
        var leg = end - Play;
        PlanSpot[] behind =
        [
            new(left, 0), new(leg, 0), new(leg, face), new(right, face), new(right, face + lip), new(leg - thick, face + lip), new(leg - thick, thick), new(left, thick),
        ];
        PlanSpot[] flat = [new(left, 0), new(right, 0), new(right, lip), new(arris, lip), new(arris, thick), new(left, thick)];
        return new()
        {
            Wall = [new(left - Reach / 3, 0), new(arris, 0), new(arris, -Reach), new(left - Reach / 3, -Reach)],
            Guide = isBehind ? behind : flat,
            Log = (end, face - Seal - depth, face - Seal),
            LogRight = Math.Max(right, arris) + Reach / 2,
            LipFace = face,
            Lip = (right, face, face + lip),
            Strip = (new(left, 0), new(left + guides.BearingWidth, 0)),
            Into = new(0, -1),
        };
    }

    private static GuidePlan Reveal(GuideSet guides, double depth, double bearing)
    {
        var (end, right, arris) = (guides.LoadOffset - bearing / 2, guides.LoadOffset + bearing / 2, guides.Fasteners.EdgeDistance);
        var (thick, lip) = (guides.BaseThickness, guides.LipThickness);
        var top = guides.BearingDistance + guides.BearingWidth / 2;
        var log = top - lip - Seal;
        var foot = Math.Min(log - depth - Play - lip, -2 * guides.Fasteners.HoleDiameter);
        return new()
        {
            Wall = [new(0, foot - Reach / 3), new(0, arris), new(-Reach, arris), new(-Reach, foot - Reach / 3)],
            Guide =
            [
                new(0, foot), new(right, foot), new(right, foot + lip), new(thick, foot + lip), new(thick, top - lip), new(right, top - lip), new(right, top), new(0, top),
            ],
            Log = (Math.Max(thick, end), log - depth, log),
            LogRight = right + Reach / 2,
            LipFace = top - lip,
            Lip = (right, top - lip, top),
            Strip = (new(0, top - guides.BearingWidth), new(0, top)),
            Into = new(-1, 0),
        };
    }

    /// <summary>Everything that is drawn.</summary>
    public IEnumerable<PlanSpot> Corners => [.. Wall, .. Guide, new(Log.Left, Log.Lower), new(LogRight, Log.Upper)];
}
