using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Barriers of one to four bays.</summary>
internal static class Barriers
{
    public static Gen<Barrier> Any { get; } =
        from logs in Logs
        from bayCount in Gen.Choose(1, 4)
        from bays in Numbers.From(0.4, 3, 0.001).ArrayOf(bayCount)
        from areAlike in Gen.Elements(false, true)
        from posts in Posts
        from byOthers in ByOthers
        from guides in GuideSets.Of(logs)
        from footing in Grounds.Footing
        select new Barrier
        {
            Logs = logs,
            Bays = areAlike ? Enumerable.Repeat(bays[0], bayCount).ToValueList() : bays.ToValueList(),
            Posts = bayCount > 1 ? posts : null,
            Guides = guides,
            ByOthers = byOthers,
            Footing = footing,
        };

    private static Gen<LogStack> Logs =>
        from material in Members.Material
        from profile in Members.Profile
        from count in Gen.Choose(1, 10)
        from endBearing in Numbers.From(0.02, 0.04)
        from clearance in Numbers.From(0, 0.015)
        from limit in Gen.Choose(100, 500)
        from below in Below
        from joint in LogServices.Joint
        from timber in LogServices.Timber
        from composite in LogServices.Composite
        select new LogStack
        {
            Material = material,
            Profile = profile,
            Count = count,
            EndBearing = endBearing,
            FittingClearance = clearance,
            DeflectionLimit = limit,
            Below = below,
            Joint = joint,
            Timber = timber,
            Composite = composite,
        };

    /// <summary>Mostly none; else one or two groups of other logs beneath.</summary>
    private static Gen<ValueList<LogGroup>> Below =>
        from kind in Gen.Choose(0, 5)
        from groups in Group.ArrayOf(kind < 4 ? 0 : kind - 3)
        select groups.ToValueList();

    private static Gen<LogGroup> Group =>
        from material in Members.Material
        from profile in Members.Profile
        from count in Gen.Choose(1, 3)
        select new LogGroup { Material = material, Profile = profile, Count = count };

    private static Gen<PostSet> Posts =>
        from material in Members.Material
        from profile in Members.Profile
        from width in Numbers.From(0.08, 0.2)
        from limit in Gen.Choose(50, 300)
        select new PostSet { Material = material, Profile = profile, Width = width, DeflectionLimit = limit };

    /// <summary>Nobody, everything by a named designer, or one check with or without a name.</summary>
    private static Gen<ValueList<DesignedByOthers>> ByOthers =>
        Gen.OneOf(
            Gen.Constant<ValueList<DesignedByOthers>>([]),
            Gen.Constant(NeededChecks.MayBeByOthers.Select(c => new DesignedByOthers(c, "A. Designer", "D-1")).ToValueList()),
            from check in Gen.Elements(NeededChecks.MayBeByOthers.ToArray())
            from name in Gen.Elements("", "A. Designer")
            select (ValueList<DesignedByOthers>)[new(check, name, "D-1")]);
}
