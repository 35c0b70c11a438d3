using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>The dock with a base plate and anchors of every method and kind, near edges and far from them, under every basis.</summary>
public static class AnchorSets
{
    public static Arbitrary<AnchoredDock> Valid() => Dock.ToArbitrary();

    private static Gen<AnchoredDock> Dock =>
        from anchors in Anchors
        from rods in Gen.Choose(1, 4)
        from grout in Gen.Elements(0, 0.005, 0.03)
        from thickness in Numbers.From(0.01, 0.04)
        from basis in Gen.Elements(Enum.GetValues<DesignBasisKind>())
        select new AnchoredDock(basis, anchors, new BasePlateInput
        {
            Material = SampleProject.Steel with { BendingStrength = 275e6 },
            Length = 0.32,
            Width = 0.25,
            Thickness = thickness,
            RodDistance = 0.12,
            RodsPerRow = rods,
            ConcreteStrength = 28e6,
            GroutThickness = grout,
        });

    private static Gen<AnchorInput> Anchors =>
        from method in Gen.Elements(Enum.GetValues<AnchorMethod>())
        from kind in Gen.Elements(Enum.GetValues<AnchorKind>())
        from depth in Numbers.From(0.05, 0.45)
        from flood in Numbers.Perhaps(Numbers.From(0.06, 0.6))
        from ahead in Numbers.Perhaps(Numbers.From(0.06, 0.6))
        from left in Numbers.Perhaps(Numbers.From(0.06, 0.6))
        from right in Numbers.Perhaps(Numbers.From(0.06, 0.6))
        from cracked in Gen.Elements(false, true)
        from shared in Gen.Elements(false, true)
        from washer in Numbers.Perhaps(Numbers.From(0.005, 0.015))
        from critical in Numbers.Perhaps(Numbers.From(0.1, 0.6))
        from spacing in Numbers.From(0.06, 0.6)
        select new AnchorInput
        {
            Method = method,
            Kind = kind,
            Depth = depth,
            MemberThickness = depth + 0.1,
            HeadArea = 400e-6,
            HookLength = 0.06,
            Pullout = 45e3,
            CriticalEdge = critical,
            Spacing = spacing,
            EdgeFlood = flood,
            EdgeProtected = ahead,
            EdgeLeft = left,
            EdgeRight = right,
            Cracked = cracked,
            SharedShear = shared,
            WasherThickness = washer,
            TensionResistance = 30e3,
            ShearResistance = 25e3,
            MinimumEdge = 0.08,
            MinimumSpacing = 0.1,
            Source = "Approval A-7",
        };
}

/// <summary>A dock with anchors.</summary>
public sealed record AnchoredDock(DesignBasisKind Basis, AnchorInput Anchors, BasePlateInput Plate)
{
    public Project Project => SampleProject.Project with
    {
        DesignBasis = Basis,
        Openings = [SampleProject.Dock with { Barrier = SampleProject.Dock.Barrier with { Anchors = Anchors, BasePlate = Plate } }],
    };

    public OpeningResult Result => SampleProject.Result(Project);
}
