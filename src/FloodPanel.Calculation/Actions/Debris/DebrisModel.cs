using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>Floating debris at one opening, resolved to forces. Heights from the sill.</summary>
public sealed class DebrisModel
{
    private readonly double retainedDepth;
    private readonly DebrisResponse[] responses;
    private readonly double[] spans;
    private readonly double[] forces;

    private DebrisModel(
        DebrisInput input, IReadOnlyList<Member> logs, double unitWeight, double retainedDepth, double height, double[] spans)
    {
        (Input, this.retainedDepth, this.spans) = (input, retainedDepth, spans);
        responses = [.. logs.Select(log => new DebrisResponse(input, log, unitWeight / Physics.Gravity))];
        StrikeHeight = Math.Max(0, Math.Min(retainedDepth, height));
        forces = [.. spans.Select(ForceOn)];
        for (var bay = 1; bay < forces.Length; bay++)
        {
            GreatestBay = forces[bay] > forces[GreatestBay] ? bay : GreatestBay;
        }
    }

    /// <summary>The debris as entered.</summary>
    public DebrisInput Input { get; }

    /// <summary>True when the sill stays dry in the design flood: then nothing is struck.</summary>
    public bool IsDry => !(retainedDepth > 0);

    /// <summary>Height at which posts and guides take the impact: still water, or the top of a lower barrier [m].</summary>
    public double StrikeHeight { get; }

    /// <summary>The bay with the greatest force, from 0.</summary>
    public int GreatestBay { get; }

    /// <summary>Resolves debris.</summary>
    /// <param name="input">The debris, or null.</param>
    /// <param name="logs">One of each kind of log; the greatest response counts for all.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³].</param>
    /// <param name="retainedDepth">h, still-water depth above the sill [m]; nothing strikes unless it is above zero.</param>
    /// <param name="height">H, vertical height of the barrier [m].</param>
    /// <param name="spans">L, effective span of each bay [m].</param>
    /// <returns>The debris; null when there is none.</returns>
    public static DebrisModel? Of(
        DebrisInput? input, IReadOnlyList<Member> logs, double unitWeight, double retainedDepth, double height, double[] spans) =>
        input is null ? null : new(input, logs, unitWeight, retainedDepth, height, spans);

    /// <summary>Share of the force that falls on one log: its height over the height of the patch, at most 1 [-].</summary>
    /// <param name="logHeight">t, height of the log [m], > 0.</param>
    public static double Share(double logHeight) => Math.Min(1, logHeight / DebrisImpact.PatchHeight);

    /// <summary>F, unfactored force on a log of a bay [N]; it differs where the response follows from the span.</summary>
    /// <param name="bay">Bay from 0.</param>
    public double Force(int bay) => forces[bay];

    /// <summary>True where an object that floats at the water line can strike a log.</summary>
    /// <param name="logBottom">Height of the lower edge of the log [m].</param>
    public bool Strikes(double logBottom) => !IsDry && logBottom < retainedDepth + DebrisImpact.PatchHeight / 2;

    /// <summary>How the force on a log of a bay came about.</summary>
    /// <param name="bay">Bay from 0.</param>
    public Working Working(int bay)
    {
        var factors = Input.Coefficients;
        var steps = new StepList(DebrisResponse.MostSteps + 9);
        steps.Given("Δt", Input.StoppingTime, Dimension.Time);
        var response = Governing(spans[bay]);
        response.Write(steps, spans[bay]);
        steps.Given("C_I", factors.Importance, Dimension.Ratio);
        steps.Given("C_O", factors.Orientation, Dimension.Ratio);
        steps.Given("C_D", factors.Depth, Dimension.Ratio);
        steps.Given("C_B", factors.Blockage, Dimension.Ratio);
        steps.Add("C", "C_I·C_O·C_D·C_B·R_max", Product(spans[bay]), Dimension.Ratio);
        steps.Given("m", Input.Mass, Dimension.Mass);
        steps.Given("V", Input.Velocity, Dimension.Velocity);
        steps.Add("F", "π·m·V·C/(2·Δt)", Impact(spans[bay]), Dimension.Force);
        var source = response.Source is { } derived ? $"{DebrisImpact.Source}; {derived}" : DebrisImpact.Source;
        return new("Force of debris", source, steps.Done());
    }

    private double ForceOn(double span) => IsDry ? 0 : Impact(span);

    private double Product(double span) => DebrisImpact.WithoutResponse(Input.Coefficients) * Governing(span).Of(span);

    private DebrisResponse Governing(double span) => responses.MaxBy(response => response.Of(span))!;

    private double Impact(double span) =>
        DebrisImpact.Force(Input.Mass, Input.Velocity, Input.StoppingTime, Product(span));
}
