using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Materials of every family with every mixture of strengths, and profiles of every shape.</summary>
internal static class Members
{
    public static Gen<Material> Material { get; } =
        from family in Gen.Elements(Enum.GetValues<MaterialFamily>())
        from density in Numbers.From(400, 8000, 10)
        from modulus in Numbers.From(7e9, 210e9, 1e9)
        from bendingStrength in Numbers.Perhaps(Stress)
        from shearStrength in Numbers.Perhaps(Stress)
        from allowableBending in Numbers.Perhaps(Stress)
        from allowableShear in Numbers.Perhaps(Stress)
        from ultimate in Numbers.Perhaps(Stress)
        from cross in Numbers.Perhaps(Stress)
        from shearModulus in Numbers.Perhaps(Numbers.From(1e8, 30e9, 1e8))
        from ownDensity in Numbers.Perhaps(Numbers.From(300, 900, 10))
        from buckling in Gen.Elements<BucklingClass?>(null, BucklingClass.A, BucklingClass.B)
        from reference in Gen.Elements(StrengthReference.Characteristic, StrengthReference.Characteristic, StrengthReference.NdsReference)
        select new Material
        {
            Family = family,
            Density = density,
            ElasticModulus = modulus,
            BendingStrength = bendingStrength,
            ShearStrength = shearStrength,
            AllowableBending = allowableBending,
            AllowableShear = allowableShear,
            UltimateStrength = ultimate,
            CrossStrength = cross,
            CrossCompression = cross,
            ShearModulus = shearModulus,
            CharacteristicDensity = ownDensity,
            BucklingClass = buckling,
            Reference = reference,
        };

    public static Gen<Profile> Profile { get; } =
        from height in Numbers.From(0.05, 0.3)
        from depth in Numbers.From(0.03, 0.15)
        from shape in Gen.OneOf(Solid, Hollow, Tube, ISection, Given)
        select shape with { Height = height, Depth = depth };

    private static Gen<double> Stress => Numbers.From(1e6, 400e6, 1e5);

    private static Gen<Profile> Solid => Gen.Constant<Profile>(new Rectangle());

    private static Gen<Profile> Hollow =>
        from face in Numbers.From(0.002, 0.01)
        from web in Numbers.From(0.002, 0.006)
        from webs in Gen.Choose(2, 6)
        select (Profile)new HollowRectangle { Face = face, Web = web, Webs = webs };

    private static Gen<Profile> Tube =>
        from wall in Numbers.From(0.002, 0.012)
        from corner in Numbers.Perhaps(Numbers.From(0, 0.014))
        from inner in Numbers.Perhaps(Numbers.From(0.0002, 0.001))
        select (Profile)new RectangularTube { Wall = wall, CornerRadius = corner, InnerRadius = inner is { } more ? Math.Max(0, (corner ?? 0) - wall) + more : null };

    private static Gen<Profile> ISection =>
        from flange in Numbers.From(0.003, 0.014)
        from web in Numbers.From(0.003, 0.012)
        select (Profile)new ISection { Flange = flange, Web = web };

    private static Gen<Profile> Given =>
        from area in Numbers.From(1e-4, 1e-2, 1e-5)
        from inertia in Numbers.From(1e-8, 1e-4, 1e-8)
        from modulus in Numbers.From(1e-6, 1e-3, 1e-6)
        from plasticModulus in Numbers.From(1e-6, 1e-3, 1e-6)
        from shearArea in Numbers.From(1e-4, 1e-2, 1e-5)
        select (Profile)new GivenProperties
        {
            Area = area,
            Inertia = inertia,
            Modulus = modulus,
            PlasticModulus = plasticModulus,
            ShearArea = shearArea,
        };
}
