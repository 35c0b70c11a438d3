using System.Runtime.CompilerServices;

namespace FloodPanel.Calculation;

/// <summary>
/// Refuses arguments that a formula cannot take. An exception from here is a bug in the caller: what users type
/// is refused earlier, with a sentence, by <see cref="Validation"/>.
/// </summary>
public static class Guard
{
    /// <summary>Refuses NaN and infinities.</summary>
    /// <param name="value">The argument.</param>
    /// <param name="name">Its name, filled in by the compiler.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static void Finite(double value, [CallerArgumentExpression(nameof(value))] string name = "")
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(name, value, "must be finite");
        }
    }

    /// <summary>Refuses negative and non-finite values.</summary>
    /// <param name="value">The argument.</param>
    /// <param name="name">Its name, filled in by the compiler.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is negative or not finite.</exception>
    public static void NonNegative(double value, [CallerArgumentExpression(nameof(value))] string name = "")
    {
        if (!(value >= 0 && double.IsFinite(value)))
        {
            throw new ArgumentOutOfRangeException(name, value, "must be finite and not negative");
        }
    }

    /// <summary>Refuses zero, negative and non-finite values.</summary>
    /// <param name="value">The argument.</param>
    /// <param name="name">Its name, filled in by the compiler.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is zero, negative or not finite.</exception>
    public static void Positive(double value, [CallerArgumentExpression(nameof(value))] string name = "")
    {
        if (!(value > 0 && double.IsFinite(value)))
        {
            throw new ArgumentOutOfRangeException(name, value, "must be finite and above zero");
        }
    }

    /// <summary>Refuses values outside a closed range, and NaN.</summary>
    /// <param name="value">The argument.</param>
    /// <param name="minimum">Least value allowed.</param>
    /// <param name="maximum">Greatest value allowed.</param>
    /// <param name="name">Its name, filled in by the compiler.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is outside the range or not a number.</exception>
    public static void InRange(
        double value, double minimum, double maximum, [CallerArgumentExpression(nameof(value))] string name = "")
    {
        if (!(value >= minimum && value <= maximum))
        {
            throw new ArgumentOutOfRangeException(name, value, $"must be from {minimum} to {maximum}");
        }
    }
}
