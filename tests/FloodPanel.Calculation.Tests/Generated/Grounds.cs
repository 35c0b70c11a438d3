using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Walls and footings, mostly none.</summary>
internal static class Grounds
{
    public static Gen<WallInput?> Wall =>
        from kind in Gen.Choose(0, 4)
        from line in Numbers.Perhaps(Numbers.From(1e3, 100e3, 100))
        from total in Numbers.Perhaps(Numbers.From(1e3, 100e3, 100))
        from source in Gen.Elements("", "Drawing W-1")
        select kind switch
        {
            0 => new WallInput { Measure = WallMeasure.PublishedDepth },
            1 or 2 => new WallInput { LineResistance = line, TotalResistance = total, Source = source },
            _ => (WallInput?)null,
        };

    public static Gen<FootingInput?> Footing =>
        from kind in Gen.Choose(0, 3)
        from width in Numbers.From(0.2, 4, 0.05)
        from thickness in Numbers.From(0.1, 1.5, 0.05)
        from edge in Numbers.From(0, 1, 0.05)
        from adhesion in Gen.Elements(0.0, 5e3)
        from cutOff in Numbers.From(0, 2, 0.1)
        from soil in Gen.Elements(Enum.GetValues<CreepSoil>())
        from share in Gen.Elements(0.75, 1.0)
        from carries in Gen.Elements(false, true)
        select kind > 0 ? null : new FootingInput
        {
            Width = width,
            Thickness = thickness,
            BarrierFromFloodEdge = edge * width,
            Adhesion = adhesion,
            CutOff = cutOff,
            Soil = soil,
            ContactShare = share,
            CarriesGuides = carries,
            Source = "Report G-2",
        };
}
