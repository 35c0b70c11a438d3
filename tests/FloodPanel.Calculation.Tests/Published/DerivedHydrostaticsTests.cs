using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Check values of still water, derived and recomputed outside this code with γ = 9.81 kN/m³; no document prints
/// them. Closed forms: R = γ·c·(h − c/2) and M = γ·c²·(h/2 − c/3) with c = min(h, H).
/// </summary>
public class DerivedHydrostaticsTests
{
    private static readonly double UnitWeight = Hydrostatic.UnitWeight(9810 / 9.80665);

    /// <summary>Overtopped; overtopped with water behind; lower than the barrier.</summary>
    [Theory]
    [InlineData(1.2, 0, 6.867, 2.616, 0.381)]
    [InlineData(1.2, 0.4, 6.082, 2.511, 0.413)]
    [InlineData(0.9, 0, 3.973, 1.192, 0.300)]
    public void Diagram_VerticalFaceOneMetreHigh_ResultantMomentAndHeight(
        double depth, double behind, double resultant, double moment, double height)
    {
        var diagram = Diagram(depth, behind);

        Assert.Equal(resultant, diagram.Force / 1000, tolerance: 0.0005);
        Assert.Equal(moment, diagram.Force * diagram.CentreOfPressure!.Value / 1000, tolerance: 0.0005);
        Assert.Equal(height, diagram.CentreOfPressure!.Value, tolerance: 0.0005);
    }

    /// <summary>Lowest log, 0 to 0.15 m, under 0.9 m: 1.214 kN/m at 0.0727 m; 8.829 and 7.358 kPa at its edges.</summary>
    [Fact]
    public void Within_LowestLog_LoadHeightAndEdgePressures()
    {
        var diagram = Diagram(0.9, 0);

        Assert.Equal(1.214, diagram.Within(0, 0.15).Characteristic / 1000, tolerance: 0.0005);
        Assert.Equal(0.0727, diagram.CentreWithin(0, 0.15)!.Value, tolerance: 0.00005);
        Assert.Equal(8.829, diagram.At(0) / 1000, tolerance: 0.0005);
        Assert.Equal(7.358, diagram.At(0.15) / 1000, tolerance: 0.0005);
    }

    /// <summary>Face at 60° to the horizontal, 0.9 m of water: normal force 4.588 kN/m, 0.346 m up the slope.</summary>
    [Fact]
    public void Evaluate_FaceThirtyDegreesFromVertical_NormalForceAndCentreUpTheSlope()
    {
        var cosRake = Math.Cos(Math.PI / 6);
        var diagram = PressureDiagram.Of(Hydrostatic.Side(UnitWeight, 0.9, height: 1.0, factor: 1));

        Assert.Equal(4.588, diagram.Force / cosRake / 1000, tolerance: 0.0005);
        Assert.Equal(0.346, diagram.CentreOfPressure!.Value / cosRake, tolerance: 0.0005);
    }

    private static PressureDiagram Diagram(double depth, double behind)
    {
        var protectedSide = Hydrostatic.Side(UnitWeight, behind, height: 1.0, factor: 1);
        return PressureDiagram.Of(
            Hydrostatic.Side(UnitWeight, depth, height: 1.0, factor: 1),
            protectedSide with { AtBottom = -protectedSide.AtBottom, AtTop = -protectedSide.AtTop });
    }
}
