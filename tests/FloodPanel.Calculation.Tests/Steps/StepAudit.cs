namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>Works the steps of a check out again, line by line.</summary>
internal static class StepAudit
{
    /// <summary>Allowed difference between a printed value and its formula, relative.</summary>
    private const double Tolerance = 1e-9;

    /// <summary>Rounding allowed where a formula takes differences, relative to the terms.</summary>
    private const double Rounding = 1e-13;

    /// <summary>Depths between levels are rounded to this [m], see FloodLevels.Depth.</summary>
    private const double LevelRounding = 1e-10;

    /// <summary>Less of a ratio has no meaning: the share of a wave at the bed, many wavelengths down, hangs on the last digit of the depth.</summary>
    private const double RatioRounding = 1e-12;

    /// <summary>What is wrong with the steps; empty when nothing is.</summary>
    public static IEnumerable<string> Complaints(string title, IReadOnlyList<CalculationStep> steps)
    {
        if (steps.Count == 0)
        {
            yield return $"{title}: no steps";
        }

        var known = new Dictionary<string, Measured>();
        foreach (var step in steps)
        {
            if (Complaint(step, known) is { } complaint)
            {
                yield return $"{title}: {step.Symbol} = {step.Formula} = {step.Value:R}: {complaint}";
            }

            var unit = Exponents.Of(step.Dimension);
            if (!known.TryAdd(step.Symbol, new(step.Value, Math.Abs(step.Value), unit)))
            {
                yield return $"{title}: {step.Symbol} stands there twice";
            }
        }
    }

    /// <summary>Steps of a check: besides, demand, capacity and utilisation stand among them.</summary>
    public static IEnumerable<string> Complaints(Check check)
    {
        foreach (var value in new[] { check.Demand, check.Capacity, check.Utilisation }.Where(v => !Stands(check, v)))
        {
            yield return $"{check.Name}: {value:R} is not the value of a step";
        }

        foreach (var complaint in Complaints(check.Name, check.Steps))
        {
            yield return complaint;
        }
    }

    private static bool Stands(Check check, double value) =>
        check.Steps.Any(s => Math.Abs(s.Value - value) <= 1e-15 * Math.Abs(value))
        || (check.Name == "freeboard" && value == check.Capacity);

    private static string? Complaint(CalculationStep step, Dictionary<string, Measured> known)
    {
        if (!double.IsFinite(step.Value))
        {
            return "not finite";
        }

        if (step.Formula.Length == 0)
        {
            return null;
        }

        try
        {
            var worked = FormulaReader.Read(step.Formula, known);
            if (worked.Unit != Exponents.Of(step.Dimension) && worked is not { Value: 0, Terms: 0 })
            {
                return $"the formula gives {worked.Unit}";
            }

            var allowed = Tolerance * Math.Abs(step.Value) + Rounding * worked.Terms
                + (step.Dimension == Dimension.Length ? LevelRounding : step.Dimension == Dimension.Ratio ? RatioRounding : 0);
            return Math.Abs(worked.Value - step.Value) <= allowed ? null : $"the formula gives {worked.Value:R}";
        }
        catch (FormatException refused)
        {
            return refused.Message;
        }
    }
}
