using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>Floating debris at one opening, resolved to forces. Heights from the sill.</summary>
public sealed class DebrisModel
{
    private readonly DebrisInput input;
    private readonly Member log;
    private readonly double density;
    private readonly double retainedDepth;
    private readonly double[] spans;
    private readonly double[] forces;

    private DebrisModel(DebrisInput input, Member log, double unitWeight, double retainedDepth, double height, double[] spans)
    {
        (this.input, this.log, this.retainedDepth, this.spans) = (input, log, retainedDepth, spans);
        density = unitWeight / Physics.Gravity;
        StrikeHeight = Math.Max(0, Math.Min(retainedDepth, height));
        LogShare = Math.Min(1, log.Section.Height / DebrisImpact.PatchHeight);
        forces = [.. spans.Select(ForceOn)];
        for (var bay = 1; bay < forces.Length; bay++)
        {
            GreatestBay = forces[bay] > forces[GreatestBay] ? bay : GreatestBay;
        }
    }

    /// <summary>Height at which posts and guides take the impact: still water, or the top of a lower barrier [m].</summary>
    public double StrikeHeight { get; }

    /// <summary>Share of the force that falls on one log: its height over the height of the patch, at most 1 [-].</summary>
    public double LogShare { get; }

    /// <summary>The bay with the greatest force, from 0.</summary>
    public int GreatestBay { get; }

    /// <summary>Resolves debris.</summary>
    /// <param name="input">The debris, or null.</param>
    /// <param name="log">The logs.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³].</param>
    /// <param name="retainedDepth">h, still-water depth above the sill [m]; nothing strikes unless it is above zero.</param>
    /// <param name="height">H, vertical height of the barrier [m].</param>
    /// <param name="spans">L, effective span of each bay [m].</param>
    /// <returns>The debris; null when there is none.</returns>
    public static DebrisModel? Of(
        DebrisInput? input, Member log, double unitWeight, double retainedDepth, double height, double[] spans) =>
        input is null ? null : new(input, log, unitWeight, retainedDepth, height, spans);

    /// <summary>F, unfactored force on a log of a bay [N]; it differs where the response follows from the span.</summary>
    /// <param name="bay">Bay from 0.</param>
    public double Force(int bay) => forces[bay];

    /// <summary>True where an object that floats at the water line can strike a log.</summary>
    /// <param name="logBottom">Height of the lower edge of the log [m].</param>
    public bool Strikes(double logBottom) => retainedDepth > 0 && logBottom < retainedDepth + DebrisImpact.PatchHeight / 2;

    /// <summary>How the force on a log of a bay came about.</summary>
    /// <param name="bay">Bay from 0.</param>
    public Working Working(int bay)
    {
        var factors = input.Coefficients;
        var steps = new StepList(24);
        var response = Response(spans[bay], steps);
        steps.Given("C_I", factors.Importance, Dimension.Ratio);
        steps.Given("C_O", factors.Orientation, Dimension.Ratio);
        steps.Given("C_D", factors.Depth, Dimension.Ratio);
        steps.Given("C_B", factors.Blockage, Dimension.Ratio);
        steps.Add("C", "C_I·C_O·C_D·C_B·R_max", DebrisImpact.WithoutResponse(factors) * response, Dimension.Ratio);
        steps.Given("m", input.Mass, Dimension.Mass);
        steps.Given("V", input.Velocity, Dimension.Velocity);
        steps.Add("F", "π·m·V·C/(2·Δt)", Impact(response), Dimension.Force);
        var source = factors.Response is null ? $"{DebrisImpact.Source}; {ResponseRatio.Source}; {NaturalPeriod.Source}" : DebrisImpact.Source;
        return new("Force of debris", source, steps.Done());
    }

    private double ForceOn(double span) =>
        retainedDepth > 0 ? Impact(Response(span, new StepList(16))) : 0;

    private double Impact(double response) => DebrisImpact.Force(
        input.Mass, input.Velocity, input.StoppingTime, DebrisImpact.WithoutResponse(input.Coefficients) * response);

    /// <summary>R_max as given, or from the log's own period, dry and wet, the larger; writes its steps.</summary>
    private double Response(double span, StepList steps)
    {
        var stop = input.StoppingTime;
        steps.Given("Δt", stop, Dimension.Time);
        if (input.Coefficients.Response is { } given)
        {
            steps.Given("R_max", given, Dimension.Ratio);
            return given;
        }

        var (height, lineMass) = (log.Section.Height, log.Material.Density * log.Section.Area);
        var added = NaturalPeriod.AddedMass(density, height);
        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", log.Section.Inertia, Dimension.SecondMoment);
        steps.Given("L", span, Dimension.Length);
        steps.Given("m_l", lineMass, Dimension.LineMass);
        var dry = Period(steps, "d", "m_l", lineMass, span);
        steps.Given("ρ", density, Dimension.Density);
        steps.Given("t", height, Dimension.SectionLength);
        steps.Add("m_w", "π·ρ·t²/4", added, Dimension.LineMass);
        var wet = Period(steps, "w", "(m_l + m_w)", lineMass + added, span);
        steps.Add("R_max", "max(R_d, R_w)", Math.Max(dry, wet), Dimension.Ratio);
        return Math.Max(dry, wet);
    }

    private double Period(StepList steps, string index, string massSymbol, double mass, double span)
    {
        var period = NaturalPeriod.Of(mass, log.Stiffness, span);
        var response = ResponseRatio.Of(input.StoppingTime / period);
        steps.Add($"T_{index}", $"2·L²/π·√({massSymbol}/(E·I))", period, Dimension.Time);
        steps.Add($"r_{index}", $"Δt/T_{index}", input.StoppingTime / period, Dimension.Ratio);
        steps.Given($"R_{index}", response, Dimension.Ratio);
        return response;
    }
}
