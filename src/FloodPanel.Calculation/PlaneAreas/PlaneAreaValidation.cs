using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>Finds what cannot be calculated in a plane area.</summary>
internal static class PlaneAreaValidation
{
    public static IReadOnlyList<InputProblem> Problems(PlaneAreaInput input)
    {
        var problems = new ProblemList();
        problems.CheckAt(PlaneAreaFields.Inclination, input.InclinationDegrees, "inclination");
        problems.CheckAt(PlaneAreaFields.Depth, input.Depth, "depth");
        problems.CheckAt(Fields.WaterDensity, input.WaterDensity, "waterDensity");
        switch (input.Shape)
        {
            case CircleShape circle:
                problems.CheckAt(PlaneAreaFields.Diameter, circle.Diameter, "diameter");
                break;
            case SegmentShape segment:
                Segment(segment, problems);
                break;
            case TrapezoidShape trapezoid:
                Trapezoid(trapezoid, problems);
                break;
            case PolygonShape polygon:
                Polygon(polygon.Corners, problems);
                break;
        }

        return problems.Problems;
    }

    private static void Segment(SegmentShape segment, ProblemList problems)
    {
        if (problems.CheckAt(PlaneAreaFields.Diameter, segment.Diameter, "diameter")
            && problems.CheckAt(PlaneAreaFields.Height, segment.Height, "height")
            && segment.Height >= segment.Diameter)
        {
            problems.Add("height", $"Height is {new Quantity(segment.Height, Dimension.Length):typed}; allowed is below the diameter, {new Quantity(segment.Diameter, Dimension.Length):typed}.");
        }
    }

    private static void Trapezoid(TrapezoidShape trapezoid, ProblemList problems)
    {
        problems.CheckAt(PlaneAreaFields.Height, trapezoid.Height, "height");
        if (problems.CheckAt(PlaneAreaFields.Bottom, trapezoid.Bottom, "bottom")
            & problems.CheckAt(PlaneAreaFields.Top, trapezoid.Top, "top")
            && trapezoid.Bottom + trapezoid.Top == 0)
        {
            problems.Add("bottom", $"Lower and upper side are both 0; one of them must have a width.");
        }
    }

    private static void Polygon(ValueList<PlanePoint> corners, ProblemList problems)
    {
        if (corners.Count is < 3 or > PlaneAreaFields.MostCorners)
        {
            problems.Add("corners", $"The polygon has {corners.Count} corners; allowed are 3 to {PlaneAreaFields.MostCorners}.");
            return;
        }

        var finite = true;
        for (var i = 0; i < corners.Count; i++)
        {
            finite &= problems.CheckAt(PlaneAreaFields.Across, corners[i].X, $"corners[{i}].x");
            finite &= problems.CheckAt(PlaneAreaFields.Up, corners[i].S, $"corners[{i}].s");
        }

        if (finite)
        {
            Crossings(corners, problems);
        }
    }

    /// <summary>The first pair of sides that meet elsewhere than at their common corner; else an area of nothing.</summary>
    private static void Crossings(ValueList<PlanePoint> corners, ProblemList problems)
    {
        var count = corners.Count;
        for (var i = 0; i < count; i++)
        {
            for (var j = i + 1; j < count; j++)
            {
                var neighbours = j == i + 1 || (i == 0 && j == count - 1);
                if (!neighbours && Meet(corners[i], corners[(i + 1) % count], corners[j], corners[(j + 1) % count]))
                {
                    problems.Add("corners", $"The side from corner {i + 1} meets the side from corner {j + 1}; enter the corners in order, so that the sides do not cross.");
                    return;
                }
            }
        }

        if (!(Outline.Of(new PolygonShape(corners)).Below(double.PositiveInfinity).Area > 1e-9))
        {
            problems.Add("corners", $"The corners enclose no area; move one of them aside.");
        }
    }

    private static bool Meet(PlanePoint a, PlanePoint b, PlanePoint c, PlanePoint d) =>
        Turn(a, b, c) * Turn(a, b, d) <= 0 && Turn(c, d, a) * Turn(c, d, b) <= 0
        && Math.Max(a.X, b.X) >= Math.Min(c.X, d.X) && Math.Max(c.X, d.X) >= Math.Min(a.X, b.X)
        && Math.Max(a.S, b.S) >= Math.Min(c.S, d.S) && Math.Max(c.S, d.S) >= Math.Min(a.S, b.S);

    private static double Turn(PlanePoint a, PlanePoint b, PlanePoint c) =>
        Math.Sign((b.X - a.X) * (c.S - a.S) - (b.S - a.S) * (c.X - a.X));
}
