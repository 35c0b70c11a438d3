using System.Globalization;
using System.Text.RegularExpressions;
using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>What a typed text means: a value [base SI], nothing (both null), or a problem in words.</summary>
public readonly record struct QuantityReading(double? Value, string? Problem);

/// <summary>
/// Reads a number with or without a unit behind it, as practitioners write it: 1.2, 12,5, 1067 mm, 3 ft 6 in,
/// 3' 6 1/2", 1 in 100. What could mean two things is refused.
/// </summary>
public static partial class QuantityText
{
    /// <summary>Reads a text; a number without a unit is in the unit shown.</summary>
    public static QuantityReading Read(string text, Dimension dimension, UnitSystem system)
    {
        var rest = Normalise(dimension == Dimension.Probability ? OneIn().Replace(text, "$1/$2") : text);
        if (rest.Length == 0)
        {
            return default;
        }

        var negative = rest[0] == '-';
        rest = (rest[0] is '-' or '+' ? rest[1..] : rest).TrimStart();
        if (rest.Length == 0)
        {
            return new(null, "it is not a number.");
        }

        var terms = new List<(double Number, double? Size)>(2);
        while (rest.Length > 0)
        {
            var number = QuantityNumber.Take(ref rest);
            if (number.Problem is not null)
            {
                return new(null, number.Problem);
            }

            if (!UnitNames.Take(ref rest, dimension, out var size))
            {
                return new(null, $"“{FirstWord(rest)}” is not a unit that fits here. {UnitNames.Hint(dimension)}");
            }

            terms.Add((number.Value, size));
            rest = size == UnitNames.Foot ? rest.TrimStart(' ', '-') : rest.TrimStart();
        }

        return Sum(terms, negative, Units.Of(dimension, system).InSI);
    }

    /// <summary>
    /// A value as it stands in a field: all digits of what was typed in this unit, but four decimals of what comes
    /// out of a conversion, which is hundredths of a millimetre for lengths. The value itself stays what it is.
    /// </summary>
    public static string Write(double value, Dimension dimension, UnitSystem system)
    {
        var text = Units.FormatInput(value, dimension, system);
        var number = double.Parse(text, CultureInfo.InvariantCulture);
        var isTyped = Math.Abs(Units.ToSI(number, dimension, system) - value) <= 1e-12 * Math.Abs(value);
        if (isTyped || number == 0)
        {
            return text;
        }

        var leadingZeros = Math.Max(0, -(int)Math.Floor(Math.Log10(Math.Abs(number))) - 1);
        return number.ToString("0." + new string('#', 4 + leadingZeros), CultureInfo.InvariantCulture);
    }

    private static QuantityReading Sum(List<(double Number, double? Size)> terms, bool negative, double shownSize)
    {
        double total;
        if (terms.Count == 1)
        {
            total = terms[0].Number * (terms[0].Size ?? shownSize);
        }
        else if (terms.Count == 2 && terms[0].Size == UnitNames.Foot && terms[1].Size is null or UnitNames.Inch)
        {
            total = terms[0].Number * UnitNames.Foot + terms[1].Number * UnitNames.Inch;
        }
        else
        {
            return new(null, "it holds more than one number. Write one number without spaces in it, or feet and inches.");
        }

        return double.IsFinite(total) ? new(negative ? -total : total, null) : new(null, "it is too large.");
    }

    private static string Normalise(string text)
    {
        var plain = text.Replace('\u2212', '-').Replace('\u2013', '-').Replace('\u00A0', ' ').Replace('\u202F', ' ')
            .Replace('\u2032', '\'').Replace('\u2019', '\'').Replace('\u2033', '"').Replace('\u201D', '"').Trim();
        // Powers and products only behind a letter: 5² and 5·2 must not turn into 52.
        return AfterLetter().Replace(plain, match => match.Value switch
        {
            "²" => "2",
            "³" => "3",
            "⁴" => "4",
            _ => "",
        });
    }

    private static string FirstWord(string rest) => rest.Split(' ', 2)[0];

    // "1 in 100" is how a chance is said.
    [GeneratedRegex(@"^\s*(\d+)\s+in\s+(\d+)\s*$", RegexOptions.IgnoreCase)]
    private static partial Regex OneIn();

    [GeneratedRegex(@"(?<=\p{L})([²³⁴]|[\^·*](?=[\p{L}234]))")]
    private static partial Regex AfterLetter();
}
