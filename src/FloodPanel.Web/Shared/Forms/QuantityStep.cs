using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>How far an arrow key moves a value.</summary>
internal static class QuantityStep
{
    /// <summary>The value one step up or down, in base SI, free of the noise of adding decimals.</summary>
    /// <param name="value">Where the step starts [base SI].</param>
    /// <param name="steps">Steps, negative for down.</param>
    /// <param name="dimension">What the value measures.</param>
    /// <param name="system">The units in which it is shown.</param>
    public static double Move(double value, int steps, Dimension dimension, UnitSystem system)
    {
        var shown = Units.FromSI(value, dimension, system);
        var size = Size(shown, dimension, system);
        return Units.ToSI(Math.Round(shown + steps * size, 9), dimension, system);
    }

    // Tape-measure steps for lengths; elsewhere a tenth of the leading digit's place, so that 0.01 and 2700 both move sensibly.
    private static double Size(double shown, Dimension dimension, UnitSystem system) => dimension switch
    {
        Dimension.Length => system == UnitSystem.SI ? 0.01 : 0.1,
        Dimension.SectionLength => system == UnitSystem.SI ? 1 : 0.125,
        Dimension.Degrees or Dimension.Angle => 1,
        Dimension.Count => Math.Abs(shown) >= 100 ? 10 : 1,
        _ => shown == 0 ? 0.1 : Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(shown))) - 1),
    };
}
