namespace FloodPanel.Calculation.Posts;

/// <summary>
/// Tightness at the ends of the logs: a post whose tip moves while the guide stands still turns the log in plan, and its end comes out of the seat.
/// </summary>
public static class PostDrift
{
    /// <summary>Bearing that a log loses at one end, δ²/(2·L) + D·δ/L.</summary>
    /// <param name="drift">δ, how far one end moves against the other in the direction of the water [m], ≥ 0.</param>
    /// <param name="span">L, span of the log [m], > 0.</param>
    /// <param name="depth">D, depth of the log [m], ≥ 0.</param>
    /// <returns>[m].</returns>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: geometry: the chord is shorter than the log by δ²/(2·L), and the face that bears turns by δ/L about the other face.</remarks>
    public static double LostBearing(double drift, double span, double depth)
    {
        Guard.NonNegative(drift);
        Guard.Positive(span);
        Guard.NonNegative(depth);

        return drift * drift / (2 * span) + depth * drift / span;
    }

    /// <summary>The worst of the two bays beside a post against what bears when a log lies at one end of its play.</summary>
    internal static Check Of(OpeningModel model, int post, in PostResponse response)
    {
        var span = Math.Min(model.Span(post), model.Span(post + 1));
        var depth = model.Runs.Max(run => run.Log.Section.Depth);
        var (bearing, play) = (model.EndBearing, model.Opening.Barrier.Logs.FittingClearance);
        var drift = Math.Abs(response.TipDeflection);
        var lost = LostBearing(drift, span, depth);
        var steps = new StepList(9);
        steps.Given("δ", drift, Dimension.Deflection);
        steps.Given("L", span, Dimension.Length);
        steps.Given("D", depth, Dimension.SectionLength);
        steps.Add("s", "δ²/(2·L) + D·δ/L", lost, Dimension.SectionLength);
        steps.Given("e", bearing, Dimension.SectionLength);
        steps.Given("c", play, Dimension.SectionLength);
        steps.Add("s_lim", "e − c", bearing - play, Dimension.SectionLength);
        steps.Add("u", "s/s_lim", lost / (bearing - play), Dimension.Ratio);
        return new(
            "post-drift", "Log bearing lost to post drift", "Geometry of a log between a guide that stands and a post that moves",
            Dimension.Deflection, lost, bearing - play, steps.Done());
    }
}
