namespace FloodPanel.Calculation.Actions;

/// <summary>How the pressure of moving water came about.</summary>
internal static class FlowWorking
{
    public static Working Of(OpeningModel model)
    {
        var flow = model.Flow!;
        var wetted = Math.Max(0, Math.Min(model.RetainedDepth, model.Height));
        var surchargeDepth = Flow.SurchargeDepth(flow.Velocity, flow.ShapeCoefficient);
        var steps = new StepList(12);
        steps.UnitWeight(model.UnitWeight);
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
}
