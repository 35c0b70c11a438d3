using System.Globalization;
using System.Text.RegularExpressions;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>Reads the number at the start of a text: decimals with a point or a comma, powers of ten, fractions.</summary>
internal static partial class QuantityNumber
{
    /// <summary>Takes the number off the text, with the blanks behind it.</summary>
    public static (double Value, string? Problem) Take(ref string rest)
    {
        var fraction = Fraction().Match(rest);
        if (fraction.Success)
        {
            rest = rest[fraction.Length..].TrimStart();
            return Divide(fraction);
        }

        var run = DigitRun().Match(rest);
        if (!run.Success)
        {
            return (0, "it is not a number.");
        }

        rest = rest[run.Length..].TrimStart();
        return Decimal(run.Groups["digits"].Value, run.Groups["power"].Value);
    }

    private static (double Value, string? Problem) Divide(Match fraction)
    {
        var whole = fraction.Groups["whole"] is { Success: true } group ? Parse(group.Value) : 0;
        var denominator = Parse(fraction.Groups["denominator"].Value);
        return denominator == 0
            ? (0, "it divides by zero.")
            : (whole + Parse(fraction.Groups["numerator"].Value) / denominator, null);
    }

    private static (double Value, string? Problem) Decimal(string digits, string power)
    {
        var commas = digits.Count(c => c == ',');
        var points = digits.Count(c => c == '.');
        if (commas + points > 1)
        {
            return (0, "write it with one decimal point and without thousands separators.");
        }

        if (commas == 1 && IsAmbiguous(digits))
        {
            return (0, $"it could mean {digits.Replace(',', '.')} or {digits.Replace(",", "")}. Write one of these.");
        }

        return (Parse(digits.Replace(',', '.') + power), null);
    }

    // 1,250 is 1250 to one reader and 1.25 to another; 12,5 and 0,125 can only be decimals.
    private static bool IsAmbiguous(string digits)
    {
        var comma = digits.IndexOf(',');
        return digits.Length - comma - 1 == 3 && comma is >= 1 and <= 3 && digits[0] != '0';
    }

    private static double Parse(string digits) =>
        double.Parse(digits, NumberStyles.Float, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^(?:(?<whole>[0-9]+)[ -]+)?(?<numerator>[0-9]+) ?/ ?(?<denominator>[0-9]+)")]
    private static partial Regex Fraction();

    [GeneratedRegex(@"^(?<digits>[.,]?[0-9][0-9.,]*)(?<power>[eE][+-]?[0-9]+)?")]
    private static partial Regex DigitRun();
}
