using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Actions;

/// <summary>Each action of a case by itself: pieces, resultant and how its pressures came about.</summary>
internal static class ActionReport
{
    public static ActionResult[] Of(OpeningModel model, CaseKind kind)
    {
        var results = new List<ActionResult>(2);
        var hydrostatic = new PressureDiagram();
        CaseDiagram.Hydrostatics(hydrostatic, model, kind);
        results.Add(Result(ActionKind.Hydrostatic, hydrostatic, model, kind, HydrostaticWorking(model, kind)));
        if (kind == CaseKind.DesignFlood && model.Flow is not null)
        {
            var flow = new PressureDiagram();
            CaseDiagram.FlowPressure(flow, model);
            results.Add(Result(ActionKind.Flow, flow, model, kind, FlowWorking(model)));
        }

        return [.. results];
    }

    private static ActionResult Result(
        ActionKind action, PressureDiagram diagram, OpeningModel model, CaseKind kind, Working working) => new(
            action,
            diagram.Pieces.ToArray(),
            diagram.Force / model.CosRake,
            diagram.CentreOfPressure,
            CaseDiagram.FloodSideFactor(model.Factors, kind),
            working);

    private static Working HydrostaticWorking(OpeningModel model, CaseKind kind)
    {
        var steps = new StepList(8);
        UnitWeight(steps, model);
        if (kind == CaseKind.BrimFull)
        {
            steps.Given("H", model.Height, Dimension.Length);
            steps.Add("p_sill", "γ·H", model.UnitWeight * model.Height, Dimension.Pressure);
            return new("Pressure of still water at the top of the barrier", Hydrostatic.Source, steps.Done());
        }

        var (depth, behind) = (model.RetainedDepth, model.ProtectedDepth);
        steps.Given("h", depth, Dimension.Length);
        steps.Given("h′", behind, Dimension.Length);
        steps.Add("p_flood", "γ·max(0, h)", model.UnitWeight * Math.Max(0, depth), Dimension.Pressure);
        steps.Add("p_protected", "γ·h′", model.UnitWeight * behind, Dimension.Pressure);
        steps.Add(
            "p_sill", "p_flood − p_protected", model.UnitWeight * (Math.Max(0, depth) - behind), Dimension.Pressure);
        return new("Pressure of still water at the sill", Hydrostatic.Source, steps.Done());
    }

    private static Working FlowWorking(OpeningModel model)
    {
        var flow = model.Flow!;
        var wetted = Math.Max(0, Math.Min(model.RetainedDepth, model.Height));
        var surchargeDepth = Flow.SurchargeDepth(flow.Velocity, flow.ShapeCoefficient);
        var steps = new StepList(12);
        UnitWeight(steps, model);
        steps.Given("V", flow.Velocity, Dimension.Velocity);
        steps.Given("a", flow.ShapeCoefficient, Dimension.Ratio);
        steps.Add("d_h", "a·V²/(2·g)", surchargeDepth, Dimension.Length);
        steps.Add("p_s", "γ·d_h", model.UnitWeight * surchargeDepth, Dimension.Pressure);
        if (flow.Velocity <= Flow.SurchargeVelocityLimit || wetted == 0)
        {
            return new("Uniform pressure of flow, surcharge method", Flow.SurchargeSource, steps.Done());
        }

        var coefficient = Flow.DragCoefficient(model.ClearWidth / wetted);
        var drag = coefficient * model.UnitWeight / Physics.Gravity * flow.Velocity * flow.Velocity / 2;
        steps.Given("B", model.ClearWidth, Dimension.Length);
        steps.Given("h_w", wetted, Dimension.Length);
        steps.Add("r", "B/h_w", model.ClearWidth / wetted, Dimension.Ratio);
        steps.Given("C_d", coefficient, Dimension.Ratio);
        steps.Add("p_d", "C_d·ρ·V²/2", drag, Dimension.Pressure);
        var pressure = Flow.Pressure(
            flow.Velocity, flow.ShapeCoefficient, model.UnitWeight, model.ClearWidth, wetted);
        steps.Add("p", "max(p_d, p_s)", pressure, Dimension.Pressure);
        return new("Uniform pressure of flow, drag method", Flow.DragSource, steps.Done());
    }

    private static void UnitWeight(StepList steps, OpeningModel model)
    {
        steps.Given("ρ", model.UnitWeight / Physics.Gravity, Dimension.Density);
        steps.Given("g", Physics.Gravity, Dimension.Acceleration);
        steps.Add("γ", "ρ·g", model.UnitWeight, Dimension.UnitWeight);
    }
}
