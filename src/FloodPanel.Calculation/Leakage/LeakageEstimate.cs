using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Leakage;

/// <summary>What leaks, what rains, and the pump.</summary>
/// <param name="WidthLength">Length by the convention of the width [m].</param>
/// <param name="SealLength">Length by the convention of the wetted seal [m].</param>
/// <param name="Leak">Leakage through the seals [m³/s].</param>
/// <param name="Rain">Runoff of rain behind the barrier [m³/s].</param>
/// <param name="Pump">Pump flow with its margin [m³/s].</param>
/// <param name="TimeToFill">Time in which the sump fills without a pump [s]; null without a sump or an inflow.</param>
/// <param name="Working">How they came about.</param>
public sealed record LeakageResult(
    double WidthLength, double SealLength, double Leak, double Rain, double Pump, double? TimeToFill, Working Working);

/// <summary>Leakage by length of seal, rain by the rational method, pump flow.</summary>
public static class LeakageEstimate
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Leak rate times length; rational method Q = C·i·A (FHWA HEC-22, chapter 3)";

    /// <summary>Q = C·i·A, runoff by the rational method [m³/s].</summary>
    /// <param name="coefficient">C, runoff coefficient [-], 0 to 1.</param>
    /// <param name="intensity">i, rain intensity [m/s], ≥ 0.</param>
    /// <param name="area">A, area that drains [m²], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: FHWA HEC-22. Limits: small areas that are wet all over within the time of the rain.</remarks>
    public static double Runoff(double coefficient, double intensity, double area)
    {
        Guard.InRange(coefficient, 0, 1);
        Guard.NonNegative(intensity);
        Guard.NonNegative(area);

        return coefficient * intensity * area;
    }

    /// <summary>Length of wetted seal: sill and both sides of each bay [m].</summary>
    /// <param name="bays">Clear bays [m].</param>
    /// <param name="wetted">Wetted length of a side, along the face [m], ≥ 0.</param>
    /// <remarks>Joints between logs are not part of either published convention and leak besides.</remarks>
    public static double SealLength(ValueList<double> bays, double wetted)
    {
        Guard.NonNegative(wetted);

        var sum = 0.0;
        foreach (var bay in bays.AsSpan())
        {
            sum += bay + 2 * wetted;
        }

        return sum;
    }

    /// <summary>The estimate of an opening; null where none is asked for.</summary>
    internal static LeakageResult? Of(LeakageInput? input, OpeningModel model)
    {
        if (input is null)
        {
            return null;
        }

        var wetted = Math.Max(0, Math.Min(model.RetainedDepth, model.Height)) / model.CosRake;
        var (width, seal) = (wetted > 0 ? model.ClearWidth : 0, wetted > 0 ? SealLength(model.Bays, wetted) : 0);
        var length = input.Convention == LeakConvention.Width ? width : seal;
        var leak = input.Rate * length;
        var rain = Runoff(input.RunoffCoefficient, input.RainIntensity, input.RainArea);
        var inflow = leak + rain;
        double? fill = input.SumpVolume > 0 && inflow > 0 ? input.SumpVolume / inflow : null;
        var steps = Steps(input, model, wetted, length);
        steps.Add("Q_l", "q·l", leak, Dimension.FlowRate);
        steps.Given("C", input.RunoffCoefficient, Dimension.Ratio);
        steps.Given("i", input.RainIntensity, Dimension.RainIntensity);
        steps.Given("A", input.RainArea, Dimension.Area);
        steps.Add("Q_r", "C·i·A", rain, Dimension.FlowRate);
        if (fill is { } time)
        {
            steps.Given("S", input.SumpVolume, Dimension.Volume);
            steps.Add("t_S", "S/(Q_l + Q_r)", time, Dimension.Time);
        }

        steps.Given("k", input.PumpMargin, Dimension.Ratio);
        steps.Add("Q_p", "k·(Q_l + Q_r)", input.PumpMargin * inflow, Dimension.FlowRate);
        return new(width, seal, leak, rain, input.PumpMargin * inflow, fill, new("Leakage, rain and pump", Source, steps.Done()));
    }

    private static StepList Steps(LeakageInput input, OpeningModel model, double wetted, double length)
    {
        var steps = new StepList(20);
        if (input.Convention == LeakConvention.Width || wetted == 0)
        {
            steps.Given("l", length, Dimension.Length);
        }
        else
        {
            steps.Given("b_sum", model.Bays.Sum(), Dimension.Length);
            steps.Given("n_b", model.Bays.Count, Dimension.Count);
            steps.Given("h_s", wetted, Dimension.Length);
            steps.Add("l", "b_sum + 2·n_b·h_s", length, Dimension.Length);
        }

        steps.Given("q", input.Rate, Dimension.LeakRate);
        return steps;
    }
}
