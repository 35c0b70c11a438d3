using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Guides of every mounting, with and without the values that their checks need.</summary>
internal static class GuideSets
{
    /// <summary>Mostly some, that fit a stack of logs; else none.</summary>
    public static Gen<GuideSet?> Of(LogStack logs) =>
        from isThere in Gen.Choose(0, 2)
        from guides in Fitting(Height(logs))
        select isThere > 0 ? guides : null;

    private static double Height(LogStack logs) => logs.Groups.Sum(run => run.Count * ((Profile)run.Profile).Height);

    private static Gen<GuideSet> Fitting(double height) =>
        from mounting in Gen.Elements(Enum.GetValues<GuideMounting>())
        from material in Members.Material
        from lip in Numbers.From(0.003, 0.02)
        from lever in Numbers.From(0, 0.06)
        from thickness in Numbers.From(0.003, 0.02)
        from offset in Numbers.From(0.01, 0.12)
        from distance in Numbers.From(0.02, 0.1)
        from width in Numbers.From(0.005, 0.03)
        from bearing in Numbers.Perhaps(Numbers.From(1e6, 2e7, 1e5))
        from source in Source
        from fasteners in Fasteners(height, distance + width)
        select new GuideSet
        {
            Mounting = mounting,
            Material = material,
            LipThickness = lip,
            LipLever = lever,
            BaseThickness = thickness,
            LoadOffset = offset,
            BearingDistance = distance,
            BearingWidth = width,
            WallBearing = bearing,
            WallBearingSource = source,
            Fasteners = fasteners,
        };

    private static Gen<GuideFasteners> Fasteners(double height, double leastEdge) =>
        from pitch in Numbers.From(0.05, 0.6)
        from end in Numbers.From(0.05, 0.4).Select(part => Math.Round(part * height, 6))
        from edge in Numbers.From(0, 0.2)
        from basis in Gen.Elements(Enum.GetValues<DesignBasisKind>())
        from tension in Numbers.Perhaps(Numbers.From(500, 50_000, 10))
        from shear in Numbers.Perhaps(Numbers.From(500, 50_000, 10))
        from minimumEdge in Numbers.Perhaps(Numbers.From(0.02, 0.2))
        from minimumSpacing in Numbers.Perhaps(Numbers.From(0.02, 0.2))
        from limit in Gen.Elements(1, 1.1, 1.2)
        from source in Source
        select new GuideFasteners
        {
            Pitch = pitch,
            EndDistance = end,
            EdgeDistance = Math.Round(leastEdge + edge, 6),
            HoleDiameter = 0.011,
            ValuesFor = basis,
            Tension = tension,
            Shear = shear,
            MinimumEdge = minimumEdge,
            MinimumSpacing = minimumSpacing,
            InteractionLimit = limit,
            Source = source,
        };

    private static Gen<string> Source => Gen.Elements("", "Approval 12/345 (invented)", "Pull tests on the wall");
}
