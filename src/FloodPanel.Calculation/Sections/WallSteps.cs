namespace FloodPanel.Calculation.Sections;

/// <summary>Steps that the methods of local buckling share.</summary>
internal static class WallSteps
{
    /// <summary>f_k, f_b, the walls and their slendernesses λ_f = b_f/t_f and λ_w = h_w/t_w.</summary>
    public static StepList Begin(ThinWalls walls, BendingStress stress)
    {
        var steps = new StepList(30);
        stress.Tell(steps);
        steps.Given("b_f", walls.FacePart, Dimension.SectionLength);
        steps.Given("t_f", walls.FaceThickness, Dimension.SectionLength);
        steps.Given("h_w", walls.WebDepth, Dimension.SectionLength);
        steps.Given("t_w", walls.WebThickness, Dimension.SectionLength);
        steps.Add("λ_f", "b_f/t_f", walls.FaceSlenderness, Dimension.Ratio);
        steps.Add("λ_w", "h_w/t_w", walls.WebSlenderness, Dimension.Ratio);
        return steps;
    }
}
