using FloodPanel.Calculation;

namespace FloodPanel.Benchmarks;

/// <summary>
/// The same formulas as the calculation, for this one opening, written out in one plain loop: the yardstick. It
/// knows that the face is vertical and that the actions are still water on both sides and flow.
/// </summary>
internal sealed class HandInlined
{
    private readonly double gamma, depth, behind, height, logHeight, bearing, surcharge;
    private readonly double logStiffness, logMoment, logShear, logLimit;
    private readonly double postStiffness, postMoment, postShear, postLimit, postWidth;
    private readonly double[] bays;
    private readonly int count;

    public HandInlined(OpeningModel model)
    {
        var flow = model.Flow!;
        (gamma, depth, behind, height) = (model.UnitWeight, model.RetainedDepth, model.ProtectedDepth, model.Height);
        surcharge = gamma * flow.ShapeCoefficient * flow.Velocity * flow.Velocity / (2 * Physics.Gravity);
        (logHeight, bearing, count, bays) = (model.LogMember(0).Section.Height, model.EndBearing, model.LogCount, [.. model.Bays]);
        (logStiffness, logMoment, logShear, logLimit) =
            (model.LogMember(0).Stiffness, model.LogMember(0).MomentResistance, model.LogMember(0).ShearResistance, model.LogMember(0).DeflectionLimit);
        (postStiffness, postMoment, postShear, postLimit, postWidth) =
            (model.Post!.Stiffness, model.Post.MomentResistance, model.Post.ShearResistance, model.Post.DeflectionLimit, model.PostWidth);
        Logs = new Log[count * bays.Length];
        Posts = new Post[bays.Length - 1];
    }

    public Log[] Logs { get; }

    public Post[] Posts { get; }

    public double Left { get; private set; }

    public double Right { get; private set; }

    public double LeftPeak { get; private set; }

    public double RightPeak { get; private set; }

    public void DesignFlood() => Fill(depth, behind, surcharge);

    public void BrimFull() => Fill(height, 0, 0);

    private void Fill(double h, double back, double flow)
    {
        var wetted = Math.Min(h, height);
        var (sum, peak) = (0.0, 0.0);
        for (var i = 0; i < count; i++)
        {
            var a = i * logHeight;
            var b = (i + 1) * logHeight;
            var w = 0.0;
            if (a < wetted)
            {
                var top = Math.Min(b, wetted);
                w = gamma * (h - (a + top) / 2) * (top - a) + flow * (top - a);
                if (a < back)
                {
                    var c = Math.Min(b, back);
                    w -= gamma * (back - (a + c) / 2) * (c - a);
                }
            }

            sum += w;
            peak = Math.Max(peak, w);
            for (var bay = 0; bay < bays.Length; bay++)
            {
                var span = bays[bay] + bearing;
                var moment = w * span * span / 8;
                var shear = w * span / 2;
                var deflection = 5 * w * span * span * span * span / (384 * logStiffness);
                Logs[bay * count + i] = new(
                    w, moment, shear, deflection, moment / logMoment, shear / logShear, deflection / (span / logLimit));
            }
        }

        for (var post = 0; post < Posts.Length; post++)
        {
            Posts[post] = Cantilever((bays[post] + bays[post + 1]) / 2 + postWidth, h, back, flow, wetted);
        }

        (Left, Right) = (sum * (bays[0] / 2 + bearing), sum * (bays[^1] / 2 + bearing));
        (LeftPeak, RightPeak) =
            (peak * (bays[0] / 2 + bearing) / logHeight, peak * (bays[^1] / 2 + bearing) / logHeight);
    }

    private Post Cantilever(double width, double h, double back, double flow, double wetted)
    {
        // Water no higher than the barrier, as in both cases here: triangles h and back, and a uniform band.
        var shear = width * (gamma * (h * h - back * back) / 2 + flow * wetted);
        var moment = width * (gamma * (h * h * h - back * back * back) / 6 + flow * wetted * wetted / 2);
        var deflection = width / postStiffness * (Tip(h) * gamma - Tip(back) * gamma
            + flow * wetted * wetted * wetted * (wetted / 8 + (height - wetted) / 6));
        return new(
            shear, moment, deflection, moment / postMoment, shear / postShear, deflection / (height / postLimit));

        double Tip(double d) => d * d * d * d * (d / 30 + (height - d) / 24);
    }

    internal readonly record struct Log(
        double Load, double Moment, double Shear, double Deflection, double Bending, double ShearUse, double DeflectionUse);

    internal readonly record struct Post(
        double Shear, double Moment, double Deflection, double Bending, double ShearUse, double DeflectionUse);
}
