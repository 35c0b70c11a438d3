namespace FloodPanel.Calculation.Footings;

/// <summary>The lines that several checks of a footing share.</summary>
internal static class FootingSteps
{
    /// <summary>Weights, uplift and N.</summary>
    public static StepList Vertical(ProjectTree.FootingInput footing, FootingLoads forces, FootingStability state)
    {
        var (load, isWet) = (state.Load, state.Load.Depth > 0);
        var steps = new StepList(36);
        steps.UnitWeight(load.UnitWeight);
        steps.Given("ℓ", load.Length, Dimension.Length);
        forces.Write(steps);
        steps.Given("h", load.Depth, Dimension.Length);
        steps.Given("h_d", load.Behind, Dimension.Length);
        steps.Given("B", footing.Width, Dimension.Length);
        steps.Given("D", footing.Thickness, Dimension.Length);
        steps.Given("x_b", footing.BarrierFromFloodEdge, Dimension.Length);
        steps.Given("ρ_c", footing.Density, Dimension.Density);
        steps.Add("W", "ρ_c·g·B·D·ℓ", state.Weight, Dimension.Force);
        steps.Add("W_h", "γ·h·x_b·ℓ", state.WaterOnHeel, Dimension.Force);
        steps.Add("W_t", "γ·h_d·(B − x_b)·ℓ", state.WaterOnToe, Dimension.Force);
        steps.Add("p_u", isWet ? "γ·(h + D)" : "", isWet ? load.UnitWeight * (load.Depth + footing.Thickness) : 0, Dimension.Pressure);
        steps.Add("p_d", isWet ? "γ·(h_d + D)" : "", isWet ? load.UnitWeight * (load.Behind + footing.Thickness) : 0, Dimension.Pressure);
        steps.Given("c", state.Contact, Dimension.Length);
        steps.Add("U", "ℓ·(p_u·(B − c) + (p_u + p_d)/2·c)", state.Uplift, Dimension.Force);
        steps.Add("N", "W + W_h + W_t − U", state.Vertical, Dimension.Force);
        return steps;
    }

    /// <summary>H, with the water on the side of the footing.</summary>
    public static void Driving(StepList steps, FootingStability state) =>
        steps.Add("H", "H_0 + γ·(h − h_d)·D·ℓ", state.Driving, Dimension.Force);

    /// <summary>Moments about the toe.</summary>
    public static void Moments(StepList steps, FootingStability state)
    {
        steps.Add("M_U", "ℓ·(p_u·(B − c)·(B + c)/2 + c²·(p_d/6 + p_u/3))", state.UpliftMoment, Dimension.Moment);
        steps.Add("M_o", "M_0 + H_0·D + γ·(h − h_d)·D²/2·ℓ + M_U", state.Overturning, Dimension.Moment);
        steps.Add("M_r", "W·B/2 + W_h·(B − x_b/2) + W_t·(B − x_b)/2", state.Resisting, Dimension.Moment);
    }
}
