namespace FloodPanel.Calculation;

/// <summary>
/// One written line, symbol = formula = value. The formula is empty for a given value; else it uses only symbols
/// of earlier steps, numbers, + − · / ( ) ² ³ ⁴ ^ √, π and min, max, cos, sin, tan, sinh, cosh, tanh, exp, ln. All values are base SI, so that the
/// formula holds as it stands.
/// </summary>
/// <param name="Symbol">The symbol, unique among the steps.</param>
/// <param name="Formula">The formula in symbols, or empty.</param>
/// <param name="Value">The value [base SI].</param>
/// <param name="Dimension">What the value measures.</param>
public readonly record struct CalculationStep(string Symbol, string Formula, double Value, Dimension Dimension);

/// <summary>How a figure that is not a check came about.</summary>
/// <param name="Title">What the figure is.</param>
/// <param name="Source">Where the method stands.</param>
/// <param name="Steps">The lines, the last being the figure itself.</param>
public sealed record Working(string Title, string Source, IReadOnlyList<CalculationStep> Steps);

/// <summary>One failure mode: demand against capacity, in base SI, with its source and its working.</summary>
/// <param name="Name">Fixed name in files, "log-bending".</param>
/// <param name="Title">Title on screens and documents.</param>
/// <param name="Source">Standard and clause, or "first principles".</param>
/// <param name="Dimension">How <see cref="Units"/> prints demand and capacity.</param>
/// <param name="Demand">What acts [base SI].</param>
/// <param name="Capacity">What is allowed [base SI].</param>
/// <param name="Steps">The working.</param>
public sealed record Check(
    string Name,
    string Title,
    string Source,
    Dimension Dimension,
    double Demand,
    double Capacity,
    IReadOnlyList<CalculationStep> Steps)
{
    /// <summary>Demand / capacity [-]; infinite where nothing resists a demand.</summary>
    public double Utilisation => Capacity > 0 ? Demand / Capacity : double.PositiveInfinity;

    /// <summary>What is not shown to pass fails, NaN and negatives included.</summary>
    public bool Passes => Utilisation is >= 0 and <= 1;

    /// <summary>True for a rule of detailing, a least edge distance or spacing: it is kept or broken, and no load uses it up.</summary>
    public bool IsDetailing { get; init; }

    /// <summary>A rule of detailing governs only when it is broken.</summary>
    public bool MayGovern => !(IsDetailing && Passes);
}
