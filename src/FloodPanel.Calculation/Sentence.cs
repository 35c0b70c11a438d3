using System.Globalization;

namespace FloodPanel.Calculation;

/// <summary>
/// Words with quantities in them, printed in the reader's units. Made from an interpolated string whose
/// <see cref="Quantity"/> holes stay in base SI until then.
/// </summary>
/// <param name="text">
/// The words; holes that are <see cref="Quantity"/> values follow the units asked for. The format "typed" prints
/// all digits, where a value is refused and rounding would disguise why.
/// </param>
public sealed class Sentence(FormattableString text) : IEquatable<Sentence>
{
    /// <summary>The sentence in a system of units.</summary>
    /// <param name="system">The system of units.</param>
    public string In(UnitSystem system) => text.ToString(new QuantityFormat(system));

    /// <summary>The sentence in SI.</summary>
    public override string ToString() => In(UnitSystem.SI);

    /// <summary>True when both read the same in each system of units.</summary>
    /// <param name="other">The other sentence.</param>
    public bool Equals(Sentence? other) =>
        other is not null && ToString() == other.ToString() && In(UnitSystem.USCustomary) == other.In(UnitSystem.USCustomary);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Sentence);

    /// <inheritdoc/>
    public override int GetHashCode() => StringComparer.Ordinal.GetHashCode(ToString());

    private sealed class QuantityFormat(UnitSystem system) : IFormatProvider, ICustomFormatter
    {
        public object? GetFormat(Type? formatType) =>
            formatType == typeof(ICustomFormatter) ? this : CultureInfo.InvariantCulture.GetFormat(formatType!);

        public string Format(string? format, object? arg, IFormatProvider? formatProvider) => arg switch
        {
            Quantity quantity when format == "typed" => Units.FormatTyped(quantity, system),
            Quantity quantity => Units.Format(quantity, system),
            IFormattable formattable => formattable.ToString(format, CultureInfo.InvariantCulture),
            _ => arg?.ToString() ?? "",
        };
    }
}
