using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Water;

/// <summary>Levels by annual exceedance probability, straight between the known points on the Gumbel reduced variate.</summary>
/// <remarks>
/// y = −ln(−ln(1 − p)): a Gumbel distribution of annual greatest levels is a straight line over it. Source: Gumbel,
/// Statistics of Extremes (1958), reduced variate. Limits: between the rarest and the most frequent known level; nothing is
/// extrapolated.
/// </remarks>
public sealed class LevelCurve
{
    /// <summary>Source of the interpolation, as printed.</summary>
    public const string Source = "interpolation on the Gumbel reduced variate between known levels";

    /// <summary>A design level within this of the table's counts as taken from it [m], 1 cm: levels are quoted to that.</summary>
    private const double Taken = 0.01;

    /// <summary>Chances that differ by no more, relatively, are the same chance: 0.7 % is 0.007 but for rounding.</summary>
    private const double SameChance = 1e-9;

    private LevelCurve(LevelPoint[] points) => Points = points.ToValueList();

    /// <summary>The known levels, the most frequent first.</summary>
    public ValueList<LevelPoint> Points { get; }

    /// <summary>The curve through a table; null when it holds fewer than two levels or problems.</summary>
    /// <param name="levels">The table, in any order.</param>
    public static LevelCurve? Of(ValueList<LevelPoint> levels)
    {
        if (levels.Count < 2)
        {
            return null;
        }

        var points = levels.OrderByDescending(point => point.AnnualProbability).ToArray();
        var usable = points.All(p => p.AnnualProbability is > 0 and < 1 && double.IsFinite(p.Level))
            && points.Zip(points.Skip(1)).All(pair =>
                !IsSame(pair.First.AnnualProbability, pair.Second.AnnualProbability) && pair.First.Level <= pair.Second.Level);
        return usable ? new(points) : null;
    }

    /// <summary>y = −ln(−ln(1 − p)), Gumbel reduced variate [-].</summary>
    /// <param name="probability">p, annual exceedance probability [-], above 0 and below 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The probability is not above 0 and below 1.</exception>
    public static double Variate(double probability)
    {
        Guard.Positive(probability);
        Guard.InRange(probability, 0, 1 - 1e-12);

        return -Math.Log(-Math.Log(1 - probability));
    }

    /// <summary>Level at a probability [m]; null outside the table.</summary>
    /// <param name="probability">p, annual exceedance probability [-].</param>
    public double? At(double probability)
    {
        if (Between(probability) is not { } pair)
        {
            return null;
        }

        var (from, to) = (Variate(pair.Frequent.AnnualProbability), Variate(pair.Rare.AnnualProbability));
        return pair.Frequent.Level + (pair.Rare.Level - pair.Frequent.Level) * (Variate(probability) - from) / (to - from);
    }

    /// <summary>True where the table gives this level at this probability, to the centimetre.</summary>
    /// <param name="probability">p, annual exceedance probability [-].</param>
    /// <param name="level">Level [m].</param>
    public bool Gives(double probability, double level) => At(probability) is { } own && Math.Abs(own - level) <= Taken;

    /// <summary>True for one and the same chance, but for the rounding of per cent and fractions.</summary>
    /// <param name="one">A probability [-].</param>
    /// <param name="other">Another [-].</param>
    internal static bool IsSame(double one, double other) => Math.Abs(one - other) <= SameChance * Math.Max(one, other);

    /// <summary>How a level of the table came about; empty outside it.</summary>
    /// <param name="probability">p, annual exceedance probability [-].</param>
    internal IEnumerable<CalculationStep> Steps(double probability)
    {
        if (Between(probability) is not { } pair)
        {
            return [];
        }

        var (from, to) = (pair.Frequent, pair.Rare);
        return
        [
            new("p", "", probability, Dimension.Probability),
            new("y", "ln(1/ln(1/(1 − p)))", Variate(probability), Dimension.Ratio),
            new("p_1", "", from.AnnualProbability, Dimension.Probability),
            new("z_1", "", from.Level, Dimension.Length),
            new("y_1", "ln(1/ln(1/(1 − p_1)))", Variate(from.AnnualProbability), Dimension.Ratio),
            new("p_2", "", to.AnnualProbability, Dimension.Probability),
            new("z_2", "", to.Level, Dimension.Length),
            new("y_2", "ln(1/ln(1/(1 − p_2)))", Variate(to.AnnualProbability), Dimension.Ratio),
            new("z_p", "z_1 + (z_2 − z_1)·(y − y_1)/(y_2 − y_1)", At(probability)!.Value, Dimension.Length),
        ];
    }

    private (LevelPoint Frequent, LevelPoint Rare)? Between(double probability)
    {
        for (var i = 1; i < Points.Count; i++)
        {
            var (frequent, rare) = (Points[i - 1], Points[i]);
            if (probability <= frequent.AnnualProbability * (1 + SameChance) && probability >= rare.AnnualProbability * (1 - SameChance))
            {
                return (frequent, rare);
            }
        }

        return null;
    }
}
