using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Cases;

/// <summary>Which actions make up a case, with which factors.</summary>
public static class CaseDiagram
{
    /// <summary>The cases of an opening, in the order in which they are shown.</summary>
    public static ValueList<CaseKind> All { get; } = [CaseKind.DesignFlood, CaseKind.BrimFull];

    /// <summary>Fills a diagram with the actions of a case.</summary>
    /// <param name="diagram">The diagram; what it held is dropped.</param>
    /// <param name="model">The opening.</param>
    /// <param name="kind">The case.</param>
    internal static void Fill(PressureDiagram diagram, OpeningModel model, CaseKind kind)
    {
        diagram.Clear();
        Hydrostatics(diagram, model, kind);
        if (kind == CaseKind.DesignFlood)
        {
            FlowPressure(diagram, model);
        }
    }

    /// <summary>Load factor of a case on the flood side [-].</summary>
    /// <param name="factors">Load factors of the basis.</param>
    /// <param name="kind">The case.</param>
    internal static double FloodSideFactor(LoadFactors factors, CaseKind kind) =>
        kind == CaseKind.BrimFull ? factors.BrimFull : factors.FloodSide;

    /// <summary>Still water of a case: the design depth on both sides, or water to the top and nothing behind.</summary>
    /// <param name="diagram">The diagram to add to.</param>
    /// <param name="model">The opening.</param>
    /// <param name="kind">The case.</param>
    internal static void Hydrostatics(PressureDiagram diagram, OpeningModel model, CaseKind kind)
    {
        var height = model.Height;
        var brimFull = kind == CaseKind.BrimFull;
        var depth = brimFull ? height : model.RetainedDepth;
        diagram.Add(Hydrostatic.Side(model.UnitWeight, depth, height, FloodSideFactor(model.Factors, kind)));
        if (!brimFull && model.ProtectedDepth > 0)
        {
            var behind = Hydrostatic.Side(model.UnitWeight, model.ProtectedDepth, height, model.Factors.ProtectedSide);
            diagram.Add(behind.Opposite());
        }
    }

    /// <summary>Moving water over the wetted height, when there is any.</summary>
    /// <param name="diagram">The diagram to add to.</param>
    /// <param name="model">The opening.</param>
    internal static void FlowPressure(PressureDiagram diagram, OpeningModel model)
    {
        var wetted = Math.Min(model.RetainedDepth, model.Height);
        if (model.Flow is not { } flow || !(wetted > 0))
        {
            return;
        }

        var pressure = Flow.Pressure(flow.Velocity, flow.ShapeCoefficient, model.UnitWeight, model.ClearWidth, wetted);
        diagram.Add(new(0, wetted, pressure, pressure, model.Factors.FloodSide));
    }
}
