using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Welded bases, rakers and base plates that fit a barrier; often none.</summary>
internal static class PostBases
{
    /// <summary>The barrier with what its posts may have at their feet.</summary>
    public static Gen<Barrier> Under(Barrier barrier, double height, double rake) =>
        barrier.Posts is not { } posts
            ? Gen.Constant(barrier)
            : from welded in Gen.Elements(false, true)
              from hasRaker in Gen.Choose(0, 3)
              from raker in Raker(height, rake)
              from hasPlate in Gen.Choose(0, 3)
              from material in Beside((Material)posts.Material)
              from plate in Plate((Profile)posts.Profile, material)
              select barrier with
              {
                  Posts = posts with { Material = material, WeldedBase = welded, Raker = hasRaker == 0 ? raker : null },
                  BasePlate = hasPlate > 0 ? plate : null,
              };

    /// <summary>The material with some of the figures that welds and stability need.</summary>
    private static Gen<Material> Beside(Material material) =>
        from ultimate in Numbers.Perhaps(Numbers.From(50e6, 500e6, 1e6))
        from yield in Numbers.Perhaps(Numbers.From(30e6, 200e6, 1e6))
        from welded in Numbers.Perhaps(Numbers.From(50e6, 250e6, 1e6))
        from shear in Numbers.Perhaps(Numbers.From(1e9, 80e9, 1e8))
        from buckling in Gen.Elements<BucklingClass?>(null, BucklingClass.A, BucklingClass.B)
        select material with { BucklingClass = buckling, UltimateStrength = ultimate, WeldedYield = yield, WeldedUltimate = welded, ShearModulus = shear };

    private static Gen<RakerInput> Raker(double height, double rake) =>
        from material in Members.Material
        from profile in Members.Profile
        from head in Numbers.From(0.2, 1)
        from beyond in Numbers.From(0.3, 2)
        from factor in Numbers.From(0.5, 2, 0.1)
        from play in Gen.Elements(0, 0, 0.001)
        from foot in Numbers.Perhaps(Numbers.From(1e3, 1e5, 100))
        let headHeight = Math.Round(head * height, 4)
        select new RakerInput
        {
            Material = material,
            Profile = profile,
            HeadHeight = headHeight,
            FootDistance = Math.Round(headHeight * (Math.Tan(double.DegreesToRadians(rake)) + beyond), 4),
            LengthFactor = factor,
            Play = play,
            FootResistance = foot,
        };

    private static Gen<BasePlateInput> Plate(Profile post, Material material) =>
        from other in Members.Material
        from isAlike in Gen.Elements(true, true, true, false)
        from beyond in Numbers.From(0.08, 0.3)
        from beside in Numbers.From(0, 0.2)
        from part in Numbers.From(0.1, 0.9)
        from thickness in Numbers.From(0.006, 0.06)
        from rods in Gen.Choose(1, 4)
        from concrete in Numbers.From(12e6, 50e6, 1e5)
        from ratio in Numbers.From(1, 9, 0.1)
        from grout in Numbers.From(0, 0.06)
        from leg in Numbers.Perhaps(Numbers.From(0.003, 0.015))
        from weld in Numbers.Perhaps(Numbers.From(150e6, 500e6, 1e6))
        let length = Math.Round(post.Depth + beyond, 4)
        select new BasePlateInput
        {
            Material = isAlike ? material : other,
            Length = length,
            Width = Math.Round(post.Height + beside, 4),
            Thickness = thickness,
            RodDistance = Math.Round((post.Depth + part * (length - post.Depth)) / 2, 4),
            RodsPerRow = rods,
            ConcreteStrength = concrete,
            AreaRatio = ratio,
            GroutThickness = grout,
            WeldLeg = leg,
            WeldStrength = weld,
        };
}
