using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Guides;

/// <summary>Invented guides with every input, for the dock or for its twin of one bay.</summary>
internal static class SampleGuides
{
    public static GuideSet Reveal { get; } = new()
    {
        Mounting = GuideMounting.Reveal,
        Material = SampleProject.Aluminium,
        LipThickness = 0.008,
        LipLever = 0.03,
        BaseThickness = 0.01,
        LoadOffset = 0.03,
        BearingDistance = 0.04,
        BearingWidth = 0.02,
        WallBearing = 5e6,
        WallBearingSource = "invented",
        Fasteners = new()
        {
            Pitch = 0.25,
            EndDistance = 0.1,
            EdgeDistance = 0.1,
            HoleDiameter = 0.012,
            ValuesFor = DesignBasisKind.AllowableStress,
            Tension = 6000,
            Shear = 8000,
            MinimumEdge = 0.08,
            MinimumSpacing = 0.1,
            InteractionLimit = 1.2,
            Source = "Approval 12/345 (invented)",
        },
    };

    /// <summary>The dock with guides.</summary>
    public static Project With(GuideSet? guides) => Refused.With((Barrier b) => b with { Guides = guides });

    /// <summary>The dock with one bay of 2.1 m, so that no post needs anything.</summary>
    public static Project OneBay(GuideSet? guides) => Refused.With((Opening o) => o with
    {
        ClearWidth = 2.1,
        Barrier = o.Barrier with { Bays = [2.1], Posts = null, Guides = guides },
    });

    public static GuideSet WithFasteners(Func<GuideFasteners, GuideFasteners> change) =>
        Reveal with { Fasteners = change(Reveal.Fasteners) };
}
