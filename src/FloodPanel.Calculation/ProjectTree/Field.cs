namespace FloodPanel.Calculation.ProjectTree;

/// <summary>
/// One numeric input: what forms, validation and the project file know of it. The limits stand here once.
/// </summary>
/// <param name="Key">Leaf name in the project file, "clearWidth"; drawings mark the dimension with it.</param>
/// <param name="Label">Label on screens and in messages, "Clear width".</param>
/// <param name="Dimension">What the number measures.</param>
/// <param name="Minimum">Least value allowed [base SI].</param>
/// <param name="Maximum">Greatest value allowed [base SI].</param>
/// <param name="Help">One sentence that says what is meant.</param>
/// <param name="MinimumExcluded">True when the least value itself is not allowed.</param>
public sealed record Field(
    string Key,
    string Label,
    Dimension Dimension,
    double Minimum,
    double Maximum,
    string Help,
    bool MinimumExcluded = false)
{
    /// <summary>True when the value is finite and within the limits.</summary>
    /// <param name="value">The value [base SI].</param>
    public bool Allows(double value) =>
        (MinimumExcluded ? value > Minimum : value >= Minimum) && value <= Maximum;

    /// <summary>What is allowed, "above 0.000 m and at most 50.000 m".</summary>
    public Sentence Allowed => MinimumExcluded
        ? new($"above {new Quantity(Minimum, Dimension)} and at most {new Quantity(Maximum, Dimension)}")
        : new($"from {new Quantity(Minimum, Dimension)} to {new Quantity(Maximum, Dimension)}");

    /// <summary>The sentence for a value that is not allowed; null when it is.</summary>
    /// <param name="value">The value [base SI].</param>
    public Sentence? Refusal(double value)
    {
        if (Allows(value))
        {
            return null;
        }

        var shown = new Quantity(value, Dimension);
        var least = new Quantity(Minimum, Dimension);
        var most = new Quantity(Maximum, Dimension);
        return MinimumExcluded
            ? new($"{Label} is {shown:typed}; allowed is above {least} and at most {most}.")
            : new($"{Label} is {shown:typed}; allowed is {least} to {most}.");
    }
}
