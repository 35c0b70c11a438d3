using System.Globalization;

namespace FloodPanel.Calculation.Water;

/// <summary>An annual exceedance probability as it is said: once in how many years on average, T = 1/p.</summary>
public static class ReturnPeriod
{
    /// <summary>The years alone, "100": whole from 10, with at most one decimal below.</summary>
    /// <param name="probability">p, annual exceedance probability [-], above 0 and up to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The probability is not above 0 and up to 1.</exception>
    public static string Years(double probability)
    {
        Guard.Positive(probability);
        Guard.InRange(probability, 0, 1);

        var years = 1 / probability;
        return years.ToString(years < 9.95 ? "0.#" : "0", CultureInfo.InvariantCulture);
    }

    /// <summary>"1 in 100".</summary>
    /// <param name="probability">p, annual exceedance probability [-], above 0 and up to 1.</param>
    public static string InWords(double probability) => $"1 in {Years(probability)}";
}
