using FloodPanel.Calculation.PlaneAreas;

namespace FloodPanel.Calculation.Verification;

/// <summary>Plane areas under water: moments as statics handbooks print them.</summary>
internal static class PlaneAreaRows
{
    private const string Handbook = "Statics handbooks: moments and centres of plane areas";

    public static IEnumerable<VerificationRow> Rows()
    {
        var half = Outline.Of(new SegmentShape(2, 1, ChordBelow: true)).Below(double.PositiveInfinity);
        var centroid = half.Up / half.Area;
        var circle = Outline.Of(new CircleShape(2)).Below(double.PositiveInfinity);
        var triangle = PlaneArea.Evaluate(new() { Shape = new TrapezoidShape(1, 0, 1), Depth = 1 });
        var inverted = PlaneArea.Evaluate(new() { Shape = new TrapezoidShape(0, 1, 1), Depth = 1 });
        return
        [
            new(Handbook, "circle, r 1: second moment, π/4", "", "0.7854", circle.UpUp - circle.Area, Evidence.Memory),
            new(Handbook, "half circle, r 1: centroid above the flat side", "", "0.4244", centroid, Evidence.Memory),
            new(Handbook, "half circle, r 1: second moment about the centroid", "", "0.1098", half.UpUp - half.Area * centroid * centroid, Evidence.Memory),
            new(Handbook, "triangle, apex in the water line: depth of the centre of pressure over the height", "", "0.75", triangle.CentreOfPressureDepth, Evidence.Memory),
            new(Handbook, "triangle, base in the water line: the same", "", "0.50", inverted.CentreOfPressureDepth, Evidence.Memory),
        ];
    }
}
