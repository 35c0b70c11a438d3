using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>The figures of a plane area that its working narrates.</summary>
internal readonly record struct PlaneAreaFigures(
    double Sine, double WaterLine, double Area, double X, double S, double Inertia, double Product, double Force, PlanePoint Centre, bool Submerged);

/// <summary>How the load on a plane area came about.</summary>
internal static class PlaneAreaWorking
{
    public static Working Of(PlaneAreaInput input, PlaneAreaFigures f)
    {
        var steps = new StepList(28);
        steps.UnitWeight(Hydrostatic.UnitWeight(input.WaterDensity));
        steps.Given("θ", double.DegreesToRadians(input.InclinationDegrees), Dimension.Angle);
        steps.Given("h", input.Depth, Dimension.Length);
        steps.Add("s_w", "h/sin(θ)", f.WaterLine, Dimension.Length);
        Moments(steps, input.Shape, f);
        steps.Add("y_c", "s_w − s_c", f.WaterLine - f.S, Dimension.Length);
        steps.Add("h_c", "y_c·sin(θ)", (f.WaterLine - f.S) * f.Sine, Dimension.Length);
        steps.Add("F", "γ·h_c·A", f.Force, Dimension.Force);
        steps.Add("y_p", "y_c + I_c/(y_c·A)", f.WaterLine - f.Centre.S, Dimension.Length);
        steps.Add("x_p", "x_c − I_xs/(y_c·A)", f.Centre.X, Dimension.Length);
        steps.Add("h_p", "y_p·sin(θ)", (f.WaterLine - f.Centre.S) * f.Sine, Dimension.Length);
        var wetted = f.Submerged ? "" : "; moments of the part below the water line";
        return new($"Still water on a plane area: s up the slope from its lowest point, y down from the water line{wetted}", PlaneArea.Source, steps.Done());
    }

    /// <summary>By formula where a handbook has one, else as integrals around the outline.</summary>
    private static void Moments(StepList steps, PlaneShape shape, PlaneAreaFigures f)
    {
        switch (shape)
        {
            case CircleShape circle when f.Submerged:
                steps.Given("D", circle.Diameter, Dimension.Length);
                steps.Add("A", "π·D²/4", f.Area, Dimension.Area);
                steps.Add("s_c", "D/2", f.S, Dimension.Length);
                steps.Add("I_c", "π·D⁴/64", f.Inertia, Dimension.AreaInertia);
                break;
            case TrapezoidShape t when f.Submerged:
                steps.Given("a", t.Bottom, Dimension.Length);
                steps.Given("b", t.Top, Dimension.Length);
                steps.Given("t", t.Height, Dimension.Length);
                steps.Add("A", "(a + b)/2·t", f.Area, Dimension.Area);
                steps.Add("s_c", "t/3·(a + 2·b)/(a + b)", f.S, Dimension.Length);
                steps.Add("I_c", "t³/36·(a² + 4·a·b + b²)/(a + b)", f.Inertia, Dimension.AreaInertia);
                break;
            default:
                steps.Given("A", f.Area, Dimension.Area);
                steps.Given("s_c", f.S, Dimension.Length);
                steps.Given("I_c", f.Inertia, Dimension.AreaInertia);
                break;
        }

        steps.Given("x_c", f.X, Dimension.Length);
        steps.Given("I_xs", f.Product, Dimension.AreaInertia);
    }
}
