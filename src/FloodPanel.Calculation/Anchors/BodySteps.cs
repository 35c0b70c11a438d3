namespace FloodPanel.Calculation.Anchors;

/// <summary>The lines of the concrete bodies that anchors break out.</summary>
internal static class BodySteps
{
    /// <summary>A, A_0 and ψ_ed of a body in tension.</summary>
    public static void Write(StepList steps, AnchorLayout layout, int rows, BreakoutBody body)
    {
        var edges = layout.Edges(rows);
        string[] symbols = ["c_f", "c_p", "c_l", "c_r"];
        steps.Given("h_ef", body.Depth, Dimension.SectionLength);
        steps.Given("n_s", layout.PerRow, Dimension.Count);
        steps.Given("s", layout.Spacing, Dimension.SectionLength);
        for (var i = 0; i < edges.Length; i++)
        {
            if (edges[i] is { } edge)
            {
                steps.Given(symbols[i], edge, Dimension.SectionLength);
            }
        }

        string Reach(int i) => edges[i] is null ? "1.5·h_ef" : $"min(1.5·h_ef, {symbols[i]})";
        steps.Add("a_1", $"(n_s − 1)·min(s, 3·h_ef) + {Reach(2)} + {Reach(3)}", body.Along, Dimension.SectionLength);
        if (rows == 2)
        {
            steps.Given("s_2", layout.RowSpacing, Dimension.SectionLength);
        }

        steps.Add("a_2", $"{(rows == 2 ? "min(s_2, 3·h_ef) + " : "")}{Reach(0)} + {Reach(1)}", body.Across, Dimension.SectionLength);
        steps.Add("A_N", "a_1·a_2", body.Area, Dimension.SectionArea);
        steps.Add("A_N0", "9·h_ef²", body.SingleArea, Dimension.SectionArea);
        if (body.NearestEdge is { } nearest)
        {
            steps.Given("c_min", nearest, Dimension.SectionLength);
        }

        steps.Add("ψ_ed", body.NearestEdge is null ? "" : "min(1, 0.7 + 0.3·c_min/(1.5·h_ef))", body.EdgeFactor, Dimension.Ratio);
    }

    /// <summary>A_V, A_V0, ψ_ed and ψ_h of a body at an edge.</summary>
    public static void Write(StepList steps, EdgeBody body)
    {
        steps.Given("c_1", body.EdgeDistance, Dimension.SectionLength);
        steps.Given("b_V", body.Width, Dimension.SectionLength);
        steps.Given("h", body.Thickness, Dimension.SectionLength);
        steps.Add("A_V", "b_V·min(1.5·c_1, h)", body.Area, Dimension.SectionArea);
        steps.Add("A_V0", "4.5·c_1²", body.SingleArea, Dimension.SectionArea);
        if (body.NearestSide is { } side)
        {
            steps.Given("c_2", side, Dimension.SectionLength);
        }

        steps.Add("ψ_ed", body.NearestSide is null ? "" : "min(1, 0.7 + 0.3·c_2/(1.5·c_1))", body.SideFactor, Dimension.Ratio);
        steps.Add("ψ_h", "max(1, √(1.5·c_1/h))", body.ThicknessFactor, Dimension.Ratio);
    }
}
