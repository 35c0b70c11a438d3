using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>Covers of round figures: γ 9806.65 N/m³, water at level 10 m, aluminium plate of E 70 GPa.</summary>
internal static class SampleCovers
{
    public const double Weight = 9806.65;

    public static Material Plate { get; } = new()
    {
        Family = MaterialFamily.Aluminium,
        Name = "plate",
        Density = 2700,
        ElasticModulus = 70e9,
        AllowableBending = 100e6,
    };

    public static Project Project { get; } = new()
    {
        Name = "covers",
        Site = new Site { DesignStillWaterLevel = 10 },
    };

    /// <summary>A square of 0.5 m that lies flat 1 m below the water, pulled off.</summary>
    public static Cover Hatch { get; } = new()
    {
        Name = "Hatch",
        Plate = new RectangleCover { Width = 0.5, Height = 0.5 },
        Position = CoverPosition.Flat,
        Level = 9,
        Material = Plate,
        Thickness = 0.008,
        Pressing = CoverPressing.Unseating,
        Fasteners = new CoverFasteners { Pitch = 0.1, GasketLoad = 1000, Tension = 2000, Source = "Approval" },
    };

    /// <summary>A vent of 0.6 × 0.4 m, its lower edge 1.5 m below the water.</summary>
    public static Cover Vent { get; } = Hatch with
    {
        Name = "Vent",
        Plate = new RectangleCover { Width = 0.6, Height = 0.4 },
        Position = CoverPosition.Upright,
        Level = 8.5,
    };

    public static CoverResult Evaluate(Cover cover) => Design.Evaluate(Project, cover, Library.Empty);

    public static Cover WithFasteners(this Cover cover, Func<CoverFasteners, CoverFasteners> change) =>
        cover with { Fasteners = change(cover.Fasteners) };

    public static double Use(this CoverResult result, string check) => result.Checks.Single(c => c.Name == check).Utilisation;

    public static double Step(this CoverResult result, string check, string symbol) =>
        result.Checks.Single(c => c.Name == check).Steps.Single(s => s.Symbol == symbol).Value;
}
