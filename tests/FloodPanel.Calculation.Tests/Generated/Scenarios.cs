using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Valid projects: every shape, family, basis and zone; dry, partly full, brim-full and overtopped; raked; with water behind.</summary>
public static class Scenarios
{
    public static Arbitrary<Scenario> Valid() => Project.ToArbitrary();

    private static Gen<Scenario> Project =>
        from opening in Opening
        from site in Site
        from depth in Depth(Height(opening))
        from behind in Numbers.From(0, 1)
        from isWetBehind in Gen.Elements(false, true)
        from basis in Gen.Elements(Enum.GetValues<DesignBasisKind>())
        let level = opening.SillLevel + depth
        let still = level - site.Surge - site.TotalClimateAllowance
        let protectedLevel = Math.Round(level - behind * (0.2 + Math.Max(0, depth)), 4)
        select new Scenario(new Project
        {
            Name = "Generated",
            DesignBasis = basis,
            Site = site with { DesignStillWaterLevel = still, Levels = [new(0.01, still), new(0.1, still - 0.3)] },
            Openings = [opening with { ProtectedSideLevel = isWetBehind ? Math.Min(level, protectedLevel) : null }],
        });

    private static Gen<Site> Site =>
        from density in Numbers.From(990, 1400, 5)
        from surge in Numbers.From(0, 0.5, 0.05)
        from climate in Numbers.From(0, 0.3, 0.05)
        from rate in Numbers.From(0, 0.01, 0.001)
        from life in Numbers.From(1, 100, 1)
        from freeboard in Numbers.From(0, 0.5, 0.05)
        from zone in Gen.Elements(Enum.GetValues<FloodZone>())
        select new Site
        {
            WaterDensity = density,
            Surge = surge,
            ClimateAllowance = climate,
            ClimateRatePerYear = rate,
            DesignLifeYears = life,
            Freeboard = freeboard,
            FloodZone = zone,
        };

    private static Gen<Opening> Opening =>
        from sill in Numbers.From(-20, 120, 0.005)
        from ground in Numbers.Perhaps(Numbers.From(-0.5, 0.5, 0.005))
        from clearHeight in Numbers.From(0.5, 3, 0.005)
        from rake in Gen.OneOf(Gen.Constant(0.0), Numbers.From(0, 60, 0.5))
        from wall in Gen.Elements(Enum.GetValues<WallKind>())
        from behind in Grounds.Wall
        from plain in Barriers.Any
        from barrier in PostBases.Under(plain, Height(plain, rake), rake)
        from actions in Actions(barrier, rake)
        select new Opening
        {
            Id = "gap",
            SillLevel = sill,
            GroundLevel = sill + ground,
            ClearWidth = barrier.Bays.Sum() + (barrier.Bays.Count - 1) * (barrier.Posts?.Width ?? 0),
            ClearHeight = clearHeight,
            RakeDegrees = rake,
            Wall = wall,
            WallBehind = behind,
            Actions = actions,
            Barrier = barrier,
        };

    private static Gen<ActionSet> Actions(Barrier barrier, double rake) =>
        from velocity in Gen.OneOf(
            Gen.Constant<double?>(null), Numbers.From(0, 3, 0.01).Select(v => (double?)v), Numbers.Perhaps(Numbers.From(3.1, 8, 0.01)))
        from shape in Numbers.From(1.25, 3, 0.05)
        from others in Gen.Choose(0, 31)
        from height in Numbers.From(0, 1)
        from wave in Wave
        select new ActionSet
        {
            Flow = velocity is { } v ? new() { Velocity = v, ShapeCoefficient = shape } : null,
            Wave = wave,
            Debris = others is 3 or 4 ? new() { Velocity = 1 } : null,
            Wind = others is 4 or 5 ? new() { Pressure = 700 } : null,
            Line = others is 5 or 6 ? new() { Force = 740, Height = height * Height(barrier, rake) } : null,
        };

    /// <summary>Mostly none; breaking; non-breaking from ripples to waves higher than the depth allows, on level and too steep beds.</summary>
    private static Gen<WaveInput?> Wave =>
        from kind in Gen.Choose(0, 7)
        from category in Gen.Choose(1, 4)
        from height in Numbers.From(0.02, 0.8, 0.01)
        from period in Numbers.From(0.5, 20, 0.1)
        from angle in Numbers.From(0, 90, 1)
        from slope in Gen.OneOf(Gen.Constant(0.0), Numbers.From(0, 0.12, 0.01))
        select kind switch
        {
            0 => (WaveInput?)new BreakingWaveInput { RiskCategory = category },
            1 or 2 => new NonBreakingWaveInput { Height = height, Period = period, AngleDegrees = angle, BedSlope = slope },
            _ => null,
        };

    /// <summary>Dry, within the barrier, exactly at its top, and over it.</summary>
    private static Gen<double> Depth(double height) => Gen.OneOf(
        Numbers.From(-0.5, 0.1, 0.005),
        Numbers.From(0, 1).Select(part => Math.Round(part * height, 4)),
        Numbers.From(0, 1).Select(part => Math.Round(part * height, 4)),
        Gen.Constant(height),
        Numbers.From(1, 1.6).Select(part => Math.Round(part * height, 4)));

    private static double Height(Opening opening) => Height(opening.Barrier, opening.RakeDegrees);

    private static double Height(Barrier barrier, double rake) =>
        barrier.Logs.Groups.Sum(group => group.Count * ((Profile)group.Profile).Height) * Math.Cos(double.DegreesToRadians(rake));
}
