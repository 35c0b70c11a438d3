using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>R_max of a log: as typed, or from the log's own period, dry and with the water that it moves, the larger.</summary>
/// <param name="input">The debris.</param>
/// <param name="log">The logs.</param>
/// <param name="density">ρ, water density [kg/m³].</param>
internal sealed class DebrisResponse(DebrisInput input, Member log, double density)
{
    /// <summary>Steps that a derived response takes at most in the working [-].</summary>
    public const int MostSteps = 22;

    private readonly double lineMass = log.Material.Density * log.Section.Area;
    private readonly double addedMass = NaturalPeriod.AddedMass(density, log.Section.Height);

    /// <summary>Sources, as printed; null where the response is typed.</summary>
    public string? Source => input.Coefficients.Response is null
        ? $"{ResponseRatio.Source}, which stands beside it as S; {NaturalPeriod.Source}"
        : null;

    /// <summary>R_max [-].</summary>
    /// <param name="span">L, effective span [m].</param>
    public double Of(double span) =>
        input.Coefficients.Response ?? Math.Max(AtMass(lineMass, span), AtMass(lineMass + addedMass, span));

    /// <summary>Writes how R_max came about.</summary>
    /// <param name="steps">The steps; Δt stands there already.</param>
    /// <param name="span">L, effective span [m].</param>
    public void Write(StepList steps, double span)
    {
        if (input.Coefficients.Response is { } given)
        {
            steps.Given("R_max", given, Dimension.Ratio);
            return;
        }

        steps.Given("E", log.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", log.Section.Inertia, Dimension.SecondMoment);
        steps.Given("L", span, Dimension.Length);
        steps.Given("m_l", lineMass, Dimension.LineMass);
        Period(steps, "d", "m_l", lineMass, span);
        steps.Given("ρ", density, Dimension.Density);
        steps.Given("t", log.Section.Height, Dimension.SectionLength);
        steps.Add("m_w", "π·ρ·t²/4", addedMass, Dimension.LineMass);
        Period(steps, "w", "(m_l + m_w)", lineMass + addedMass, span);
        steps.Add("R_max", "max(R_d, R_w)", Of(span), Dimension.Ratio);
    }

    private double AtMass(double mass, double span) =>
        ResponseRatio.Of(input.StoppingTime / NaturalPeriod.Of(mass, log.Stiffness, span));

    /// <summary>T, r = Δt/T, R straight between two rows of the table, and S, the exact value to hold R against.</summary>
    private void Period(StepList steps, string index, string massSymbol, double mass, double span)
    {
        var period = NaturalPeriod.Of(mass, log.Stiffness, span);
        var (ratio, r) = (input.StoppingTime / period, $"r_{index}");
        steps.Add($"T_{index}", $"2·L²/π·√({massSymbol}/(E·I))", period, Dimension.Time);
        steps.Add(r, $"Δt/T_{index}", ratio, Dimension.Ratio);
        if (ResponseRatio.RowAt(ratio) is { } row)
        {
            steps.Given($"{r}1", row.Ratio, Dimension.Ratio);
            steps.Given($"R_{index}1", row.Response, Dimension.Ratio);
            steps.Given($"R_{index}2", row.Next, Dimension.Ratio);
            steps.Add(
                $"R_{index}", $"R_{index}1 + (R_{index}2 − R_{index}1)·({r} − {r}1)/0.1", ResponseRatio.Of(ratio), Dimension.Ratio);
        }
        else
        {
            steps.Given($"R_{index}", ResponseRatio.Of(ratio), Dimension.Ratio);
        }

        steps.Add($"S_{index}", ResponseRatio.HalfSineFormula(ratio, r), ResponseRatio.HalfSine(ratio), Dimension.Ratio);
    }
}
