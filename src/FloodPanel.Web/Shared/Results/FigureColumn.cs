using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Results;

/// <summary>Sets the numbers of a column on their decimal point, although each has three figures of its own.</summary>
public static class FigureColumn
{
    /// <summary>What has to follow each number, unseen, so that their points stand in line: "", "0", ".00".</summary>
    public static IReadOnlyList<string> Pads(IEnumerable<double> values, Dimension dimension, UnitSystem system)
    {
        var decimals = values.Select(v => Decimals(Units.FormatNumber(v, dimension, system))).ToArray();
        var most = decimals.DefaultIfEmpty().Max();
        return [.. decimals.Select(d => Pad(d, most))];
    }

    private static int Decimals(string number) => number.IndexOf('.') is var point and >= 0 ? number.Length - point - 1 : 0;

    private static string Pad(int decimals, int most) =>
        decimals == most ? "" : (decimals == 0 ? "." : "") + new string('0', most - decimals);
}
