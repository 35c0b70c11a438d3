namespace FloodPanel.Calculation.Covers;

/// <summary>Finds what a plate feels most.</summary>
internal static class PlateSearch
{
    private const int Parts = 16;

    /// <summary>Halvings of the step around the best place: 16·2⁹ parts in the end, the peak of a parabola to 1e-8.</summary>
    private const int Halvings = 9;

    /// <summary>The worst of a rectangular plate; the left half says it all.</summary>
    public static PlateResponse Of(RectangularPlate plate)
    {
        var (height, half) = (plate.Height, plate.Width / 2);
        var whole = Greatest(x => MomentsOn(plate.Row(x)), height, half);
        var wet = Greatest(x => MomentsOn(plate.Row(x)), height, half, plate.WaterLine);
        var (moment, down, across) = wet.Value > whole.Value ? wet : whole;
        var (bulge, _, _) = Greatest(x => plate.Row(x).Bulge, height, half);
        var reaction = Math.Max(
            Greatest(x => ReactionOn(plate.Row(x)), height, 0).Value, Greatest(x => ReactionOn(plate.Row(x)), height, 0, plate.WaterLine).Value);
        if (plate.Top == PlateEdge.Supported)
        {
            var edge = plate.Row(0);
            reaction = Math.Max(reaction, Greatest(_ => y => -edge.Shear(y), 0, half).Value);
        }

        if (plate.Bottom == PlateEdge.Supported)
        {
            var edge = plate.Row(height);
            reaction = Math.Max(reaction, Greatest(_ => edge.Shear, 0, half).Value);
        }

        var (upper, lower) = (plate.TopCornerHold, plate.BottomCornerHold);
        return new(moment, down, across, bulge, reaction, Math.Max(0, Math.Max(upper, lower)), Math.Max(0, -Math.Min(upper, lower)), 0);

        static Func<double, double> MomentsOn(PlateRow row) => y => row.Moments(y).Greatest;
        static Func<double, double> ReactionOn(PlateRow row) => _ => row.SideReaction();
    }

    /// <summary>The worst of a circular plate. Across and down are measured from its bounding square, as on a rectangle.</summary>
    public static PlateResponse Of(CircularPlate plate)
    {
        var (moment, @out, angle) = Greatest(r => a => plate.Moments(r, a).Greatest, 1, Math.PI);
        var (bulge, _, _) = Greatest(r => a => plate.Bulge(r, a), 1, Math.PI);
        var fixing = plate.IsClamped ? -plate.Moments(1, 0).Down : 0;
        var (sine, cosine) = Math.SinCos(angle);
        var radius = plate.Radius;
        return new(moment, radius * (1 + @out * cosine), radius * (1 + @out * sine), bulge, plate.Reaction(0), 0, 0, fixing);
    }

    /// <summary>The greatest value between two lines; a strip of water at the foot of a plate has its peak between the lines of the whole plate.</summary>
    private static (double Value, double X, double Y) Greatest(Func<double, Func<double, double>> row, double toX, double toY, double fromX = 0)
    {
        var best = (Value: double.NegativeInfinity, X: 0.0, Y: 0.0);
        var (stepX, stepY) = ((toX - fromX) / Parts, toY / Parts);
        Look(fromX, toX, 0, toY);
        for (var i = 0; i < Halvings; i++)
        {
            (stepX, stepY) = (stepX / 2, stepY / 2);
            Look(best.X - stepX, best.X + stepX, best.Y - stepY, best.Y + stepY);
        }

        return best;

        void Look(double fromX, double endX, double fromY, double endY)
        {
            foreach (var x in Places(fromX, endX, stepX, toX))
            {
                var of = row(x);
                foreach (var y in Places(fromY, endY, stepY, toY))
                {
                    var value = of(y);
                    best = value > best.Value ? (value, x, y) : best;
                }
            }
        }
    }

    private static IEnumerable<double> Places(double from, double to, double step, double most)
    {
        var parts = step > 0 ? (int)Math.Round((to - from) / step) : 0;
        return Enumerable.Range(0, parts + 1).Select(i => Math.Clamp(from + i * step, 0, most));
    }
}
