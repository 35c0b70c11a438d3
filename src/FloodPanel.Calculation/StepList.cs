using FloodPanel.Calculation.Materials;

namespace FloodPanel.Calculation;

/// <summary>Collects the steps of a check in order.</summary>
/// <param name="capacity">Steps expected [-].</param>
internal readonly ref struct StepList(int capacity)
{
    private readonly List<CalculationStep> steps = new(capacity);

    public List<CalculationStep> Steps => steps;

    public void Given(string symbol, double value, Dimension dimension) => steps.Add(new(symbol, "", value, dimension));

    public void Add(string symbol, string formula, double value, Dimension dimension) =>
        steps.Add(new(symbol, formula, value, dimension));

    /// <summary>ρ, g and γ = ρ·g, unit weight of water.</summary>
    public void UnitWeight(double unitWeight)
    {
        Given("ρ", unitWeight / Physics.Gravity, Dimension.Density);
        Given("g", Physics.Gravity, Dimension.Acceleration);
        Add("γ", "ρ·g", unitWeight, Dimension.UnitWeight);
    }

    /// <summary>b, e and L = b + e, the effective span of a log.</summary>
    public void Span(double clearBay, double endBearing)
    {
        Given("b", clearBay, Dimension.Length);
        Given("e", endBearing, Dimension.SectionLength);
        Add("L", "b + e", clearBay + endBearing, Dimension.Length);
    }

    /// <summary>A design stress: typed, or from the characteristic strength f_k.</summary>
    public void Stress(string symbol, DesignStress stress)
    {
        if (stress.Strength is { } strength)
        {
            Given("f_k", strength, Dimension.Stress);
            steps.AddRange(stress.Factors);
        }

        Add(symbol, stress.Formula, stress.Value, Dimension.Stress);
    }

    public IReadOnlyList<CalculationStep> Done() => steps;
}
