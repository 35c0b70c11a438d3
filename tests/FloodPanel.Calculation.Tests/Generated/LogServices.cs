using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Joints, timber and composite factors of a stack, each present half of the time.</summary>
internal static class LogServices
{
    public static Gen<LogJoint?> Joint =>
        from isThere in Gen.Elements(false, true)
        from travel in Numbers.From(0.001, 0.05)
        from seal in Numbers.Perhaps(Numbers.From(0.0005, 0.01, 0.0005))
        select isThere ? new LogJoint { Travel = travel, SealCompression = seal } : null;

    public static Gen<TimberService?> Timber =>
        from isThere in Gen.Elements(false, true)
        from duration in Gen.Elements(Enum.GetValues<LoadDuration>())
        from size in Numbers.From(0.9, 1.5, 0.05)
        select isThere ? new TimberService { Duration = duration, SizeFactor = size } : null;

    public static Gen<CompositeService?> Composite =>
        from isThere in Gen.Elements(false, true)
        from material in Numbers.From(1, 5, 0.1)
        from conversion in Numbers.From(0.1, 1, 0.05)
        select isThere ? new CompositeService { MaterialFactor = material, ConversionFactor = conversion } : null;
}
