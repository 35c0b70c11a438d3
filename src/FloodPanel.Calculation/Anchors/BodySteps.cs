namespace FloodPanel.Calculation.Anchors;

/// <summary>The lines of the concrete bodies that anchors break out.</summary>
internal static class BodySteps
{
    private static readonly string[] EdgeSymbols = ["c_f", "c_p", "c_l", "c_r"];

    /// <summary>h_ef, h′, A_N, A_N0 and ψ_ed of a body in tension; h_ef is given, or has a formula.</summary>
    public static void Write(StepList steps, BreakoutBody body, string embedment = "")
    {
        var edges = body.Layout.Edges(body.Rows);
        steps.Add("h_ef", embedment, body.Embedment, Dimension.SectionLength);
        for (var i = 0; i < edges.Length; i++)
        {
            if (edges[i] is { } edge)
            {
                steps.Given(EdgeSymbols[i], edge, Dimension.SectionLength);
            }
        }

        WriteSpacings(steps, body);
        steps.Add("h′", DepthFormula(body, edges), body.Depth, Dimension.SectionLength);
        string Reach(int i) => edges[i] is null ? "1.5·h′" : $"min(1.5·h′, {EdgeSymbols[i]})";
        var along = body.Layout.PerRow > 1 ? "(n_s − 1)·min(s, 3·h′) + " : "";
        steps.Add("a_1", $"{along}{Reach(2)} + {Reach(3)}", body.Along, Dimension.SectionLength);
        steps.Add("a_2", $"{(body.Rows == 2 ? "min(s_2, 3·h′) + " : "")}{Reach(0)} + {Reach(1)}", body.Across, Dimension.SectionLength);
        steps.Add("A_N", "a_1·a_2", body.Area, Dimension.SectionArea);
        steps.Add("A_N0", "9·h′²", body.SingleArea, Dimension.SectionArea);
        var nearest = body.NearestEdge is { } least ? EdgeSymbols[Array.IndexOf(edges, least)] : "";
        steps.Add("ψ_ed", nearest.Length == 0 ? "" : $"min(1, 0.7 + 0.3·{nearest}/(1.5·h′))", body.EdgeFactor, Dimension.Ratio);
    }

    /// <summary>c_1, A_V, A_V0, ψ_ed and ψ_h of a body at an edge; the sides weaken it unless it is left out.</summary>
    public static void Write(StepList steps, EdgeBody body, bool countsSides)
    {
        steps.Given("c_e", body.Edge, Dimension.SectionLength);
        steps.Given("h", body.Thickness, Dimension.SectionLength);
        if (body.Count > 1)
        {
            steps.Given("n_e", body.Count, Dimension.Count);
            steps.Given("s", body.Spacing, Dimension.SectionLength);
        }

        (string Symbol, double? Value)[] sides = [("c_2", body.Side), ("c_3", body.OtherSide)];
        foreach (var (symbol, value) in sides)
        {
            if (value is { } there)
            {
                steps.Given(symbol, there, Dimension.SectionLength);
            }
        }

        var spread = body.Count > 1 ? "max(max(c_2, c_3)/1.5, max(h/1.5, s/3))" : "max(max(c_2, c_3)/1.5, h/1.5)";
        steps.Add("c_1", body.IsNarrow ? $"min(c_e, {spread})" : "c_e", body.EdgeDistance, Dimension.SectionLength);
        string Reach((string Symbol, double? Value) side) => side.Value is null ? "1.5·c_1" : $"min(1.5·c_1, {side.Symbol})";
        var along = body.Count > 1 ? "(n_e − 1)·min(s, 3·c_1) + " : "";
        steps.Add("b_V", $"{along}{Reach(sides[0])} + {Reach(sides[1])}", body.Width, Dimension.SectionLength);
        steps.Add("A_V", "b_V·min(1.5·c_1, h)", body.Area, Dimension.SectionArea);
        steps.Add("A_V0", "4.5·c_1²", body.SingleArea, Dimension.SectionArea);
        steps.Add("ψ_ed", countsSides ? SideFormula(body) : "", countsSides ? body.SideFactor : 1, Dimension.Ratio);
        steps.Add("ψ_h", "max(1, √(1.5·c_1/h))", body.ThicknessFactor, Dimension.Ratio);
    }

    private static void WriteSpacings(StepList steps, BreakoutBody body)
    {
        if (body.Layout.PerRow > 1)
        {
            steps.Given("n_s", body.Layout.PerRow, Dimension.Count);
            steps.Given("s", body.Layout.Spacing, Dimension.SectionLength);
        }

        if (body.Rows == 2)
        {
            steps.Given("s_2", body.Layout.RowSpacing, Dimension.SectionLength);
        }
    }

    private static string DepthFormula(BreakoutBody body, double?[] edges)
    {
        if (body.GreatestNearEdge is not { } greatest)
        {
            return "h_ef";
        }

        var edge = $"{EdgeSymbols[Array.IndexOf(edges, greatest)]}/1.5";
        return (body.Layout.PerRow > 1, body.Rows == 2) switch
        {
            (true, true) => $"min(h_ef, max({edge}, max(s, s_2)/3))",
            (true, false) => $"min(h_ef, max({edge}, s/3))",
            (false, true) => $"min(h_ef, max({edge}, s_2/3))",
            (false, false) => $"min(h_ef, {edge})",
        };
    }

    private static string SideFormula(EdgeBody body) => (body.Side, body.OtherSide) switch
    {
        (null, null) => "",
        ({ }, null) => "min(1, 0.7 + 0.3·c_2/(1.5·c_1))",
        (null, { }) => "min(1, 0.7 + 0.3·c_3/(1.5·c_1))",
        _ => "min(1, 0.7 + 0.3·min(c_2, c_3)/(1.5·c_1))",
    };
}
